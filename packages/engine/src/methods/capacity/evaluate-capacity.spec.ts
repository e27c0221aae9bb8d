import { describe, expect, it } from 'vitest';
import type { Known, Quantity } from '../../derivation/quantity';
import { isKnown, leaf, missing } from '../../derivation/quantity';
import { moistAirFromDryBulbAndWetBulb } from '../../psychrometrics/moist-air';
import { flowToM3PerS, moistAirEnthalpyBtuPerLb, powerFromW, powerToW, temperatureToK } from '../../units';
import type { CapacityInput } from './evaluate-capacity';
import { evaluateCapacity } from './evaluate-capacity';

const SEA_LEVEL_PA = 101_325;
const exactly = (id: string, kind: Known['kind'], value: number, u = 0): Known =>
  leaf({ id, kind, value, origin: 'reading', parts: u > 0 ? [{ key: `reading:${id}`, u, shape: 'rectangular' }] : [] });
const degF = (id: string, value: number, u = 0): Known => exactly(id, 'temperatureK', temperatureToK(value, 'degF'), u);
const air = (dryBulbF: number, wetBulbF: number) =>
  moistAirFromDryBulbAndWetBulb({
    dryBulbK: temperatureToK(dryBulbF, 'degF'),
    wetBulbK: temperatureToK(wetBulbF, 'degF'),
    pressurePa: SEA_LEVEL_PA,
  });

function known(quantity: Quantity): Known {
  if (!isKnown(quantity)) throw new Error(`not known: ${JSON.stringify(quantity)}`);
  return quantity;
}
const value = (quantity: Quantity): number => known(quantity).value;

/** 80/67 °F in, 58/57 °F out, 1200 cfm of standard air, 3 tons nominal. */
const INPUT: CapacityInput = {
  airflow: exactly('airflow', 'flowM3PerS', flowToM3PerS(1200, 'cfm')),
  airflowIn: 'standard',
  returnAir: { dryBulb: degF('returnDryBulb', 80), wetBulb: degF('returnWetBulb', 67) },
  supplyAir: { dryBulb: degF('supplyDryBulb', 58), wetBulb: degF('supplyWetBulb', 57) },
  atmosphere: exactly('atmosphere', 'pressurePa', SEA_LEVEL_PA),
  nominalCapacity: exactly('nominalCapacity', 'powerW', powerToW(3, 'ton')),
};

describe('delivered capacity', () => {
  it('is 4.5 × cfm × enthalpy difference in Btu/h for standard air, by the inch-pound enthalpies', () => {
    const before = air(80, 67);
    const after = air(58, 57);
    const dh = moistAirEnthalpyBtuPerLb(80, before.humidityRatio) - moistAirEnthalpyBtuPerLb(58, after.humidityRatio);
    const btuPerHour = powerFromW(value(evaluateCapacity(INPUT).totalW), 'Btu/h');
    // eq. 30 prints its coefficients rounded apart in each unit system
    expect(btuPerHour / (4.5 * 1200 * dh)).toBeCloseTo(1, 2);
    expect(Math.abs(btuPerHour / (4.5 * 1200 * dh) - 1)).toBeLessThan(0.002);
  });

  it('has a sensible part of 1.08 to 1.10 × cfm × temperature difference', () => {
    const perCfmDegF = powerFromW(value(evaluateCapacity(INPUT).sensibleW), 'Btu/h') / (1200 * 22);
    expect(perCfmDegF).toBeGreaterThan(1.08);
    expect(perCfmDegF).toBeLessThan(1.11);
  });

  it('is sensible and latent heat exactly: what is not sensible condensed at the return temperature', () => {
    const result = evaluateCapacity(INPUT);
    const drop = air(80, 67).humidityRatio - air(58, 57).humidityRatio;
    const vapour = 1e3 * (2501 + 1.86 * (temperatureToK(80, 'degF') - 273.15));
    const latent = value(result.dryAirMassFlowKgPerS) * drop * vapour;
    expect(value(result.totalW)).toBeCloseTo(value(result.sensibleW) + latent, 6);
    expect(value(result.sensibleHeatRatio)).toBeCloseTo(value(result.sensibleW) / value(result.totalW), 12);
    expect(value(result.ofNominal)).toBeCloseTo(value(result.totalW) / powerToW(3, 'ton'), 12);
  });

  it('takes the mass from the place where the flow was measured', () => {
    for (const place of ['return', 'supply'] as const) {
      const { specificVolumeM3PerKg } = place === 'return' ? air(80, 67) : air(58, 57);
      const result = evaluateCapacity({ ...INPUT, airflowIn: place });
      expect(value(result.dryAirMassFlowKgPerS)).toBeCloseTo(flowToM3PerS(1200, 'cfm') / specificVolumeM3PerKg, 12);
      expect(result.steps.map(({ id }) => id)).toContain(`${place}SpecificVolume`);
    }
  });

  it('reads relative humidity in place of a wet bulb', () => {
    const relativeHumidity = (id: string, ratio: number): Known => exactly(id, 'fraction', ratio);
    const result = evaluateCapacity({
      ...INPUT,
      returnAir: {
        dryBulb: degF('returnDryBulb', 80),
        relativeHumidity: relativeHumidity('returnRelativeHumidity', air(80, 67).relativeHumidityRatio),
      },
      supplyAir: {
        dryBulb: degF('supplyDryBulb', 58),
        relativeHumidity: relativeHumidity('supplyRelativeHumidity', air(58, 57).relativeHumidityRatio),
      },
    });
    expect(value(result.totalW)).toBeCloseTo(value(evaluateCapacity(INPUT).totalW), 3);
    expect(result.steps.map(({ id }) => id)).toEqual(expect.arrayContaining(['returnWetBulb', 'supplyWetBulb']));
  });

  it('loses a little to the condensate where that is counted', () => {
    const counted = value(evaluateCapacity({ ...INPUT, condensate: 'counted' }).totalW);
    const neglected = value(evaluateCapacity(INPUT).totalW);
    const drop = air(80, 67).humidityRatio - air(58, 57).humidityRatio;
    const condensate = drop * 4190 * (temperatureToK(58, 'degF') - 273.15);
    expect(neglected - counted).toBeCloseTo(value(evaluateCapacity(INPUT).dryAirMassFlowKgPerS) * condensate, 6);
    expect(counted / neglected).toBeGreaterThan(0.99);
    expect(counted / neglected).toBeLessThan(0.998);
  });

  it('has no condensate where the supply is wetter, and says so', () => {
    const supplyAir = { dryBulb: degF('supplyDryBulb', 70), wetBulb: degF('supplyWetBulb', 69) };
    const result = evaluateCapacity({ ...INPUT, supplyAir, condensate: 'counted' });
    expect(result.cautions).toEqual(['supply-wetter-than-return']);
    expect(value(result.totalW)).toBeCloseTo(value(evaluateCapacity({ ...INPUT, supplyAir }).totalW), 9);
  });

  it('has no ratio of sensible to total where nothing was cooled', () => {
    const supplyAir = { dryBulb: degF('supplyDryBulb', 85), wetBulb: degF('supplyWetBulb', 69) };
    const result = evaluateCapacity({ ...INPUT, supplyAir });
    expect(value(result.totalW)).toBeLessThan(0);
    expect(result.sensibleHeatRatio.state).toBe('refused');
    expect(result.cautions).toContain('no-cooling');
  });

  it('says what is missing', () => {
    const result = evaluateCapacity({ ...INPUT, supplyAir: { dryBulb: degF('supplyDryBulb', 58) } });
    expect(result.totalW).toEqual(missing('supplyWetBulb'));
    const { nominalCapacity: _, ...without } = INPUT;
    expect(evaluateCapacity(without).ofNominal).toEqual(missing('nominalCapacity'));
    expect(evaluateCapacity({ ...INPUT, airflow: missing('airflow') }).sensibleW).toEqual(missing('airflow'));
  });

  it('refuses a wet bulb above its dry bulb', () => {
    const supplyAir = { dryBulb: degF('supplyDryBulb', 58), wetBulb: degF('supplyWetBulb', 60) };
    expect(evaluateCapacity({ ...INPUT, supplyAir }).totalW.state).toBe('refused');
  });

  it('carries the ± of the airflow whole, and that of one thermometer through split and enthalpy together', () => {
    const flow = exactly('airflow', 'flowM3PerS', flowToM3PerS(1200, 'cfm'), flowToM3PerS(84, 'cfm') / Math.sqrt(3));
    const result = evaluateCapacity({ ...INPUT, airflow: flow });
    const total = known(result.totalW);
    const fromFlow = total.contributions.get('reading:airflow')!;
    expect(fromFlow / total.value).toBeCloseTo(0.07 / Math.sqrt(3), 9);
    // in the ratio the airflow cancels, but for what secants over ±4 % bend
    expect(known(result.sensibleHeatRatio).contributions.get('reading:airflow')).toBeCloseTo(0, 3);
    expect(total.contributions.get('placement:supplyEnthalpy')).toBeLessThan(0);
  });
});
