/** What stands on the pages of a worked example: the givens in their own units with others beside, and each number with what it is held against. */
import {
  lengthToM,
  pressureAsReadToPa,
  differenceToK,
  READING_DIMENSIONS,
  temperatureToK,
  type Amount,
  type DerivationStep,
  type EvaluationRequest,
  type Known,
  type PressureUnit,
  type QuantityKind,
  type ReadingId,
  type ReadingInput,
  type TemperatureUnit,
} from '@chargewright/engine';
import type {
  CheckedFigure,
  CheckExample,
  MoistAirExample,
  WeighInPart,
  WorkedFigure,
} from '@chargewright/engine/training';
import { derivationLines, type DerivationLine } from './derivation-lines';
import { readingWords } from './english/readings';
import { setupWords } from './english/setup';
import { workedExampleWords } from './english/worked-examples';
import { formatNumber, formatShort, formatStated, formatValue, unitLabel } from './format-value';
import type { UnitSystem } from './unit-system';

export interface GivenRow {
  readonly name: string;
  /** As on paper. */
  readonly own: string;
  /** The same in other units; empty where there are none. */
  readonly other: string;
}

const words = workedExampleWords;

/** Units beside those of an example: the reader's, where he reads in others, else the usual ones of the other kind. */
const besideUnits = (own: 'inch-pound' | 'metric', system: UnitSystem): UnitSystem => {
  if (own === 'metric') return 'F-psi';
  return system === 'F-psi' ? 'C-kPa' : system;
};

const ownUnits = ({ readings }: EvaluationRequest): 'inch-pound' | 'metric' =>
  Object.values(readings).some(({ unit }) => unit === 'degC') ? 'metric' : 'inch-pound';

const decimalsIn = (step: number): number => Math.max(0, Math.round(-Math.log10(step)));

const amountText = ({ value, unit }: Amount<string>, decimals: number): string =>
  `${formatNumber(value, decimals)} ${unitLabel(unit)}`;

/** A gauge pressure printed as one, not as an absolute one. */
const gaugeText = (pa: number, system: UnitSystem): string => `${formatValue('pressureDifferencePa', pa, system)}g`;

function otherText(id: ReadingId, { value, unit }: ReadingInput, system: UnitSystem): string {
  if (READING_DIMENSIONS[id] === 'pressure') return gaugeText(pressureAsReadToPa(value, unit as PressureUnit), system);
  return formatValue('temperatureK', temperatureToK(value, unit as TemperatureUnit), system);
}

function readingRow(id: ReadingId, reading: ReadingInput, system: UnitSystem): GivenRow {
  return {
    name: capital(readingWords[id].name),
    own: amountText(reading, decimalsIn(reading.resolution ?? 1)),
    other: otherText(id, reading, system),
  };
}

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

const trimmed = (amount: Amount<string>): string => amountText(amount, decimalsOf(amount.value));

const decimalsOf = (value: number): number => String(value).split('.')[1]?.length ?? 0;

/** What is known of the system before anything is read. */
export function systemRows({ request }: Pick<CheckExample, 'request'>, system: UnitSystem): readonly GivenRow[] {
  const { setup, visit = {} } = request;
  const beside = besideUnits(ownUnits(request), system);
  const { refrigerant, meteringDevice, elevation, targetSubcooling, targetSuperheat } = setup;
  const { given } = words;
  const plain = (name: string, own: string): GivenRow => ({ name, own, other: '' });
  const target = (name: string, amount: Amount<'deltaF' | 'deltaC'> | undefined): readonly GivenRow[] =>
    amount === undefined
      ? []
      : [
          {
            name,
            own: trimmed(amount),
            other: formatShort('differenceK', differenceToK(amount.value, amount.unit), beside),
          },
        ];
  return [
    plain(given.refrigerant, refrigerant),
    plain(given.meteringDevice, setupWords.meteringDevice.options[meteringDevice].label),
    ...(elevation === undefined
      ? []
      : [
          {
            name: setupWords.numbers.elevation.label,
            own: trimmed(elevation),
            other: formatShort('lengthM', lengthToM(elevation.value, elevation.unit), beside),
          },
        ]),
    ...target(setupWords.numbers.targetSubcooling.label, targetSubcooling),
    ...target(setupWords.numbers.targetSuperheat.label, targetSuperheat),
    ...(visit.runningMinutes === undefined ? [] : [plain(given.running, given.minutes(visit.runningMinutes))]),
    ...(visit.iceSeen ? [plain(given.ice, given.seen)] : []),
  ];
}

export function readingRows({ request }: Pick<CheckExample, 'request'>, system: UnitSystem): readonly GivenRow[] {
  const beside = besideUnits(ownUnits(request), system);
  return readingsOf(request).map(([id, reading]) => readingRow(id, reading, beside));
}

/** What was read further, in the tests that are given with the example. */
export const furtherRows = (
  { request, slips }: Pick<CheckExample, 'request' | 'slips'>,
  system: UnitSystem,
): readonly { readonly name: string; readonly rows: readonly GivenRow[] }[] =>
  slips
    .filter(({ given }) => given === true)
    .map((slip) => ({
      name: capital(words.slips[slip.id].name),
      rows: readingsOf(slip.request)
        .filter(([id]) => request.readings[id] === undefined)
        .map(([id, reading]) => readingRow(id, reading, besideUnits(ownUnits(request), system))),
    }));

const readingsOf = ({ readings }: EvaluationRequest) => Object.entries(readings) as [ReadingId, ReadingInput][];

export function airRows({ given }: Pick<MoistAirExample, 'given'>, system: UnitSystem): readonly GivenRow[] {
  const beside = besideUnits('inch-pound', system);
  const temperature = (name: string, value: number): GivenRow => ({
    name,
    own: amountText({ value, unit: 'degF' }, 0),
    other: formatValue('temperatureK', temperatureToK(value, 'degF'), beside),
  });
  return [
    temperature(words.given.dryBulb, given.dryBulbF),
    temperature(words.given.wetBulb, given.wetBulbF),
    {
      name: words.given.pressure,
      own: trimmed({ value: given.pressurePsia, unit: 'psia' }),
      other: formatValue('pressurePa', pressureAsReadToPa(given.pressurePsia, 'psia'), beside),
    },
  ];
}

/** What the manual gives of one line set; its own units are inch-pound. */
export function lineRows({ input, misprintsKg }: WeighInPart, system: UnitSystem): readonly GivenRow[] {
  const beside = besideUnits('inch-pound', system);
  const { factoryChargeKg = 0, line } = input;
  const { installedLengthM = 0, includedLengthM = 0, makersRateKgPerM = 0 } = line;
  const { given } = words;
  const row = (name: string, kind: QuantityKind, ...si: readonly number[]): GivenRow => ({
    name,
    own: si.map((value) => formatStated(kind, value, 'F-psi')).join(', '),
    other: si.map((value) => formatStated(kind, value, beside)).join(', '),
  });
  return [
    row(given.factoryCharge, 'massKg', factoryChargeKg),
    row(given.includedLength, 'lengthM', includedLengthM),
    row(given.extraLength, 'lengthM', installedLengthM - includedLengthM),
    row(given.rate, 'chargeRateKgPerM', makersRateKgPerM),
    row(given.printedSums, 'massKg', ...misprintsKg),
  ];
}

export interface FigureRow {
  readonly name: string;
  readonly printed: string;
  /** What the engine finds. */
  readonly here: string;
  readonly against: string;
  readonly misprint: boolean;
}

/** A step of the math, with the figure its result is held against where there is one. */
export interface CheckedLine extends DerivationLine {
  readonly check: Pick<FigureRow, 'printed' | 'against'> | null;
}

const OF: Readonly<Record<string, string>> = {
  ...Object.fromEntries(Object.entries(words.slips).map(([id, { name }]) => [id, name])),
  ...words.lines,
};

function figureName({ what, of }: CheckedFigure): string {
  const name = words.figures[what];
  const which = of === undefined ? undefined : OF[of];
  return which === undefined ? name : words.key.ofWhich(name, which);
}

/** A number as printed and as found here, with one decimal more, in the unit of the print. */
function figureRow({ figure, computed }: WorkedFigure): FigureRow {
  const { value, unit, standing, source, misprint = false } = figure;
  const decimals = decimalsOf(value);
  const text = (number: number, places: number): string => amountText({ value: number, unit }, places).trim();
  return {
    name: figureName(figure),
    printed: text(value, decimals),
    here: computed === null ? '' : text(computed, decimals + 1),
    against: words.against[standing](source),
    misprint,
  };
}

/** Figures that have another name than the step that gives them. */
const STEP_OF: Readonly<Partial<Record<CheckedFigure['what'], string>>> = {
  splitDeviation: 'temperature-splitDeviation',
};

const stepOf = ({ what }: CheckedFigure): string => STEP_OF[what] ?? what;

/** A figure of other readings, or of a line set, stands beside no step of the example's own. */
const standsBeside = ({ figure }: WorkedFigure, { id }: { readonly id: string }): boolean =>
  figure.of === undefined && stepOf(figure) === id;

/** The steps that lead to the figures of a lesson; a check derives more than it is about. */
export function stepsOfLesson(
  steps: readonly DerivationStep[],
  figures: readonly WorkedFigure[],
): readonly DerivationStep[] {
  const wanted = new Set<string>();
  const visit = ({ step }: Known): void => {
    if (step.type === 'leaf' || wanted.has(step.formula.id)) return;
    wanted.add(step.formula.id);
    Object.values(step.from).forEach(visit);
  };
  for (const { id, result } of steps) if (figures.some((each) => standsBeside(each, { id }))) visit(result);
  return steps.filter(({ id }) => wanted.has(id));
}

/** The math in its order, each result with what it is held against. */
export const checkedLines = (
  steps: readonly DerivationStep[],
  figures: readonly WorkedFigure[],
  system: UnitSystem,
): readonly CheckedLine[] =>
  derivationLines(steps, system).map((line) => {
    const worked = figures.find((each) => standsBeside(each, line));
    const name = words.steps[line.id] ?? line.name;
    if (worked === undefined) return { ...line, name, check: null };
    const { printed, against } = figureRow(worked);
    return { ...line, name, check: { printed, against } };
  });

/** The figures that stand beside none of these steps. */
export const otherFigureRows = (
  figures: readonly WorkedFigure[],
  steps: readonly DerivationStep[],
): readonly FigureRow[] => figures.filter((each) => !steps.some((step) => standsBeside(each, step))).map(figureRow);
