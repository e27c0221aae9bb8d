import { problem } from '@chargewright/contract/problem';
import { weighInAnswer } from '@chargewright/contract/weigh-in';
import type { WeighInAnswer } from '@chargewright/contract/weigh-in';
import { evaluateWeighIn, isKnown, massFromKg, readWeighInRequest } from '@chargewright/engine';
import * as fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { LIMITS } from '../../http/limits';
import { WEIGH_IN_EXAMPLE } from '../../testing/field-examples';
import { startTestServer } from '../../testing/test-server';
import type { TestServer } from '../../testing/test-server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ limits: { ...LIMITS, requestsPerSecond: 1_000_000 } });
});
afterAll(() => server.close());

const PATH = '/api/v1/weigh-in';

async function judged(body: unknown): Promise<WeighInAnswer> {
  const response = await server.postJson(PATH, body);
  expect(response.status).toBe(200);
  return weighInAnswer.parse(await response.json());
}

async function refused(body: unknown): Promise<Readonly<Record<string, string>>> {
  const response = await server.postJson(PATH, body);
  expect(response.status).toBe(422);
  const { errors = [] } = problem.parse(await response.json());
  return Object.fromEntries(errors.map(({ path, message }) => [path, message]));
}

describe('a weigh-in', () => {
  it('is answered in the shape of the contract, to any origin, and kept nowhere', async () => {
    const response = await server.postJson(PATH, WEIGH_IN_EXAMPLE);
    const body: unknown = await response.json();
    expect(weighInAnswer.parse(body)).toEqual(body);
    expect(response.headers.get('cache-control')).toBe('no-store');
    expect(response.headers.get('access-control-allow-origin')).toBe('*');
  });

  it('is the engine’s, with the sum a person writes', async () => {
    const read = readWeighInRequest(WEIGH_IN_EXAMPLE);
    if (!read.ok) throw new Error('faulty');
    const { requiredTotal, finding } = evaluateWeighIn(read.input);
    const answer = await judged(WEIGH_IN_EXAMPLE);
    expect(answer.requiredTotal?.value).toBe(isKnown(requiredTotal) ? massFromKg(requiredTotal.value, 'oz') : NaN);
    expect(answer.finding).toBe(finding);
    expect(answer).toMatchObject({
      procedure: { id: 'general-rules', version: 1 },
      byRule: 'passes',
      vacuum: 'passes',
      label: 'not-applicable',
      rate: { origin: 'maker', rate: { unit: 'oz/ft' } },
      rounded: { required: { unit: 'oz' } },
    });
    expect(answer.sum).toEqual([
      { about: 'Line set', text: '45 ft − 15 ft = 30 ft × 0.60 oz/ft = 18 oz' },
      { about: 'Whole charge', text: '6 lb 0 oz (factory) + 18 oz = 7 lb 2 oz (114 oz)' },
      { about: 'Weighed in less required', text: '1 lb 2 oz − 1 lb 2 oz = 0 oz' },
      { about: 'Whole charge now', text: '6 lb 0 oz (factory) + 18 oz = 7 lb 2 oz (114 oz)' },
    ]);
  });

  // a maker's own printed example shows 9 oz, and 4.5 oz elsewhere, for the first line, and 13.5 oz for the second
  it.each([
    [45, 0.4, 18],
    [25, 0.6, 15],
  ])('of %d ft at %d oz/ft shows its own sum of %d oz', async (feet, rate, ounces) => {
    const line = {
      ...WEIGH_IN_EXAMPLE.line,
      installedLength: { value: feet, unit: 'ft' },
      includedLength: { value: 0, unit: 'ft' },
      makersRate: { value: rate, unit: 'oz/ft' },
    };
    const answer = await judged({ ...WEIGH_IN_EXAMPLE, line });
    expect(answer.sum[0]?.text).toBe(`${feet} ft − 0 ft = ${feet} ft × ${rate.toFixed(2)} oz/ft = ${ounces} oz`);
    expect(answer.required?.value).toBeCloseTo(ounces, 9);
  });

  it('is answered in grams for metres', async () => {
    const answer = await judged({
      ...WEIGH_IN_EXAMPLE,
      line: {
        installedLength: { value: 12, unit: 'm' },
        includedLength: { value: 5, unit: 'm' },
        liquidLineSize: '3/8',
        makersRate: { value: 54, unit: 'g/m' },
      },
    });
    expect(answer.lineAdjustment).toMatchObject({ unit: 'g' });
    expect(answer.lineAdjustment?.value).toBeCloseTo(378, 6);
    expect(answer.sum[0]?.text).toBe('12 m − 5 m = 7 m × 54 g/m = 378 g');
  });

  it('by another refrigerant’s density says so, and never takes the R-410A rate for it', async () => {
    const { makersRate: _, ...line } = WEIGH_IN_EXAMPLE.line;
    const answer = await judged({ ...WEIGH_IN_EXAMPLE, refrigerant: 'R-454B', line });
    expect(answer.rate?.origin).toBe('liquid-density');
    expect(answer.rate?.rate?.value).toBeLessThan(0.58);
    expect(answer.cautions.map(({ code }) => code)).toEqual(['rate-by-density', 'label-maximum-not-recorded']);
    const ductless = await judged({ ...WEIGH_IN_EXAMPLE, refrigerant: 'R-32', kind: 'ductless', line });
    expect(ductless.rate).toBeNull();
    expect(ductless.reason?.code).toBe('rate-needed');
  });

  it('by the rules of 2008 is not a rater’s', async () => {
    const answer = await judged({ ...WEIGH_IN_EXAMPLE, procedure: 'cec-ra3.2-2008-rater' });
    expect(answer).toMatchObject({ finding: 'not-verifiable', reason: { code: 'weigh-in-not-permitted' } });
    expect(answer.procedure.id).toBe('cec-ra3.2-2008-rater');
  });

  it('names what is missing', async () => {
    const answer = await judged({ refrigerant: 'R-410A', kind: 'ducted', method: 'adjustment' });
    expect([...answer.missing].sort()).toEqual([
      'actualCharge',
      'factoryCharge',
      'includedLength',
      'installedLength',
      'liquidLineSize',
    ]);
  });
});

describe('what cannot be', () => {
  it('is told all at once, of the shape and of the values, in words', async () => {
    const errors = await refused({
      refrigerant: 'R-0',
      kind: 'attic',
      method: 'total',
      factoryCharge: { value: 6, unit: 'stone' },
      line: {
        installedLength: { value: -45, unit: 'ft' },
        liquidLineSize: '7/8',
        makersRate: { value: 0, unit: 'oz/ft' },
        shorterLine: null,
      },
      corrections: { coil: 4 },
      actualCharge: { value: -1, unit: 'oz' },
      scale: { resolution: { value: 0, unit: 'oz' } },
      vacuum: { deepest: { value: 400, unit: 'micron' }, isolatedMinutes: 'five' },
    });
    expect(errors).toEqual({
      refrigerant: 'This refrigerant is not in the list. Use its number, as in “R-410A”.',
      kind: 'Kind of system has an unknown value: give ducted or ductless.',
      factoryCharge: 'Factory charge has a unit that does not fit: give oz, lb, kg or g.',
      'line.installedLength': 'Installed length must not be less than zero.',
      'line.liquidLineSize': 'Size of the liquid line has an unknown value: give 1/4, 5/16, 3/8, 1/2 or other.',
      'line.makersRate': 'Maker’s rate must be more than zero.',
      'line.shorterLine': 'Rule for a shorter line is null: leave it out when it is not known.',
      'corrections.coil': 'Correction for the coil has the wrong type: give an object.',
      actualCharge: 'Weighed-in charge must not be less than zero.',
      'scale.resolution': 'Scale, resolution must be more than zero.',
      'vacuum.isolatedMinutes': 'Minutes isolated has the wrong type: give a number.',
    });
  });

  it.each([
    ['', null],
    ['procedure', { ...WEIGH_IN_EXAMPLE, procedure: 'by-feel' }],
  ])('names the field %j', async (path, body) => {
    expect(Object.keys(await refused(body))).toEqual([path]);
  });

  it('is another method of HTTP', async () => {
    expect((await server.ask(PATH)).status).toBe(405);
  });
});

it('never answers 5xx, whatever the body', async () => {
  const number = fc.oneof(fc.integer({ min: -50, max: 500 }), fc.double({ noNaN: true }));
  const mass = fc.record({ value: number, unit: fc.constantFrom('oz', 'lb', 'kg', 'g') });
  const length = fc.record({ value: number, unit: fc.constantFrom('ft', 'm') });
  const rate = fc.record({ value: number, unit: fc.constantFrom('oz/ft', 'g/m') });
  const size = fc.constantFrom('1/4', '5/16', '3/8', '1/2', 'other');
  const optional = { requiredKeys: [] };
  const body = fc.record(
    {
      refrigerant: fc.constantFrom('R-410A', 'R-32', 'R-744', 'R-0'),
      kind: fc.constantFrom('ducted', 'ductless'),
      method: fc.constantFrom('adjustment', 'total'),
      procedure: fc.constantFrom('general-rules', 'cec-ra3.2-2019-rater', 'cec-ra3.2-2008-rater'),
      outdoorDryBulb: fc.record({ value: number, unit: fc.constantFrom('degF', 'degC') }),
      factoryCharge: mass,
      line: fc.record(
        {
          installedLength: length,
          liquidLineSize: size,
          makersRate: rate,
          includedLength: length,
          includedLiquidLineSize: size,
          makersIncludedRate: rate,
          shorterLine: fc.constantFrom('subtract', 'keep'),
        },
        optional,
      ),
      corrections: fc.record({ coil: mass, drier: mass, other: mass }, optional),
      actualCharge: mass,
      scale: fc.record({ resolution: mass, plusMinus: mass }, optional),
      vacuum: fc.record(
        { deepest: fc.record({ value: number, unit: fc.constantFrom('micron', 'Pa') }), isolatedMinutes: number },
        optional,
      ),
      labelMaximum: mass,
    },
    { requiredKeys: ['refrigerant', 'kind', 'method'] },
  );
  const statuses = new Set<number>();
  await fc.assert(
    fc.asyncProperty(fc.oneof({ weight: 4, arbitrary: body }, fc.jsonValue({ maxDepth: 4 })), async (value) => {
      const { status } = await server.postJson(PATH, value);
      statuses.add(status);
      expect(status).toBeLessThan(500);
    }),
    { numRuns: 500 },
  );
  expect([...statuses].sort()).toEqual([200, 422]);
}, 60_000);
