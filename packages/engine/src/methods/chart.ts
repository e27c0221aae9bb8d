/**
 * A printed chart over two temperatures: bilinear between its cells, with its dashes honoured.
 * The axes are kept in the printed °F, so that a printed point comes back exactly; callers pass and get kelvin.
 */
import { EngineError } from '../errors';
import { differenceToK, temperatureFromK } from '../units';

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

/** A corner counts only above this weight: 95 °F comes back from kelvin as 95.000 000 000 000 06. */
export const LEAST_WEIGHT = 1e-9;

/** Corners of one cell of the grid, low or high row (`0`, `1`) by low or high column. */
export interface Corners {
  readonly c00: number | null;
  readonly c01: number | null;
  readonly c10: number | null;
  readonly c11: number | null;
}

export const cornersOf = (chart: Chart, row: number, column: number): Corners => ({
  c00: cell(chart, row, column),
  c01: cell(chart, row, column + 1),
  c10: cell(chart, row + 1, column),
  c11: cell(chart, row + 1, column + 1),
});

const cell = (chart: Chart, row: number, column: number): number | null => chart.cellsF[row]?.[column] ?? null;

interface Position {
  readonly index: number;
  readonly fraction: number;
}

/**
 * Value of the chart as a difference in K, at a row and a column temperature in K. Bilinear among four printed corners; with three, the plane
 * through them inside their triangle. Throws `EngineError` `out-of-range`: reason `outside-chart` beyond its rows or columns, `dash` where no value stands.
 */
export function chartValueK(chart: Chart, at: { readonly rowK: number; readonly columnK: number }): number {
  const row = locate(chart, chart.rowsF, at.rowK);
  const column = locate(chart, chart.columnsF, at.columnK);
  const value = interpolate(cornersOf(chart, row.index, column.index), row.fraction, column.fraction);
  if (value === null) throw noValue(chart, 'dash', at.columnK);
  return differenceToK(value, 'deltaF');
}

/** Bilinear value in a cell, or `null` where the dashes leave none. */
export function interpolate(corners: Corners, rowFraction: number, columnFraction: number): number | null {
  const weights: readonly (readonly [value: number | null, weight: number])[] = [
    [corners.c00, (1 - rowFraction) * (1 - columnFraction)],
    [corners.c01, (1 - rowFraction) * columnFraction],
    [corners.c10, rowFraction * (1 - columnFraction)],
    [corners.c11, rowFraction * columnFraction],
  ];
  let sum = 0;
  for (const [value, weight] of weights) {
    if (weight <= LEAST_WEIGHT) continue;
    if (value === null) return planeOfThree(corners, rowFraction, columnFraction);
    sum += weight * value;
  }
  return sum;
}

/** The plane through three printed corners, inside their triangle; `null` outside it or with fewer than three. */
function planeOfThree({ c00, c01, c10, c11 }: Corners, r: number, c: number): number | null {
  if (c00 === null)
    return c01 === null || c10 === null || c11 === null ? null : inTriangle(c11, c01, c10, 1 - r, 1 - c);
  if (c11 === null) return c01 === null || c10 === null ? null : inTriangle(c00, c10, c01, r, c);
  if (c01 === null) return c10 === null ? null : inTriangle(c10, c00, c11, 1 - r, c);
  return inTriangle(c01, c11, c00, r, 1 - c);
}

/** Right-angled triangle: value at the corner and one step along each side, at the distances `along` and `across` from that corner. */
function inTriangle(corner: number, alongEnd: number, acrossEnd: number, along: number, across: number): number | null {
  if (along + across > 1 + LEAST_WEIGHT) return null;
  return corner + along * (alongEnd - corner) + across * (acrossEnd - corner);
}

function locate(chart: Chart, axisF: readonly number[], kelvin: number): Position {
  const x = temperatureFromK(kelvin, 'degF');
  const last = axisF.length - 1;
  if (!(x >= axisF[0]! - LEAST_WEIGHT && x <= axisF[last]! + LEAST_WEIGHT))
    throw noValue(chart, 'outside-chart', kelvin);
  let index = 0;
  while (index < last - 1 && x >= axisF[index + 1]!) index++;
  const low = axisF[index]!;
  const fraction = (x - low) / (axisF[index + 1]! - low);
  return { index, fraction: Math.min(Math.max(fraction, 0), 1) };
}

function noValue(chart: Chart, reason: 'dash' | 'outside-chart', value: number): EngineError {
  return new EngineError('out-of-range', { quantity: chart.id, value, reason, source: chart.source });
}
