/**
 * What `GET /api/v1/psychrometrics` answers for every pair of readings, against an independent library of the same equations (psychrolib, MIT, its version
 * 2.5.0) in both of its unit systems, so that the datum of each enthalpy is looked at too, and against Example 1 of the Handbook.
 */
import { createRequire } from 'node:module';
import { beforeAll, describe, expect, it } from 'vitest';
import { lookUpMoistAir } from '../../../apps/api/src/features/psychrometrics/psychrometrics-service';

interface Oracle {
  readonly SI: number;
  readonly IP: number;
  SetUnitSystem(system: number): void;
  GetHumRatioFromTWetBulb(dryBulb: number, wetBulb: number, pressure: number): number;
  GetVapPresFromHumRatio(humidityRatio: number, pressure: number): number;
  GetTDewPointFromTWetBulb(dryBulb: number, wetBulb: number, pressure: number): number;
  GetRelHumFromTWetBulb(dryBulb: number, wetBulb: number, pressure: number): number;
  GetMoistAirEnthalpy(dryBulb: number, humidityRatio: number): number;
  GetMoistAirVolume(dryBulb: number, humidityRatio: number, pressure: number): number;
}

const oracle = createRequire(import.meta.url)('psychrolib') as Oracle;

const NAMES = ['dryBulb', 'wetBulb', 'dewPoint', 'relativeHumidity', 'humidityRatio', 'enthalpy'] as const;
type Name = (typeof NAMES)[number];
type Readings = Readonly<Record<Name, number>>;

const REFUSED = ['wetBulb enthalpy', 'dewPoint humidityRatio'];
const PAIRS = NAMES.flatMap((one, k) => NAMES.slice(k + 1).map((other) => [one, other] as const)).filter(
  (pair) => !REFUSED.includes(pair.join(' ')),
);

function oracleState(dryBulb: number, wetBulb: number, pressure: number) {
  const humidityRatio = oracle.GetHumRatioFromTWetBulb(dryBulb, wetBulb, pressure);
  return {
    readings: {
      dryBulb,
      wetBulb,
      dewPoint: oracle.GetTDewPointFromTWetBulb(dryBulb, wetBulb, pressure),
      relativeHumidity: 100 * oracle.GetRelHumFromTWetBulb(dryBulb, wetBulb, pressure),
      humidityRatio,
      enthalpy: oracle.GetMoistAirEnthalpy(dryBulb, humidityRatio),
    } satisfies Readings,
    specificVolume: oracle.GetMoistAirVolume(dryBulb, humidityRatio, pressure),
    vaporPressure: oracle.GetVapPresFromHumRatio(humidityRatio, pressure),
  };
}

const answer = (pair: readonly Name[], readings: Readings, rest: Readonly<Record<string, string>>) =>
  lookUpMoistAir({ ...Object.fromEntries(pair.map((name) => [name, String(readings[name])])), ...rest });

/**
 * Largest differences allowed, just above those found. Eq. 33 IP has rounded constants of its own, so that the oracle's inch-pound wet bulb lies up to
 * 0.0155 °F from that of eq. 33 SI, which this engine computes with, and what comes from it accordingly.
 */
const ALLOWED_INCH_POUND: Readings = {
  dryBulb: 0.05,
  wetBulb: 0.016,
  dewPoint: 0.07,
  relativeHumidity: 0.025,
  humidityRatio: 1.1e-5,
  enthalpy: 0.012,
};
/** In SI both compute with the same printed constants: only the solvers differ. */
const ALLOWED_SI: Readings = {
  dryBulb: 1e-7,
  wetBulb: 1e-7,
  dewPoint: 1e-7,
  relativeHumidity: 1e-7,
  humidityRatio: 1e-10,
  enthalpy: 1e-7,
};

describe.each(PAIRS)('moist air from %s and %s', (...pair) => {
  it.each([
    ['a cooling coil’s return air', 80, 67],
    ['desert air', 105, 64],
    ['near saturation', 62, 61.5],
  ])('is the oracle’s in inch-pound units: %s', (_, dryBulb, wetBulb) => {
    oracle.SetUnitSystem(oracle.IP);
    // 101,325 Pa in psi
    const expected = oracleState(dryBulb, wetBulb, 101_325 / 6894.757293168);
    const got = answer(pair, expected.readings, { unit: 'degF' });
    for (const name of NAMES) {
      expect(Math.abs((got[name]?.value ?? NaN) - expected.readings[name]), name).toBeLessThan(
        ALLOWED_INCH_POUND[name],
      );
    }
    expect(got.enthalpy.unit).toBe('Btu/lb');
    expect(got.specificVolume.value).toBeCloseTo(expected.specificVolume, 2);
    expect(got.vaporPressure.value).toBeCloseTo(expected.vaporPressure, 3);
  });

  it.each([
    ['summer air', 32, 23],
    ['return air', 24, 17],
  ])('is the oracle’s in SI: %s', (_, dryBulb, wetBulb) => {
    oracle.SetUnitSystem(oracle.SI);
    const expected = oracleState(dryBulb, wetBulb, 101_325);
    const readings = { ...expected.readings, enthalpy: expected.readings.enthalpy / 1e3 };
    const got = answer(pair, readings, { unit: 'degC' });
    for (const name of NAMES) {
      expect(Math.abs((got[name]?.value ?? NaN) - readings[name]), name).toBeLessThan(ALLOWED_SI[name]);
    }
    expect(got.enthalpy.unit).toBe('kJ/kg');
    expect(got.specificVolume.value).toBeCloseTo(expected.specificVolume, 4);
  });
});

describe('Example 1 of ASHRAE Fundamentals (2017) ch. 1, 100 °F and 65 °F wet bulb, through every pair', () => {
  let example: Readings;
  beforeAll(() => {
    const { dryBulb, wetBulb, dewPoint, relativeHumidity, humidityRatio, enthalpy } = lookUpMoistAir({
      dryBulb: '100',
      wetBulb: '65',
      unit: 'degF',
    });
    example = {
      dryBulb: dryBulb.value,
      wetBulb: wetBulb.value,
      dewPoint: dewPoint?.value ?? NaN,
      relativeHumidity: relativeHumidity.value,
      humidityRatio: humidityRatio.value,
      enthalpy: enthalpy.value,
    };
  });

  it.each(PAIRS)('%s and %s', (...pair) => {
    const got = answer(pair, example, { unit: 'degF' });
    // printed answers are chart readings; allowed as in worked-states.ts
    expect(Math.abs(got.humidityRatio.value - 0.00523)).toBeLessThan(0.001);
    expect(Math.abs((got.dewPoint?.value ?? NaN) - 40)).toBeLessThan(1);
    expect(Math.abs(got.relativeHumidity.value - 13)).toBeLessThan(1);
    expect(Math.abs(got.enthalpy.value - 29.8)).toBeLessThan(0.1);
    expect(Math.abs(got.specificVolume.value / 14.22 - 1)).toBeLessThan(0.01);
    // and the readings it came from, by our own equations
    for (const name of NAMES) expect(got[name]?.value).toBeCloseTo(example[name], 6);
  });
});
