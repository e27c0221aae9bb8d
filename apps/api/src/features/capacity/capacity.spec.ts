import { capacityAnswer } from '@chargewright/contract/capacity';
import type { CapacityAnswer } from '@chargewright/contract/capacity';
import { problem } from '@chargewright/contract/problem';
import { evaluateCapacity, expandedUncertainty, isKnown, powerFromW, readCapacityRequest } from '@chargewright/engine';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { CAPACITY_EXAMPLE } from '../../testing/field-examples';
import { startTestServer } from '../../testing/test-server';
import type { TestServer } from '../../testing/test-server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const PATH = '/api/v1/capacity';

async function found(body: unknown): Promise<CapacityAnswer> {
  const response = await server.postJson(PATH, body);
  expect(response.status).toBe(200);
  return capacityAnswer.parse(await response.json());
}

describe('a capacity', () => {
  it('is answered in the shape of the contract, to any origin, and kept nowhere', async () => {
    const response = await server.postJson(PATH, CAPACITY_EXAMPLE);
    const body: unknown = await response.json();
    expect(capacityAnswer.parse(body)).toEqual(body);
    expect(response.headers.get('cache-control')).toBe('no-store');
    expect(response.headers.get('access-control-allow-origin')).toBe('*');
  });

  it('is the engine’s, with its ± for k = 2', async () => {
    const read = readCapacityRequest(CAPACITY_EXAMPLE);
    if (!read.ok) throw new Error('faulty');
    const { totalW, sensibleW } = evaluateCapacity(read.input);
    if (!isKnown(totalW) || !isKnown(sensibleW)) throw new Error('unknown');
    const answer = await found(CAPACITY_EXAMPLE);
    expect(answer.total).toEqual({
      value: powerFromW(totalW.value, 'ton'),
      unit: 'ton',
      plusMinus: powerFromW(expandedUncertainty(totalW), 'ton'),
    });
    expect(answer.sensible?.value).toBeCloseTo(powerFromW(sensibleW.value, 'ton'), 12);
    expect(answer.sensibleHeatRatio?.value).toBeCloseTo((100 * sensibleW.value) / totalW.value, 9);
    expect(answer.ofNominal).toMatchObject({ unit: '%' });
    expect(answer.ofNominal?.value).toBeCloseTo((100 * (answer.total?.value ?? NaN)) / 3, 9);
    expect(answer.derivation.map(({ id }) => id)).toEqual(
      expect.arrayContaining(['supplyWetBulb', 'totalCapacity', 'sensibleCapacity', 'capacityRatio']),
    );
  });

  it('is the same in kW and °C', async () => {
    const celsius = (degF: number) => ({ value: ((degF - 32) * 5) / 9, unit: 'degC' });
    const metric = await found({
      ...CAPACITY_EXAMPLE,
      returnDryBulb: celsius(78),
      returnWetBulb: celsius(65),
      supplyDryBulb: celsius(58),
    });
    const inchPound = await found(CAPACITY_EXAMPLE);
    expect(metric.total?.unit).toBe('kW');
    expect((metric.total?.value ?? NaN) / 3.51685284).toBeCloseTo(inchPound.total?.value ?? NaN, 6);
  });

  it('names what is missing, and what a coil does not do', async () => {
    expect((await found({})).missing).toContain('airflow');
    const wet = await found({ ...CAPACITY_EXAMPLE, supplyDryBulb: { value: 79, unit: 'degF' } });
    expect(wet.cautions.map(({ code }) => code)).toEqual(['supply-wetter-than-return', 'no-cooling']);
  });
});

it('tells every fault at once', async () => {
  const response = await server.postJson(PATH, {
    airflow: { value: -1, unit: 'cfm' },
    airflowIn: 'attic',
    condensate: 1,
    returnDryBulb: { value: 78, unit: 'degF' },
    returnWetBulb: { value: 81, unit: 'degF' },
    supplyRelativeHumidity: { value: 92 },
  });
  expect(response.status).toBe(422);
  const { errors = [] } = problem.parse(await response.json());
  expect(Object.fromEntries(errors.map(({ path, message }) => [path, message]))).toEqual({
    airflow: 'Airflow must not be less than zero.',
    airflowIn: 'Air the airflow is stated in has an unknown value: give return, supply or standard.',
    condensate: 'Condensate has an unknown value: give neglected or counted.',
    returnWetBulb: 'Return wet bulb 81 °F is above return dry bulb 78 °F',
    supplyRelativeHumidity: 'Supply relative humidity, unit is missing.',
  });
});

it('answers 405 to other methods', async () => {
  expect((await server.ask(PATH)).status).toBe(405);
});
