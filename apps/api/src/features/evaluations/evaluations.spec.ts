import { evaluationAnswer } from '@chargewright/contract/evaluation';
import type { EvaluationAnswer } from '@chargewright/contract/evaluation';
import { problem } from '@chargewright/contract/problem';
import { MAKERS_CHART_KINDS, READING_IDS } from '@chargewright/engine';
import * as fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import * as z from 'zod';
import { LIMITS } from '../../http/limits';
import { EVALUATION_EXAMPLE } from '../../testing/evaluation-example';
import { startTestServer } from '../../testing/test-server';
import type { TestServer } from '../../testing/test-server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ limits: { ...LIMITS, requestsPerSecond: 1_000_000 } });
});
afterAll(() => server.close());

const PATH = '/api/v1/evaluations';

async function evaluated(body: unknown): Promise<EvaluationAnswer> {
  const response = await server.postJson(PATH, body);
  expect(response.status).toBe(200);
  return evaluationAnswer.parse(await response.json());
}

async function refused(body: unknown): Promise<Readonly<Record<string, string>>> {
  const response = await server.postJson(PATH, body);
  expect(response.status).toBe(422);
  expect(response.headers.get('content-type')).toMatch('application/problem+json');
  const { errors = [] } = problem.parse(await response.json());
  return Object.fromEntries(errors.map(({ path, message }) => [path, message]));
}

const withReadings = (readings: object) => ({
  ...EVALUATION_EXAMPLE,
  readings: { ...EVALUATION_EXAMPLE.readings, ...readings },
});

describe('a check that can be judged', () => {
  it('is answered in the shape of the contract, with nothing in it that the contract does not have', async () => {
    const response = await server.postJson(PATH, EVALUATION_EXAMPLE);
    const body: unknown = await response.json();
    // the schema drops what it does not know
    expect(evaluationAnswer.parse(body)).toEqual(body);
    expect(response.headers.get('cache-control')).toBe('no-store');
  });

  it('has its numbers, unrounded and in the units of the return dry bulb', async () => {
    const { derived, criteria, overall, engineVersion, procedure } = await evaluated(EVALUATION_EXAMPLE);
    expect(engineVersion).toMatch(/^\d+\.\d+\.\d+\+/);
    expect(procedure).toEqual({ id: 'general-rules', version: 1 });
    expect(derived.superheat?.unit).toBe('deltaF');
    // 52 °F less the dew point of R-410A at 118 psig, 650 ft
    expect(derived.superheat?.value).toBeCloseTo(52 - (derived.evaporatingDewTemperature?.value ?? NaN), 9);
    expect(derived.temperatureSplit?.value).toBeCloseTo(19.6, 9);
    // ±1 °F limits of two probes and ±1.5 °F of sampling, rectangular, k = 2
    expect(derived.temperatureSplit?.plusMinus).toBeCloseTo(2 * Math.sqrt((1 + 1 + 1.5 ** 2) / 3), 9);
    const superheat = criteria.find(({ criterion }) => criterion === 'superheat');
    expect(superheat).toMatchObject({
      targetSource: 'makers-chart-a',
      tolerance: { high: 5, unit: 'deltaF' },
      finding: 'too-close-to-call',
      reason: null,
      reasonText: null,
    });
    expect(superheat?.target?.value).toBeCloseTo(8, 9);
    // the floor: superheat itself never under 5 °F
    expect(superheat?.tolerance?.low).toBeCloseTo(-3, 9);
    expect(overall.finding).toBe('too-close-to-call');
    expect(overall.cautions.map(({ code }) => code)).toContain('gauge-not-zeroed');
  });

  it('has the causes that fit, what would separate them, and why there is none', async () => {
    const starved = withReadings({
      suctionPressure: { value: 95, unit: 'psig' },
      suctionLineTemperature: { value: 62, unit: 'degF' },
      liquidPressure: { value: 340, unit: 'psig' },
      liquidLineTemperature: { value: 102, unit: 'degF' },
      supplyDryBulb: { value: 64, unit: 'degF' },
    });
    const { diagnosis, diagnosisNotes } = await evaluated(starved);
    expect(diagnosis).toEqual([
      {
        cause: 'low-charge',
        text: 'Too little refrigerant',
        fits: expect.arrayContaining([
          { code: 'superheat-above-target', text: expect.stringMatching(/^Superheat is [\d.]+ °F ± [\d.]+ °F above/) },
          { code: 'subcooling-below-target', text: expect.stringContaining('below its target') },
        ]) as unknown,
        doesNotFit: [],
        nextMeasurement: { code: 'leak-search', text: 'Search for the leak.' },
      },
    ]);
    expect(diagnosisNotes).toEqual([]);
    const heating = await evaluated({ ...starved, setup: { ...starved.setup, mode: 'heating' } });
    expect(heating.diagnosis).toEqual([]);
    expect(heating.diagnosisNotes.map(({ code }) => code)).toEqual(['unfit']);
  });

  it('takes the separating tests into the diagnosis and the next step', async () => {
    const drier = {
      drierInletTemperature: { value: 100, unit: 'degF' },
      drierOutletTemperature: { value: 91, unit: 'degF' },
    };
    const { diagnosis, overall } = await evaluated(withReadings(drier));
    expect(overall.nextStep.code).toBe('find-restriction');
    const restriction = diagnosis.find(({ cause }) => cause === 'restriction');
    expect(restriction?.fits.at(-1)).toEqual({
      code: 'drier-drop',
      text: 'The line cools by 9.0 °F ± 1.6 °F over the drier.',
    });
    const standing = {
      standingPressure: { value: 330, unit: 'psig' },
      standingOutdoorCoilTemperature: { value: 92, unit: 'degF' },
    };
    const air = await evaluated({ ...withReadings(standing), visit: { tests: { liquidShutIn: true } } });
    expect(air.diagnosis.map(({ cause }) => cause)).toContain('air-in-system');
    const free = await evaluated(withReadings(standing));
    expect(free.diagnosis.map(({ cause }) => cause)).not.toContain('air-in-system');
  });

  it('names what is wrong with a test that was recorded', async () => {
    const errors = await refused({
      ...withReadings({
        standingPressure: { value: 900, unit: 'psig' },
        drierInletTemperature: { value: 100, unit: 'psig' },
      }),
      setup: { ...EVALUATION_EXAMPLE.setup, expectedCompressorCurrent: { value: 0, unit: 'A' } },
      visit: { tests: { bulb: 'gone', liquidShutIn: 1 } },
    });
    expect(errors).toEqual({
      'readings.standingPressure': expect.stringMatching(
        /^Standing pressure .* is above the critical pressure/,
      ) as unknown,
      'readings.drierInletTemperature':
        'Temperature before the drier has a unit that does not fit: give degF, degC or K.',
      'setup.expectedCompressorCurrent': 'Expected compressor current must be more than zero.',
      'visit.tests.bulb': 'Bulb has an unknown value: give right, loose or charge-lost.',
      'visit.tests.liquidShutIn': 'Liquid shut in has the wrong type: give true or false.',
    });
  });

  it('is judged by the procedure that is asked for, only just where the rule alone decides', async () => {
    const { criteria, overall, procedure } = await evaluated({
      ...EVALUATION_EXAMPLE,
      procedure: 'cec-ra3.2-2019-installer',
      setup: { ...EVALUATION_EXAMPLE.setup, alteration: true, highVelocity: false },
      visit: { ...EVALUATION_EXAMPLE.visit, preflight: { accessHole: 'ok' } },
      readings: { ...EVALUATION_EXAMPLE.readings, airflow: { value: 950, unit: 'cfm' } },
    });
    expect(procedure).toEqual({ id: 'cec-ra3.2-2019-installer', version: 1 });
    const superheat = criteria.find(({ criterion }) => criterion === 'superheat');
    // the table prints 8.1 °F at 95 °F outdoors and 65 °F wet bulb; the readings give less than 5 more
    expect(superheat?.target?.value).toBeCloseTo(8.1, 9);
    expect(superheat).toMatchObject({ targetSource: 'finer-table', byRule: 'passes', onlyJust: true });
    expect(superheat?.tolerance?.low).toBeCloseTo(-5, 9);
    expect(criteria.find(({ criterion }) => criterion === 'airflow')).toMatchObject({
      required: true,
      finding: 'within',
    });
    expect(overall.finding).toBe(superheat?.finding);
  });

  it('is judged by the maker’s data alone where that is asked for: what is not entered is asked for, and whose the ± is, is said', async () => {
    const asked = { ...EVALUATION_EXAMPLE, procedure: 'manufacturer' };
    const without = await evaluated(asked);
    expect(without.procedure).toEqual({ id: 'manufacturer', version: 1 });
    expect(without.overall).toMatchObject({ finding: 'not-judged', nextStep: { code: 'find-nameplate-target' } });
    const targetSuperheat = { value: 13, unit: 'deltaF' };
    const { criteria } = await evaluated({ ...asked, setup: { ...asked.setup, targetSuperheat } });
    expect(criteria.find(({ criterion }) => criterion === 'superheat')).toMatchObject({
      targetSource: 'entered',
      toleranceSource: 'general-rules',
      required: true,
    });
    const { stage: _, ...setup } = asked.setup;
    const { overall } = await evaluated({ ...asked, setup: { ...setup, targetSuperheat } });
    expect(overall.nextStep).toMatchObject({
      code: 'state-the-setup',
      text: expect.stringContaining('State this first: stage.') as unknown,
    });
  });

  it('says the enthalpy on the datum of its unit', async () => {
    const { derived } = await evaluated(EVALUATION_EXAMPLE);
    const humidityRatio = derived.returnHumidityRatio?.value ?? NaN;
    // ASHRAE Fundamentals (2017) ch. 1, eq. 30 IP
    expect(derived.returnEnthalpy?.value).toBeCloseTo(0.24 * 78 + humidityRatio * (1061 + 0.444 * 78), 9);
    expect(derived.returnEnthalpy?.unit).toBe('Btu/lb');
    expect(derived.returnEnthalpy?.plusMinus).toBeLessThan(2);
  });

  it('shows its math', async () => {
    const { derivation, derived } = await evaluated(EVALUATION_EXAMPLE);
    expect(derivation.find(({ id }) => id === 'superheat')).toMatchObject({
      formula: 'T_suction − T_dew',
      substitution: expect.stringMatching(/^52\.0 °F − 39\.\d °F$/) as unknown,
      value: derived.superheat?.value,
      unit: 'deltaF',
    });
  });

  it('lists a criterion that is not judged with nulls and the reason', async () => {
    const { liquidPressure: _left, ...readings } = EVALUATION_EXAMPLE.readings;
    const { criteria, derived } = await evaluated({ ...EVALUATION_EXAMPLE, readings });
    expect(criteria.find(({ criterion }) => criterion === 'subcooling')).toMatchObject({
      actual: null,
      target: { value: 10, unit: 'deltaF' },
      deviation: null,
      tolerance: { low: -3, high: 3, unit: 'deltaF' },
      byRule: null,
      probabilityWithin: null,
      finding: 'not-judged',
      reason: 'readings-missing',
      reasonText: expect.stringContaining('liquid pressure') as unknown,
    });
    expect(derived).not.toHaveProperty('subcooling');
  });

  it('gives a window its limits, with and without an actual value', async () => {
    const setup = { ...EVALUATION_EXAMPLE.setup, meteringDevice: 'txv' };
    const windowOf = async (body: unknown) =>
      (await evaluated(body)).criteria.find(({ criterion }) => criterion === 'superheat-window');
    const read = await windowOf({ ...EVALUATION_EXAMPLE, setup });
    expect(read).toMatchObject({ target: null, deviation: null, targetSource: 'procedure-window', finding: 'within' });
    expect(read?.tolerance?.low).toBeCloseTo(4, 9);
    expect(read?.tolerance?.high).toBeCloseTo(25, 9);
    const unread = await windowOf({ setup: { ...setup, superheatRange: { low: 3, high: 8, unit: 'deltaC' } } });
    expect(unread?.actual).toBeNull();
    expect(unread?.tolerance?.low).toBeCloseTo(5.4, 9);
    expect(unread?.tolerance?.high).toBeCloseTo(14.4, 9);
    expect(unread?.tolerance?.unit).toBe('deltaF');
  });

  it('gives a criterion of airflow its limits in the unit of airflow', async () => {
    const { criteria } = await evaluated(withReadings({ airflow: { value: 1_000, unit: 'cfm' } }));
    expect(criteria.find(({ criterion }) => criterion === 'airflow')?.tolerance).toEqual({
      low: 0,
      high: null,
      unit: 'cfm',
    });
  });

  it('needs refrigerant and metering device only', async () => {
    const { overall } = await evaluated({ setup: { refrigerant: 'R-22', meteringDevice: 'txv' } });
    expect(overall.finding).toBe('not-judged');
    expect(overall.cautions.map(({ code }) => code)).toContain('elevation-assumed');
  });

  it('answers in the units of the return dry bulb, else of the first temperature, else of the pressure', async () => {
    const { returnDryBulb: _left, ...others } = EVALUATION_EXAMPLE.readings;
    const suction = { suctionPressure: { value: 814, unit: 'kPag' } };
    const setup = EVALUATION_EXAMPLE.setup;
    const unitOf = async (readings: object) =>
      (await evaluated({ setup, readings })).derived.evaporatingDewTemperature?.unit;
    expect(await unitOf({ ...others, returnDryBulb: { value: 26, unit: 'degC' } })).toBe('degC');
    expect(await unitOf({ ...others, ...suction, returnDryBulb: { value: 299, unit: 'K' } })).toBe('degC');
    expect(await unitOf({ ...others, ...suction })).toBe('degF');
    expect(await unitOf(suction)).toBe('degC');
    expect(await unitOf({ suctionPressure: { value: 118, unit: 'psig' } })).toBe('degF');
  });

  it('gives the same finding in °C and kPa', async () => {
    const celsius = (value: number) => ({ value: ((value - 32) * 5) / 9, unit: 'degC' });
    const kPag = (value: number) => ({ value: value * 6.894757293168, unit: 'kPag' });
    const inMetric = Object.fromEntries(
      Object.entries(EVALUATION_EXAMPLE.readings).map(([id, { value, unit }]) => [
        id,
        unit === 'psig' ? kPag(value) : celsius(value),
      ]),
    );
    const metric = await evaluated({ ...EVALUATION_EXAMPLE, readings: inMetric });
    const inchPound = await evaluated(EVALUATION_EXAMPLE);
    expect(metric.overall.finding).toBe(inchPound.overall.finding);
    expect(metric.derived.superheat?.unit).toBe('deltaC');
    expect((metric.derived.superheat?.value ?? NaN) * 1.8).toBeCloseTo(inchPound.derived.superheat?.value ?? NaN, 9);
  });

  it('ignores fields of a newer contract', async () => {
    const newer = { ...EVALUATION_EXAMPLE, weather: { humid: true } };
    expect(await evaluated(newer)).toEqual(await evaluated(EVALUATION_EXAMPLE));
  });

  it('is not judged between the end of the curve and the critical point', async () => {
    // R-410A: critical about 711 psia
    const { criteria } = await evaluated(withReadings({ liquidPressure: { value: 705, unit: 'psia' } }));
    expect(criteria.find(({ criterion }) => criterion === 'subcooling')).toMatchObject({
      finding: 'not-judged',
      reason: 'outside-curve',
    });
  });
});

describe('a check that cannot be', () => {
  it('answers every fault at once, of the shape and of the values', async () => {
    const errors = await refused({
      procedure: 'by-feel',
      setup: {
        refrigerant: 'R-410A',
        meteringDevice: 'piston',
        elevation: { value: 20_000, unit: 'ft' },
        targetSubcooling: { value: 10, unit: 'degF' },
      },
      visit: { runningMinutes: -1, preflight: { panelsOn: true } },
      readings: {
        returnDryBulb: { value: 78, unit: 'degF' },
        returnWetBulb: { value: 81, unit: 'degF', plusMinus: { value: 1, unit: 'degF' } },
        supplyRelativeHumidity: { value: 101, unit: '%' },
        outdoorDryBulb: { value: -500, unit: 'degF' },
        suctionPressure: null,
        liquidPressure: { value: 800, unit: 'psia' },
        liquidLineTemperature: { value: '106', unit: 'degF' },
      },
    });
    expect(Object.keys(errors).sort()).toEqual([
      'procedure',
      'readings.liquidLineTemperature',
      'readings.liquidPressure',
      'readings.outdoorDryBulb',
      'readings.returnWetBulb',
      'readings.returnWetBulb.plusMinus',
      'readings.suctionPressure',
      'readings.supplyRelativeHumidity',
      'setup.elevation',
      'setup.meteringDevice',
      'setup.targetSubcooling',
      'visit.preflight.panelsOn',
      'visit.runningMinutes',
    ]);
    expect(errors['readings.returnWetBulb']).toBe('Return wet bulb 81 °F is above return dry bulb 78 °F');
  });

  it.each([
    ['setup.refrigerant', { setup: { refrigerant: 'R-0', meteringDevice: 'txv' } }],
    ['readings.suctionPressure', withReadings({ suctionPressure: { value: -15, unit: 'psig' } })],
    ['readings.liquidPressure', withReadings({ liquidPressure: { value: 900, unit: 'psig' } })],
    ['readings.returnWetBulb', withReadings({ returnWetBulb: { value: 65, unit: 'deltaF' } })],
    ['setup', { ...EVALUATION_EXAMPLE, setup: 'R-410A' }],
    ['', null],
    ['', []],
  ])('names the field %j', async (path, body) => {
    expect(Object.keys(await refused(body))).toEqual([path]);
  });

  it('says what would be right', async () => {
    const errors = await refused({
      setup: { refrigerant: 410, meteringDevice: 'txv', targetSubcooling: { value: 10, unit: 'degF' } },
      readings: { returnWetBulb: { value: 65, unit: 'F' }, suctionPressure: { value: 118 } },
    });
    expect(errors).toEqual({
      'setup.refrigerant': 'Refrigerant has the wrong type: give a text.',
      'setup.targetSubcooling':
        'Target subcooling is a temperature difference: give it in deltaF or deltaC, not in a unit of temperature.',
      'readings.returnWetBulb': 'Return wet bulb has a unit that does not fit: give degF, degC or K.',
      'readings.suctionPressure': 'Suction pressure, unit is missing.',
    });
  });

  it('names a body that is no object, and the kind of a ± as part of the ±', async () => {
    expect(await refused(null)).toEqual({ '': '“body” has the wrong type: give an object.' });
    expect(await refused(7)).toEqual({ '': '“body” has the wrong type: give an object.' });
    const plusMinus = { value: 1, unit: 'deltaF', kind: 'k3' };
    expect(await refused(withReadings({ returnWetBulb: { value: 65, unit: 'degF', plusMinus } }))).toEqual({
      'readings.returnWetBulb.plusMinus': 'Return wet bulb, plus or minus has an unknown value: give limit or k2.',
    });
  });

  it('tells every fault of the maker’s tables at once, of the shape and of the values', async () => {
    const axis = (...values: readonly unknown[]) => ({ unit: 'degF', values });
    const curve = { kind: 'liquid-pressure', rows: axis(80, 100), unit: 'psig', cells: [[270], [355]] };
    const makersCharts = [
      { ...curve, rows: axis(100, 80) },
      { ...curve, port: 'any' },
      { ...curve, unit: 'deltaF', port: 'discharge' },
    ];
    const makersChart = { kind: 'subcooling', unit: 'deltaF', cells: [[null]] };
    expect(
      await refused({ setup: { refrigerant: 'R-410A', meteringDevice: 'txv', makersChart, makersCharts } }),
    ).toEqual({
      'setup.makersChart.cells': 'Maker’s table, cells: nothing but dashes. Type at least one number.',
      'setup.makersCharts.0.rows':
        'Maker’s table 1, rows: value 2 is not above the one before it. Type them from low to high.',
      'setup.makersCharts.1.port': 'Maker’s table 2, port has an unknown value: give liquid, discharge or suction.',
      'setup.makersCharts.2.unit': 'Maker’s table 3, unit is not measured in this unit.',
    });
  });

  it('has a sentence for each fault', async () => {
    const messages = Object.values(
      await refused({ setup: { refrigerant: null, stage: 7 }, readings: { airflow: {} } }),
    );
    expect(messages).toHaveLength(4);
    for (const message of messages) expect(message).toMatch(/^[A-Z“].{10,}/);
  });
});

describe('a request that cannot be read', () => {
  const post = (body: string, type = 'application/json') =>
    server.ask(PATH, { method: 'POST', headers: { 'Content-Type': type }, body });

  const form = 'application/x-www-form-urlencoded';
  it.each([
    ['half a body', '{"setup":', 'application/json', 400, 'malformed-json'],
    ['an empty body', '', 'application/json', 400, 'malformed-json'],
    ['a body with NaN', '{"a":NaN}', 'application/json', 400, 'malformed-json'],
    ['a form', 'setup=1', form, 415, 'not-json'],
    ['another alphabet', '{}', 'application/json; charset=latin1', 415, 'not-json'],
    ['over 100 kB', JSON.stringify({ note: 'x'.repeat(102_400) }), 'application/json', 413, 'body-too-large'],
  ])('as %s is refused', async (_what, body, type, status, code) => {
    const response = await post(body, type);
    expect(response.status).toBe(status);
    expect(problem.parse(await response.json())).toMatchObject({ status, code });
  });

  it('may be as large as 100 kB', async () => {
    const padding = 'x'.repeat(99_000 - JSON.stringify(EVALUATION_EXAMPLE).length);
    expect((await server.postJson(PATH, { ...EVALUATION_EXAMPLE, note: padding })).status).toBe(200);
  });

  it('answers 405 to other methods', async () => {
    const response = await server.ask(PATH);
    expect(response.status).toBe(405);
    expect(response.headers.get('allow')).toBe('POST, OPTIONS');
    expect(problem.parse(await response.json()).code).toBe('method-not-allowed');
  });
});

it('never answers 5xx, whatever the body', async () => {
  const units = [
    'degF',
    'degC',
    'K',
    'psig',
    'psia',
    'kPaa',
    'inHgVac',
    '%',
    'cfm',
    'Pa',
    'ft',
    'oz',
    'deltaF',
    'A',
    '',
  ];
  const anything = fc.jsonValue({ maxDepth: 1 });
  const number = fc.oneof(fc.integer({ min: -500, max: 1_000 }), fc.double({ noNaN: true }), anything);
  const plusMinus = fc.record({ value: number, unit: fc.constantFrom('deltaF', 'psi', '%') }, { requiredKeys: [] });
  const amount = fc.record(
    { value: number, unit: fc.constantFrom(...units), plusMinus, ageSeconds: number, resolution: number },
    { requiredKeys: ['value', 'unit'] },
  );
  const any = fc.oneof({ weight: 4, arbitrary: amount }, anything);
  const fields = (...names: readonly string[]) => fc.dictionary(fc.constantFrom(...names), any);
  const few = (...names: readonly string[]) => fc.dictionary(fc.constantFrom(...names), any, { maxKeys: 2 });
  const axis = fc.record({ unit: fc.constantFrom(...units), values: fc.array(number, { maxLength: 3 }) });
  const table = fc.record(
    {
      kind: fc.constantFrom(...MAKERS_CHART_KINDS, 7),
      rows: axis,
      columns: axis,
      unit: fc.constantFrom(...units),
      cells: fc.array(fc.array(fc.oneof(number, fc.constant(null)), { maxLength: 3 }), { maxLength: 3 }),
    },
    { requiredKeys: ['kind', 'unit', 'cells'] },
  );
  const setup = fc
    .tuple(
      fc.record({
        refrigerant: fc.constantFrom<unknown>('R-410A', 'R-22', 'R-744', 'R-407C', null, 'R-0'),
        meteringDevice: fc.constantFrom<unknown>('txv', 'fixed-orifice', 7),
      }),
      fields('elevation', 'stationPressure', 'targetSuperheat', 'targetSubcooling', 'nominalCapacity', 'lineSet'),
      fc.option(table, { nil: undefined }),
    )
    .map(([required, optional, makersChart]) => ({ ...optional, ...required, ...(makersChart && { makersChart }) }));
  const visit = fields('runningMinutes', 'lowestReturnDryBulb', 'preflight', 'earlier', 'addedThisVisit', 'iceSeen');
  const body = fc.record({ setup, visit, readings: fields(...READING_IDS) }, { requiredKeys: ['setup'] });
  const changedExample = fc
    .record({ setup: few('elevation', 'targetSuperheat'), readings: few(...READING_IDS) })
    .map((changed) => ({
      ...EVALUATION_EXAMPLE,
      setup: { ...EVALUATION_EXAMPLE.setup, ...changed.setup },
      readings: { ...EVALUATION_EXAMPLE.readings, ...changed.readings },
    }));
  const bodies = fc.oneof(
    { weight: 6, arbitrary: body },
    { weight: 3, arbitrary: changedExample },
    fc.jsonValue({ maxDepth: 4 }),
  );
  const statuses = new Set<number>();
  await fc.assert(
    fc.asyncProperty(bodies, async (value) => {
      const { status } = await server.postJson(PATH, value);
      statuses.add(status);
      expect(status).toBeLessThan(500);
    }),
    { numRuns: 2_000 },
  );
  expect([...statuses].sort()).toEqual([200, 422]);
}, 60_000);

it('answers plausible systems at the edges of what can be, without a fault of its own', async () => {
  const edges = [-1e308, -1e-308, 0, 1e-308, 1e308, 710.9, 14.7, -14.69, -459.67, 211.9];
  const readings = (value: number) =>
    Object.fromEntries(
      Object.entries(EVALUATION_EXAMPLE.readings).map(([id, { unit }], at) => [id, { value: value + at, unit }]),
    );
  for (const value of edges) {
    const response = await server.postJson(PATH, { ...EVALUATION_EXAMPLE, readings: readings(value) });
    expect([200, 422]).toContain(response.status);
    if (response.status === 200) expect(z.json().safeParse(await response.json()).success).toBe(true);
  }
});
