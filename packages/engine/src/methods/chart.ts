/**
 * A printed chart over two temperatures: bilinear between its cells, with its dashes honoured.
 * The axes are kept in the printed °F, so that a printed point comes back exactly; callers pass and get kelvin.
 */
import { EngineError } from '../errors';
import { differenceToK, temperatureFromK } from '../units';
import type { Grid } from './grid';
import { gridValue } from './grid';

export interface Chart {
  readonly id: 'makers-chart-a' | 'makers-chart-b' | 'finer-table' | 'split-table' | 'split-chart';
  readonly standing: 'read' | 'memory';
  readonly source: string;
  /** Half of the last printed digit, in °F. */
  readonly roundingF: number;
  readonly rowsF: readonly number[];
  readonly columnsF: readonly number[];
  /** `null` is a dash. */
  readonly cellsF: readonly (readonly (number | null)[])[];
}

export const gridOfChart = ({ rowsF, columnsF, cellsF }: Chart): Grid => ({
  rows: rowsF,
  columns: columnsF,
  cells: cellsF,
});

/**
 * Value of the chart as a difference in K, at a row and a column temperature in K. Bilinear among four printed corners; with three, the plane
 * through them inside their triangle. Throws `EngineError` `out-of-range`: reason `outside-chart` beyond its rows or columns, `dash` where no value stands.
 */
export function chartValueK(chart: Chart, at: { readonly rowK: number; readonly columnK: number }): number {
  const value = gridValue(gridOfChart(chart), temperatureFromK(at.rowK, 'degF'), temperatureFromK(at.columnK, 'degF'));
  if (typeof value === 'number') return differenceToK(value, 'deltaF');
  throw new EngineError('out-of-range', {
    quantity: chart.id,
    value: value === 'outside-rows' ? at.rowK : at.columnK,
    reason: value === 'dash' ? 'dash' : 'outside-chart',
    source: chart.source,
  });
}
