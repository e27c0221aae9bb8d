/** A maker's table under the hand: new, longer, shorter, one place changed. Pure. */
import { CHART_UNITS, DIMENSION_OF_CONDITION, MAKERS_CHART_FACTS } from '@chargewright/engine';
import type { ChartUnit, MakersChartKind } from '@chargewright/engine';
import type { UnitSystem } from '@chargewright/wording';
import type { TypedAxis, TypedChart } from '../loose-checks/check-draft';

/** An empty table of a kind, two rows high, in the units the person works in. */
export function emptyChart(kind: MakersChartKind, system: UnitSystem): TypedChart {
  const { rows, columns, cells } = MAKERS_CHART_FACTS[kind];
  const usual = (dimension: keyof typeof CHART_UNITS): ChartUnit => CHART_UNITS[dimension].usual[system];
  const axis = (unit: ChartUnit): TypedAxis => ({ unit, values: ['', ''] });
  const width = columns === null ? 1 : 2;
  return {
    kind,
    rows: axis(usual(DIMENSION_OF_CONDITION[rows])),
    ...(columns !== null && { columns: axis(usual(DIMENSION_OF_CONDITION[columns])) }),
    unit: usual(cells),
    cells: Array.from({ length: 2 }, () => Array.from({ length: width }, () => '')),
  };
}

/** One figure in place of a table, or back to a table of two rows. */
export function withOneFigure(chart: TypedChart, system: UnitSystem): TypedChart {
  const { rows: _, columns: __, ...rest } = chart;
  return { ...rest, cells: [[chart.cells[0]?.[0] ?? '']], unit: chart.unit || emptyChart(chart.kind, system).unit };
}

export const widthOf = ({ columns, cells }: TypedChart): number => columns?.values.length ?? cells[0]?.length ?? 1;

export function withRow(chart: TypedChart): TypedChart {
  if (!chart.rows) return chart;
  const blank = Array.from({ length: widthOf(chart) }, () => '');
  return {
    ...chart,
    rows: { ...chart.rows, values: [...chart.rows.values, ''] },
    cells: [...chart.cells, blank],
  };
}

export function withoutRow(chart: TypedChart, row: number): TypedChart {
  if (!chart.rows) return chart;
  return {
    ...chart,
    rows: { ...chart.rows, values: chart.rows.values.filter((_, at) => at !== row) },
    cells: chart.cells.filter((_, at) => at !== row),
  };
}

export function withColumn(chart: TypedChart): TypedChart {
  if (!chart.columns) return chart;
  return {
    ...chart,
    columns: { ...chart.columns, values: [...chart.columns.values, ''] },
    cells: chart.cells.map((line) => [...line, '']),
  };
}

export function withoutColumn(chart: TypedChart, column: number): TypedChart {
  if (!chart.columns) return chart;
  return {
    ...chart,
    columns: { ...chart.columns, values: chart.columns.values.filter((_, at) => at !== column) },
    cells: chart.cells.map((line) => line.filter((_, at) => at !== column)),
  };
}

const replaced = (texts: readonly string[], at: number, text: string): readonly string[] =>
  texts.map((each, index) => (index === at ? text : each));

export const withCell = (chart: TypedChart, row: number, column: number, text: string): TypedChart => ({
  ...chart,
  cells: chart.cells.map((line, index) => (index === row ? replaced(line, column, text) : line)),
});

export function withAxisValue(chart: TypedChart, axis: 'rows' | 'columns', at: number, text: string): TypedChart {
  const old = chart[axis];
  return old ? { ...chart, [axis]: { ...old, values: replaced(old.values, at, text) } } : chart;
}
