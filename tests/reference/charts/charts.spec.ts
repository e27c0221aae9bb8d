/** The charts the engine judges by, laid beside the transcriptions they were typed from: the rows keep their provenance in the files. */
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import type { Chart } from '../../../packages/engine/src/methods/chart';
import { chartValueK } from '../../../packages/engine/src/methods/chart';
import { SPLIT_TABLE } from '../../../packages/engine/src/methods/data/split-table';
import { SPLIT_CHART } from '../../../packages/engine/src/methods/data/split-chart';
import { SUPERHEAT_CHART_A } from '../../../packages/engine/src/methods/data/superheat-chart-a';
import { SUPERHEAT_CHART_B } from '../../../packages/engine/src/methods/data/superheat-chart-b';
import { SUPERHEAT_TABLE_FINER } from '../../../packages/engine/src/methods/data/superheat-table-finer';
import { temperatureToK } from '../../../packages/engine/src/units';

interface PrintedChart {
  readonly rowsF: readonly number[];
  readonly columnsF: readonly number[];
  readonly cellsF: readonly (readonly (number | null)[])[];
}

/** A transcription; `copy` picks the rows that start with it. */
function printed(name: string, copy?: string): PrintedChart {
  const text = readFileSync(new URL(name, import.meta.url), 'utf8');
  const [header = '', ...lines] = text.split('\n').filter((line) => line !== '' && !line.startsWith('#'));
  const rows = lines.map((line) => line.split(',')).filter(([first]) => copy === undefined || first === copy);
  const skip = copy === undefined ? 0 : 1;
  return {
    columnsF: header
      .split(',')
      .slice(skip + 1)
      .map((column) => number(column.replace('wb', ''))),
    rowsF: rows.map((row) => number(row[skip])),
    cellsF: rows.map((row) => row.slice(skip + 1).map((cell) => (cell === '-' ? null : number(cell)))),
  };
}

function number(text: string | undefined): number {
  const value = text === undefined || text.trim() === '' ? Number.NaN : Number(text);
  if (!Number.isFinite(value)) throw new Error(`not a figure: ${text}`);
  return value;
}

const COPY_A = printed('target-superheat-maker-chart.csv', 'A');
const COPY_B = printed('target-superheat-maker-chart.csv', 'B');
const SPLIT = printed('target-temperature-split.csv');
const FINER = printed('target-superheat.csv');
const MAKERS_SPLIT = printed('target-temperature-split-maker-chart.csv');

const valueF = (chart: Chart, rowF: number, columnF: number): number =>
  (chartValueK(chart, { rowK: temperatureToK(rowF, 'degF'), columnK: temperatureToK(columnF, 'degF') }) * 9) / 5;

/** Every printed cell, with its row and column. */
const cellsOf = ({ rowsF, columnsF, cellsF }: PrintedChart) =>
  cellsF.flatMap((row, r) => row.map((cell, c) => ({ rowF: rowsF[r]!, columnF: columnsF[c]!, cell })));

describe.each([
  ['superheat chart, copy A', SUPERHEAT_CHART_A, COPY_A, 16 * 14],
  ['superheat chart, copy B', SUPERHEAT_CHART_B, COPY_B, 13 * 14],
  ['finer superheat table', SUPERHEAT_TABLE_FINER, FINER, 61 * 27],
  ['split table', SPLIT_TABLE, SPLIT, 15 * 27],
  ['maker’s split chart', SPLIT_CHART, MAKERS_SPLIT, 6 * 14],
] as const)('%s', (_, chart, table, size) => {
  it('is the transcription, cell by cell', () => {
    expect(cellsOf(table)).toHaveLength(size);
    const { rowsF, columnsF, cellsF } = chart;
    expect({ rowsF, columnsF, cellsF }).toEqual(table);
  });

  it('reaches every printed value through kelvin', () => {
    for (const { rowF, columnF, cell } of cellsOf(table)) {
      if (cell === null) expect(() => valueF(chart, rowF, columnF)).toThrow(/dash/);
      else expect(Math.abs(valueF(chart, rowF, columnF) - cell)).toBeLessThan(1e-8);
    }
  });
});

describe('against other prints', () => {
  it('copy B of the superheat chart differs in 12 cells, by 1 °F', () => {
    const differences: number[] = [];
    for (const { rowF, columnF, cell } of cellsOf(COPY_B)) {
      if (cell === null) {
        expect(() => valueF(SUPERHEAT_CHART_A, rowF, columnF)).toThrow(/dash/);
        continue;
      }
      const difference = Math.abs(valueF(SUPERHEAT_CHART_A, rowF, columnF) - cell);
      if (difference > 1e-6) differences.push(difference);
    }
    expect(differences).toHaveLength(12);
    for (const difference of differences) expect(difference).toBeCloseTo(1, 6);
  });

  it('the finer table agrees with copies A and B within 1.5 and 1 °F; they print 5 where it prints three more dashes', () => {
    const differences: number[] = [];
    const dashes: string[] = [];
    for (const [copy, most] of [
      [COPY_A, 1.5],
      [COPY_B, 1],
    ] as const) {
      for (const { rowF, columnF, cell } of cellsOf(copy)) {
        const r = FINER.rowsF.indexOf(rowF);
        const finer = r < 0 ? null : FINER.cellsF[r]![FINER.columnsF.indexOf(columnF)]!;
        if (r >= 0 && cell !== null && finer === null) {
          expect(cell).toBe(5);
          dashes.push(`${rowF}/${columnF}`);
        }
        if (cell === null || finer === null) continue;
        expect(Math.abs(finer - cell), `${rowF}/${columnF}`).toBeLessThanOrEqual(most + 1e-9);
        differences.push(finer - cell);
      }
    }
    expect(new Set(dashes)).toEqual(new Set(['80/58', '90/62', '105/66']));
    expect(differences).toHaveLength(2 * 115);
    const rms = Math.sqrt(differences.reduce((sum, x) => sum + x * x, 0) / differences.length);
    expect(rms).toBeLessThan(0.45);
  });

  it('the finer table prints no value under 5 °F and its dashes reach from each column’s first to its end', () => {
    FINER.columnsF.forEach((_, c) => {
      const column = FINER.cellsF.map((row): number | null => row[c] ?? null);
      const first = column.indexOf(null);
      expect(column.slice(0, first < 0 ? undefined : first).every((cell) => cell !== null && cell >= 5)).toBe(true);
      if (first >= 0) expect(column.slice(first).every((cell) => cell === null)).toBe(true);
    });
  });

  it('the split table follows one smooth expression within 0.063 °F: none of its 356 cells is a slip', () => {
    const cells = cellsOf(SPLIT).filter(({ cell }) => cell !== null);
    expect(cells).toHaveLength(356);
    for (const { rowF, columnF, cell } of cells) {
      const smooth = 19.699 + 0.54415 * (rowF - 77) - 0.67834 * (columnF - 63) - 0.02281 * (columnF - 63) ** 2;
      expect(Math.abs(smooth - cell!), `${rowF}/${columnF}`).toBeLessThan(0.063);
    }
  });

  it('the split table lies 0.10 °F above a maker’s own chart on average, 0.49 °F rms', () => {
    const differences = cellsOf(MAKERS_SPLIT).map(
      ({ rowF, columnF, cell }) => valueF(SPLIT_TABLE, rowF, columnF) - cell!,
    );
    const meanOf = (values: readonly number[]): number => values.reduce((sum, x) => sum + x, 0) / values.length;
    expect(differences).toHaveLength(84);
    expect(meanOf(differences)).toBeCloseTo(0.1, 2);
    expect(Math.sqrt(meanOf(differences.map((x) => x * x)))).toBeCloseTo(0.49, 2);
  });
});
