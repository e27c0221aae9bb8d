import { describe, expect, it } from 'vitest';
import { EngineError } from '../errors';
import { differenceToK, temperatureToK } from '../units';
import type { Chart } from './chart';
import { chartValueK } from './chart';
import { SPLIT_TABLE } from './data/split-table';
import { SUPERHEAT_CHART_A } from './data/superheat-chart-a';
import { interpolate } from './grid';

const valueF = (chart: Chart, rowF: number, columnF: number): number =>
  (chartValueK(chart, { rowK: temperatureToK(rowF, 'degF'), columnK: temperatureToK(columnF, 'degF') }) * 9) / 5;

function reasonAt(chart: Chart, rowF: number, columnF: number): string {
  try {
    valueF(chart, rowF, columnF);
  } catch (error) {
    if (error instanceof EngineError) return error.details.reason;
    throw error;
  }
  return 'a value';
}

const corners = (c00: number | null, c01: number | null, c10: number | null, c11: number | null) => ({
  c00,
  c01,
  c10,
  c11,
});

describe.each([SUPERHEAT_CHART_A, SPLIT_TABLE])('$id', (chart) => {
  it('has a cell for every row and column, and axes that rise', () => {
    expect(chart.cellsF).toHaveLength(chart.rowsF.length);
    for (const row of chart.cellsF) expect(row).toHaveLength(chart.columnsF.length);
    for (const axis of [chart.rowsF, chart.columnsF]) expect([...axis].sort((a, b) => a - b)).toEqual(axis);
  });

  it('gives every printed cell back through kelvin, and refuses every dash', () => {
    chart.rowsF.forEach((rowF, r) => {
      chart.columnsF.forEach((columnF, c) => {
        const cell = chart.cellsF[r]![c]!;
        if (cell === null) expect(reasonAt(chart, rowF, columnF), `${rowF}/${columnF}`).toBe('dash');
        else expect(Math.abs(valueF(chart, rowF, columnF) - cell), `${rowF}/${columnF}`).toBeLessThan(1e-8);
      });
    });
  });

  it('refuses beyond its edges and not on them', () => {
    const [firstRow, lastRow] = [chart.rowsF[0]!, chart.rowsF.at(-1)!];
    const [firstColumn, lastColumn] = [chart.columnsF[0]!, chart.columnsF.at(-1)!];
    expect(reasonAt(chart, firstRow, firstColumn)).toBe('a value');
    expect(reasonAt(chart, lastRow, lastColumn)).toBe('a value');
    for (const [row, column] of [
      [firstRow - 1e-6, lastColumn],
      [lastRow + 1e-6, lastColumn],
      [firstRow, firstColumn - 1e-6],
      [lastRow, lastColumn + 1e-6],
      [Number.NaN, firstColumn],
    ] as const)
      expect(reasonAt(chart, row, column), `${row}/${column}`).toBe('outside-chart');
  });

  it('is continuous: a millionth of a degree changes a value by no more than its slope', () => {
    for (let k = 0; k < 200; k++) {
      // a low-discrepancy walk over the whole chart
      const rowF = chart.rowsF[0]! + ((k * 0.618034) % 1) * (chart.rowsF.at(-1)! - chart.rowsF[0]! - 1e-6);
      const columnF = chart.columnsF[0]! + ((k * 0.7548777) % 1) * (chart.columnsF.at(-1)! - chart.columnsF[0]! - 1e-6);
      if (reasonAt(chart, rowF, columnF) !== 'a value' || reasonAt(chart, rowF + 1e-6, columnF + 1e-6) !== 'a value')
        continue;
      expect(Math.abs(valueF(chart, rowF + 1e-6, columnF + 1e-6) - valueF(chart, rowF, columnF))).toBeLessThan(5e-6);
    }
  });
});

describe('between printed cells', () => {
  it('is bilinear: 82.5 °F outdoors and 67 °F wet bulb lie in the middle of 18, 21, 15 and 19', () => {
    expect(valueF(SUPERHEAT_CHART_A, 82.5, 67)).toBeCloseTo((18 + 21 + 15 + 19) / 4, 8);
  });

  it('weighs the four corners: a quarter along the rows, half along the columns', () => {
    expect(interpolate(corners(0, 10, 20, 40), 0.25, 0.5)).toBeCloseTo(0.75 * 5 + 0.25 * 30, 12);
  });

  it('reads 95 °F, which comes back from kelvin as 95.00000000000006, as the row of 95 °F though the next row has a dash', () => {
    // 95 °F / 64 °F prints 6, and 100 °F / 64 °F a dash
    expect(valueF(SUPERHEAT_CHART_A, 95, 64)).toBeCloseTo(6, 8);
  });
});

describe('dashes', () => {
  it('count only above a weight of 1e-9', () => {
    expect(interpolate(corners(6, 10, null, null), 1e-10, 0.5)).toBeCloseTo(8, 8);
    expect(interpolate(corners(6, 10, null, null), 1e-8, 0.5)).toBeNull();
  });

  // the plane r·10 + c·4 + 1 in each of the four triangles; the missing corner would lie on it too
  const plane = (r: number, c: number): number => 10 * r + 4 * c + 1;
  const [c00, c01, c10, c11] = [plane(0, 0), plane(0, 1), plane(1, 0), plane(1, 1)];
  it.each([
    ['low row, low column', corners(null, c01, c10, c11), [0.7, 0.6], [0.3, 0.4]],
    ['low row, high column', corners(c00, null, c10, c11), [0.7, 0.4], [0.3, 0.6]],
    ['high row, low column', corners(c00, c01, null, c11), [0.3, 0.6], [0.7, 0.4]],
    ['high row, high column', corners(c00, c01, c10, null), [0.3, 0.4], [0.7, 0.6]],
  ] as const)(
    'at one corner (%s) leave the plane of the other three inside their triangle',
    (_, cell, inside, outside) => {
      expect(interpolate(cell, inside[0], inside[1])).toBeCloseTo(plane(inside[0], inside[1]), 12);
      expect(interpolate(cell, outside[0], outside[1])).toBeNull();
    },
  );

  it('at one corner leave the edge of the triangle itself', () => {
    expect(interpolate(corners(null, c01, c10, c11), 0.5, 0.5)).toBeCloseTo(plane(0.5, 0.5), 12);
  });

  it('at two corners leave only the printed edge', () => {
    expect(interpolate(corners(null, 4, null, 8), 0.5, 1)).toBeCloseTo(6, 12);
    expect(interpolate(corners(null, 4, null, 8), 0.5, 0.99)).toBeNull();
    expect(interpolate(corners(3, null, null, 8), 0.5, 0.5)).toBeNull();
  });

  it('are met in the chart: beside 85 °F / 60 °F the triangle of 80/60, 80/62 and 85/62', () => {
    expect(valueF(SUPERHEAT_CHART_A, 82, 61.6)).toBeCloseTo(12 + 0.4 * (8 - 12) + 0.2 * (8 - 12), 8);
    expect(reasonAt(SUPERHEAT_CHART_A, 84, 60.6)).toBe('dash');
  });
});

it('gives the value as a difference in K', () => {
  const rowK = temperatureToK(85, 'degF');
  const columnK = temperatureToK(66, 'degF');
  expect(chartValueK(SUPERHEAT_CHART_A, { rowK, columnK })).toBeCloseTo(differenceToK(15, 'deltaF'), 10);
});
