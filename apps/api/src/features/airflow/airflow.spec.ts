import { airflowAnswer } from '@chargewright/contract/airflow';
import type { AirflowAnswer } from '@chargewright/contract/airflow';
import { problem } from '@chargewright/contract/problem';
import {
  evaluateAirflow,
  expandedUncertainty,
  flowFromM3PerS,
  isKnown,
  readAirflowRequest,
} from '@chargewright/engine';
import * as fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { LIMITS } from '../../http/limits';
import { AIRFLOW_EXAMPLE } from '../../testing/field-examples';
import { startTestServer } from '../../testing/test-server';
import type { TestServer } from '../../testing/test-server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ limits: { ...LIMITS, requestsPerSecond: 1_000_000 } });
});
afterAll(() => server.close());

const PATH = '/api/v1/airflow';

async function found(body: unknown): Promise<AirflowAnswer> {
  const response = await server.postJson(PATH, body);
  expect(response.status).toBe(200);
  return airflowAnswer.parse(await response.json());
}

async function refused(body: unknown): Promise<Readonly<Record<string, string>>> {
  const response = await server.postJson(PATH, body);
  expect(response.status).toBe(422);
  expect(response.headers.get('content-type')).toMatch('application/problem+json');
  const { errors = [] } = problem.parse(await response.json());
  return Object.fromEntries(errors.map(({ path, message }) => [path, message]));
}

describe('an airflow', () => {
  it('is answered in the shape of the contract, to any origin, and kept nowhere', async () => {
    const response = await server.postJson(PATH, AIRFLOW_EXAMPLE);
    const body: unknown = await response.json();
    expect(airflowAnswer.parse(body)).toEqual(body);
    expect(response.headers.get('cache-control')).toBe('no-store');
    expect(response.headers.get('access-control-allow-origin')).toBe('*');
  });

  it('is the engine’s, with its ± for k = 2', async () => {
    const read = readAirflowRequest(AIRFLOW_EXAMPLE);
    if (!read.ok) throw new Error('faulty');
    const { airflow } = evaluateAirflow(read.input);
    if (!isKnown(airflow)) throw new Error('unknown');
    const answer = await found(AIRFLOW_EXAMPLE);
    expect(answer.airflow?.value).toBeCloseTo(flowFromM3PerS(airflow.value, 'cfm'), 9);
    expect(answer.airflow?.plusMinus).toBeCloseTo(flowFromM3PerS(expandedUncertainty(airflow), 'cfm'), 9);
    expect(answer.airflow?.unit).toBe('cfm');
    expect(answer.airflowPerCapacity).toMatchObject({ unit: 'cfm/ton' });
    expect(answer.airflowPerCapacity?.value).toBeCloseTo((answer.airflow?.value ?? NaN) / 3, 9);
    expect(answer.reason).toBeNull();
    expect(answer.cautions.map(({ code }) => code)).toEqual(['humidity-assumed']);
    expect(answer.derivation.find(({ id }) => id === 'electricHeat')).toMatchObject({
      substitution: '238.0 V × 41.5 A',
      value: 9877,
      unit: 'W',
      result: '9877 W',
    });
  });

  it('is answered in the units of the temperatures, else of the airflow', async () => {
    const metric = await found({
      ...AIRFLOW_EXAMPLE,
      returnDryBulb: { value: 21, unit: 'degC' },
      supplyDryBulb: { value: 35, unit: 'degC' },
    });
    expect(metric.airflow?.unit).toBe('L/s');
    expect(metric.airflowPerCapacity?.unit).toBe('L/s/kW');
    expect((await found({ method: 'measured', airflow: { value: 2000, unit: 'm3/h' } })).airflow?.unit).toBe('L/s');
    expect((await found({ method: 'measured', airflow: { value: 1200, unit: 'cfm' } })).airflow?.unit).toBe('cfm');
  });

  it('of another blower speed does not count, and stands as found', async () => {
    const answer = await found({ ...AIRFLOW_EXAMPLE, atCoolingSpeed: 'no' });
    expect(answer.airflow).toBeNull();
    expect(answer.airflowAsFound?.value).toBeGreaterThan(1000);
    expect(answer.reason).toMatchObject({ code: 'other-blower-speed' });
  });

  it('names what is missing', async () => {
    const answer = await found({ method: 'temperature-rise-electric', returnDryBulb: { value: 70, unit: 'degF' } });
    expect([...answer.missing].sort()).toEqual(['heaterCurrent', 'lineVoltage', 'supplyDryBulb']);
    expect(answer.reason?.text).toContain('heater current');
  });

  it('reads a fan table with its dashes', async () => {
    const body = {
      method: 'static-pressure',
      atCoolingSpeed: 'yes',
      elevation: { value: 0, unit: 'ft' },
      returnDryBulb: { value: 70, unit: 'degF' },
      returnStaticPressure: { value: -0.2, unit: 'inH2O' },
      supplyStaticPressure: { value: 0.25, unit: 'inH2O' },
      fanTable: {
        source: 'manual, p. 4',
        blowerTap: 'medium',
        staticPressureUnit: 'inH2O',
        airflowUnit: 'cfm',
        rows: [
          { staticPressure: 0.3, airflow: 1300 },
          { staticPressure: 0.5, airflow: 1200 },
          { staticPressure: 0.7, airflow: null },
        ],
      },
    };
    // 0.45 in. w.c. lies between 1300 and 1200 cfm
    expect((await found(body)).airflow?.value).toBeCloseTo(1225, -1);
    const high = { ...body, supplyStaticPressure: { value: 0.4, unit: 'inH2O' } };
    expect((await found(high)).reason?.code).toBe('dash');
  });
});

describe('what cannot be', () => {
  it('is told all at once, of the shape and of the values, in words', async () => {
    const errors = await refused({
      method: 'by-feel',
      elevation: { value: 30_000, unit: 'ft' },
      returnDryBulb: { value: 70, unit: 'degF' },
      returnWetBulb: { value: 75, unit: 'degF' },
      supplyDryBulb: null,
      lineVoltage: { value: '240', unit: 'V' },
      heaterCurrent: { value: 40, unit: 'A', plusMinus: { value: 1, unit: '%' } },
      gasRevolution: { value: 0, unit: 's' },
      furnaceEfficiency: { value: 120, unit: '%' },
      fanTable: {
        staticPressureUnit: 'inH2O',
        airflowUnit: 'cfm',
        rows: [{ staticPressure: 0.3, airflow: 'high' }, { airflow: 1200 }],
      },
    });
    expect(Object.keys(errors).sort()).toEqual([
      'elevation',
      'fanTable.rows.0.airflow',
      'fanTable.rows.1.staticPressure',
      'furnaceEfficiency',
      'gasRevolution',
      'heaterCurrent.plusMinus',
      'lineVoltage',
      'method',
      'returnWetBulb',
      'supplyDryBulb',
    ]);
    expect(errors).toMatchObject({
      method:
        'Method has an unknown value: give measured, temperature-rise-electric, temperature-rise-gas or static-pressure.',
      gasRevolution: 'Time of one turn must be more than zero.',
      returnWetBulb: 'Return wet bulb 75 °F is above return dry bulb 70 °F',
      'heaterCurrent.plusMinus': 'Heater current, plus or minus has a unit that does not fit: give A.',
    });
    for (const message of Object.values(errors)) expect(message).toMatch(/^[A-Z“].{10,}/);
  });

  it.each([
    ['', null],
    ['', []],
    ['method', {}],
    [
      'fanTable.rows',
      { method: 'static-pressure', fanTable: { staticPressureUnit: 'Pa', airflowUnit: 'cfm', rows: {} } },
    ],
    ['fanTable', { method: 'static-pressure', fanTable: { staticPressureUnit: 'Pa', airflowUnit: 'cfm', rows: [] } }],
  ])('names the field %j', async (path, body) => {
    expect(Object.keys(await refused(body))).toEqual([path]);
  });

  it('is another method of HTTP', async () => {
    const response = await server.ask(PATH);
    expect(response.status).toBe(405);
    expect(response.headers.get('allow')).toBe('POST, OPTIONS');
  });
});

it('never answers 5xx, whatever the body', async () => {
  const number = fc.oneof(
    fc.integer({ min: -500, max: 2_000 }),
    fc.double({ noNaN: true }),
    fc.jsonValue({ maxDepth: 1 }),
  );
  const unit = fc.constantFrom(
    'degF',
    'degC',
    'K',
    'cfm',
    'L/s',
    '%',
    'V',
    'A',
    'W',
    'ft3',
    's',
    'Btu/ft3',
    'inH2O',
    'Pa',
    'ton',
    'ft',
    'psia',
  );
  const plusMinus = fc.record(
    { value: number, unit, kind: fc.constantFrom('limit', 'k2') },
    { requiredKeys: ['value', 'unit'] },
  );
  const amount = fc.record({ value: number, unit, plusMinus, resolution: number }, { requiredKeys: ['value', 'unit'] });
  const row = fc.record({ staticPressure: number, airflow: fc.oneof(number, fc.constant(null)) });
  const fanTable = fc.record({
    staticPressureUnit: fc.constantFrom('inH2O', 'Pa'),
    airflowUnit: fc.constantFrom('cfm', 'L/s'),
    rows: fc.array(row, { maxLength: 5 }),
  });
  const names = [
    'returnDryBulb',
    'returnWetBulb',
    'returnRelativeHumidity',
    'supplyDryBulb',
    'airflow',
    'lineVoltage',
    'heaterCurrent',
    'blowerHeat',
    'dialVolume',
    'gasRevolution',
    'gasHeatingValue',
    'furnaceEfficiency',
    'returnStaticPressure',
    'supplyStaticPressure',
    'elevation',
    'stationPressure',
    'nominalCapacity',
  ];
  const body = fc
    .tuple(
      fc.record({
        method: fc.constantFrom('measured', 'temperature-rise-electric', 'temperature-rise-gas', 'static-pressure'),
        atCoolingSpeed: fc.constantFrom('yes', 'no', 'unknown'),
        airflowIn: fc.constantFrom('return', 'supply', 'standard'),
      }),
      fc.dictionary(fc.constantFrom(...names), amount),
      fc.option(fanTable),
    )
    .map(([choices, amounts, table]) => ({ ...amounts, ...choices, ...(table && { fanTable: table }) }));
  const sound = fc
    .record({
      returnDryBulb: fc.double({ min: -90, max: 250, noNaN: true }),
      supplyDryBulb: fc.double({ min: -90, max: 250, noNaN: true }),
      heaterCurrent: fc.double({ min: 0, max: 1e9, noNaN: true }),
    })
    .map((values) => ({
      ...AIRFLOW_EXAMPLE,
      returnDryBulb: { value: values.returnDryBulb, unit: 'degF' },
      supplyDryBulb: { value: values.supplyDryBulb, unit: 'degF' },
      heaterCurrent: { value: values.heaterCurrent, unit: 'A' },
    }));
  const statuses = new Set<number>();
  await fc.assert(
    fc.asyncProperty(fc.oneof(body, sound, fc.jsonValue({ maxDepth: 4 })), async (value) => {
      const { status } = await server.postJson(PATH, value);
      statuses.add(status);
      expect(status).toBeLessThan(500);
    }),
    { numRuns: 500 },
  );
  expect([...statuses].sort()).toEqual([200, 422]);
}, 60_000);
