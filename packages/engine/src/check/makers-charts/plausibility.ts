/**
 * What looks wrong in a maker's table though it can be: slips of the hand and of the unit. Worth a second look, never refused. The usual ranges are
 * common practice without a source; what counts as odd is our choice.
 */
import type { ChartUnit } from '../../methods/makers-chart/chart-units';
import { CHART_UNITS, dimensionOfChartUnit } from '../../methods/makers-chart/chart-units';
import type { ChartCondition, ChartTrend, MakersChartKind } from '../../methods/makers-chart/kinds';
import { MAKERS_CHART_FACTS } from '../../methods/makers-chart/kinds';
import { printedToSi } from '../../methods/makers-chart/printed-values';
import type { ChartAxisInput, MakersChartInput } from '../request';
import { printedStep } from './printed-step';

export const CHART_ODDITY_CODES = ['unit-slip', 'unusual', 'against-neighbours', 'wrong-way', 'hole'] as const;
export type ChartOddityCode = (typeof CHART_ODDITY_CODES)[number];

/** Something odd, and where: at a cell, at a place of an axis, or of a whole row or column of cells. */
export interface ChartOddity {
  readonly code: ChartOddityCode;
  readonly part: 'rows' | 'columns' | 'cells';
  /** Counted from 0; left out where the whole part is meant. */
  readonly row?: number;
  readonly column?: number;
  /** Under `unit-slip`: the unit in which the figures would be usual. */
  readonly likelyUnit?: ChartUnit;
}

interface Usual {
  readonly low: number;
  readonly high: number;
}

const usual = (low: number, high: number, unit: ChartUnit): Usual => ({
  low: printedToSi(low, unit),
  high: printedToSi(high, unit),
});

const USUAL_CONDITIONS: Readonly<Record<ChartCondition, Usual>> = {
  outdoorDryBulb: usual(-20, 130, 'degF'),
  returnWetBulb: usual(40, 85, 'degF'),
  returnDryBulb: usual(50, 100, 'degF'),
  suctionPressure: usual(15, 250, 'psig'),
  liquidLineTemperature: usual(40, 150, 'degF'),
};

const USUAL_TARGETS: Readonly<Record<MakersChartKind, Usual>> = {
  superheat: usual(0, 60, 'deltaF'),
  subcooling: usual(0, 30, 'deltaF'),
  'liquid-line-approach': usual(0, 30, 'deltaF'),
  'suction-line-temperature': usual(30, 100, 'degF'),
  'liquid-pressure': usual(50, 650, 'psig'),
  'heating-discharge-pressure': usual(80, 650, 'psig'),
  'heating-discharge-temperature': usual(90, 260, 'degF'),
};

/** Lines of cells tell a common way only from this many on. */
const LEAST_LINES = 3;

/** Everything odd about a table of the right shape; an empty list is the usual answer. */
export function plausibilityOfMakersChart(chart: MakersChartInput): readonly ChartOddity[] {
  const { rows, columns } = MAKERS_CHART_FACTS[chart.kind];
  return [
    ...axisOddities('rows', chart.rows, rows),
    ...axisOddities('columns', chart.columns, columns),
    ...unusualCells(chart),
    ...shapeOddities(chart),
  ];
}

function axisOddities(
  part: 'rows' | 'columns',
  axis: ChartAxisInput | undefined,
  condition: ChartCondition | null,
): readonly ChartOddity[] {
  if (axis === undefined || condition === null) return [];
  const range = USUAL_CONDITIONS[condition];
  const outside = axis.values.flatMap((value, index) => (isUsual(value, axis.unit, range) ? [] : [index]));
  const likelyUnit = outside.length === 0 ? undefined : unitOfUsual(axis.values, axis.unit, range);
  if (likelyUnit !== undefined) return [{ code: 'unit-slip', part, likelyUnit }];
  return outside.map((index) => ({ code: 'unusual', part, [part === 'rows' ? 'row' : 'column']: index }));
}

function unusualCells({ kind, unit, cells }: MakersChartInput): readonly ChartOddity[] {
  const range = USUAL_TARGETS[kind];
  const outside: ChartOddity[] = [];
  cells.forEach((line, row) =>
    line.forEach((cell, column) => {
      if (cell !== null && !isUsual(cell, unit, range)) outside.push({ code: 'unusual', part: 'cells', row, column });
    }),
  );
  if (outside.length === 0) return [];
  const likelyUnit = unitOfUsual(cells.flat().filter(isPrinted), unit, range);
  return likelyUnit === undefined ? outside : [{ code: 'unit-slip', part: 'cells', likelyUnit }];
}

const isPrinted = (cell: number | null | undefined): cell is number => cell != null;

const isUsual = (value: number, unit: ChartUnit, { low, high }: Usual): boolean => {
  const si = printedToSi(value, unit);
  return si >= low && si <= high;
};

/** Another unit in which all the figures would be usual. */
const unitOfUsual = (values: readonly number[], unit: ChartUnit, range: Usual): ChartUnit | undefined =>
  CHART_UNITS[dimensionOfChartUnit(unit)].units.find(
    (other) => other !== unit && values.every((value) => isUsual(value, other, range)),
  );

function shapeOddities(chart: MakersChartInput): readonly ChartOddity[] {
  const { trend } = MAKERS_CHART_FACTS[chart.kind];
  const step = printedStep(chart);
  const down = transposed(chart.cells);
  const odd = new Map<string, ChartOddity>();
  const add = (oddity: ChartOddity): void => {
    odd.set(`${oddity.code} ${oddity.part} ${oddity.row} ${oddity.column}`, oddity);
  };
  const inLine = (line: readonly (number | null)[], place: (at: number) => { row: number; column: number }): void =>
    line.forEach((cell, at) => {
      const [before, after] = [line[at - 1], line[at + 1]];
      if (!isPrinted(before) || !isPrinted(after)) return;
      if (cell === null) add({ code: 'hole', part: 'cells', ...place(at) });
      else if (isSpike(before, cell, after, step)) add({ code: 'against-neighbours', part: 'cells', ...place(at) });
    });
  down.forEach((line, column) => inLine(line, (row) => ({ row, column })));
  chart.cells.forEach((line, row) => inLine(line, (column) => ({ row, column })));
  wrongWays(down, trend.rows).forEach((column) => add({ code: 'wrong-way', part: 'cells', column }));
  wrongWays(chart.cells, trend.columns).forEach((row) => add({ code: 'wrong-way', part: 'cells', row }));
  return [...odd.values()];
}

/** Outside both neighbours by more than they differ from each other, and by more than a rounding can make. */
function isSpike(before: number, cell: number, after: number, step: number): boolean {
  const beyond = Math.max(Math.min(before, after) - cell, cell - Math.max(before, after));
  return beyond > Math.max(Math.abs(after - before), 2 * step);
}

/** Lines that go the other way than most of them; where all agree, and there is a known way, those that go against it. */
function wrongWays(lines: readonly (readonly (number | null)[])[], known: ChartTrend | null): readonly number[] {
  const ways = lines.map(wayOf);
  const rising = ways.filter((way) => way === 'rises').length;
  const falling = ways.filter((way) => way === 'falls').length;
  const common = rising === falling ? null : rising > falling ? 'rises' : 'falls';
  const expected = known ?? (rising + falling >= LEAST_LINES ? common : null);
  return ways.flatMap((way, line) => (way !== null && expected !== null && way !== expected ? [line] : []));
}

/** From the first to the last printed cell of a line. */
function wayOf(line: readonly (number | null)[]): ChartTrend | null {
  const printed = line.filter(isPrinted);
  const change = (printed.at(-1) ?? 0) - (printed[0] ?? 0);
  return change === 0 ? null : change > 0 ? 'rises' : 'falls';
}

function transposed(cells: MakersChartInput['cells']): (number | null)[][] {
  const width = Math.max(0, ...cells.map(({ length }) => length));
  return Array.from({ length: width }, (_, column) => cells.map((row) => row[column] ?? null));
}
