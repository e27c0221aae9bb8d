/**
 * The target from a maker's table, by its own text: on a table whose cells lie on a plane the interpolation has to give the plane, here computed apart in
 * SI. Each kind is printed once in °F and psi and once in °C and bar.
 */
import type { ChartUnit, MakersChartKind } from '@chargewright/engine';
import { MAKERS_CHART_FACTS, MAKERS_CHART_KINDS } from '@chargewright/engine';
import { compile } from 'mathjs';
import { describe, expect, it } from 'vitest';
import type { MakersGrid } from '../../../packages/engine/src/methods/makers-chart/makers-table';
import { makersTargetFormula } from '../../../packages/engine/src/methods/makers-chart/makers-table';

const ATMOSPHERE_PA = 101_325;

/** SI of a printed figure, by the definitions of the units. */
const toSi = (value: number, unit: ChartUnit): number => {
  switch (unit) {
    case 'degF':
      return (value + 459.67) / 1.8;
    case 'degC':
      return value + 273.15;
    case 'deltaF':
      return value / 1.8;
    case 'deltaC':
      return value;
    case 'psig':
      return value * 6894.757293168 + ATMOSPHERE_PA;
    case 'barg':
      return value * 1e5 + ATMOSPHERE_PA;
    case 'psia':
    case 'kPag':
    case 'kPaa':
    case 'bara':
      throw new RangeError(`no table here is printed in ${unit}`);
  }
};

const AXES = {
  temperature: { degF: [40, 61, 77, 95, 118], degC: [5, 16, 24, 36, 48] },
  pressure: { psig: [60, 95, 118, 160], barg: [4, 6.5, 8, 11] },
} as const;
const UNITS = {
  inchPound: { temperature: 'degF', difference: 'deltaF', pressure: 'psig' },
  metric: { temperature: 'degC', difference: 'deltaC', pressure: 'barg' },
} as const;

function gridOf(kind: MakersChartKind, system: keyof typeof UNITS): MakersGrid {
  const { rows, columns, cells } = MAKERS_CHART_FACTS[kind];
  const unitOf = (condition: string) => UNITS[system][condition === 'suctionPressure' ? 'pressure' : 'temperature'];
  const axis = (condition: string): readonly number[] => {
    const unit = unitOf(condition);
    return unit === 'psig' || unit === 'barg' ? AXES.pressure[unit] : AXES.temperature[unit];
  };
  const across = columns === null ? [0, 1] : axis(columns);
  return {
    kind,
    rowUnit: unitOf(rows),
    columnUnit: columns === null ? null : unitOf(columns),
    cellUnit: UNITS[system][cells],
    resolution: 1,
    grid: {
      rows: axis(rows),
      columns: across,
      cells: axis(rows).map((row) => across.map((column) => 20 + 0.3 * row + (columns === null ? 0 : 0.7 * column))),
    },
  };
}

/** The plane itself, from SI to SI. */
function planeOf({ rowUnit, columnUnit, cellUnit }: MakersGrid): (rowSi: number, columnSi?: number) => number {
  const fromSi = (si: number, unit: ChartUnit): number => (si - toSi(0, unit)) / (toSi(1, unit) - toSi(0, unit));
  return (rowSi, columnSi) =>
    toSi(20 + 0.3 * fromSi(rowSi, rowUnit) + (columnUnit === null ? 0 : 0.7 * fromSi(columnSi!, columnUnit)), cellUnit);
}

const TABLES = MAKERS_CHART_KINDS.flatMap((kind) =>
  (['inchPound', 'metric'] as const).map((system) => [kind, system, gridOf(kind, system)] as const),
);

describe.each(TABLES)('%s, %s', (_kind, _system, table) => {
  const formula = makersTargetFormula(table);
  const names = Object.keys(formula.symbols);
  const expression = compile(formula.text);

  it('names every input in its text, the rows first', () => {
    expect(names).toHaveLength(table.columnUnit === null ? 1 : 2);
    for (const symbol of Object.values(formula.symbols)) expect(formula.text).toContain(symbol);
  });

  it('computes what it says, on 200 random inputs', () => {
    let state = 7;
    const next = (): number => (state = (state * 48271) % 2147483647) / 2147483647;
    const within = (axis: readonly number[]): number => axis[0]! + next() * (axis.at(-1)! - axis[0]!);
    for (let i = 0; i < 200; i++) {
      const printed = [within(table.grid.rows), within(table.grid.columns)];
      const units = [table.rowUnit, table.columnUnit ?? table.rowUnit];
      const inputs = Object.fromEntries(names.map((name, k) => [name, toSi(printed[k]!, units[k]!)]));
      const scope = new Map<string, unknown>(names.map((name) => [formula.symbols[name]!, inputs[name]]));
      scope.set('maker', planeOf(table));
      const shown = expression.evaluate(scope) as number;
      expect(Math.abs(shown - formula.of(inputs))).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(shown)));
    }
  });
});
