/** What would make a check verifiable: the conditions at which its chart has a target. */
import { isKnown } from '../../derivation/quantity';
import { gridOfChart } from '../../methods/chart';
import type { Grid } from '../../methods/grid';
import type { ChartUnit } from '../../methods/makers-chart/chart-units';
import type { ChartCondition } from '../../methods/makers-chart/kinds';
import { MAKERS_CHART_FACTS } from '../../methods/makers-chart/kinds';
import { isGrid, ONE_COLUMN } from '../../methods/makers-chart/makers-table';
import { printedFromSi, printedToSi } from '../../methods/makers-chart/printed-values';
import type { Span } from '../../methods/value-spans';
import { columnSpans, rowSpans } from '../../methods/value-spans';
import type { AwaitedCondition, TargetRange } from '../codes';
import { chartCondition, SUPERHEAT_CHARTS } from '../criteria/charge-target';
import { leastOutdoorK, mostOutdoorK } from '../criteria/conditions';
import type { Evidence } from './facts';

interface Axis {
  readonly condition: AwaitedCondition;
  readonly unit: ChartUnit;
}

interface Table {
  readonly grid: Grid;
  readonly rows: Axis;
  readonly columns: Axis | null;
  readonly cellUnit: ChartUnit;
}

/**
 * One range for each condition that can be awaited, at the present value of the other, within the outdoor limits of the test: the nearest to
 * the present value, in SI. `leastK`: the target must be at least this difference. Empty without a chart, or where nothing but both together helps.
 */
export function targetRanges(evidence: Evidence, leastK?: number): readonly TargetRange[] {
  const table = tableOf(evidence);
  if (table === null) return [];
  const { grid, rows, columns, cellUnit } = table;
  const least = leastK === undefined ? undefined : printedFromSi(leastK, cellUnit);
  const present = presentValues(evidence);
  const row = present(rows.condition);
  if (columns === null) {
    return row === null ? [] : nearest(evidence, rows, row, rowSpans(grid, ONE_COLUMN[0], least), null);
  }
  const column = present(columns.condition);
  if (row === null || column === null) return [];
  return [
    ...nearest(evidence, rows, row, rowSpans(grid, printedFromSi(column, columns.unit), least), {
      condition: columns.condition,
      valueK: column,
    }),
    ...nearest(evidence, columns, column, columnSpans(grid, printedFromSi(row, rows.unit), least), {
      condition: rows.condition,
      valueK: row,
    }),
  ];
}

function tableOf({ method, target }: Evidence): Table | null {
  const made = method?.chart?.table;
  if (made !== undefined) {
    if (!isGrid(made)) return null;
    const facts = MAKERS_CHART_FACTS[made.kind];
    if (!isAwaited(facts.rows)) return null;
    const rows: Axis = { condition: facts.rows, unit: made.rowUnit };
    if (facts.columns === null || made.columnUnit === null) {
      return { grid: made.grid, rows, columns: null, cellUnit: made.cellUnit };
    }
    if (!isAwaited(facts.columns)) return null;
    return {
      grid: made.grid,
      rows,
      columns: { condition: facts.columns, unit: made.columnUnit },
      cellUnit: made.cellUnit,
    };
  }
  if (target === null || target.source === 'entered' || target.source === 'makers-data') return null;
  return {
    grid: gridOfChart(SUPERHEAT_CHARTS[target.source]),
    rows: { condition: 'outdoorDryBulb', unit: 'degF' },
    columns: { condition: 'returnWetBulb', unit: 'degF' },
    cellUnit: 'deltaF',
  };
}

const isAwaited = (condition: ChartCondition): condition is AwaitedCondition =>
  condition === 'outdoorDryBulb' || condition === 'returnWetBulb' || condition === 'returnDryBulb';

const presentValues =
  ({ input, derived }: Evidence) =>
  (condition: AwaitedCondition): number | null => {
    const quantity = chartCondition(input, derived)(condition);
    return isKnown(quantity) ? quantity.value : null;
  };

function nearest(
  { input, method }: Evidence,
  { condition, unit }: Axis,
  presentK: number,
  spans: readonly Span[],
  at: TargetRange['at'],
): readonly TargetRange[] {
  const outdoors = condition === 'outdoorDryBulb';
  const from = (outdoors ? leastOutdoorK(input, method) : undefined) ?? -Infinity;
  const to = (outdoors ? mostOutdoorK(input, method) : undefined) ?? Infinity;
  const ranges = spans
    .map(({ low, high }) => ({
      along: condition,
      lowK: Math.max(printedToSi(low, unit), from),
      highK: Math.min(printedToSi(high, unit), to),
      presentK,
      at,
    }))
    .filter(({ lowK, highK }) => highK > lowK)
    .sort((a, b) => distance(a) - distance(b));
  return ranges.slice(0, 1);
}

const distance = ({ lowK, highK, presentK }: TargetRange): number => Math.max(lowK - presentK, presentK - highK, 0);
