import { describe, expect, it } from 'vitest';
import type { Known } from '../derivation/quantity';
import { isKnown } from '../derivation/quantity';
import { PA_PER_PSI, temperatureFromK } from '../units';
import type { UsedReadingId } from './assumed-uncertainty';
import type { CheckInput } from './input';
import type { PlusMinus, ReadingInput } from './request';
import { deriveQuantities } from './derived-quantities';
import { inputOf, orificeRequest, valveRequest } from './testing/healthy-systems';
import type { Changes } from './testing/healthy-systems';

function read(id: UsedReadingId, reading: ReadingInput, setup: Changes['setup'] = {}): Known {
  const found = inputOf(valveRequest({ setup, readings: { [id]: reading } })).readings[id];
  if (found === undefined) throw new Error(`${id} was not read`);
  return found.quantity;
}

const ATMOSPHERE_PA = 101_325;
const ROOT_3 = Math.sqrt(3);

describe('values', () => {
  it.each<[ReadingInput, number]>([
    [{ value: 41, unit: 'degF' }, 278.15],
    [{ value: 5, unit: 'degC' }, 278.15],
    [{ value: 278.15, unit: 'K' }, 278.15],
    [{ value: -40, unit: 'degF' }, 233.15],
  ])('a temperature of %j is %d K', (reading, kelvin) => {
    expect(read('outdoorDryBulb', reading).value).toBeCloseTo(kelvin, 10);
  });

  it.each<[ReadingInput, number]>([
    [{ value: 100, unit: 'psig' }, 100 * PA_PER_PSI + ATMOSPHERE_PA],
    [{ value: 100, unit: 'psia' }, 100 * PA_PER_PSI],
    [{ value: 700, unit: 'kPag' }, 801_325],
    [{ value: 700, unit: 'kPaa' }, 700_000],
    [{ value: 7, unit: 'barg' }, 801_325],
    [{ value: 7, unit: 'bara' }, 700_000],
    // 10 inches of mercury below the atmosphere: 33.86389 kPa
    [{ value: 10, unit: 'inHgVac' }, 101_325 - 33_863.89],
  ])('a pressure of %j at sea level is %d Pa', (reading, pa) => {
    expect(read('suctionPressure', reading).value).toBeCloseTo(pa, 6);
  });

  it('a gauge pressure counts from the local atmosphere: 12.228 psia at 5000 ft', () => {
    const elevation = { value: 5000, unit: 'ft' } as const;
    const at5000 = read('suctionPressure', { value: 118, unit: 'psig' }, { elevation });
    expect(at5000.value / PA_PER_PSI).toBeCloseTo(118 + 12.228, 3);
    expect(read('suctionPressure', { value: 118, unit: 'psia' }, { elevation }).value / PA_PER_PSI).toBeCloseTo(
      118,
      10,
    );
    const stationPressure = { value: 85, unit: 'kPaa' } as const;
    const measured = read('suctionPressure', { value: 118, unit: 'psig' }, { elevation, stationPressure });
    expect(measured.value).toBeCloseTo(118 * PA_PER_PSI + 85_000, 6);
  });

  it('a relative humidity is a fraction, an airflow is in m³/s', () => {
    expect(read('returnRelativeHumidity', { value: 50, unit: '%' }).value).toBe(0.5);
    // 1 cfm = 0.0283168465920 m³ / 60 s
    expect(read('airflow', { value: 1200, unit: 'cfm' }).value).toBeCloseTo((1200 * 0.028316846592) / 60, 12);
    expect(read('airflow', { value: 3600, unit: 'm3/h' }).value).toBeCloseTo(1, 12);
    expect(read('airflow', { value: 500, unit: 'L/s' }).value).toBeCloseTo(0.5, 12);
  });
});

describe('uncertainty when none is stated', () => {
  it.each<[UsedReadingId, ReadingInput, number]>([
    ['returnDryBulb', { value: 76, unit: 'degF' }, 1 / 1.8],
    ['returnWetBulb', { value: 19, unit: 'degC' }, 1 / 1.8],
    ['supplyDryBulb', { value: 59, unit: 'degF' }, 1 / 1.8],
    ['supplyWetBulb', { value: 57, unit: 'degF' }, 1 / 1.8],
    ['outdoorDryBulb', { value: 300, unit: 'K' }, 1 / 1.8],
    ['suctionLineTemperature', { value: 52, unit: 'degF' }, 1 / 1.8],
    ['liquidLineTemperature', { value: 95, unit: 'degF' }, 1 / 1.8],
    ['dischargeLineTemperature', { value: 180, unit: 'degF' }, 1 / 1.8],
    ['returnRelativeHumidity', { value: 50, unit: '%' }, 0.03],
    ['suctionPressure', { value: 132, unit: 'psia' }, 2 * PA_PER_PSI],
    ['liquidPressure', { value: 355, unit: 'psia' }, 4 * PA_PER_PSI],
    ['dischargePressure', { value: 355, unit: 'psia' }, 4 * PA_PER_PSI],
    ['airflow', { value: 0.5 * 1000, unit: 'L/s' }, 0.07 * 0.5],
    ['writtenEvaporatingTemperature', { value: 40, unit: 'degF' }, 0],
    ['writtenCondensingTemperature', { value: 105, unit: 'degF' }, 0],
  ])('of %s is a limit, rectangular', (id, reading, limit) => {
    const quantity = read(id, reading);
    expect(quantity.u).toBeCloseTo(limit / ROOT_3, 10);
    if (limit > 0) expect(quantity.step).toMatchObject({ parts: [{ key: `reading:${id}`, shape: 'rectangular' }] });
  });

  it('of a gauge pressure has that of the atmosphere too: ±1.5 kPa by elevation, ±0.1 kPa by a barometer', () => {
    const gauge = (2 * PA_PER_PSI) / ROOT_3;
    const reading = { value: 118, unit: 'psig' } as const;
    expect(read('suctionPressure', reading).u).toBeCloseTo(Math.hypot(gauge, 1500 / ROOT_3), 4);
    const stationPressure = { value: 101, unit: 'kPaa' } as const;
    expect(read('suctionPressure', reading, { stationPressure }).u).toBeCloseTo(Math.hypot(gauge, 100 / ROOT_3), 4);
  });
});

describe('uncertainty as stated', () => {
  const withPlusMinus = (plusMinus: PlusMinus) => read('returnWetBulb', { value: 65, unit: 'degF', plusMinus });

  it('a limit is rectangular: divided by √3; it is the default kind', () => {
    for (const plusMinus of [
      { value: 0.9, unit: 'deltaF' },
      { value: 0.9, unit: 'deltaF', kind: 'limit' },
    ] as const) {
      expect(withPlusMinus(plusMinus).u).toBeCloseTo(0.5 / ROOT_3, 12);
      expect(withPlusMinus(plusMinus).step).toMatchObject({ parts: [{ shape: 'rectangular' }] });
    }
  });

  it('an expanded uncertainty with k = 2 is halved, and normal', () => {
    const quantity = withPlusMinus({ value: 0.5, unit: 'deltaC', kind: 'k2' });
    expect(quantity.u).toBeCloseTo(0.25, 12);
    expect(quantity.step).toMatchObject({ parts: [{ shape: 'normal' }] });
  });

  it.each<[UsedReadingId, ReadingInput, number]>([
    ['suctionPressure', { value: 132, unit: 'psia', plusMinus: { value: 1, unit: 'psi' } }, PA_PER_PSI],
    ['suctionPressure', { value: 132, unit: 'psia', plusMinus: { value: 5, unit: 'kPa' } }, 5000],
    ['suctionPressure', { value: 132, unit: 'psia', plusMinus: { value: 0.1, unit: 'bar' } }, 10_000],
    ['returnRelativeHumidity', { value: 50, unit: '%', plusMinus: { value: 2, unit: '%' } }, 0.02],
    ['airflow', { value: 1000, unit: 'L/s', plusMinus: { value: 5, unit: '%' } }, 0.05],
    ['airflow', { value: 1000, unit: 'L/s', plusMinus: { value: 36, unit: 'm3/h' } }, 0.01],
    ['airflow', { value: 1000, unit: 'L/s', plusMinus: { value: 20, unit: 'L/s' } }, 0.02],
  ])('of %s in any unit of the quantity (%j)', (id, reading, limit) => {
    expect(read(id, reading).u).toBeCloseTo(limit / ROOT_3, 9);
  });

  it('of zero is zero', () => {
    expect(withPlusMinus({ value: 0, unit: 'deltaF' }).u).toBe(0);
  });

  it('takes the step of the display as ± half of it, a rounding of its own', () => {
    const reading = { value: 65, unit: 'degF', resolution: 0.9, plusMinus: { value: 0, unit: 'deltaF' } } as const;
    const quantity = read('returnWetBulb', reading);
    expect(quantity.u).toBeCloseTo(0.25 / ROOT_3, 12);
    expect([...quantity.contributions.keys()]).toEqual(['resolution:returnWetBulb']);
    const vacuum = read('suctionPressure', {
      value: 5,
      unit: 'inHgVac',
      resolution: 1,
      plusMinus: { value: 0, unit: 'psi' },
    });
    expect(vacuum.contributions.get('resolution:suctionPressure')).toBeCloseTo(3386.389 / 2 / ROOT_3, 9);
  });
});

describe('one instrument for several readings', () => {
  const changes = (id: string): Changes => ({
    readings: {
      returnDryBulb: { value: 76, unit: 'degF', instrumentId: id },
      supplyDryBulb: { value: 59, unit: 'degF', instrumentId: 'a' },
      suctionPressure: { value: 118, unit: 'psig', instrumentId: 'a' },
    },
  });
  const keys = (id: UsedReadingId, { readings }: CheckInput) => [...readings[id]!.quantity.contributions.keys()];

  it('shares its error within a kind of quantity, and no further', () => {
    const input = inputOf(valveRequest(changes('a')));
    expect(keys('returnDryBulb', input)).toEqual(keys('supplyDryBulb', input));
    expect(keys('suctionPressure', input)).toContain('instrument:pressure:a');
    expect(keys('suctionLineTemperature', input)).toEqual(['reading:suctionLineTemperature']);
    expect(keys('returnDryBulb', inputOf(valveRequest(changes('b'))))).not.toEqual(keys('supplyDryBulb', input));
  });
});

describe('setup and visit', () => {
  it('what is left out is the usual, and named as assumed', () => {
    const setup = { mode: null, kind: null, stage: null, highSidePort: null, elevation: null } as const;
    expect(inputOf(valveRequest({ setup, visit: { preflight: null } }))).toMatchObject({
      procedure: { id: 'general-rules', version: 1 },
      setup: {
        mode: 'cooling',
        kind: 'split',
        stage: 'full',
        highSidePort: 'liquid',
        assumed: ['mode', 'kind', 'stage', 'highSidePort'],
        elevationAssumed: true,
        targetSubcoolingPort: 'liquid',
        atmosphere: { value: 101_325 },
      },
      visit: {
        preflight: {},
        addedThisVisitKg: 0,
        additionsOnEarlierVisits: 0,
        commissioning: false,
        hoursOff: 0,
        headRaised: false,
        iceSeen: false,
      },
    });
  });

  it('amounts are in SI', () => {
    const { setup, visit } = inputOf(
      valveRequest({
        setup: {
          targetSuperheat: { value: 9, unit: 'deltaF' },
          targetSubcooling: { value: 5, unit: 'deltaC' },
          superheatRange: { low: 9, high: 18, unit: 'deltaF' },
          nominalCapacity: { value: 3, unit: 'ton' },
          designAirflow: { value: 3600, unit: 'm3/h' },
          factoryCharge: { value: 6, unit: 'lb' },
          maxHighPressure: { value: 40, unit: 'barg' },
          lineSet: { lift: { value: 10, unit: 'ft' } },
          chargeMode: true,
        },
        visit: { addedThisVisit: { value: 16, unit: 'oz' }, lowestReturnDryBulb: { value: 22, unit: 'degC' } },
      }),
    );
    expect(setup.targetSuperheat?.value).toBeCloseTo(5, 12);
    expect(setup.targetSuperheat?.u).toBe(0);
    expect(setup.targetSubcooling?.value).toBe(5);
    expect(setup.superheatRange).toEqual({ lowK: 5, highK: 10 });
    // 1 ton of refrigeration is 3516.853 W
    expect(setup.nominalCapacityW).toBeCloseTo(3 * 3516.853, 2);
    expect(setup.designAirflowM3PerS).toBeCloseTo(1, 12);
    expect(setup.factoryChargeKg).toBeCloseTo(6 * 0.45359237, 12);
    expect(setup.maxHighPressurePa).toBeCloseTo(4e6 + 101_325, 6);
    expect(setup.liftM).toBeCloseTo(3.048, 12);
    expect(setup.chargeMode).toBe(true);
    expect([setup.alteration, setup.highVelocity, setup.airflowPath]).toEqual([false, false, undefined]);
    expect(visit.addedThisVisitKg).toBeCloseTo(0.45359237, 12);
    expect(visit.lowestReturn?.value).toBeCloseTo(295.15, 10);
  });

  it('takes the procedure by its id, and what the procedures ask of a system', () => {
    const { procedure, setup } = inputOf(
      valveRequest({
        procedure: 'cec-ra3.2-2019-rater',
        setup: { alteration: true, highVelocity: true, airflowPath: 'best-possible' },
      }),
    );
    expect(procedure.id).toBe('cec-ra3.2-2019-rater');
    expect(setup).toMatchObject({ alteration: true, highVelocity: true, airflowPath: 'best-possible' });
  });

  it('an amount added before stands for an addition on an earlier visit where none was counted', () => {
    const additions = (visit: Changes['visit']): number =>
      inputOf(valveRequest({ visit: visit! })).visit.additionsOnEarlierVisits;
    const addedBefore = { value: 4, unit: 'oz' } as const;
    expect(additions({ addedBefore })).toBe(1);
    expect(additions({ addedBefore: { value: 0, unit: 'oz' } })).toBe(0);
    expect(additions({ addedBefore, additionsOnEarlierVisits: 2 })).toBe(2);
    expect(additions({ addedBefore, additionsOnEarlierVisits: 0 })).toBe(0);
  });

  it('earlier readings are read like the others, with the same atmosphere', () => {
    const { readings } = valveRequest();
    const elevation = { value: 5000, unit: 'ft' } as const;
    const { visit, readings: now } = inputOf(
      valveRequest({ setup: { elevation }, visit: { earlier: { minutesAgo: 6, readings } } }),
    );
    expect(visit.earlier?.minutesAgo).toBe(6);
    expect(visit.earlier?.readings.suctionPressure?.quantity.value).toBe(now.suctionPressure?.quantity.value);
  });

  it('keeps what the separating tests measured and showed', () => {
    const { readings, visit, setup } = inputOf(
      valveRequest({
        setup: { expectedCompressorCurrent: { value: 12, unit: 'A' } },
        visit: { tests: { liquidShutIn: true, bulb: 'loose', valve: 'hunting' } },
        readings: { standingPressure: 250, drierInletTemperature: 95, compressorCurrent: 10 },
      }),
    );
    expect(visit.tests).toEqual({ liquidShutIn: true, bulb: 'loose', valve: 'hunting' });
    expect(inputOf(valveRequest()).visit.tests).toEqual({});
    expect(setup.expectedCompressorCurrentA).toBe(12);
    expect(readings.compressorCurrent?.quantity).toMatchObject({ kind: 'currentA', value: 10 });
    // ±3 % as a limit
    expect(readings.compressorCurrent?.quantity.u).toBeCloseTo(0.3 / Math.sqrt(3), 12);
    expect(readings.standingPressure?.quantity.value).toBeCloseTo(264.695948775513 * PA_PER_PSI, 3);
    expect(readings.drierInletTemperature?.quantity.u).toBeCloseTo(5 / 9 / Math.sqrt(3), 12);
  });

  it('takes the mean of two wet bulbs that agree, as no surer than one of them, and the later of two that do not', () => {
    const wetBulb = (before: number) => {
      const { setup, readings } = inputOf(orificeRequest({ readings: { returnWetBulbBefore: before } }));
      return deriveQuantities(setup, readings).returnWetBulb;
    };
    const [one, two, apart] = [wetBulb(66), wetBulb(66.9), wetBulb(67.1)];
    if (!isKnown(one) || !isKnown(two) || !isKnown(apart)) throw new Error('not known');
    expect(one.u).toBeCloseTo(5 / 9 / Math.sqrt(3), 9);
    expect(temperatureFromK(two.value, 'degF')).toBeCloseTo(66.45, 9);
    // one thermometer, and half of the drift as a limit
    expect(two.u).toBeCloseTo((Math.hypot(1, 0.45) * 5) / 9 / Math.sqrt(3), 6);
    expect(temperatureFromK(apart.value, 'degF')).toBeCloseTo(66, 9);
  });

  it('keeps age and step with a reading, and leaves out what enters no computation', () => {
    const reading = { value: 52, unit: 'degF', ageSeconds: 30, resolution: 0.9 } as const;
    const { readings } = inputOf(
      orificeRequest({
        readings: {
          suctionLineTemperature: reading,
          compressorCurrent: 12,
          lineVoltage: 240,
          returnStaticPressure: -0.2,
        },
      }),
    );
    expect(readings.suctionLineTemperature).toMatchObject({
      ageSeconds: 30,
      resolution: expect.closeTo(0.5, 10) as number,
    });
    expect(readings.suctionPressure).not.toHaveProperty('ageSeconds');
    expect(Object.keys(readings)).toHaveLength(9);
    for (const id of ['lineVoltage', 'returnStaticPressure']) expect(Object.keys(readings)).not.toContain(id);
  });
});
