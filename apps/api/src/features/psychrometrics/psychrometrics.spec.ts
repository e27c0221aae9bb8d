import { problem } from '@chargewright/contract/problem';
import { AIR_QUANTITIES, psychrometricsAnswer } from '@chargewright/contract/psychrometrics';
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

  it('is the same by every pair that determines it, and says what was given back to the last digit', async () => {
    const whole = await air('dryBulb=80&wetBulb=67&unit=degF');
    const values: Readonly<Record<string, number>> = {
      dryBulb: 80,
      wetBulb: 67,
      dewPoint: whole.dewPoint?.value ?? NaN,
      relativeHumidity: whole.relativeHumidity.value,
      humidityRatio: whole.humidityRatio.value,
      enthalpy: whole.enthalpy.value,
    };
    const pairs = AIR_QUANTITIES.flatMap((one, k) => AIR_QUANTITIES.slice(k + 1).map((other) => [one, other] as const));
    expect(pairs).toHaveLength(15);
    const refused: string[] = [];
    for (const [one, other] of pairs) {
      const response = await ask(`${one}=${values[one]}&${other}=${values[other]}&unit=degF`);
      if (response.status === 422) {
        refused.push(`${one} ${other}`);
        continue;
      }
      const state = psychrometricsAnswer.parse(await response.json());
      expect(state.dryBulb.value, `${one} ${other}`).toBeCloseTo(80, 6);
      expect(state.wetBulb.value, `${one} ${other}`).toBeCloseTo(67, 6);
      expect([state[one]?.value, state[other]?.value]).toEqual([values[one], values[other]]);
    }
    expect(refused).toEqual(['wetBulb enthalpy', 'dewPoint humidityRatio']);
  });

  it('takes an enthalpy in either unit, whatever the temperatures are in', async () => {
    const inSi = await air('dryBulb=26&relativeHumidity=50&unit=degC');
    const inBtu = await air('dryBulb=26&relativeHumidity=50&unit=degC&enthalpyUnit=Btu/lb');
    expect(inBtu.enthalpy.unit).toBe('Btu/lb');
    expect(inBtu.wetBulb).toEqual(inSi.wetBulb);
    for (const { enthalpy } of [inSi, inBtu]) {
      const back = await air(
        `enthalpy=${enthalpy.value}&enthalpyUnit=${encodeURIComponent(enthalpy.unit)}&relativeHumidity=50&unit=degC`,
      );
      expect(back.dryBulb.value).toBeCloseTo(26, 6);
      expect(back.enthalpy).toEqual(enthalpy);
    }
  });

  it('names what wets the bulb, also where it was not given', async () => {
    expect((await air('enthalpy=2&humidityRatio=0.001&unit=degC')).wetBulbSurface).toBe('ice');
    expect((await air('wetBulb=12&dewPoint=8&unit=degC')).wetBulbSurface).toBe('water');
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
    [
      'wetBulb=67&enthalpy=31&unit=degF',
      'enthalpy',
      'Wet bulb and enthalpy hardly differ: lines of one run almost along lines of the other, so the smallest error would move the dry bulb by many degrees. Give another reading in place of one of them.',
    ],
    [
      'dewPoint=60&humidityRatio=0.011&unit=degF',
      'humidityRatio',
      'Dew point and humidity ratio say the same thing: at one air pressure each gives the other, and the dry bulb stays open. Give another reading in place of one of them.',
    ],
    [
      'relativeHumidity=0&humidityRatio=0&unit=degC',
      'humidityRatio',
      'Perfectly dry air has relative humidity and humidity ratio 0 at any temperature: the dry bulb stays open. Give another reading in place of one of them.',
    ],
    ['wetBulb=60&dewPoint=61&unit=degF', 'dewPoint', 'Dew point 61 °F is above wet bulb 60 °F'],
    [
      'dryBulb=80&humidityRatio=0.03&unit=degF',
      'humidityRatio',
      'Humidity ratio 0.03 lb/lb is above 0.02224 lb/lb, the most that air of this dry bulb can hold.',
    ],
    [
      'wetBulb=20&humidityRatio=0.03&unit=degC',
      'humidityRatio',
      'Humidity ratio 0.03 kg/kg is above 0.0147 kg/kg, the most that air of this wet bulb can hold.',
    ],
    [
      'dryBulb=80&enthalpy=19.1&unit=degF',
      'enthalpy',
      'Enthalpy 19.1 Btu/lb is below 19.2 Btu/lb, which perfectly dry air of this dry bulb has.',
    ],
    [
      'dryBulb=20&enthalpy=60&unit=degC',
      'enthalpy',
      'Enthalpy 60 kJ/kg is above 57.42 kJ/kg, which saturated air of this dry bulb has.',
    ],
    [
      'dewPoint=20&enthalpy=50&unit=degC',
      'enthalpy',
      'Enthalpy 50 kJ/kg is below 57.42 kJ/kg, which air saturated with this much water has.',
    ],
    [
      'humidityRatio=0.001&enthalpy=200&unit=degC',
      'enthalpy',
      'Together these two give a dry bulb of 195.96 °C, outside −60 °C to 90 °C, where moist air is known.',
    ],
    [
      'dewPoint=50&relativeHumidity=10&unit=degC',
      'relativeHumidity',
      'With relative humidity 10 % the dry bulb would lie outside −60 °C to 90 °C, where moist air is known.',
    ],
    [
      'wetBulb=95&relativeHumidity=50&unit=degC',
      'wetBulb',
      'Wet bulb 95 °C is outside −60 °C to 90 °C, where moist air is known.',
    ],
    [
      'wetBulb=20&dewPoint=-101&unit=degC',
      'dewPoint',
      'Dew point −101 °C is outside −100 °C to 90 °C, where moist air is known.',
    ],
    [
      'dryBulb=20&humidityRatio=-0.001&unit=degC',
      'humidityRatio',
      'Humidity ratio −0.001 kg/kg is outside 0 kg/kg to 400 kg/kg, where moist air is known.',
    ],
    [
      'humidityRatio=0.001&enthalpy=-70&unit=degC',
      'enthalpy',
      'Enthalpy −70 kJ/kg is outside −60.36 kJ/kg to 1000000 kJ/kg, where moist air is known.',
    ],
    [
      'wetBulb=88&humidityRatio=0.5&unit=degC&elevation=18000&elevationUnit=ft',
      'humidityRatio',
      'Water boils at this temperature and elevation: there would be no air left.',
    ],
  ])('?%s says of %s: %s', async (query, path, message) => {
    expect(await faults(query)).toEqual({ [path]: message });
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
    ['enthalpy=31&unit=degF', ['dryBulb']],
    ['wetBulb=95&relativeHumidity=120&unit=degC', ['relativeHumidity', 'wetBulb']],
    ['dryBulb=80&enthalpy=31&unit=degF&enthalpyUnit=kcal', ['enthalpyUnit']],
  ])('?%s is refused at %j', async (query, paths) => {
    expect(Object.keys(await faults(query)).sort()).toEqual(paths);
  });

  it('answers 405 to other methods', async () => {
    expect((await server.postJson('/api/v1/psychrometrics', {})).status).toBe(405);
  });
});
