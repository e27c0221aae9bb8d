/** The picture of a maker's table: one line for each column over the rows, broken at dashes, so that a slip of the finger stands out. Pure. */
import type { MakersChartInput } from '@chargewright/engine';
import { scaleLinear } from 'd3-scale';
import { line } from 'd3-shape';

export interface PictureLine {
  readonly path: string;
  /** Where its name stands: at its last figure. */
  readonly end: { readonly x: number; readonly y: number };
  readonly name: string;
}

export interface PictureMark {
  readonly at: number;
  readonly text: string;
}

export interface ChartPicture {
  readonly width: number;
  readonly height: number;
  readonly lines: readonly PictureLine[];
  readonly points: readonly { readonly x: number; readonly y: number }[];
  readonly across: readonly PictureMark[];
  readonly up: readonly PictureMark[];
}

const WIDTH = 340;
const HEIGHT = 200;
const EDGE = { left: 40, right: 40, top: 12, bottom: 24 };

interface Point {
  readonly row: number;
  readonly value: number | null;
}

/** `null` where there is no axis or no figure to draw. */
export function chartPicture({ rows, columns, cells }: MakersChartInput): ChartPicture | null {
  const values = cells.flat().filter((cell) => cell !== null);
  if (rows === undefined || rows.values.length < 2 || values.length === 0) return null;
  const x = scaleLinear([Math.min(...rows.values), Math.max(...rows.values)], [EDGE.left, WIDTH - EDGE.right]);
  const y = scaleLinear([Math.min(...values), Math.max(...values)], [HEIGHT - EDGE.bottom, EDGE.top]).nice(4);
  const draw = line<Point>()
    .defined(({ value }) => value !== null)
    .x(({ row }) => x(row))
    .y(({ value }) => y(value ?? 0));
  const width = columns?.values.length ?? 1;
  const lines = Array.from({ length: width }, (_, column): PictureLine => {
    const points = rows.values.map((row, at): Point => ({ row, value: cells[at]?.[column] ?? null }));
    const last = points.findLast(({ value }) => value !== null);
    return {
      path: draw(points) ?? '',
      end: { x: x(last?.row ?? 0), y: y(last?.value ?? 0) },
      name: last === undefined ? '' : String(columns?.values[column] ?? ''),
    };
  });
  const points = cells.flatMap((each, at) =>
    each.flatMap((cell) => (cell === null ? [] : [{ x: x(rows.values[at] ?? 0), y: y(cell) }])),
  );
  return {
    width: WIDTH,
    height: HEIGHT,
    lines,
    points,
    across: x.ticks(5).map((tick) => ({ at: x(tick), text: String(tick) })),
    up: y.ticks(4).map((tick) => ({ at: y(tick), text: String(tick) })),
  };
}
