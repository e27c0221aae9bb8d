/** The formulas that only the worked examples show: each `text`, evaluated by mathjs with its symbols, against the function that computes it. */
import { compile } from 'mathjs';
import { describe, expect, it } from 'vitest';
import type { Formula } from '../../../packages/engine/src/derivation/formula';
import * as moistAirSteps from '../../../packages/engine/src/training/worked-examples/moist-air-steps';
import { oracle } from '../psychrometrics/oracle';

const celsius = (kelvin: number): number => kelvin - 273.15;

/** What the functions of the texts stand for: an independent library, or the published line written out. */
const FUNCTIONS = {
  W: (dryBulbK: number, wetBulbK: number, pressurePa: number) =>
    oracle.GetHumRatioFromTWetBulb(celsius(dryBulbK), celsius(wetBulbK), pressurePa),
  // eqs. 20 and 22
  RH: (dryBulbK: number, w: number, pressurePa: number) =>
    (pressurePa * w) / (0.621945 + w) / oracle.GetSatVapPres(celsius(dryBulbK)),
  T_dp: (w: number, pressurePa: number) =>
    273.15 + oracle.GetTDewPointFromVapPres(40, (pressurePa * w) / (0.621945 + w)),
  h: (dryBulbK: number, w: number) => oracle.GetMoistAirEnthalpy(celsius(dryBulbK), w),
  v: (dryBulbK: number, w: number, pressurePa: number) => oracle.GetMoistAirVolume(celsius(dryBulbK), w, pressurePa),
};

const RANGES: Readonly<Record<string, readonly [low: number, high: number]>> = {
  T: [303, 311],
  T_wb: [293, 298],
  p: [8e4, 1.02e5],
  W: [0.005, 0.015],
};

/** The library finds dew points to 0.001 K, which is 4e-6 of them. */
const RELATIVE = 1e-5;

const FORMULAS: readonly Formula[] = [
  moistAirSteps.humidityRatioStep,
  moistAirSteps.relativeHumidityStep,
  moistAirSteps.dewPointStep,
  moistAirSteps.enthalpyStep,
  moistAirSteps.specificVolumeStep,
];

it('the list has every formula of the moist-air steps', () => {
  const formulas = Object.values(moistAirSteps).filter((value) => typeof value === 'object' && 'text' in value);
  expect(formulas).toHaveLength(FORMULAS.length);
});

describe.each(FORMULAS)('$id', (formula) => {
  it('computes what it says, on 200 random inputs', () => {
    const expression = compile(formula.text.replaceAll('−', '-'));
    const symbols = Object.entries(formula.symbols);
    let state = 1;
    const next = (): number => (state = (state * 48271) % 2147483647) / 2147483647;
    for (let i = 0; i < 200; i++) {
      const drawn = symbols.map(([name, symbol]) => {
        const range = RANGES[symbol];
        if (range === undefined) throw new Error(`no range for ${symbol}`);
        return [name, symbol, range[0] + next() * (range[1] - range[0])] as const;
      });
      const scope = new Map<string, unknown>(drawn.map(([, symbol, value]) => [symbol, value]));
      // a symbol may share its name with a function: the function wins where it is called
      for (const [name, of] of Object.entries(FUNCTIONS)) if (formula.text.includes(`${name}(`)) scope.set(name, of);
      const shown = expression.evaluate(scope) as number;
      const computed = formula.of(Object.fromEntries(drawn.map(([name, , value]) => [name, value])));
      expect(Math.abs(shown - computed)).toBeLessThanOrEqual(RELATIVE * Math.max(Math.abs(shown), 1e-3));
    }
  });
});
