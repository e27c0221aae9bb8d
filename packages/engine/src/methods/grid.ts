/**
 * Numbers printed over two axes: bilinear between their cells, with their dashes honoured. A grid knows no units: axes and cells are as printed,
 * so that a printed point comes back exactly.
 */

export interface Grid {
  /** Ascending; so are the columns. */
  readonly rows: readonly number[];
  readonly columns: readonly number[];
  /** One row of cells for each of `rows`; `null` is a dash. */
  readonly cells: readonly (readonly (number | null)[])[];
}

/** Why a grid has no value at a point. */
export type NoGridValue = 'dash' | 'outside-rows' | 'outside-columns';

/** A corner counts only above this weight: 95 °F comes back from kelvin as 95.000 000 000 000 06. */
export const LEAST_WEIGHT = 1e-9;

/** Corners of one cell of the grid, low or high row (`0`, `1`) by low or high column. */
export interface Corners {
  readonly c00: number | null;
  readonly c01: number | null;
  readonly c10: number | null;
  readonly c11: number | null;
}

export const cornersOf = (grid: Grid, row: number, column: number): Corners => ({
  c00: cell(grid, row, column),
  c01: cell(grid, row, column + 1),
  c10: cell(grid, row + 1, column),
  c11: cell(grid, row + 1, column + 1),
});

const cell = (grid: Grid, row: number, column: number): number | null => grid.cells[row]?.[column] ?? null;

export interface GridPosition {
  readonly index: number;
  readonly fraction: number;
}

/** Value at a row and a column. Bilinear among four printed corners; with three, the plane through them inside their triangle. */
export function gridValue(grid: Grid, row: number, column: number): number | NoGridValue {
  const r = locate(grid.rows, row);
  if (r === null) return 'outside-rows';
  const c = locate(grid.columns, column);
  if (c === null) return 'outside-columns';
  return interpolate(cornersOf(grid, r.index, c.index), r.fraction, c.fraction) ?? 'dash';
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

/** The interval of an axis that holds a point, and how far into it; `null` beyond its ends. */
export function locate(axis: readonly number[], x: number): GridPosition | null {
  const last = axis.length - 1;
  if (!(x >= axis[0]! - LEAST_WEIGHT && x <= axis[last]! + LEAST_WEIGHT)) return null;
  let index = 0;
  while (index < last - 1 && x >= axis[index + 1]!) index++;
  const low = axis[index]!;
  const fraction = (x - low) / (axis[index + 1]! - low);
  return { index, fraction: Math.min(Math.max(fraction, 0), 1) };
}
