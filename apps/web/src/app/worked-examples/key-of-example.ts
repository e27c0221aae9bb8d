/** What a key says of each kind of example, as texts: the page only lays it out. */
import type { CheckResult, Diagnosis, NextStep } from '@chargewright/engine';
import {
  workCheck,
  workMoistAir,
  workWeighIn,
  type CheckExample,
  type MoistAirExample,
  type WeighInExample,
  type WorkedExample,
} from '@chargewright/engine/training';
import {
  causeText,
  cautionText,
  checkedLines,
  evidenceText,
  formatStated,
  formatValue,
  nextStepLines,
  otherFigureRows,
  overallHeadline,
  separatingTestWords as testWords,
  stepsOfLesson,
  stopText,
  weighInSum,
  workedExampleWords,
  type CheckedLine,
  type FigureRow,
  type SumLine,
  type UnitSystem,
} from '@chargewright/wording';
import { firstSentence } from '../check-a-charge/first-sentence';

export interface ExampleKey {
  readonly math: readonly CheckedLine[];
  /** The sums of a weigh-in, a line set each. */
  readonly sums: readonly { readonly title: string; readonly lines: readonly SumLine[] }[];
  /** Empty where nothing is judged. */
  readonly findings: readonly string[];
  readonly causes: readonly { readonly name: string; readonly signs: readonly string[] }[];
  readonly nextStep: NextStep | undefined;
  readonly otherwise: readonly { readonly what: string; readonly outcome: string }[];
  /** Those that stand beside no step of the math. */
  readonly figures: readonly FigureRow[];
}

const { key: words, slips: slipWords, lines: lineNames } = workedExampleWords;

export function keyOf(example: WorkedExample, system: UnitSystem): ExampleKey {
  switch (example.kind) {
    case 'check':
      return checkKey(example, system);
    case 'moist-air':
      return airKey(example, system);
    case 'weigh-in':
      return weighInKey(example, system);
  }
}

function checkKey(example: CheckExample, system: UnitSystem): ExampleKey {
  const { result, diagnosis, slips, figures } = workCheck(example);
  const { stops, cautions, nextStep } = result.overall;
  const steps = stepsOfLesson(result.derivation, figures);
  return {
    math: checkedLines(steps, figures, system),
    sums: [],
    findings: [
      ...(stops.length > 0 ? stops.map((stop) => stopText(stop, system)) : [`${overallHeadline(result, system)}.`]),
      ...cautions.filter(({ code }) => example.key.cautions.includes(code)).map((each) => cautionText(each, system)),
    ],
    causes: diagnosis.causes.map(({ cause, fits, doesNotFit }) => ({
      name: causeText(cause),
      signs: [
        ...fits.map((sign) => `${testWords.fits}: ${evidenceText(sign, system)}`),
        ...doesNotFit.map((sign) => `${testWords.doesNotFit}: ${evidenceText(sign, system)}`),
      ],
    })),
    nextStep,
    otherwise: slips.map(({ slip, result: slipped, diagnosis: found }) => ({
      what: slipWords[slip.id].what,
      outcome: slip.given ? `${causeNames(found)} ${outcome(slipped, system)}` : outcome(slipped, system),
    })),
    figures: otherFigureRows(figures, steps),
  };
}

/** What the further readings of a test leave of the causes. */
const causeNames = ({ causes }: Diagnosis): string => causes.map(({ cause }) => `${causeText(cause)}.`).join(' ');

/** The finding and the first sentence of what to do. */
const outcome = (result: CheckResult, system: UnitSystem): string =>
  `${overallHeadline(result, system)}. ${firstSentence(nextStepLines(result.overall.nextStep, system).step)}`;

function airKey(example: MoistAirExample, system: UnitSystem): ExampleKey {
  const { steps, figures } = workMoistAir(example);
  return {
    math: checkedLines(steps, figures, system),
    sums: [],
    findings: [],
    causes: [],
    nextStep: undefined,
    otherwise: [],
    figures: otherFigureRows(figures, steps),
  };
}

function weighInKey(example: WeighInExample, system: UnitSystem): ExampleKey {
  const { parts, figures } = workWeighIn(example);
  return {
    math: [],
    sums: parts.map(({ part, result }) => ({
      title: words.mathOf(lineNames[part.id]),
      lines: weighInSum(result, system),
    })),
    findings: [],
    causes: [],
    nextStep: undefined,
    otherwise: parts.flatMap(({ part, misprinted }) =>
      misprinted.flatMap(({ actual, difference }) =>
        actual.state === 'known' && difference.state === 'known'
          ? [
              {
                what: words.printedSumWeighedIn(lineNames[part.id], formatStated('massKg', actual.value, system)),
                outcome: words.offRequired(formatValue('massKg', difference.value, system)),
              },
            ]
          : [],
      ),
    ),
    figures: otherFigureRows(figures, []),
  };
}
