import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { moistAirEnthalpyBtuPerLb } from '../units/moist-air';
import { temperatureFromK } from '../units/temperature';
import {
  dryBulbKByEnthalpy,
  enthalpyBy,
  enthalpyImbalance,
  enthalpyJPerKg,
  humidityRatioByEnthalpy,
  INCH_POUND_ENTHALPY,
  SI_ENTHALPY,
} from './enthalpy';
import { humidityRatioFromRelativeHumidity } from './humidity-ratio';
import { TRIPLE_POINT_K, waterVapourSaturationPressurePa } from './saturation-pressure';

const between = (low: number, high: number) =>
  fc.integer({ min: 0, max: 1_000_000 }).map((k) => low + ((high - low) * k) / 1_000_000);

describe('eq. 30', () => {
  it.each([SI_ENTHALPY, INCH_POUND_ENTHALPY])('$quantity is undone by its two inverses', (equation) => {
    fc.assert(
      fc.property(between(213.15, 363.15), between(0, 2), (dryBulbK, humidityRatio) => {
        const enthalpy = enthalpyBy(equation, { dryBulbK, humidityRatio });
        expect(Math.abs(dryBulbKByEnthalpy(equation, { humidityRatio, enthalpy }) - dryBulbK)).toBeLessThan(1e-11);
        expect(Math.abs(humidityRatioByEnthalpy(equation, { dryBulbK, enthalpy }) - humidityRatio)).toBeLessThan(1e-14);
      }),
    );
  });

  it('in inch-pound units is the one printed with °F', () => {
    fc.assert(
      fc.property(between(213.15, 363.15), between(0, 2), (dryBulbK, humidityRatio) => {
        const printed = moistAirEnthalpyBtuPerLb(temperatureFromK(dryBulbK, 'degF'), humidityRatio);
        expect(enthalpyBy(INCH_POUND_ENTHALPY, { dryBulbK, humidityRatio })).toBeCloseTo(printed, 9);
      }),
    );
  });

  it('at 30 °C and 10 g/kg is 55.748 kJ/kg by hand: 1.006 · 30 + 0.01 · (2501 + 1.86 · 30)', () => {
    expect(enthalpyJPerKg({ dryBulbK: 303.15, humidityRatio: 0.01 })).toBeCloseTo(55_748, 6);
    expect(dryBulbKByEnthalpy(SI_ENTHALPY, { humidityRatio: 0.01, enthalpy: 55_748 })).toBeCloseTo(303.15, 9);
    expect(humidityRatioByEnthalpy(SI_ENTHALPY, { dryBulbK: 303.15, enthalpy: 55_748 })).toBeCloseTo(0.01, 12);
  });
});

describe('enthalpyImbalance', () => {
  const trial = fc
    .record({
      relativeHumidityRatio: between(0, 1),
      enthalpy: between(-60e3, 1e6),
      pressurePa: between(50e3, 110e3),
      dryBulbK: between(213.16, 363.14),
    })
    .filter(({ dryBulbK }) => Math.abs(dryBulbK - TRIPLE_POINT_K) > 0.01);

  it('has the slope of its central difference and falls, also where the vapour would boil', () => {
    fc.assert(
      fc.property(trial, ({ dryBulbK, ...air }) => {
        const h = 1e-3;
        const [, slope] = enthalpyImbalance(SI_ENTHALPY, air, dryBulbK);
        const difference =
          enthalpyImbalance(SI_ENTHALPY, air, dryBulbK + h)[0] - enthalpyImbalance(SI_ENTHALPY, air, dryBulbK - h)[0];
        expect(Math.abs(difference / (2 * h) / slope - 1)).toBeLessThan(1e-6);
        expect(slope).toBeLessThan(0);
      }),
      { numRuns: 2000 },
    );
  });

  it('is zero at the dry bulb', () => {
    fc.assert(
      fc.property(trial, ({ dryBulbK, relativeHumidityRatio, pressurePa }) => {
        fc.pre(relativeHumidityRatio * waterVapourSaturationPressurePa(dryBulbK) < 0.9 * pressurePa);
        const humidityRatio = humidityRatioFromRelativeHumidity({ dryBulbK, relativeHumidityRatio, pressurePa });
        const given = enthalpyJPerKg({ dryBulbK, humidityRatio });
        const air = { relativeHumidityRatio, enthalpy: given, pressurePa };
        const [value, slope] = enthalpyImbalance(SI_ENTHALPY, air, dryBulbK);
        expect(Math.abs(value / slope)).toBeLessThan(1e-11);
      }),
    );
  });
});
