import { describe, expect, it } from 'vitest';
import type { FanTableRow } from './fan-table';
import { fanTableAirflowM3PerS, fanTableFaults, risingAirflow } from './fan-table';

const table = (...rows: readonly (readonly [staticPa: number, airflow: number | null])[]) => ({
  source: 'made up for this test',
  blowerTap: '4',
  rows: rows.map(([staticPa, airflowM3PerS]): FanTableRow => ({ staticPa, airflowM3PerS })),
});

describe('a fan table', () => {
  it('gives its printed rows back, and straight lines between them', () => {
    const t = table([25, 0.7], [75, 0.6], [125, 0.45]);
    const expected = [0.7, 0.65, 0.6, 0.525, 0.45];
    for (const [k, pa] of [25, 50, 75, 100, 125].entries()) {
      expect(fanTableAirflowM3PerS(t, pa)).toBeCloseTo(expected[k]!, 12);
    }
  });

  it('answers on a printed row beside a dash, also a rounding off, and nowhere nearer the dash', () => {
    const t = table([25, null], [75, 0.6], [125, 0.5], [175, null]);
    expect(fanTableAirflowM3PerS(t, 75 - 1e-9)).toBeCloseTo(0.6, 9);
    expect(fanTableAirflowM3PerS(t, 125 + 1e-9)).toBeCloseTo(0.5, 9);
    for (const pa of [74.99, 25, 125.01, 175]) {
      expect(() => fanTableAirflowM3PerS(t, pa), String(pa)).toThrow(
        expect.objectContaining({ details: expect.objectContaining({ reason: 'dash' }) }),
      );
    }
  });

  it.each([24.99, 125.01, -50, Number.NaN])('refuses %d Pa outside its rows', (pa) => {
    expect(() => fanTableAirflowM3PerS(table([25, 0.7], [125, 0.5]), pa)).toThrow(
      expect.objectContaining({ kind: 'out-of-range', details: expect.objectContaining({ reason: 'outside-table' }) }),
    );
  });

  it.each([
    ['too-few-rows', table([25, 0.7], [75, null])],
    ['too-few-rows', table()],
    ['not-finite', table([25, 0.7], [Number.NaN, 0.6], [125, 0.5])],
    ['not-finite', table([25, 0.7], [75, Infinity])],
    ['statics-not-ascending', table([25, 0.7], [25, 0.6])],
    ['statics-not-ascending', table([75, 0.7], [25, 0.6])],
    ['airflow-not-above-zero', table([25, 0.7], [75, 0])],
  ] as const)('has the fault %s', (fault, t) => {
    expect(fanTableFaults(t)).toContain(fault);
    expect(() => fanTableAirflowM3PerS(t, 50)).toThrow(
      expect.objectContaining({ details: expect.objectContaining({ reason: 'table-not-usable' }) }),
    );
  });

  it('has no fault in good order, and knows a rise over a dash', () => {
    const t = table([25, 0.7], [75, null], [125, 0.71]);
    expect(fanTableFaults(t)).toEqual([]);
    expect(risingAirflow(t)).toBe(true);
    expect(risingAirflow(table([25, 0.7], [75, 0.7], [125, 0.6]))).toBe(false);
  });
});
