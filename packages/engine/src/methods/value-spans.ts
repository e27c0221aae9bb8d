/** Where a grid has values along a line: what would have to change for a target to exist. */
import type { Corners, Grid } from './grid';
import { cornersOf, interpolate, locate } from './grid';

/** A closed interval of an axis, in its printed unit. */
export interface Span {
  readonly low: number;
  readonly high: number;
}

const transposed = ({ rows, columns, cells }: Grid): Grid => ({
  rows: columns,
  columns: rows,
  cells: columns.map((_, column) => rows.map((__, row) => cells[row]?.[column] ?? null)),
});

/** Spans of the rows that have a value of at least `least` at this column: ascending, apart from each other. None beyond the columns. */
export function rowSpans(grid: Grid, column: number, least = -Infinity): readonly Span[] {
  const at = locate(grid.columns, column);
  if (at === null) return [];
  const spans: Span[] = [];
  for (let row = 0; row < grid.rows.length - 1; row++) {
    const low = grid.rows[row]!;
    const height = grid.rows[row + 1]! - low;
    for (const part of partsOfCell(cornersOf(grid, row, at.index), at.fraction, least)) {
      const span = { low: low + part.low * height, high: low + part.high * height };
      const last = spans.at(-1);
      if (last !== undefined && span.low - last.high <= TOUCH * height) {
        spans[spans.length - 1] = { low: last.low, high: span.high };
      } else spans.push(span);
    }
  }
  return spans;
}

/** `rowSpans` of the columns, at a row. */
export const columnSpans = (grid: Grid, row: number, least = -Infinity): readonly Span[] =>
  rowSpans(transposed(grid), row, least);

/** Parts of a cell nearer than this join. */
const TOUCH = 1e-9;

/** Between the rows of a cell and the edges that a dash cuts, the value is linear along a column. */
function partsOfCell(corners: Corners, columnFraction: number, least: number): readonly Span[] {
  const edges = [0, columnFraction, 1 - columnFraction, 1].sort((a, b) => a - b);
  return edges.slice(1).flatMap((to, i) => {
    const from = edges[i]!;
    if (to - from <= TOUCH) return [];
    const third = (to - from) / 3;
    const atThird = interpolate(corners, from + third, columnFraction);
    const atTwoThirds = interpolate(corners, to - third, columnFraction);
    if (atThird === null || atTwoThirds === null) return [];
    const perPart = (atTwoThirds - atThird) / third;
    return clipped({ low: from, high: to }, atThird - perPart * third, perPart, least);
  });
}

/** The part of a span where `atLow + perPart × (x − low)` is at least `least`. */
function clipped({ low, high }: Span, atLow: number, perPart: number, least: number): readonly Span[] {
  const atHigh = atLow + perPart * (high - low);
  if (atLow >= least && atHigh >= least) return [{ low, high }];
  if (atLow < least && atHigh < least) return [];
  const crossing = low + (least - atLow) / perPart;
  return [atLow >= least ? { low, high: crossing } : { low: crossing, high }];
}
