import { describe, expect, it } from 'vitest';
import { SUPERHEAT_CHART_A } from '../../methods/data/superheat-chart-a';
import type { MakersChartInput } from '../request';
import { plausibilityOfMakersChart } from './plausibility';

/** The printed chart as a maker's table. */
const PRINTED: MakersChartInput = {
  kind: 'superheat',
  rows: { unit: 'degF', values: SUPERHEAT_CHART_A.rowsF },
  columns: { unit: 'degF', values: SUPERHEAT_CHART_A.columnsF },
  unit: 'deltaF',
  cells: SUPERHEAT_CHART_A.cellsF,
};
const CURVE: MakersChartInput = {
  kind: 'liquid-pressure',
  rows: { unit: 'degF', values: [70, 80, 90, 100] },
  unit: 'psig',
  cells: [[228], [265], [306], [352]],
};

const withCell = (chart: MakersChartInput, row: number, column: number, cell: number | null): MakersChartInput => ({
  ...chart,
  cells: chart.cells.map((line, r) => line.map((each, c) => (r === row && c === column ? cell : each))),
});
const degC = (degF: number): number => ((degF - 32) * 5) / 9;

describe('a table that looks right', () => {
  it.each([
    ['the printed superheat chart', PRINTED],
    [
      'the same in °C',
      {
        ...PRINTED,
        rows: { unit: 'degC', values: SUPERHEAT_CHART_A.rowsF.map(degC) },
        columns: { unit: 'degC', values: SUPERHEAT_CHART_A.columnsF.map(degC) },
        unit: 'deltaC',
        cells: SUPERHEAT_CHART_A.cellsF.map((line) => line.map((cell) => (cell === null ? null : (cell * 5) / 9))),
      },
    ],
    ['a curve', CURVE],
    ['one figure', { kind: 'subcooling', unit: 'deltaF', cells: [[10]] }],
    [
      'subcooling that falls and rises again, as makers print it',
      {
        kind: 'subcooling',
        rows: { unit: 'degF', values: [65, 75, 85, 95, 105, 115] },
        unit: 'deltaF',
        cells: [[12], [11], [10], [10], [11], [12]],
      },
    ],
    [
      'hot gas in heating',
      {
        kind: 'heating-discharge-temperature',
        rows: { unit: 'degF', values: [20, 30, 40, 50] },
        columns: { unit: 'degF', values: [65, 70, 75] },
        unit: 'degF',
        cells: [
          [168, 170, 172],
          [160, 162, 164],
          [154, 156, 158],
          [150, 152, 154],
        ],
      },
    ],
  ] as const)('%s', (_, chart) => {
    expect(plausibilityOfMakersChart(chart)).toEqual([]);
  });
});

describe('a table with a slip in it', () => {
  it('has digits swapped: 38 typed as 83', () => {
    // row of 55 °F, 70 °F wet bulb
    expect(plausibilityOfMakersChart(withCell(PRINTED, 3, 10, 83))).toEqual([
      { code: 'unusual', part: 'cells', row: 3, column: 10 },
      { code: 'against-neighbours', part: 'cells', row: 3, column: 10 },
    ]);
  });

  it('has a digit lost: 27 typed as 2', () => {
    expect(plausibilityOfMakersChart(withCell(PRINTED, 4, 7, 2))).toEqual([
      { code: 'against-neighbours', part: 'cells', row: 4, column: 7 },
    ]);
  });

  it('has a dash among printed cells', () => {
    expect(plausibilityOfMakersChart(withCell(PRINTED, 5, 8, null))).toEqual([
      { code: 'hole', part: 'cells', row: 5, column: 8 },
    ]);
  });

  it('has a column typed from the bottom to the top', () => {
    const last = SUPERHEAT_CHART_A.columnsF.length - 1;
    const upward = SUPERHEAT_CHART_A.cellsF.map((line) => line[last]!).reverse();
    const cells = PRINTED.cells.map((line, r) => [...line.slice(0, last), upward[r]!]);
    expect(plausibilityOfMakersChart({ ...PRINTED, cells })).toContainEqual({
      code: 'wrong-way',
      part: 'cells',
      column: last,
    });
  });

  it('has rows and columns exchanged, which turns every trend around', () => {
    const small: MakersChartInput = {
      ...PRINTED,
      rows: { unit: 'degF', values: [75, 85, 95] },
      columns: { unit: 'degF', values: [62, 66, 70] },
      cells: [
        [15, 8, 6],
        [21, 15, 10],
        [28, 22, 18],
      ],
    };
    expect(plausibilityOfMakersChart(small).filter(({ code }) => code === 'wrong-way')).toEqual([
      ...[0, 1, 2].map((column) => ({ code: 'wrong-way', part: 'cells', column })),
      ...[0, 1, 2].map((row) => ({ code: 'wrong-way', part: 'cells', row })),
    ]);
  });

  it('has a curve that falls as the liquid gets warmer', () => {
    expect(plausibilityOfMakersChart({ ...CURVE, cells: [[352], [306], [265], [228]] })).toEqual([
      { code: 'wrong-way', part: 'cells', column: 0 },
    ]);
  });

  it('has one value of an axis out of the usual', () => {
    const rows = { unit: 'degF', values: [70, 80, 90, 1000] } as const;
    expect(plausibilityOfMakersChart({ ...CURVE, rows })).toEqual([{ code: 'unusual', part: 'rows', row: 3 }]);
    const columns = { unit: 'degF', values: [5, ...SUPERHEAT_CHART_A.columnsF.slice(1)] } as const;
    expect(plausibilityOfMakersChart({ ...PRINTED, columns })).toEqual([
      { code: 'unusual', part: 'columns', column: 0 },
    ]);
  });

  it.each([
    ['°F typed as °C', { ...PRINTED, rows: { unit: 'degC', values: SUPERHEAT_CHART_A.rowsF } }, 'rows', 'degF'],
    [
      '°F of wet bulb typed as °C',
      { ...PRINTED, columns: { unit: 'degC', values: SUPERHEAT_CHART_A.columnsF } },
      'columns',
      'degF',
    ],
    ['°F of superheat typed as °C', { ...PRINTED, unit: 'deltaC' }, 'cells', 'deltaF'],
    ['psig typed as bar', { ...CURVE, unit: 'barg' }, 'cells', 'psig'],
    [
      '°C typed as °F',
      { ...PRINTED, columns: { unit: 'degF', values: SUPERHEAT_CHART_A.columnsF.map(degC) } },
      'columns',
      'degC',
    ],
  ] as const)('has the unit of another scale: %s', (_, chart, part, likelyUnit) => {
    expect(plausibilityOfMakersChart(chart)).toEqual([{ code: 'unit-slip', part, likelyUnit }]);
  });
});
