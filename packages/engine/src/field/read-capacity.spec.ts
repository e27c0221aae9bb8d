import { describe, expect, it } from 'vitest';
import type { Quantity } from '../derivation/quantity';
import { expandedUncertainty, isKnown } from '../derivation/quantity';
import { evaluateCapacity } from '../methods/capacity/evaluate-capacity';
import { powerFromW, temperatureToK } from '../units';
import type { CapacityRequest } from './field-request';
import { crossCheckCapacity, readCapacityRequest } from './read-capacity';

/** 80/67 °F in, 58/57 °F out: the rating point with an ordinary supply. */
const REQUEST = {
  airflow: { value: 1200, unit: 'cfm' },
  elevation: { value: 0, unit: 'ft' },
  nominalCapacity: { value: 3, unit: 'ton' },
  returnDryBulb: { value: 80, unit: 'degF' },
  returnWetBulb: { value: 67, unit: 'degF' },
  supplyDryBulb: { value: 58, unit: 'degF' },
  supplyWetBulb: { value: 57, unit: 'degF' },
} as const satisfies CapacityRequest;

function resultOf(request: CapacityRequest) {
  const read = readCapacityRequest(request);
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  return evaluateCapacity(read.input);
}
function value(quantity: Quantity): number {
  if (!isKnown(quantity)) throw new Error(`not known: ${JSON.stringify(quantity)}`);
  return quantity.value;
}

describe('a request for a capacity', () => {
  it('is the trade’s sum within the density of the return air: 4.5 × cfm × Δh, 1.08 × cfm × ΔT', () => {
    const result = resultOf(REQUEST);
    // enthalpies of 67 and 57 °F wet bulb at sea level, Btu/lb: 31.4 and 24.5 (psychrometric chart, from memory)
    expect(powerFromW(value(result.totalW), 'Btu/h') / (4.5 * 1200 * (31.4 - 24.5))).toBeCloseTo(0.97, 1);
    expect(powerFromW(value(result.sensibleW), 'Btu/h') / (1.08 * 1200 * 22)).toBeCloseTo(0.98, 1);
    expect(value(result.sensibleHeatRatio)).toBeCloseTo(value(result.sensibleW) / value(result.totalW), 12);
    expect(value(result.ofNominal)).toBeCloseTo(powerFromW(value(result.totalW), 'ton') / 3, 12);
    expect(result.reason).toBeNull();
    expect(result.cautions).toEqual([]);
  });

  it('gives the same in °C, m³/h and kW', () => {
    const celsius = (degF: number) => ({ value: temperatureToK(degF, 'degF') - 273.15, unit: 'degC' }) as const;
    const metric = resultOf({
      airflow: { value: 1200 * 0.3048 ** 3 * 60, unit: 'm3/h' },
      elevation: { value: 0, unit: 'm' },
      nominalCapacity: { value: (3 * 12_000 * 1055.05585262) / 3.6e6, unit: 'kW' },
      returnDryBulb: celsius(80),
      returnWetBulb: celsius(67),
      supplyDryBulb: celsius(58),
      supplyWetBulb: celsius(57),
    });
    const inchPound = resultOf(REQUEST);
    expect(value(metric.totalW) / value(inchPound.totalW)).toBeCloseTo(1, 9);
    expect(value(metric.ofNominal)).toBeCloseTo(value(inchPound.ofNominal), 9);
  });

  it('takes relative humidity in place of a wet bulb', () => {
    const { returnWetBulb: _, supplyWetBulb: __, ...bulbs } = REQUEST;
    const result = resultOf({
      ...bulbs,
      returnRelativeHumidity: { value: 51.1, unit: '%' },
      supplyRelativeHumidity: { value: 94.2, unit: '%' },
    });
    expect(value(result.totalW) / value(resultOf(REQUEST).totalW)).toBeCloseTo(1, 1);
  });

  it('counts the condensate where it is asked to', () => {
    const ratio = value(resultOf({ ...REQUEST, condensate: 'counted' }).totalW) / value(resultOf(REQUEST).totalW);
    expect(ratio).toBeGreaterThan(0.99);
    expect(ratio).toBeLessThan(0.997);
  });

  it('carries the ± of the airflow it is given', () => {
    const plusMinus = { value: 120, unit: 'cfm', kind: 'k2' } as const;
    const wide = resultOf({ ...REQUEST, airflow: { ...REQUEST.airflow, plusMinus } });
    const narrow = resultOf({ ...REQUEST, airflow: { ...REQUEST.airflow, plusMinus: { ...plusMinus, value: 0 } } });
    const relative = (quantity: Quantity) => (isKnown(quantity) ? expandedUncertainty(quantity) / quantity.value : NaN);
    expect(relative(wide.totalW) ** 2 - relative(narrow.totalW) ** 2).toBeCloseTo(0.01, 4);
  });

  it('names what is missing', () => {
    expect(resultOf({}).reason).toMatchObject({
      code: 'inputs-missing',
      inputs: expect.arrayContaining(['airflow', 'returnDryBulb', 'supplyWetBulb']) as unknown,
    });
    const { airflow: _, ...without } = REQUEST;
    expect(resultOf(without).reason).toEqual({ code: 'inputs-missing', inputs: ['airflow'] });
  });

  it('says that sea level was taken, and what a coil does not do', () => {
    const { elevation: _, ...nowhere } = REQUEST;
    expect(
      resultOf({ ...nowhere, supplyDryBulb: { value: 81, unit: 'degF' }, supplyWetBulb: { value: 75, unit: 'degF' } })
        .cautions,
    ).toEqual(['elevation-assumed', 'supply-wetter-than-return', 'no-cooling']);
  });

  it('has no total for air that cannot be', () => {
    expect(resultOf({ ...REQUEST, supplyWetBulb: { value: 20, unit: 'degF' } }).reason).toEqual({
      code: 'outside-range',
    });
    expect(resultOf({ ...REQUEST, airflow: { value: 0, unit: 'cfm' } }).reason).toEqual({ code: 'outside-range' });
  });

  it('tells every fault at once', () => {
    const faults = crossCheckCapacity({
      airflow: { value: -1, unit: 'cfm' },
      nominalCapacity: { value: -3, unit: 'ton' },
      stationPressure: { value: 14, unit: 'psig' },
      supplyDryBulb: { value: 58, unit: 'degF' },
      supplyWetBulb: { value: 59, unit: 'degF' },
    });
    expect(faults.map(({ path, code }) => `${path} ${code}`)).toEqual([
      'stationPressure gauge-unit-on-absolute',
      'airflow must-not-be-negative',
      'supplyWetBulb wet-bulb-above-dry-bulb',
      'nominalCapacity must-be-positive',
    ]);
    expect(readCapacityRequest({ airflow: { value: -1, unit: 'cfm' } }).ok).toBe(false);
  });
});
