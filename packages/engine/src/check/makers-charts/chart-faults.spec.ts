import { describe, expect, it } from 'vitest';
import { crossCheck } from '../cross-check';
import type { MakersChartInput } from '../request';
import { readMakersCharts } from './read-makers-charts';

const CHART: MakersChartInput = {
  kind: 'superheat',
  rows: { unit: 'degF', values: [75, 85, 95] },
  columns: { unit: 'degF', values: [60, 66] },
  unit: 'deltaF',
  cells: [
    [12, 21],
    [null, 15],
    [null, 10],
  ],
};
const CURVE: MakersChartInput = {
  kind: 'liquid-pressure',
  rows: { unit: 'degF', values: [80, 100] },
  unit: 'psig',
  cells: [[270], [355]],
};
const FIGURE: MakersChartInput = { kind: 'liquid-line-approach', unit: 'deltaF', cells: [[8]] };

const setup = { refrigerant: 'R-410A', meteringDevice: 'fixed-orifice' } as const;
const faultsOf = (makersChart: MakersChartInput): readonly string[] =>
  crossCheck({ setup: { ...setup, makersChart } }).map(({ path, code }) => `${path} ${code}`);

describe('a maker’s table of the right shape', () => {
  it.each([
    ['over two conditions', CHART],
    ['over one', CURVE],
    ['of one figure', FIGURE],
    [
      'with all that may stand beside it',
      {
        ...CHART,
        port: 'suction',
        resolution: 1,
        tolerance: { value: 4, unit: 'deltaF' },
        leastOutdoor: { value: 55, unit: 'degF' },
        mostOutdoor: { value: 115, unit: 'degF' },
        leastReturn: { value: 20, unit: 'degC' },
        mostReturn: { value: 80, unit: 'degF' },
      },
    ],
    ['at its largest', grid(40, 40)],
  ] as const)('%s has no fault', (_, chart) => {
    expect(faultsOf(chart)).toEqual([]);
  });
});

/** Falls by the row, rises by the column. */
function grid(rows: number, columns: number): MakersChartInput {
  const values = (n: number) => Array.from({ length: n }, (_, k) => 50 + k);
  return {
    ...CHART,
    rows: { unit: 'degF', values: values(rows) },
    columns: { unit: 'degF', values: values(columns) },
    cells: values(rows).map((_, r) => values(columns).map((__, c) => 40 - r + c)),
  };
}

describe('what cannot be in a maker’s table', () => {
  const axis = (values: readonly number[]) => ({ unit: 'degF', values }) as const;
  const { columns: _, ...withoutColumns } = CHART;
  const { rows: __, ...withoutRows } = CHART;
  it.each<[string, MakersChartInput, readonly string[]]>([
    ['an axis that falls', { ...CHART, rows: axis([95, 85, 75]) }, ['rows axis-not-ascending']],
    ['a value twice', { ...CHART, columns: axis([66, 66]) }, ['columns axis-not-ascending']],
    ['one row', { ...CHART, rows: axis([75]), cells: [[12, 21]] }, ['rows axis-too-short']],
    ['no columns', withoutColumns, ['columns axis-missing', ...Array<string>(3).fill('cells wrong-length-of-row')]],
    ['columns without rows', { ...withoutRows, cells: [[12]] }, ['columns axis-not-used']],
    [
      'columns of a curve',
      { ...CURVE, columns: axis([60, 70]) },
      ['columns axis-not-used', ...twice('cells wrong-length-of-row')],
    ],
    [
      'a row too few',
      {
        ...CHART,
        cells: [
          [12, 21],
          [8, 15],
        ],
      },
      ['cells wrong-number-of-rows'],
    ],
    ['a row too short', { ...CHART, cells: [[12, 21], [15], [6, 10]] }, ['cells wrong-length-of-row']],
    ['two figures in place of one', { ...FIGURE, cells: [[8, 9]] }, ['cells wrong-length-of-row']],
    [
      'nothing but dashes',
      {
        ...CHART,
        cells: [
          [null, null],
          [null, null],
          [null, null],
        ],
      },
      ['cells no-cell-printed'],
    ],
    ['no cells at all', { ...FIGURE, cells: [] }, ['cells wrong-number-of-rows', 'cells no-cell-printed']],
    ['a pressure as a target superheat', { ...CHART, unit: 'psig' }, ['unit wrong-unit']],
    ['a difference on an axis', { ...CHART, rows: { unit: 'deltaF', values: [75, 85, 95] } }, ['rows wrong-unit']],
    ['a port of the other side', { ...CHART, port: 'liquid' }, ['port port-does-not-fit']],
    ['a ± of another quantity', { ...CURVE, tolerance: { value: 3, unit: 'deltaF' } }, ['tolerance wrong-unit']],
    ['a ± of nothing', { ...CURVE, tolerance: { value: 0, unit: 'psi' } }, ['tolerance must-be-positive']],
    ['a step of nothing', { ...CURVE, resolution: 0 }, ['resolution must-be-positive']],
    [
      'a negative target',
      {
        ...CHART,
        cells: [
          [12, 21],
          [null, -1],
          [null, 10],
        ],
      },
      ['cells.1.1 must-not-be-negative'],
    ],
    ['a pressure below vacuum', { ...CURVE, cells: [[-20], [355]] }, ['cells.0.0 not-above-vacuum']],
    ['a temperature below absolute zero', { ...CURVE, rows: axis([-500, 100]) }, ['rows.values.0 below-absolute-zero']],
    ['a number too large', { ...CHART, rows: axis([75, 85, 1e13]) }, ['rows.values.2 not-a-finite-number']],
    [
      'no number',
      {
        ...CHART,
        cells: [
          [12, NaN],
          [null, 15],
          [null, 10],
        ],
      },
      ['cells.0.1 not-a-finite-number'],
    ],
    [
      'a lowest above a highest',
      { ...CHART, leastOutdoor: { value: 100, unit: 'degF' }, mostOutdoor: { value: 30, unit: 'degC' } },
      ['leastOutdoor low-above-high'],
    ],
    ['more rows than a table of a unit has', grid(41, 40), ['rows table-too-large']],
    ['more columns', grid(40, 41), ['columns table-too-large']],
  ])('%s', (_what, chart, faults) => {
    expect(faultsOf(chart)).toEqual(faults.map((fault) => `setup.makersChart.${fault}`));
  });

  it('is all told at once', () => {
    const chart: MakersChartInput = {
      ...CHART,
      rows: axis([95, 85, 75]),
      unit: 'psig',
      port: 'liquid',
      cells: [[1, 2]],
    };
    expect(faultsOf(chart)).toHaveLength(4);
  });

  it('is found in each of several tables, at its own place', () => {
    const charts = [CHART, { ...CURVE, cells: [[270]] }, undefined, { ...FIGURE, port: 'suction' }] as const;
    const faults = crossCheck({ setup: { ...setup, makersChart: CURVE, makersCharts: charts } });
    expect(faults.map(({ path, code }) => `${path} ${code}`)).toEqual([
      'setup.makersCharts.1 table-given-twice',
      'setup.makersCharts.1.cells wrong-number-of-rows',
      'setup.makersCharts.3.port port-does-not-fit',
    ]);
  });

  it('takes one table of a kind for each port, and no more than ten', () => {
    const forDischarge = { ...CURVE, port: 'discharge' } as const;
    expect(crossCheck({ setup: { ...setup, makersCharts: [CURVE, forDischarge] } })).toEqual([]);
    const codes = crossCheck({ setup: { ...setup, makersCharts: Array<MakersChartInput>(11).fill(CURVE) } }).map(
      ({ code }) => code,
    );
    expect(codes).toEqual(['too-many-tables', ...Array<string>(10).fill('table-given-twice')]);
  });
});

const twice = (fault: string): readonly string[] => [fault, fault];

describe('a table that is read', () => {
  it('holds for the first port of its kind where none is stated', () => {
    const [first, second] = readMakersCharts({ ...setup, makersCharts: [CHART, { ...CURVE, port: 'discharge' }] });
    expect([first?.port, second?.port]).toEqual(['suction', 'discharge']);
  });

  it.each([
    ['whole numbers', CHART, 1],
    [
      'tenths',
      {
        ...CHART,
        cells: [
          [12, 21],
          [8, 15.5],
          [6, 10],
        ],
      },
      0.1,
    ],
    ['hundredths', { ...CURVE, cells: [[18.62], [24.5]], unit: 'bara' }, 0.01],
    ['a stated step', { ...CHART, resolution: 0.5 }, 0.5],
  ] as const)('is printed as finely as its cells: %s', (_, chart, step) => {
    const [read] = readMakersCharts({ ...setup, makersChart: chart });
    expect(read?.table).toMatchObject({ resolution: expect.closeTo(step, 12) as unknown });
  });

  it('has its limits and its ± in SI', () => {
    const [read] = readMakersCharts({
      ...setup,
      makersChart: {
        ...CURVE,
        tolerance: { value: 1, unit: 'bar' },
        leastOutdoor: { value: 50, unit: 'degF' },
        mostReturn: { value: 27, unit: 'degC' },
      },
    });
    expect(read).toMatchObject({ tolerance: 1e5, leastOutdoorK: 283.15, mostReturnK: 300.15 });
    expect(read).not.toHaveProperty('mostOutdoorK');
  });
});
