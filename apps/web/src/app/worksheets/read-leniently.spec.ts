import { readAirflowRequest, readWeighInRequest } from '@chargewright/engine';
import type { AirflowRequest, WeighInRequest } from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import { readLeniently } from './read-leniently';

describe('a request with faulty entries', () => {
  it('is read without them, and each is named', () => {
    const request: AirflowRequest = {
      method: 'temperature-rise-electric',
      lineVoltage: { value: -240, unit: 'V' },
      heaterCurrent: { value: 40, unit: 'A', plusMinus: { value: -1, unit: 'A' } },
      returnDryBulb: { value: 70, unit: 'degF' },
    };
    const { input, faults } = readLeniently(request, readAirflowRequest);
    expect(faults.map(({ path }) => path)).toEqual(['lineVoltage', 'heaterCurrent.plusMinus']);
    expect(input?.method === 'temperature-rise-electric' && [input.voltage.state, input.current.state]).toEqual([
      'missing',
      'missing',
    ]);
  });

  it('loses a faulty table as a whole, but only one faulty length of a line', () => {
    const table = {
      staticPressureUnit: 'inH2O',
      airflowUnit: 'cfm',
      rows: [{ staticPressure: NaN, airflow: 1 }],
    } as const;
    const fan = readLeniently({ method: 'static-pressure', fanTable: table }, readAirflowRequest);
    expect(fan.input && 'table' in fan.input).toBe(false);
    const request: WeighInRequest = {
      refrigerant: 'R-410A',
      kind: 'ducted',
      method: 'total',
      line: { installedLength: { value: -1, unit: 'ft' }, includedLength: { value: 15, unit: 'ft' } },
    };
    const { input, faults } = readLeniently(request, readWeighInRequest);
    expect(faults.map(({ path }) => path)).toEqual(['line.installedLength']);
    expect(input?.line.includedLengthM).toBeCloseTo(4.572, 9);
    expect(input?.line.installedLengthM).toBeUndefined();
  });

  it('is not read where what is faulty cannot be left out', () => {
    const faulty = { ok: false, faults: [{ code: 'unknown-refrigerant', figures: {}, path: 'none-of-it' }] } as const;
    expect(readLeniently({ a: 1 }, () => faulty)).toEqual({ input: null, faults: faulty.faults });
  });
});
