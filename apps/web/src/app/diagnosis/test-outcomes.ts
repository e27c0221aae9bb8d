/** What each separating test shows so far, in words: the engine's finding with its ±. Empty while it is not made. */
import {
  airTest,
  currentTest,
  differenceToK,
  drierTest,
  expandedUncertainty,
  isKnown,
  type CheckInput,
  type CheckResult,
  type Quantity,
} from '@chargewright/engine';
import { formatShort, formatValue, separatingTestWords, type TestId, type UnitSystem } from '@chargewright/wording';

const words = separatingTestWords;

/** The limits of the sentences, as the trade prints them. */
const THREE_K = differenceToK(3, 'deltaF');
const ONE_K = differenceToK(1, 'deltaF');
const TENTH = 0.1;

interface Limit {
  readonly kind: 'differenceK' | 'fraction';
  readonly value: number;
}

type Outcome = (value: string, plusMinus: string, limit: string) => string;

/** A refused quantity has no number to show: its sentence then stands on the limit alone. */
function say(outcome: Outcome, measured: Quantity, { kind, value }: Limit, system: UnitSystem): string {
  const limit = formatShort(kind, value, system);
  if (!isKnown(measured)) return outcome('–', '–', limit);
  const shown = formatValue(kind, measured.value, system);
  return outcome(shown, formatValue(kind, expandedUncertainty(measured), system), limit);
}

export interface TestOutcome {
  readonly text: string;
  /** Whether anything was recorded for it. */
  readonly isMade: boolean;
}

export function testOutcomes(
  input: CheckInput,
  result: CheckResult,
  system: UnitSystem,
): Readonly<Record<TestId, TestOutcome>> {
  const { readings, visit } = input;
  const drier = drierTest(input);
  const air = airTest(input);
  const current = currentTest(input);
  const outcome = (text: string, isMade = text !== ''): TestOutcome => ({ text, isMade });
  return {
    drier: outcome(
      drier.finding === 'unmeasured'
        ? ''
        : say(words.drierOutcomes[drier.finding], drier.drop, { kind: 'differenceK', value: THREE_K }, system),
    ),
    air: outcome(
      air.finding === 'untested'
        ? ''
        : say(words.airOutcomes[air.finding], air.excess, { kind: 'differenceK', value: THREE_K }, system),
    ),
    bulb: outcome('', visit.tests.bulb !== undefined || visit.tests.valve !== undefined),
    current: outcome(
      current.finding === 'unmeasured'
        ? ''
        : say(words.currentOutcomes[current.finding], current.offExpected, { kind: 'fraction', value: TENTH }, system),
    ),
    wetBulb: readings.returnWetBulbBefore === undefined ? outcome('') : outcome(wetBulbText(input, result, system)),
  };
}

function wetBulbText({ readings }: CheckInput, { derived, overall }: CheckResult, system: UnitSystem): string {
  if (readings.returnWetBulb === undefined) return words.wetBulbWaits;
  if (overall.cautions.some(({ code }) => code === 'wet-bulb-moved')) {
    return words.wetBulbMoved(formatShort('differenceK', ONE_K, system));
  }
  const mean = derived.returnWetBulb;
  if (mean === undefined) return '';
  const plusMinus = formatValue('differenceK', expandedUncertainty(mean), system);
  return words.wetBulbMean(formatValue('temperatureK', mean.value, system), plusMinus);
}
