/** What cannot be in a maker's table: its axes, the shape of its cells, units that belong to another quantity. */
import type { ChartDimension, ChartUnit } from '../../methods/makers-chart/chart-units';
import { CHART_UNITS } from '../../methods/makers-chart/chart-units';
import { DIMENSION_OF_CONDITION, MAKERS_CHART_FACTS } from '../../methods/makers-chart/kinds';
import type { ChartCondition, MakersChartKindFacts } from '../../methods/makers-chart/kinds';
import type { DifferenceUnit, PressureDifferenceUnit } from '../../units';
import { printedToSi } from '../../methods/makers-chart/printed-values';
import { PRESSURE_DIFFERENCE_UNITS, temperatureToK } from '../../units';
import type { Figure } from '../codes';
import type { ChartAxisInput, MakersChartInput, TemperatureAmount } from '../request';
import type { Faults } from '../value-faults';

/** A table of a unit is small; larger ones are a slip, or no table of a unit (choice). */
const MOST_LINES = 40;
const MOST_TABLES = 10;
/** An interpolation takes two. */
const LEAST_VALUES = 2;

const TOLERANCE_UNITS: Readonly<
  Record<ChartDimension, readonly (Exclude<DifferenceUnit, 'K'> | PressureDifferenceUnit)[]>
> = {
  temperature: ['deltaF', 'deltaC'],
  difference: ['deltaF', 'deltaC'],
  pressure: PRESSURE_DIFFERENCE_UNITS,
};

const count = (value: number): Figure => ({ kind: 'count', value });

/** Tables whose own shape was at fault are left out by the contract, with their place kept. */
export interface ChartsInput {
  readonly makersChart?: MakersChartInput;
  readonly makersCharts?: readonly (MakersChartInput | undefined)[];
}

/** Every table of a setup with its path. */
export const chartsWithPaths = ({
  makersChart,
  makersCharts = [],
}: ChartsInput): readonly (readonly [path: string, chart: MakersChartInput])[] =>
  [
    ['setup.makersChart', makersChart] as const,
    ...makersCharts.map((chart, at) => [`setup.makersCharts.${at}`, chart] as const),
  ].flatMap(([path, chart]) => (chart === undefined ? [] : [[path, chart] as const]));

export function checkMakersCharts(faults: Faults, setup: ChartsInput): void {
  const charts = chartsWithPaths(setup);
  if (charts.length > MOST_TABLES) {
    faults.add('setup.makersCharts', { code: 'too-many-tables', figures: { most: count(MOST_TABLES) } });
  }
  const seen = new Set<string>();
  for (const [path, chart] of charts) {
    const name = `${chart.kind} ${chart.port ?? MAKERS_CHART_FACTS[chart.kind].ports[0]}`;
    if (seen.has(name)) faults.add(path, { code: 'table-given-twice', figures: {} });
    seen.add(name);
    checkChart(faults, path, chart);
  }
}

function checkChart(faults: Faults, path: string, chart: MakersChartInput): void {
  const facts = MAKERS_CHART_FACTS[chart.kind];
  if (chart.port !== undefined && !facts.ports.includes(chart.port)) {
    faults.add(`${path}.port`, { code: 'port-does-not-fit', figures: {} });
  }
  checkAxes(faults, path, chart, facts);
  checkCells(faults, path, chart, facts.cells);
  const { resolution, tolerance } = chart;
  if (resolution !== undefined) faults.positive(`${path}.resolution`, { value: resolution, unit: chart.unit });
  if (tolerance !== undefined) {
    faults.positive(`${path}.tolerance`, tolerance);
    if (!TOLERANCE_UNITS[facts.cells].includes(tolerance.unit)) {
      faults.add(`${path}.tolerance`, { code: 'wrong-unit', figures: {} });
    }
  }
  checkLimits(faults, `${path}.leastOutdoor`, chart.leastOutdoor, chart.mostOutdoor);
  checkLimits(faults, `${path}.leastReturn`, chart.leastReturn, chart.mostReturn);
}

function checkAxes(
  faults: Faults,
  path: string,
  { rows, columns }: MakersChartInput,
  facts: MakersChartKindFacts,
): void {
  if (rows !== undefined) checkAxis(faults, `${path}.rows`, rows, facts.rows);
  if (columns !== undefined && (facts.columns === null || rows === undefined)) {
    faults.add(`${path}.columns`, { code: 'axis-not-used', figures: {} });
  } else if (columns !== undefined && facts.columns !== null) {
    checkAxis(faults, `${path}.columns`, columns, facts.columns);
  } else if (facts.columns !== null && rows !== undefined) {
    faults.add(`${path}.columns`, { code: 'axis-missing', figures: {} });
  }
}

function checkAxis(faults: Faults, path: string, { unit, values }: ChartAxisInput, condition: ChartCondition): void {
  const fits = checkUnit(faults, path, unit, DIMENSION_OF_CONDITION[condition]);
  if (values.length < LEAST_VALUES) {
    faults.add(path, { code: 'axis-too-short', figures: { least: count(LEAST_VALUES) } });
  }
  if (values.length > MOST_LINES) faults.add(path, { code: 'table-too-large', figures: { most: count(MOST_LINES) } });
  if (!values.every((value, at) => checkFigure(faults, `${path}.values.${at}`, value, fits ? unit : null))) return;
  const at = values.findIndex((value, place) => place > 0 && value <= values[place - 1]!);
  if (at > 0) faults.add(path, { code: 'axis-not-ascending', figures: { place: count(at + 1) } });
}

function checkCells(faults: Faults, path: string, chart: MakersChartInput, dimension: ChartDimension): void {
  const { rows, columns, cells, unit } = chart;
  const at = `${path}.cells`;
  const fits = checkUnit(faults, `${path}.unit`, unit, dimension);
  const height = rows?.values.length ?? 1;
  if (height > MOST_LINES || (columns?.values.length ?? 1) > MOST_LINES) return;
  const width = rows === undefined ? 1 : (columns?.values.length ?? 1);
  if (cells.length !== height) {
    const figures = { given: count(cells.length), wanted: count(height) };
    faults.add(at, { code: 'wrong-number-of-rows', figures });
  }
  cells.forEach((line, row) => {
    if (line.length !== width) {
      const figures = { row: count(row + 1), given: count(line.length), wanted: count(width) };
      faults.add(at, { code: 'wrong-length-of-row', figures });
    }
    // one of a row is enough to find the slip, and keeps the answer to a table of nonsense short
    line.every(
      (cell, column) => cell === null || checkFigure(faults, `${at}.${row}.${column}`, cell, fits ? unit : null),
    );
  });
  if (cells.flat().every((cell) => cell === null)) faults.add(at, { code: 'no-cell-printed', figures: {} });
}

function checkUnit(faults: Faults, path: string, unit: ChartUnit, dimension: ChartDimension): boolean {
  if (CHART_UNITS[dimension].units.includes(unit)) return true;
  faults.add(path, { code: 'wrong-unit', figures: {} });
  return false;
}

/**
 * A figure of an axis or of a cell: whether it can be. A difference is a target, and a target is not negative. `null`: in a unit that does not
 * belong there.
 */
function checkFigure(faults: Faults, path: string, value: number, unit: ChartUnit | null): boolean {
  const before = faults.list.length;
  if (!faults.finite(path, value)) return false;
  switch (unit) {
    case null:
      break;
    case 'degF':
    case 'degC':
      faults.temperature(path, { value, unit });
      break;
    case 'deltaF':
    case 'deltaC':
      faults.notNegative(path, value);
      break;
    case 'psig':
    case 'psia':
    case 'kPag':
    case 'kPaa':
    case 'barg':
    case 'bara':
      if (printedToSi(value, unit) <= 0) faults.add(path, { code: 'not-above-vacuum', figures: {} });
      break;
  }
  return faults.list.length === before;
}

function checkLimits(
  faults: Faults,
  path: string,
  least: TemperatureAmount | undefined,
  most: TemperatureAmount | undefined,
): void {
  if (least !== undefined) faults.temperature(path, least);
  if (most !== undefined) faults.temperature(path.replace('.least', '.most'), most);
  if (least === undefined || most === undefined) return;
  if (temperatureToK(least.value, least.unit) > temperatureToK(most.value, most.unit)) {
    faults.add(path, { code: 'low-above-high', figures: {} });
  }
}
