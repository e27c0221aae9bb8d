/**
 * How probable it is that a chart has no target at the true conditions, given how well they are known: near a dash a reading that is off by a
 * degree stands on the other side.
 */
import { standardNormalCdf } from '../numerics/normal-distribution';
import { temperatureFromK } from '../units';
import type { Chart } from './chart';
import { gridOfChart } from './chart';
import type { Corners, Grid } from './grid';
import { cornersOf } from './grid';

/** A coordinate of a grid, in its printed unit, with its standard uncertainty. */
export interface Normal {
  readonly mean: number;
  readonly u: number;
}

/** Beyond this many standard uncertainties lies less than 6e-7 of the probability. */
const REACH = 5;
/** Integration panels of at most this many standard uncertainties: the 3-point rule is then good to 1e-4. */
const PANEL = 0.75;
const GAUSS_3: readonly (readonly [x: number, weight: number])[] = [
  [-Math.sqrt(0.6), 5 / 9],
  [0, 8 / 9],
  [Math.sqrt(0.6), 5 / 9],
];

/** A standard uncertainty that stands for an exactly known coordinate, in °F or any other printed unit of an axis. */
const EXACT = 1e-7;

/** `probabilityOfNoValue` of a chart, at temperatures with standard uncertainties in K. */
export const probabilityOfNoTarget = (
  chart: Chart,
  at: { readonly rowK: number; readonly rowUK: number; readonly columnK: number; readonly columnUK: number },
): number =>
  probabilityOfNoValue(
    gridOfChart(chart),
    { mean: temperatureFromK(at.rowK, 'degF'), u: 1.8 * at.rowUK },
    { mean: temperatureFromK(at.columnK, 'degF'), u: 1.8 * at.columnUK },
  );

/**
 * Probability in [0, 1] that the grid has no value at the true row and column, both taken as independent normal variables
 * (JCGM 106:2012, 7.2, over two variables). Integrated row by row; exact along the columns.
 */
export function probabilityOfNoValue(grid: Grid, atRow: Normal, atColumn: Normal): number {
  if (atRow.u === 0 && atColumn.u === 0) return 0;
  const row: Normal = { mean: atRow.mean, u: Math.max(atRow.u, EXACT) };
  const column: Normal = { mean: atColumn.mean, u: Math.max(atColumn.u, EXACT) };
  if (allPrintedWithinReach(grid, row, column)) return 0;
  const cdfAtColumns = grid.columns.map((c) => standardNormalCdf((c - column.mean) / column.u));
  let exists = 0;
  for (let r = 0; r < grid.rows.length - 1; r++) {
    const low = grid.rows[r]!;
    const height = grid.rows[r + 1]! - low;
    const from = Math.max(low, row.mean - REACH * row.u);
    const to = Math.min(low + height, row.mean + REACH * row.u);
    if (to <= from) continue;
    const cells = cellsInRow(grid, r, cdfAtColumns);
    const panels = Math.ceil((to - from) / (PANEL * row.u));
    const half = (0.5 * (to - from)) / panels;
    for (let p = 0; p < panels; p++) {
      const middle = from + (2 * p + 1) * half;
      for (const [x, weight] of GAUSS_3) {
        const at = middle + half * x;
        const z = (at - row.mean) / row.u;
        const density = Math.exp(-0.5 * z * z) / (Math.sqrt(2 * Math.PI) * row.u);
        exists += half * weight * density * probabilityInRow(cells, (at - low) / height, column);
      }
    }
  }
  return Math.min(Math.max(1 - exists, 0), 1);
}

/** The cells of a row that the column temperature can reach: those printed in full, as one probability, and those cut by a dash. */
interface CellsInRow {
  readonly printed: number;
  readonly cut: readonly CutCell[];
}

interface CutCell {
  readonly corners: Corners;
  readonly low: number;
  readonly width: number;
  readonly cdfLow: number;
  readonly cdfHigh: number;
}

function cellsInRow(grid: Grid, row: number, cdfAtColumns: readonly number[]): CellsInRow {
  const cut: CutCell[] = [];
  let printed = 0;
  for (let c = 0; c < grid.columns.length - 1; c++) {
    const cdfLow = cdfAtColumns[c]!;
    const cdfHigh = cdfAtColumns[c + 1]!;
    if (cdfHigh - cdfLow < 1e-9) continue;
    const corners = cornersOf(grid, row, c);
    const dashes = numberOfDashes(corners);
    if (dashes === 0) printed += cdfHigh - cdfLow;
    if (dashes !== 1) continue;
    const low = grid.columns[c]!;
    cut.push({ corners, low, width: grid.columns[c + 1]! - low, cdfLow, cdfHigh });
  }
  return { printed, cut };
}

const numberOfDashes = ({ c00, c01, c10, c11 }: Corners): number =>
  Number(c00 === null) + Number(c01 === null) + Number(c10 === null) + Number(c11 === null);

/** Probability over the column temperature that a value stands at this height of a row of cells. */
function probabilityInRow({ printed, cut }: CellsInRow, fraction: number, column: Normal): number {
  let sum = printed;
  for (const { corners, low, width, cdfLow, cdfHigh } of cut) {
    const [from, to] = printedPart(corners, fraction);
    if (to <= from) continue;
    const cdf = (part: number): number => standardNormalCdf((low + part * width - column.mean) / column.u);
    sum += (to === 1 ? cdfHigh : cdf(to)) - (from === 0 ? cdfLow : cdf(from));
  }
  return sum;
}

/** The part of a cell's width where a value stands at row fraction `r` when one corner is a dash: one side of the triangle's edge. */
function printedPart({ c00, c01, c11 }: Corners, r: number): readonly [from: number, to: number] {
  if (c00 === null) return [1 - r, 1];
  if (c11 === null) return [0, 1 - r];
  if (c01 === null) return [0, r];
  return [r, 1];
}

function allPrintedWithinReach(grid: Grid, row: Normal, column: Normal): boolean {
  const within = (axis: readonly number[], { mean, u }: Normal): boolean =>
    mean - REACH * u >= axis[0]! && mean + REACH * u <= axis[axis.length - 1]!;
  if (!within(grid.rows, row) || !within(grid.columns, column)) return false;
  const touches = (axis: readonly number[], i: number, { mean, u }: Normal): boolean =>
    axis[i + 1]! >= mean - REACH * u && axis[i]! <= mean + REACH * u;
  for (let r = 0; r < grid.rows.length - 1; r++) {
    if (!touches(grid.rows, r, row)) continue;
    for (let c = 0; c < grid.columns.length - 1; c++) {
      if (!touches(grid.columns, c, column)) continue;
      if (numberOfDashes(cornersOf(grid, r, c)) > 0) return false;
    }
  }
  return true;
}
