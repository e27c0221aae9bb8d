import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { attempt } from '../result';
import { moistAirEnthalpyBtuPerLb } from '../units/moist-air';
import { temperatureFromK, temperatureToK } from '../units/temperature';
import { moistAirFromInchPoundEnthalpy, type InchPoundEnthalpyPair } from './inch-pound-enthalpy';
import { moistAirFromDryBulbAndRelativeHumidity, type MoistAir } from './moist-air';

const SEA_LEVEL_PA = 101_325;
const from = (pair: InchPoundEnthalpyPair): MoistAir =>
  moistAirFromInchPoundEnthalpy({ pressurePa: SEA_LEVEL_PA, ...pair });
const btuPerLb = ({ dryBulbK, humidityRatio }: MoistAir): number =>
  moistAirEnthalpyBtuPerLb(temperatureFromK(dryBulbK, 'degF'), humidityRatio);
const degF = (value: number): number => temperatureToK(value, 'degF');

const between = (low: number, high: number) =>
  fc.integer({ min: 0, max: 1_000_000 }).map((k) => low + ((high - low) * k) / 1_000_000);

function refusal(pair: InchPoundEnthalpyPair) {
  const result = attempt(() => from(pair));
  if (result.ok) throw new Error(`not refused: ${JSON.stringify(result.value)}`);
  const { kind, details } = result.error;
  return { ...details, code: `${kind} ${details.quantity} ${details.reason}` };
}

describe('an enthalpy in Btu/lb', () => {
  it('leads back to the state it came from, with each of its four partners', () => {
    fc.assert(
      fc.property(between(-70, 190), between(0.001, 1), between(60e3, 110e3), (dryBulbF, rh, pressurePa) => {
        const state = attempt(() =>
          moistAirFromDryBulbAndRelativeHumidity({ dryBulbK: degF(dryBulbF), relativeHumidityRatio: rh, pressurePa }),
        );
        // near boiling the humidity magnifies the solver's 1e-9 K without limit
        fc.pre(state.ok && state.value.dewPointK !== null && state.value.vapourPressurePa < 0.5 * pressurePa);
        if (!state.ok) return;
        const { dryBulbK, dewPointK, humidityRatio, relativeHumidityRatio } = state.value;
        const enthalpyBtuPerLb = btuPerLb(state.value);
        for (const partner of [{ dryBulbK }, { dewPointK }, { humidityRatio }, { relativeHumidityRatio }]) {
          const pair = { enthalpyBtuPerLb, pressurePa, ...partner } as InchPoundEnthalpyPair & { pressurePa: number };
          const back = moistAirFromInchPoundEnthalpy(pair);
          expect(Math.abs(back.dryBulbK - dryBulbK)).toBeLessThan(1e-7);
          expect(Math.abs(back.humidityRatio / humidityRatio - 1)).toBeLessThan(1e-6);
          expect(Math.abs(btuPerLb(back) - enthalpyBtuPerLb)).toBeLessThan(1e-6);
        }
      }),
      { numRuns: 500 },
    );
  });

  it('counts from dry air at 0 °F', () => {
    expect(from({ enthalpyBtuPerLb: 0, humidityRatio: 0 }).dryBulbK).toBeCloseTo(degF(0), 9);
    expect(from({ enthalpyBtuPerLb: 7.68, humidityRatio: 0 }).enthalpyJPerKg).toBeCloseTo(0, 6);
  });

  it('is refused below that of dry air and above that of saturated air, in Btu/lb', () => {
    // 0.240 · 80 Btu/lb by hand
    const below = refusal({ enthalpyBtuPerLb: 19.1, dryBulbK: degF(80) });
    expect(below.code).toBe('inconsistent-inputs enthalpyBtuPerLb below-dry-air');
    expect(below.min).toBeCloseTo(19.2, 9);
    const saturated = moistAirFromDryBulbAndRelativeHumidity({
      dryBulbK: degF(80),
      relativeHumidityRatio: 1,
      pressurePa: SEA_LEVEL_PA,
    });
    const above = refusal({ enthalpyBtuPerLb: 44, dryBulbK: degF(80) });
    expect(above.code).toBe('inconsistent-inputs enthalpyBtuPerLb above-saturation');
    expect(above.max).toBeCloseTo(btuPerLb(saturated), 9);
    const { dewPointK, humidityRatio } = saturated;
    for (const partner of [{ dewPointK: dewPointK! }, { humidityRatio }]) {
      const cold = refusal({ enthalpyBtuPerLb: 43, ...partner });
      expect(cold.code).toBe('inconsistent-inputs enthalpyBtuPerLb below-saturation');
      expect(cold.min).toBeCloseTo(btuPerLb(saturated), 6);
    }
  });

  it('is refused out of range: dry air at −60 °C has −18.24, 1 GJ/kg is 429,923', () => {
    const { code, min, max } = refusal({ enthalpyBtuPerLb: -18.25, humidityRatio: 0 });
    expect(code).toBe('out-of-range enthalpyBtuPerLb outside-moist-air-range');
    expect(min).toBeCloseTo(-18.24, 9);
    expect(max).toBeCloseTo(429_923, 0);
    expect(refusal({ enthalpyBtuPerLb: 60, humidityRatio: 0 }).code).toBe(
      'out-of-range dryBulbK outside-moist-air-range',
    );
  });

  it('does not determine a state together with a wet bulb', () => {
    const { code } = refusal({ enthalpyBtuPerLb: 30, wetBulbK: degF(65) });
    expect(code).toBe('not-supported enthalpyBtuPerLb near-parallel-pair');
  });
});
