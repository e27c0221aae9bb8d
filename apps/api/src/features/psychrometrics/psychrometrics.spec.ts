import { problem } from '@chargewright/contract/problem';
import { psychrometricsAnswer } from '@chargewright/contract/psychrometrics';
import type { PsychrometricsAnswer } from '@chargewright/contract/psychrometrics';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestServer } from '../../testing/test-server';
import type { TestServer } from '../../testing/test-server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const ask = (query: string) => server.ask(`/api/v1/psychrometrics?${query}`);

async function air(query: string): Promise<PsychrometricsAnswer> {
  const response = await ask(query);
  expect(response.status).toBe(200);
  return psychrometricsAnswer.parse(await response.json());
}

async function faults(query: string): Promise<Readonly<Record<string, string>>> {
  const response = await ask(query);
  expect(response.status).toBe(422);
  const { errors = [] } = problem.parse(await response.json());
  return Object.fromEntries(errors.map(({ path, message }) => [path, message]));
}

describe('moist air', () => {
  it('of 80 °F and 67 °F wet bulb has the properties of the chart', async () => {
    const state = await air('dryBulb=80&wetBulb=67&unit=degF');
    expect(state.dryBulb).toEqual({ value: 80, unit: 'degF' });
    expect(state.wetBulb).toEqual({ value: 67, unit: 'degF' });
    // the AHRI rating point; read from a psychrometric chart: 51 %, 78 gr/lb, 31.4 Btu/lb, 13.85 ft³/lb, 60.3 °F (from memory)
    expect(state.relativeHumidity.value).toBeCloseTo(51.1, 0);
    expect(state.relativeHumidity.unit).toBe('%');
    expect(state.humidityRatio.value * 7_000).toBeCloseTo(78, 0);
    expect(state.humidityRatio.unit).toBe('1');
    expect(state.enthalpy).toMatchObject({ unit: 'Btu/lb' });
    expect(state.enthalpy.value).toBeCloseTo(31.4, 1);
    expect(state.specificVolume).toMatchObject({ unit: 'ft3/lb' });
    expect(state.specificVolume.value).toBeCloseTo(13.85, 2);
    expect(state.dewPoint?.value).toBeCloseTo(60.3, 1);
    expect(state.vaporPressure.unit).toBe('psia');
  });

  it('is answered in SI for °C', async () => {
    const state = await air('dryBulb=25&relativeHumidity=50&unit=degC');
    expect(state.relativeHumidity).toEqual({ value: 50, unit: '%' });
    expect(state).toMatchObject({
      wetBulb: { unit: 'degC' },
      enthalpy: { unit: 'kJ/kg' },
      specificVolume: { unit: 'm3/kg' },
      vaporPressure: { unit: 'kPaa' },
      wetBulbSurface: 'water',
    });
    // ASHRAE Fundamentals (2017) ch. 1, eq. 30 SI
    const { value } = state.humidityRatio;
    expect(state.enthalpy.value).toBeCloseTo(1.006 * 25 + value * (2501 + 1.86 * 25), 9);
  });

  it('is the same by wet bulb, relative humidity and dew point', async () => {
    const byWetBulb = await air('dryBulb=80&wetBulb=67&unit=degF');
    const byHumidity = await air(`dryBulb=80&relativeHumidity=${byWetBulb.relativeHumidity.value}&unit=degF`);
    const byDewPoint = await air(`dryBulb=80&dewPoint=${byWetBulb.dewPoint?.value}&unit=degF`);
    for (const { humidityRatio, wetBulb } of [byHumidity, byDewPoint]) {
      expect(humidityRatio.value).toBeCloseTo(byWetBulb.humidityRatio.value, 9);
      expect(wetBulb.value).toBeCloseTo(67, 6);
    }
  });

  it('holds more water at elevation for the same bulbs', async () => {
    const sea = await air('dryBulb=80&wetBulb=67&unit=degF');
    const high = await air('dryBulb=80&wetBulb=67&unit=degF&elevation=5280&elevationUnit=ft');
    expect(high.humidityRatio.value).toBeGreaterThan(sea.humidityRatio.value * 1.1);
    expect(high.atmosphere.value).toBeCloseTo(12.1, 2);
  });

  it('without any water has no dew point', async () => {
    expect((await air('dryBulb=300&relativeHumidity=0&unit=K')).dewPoint).toBeNull();
  });
});

describe('air that cannot be', () => {
  it('says what contradicts what', async () => {
    expect(await faults('dryBulb=78&wetBulb=81&unit=degF')).toEqual({
      wetBulb: 'Wet bulb 81 °F is above dry bulb 78 °F',
    });
  });

  it.each([
    ['dryBulb=80&dewPoint=81&unit=degF', ['dewPoint']],
    ['dryBulb=100&wetBulb=20&unit=degF', ['wetBulb']],
    ['dryBulb=80&relativeHumidity=100.1&unit=degF', ['relativeHumidity']],
    ['dryBulb=80&relativeHumidity=-1&unit=degF', ['relativeHumidity']],
    ['dryBulb=80&dewPoint=-200&unit=degF', ['dewPoint']],
    ['dryBulb=200&relativeHumidity=10&unit=degF', ['dryBulb']],
    ['dryBulb=-500&wetBulb=-501&unit=degF', ['dryBulb']],
    ['dryBulb=88&dewPoint=88&unit=degC&elevation=18000&elevationUnit=ft', ['dewPoint']],
    [
      'dryBulb=300&relativeHumidity=120&unit=degF&elevation=9e9&elevationUnit=m',
      ['dryBulb', 'elevation', 'relativeHumidity'],
    ],
    ['unit=furlong', ['dryBulb', 'unit', 'wetBulb']],
    ['dryBulb=80&wetBulb=67&dewPoint=60&unit=degF', ['dewPoint']],
  ])('?%s is refused at %j', async (query, paths) => {
    expect(Object.keys(await faults(query)).sort()).toEqual(paths);
  });

  it('answers 405 to other methods', async () => {
    expect((await server.postJson('/api/v1/psychrometrics', {})).status).toBe(405);
  });
});
