import fc from 'fast-check';
import { describe, expect, expectTypeOf, it } from 'vitest';
import { attempt } from '../result';
import { enthalpyJPerKg } from './enthalpy';
import { moistAirFromDryBulbAndRelativeHumidity, type MoistAir } from './moist-air';
import {
  MOIST_AIR_PAIRS,
  MOIST_AIR_READINGS,
  moistAirFromPair,
  REFUSED_MOIST_AIR_PAIRS,
  type MoistAirPair,
  type MoistAirReading,
} from './moist-air-pairs';
import { waterVapourSaturationPressurePa } from './saturation-pressure';
import { humidityRatioFromWetBulb } from './wet-bulb';

const between = (low: number, high: number) =>
  fc.integer({ min: 0, max: 1_000_000 }).map((k) => low + ((high - low) * k) / 1_000_000);

/** Air by its dry bulb and relative humidity; `share` is the most of the total pressure that saturation may have. */
const airBetween = (lowK: number, highK: number, driest: number, share: number) =>
  fc
    .record({
      dryBulbK: between(lowK, highK),
      relativeHumidityRatio: between(driest, 1),
      pressurePa: between(50e3, 110e3),
    })
    .filter((x) => waterVapourSaturationPressurePa(x.dryBulbK) < share * x.pressurePa)
    .map(moistAirFromDryBulbAndRelativeHumidity);

type Pair = readonly [MoistAirReading, MoistAirReading];

/** Of a state, what a pair names and no more. */
function readingsOf(state: MoistAir, [one, other]: Pair) {
  const { pressurePa } = state;
  return { pressurePa, [one]: state[one], [other]: state[other] } as unknown as MoistAirPair & { pressurePa: number };
}

const through = (pair: Pair, state: MoistAir): MoistAir => moistAirFromPair(readingsOf(state, pair));

/** Dry air has no dew point, and its relative humidity and humidity ratio say the same. */
const isStatedBy = (pair: Pair, state: MoistAir): boolean => {
  const [one, other] = pair;
  const dry = state.humidityRatio === 0;
  return (
    state[one] !== null && state[other] !== null && !(dry && pair.join() === 'relativeHumidityRatio,humidityRatio')
  );
};

function expectSameState(a: MoistAir, b: MoistAir, toleranceK: number) {
  expect(Math.abs(a.dryBulbK - b.dryBulbK)).toBeLessThan(toleranceK);
  expect(Math.abs(a.wetBulbK - b.wetBulbK)).toBeLessThan(toleranceK);
  expect(Math.abs(a.dewPointK! - b.dewPointK!)).toBeLessThan(toleranceK);
  expect(Math.abs(a.relativeHumidityRatio - b.relativeHumidityRatio)).toBeLessThan(0.1 * toleranceK);
  expect(Math.abs(a.humidityRatio / b.humidityRatio - 1)).toBeLessThan(toleranceK);
  expect(a.wetBulbSurface).toBe(b.wetBulbSurface);
}

describe('the 13 pairs of moist air', () => {
  it('are 13 of the 15 there are', () => {
    const all = MOIST_AIR_READINGS.flatMap((one, k) =>
      MOIST_AIR_READINGS.slice(k + 1).map((other) => `${one},${other}`),
    );
    const named = [...MOIST_AIR_PAIRS, ...REFUSED_MOIST_AIR_PAIRS.map(({ pair }) => pair)].map((pair) => pair.join());
    expect(MOIST_AIR_PAIRS).toHaveLength(13);
    expect(named.toSorted()).toEqual(all.toSorted());
  });

  it.each(MOIST_AIR_PAIRS)('%s and %s lead back to the state, to 1e-7 K', (...pair) => {
    fc.assert(
      fc.property(airBetween(275, 363.14, 0.05, 0.5), (state) => {
        fc.pre(state.wetBulbSurface === 'water');
        expectSameState(through(pair, state), state, 1e-7);
      }),
      { numRuns: 1000 },
    );
  });

  it.each(MOIST_AIR_PAIRS)('%s and %s are kept to the last digit', (...pair) => {
    fc.assert(
      fc.property(airBetween(213.2, 363.14, 0, 0.9), (state) => {
        fc.pre(isStatedBy(pair, state));
        expect(through(pair, state)).toMatchObject(readingsOf(state, pair));
      }),
      { numRuns: 200 },
    );
  });

  it.each(MOIST_AIR_PAIRS)(
    '%s and %s are those of the state they lead to, from −60 to 90 °C, iced and wet',
    (...pair) => {
      fc.assert(
        fc.property(airBetween(213.2, 363.14, 0, 0.9), (state) => {
          fc.pre(isStatedBy(pair, state));
          const found = through(pair, state);
          const again = moistAirFromDryBulbAndRelativeHumidity(found);
          expect(again.wetBulbSurface).toBe(found.wetBulbSurface);
          expect(Math.abs(again.wetBulbK - found.wetBulbK)).toBeLessThan(1e-8);
          if (pair.includes('dewPointK')) expect(Math.abs(again.dewPointK! - found.dewPointK!)).toBeLessThan(1e-8);
          // 1e-9 K of dry bulb is worth less than 1e-9 of the humidity while vapour has less than nine tenths of the pressure
          const tolerance = 1e-9 * (1e-3 + again.humidityRatio) * (1 + again.humidityRatio);
          expect(Math.abs(again.humidityRatio - found.humidityRatio)).toBeLessThan(tolerance);
          expect(Math.abs(again.enthalpyJPerKg - found.enthalpyJPerKg)).toBeLessThan(3e6 * tolerance);
          expect(found.dryBulbK).toBeGreaterThanOrEqual(found.wetBulbK);
          expect(found.relativeHumidityRatio).toBeLessThanOrEqual(1);
        }),
        { numRuns: 500 },
      );
    },
  );

  it('may be read off any state that a pair gave, dry and saturated ones too', () => {
    const pairs = fc.constantFrom(...MOIST_AIR_PAIRS);
    const state = fc.oneof(
      airBetween(214, 362, 0, 0.5),
      airBetween(214, 362, 1, 0.5),
      airBetween(214, 362, 0, 0.5).map(dried),
    );
    fc.assert(
      fc.property(state, pairs, pairs, (start, first, second) => {
        fc.pre(isStatedBy(first, start));
        const found = through(first, start);
        fc.pre(isStatedBy(second, found));
        const again = through(second, found);
        expect(Math.abs(again.dryBulbK - start.dryBulbK)).toBeLessThan(1e-6);
        expect(Math.abs(again.humidityRatio - start.humidityRatio)).toBeLessThan(1e-8);
      }),
      { numRuns: 5000 },
    );
  });

  it('never have a dry bulb below wet bulb or dew point, nor more than saturation, where they meet but for rounding', () => {
    const pressurePa = 101_325;
    for (let wetBulbK = 214.1; wetBulbK < 360; wetBulbK += 0.7) {
      const humidityRatio = moistAirFromPair({ pressurePa, wetBulbK, dewPointK: wetBulbK }).humidityRatio;
      for (const ulps of [-3, -2, -1, 0, 1, 2, 3, 2e4]) {
        const dewPointK = wetBulbK * (1 + ulps * Number.EPSILON);
        const found = [
          moistAirFromPair({ pressurePa, wetBulbK, dewPointK }),
          moistAirFromPair({ pressurePa, wetBulbK, humidityRatio: humidityRatio * (1 + ulps * Number.EPSILON) }),
          moistAirFromPair({ pressurePa, dewPointK, relativeHumidityRatio: 1 - Math.abs(ulps) * Number.EPSILON }),
        ];
        for (const { dryBulbK, ...state } of found) {
          expect(dryBulbK).toBeGreaterThanOrEqual(Math.max(state.wetBulbK - 1e-9, state.dewPointK!));
          expect(state.relativeHumidityRatio).toBeLessThanOrEqual(1);
        }
        expect(found[0]!.dryBulbK).toBeGreaterThanOrEqual(wetBulbK);
        expect(found[1]!.dryBulbK).toBeGreaterThanOrEqual(wetBulbK);
      }
      expect(moistAirFromPair({ pressurePa, dewPointK: wetBulbK, relativeHumidityRatio: 1 }).dryBulbK).toBe(wetBulbK);
    }
  });

  it('meet in one point at saturation, also around freezing', () => {
    for (const dryBulbK of [214, 250, 273.15, 273.155, 273.16, 273.165, 300, 340]) {
      const saturated = moistAirFromDryBulbAndRelativeHumidity({
        dryBulbK,
        relativeHumidityRatio: 1,
        pressurePa: 101_325,
      });
      for (const pair of MOIST_AIR_PAIRS) {
        const found = through(pair, saturated);
        expect(Math.abs(found.dryBulbK - dryBulbK)).toBeLessThan(1e-7);
        expect(found.relativeHumidityRatio).toBeCloseTo(1, 9);
      }
    }
  });

  it('find a dry bulb in the step of saturation at 0.01 °C', () => {
    for (const dryBulbK of [273.16 - 1e-8, 273.16, 273.16 + 1e-8]) {
      const state = moistAirFromDryBulbAndRelativeHumidity({ dryBulbK, relativeHumidityRatio: 0.6, pressurePa: 90e3 });
      // the step is worth 1e-7 K
      for (const pair of MOIST_AIR_PAIRS) expect(Math.abs(through(pair, state).dryBulbK - dryBulbK)).toBeLessThan(2e-7);
    }
  });
});

const dried = ({ dryBulbK, pressurePa }: MoistAir) =>
  moistAirFromDryBulbAndRelativeHumidity({ dryBulbK, relativeHumidityRatio: 0, pressurePa });

describe('the branch of the wet bulb', () => {
  const atPressure = { pressurePa: 101_325 };
  const icedK = 273.15 - 0.1;
  const humidityRatio = humidityRatioFromWetBulb({ dryBulbK: 278.15, wetBulbK: icedK, ...atPressure });

  it('is iced where an iced bulb was measured, though the same air has a wet one', () => {
    const found = moistAirFromPair({ ...atPressure, wetBulbK: icedK, humidityRatio });
    expect(found).toMatchObject({ wetBulbK: icedK, wetBulbSurface: 'ice' });
    for (const pair of MOIST_AIR_PAIRS.filter(
      ([one, other]) => one === 'wetBulbK' || (other as string) === 'wetBulbK',
    )) {
      expect(through(pair, found)).toMatchObject({ wetBulbK: icedK, wetBulbSurface: 'ice' });
      expect(through(pair, found).dryBulbK).toBeCloseTo(278.15, 8);
    }
  });

  it('is the wet one where the wet bulb is derived', () => {
    const iced = moistAirFromPair({ ...atPressure, wetBulbK: icedK, humidityRatio });
    for (const pair of MOIST_AIR_PAIRS.filter((each: Pair) => !each.includes('wetBulbK'))) {
      const found = through(pair, iced);
      expect(found.wetBulbSurface).toBe('water');
      expect(found.wetBulbK).toBeGreaterThan(273.15);
    }
  });
});

describe('the refused pairs', () => {
  const state = moistAirFromDryBulbAndRelativeHumidity({
    dryBulbK: 300,
    relativeHumidityRatio: 0.5,
    pressurePa: 101_325,
  });

  it.each(REFUSED_MOIST_AIR_PAIRS)('$pair: $reason', ({ pair, reason }) => {
    const result = attempt(() => moistAirFromPair(readingsOf(state, pair)));
    expect(result.ok ? result.value : result.error).toMatchObject({
      kind: 'not-supported',
      details: { quantity: pair[1], value: state[pair[1]], reason },
    });
  });

  it('dew point and humidity ratio say nothing of the dry bulb', () => {
    const pressurePa = 101_325;
    const cool = moistAirFromPair({ pressurePa, dryBulbK: 290, dewPointK: 280 });
    const hot = moistAirFromPair({ pressurePa, dryBulbK: 340, dewPointK: 280 });
    expect(cool.humidityRatio).toBe(hot.humidityRatio);
  });

  it('wet bulb and enthalpy say next to nothing of the dry bulb, and at 0 °C nothing', () => {
    const enthalpies = (wetBulbC: number, dryBulbsC: readonly number[]) =>
      dryBulbsC.map((t) => {
        const dryBulbK = t + 273.15;
        const humidityRatio = humidityRatioFromWetBulb({ dryBulbK, wetBulbK: wetBulbC + 273.15, pressurePa: 101_325 });
        return enthalpyJPerKg({ dryBulbK, humidityRatio });
      });
    const [saturated, ...drier] = enthalpies(20, [20, 30, 40, 50, 55.8]);
    const [halfAKelvinMore] = enthalpies(20.5, [20.5]);
    for (const h of drier) expect(Math.abs(h - saturated!)).toBeLessThan(1500);
    expect(halfAKelvinMore! - saturated!).toBeGreaterThan(1400);
    const [atFreezing, ...others] = enthalpies(0, [0, 2, 5, 9]);
    for (const h of others) expect(h).toBeCloseTo(atFreezing!, 8);
  });
});

describe('what every pair refuses', () => {
  const at = (pressurePa: number) =>
    moistAirFromDryBulbAndRelativeHumidity({ dryBulbK: 300, relativeHumidityRatio: 0.5, pressurePa });
  const refusal = (x: object) => {
    const result = attempt(() => moistAirFromPair(x as MoistAirPair & { pressurePa: number }));
    if (result.ok) throw new Error(`not refused: ${JSON.stringify(result.value)}`);
    return `${result.error.kind} ${result.error.details.quantity}`;
  };

  it.each(MOIST_AIR_PAIRS)('%s and %s: a pressure an ulp outside 50 to 110 kPa; the limits are inside', (...pair) => {
    expect(through(pair, at(50e3)).dryBulbK).toBeCloseTo(300, 7);
    expect(through(pair, at(110e3)).dryBulbK).toBeCloseTo(300, 7);
    const below = { ...readingsOf(at(50e3), pair), pressurePa: 50e3 * (1 - Number.EPSILON) };
    const above = { ...readingsOf(at(110e3), pair), pressurePa: 110e3 * (1 + Number.EPSILON) };
    expect(refusal(below)).toBe('out-of-range pressurePa');
    expect(refusal(above)).toBe('out-of-range pressurePa');
  });

  it.each(MOIST_AIR_PAIRS)('%s and %s: NaN and infinities, by name', (...pair) => {
    const sound = readingsOf(at(1e5), pair);
    for (const name of ['pressurePa', ...pair]) {
      expect(refusal({ ...sound, [name]: Number.NaN })).toBe(`out-of-range ${name}`);
      expect(refusal({ ...sound, [name]: Infinity })).toMatch(new RegExp(` ${name}$`));
      expect(refusal({ ...sound, [name]: -Infinity })).toMatch(new RegExp(` ${name}$`));
    }
  });
});

describe('moistAirFromPair', () => {
  it('gives the example of its text', () => {
    expect(moistAirFromPair({ pressurePa: 101_325, wetBulbK: 292.6, dewPointK: 288.9 }).dryBulbK).toBeCloseTo(299.8, 1);
  });

  it('takes exactly two readings, by type and when it runs', () => {
    const one = { pressurePa: 101_325, dryBulbK: 300 };
    const three = { ...one, wetBulbK: 290, dewPointK: 285 };
    expectTypeOf(one).not.toExtend<MoistAirPair>();
    expectTypeOf(three).not.toExtend<MoistAirPair>();
    expectTypeOf<{ dryBulbK: number; enthalpyJPerKg: number }>().toExtend<MoistAirPair>();
    // @ts-expect-error one reading: the type refuses it, and so must the function where types are not checked
    expect(() => moistAirFromPair(one)).toThrow(TypeError);
    // @ts-expect-error three readings: as above
    expect(() => moistAirFromPair(three)).toThrow(
      'two readings of moist air are needed, given: dryBulbK, wetBulbK, dewPointK',
    );
  });
});
