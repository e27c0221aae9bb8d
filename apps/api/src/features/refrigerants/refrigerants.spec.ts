import { problem } from '@chargewright/contract/problem';
import { refrigerantsAnswer, saturationByPressure, saturationByTemperature } from '@chargewright/contract/refrigerant';
import type {
  RefrigerantsAnswer,
  SaturationByPressure,
  SaturationByTemperature,
} from '@chargewright/contract/refrigerant';
import { REFRIGERANT_IDS } from '@chargewright/engine';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestServer } from '../../testing/test-server';
import type { TestServer } from '../../testing/test-server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const saturation = (id: string, query: string) =>
  server.ask(`/api/v1/refrigerants/${encodeURIComponent(id)}/saturation?${query}`);

async function atPressure(id: string, query: string): Promise<SaturationByPressure> {
  const response = await saturation(id, query);
  expect(response.status).toBe(200);
  return saturationByPressure.parse(await response.json());
}

async function atTemperature(id: string, query: string): Promise<SaturationByTemperature> {
  const response = await saturation(id, query);
  expect(response.status).toBe(200);
  return saturationByTemperature.parse(await response.json());
}

async function faultPaths(id: string, query: string): Promise<readonly string[]> {
  const response = await saturation(id, query);
  expect(response.status).toBe(422);
  return (problem.parse(await response.json()).errors ?? []).map(({ path }) => path);
}

describe('the list of refrigerants', () => {
  let list: RefrigerantsAnswer['refrigerants'];
  beforeAll(async () => {
    list = refrigerantsAnswer.parse(await (await server.ask('/api/v1/refrigerants')).json()).refrigerants;
  });
  const named = (id: string) => list.find((refrigerant) => refrigerant.id === id);

  it('has every refrigerant with curves', () => {
    expect(list.map(({ id }) => id)).toEqual(REFRIGERANT_IDS);
  });

  it('describes a blend', () => {
    expect(named('R-410A')).toMatchObject({
      safetyClass: 'A1',
      modelGrade: 'A',
      composition: [
        { id: 'R-32', massFraction: 0.5 },
        { id: 'R-125', massFraction: 0.5 },
      ],
      criticalPoint: { temperature: { unit: 'degC' }, pressure: { unit: 'kPaa' } },
    });
    // R-407C glides by 6 to 7 K at evaporating pressures, R-410A by about 0.1 K (common practice, no source)
    expect(named('R-407C')?.glide.value).toBeGreaterThan(5);
    expect(named('R-407C')?.glide.value).toBeLessThan(8);
    expect(named('R-410A')?.glide.value).toBeLessThan(0.3);
  });

  it('gives a pure fluid no glide', () => {
    expect(named('R-32')?.glide.value).toBe(0);
    expect(named('R-32')?.composition).toEqual([{ id: 'R-32', massFraction: 1 }]);
  });

  it('has whole compositions', () => {
    for (const { id, composition } of list) {
      const sum = composition.reduce((total, { massFraction }) => total + massFraction, 0);
      expect(sum, id).toBeCloseTo(1, 9);
    }
  });
});

describe('saturation at a pressure', () => {
  it('is answered in °F for psi', async () => {
    const { bubbleTemperature, dewTemperature, glide, reason } = await atPressure('R-407C', 'pressure=70&unit=psig');
    expect(reason).toBeNull();
    expect(bubbleTemperature?.unit).toBe('degF');
    expect(dewTemperature?.unit).toBe('degF');
    expect(glide?.unit).toBe('deltaF');
    expect(glide?.value).toBeCloseTo((dewTemperature?.value ?? NaN) - (bubbleTemperature?.value ?? NaN), 9);
  });

  it.each(['500 kPag', '600 kPaa', '5 barg', '6 bara', '5 inHgVac'])('is answered in °C for %s', async (given) => {
    const [pressure, unit] = given.split(' ');
    const { dewTemperature, atmosphere } = await atPressure('R-134a', `pressure=${pressure}&unit=${unit}`);
    expect(dewTemperature?.unit).toBe('degC');
    expect(atmosphere.unit).toBe('kPaa');
  });

  it('is R-22 at 40 °F for about 68.5 psig, as every chart prints it', async () => {
    const { dewTemperature } = await atPressure('R-22', 'pressure=68.5&unit=psig');
    expect(dewTemperature?.value).toBeCloseTo(40, 0);
  });

  it('counts gauge pressures from the air at the elevation', async () => {
    const sea = await atPressure('R-410A', 'pressure=118&unit=psig');
    const high = await atPressure('R-410A', 'pressure=118&unit=psig&elevation=5280&elevationUnit=ft');
    expect(sea.atmosphere.value).toBeCloseTo(14.696, 3);
    // 5,280 ft: 12.10 psia (83.4 kPa) by the ICAO standard atmosphere
    expect(high.atmosphere.value).toBeCloseTo(12.1, 2);
    const absolute = await atPressure('R-410A', `pressure=${118 + high.atmosphere.value}&unit=psia`);
    expect(high.dewTemperature?.value).toBeCloseTo(absolute.dewTemperature?.value ?? NaN, 9);
    expect(high.dewTemperature?.value).toBeLessThan((sea.dewTemperature?.value ?? NaN) - 1);
  });

  it('takes a designation with brackets', async () => {
    expect((await atPressure('R-1234ze(E)', 'pressure=40&unit=psig')).refrigerant).toBe('R-1234ze(E)');
  });

  it('is null where the curve has no answer and physics has', async () => {
    const near = await atPressure('R-410A', 'pressure=705&unit=psia');
    expect(near).toMatchObject({ bubbleTemperature: null, dewTemperature: null, glide: null, reason: 'outside-curve' });
    const low = await atPressure('R-410A', 'pressure=1&unit=psia');
    expect(low).toMatchObject({ bubbleTemperature: null, reason: 'outside-curve' });
  });
});

describe('saturation at a temperature', () => {
  it('gives bubble and dew, gauge and absolute, and leads back', async () => {
    const { bubblePressure, dewPressure, atmosphere } = await atTemperature('R-407C', 'temperature=40&unit=degF');
    expect(bubblePressure?.gauge.unit).toBe('psig');
    expect(dewPressure?.absolute.unit).toBe('psia');
    expect((dewPressure?.absolute.value ?? NaN) - (dewPressure?.gauge.value ?? NaN)).toBeCloseTo(atmosphere.value, 9);
    const back = await atPressure('R-407C', `pressure=${dewPressure?.gauge.value}&unit=psig`);
    expect(back.dewTemperature?.value).toBeCloseTo(40, 7);
    const bubbleBack = await atPressure('R-407C', `pressure=${bubblePressure?.absolute.value}&unit=psia`);
    expect(bubbleBack.bubbleTemperature?.value).toBeCloseTo(40, 7);
  });

  it.each(['degC', 'K'])('is answered in kPa for %s', async (unit) => {
    const { dewPressure } = await atTemperature('R-32', `temperature=${unit === 'K' ? 280 : 7}&unit=${unit}`);
    expect(dewPressure).toMatchObject({ gauge: { unit: 'kPag' }, absolute: { unit: 'kPaa' } });
  });

  it('is null outside the curve', async () => {
    expect(await atTemperature('R-410A', 'temperature=-60&unit=degC')).toMatchObject({
      bubblePressure: null,
      dewPressure: null,
      reason: 'outside-curve',
    });
  });
});

describe('a look-up that cannot be', () => {
  it.each([
    ['pressure=900&unit=psig', ['pressure']],
    ['pressure=-14.7&unit=psig', ['pressure']],
    ['pressure=0&unit=kPaa', ['pressure']],
    ['temperature=400&unit=degF', ['temperature']],
    ['temperature=-1&unit=K', ['temperature']],
    ['pressure=118&unit=psig&elevation=20000&elevationUnit=ft', ['elevation']],
    ['pressure=900&unit=psia&elevation=20000&elevationUnit=ft', ['elevation', 'pressure']],
    ['temperature=400&unit=degF&elevation=-1&elevationUnit=mile', ['elevationUnit']],
    ['', ['unit', 'pressure']],
    ['pressure=high&temperature=40&unit=psig&elevation=1', ['pressure', 'temperature', 'elevationUnit']],
  ])('?%s is refused at %j', async (query, paths) => {
    expect(await faultPaths('R-410A', query)).toEqual(paths);
  });

  it.each(['R-0', 'r-410a', 'R410A', '__proto__', 'toString'])('does not know %s', async (id) => {
    const response = await saturation(id, 'pressure=1&unit=psig');
    expect(response.status).toBe(404);
    expect(problem.parse(await response.json()).code).toBe('unknown-refrigerant');
  });

  it('answers 400 to an address that does not decode', async () => {
    const response = await server.ask('/api/v1/refrigerants/%E0%A4%A/saturation?pressure=1&unit=psig');
    expect(response.status).toBe(400);
    expect(problem.parse(await response.json()).code).toBe('malformed-request');
  });

  it('answers 405 to other methods', async () => {
    expect((await server.postJson('/api/v1/refrigerants', {})).status).toBe(405);
    expect((await server.postJson('/api/v1/refrigerants/R-22/saturation', {})).status).toBe(405);
  });
});
