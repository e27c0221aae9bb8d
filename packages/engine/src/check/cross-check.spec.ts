import { describe, expect, it } from 'vitest';
import { crossCheck } from './cross-check';
import type { PartialRequest } from './cross-check';
import { READING_IDS } from './readings';
import { readRequest } from './read-request';
import type { ReadingInput, SetupInput, VisitInput } from './request';
import { orificeRequest, valveRequest } from './testing/healthy-systems';

const faultsOf = (request: PartialRequest): readonly string[] =>
  crossCheck(request).map(({ path, code }) => `${path} ${code}`);
const setup = (changes: Partial<SetupInput>) =>
  ({ setup: { refrigerant: 'R-410A', meteringDevice: 'txv', ...changes } }) as const;
const readings = (changes: Readonly<Record<string, ReadingInput>>) => ({ ...setup({}), readings: changes });
const degF = (value: number): ReadingInput => ({ value, unit: 'degF' });

it('a healthy request has no fault, nor has one with nothing but what is required', () => {
  expect(crossCheck(orificeRequest())).toEqual([]);
  expect(crossCheck(valveRequest())).toEqual([]);
  expect(crossCheck({ ...setup({}), readings: {} })).toEqual([]);
  expect(crossCheck({})).toEqual([]);
});

describe('every fault', () => {
  it.each<[string, PartialRequest, readonly string[]]>([
    ['unknown procedure', { procedure: 'my-rules' }, ['procedure unknown-procedure']],
    ['known procedure', { procedure: 'general-rules' }, []],
    ['unknown refrigerant', setup({ refrigerant: 'R-410' }), ['setup.refrigerant unknown-refrigerant']],
    [
      'wet bulb above dry bulb',
      readings({ returnDryBulb: degF(78), returnWetBulb: degF(81) }),
      ['readings.returnWetBulb wet-bulb-above-dry-bulb'],
    ],
    ['wet bulb at dry bulb', readings({ returnDryBulb: degF(78), returnWetBulb: degF(78) }), []],
    [
      'wet bulb at dry bulb in another unit',
      readings({ returnDryBulb: degF(78), returnWetBulb: { value: ((78 - 32) * 5) / 9, unit: 'degC' } }),
      [],
    ],
    [
      'supply wet bulb above dry bulb',
      readings({ supplyDryBulb: degF(58), supplyWetBulb: degF(58.1) }),
      ['readings.supplyWetBulb wet-bulb-above-dry-bulb'],
    ],
    [
      'below absolute zero',
      readings({ returnDryBulb: { value: -273.16, unit: 'degC' } }),
      ['readings.returnDryBulb below-absolute-zero'],
    ],
    ['absolute zero', readings({ returnDryBulb: { value: -273.15, unit: 'degC' } }), []],
    [
      'negative kelvin',
      readings({ outdoorDryBulb: { value: -1, unit: 'K' } }),
      ['readings.outdoorDryBulb below-absolute-zero'],
    ],
    [
      'above the critical pressure',
      readings({ liquidPressure: { value: 4904, unit: 'kPaa' } }),
      ['readings.liquidPressure above-critical-pressure'],
    ],
    ['just below it', readings({ liquidPressure: { value: 4902, unit: 'kPaa' } }), []],
    [
      'a perfect vacuum',
      readings({ suctionPressure: { value: -14.7, unit: 'psig' } }),
      ['readings.suctionPressure not-above-vacuum'],
    ],
    ['a deep vacuum', readings({ suctionPressure: { value: 29, unit: 'inHgVac' } }), []],
    [
      'deeper than perfect',
      readings({ suctionPressure: { value: 30, unit: 'inHgVac' } }),
      ['readings.suctionPressure not-above-vacuum'],
    ],
    [
      'zero absolute',
      readings({ suctionPressure: { value: 0, unit: 'psia' } }),
      ['readings.suctionPressure not-above-vacuum'],
    ],
    [
      'humidity above 100 %',
      readings({ returnRelativeHumidity: { value: 100.1, unit: '%' } }),
      ['readings.returnRelativeHumidity humidity-outside-range'],
    ],
    [
      'humidity below 0 %',
      readings({ supplyRelativeHumidity: { value: -0.1, unit: '%' } }),
      ['readings.supplyRelativeHumidity humidity-outside-range'],
    ],
    [
      'humidity of 0 and 100 %',
      readings({ returnRelativeHumidity: { value: 100, unit: '%' }, supplyRelativeHumidity: { value: 0, unit: '%' } }),
      [],
    ],
    [
      'elevation too low',
      setup({ elevation: { value: -1500.1, unit: 'ft' } }),
      ['setup.elevation elevation-outside-range'],
    ],
    [
      'elevation too high',
      setup({ elevation: { value: 18_000.1, unit: 'ft' } }),
      ['setup.elevation elevation-outside-range'],
    ],
    ['the lowest elevation', setup({ elevation: { value: -1500, unit: 'ft' } }), []],
    ['the highest elevation', setup({ elevation: { value: 18_000, unit: 'ft' } }), []],
    [
      'a gauge unit on the station pressure',
      setup({ stationPressure: { value: 0, unit: 'psig' } }),
      ['setup.stationPressure gauge-unit-on-absolute'],
    ],
    [
      'a station pressure outside the range',
      setup({ stationPressure: { value: 120, unit: 'kPaa' } }),
      ['setup.stationPressure barometer-outside-range'],
    ],
    [
      'the same below',
      setup({ stationPressure: { value: 49, unit: 'kPaa' } }),
      ['setup.stationPressure barometer-outside-range'],
    ],
    [
      'a sea-level barometer at 5000 ft',
      setup({ elevation: { value: 5000, unit: 'ft' }, stationPressure: { value: 101.3, unit: 'kPaa' } }),
      ['setup.stationPressure barometer-contradicts-elevation'],
    ],
    [
      'a station barometer at 5000 ft',
      setup({ elevation: { value: 5000, unit: 'ft' }, stationPressure: { value: 83, unit: 'kPaa' } }),
      [],
    ],
    [
      'a negative target superheat',
      setup({ targetSuperheat: { value: -1, unit: 'deltaF' } }),
      ['setup.targetSuperheat must-not-be-negative'],
    ],
    [
      'a negative target subcooling',
      setup({ targetSubcooling: { value: -1, unit: 'deltaF' } }),
      ['setup.targetSubcooling must-not-be-negative'],
    ],
    ['no capacity', setup({ nominalCapacity: { value: 0, unit: 'ton' } }), ['setup.nominalCapacity must-be-positive']],
    [
      'no design airflow',
      setup({ designAirflow: { value: 0, unit: 'cfm' } }),
      ['setup.designAirflow must-be-positive'],
    ],
    [
      'a negative charge',
      setup({ factoryCharge: { value: -2, unit: 'lb' } }),
      ['setup.factoryCharge must-be-positive'],
    ],
    [
      'a limit below vacuum',
      setup({ maxHighPressure: { value: -20, unit: 'psig' } }),
      ['setup.maxHighPressure not-above-vacuum'],
    ],
    ['a limit above the critical pressure', setup({ maxHighPressure: { value: 900, unit: 'psig' } }), []],
    [
      'a range upside down',
      setup({ superheatRange: { low: 10, high: 8, unit: 'deltaF' } }),
      ['setup.superheatRange low-above-high'],
    ],
    ['a range of one value', setup({ superheatRange: { low: 8, high: 8, unit: 'deltaF' } }), []],
    [
      'a negative line set',
      setup({ lineSet: { length: { value: -1, unit: 'ft' }, included: { value: -1, unit: 'ft' } } }),
      ['setup.lineSet.length must-not-be-negative', 'setup.lineSet.included must-not-be-negative'],
    ],
    ['a lift downwards', setup({ lineSet: { lift: { value: -10, unit: 'ft' } } }), []],
    [
      'a negative airflow',
      readings({ airflow: { value: -1, unit: 'cfm' } }),
      ['readings.airflow must-not-be-negative'],
    ],
    [
      'a negative current',
      readings({ compressorCurrent: { value: -1, unit: 'A' } }),
      ['readings.compressorCurrent must-not-be-negative'],
    ],
    ['a negative static pressure is suction', readings({ returnStaticPressure: { value: -0.2, unit: 'inH2O' } }), []],
    [
      'a negative ±',
      readings({ returnDryBulb: { ...degF(78), plusMinus: { value: -1, unit: 'deltaF' } } }),
      ['readings.returnDryBulb.plusMinus must-not-be-negative'],
    ],
    [
      'a negative age and step',
      readings({ returnDryBulb: { ...degF(78), ageSeconds: -1, resolution: -0.1 } }),
      [
        'readings.returnDryBulb.ageSeconds must-not-be-negative',
        'readings.returnDryBulb.resolution must-not-be-negative',
      ],
    ],
    [
      'a pressure unit on a temperature',
      readings({ returnDryBulb: { value: 78, unit: 'psig' } }),
      ['readings.returnDryBulb wrong-unit'],
    ],
    [
      'a temperature unit on a pressure',
      readings({ suctionPressure: { value: 78, unit: 'degF' } }),
      ['readings.suctionPressure wrong-unit'],
    ],
    [
      'a ± of another quantity',
      readings({ suctionPressure: { value: 118, unit: 'psig', plusMinus: { value: 1, unit: 'deltaF' } } }),
      ['readings.suctionPressure.plusMinus wrong-unit'],
    ],
  ])('%s', (_, request, faults) => {
    expect(faultsOf(request)).toEqual(faults);
  });

  const VISITS: readonly (readonly [keyof VisitInput, VisitInput])[] = [
    ['runningMinutes', { runningMinutes: -1 }],
    ['instrumentsCheckedDaysAgo', { instrumentsCheckedDaysAgo: -1 }],
    ['addedThisVisit', { addedThisVisit: { value: -1, unit: 'oz' } }],
    ['addedBefore', { addedBefore: { value: -1, unit: 'oz' } }],
    ['additionsOnEarlierVisits', { additionsOnEarlierVisits: -1 }],
    ['hoursOff', { hoursOff: -1 }],
  ];
  it.each(VISITS)('a negative %s', (field, visit) => {
    expect(faultsOf({ visit })).toEqual([`visit.${field} must-not-be-negative`]);
  });

  it('of a lowest return air and of earlier readings is found at its own path', () => {
    const visit = {
      lowestReturnDryBulb: { value: -500, unit: 'degF' },
      earlier: {
        minutesAgo: -5,
        readings: { returnDryBulb: degF(70), returnWetBulb: degF(71), liquidPressure: { value: 9000, unit: 'psig' } },
      },
    } as const;
    expect(faultsOf({ ...setup({}), visit })).toEqual([
      'visit.lowestReturnDryBulb below-absolute-zero',
      'visit.earlier.minutesAgo must-not-be-negative',
      'visit.earlier.readings.liquidPressure above-critical-pressure',
      'visit.earlier.readings.returnWetBulb wet-bulb-above-dry-bulb',
    ]);
  });
});

describe('figures', () => {
  it('tell what was given and what would be right, in SI', () => {
    expect(crossCheck(readings({ returnDryBulb: degF(78), returnWetBulb: degF(81) }))[0]!.figures).toEqual({
      wetBulb: { kind: 'temperatureK', value: expect.closeTo(300.372, 3) as number },
      dryBulb: { kind: 'temperatureK', value: expect.closeTo(298.706, 3) as number },
    });
    const elevation = { value: 5000, unit: 'ft' } as const;
    const stationPressure = { value: 101_300 / 1000, unit: 'kPaa' } as const;
    // 5000 ft: 12.228 psia by the standard atmosphere
    expect(crossCheck(setup({ elevation, stationPressure }))[0]!.figures).toEqual({
      stated: { kind: 'pressurePa', value: expect.closeTo(101_300, 6) as number },
      expected: { kind: 'pressurePa', value: expect.closeTo(12.228 * 6894.757, -1) as number },
    });
  });
});

describe('totality', () => {
  it('tells every fault at once', () => {
    const request: PartialRequest = {
      procedure: 'x',
      setup: {
        refrigerant: 'x',
        meteringDevice: 'txv',
        elevation: { value: 1e6, unit: 'ft' },
        nominalCapacity: { value: 0, unit: 'ton' },
      },
      visit: { runningMinutes: -1 },
      readings: {
        returnDryBulb: { value: Number.NaN, unit: 'degF' },
        returnWetBulb: degF(80),
        liquidPressure: { value: -1, unit: 'psia' },
      },
    };
    expect(faultsOf(request)).toEqual([
      'procedure unknown-procedure',
      'setup.refrigerant unknown-refrigerant',
      'setup.elevation elevation-outside-range',
      'setup.nominalCapacity must-be-positive',
      'visit.runningMinutes must-not-be-negative',
      'readings.returnDryBulb not-a-finite-number',
      'readings.liquidPressure not-above-vacuum',
    ]);
  });

  it('waits with a gauge pressure while the atmosphere is unknown', () => {
    const elevation = { value: 1e6, unit: 'ft' } as const;
    const request = { ...setup({ elevation }), readings: { suctionPressure: { value: -100, unit: 'psig' } } } as const;
    expect(faultsOf(request)).toEqual(['setup.elevation elevation-outside-range']);
  });

  it.each([Number.NaN, Infinity, -Infinity, 1e300, -1e300])('refuses %d everywhere and never throws', (value) => {
    for (const id of READING_IDS) {
      const { unit } = { ...valveRequest().readings[id], ...{} } as { unit?: ReadingInput['unit'] };
      const reading = { value, unit: unit ?? UNIT_OF[id] ?? 'degF' } as ReadingInput;
      expect(faultsOf(readings({ [id]: reading })), id).toEqual([`readings.${id} not-a-finite-number`]);
    }
    for (const field of ['plusMinus', 'resolution', 'ageSeconds'] as const) {
      const extra = field === 'plusMinus' ? { plusMinus: { value, unit: 'deltaF' } as const } : { [field]: value };
      expect(faultsOf(readings({ returnDryBulb: { ...degF(78), ...extra } }))).toEqual([
        `readings.returnDryBulb.${field} not-a-finite-number`,
      ]);
    }
    const amounts = setup({
      elevation: { value, unit: 'm' },
      stationPressure: { value, unit: 'kPaa' },
      targetSuperheat: { value, unit: 'deltaC' },
      nominalCapacity: { value, unit: 'kW' },
      superheatRange: { low: value, high: 5, unit: 'deltaC' },
      lineSet: { lift: { value, unit: 'm' } },
      maxHighPressure: { value, unit: 'bara' },
    });
    expect(new Set(crossCheck(amounts).map(({ code }) => code))).toEqual(new Set(['not-a-finite-number']));
    expect(crossCheck(amounts)).toHaveLength(7);
  });

  it('what has no fault can be read', () => {
    expect(readRequest(orificeRequest()).ok).toBe(true);
    expect(readRequest({ ...orificeRequest(), procedure: 'my-rules' })).toEqual({
      ok: false,
      faults: [{ path: 'procedure', code: 'unknown-procedure', figures: {} }],
    });
  });
});

const UNIT_OF: Readonly<Partial<Record<(typeof READING_IDS)[number], ReadingInput['unit']>>> = {
  returnRelativeHumidity: '%',
  supplyRelativeHumidity: '%',
  dischargePressure: 'psig',
  airflow: 'cfm',
  returnStaticPressure: 'Pa',
  supplyStaticPressure: 'Pa',
  compressorCurrent: 'A',
  lineVoltage: 'V',
  standingPressure: 'psig',
};
