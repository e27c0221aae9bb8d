import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gridOfChart } from './chart';
import { SUPERHEAT_CHART_A } from './data/superheat-chart-a';
import type { Grid } from './grid';
import { gridValue } from './grid';
import { columnSpans, rowSpans } from './value-spans';

const CUT: Grid = {
  rows: [85, 95, 105],
  columns: [57, 63, 67],
  cells: [
    [10, 14, 18],
    [6, 10, 14],
    [null, 5, 9],
  ],
};

describe('the rows that have a value', () => {
  it('reach to the edge that a dash cuts', () => {
    // half way between 57 and 63, the triangle ends half way between 95 and 105
    expect(rowSpans(CUT, 60)).toEqual([{ low: 85, high: 100 }]);
    expect(rowSpans(CUT, 57)).toEqual([{ low: 85, high: 95 }]);
    expect(rowSpans(CUT, 65)).toEqual([{ low: 85, high: 105 }]);
    expect(columnSpans(CUT, 100)).toEqual([{ low: 60, high: 67 }]);
  });

  it('and have enough of it', () => {
    // 14 at 85, 10 at 95, 5 at 105
    expect(rowSpans(CUT, 63, 12)).toEqual([{ low: 85, high: 90 }]);
    expect(rowSpans(CUT, 63, 15)).toEqual([]);
    expect(columnSpans(CUT, 95, 8)).toEqual([{ low: 60, high: 67 }]);
  });

  it('are none beyond the columns', () => {
    expect(rowSpans(CUT, 56)).toEqual([]);
    expect(rowSpans(CUT, 68)).toEqual([]);
  });

  it('are apart where dashes lie between', () => {
    const gap: Grid = {
      rows: [1, 2, 3, 4],
      columns: [0, 1],
      cells: [
        [5, 5],
        [5, 5],
        [null, null],
        [7, 7],
      ],
    };
    expect(rowSpans(gap, 0.5)).toEqual([{ low: 1, high: 2 }]);
    expect(rowSpans({ ...gap, rows: [1, 2, 3, 4, 5], cells: [...gap.cells, [7, 7]] }, 0.5)).toEqual([
      { low: 1, high: 2 },
      { low: 4, high: 5 },
    ]);
  });

  it('are those where the printed chart answers, and no others', () => {
    const grid = gridOfChart(SUPERHEAT_CHART_A);
    const [from, to] = [grid.columns[0]!, grid.columns.at(-1)!];
    const column = fc.double({ min: from, max: to, noNaN: true });
    const row = fc.double({ min: grid.rows[0]!, max: grid.rows.at(-1)!, noNaN: true });
    fc.assert(
      fc.property(column, row, fc.integer({ min: -5, max: 30 }), (c, r, least) => {
        const value = gridValue(grid, r, c);
        const spans = rowSpans(grid, c, least);
        const distance = Math.min(
          ...spans.flatMap(({ low, high }) => [Math.abs(r - low), Math.abs(r - high)]),
          Infinity,
        );
        fc.pre(distance > 1e-6);
        expect(spans.some(({ low, high }) => low <= r && r <= high)).toBe(typeof value === 'number' && value >= least);
      }),
      { numRuns: 2_000 },
    );
  });
});
