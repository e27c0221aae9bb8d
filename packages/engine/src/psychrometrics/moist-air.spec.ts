import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { attempt } from '../result';
import {
  enthalpyJPerKg,
  moistAirFromDryBulbAndDewPoint,
  moistAirFromDryBulbAndRelativeHumidity,
  moistAirFromDryBulbAndWetBulb,
  specificVolumeM3PerKg,
  type MoistAir,
} from './moist-air';
import { waterVapourSaturationPressurePa } from './saturation-pressure';

const between = (low: number, high: number) =>
  fc.integer({ min: 0, max: 1_000_000 }).map((k) => low + ((high - low) * k) / 1_000_000);

const airBetween = (lowK: number, highK: number, driest: number) =>
  fc
    .record({
      dryBulbK: between(lowK, highK),
      relativeHumidityRatio: between(driest, 1),
      pressurePa: between(50e3, 110e3),
    })
    .filter((x) => x.relativeHumidityRatio * waterVapourSaturationPressurePa(x.dryBulbK) < 0.99 * x.pressurePa);

function refusal(compute: () => unknown): string {
  const result = attempt(compute);
  if (result.ok) throw new Error(`not refused: ${JSON.stringify(result.value)}`);
  return `${result.error.kind} ${result.error.details.quantity} ${result.error.details.reason}`;
}

function expectSameState(a: MoistAir, b: MoistAir, toleranceK: number) {
  expect(Math.abs(a.wetBulbK - b.wetBulbK)).toBeLessThan(toleranceK);
  expect(Math.abs(a.dewPointK! - b.dewPointK!)).toBeLessThan(toleranceK);
  expect(Math.abs(a.relativeHumidityRatio - b.relativeHumidityRatio)).toBeLessThan(1e-8);
  expect(a.wetBulbSurface).toBe(b.wetBulbSurface);
}

describe('moist air', () => {
  it('comes back to 1e-7 K through wet bulb and through dew point, away from the ice branch', () => {
    fc.assert(
      fc.property(airBetween(275, 363.15, 0.05), (x) => {
        const state = moistAirFromDryBulbAndRelativeHumidity(x);
        fc.pre(state.wetBulbSurface === 'water');
        expectSameState(state, moistAirFromDryBulbAndWetBulb({ ...x, wetBulbK: state.wetBulbK }), 1e-7);
        expectSameState(state, moistAirFromDryBulbAndDewPoint({ ...x, dewPointK: state.dewPointK! }), 1e-7);
      }),
      { numRuns: 3000 },
    );
  });

  it('has dew point ≤ wet bulb ≤ dry bulb, and its own readings unchanged', () => {
    fc.assert(
      fc.property(airBetween(213.15, 363.15, 0), (x) => {
        const state = moistAirFromDryBulbAndRelativeHumidity(x);
        expect(state).toMatchObject(x);
        expect(state.wetBulbK).toBeLessThanOrEqual(x.dryBulbK);
        if (state.dewPointK !== null) {
          expect(state.dewPointK).toBeLessThanOrEqual(state.wetBulbK + 1e-9);
          expect(moistAirFromDryBulbAndDewPoint({ ...x, dewPointK: state.dewPointK }).dewPointK).toBe(state.dewPointK);
        }
        for (const value of Object.values(state))
          if (typeof value === 'number') expect(value).toSatisfy(Number.isFinite);
      }),
      { numRuns: 2000 },
    );
  });

  it('is one point where all four meet at saturation', () => {
    for (const dryBulbK of [213.15, 250, 273.15, 273.155, 273.16, 300, 340]) {
      const rest = { dryBulbK, pressurePa: 101_325 };
      const states = [
        moistAirFromDryBulbAndRelativeHumidity({ ...rest, relativeHumidityRatio: 1 }),
        moistAirFromDryBulbAndDewPoint({ ...rest, dewPointK: dryBulbK }),
        moistAirFromDryBulbAndWetBulb({ ...rest, wetBulbK: dryBulbK }),
      ];
      for (const state of states) {
        expect(state.wetBulbK).toBe(dryBulbK);
        expect(Math.abs(state.dewPointK! - dryBulbK)).toBeLessThan(1e-9);
        expect(state.dewPointK).toBeLessThanOrEqual(dryBulbK);
        expect(state.relativeHumidityRatio).toBeCloseTo(1, 12);
        expect(state.relativeHumidityRatio).toBeLessThanOrEqual(1);
      }
    }
  });

  it('has no more than saturation where the dew point lies an ulp below the dry bulb', () => {
    for (let dryBulbK = 214.1; dryBulbK < 363; dryBulbK += 0.07) {
      const dewPointK = dryBulbK * (1 - Number.EPSILON);
      const state = moistAirFromDryBulbAndDewPoint({ dryBulbK, dewPointK, pressurePa: 101_325 });
      expect(state.relativeHumidityRatio).toBeLessThanOrEqual(1);
    }
  });

  it('has a frost point below 0.01 °C and a relative humidity over ice', () => {
    const state = moistAirFromDryBulbAndRelativeHumidity({
      dryBulbK: 258.15,
      relativeHumidityRatio: 0.5,
      pressurePa: 101_325,
    });
    expect(state.vapourPressurePa).toBeCloseTo(0.5 * 165.3, 1);
    expect(state.wetBulbSurface).toBe('ice');
  });

  it('keeps a measured iced bulb and says so', () => {
    const state = moistAirFromDryBulbAndWetBulb({ dryBulbK: 278.15, wetBulbK: 273.05, pressurePa: 101_325 });
    expect(state.wetBulbK).toBe(273.05);
    expect(state.wetBulbSurface).toBe('ice');
  });

  it('has no dew point when dry, and everything else', () => {
    const dry = moistAirFromDryBulbAndRelativeHumidity({
      dryBulbK: 298.15,
      relativeHumidityRatio: 0,
      pressurePa: 101_325,
    });
    expect(dry).toMatchObject({ dewPointK: null, humidityRatio: 0, vapourPressurePa: 0, wetBulbSurface: 'water' });
    expect(dry.enthalpyJPerKg).toBeCloseTo(25_150, 6);
  });

  it('has a dew point down to −100 °C and none below', () => {
    const at = (vapourPressurePa: number) =>
      moistAirFromDryBulbAndRelativeHumidity({
        dryBulbK: 300,
        relativeHumidityRatio: vapourPressurePa / waterVapourSaturationPressurePa(300),
        pressurePa: 101_325,
      }).dewPointK;
    expect(at(0.001406)).toBeCloseTo(173.15, 2);
    expect(at(0.001404)).toBeNull();
  });
});

describe('enthalpy and specific volume', () => {
  it('are zero for dry air at 0 °C and that of the ideal gas', () => {
    expect(enthalpyJPerKg({ dryBulbK: 273.15, humidityRatio: 0 })).toBe(0);
    expect(specificVolumeM3PerKg({ dryBulbK: 300, humidityRatio: 0, pressurePa: 100e3 })).toBeCloseTo(0.861126, 9);
  });

  it('refuse what is out of range', () => {
    expect(refusal(() => enthalpyJPerKg({ dryBulbK: 400, humidityRatio: 0 }))).toMatch(/^out-of-range dryBulbK/);
    expect(refusal(() => enthalpyJPerKg({ dryBulbK: 300, humidityRatio: -1e-9 }))).toMatch(
      /^out-of-range humidityRatio/,
    );
    const volume = { dryBulbK: 300, humidityRatio: 0.01, pressurePa: 101_325 };
    expect(refusal(() => specificVolumeM3PerKg({ ...volume, pressurePa: 49_999 }))).toMatch(/^out-of-range pressurePa/);
    expect(refusal(() => specificVolumeM3PerKg({ ...volume, humidityRatio: Number.NaN }))).toMatch(
      /^out-of-range humidityRatio/,
    );
  });
});

describe('refusals of moist air', () => {
  const doors: readonly [string, (x: { dryBulbK: number; pressurePa: number }) => MoistAir][] = [
    ['wet bulb', (x) => moistAirFromDryBulbAndWetBulb({ ...x, wetBulbK: x.dryBulbK })],
    ['relative humidity', (x) => moistAirFromDryBulbAndRelativeHumidity({ ...x, relativeHumidityRatio: 0.5 })],
    ['dew point', (x) => moistAirFromDryBulbAndDewPoint({ ...x, dewPointK: x.dryBulbK })],
  ];
  const lowestK = -60 + 273.15;

  it.each(doors)('from %s: the limits are inside, an ulp beyond is refused', (_, door) => {
    expect(door({ dryBulbK: lowestK, pressurePa: 50e3 }).dryBulbK).toBe(lowestK);
    expect(door({ dryBulbK: 363.15, pressurePa: 110e3 }).pressurePa).toBe(110e3);
    const down = 1 - Number.EPSILON;
    const up = 1 + Number.EPSILON;
    expect(refusal(() => door({ dryBulbK: lowestK * down, pressurePa: 1e5 }))).toMatch(/^out-of-range dryBulbK/);
    expect(refusal(() => door({ dryBulbK: 363.15 * up, pressurePa: 1e5 }))).toMatch(/^out-of-range dryBulbK/);
    expect(refusal(() => door({ dryBulbK: 300, pressurePa: 50e3 * down }))).toMatch(/^out-of-range pressurePa/);
    expect(refusal(() => door({ dryBulbK: 300, pressurePa: 110e3 * up }))).toMatch(/^out-of-range pressurePa/);
  });

  it.each(doors)('from %s: NaN and infinities are refused', (_, door) => {
    for (const bad of [Number.NaN, Infinity, -Infinity]) {
      expect(refusal(() => door({ dryBulbK: bad, pressurePa: 1e5 }))).toMatch(/^out-of-range dryBulbK/);
      expect(refusal(() => door({ dryBulbK: 300, pressurePa: bad }))).toMatch(/^out-of-range pressurePa/);
    }
  });

  it('name the reading at fault', () => {
    const room = { dryBulbK: 300, pressurePa: 101_325 };
    const hot = { dryBulbK: 363.15, pressurePa: 50e3 };
    expect(refusal(() => moistAirFromDryBulbAndWetBulb({ ...room, wetBulbK: 300.01 }))).toMatch(
      /wet-bulb-above-dry-bulb$/,
    );
    expect(refusal(() => moistAirFromDryBulbAndWetBulb({ ...room, wetBulbK: 280 }))).toMatch(/wet-bulb-too-low$/);
    expect(refusal(() => moistAirFromDryBulbAndDewPoint({ ...room, dewPointK: 300.01 }))).toMatch(
      /dew-point-above-dry-bulb$/,
    );
    expect(refusal(() => moistAirFromDryBulbAndRelativeHumidity({ ...room, relativeHumidityRatio: 1.01 }))).toMatch(
      /outside-0-to-1$/,
    );
    for (const boiling of [
      () => moistAirFromDryBulbAndRelativeHumidity({ ...hot, relativeHumidityRatio: 0.9 }),
      () => moistAirFromDryBulbAndDewPoint({ ...hot, dewPointK: 360 }),
      () => moistAirFromDryBulbAndWetBulb({ ...hot, wetBulbK: 360 }),
    ]) {
      expect(refusal(boiling)).toBe('inconsistent-inputs vapourPressurePa vapour-pressure-not-below-total');
    }
  });
});
