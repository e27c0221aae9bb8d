/** Every formula's `text`, evaluated by mathjs with its symbols, against the function that computes it: what is shown is what is done. */
import { compile } from 'mathjs';
import { describe, expect, it } from 'vitest';
import type { Formula } from '../../../packages/engine/src/derivation/formula';
import * as airSide from '../../../packages/engine/src/methods/air-side';
import * as airToRefrigerant from '../../../packages/engine/src/methods/air-to-refrigerant';
import { chartValueK } from '../../../packages/engine/src/methods/chart';
import * as cyclePoints from '../../../packages/engine/src/methods/cycle-points';
import { SPLIT_TABLE } from '../../../packages/engine/src/methods/data/split-table';
import { SUPERHEAT_CHART_A } from '../../../packages/engine/src/methods/data/superheat-chart-a';
import * as separatingTests from '../../../packages/engine/src/methods/separating-tests';
import * as targets from '../../../packages/engine/src/methods/targets';
import {
  moistAirFromDryBulbAndRelativeHumidity,
  moistAirFromDryBulbAndWetBulb,
} from '../../../packages/engine/src/psychrometrics/moist-air';
import { bubbleTemperatureK, dewTemperatureK } from '../../../packages/engine/src/refrigerants/saturation';

/** A blend with a glide, so that bubble and dew cannot stand in for each other. */
const REFRIGERANT = 'R-407C';

/** What the functions of the texts stand for, by other doors of the engine than the formulas use where there are any. */
const FUNCTIONS = {
  T_dew: (pressurePa: number) => dewTemperatureK({ refrigerant: REFRIGERANT, pressurePa }),
  T_bubble: (pressurePa: number) => bubbleTemperatureK({ refrigerant: REFRIGERANT, pressurePa }),
  T_mean: (pressurePa: number) => {
    const bubble = bubbleTemperatureK({ refrigerant: REFRIGERANT, pressurePa });
    const dew = dewTemperatureK({ refrigerant: REFRIGERANT, pressurePa });
    return (bubble + 0.2 * (dew - bubble) + dew) / 2;
  },
  chart: (columnK: number, rowK: number) => chartValueK(SUPERHEAT_CHART_A, { columnK, rowK }),
  table: (rowK: number, columnK: number) => chartValueK(SPLIT_TABLE, { columnK, rowK }),
  T_wb: (dryBulbK: number, relativeHumidityRatio: number, pressurePa: number) =>
    moistAirFromDryBulbAndRelativeHumidity({ dryBulbK, relativeHumidityRatio, pressurePa }).wetBulbK,
  W: (dryBulbK: number, wetBulbK: number, pressurePa: number) =>
    moistAirFromDryBulbAndWetBulb({ dryBulbK, wetBulbK, pressurePa }).humidityRatio,
  RH: (dryBulbK: number, humidityRatio: number, pressurePa: number) => {
    // eqs. 20 and 22 of the handbook by hand: the vapour pressure of this air over that of saturated air
    const vapourPa = (pressurePa * humidityRatio) / (0.621945 + humidityRatio);
    return (
      vapourPa /
      moistAirFromDryBulbAndRelativeHumidity({ dryBulbK, relativeHumidityRatio: 1, pressurePa }).vapourPressurePa
    );
  },
  h: (dryBulbK: number, humidityRatio: number) =>
    1000 * (1.006 * (dryBulbK - 273.15) + humidityRatio * (2501 + 1.86 * (dryBulbK - 273.15))),
};

/** Where each input is drawn from, by its symbol; all of it inside every table. */
const RANGES: Readonly<Record<string, readonly [low: number, high: number]>> = {
  p_gauge: [3e5, 2e6],
  p_atmosphere: [8e4, 1.02e5],
  p_suction: [4e5, 8e5],
  p_high: [1.5e6, 3e6],
  p_absolute: [1.5e6, 3e6],
  T_suction: [275, 300],
  T_liquid: [300, 320],
  T_dew: [270, 285],
  T_bubble: [310, 325],
  T_outdoor: [290, 302],
  T_return: [295, 300],
  T_supply: [283, 292],
  T_wb: [291, 294],
  RH: [0.1, 1],
  W: [0.004, 0.01],
  T_mean: [270, 285],
  I: [4, 20],
  I_expected: [4, 20],
  T_before: [300, 310],
  T_after: [295, 310],
  p_standing: [8e5, 1.6e6],
  T_standing: [295, 310],
  T_coil: [295, 310],
  actual: [0, 20],
  target: [0, 20],
};

const FORMULAS: readonly Formula[] = [
  cyclePoints.absolutePressure('suctionPressure'),
  cyclePoints.evaporatingDewTemperature(REFRIGERANT),
  cyclePoints.condensingBubbleTemperature(REFRIGERANT),
  cyclePoints.meanEvaporatingTemperature(REFRIGERANT),
  cyclePoints.superheat,
  cyclePoints.subcooling,
  cyclePoints.condensingOverAmbient,
  airSide.temperatureSplit,
  airSide.returnWetBulbFromHumidity,
  airSide.returnHumidityRatio,
  airSide.returnRelativeHumidity,
  airSide.returnEnthalpy,
  airToRefrigerant.returnOverEvaporating,
  airToRefrigerant.liquidLineApproach,
  airToRefrigerant.currentOffExpected,
  cyclePoints.siteGaugePressure('liquid-pressure'),
  separatingTests.drierDrop,
  separatingTests.standingSaturation(REFRIGERANT),
  separatingTests.standingExcess,
  separatingTests.bracketedWetBulb,
  targets.targetSuperheat(SUPERHEAT_CHART_A),
  targets.targetTemperatureSplit,
  targets.deviation('superheat', 'differenceK'),
];

const isFormula = (value: unknown): value is Formula =>
  typeof value === 'object' && value !== null && 'text' in value && 'of' in value;

describe('the list', () => {
  it('has every formula of the methods', () => {
    const refrigerant = (value: unknown): unknown =>
      // a formula of one refrigerant, reading or criterion is a function of it
      typeof value === 'function' ? attempt(() => (value as (x: string) => unknown)(REFRIGERANT)) : value;
    const ids = [cyclePoints, airSide, airToRefrigerant, separatingTests, targets]
      .flatMap((module) => Object.values(module).map(refrigerant))
      .filter(isFormula)
      .map(({ text }) => text);
    expect(ids.length).toBe(FORMULAS.length);
    expect(new Set(FORMULAS.map(({ text }) => text))).toEqual(new Set(ids));
  });
});

function attempt(make: () => unknown): unknown {
  try {
    return make();
  } catch {
    // what is no maker of formulas
    return undefined;
  }
}

describe.each(FORMULAS)('$id', (formula) => {
  const expression = compile(formula.text.replaceAll('−', '-').replaceAll('×', '*'));
  const names = Object.keys(formula.symbols);

  it('names every input in its text', () => {
    for (const symbol of Object.values(formula.symbols)) expect(formula.text).toContain(symbol);
    expect(new Set(Object.values(formula.symbols)).size).toBe(names.length);
  });

  it('computes what it says, on 200 random inputs', () => {
    let state = 1;
    const next = (): number => (state = (state * 48271) % 2147483647) / 2147483647;
    for (let i = 0; i < 200; i++) {
      const inputs = Object.fromEntries(
        names.map((name) => {
          const range = RANGES[formula.symbols[name]!];
          if (range === undefined) throw new Error(`no range for ${formula.symbols[name]}`);
          return [name, range[0] + next() * (range[1] - range[0])];
        }),
      );
      const scope = new Map<string, unknown>(names.map((name) => [formula.symbols[name]!, inputs[name]]));
      // a symbol may share its name with a function: the function wins where it is called
      const called = Object.entries(FUNCTIONS).filter(([name]) => formula.text.includes(`${name}(`));
      for (const [name, of] of called) scope.set(name, of);
      const shown = expression.evaluate(scope) as number;
      expect(Math.abs(shown - formula.of(inputs))).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(shown)));
    }
  });
});
