import { describe, expect, it } from 'vitest';
import { bubblePressurePa, dewPressurePa } from '../refrigerants/saturation';
import type { RefrigerantId } from '../refrigerants/catalogue';
import { lengthFromM, PA_PER_PSI, temperatureFromK, temperatureToK } from '../units';
import type { CautionCode, Figure } from './codes';
import { deriveQuantities } from './derived-quantities';
import type { EvaluationRequest, ReadingInput } from './request';
import type { Changes, ReadingChanges } from './testing/healthy-systems';
import {
  cautionCodes,
  evaluate,
  inputOf,
  orificeRequest,
  valveRequest,
  withPlusMinus,
} from './testing/healthy-systems';

const has = (request: EvaluationRequest, code: CautionCode): boolean => cautionCodes(evaluate(request)).includes(code);

function figuresOf(request: EvaluationRequest, code: CautionCode): Readonly<Record<string, Figure>> {
  const caution = evaluate(request).overall.cautions.find((found) => found.code === code);
  if (caution === undefined) throw new Error(`no caution ${code}`);
  return caution.figures;
}

const psia = (pa: number): ReadingInput => ({ value: pa / PA_PER_PSI, unit: 'psia' });
const atF = (refrigerant: RefrigerantId, degF: number) => ({ refrigerant, temperatureK: temperatureToK(degF, 'degF') });

it('a healthy system, fully recorded, has none', () => {
  expect(cautionCodes(evaluate(orificeRequest()))).toEqual([]);
  expect(cautionCodes(evaluate(valveRequest()))).toEqual([]);
});

describe('the saturation temperature written on the paper', () => {
  // R-407C at 60 psig: dew 33.6 °F, 10.5 °F above bubble
  const blend: Changes = {
    setup: { refrigerant: 'R-407C' },
    readings: { suctionPressure: 60, suctionLineTemperature: 46, liquidPressure: 250 },
  };
  const written = (
    id: 'writtenEvaporatingTemperature' | 'writtenCondensingTemperature',
    value: number,
  ): EvaluationRequest => valveRequest({ ...blend, readings: { ...blend.readings, [id]: value } });
  const input = inputOf(valveRequest(blend));
  const derived = deriveQuantities(input.setup, input.readings);
  const inF = (quantity: (typeof derived)['superheat']): number =>
    quantity.state === 'known' ? temperatureFromK(quantity.value, 'degF') : Number.NaN;
  const sides = [
    [
      'writtenEvaporatingTemperature',
      inF(derived.evaporatingDewTemperature),
      inF(derived.evaporatingBubbleTemperature),
    ],
    ['writtenCondensingTemperature', inF(derived.condensingBubbleTemperature), inF(derived.condensingDewTemperature)],
  ] as const;

  it.each(sides)(
    '%s: within 3 °F of the right point says nothing, further off another refrigerant',
    (id, right, other) => {
      expect(Math.abs(right - other)).toBeGreaterThan(8);
      const away = Math.sign(right - other);
      for (const [distance, wrong] of [
        [0, false],
        [1, false],
        [2.999, false],
        [3.001, true],
        [20, true],
      ] as const) {
        expect(has(written(id, right + away * distance), 'wrong-refrigerant'), String(distance)).toBe(wrong);
        expect(has(written(id, right + away * distance), 'wrong-column')).toBe(false);
      }
    },
  );

  it.each(sides)('%s: within 1 °F of the other point it is the wrong column', (id, _right, other) => {
    for (const [value, wrong] of [
      [other, true],
      [other + 0.999, true],
      [other - 0.999, true],
      [other + 1.001, false],
    ] as const) {
      expect(has(written(id, value), 'wrong-column'), String(value)).toBe(wrong);
      expect(has(written(id, value), 'wrong-refrigerant')).toBe(!wrong);
    }
  });

  it('of one substance has no other column', () => {
    expect(has(orificeRequest({ readings: { writtenEvaporatingTemperature: 38.5 } }), 'wrong-column')).toBe(false);
    // R-410A: bubble and dew lie 0.2 °F apart
    for (const value of [38.4, 38.9, 41.1]) {
      expect(has(valveRequest({ readings: { writtenEvaporatingTemperature: value } }), 'wrong-column')).toBe(false);
    }
  });

  it('comes with what was written and what was computed', () => {
    const figures = figuresOf(orificeRequest({ readings: { writtenEvaporatingTemperature: 50 } }), 'wrong-refrigerant');
    expect(temperatureFromK(figures['written']!.value as number, 'degF')).toBeCloseTo(50, 9);
    expect(temperatureFromK(figures['computed']!.value as number, 'degF')).toBeCloseTo(40, 0);
  });
});

describe('flash', () => {
  const { state, value = Number.NaN } = deriveQuantities(
    inputOf(valveRequest()).setup,
    inputOf(valveRequest()).readings,
  ).condensingBubbleTemperature as { state: string; value?: number };
  const bubbleF = temperatureFromK(value, 'degF');
  const request = (subcoolingF: number) => valveRequest({ readings: { liquidLineTemperature: bubbleF - subcoolingF } });

  it('comes where the subcooling is no more than its U', () => {
    expect(state).toBe('known');
    const { subcooling } = evaluate(request(5)).derived;
    const expandedF = 2 * 1.8 * subcooling!.u;
    expect(expandedF).toBeGreaterThan(1);
    expect(has(request(expandedF + 0.001), 'flash')).toBe(false);
    expect(has(request(expandedF - 0.001), 'flash')).toBe(true);
    expect(has(request(0), 'flash')).toBe(true);
  });
});

describe('dry-wick', () => {
  it.each([
    [66, null, false],
    [75.8, null, false],
    [75.95, null, true],
    [76, null, true],
    [75.8, 0.5, true],
    [75.5, 0.5, false],
    [75, 1, false],
    [75.1, 1, true],
  ])('at 76 °F dry bulb and a wet bulb of %d read to %s: %s', (wetBulb, resolution, dry) => {
    const reading = { value: wetBulb, unit: 'degF', ...(resolution === null ? {} : { resolution }) } as const;
    // at 76 °F a wet bulb of 74.9 °F is 95 % relative humidity
    const damp = wetBulb > 74.9;
    expect(has(orificeRequest({ readings: { returnWetBulb: reading } }), 'dry-wick')).toBe(dry || damp);
  });

  it('comes above 95 % relative humidity by the wet bulb, and not where humidity itself was read', () => {
    expect(has(orificeRequest({ readings: { returnWetBulb: 74.7 } }), 'dry-wick')).toBe(false);
    expect(has(orificeRequest({ readings: { returnWetBulb: 75.1 } }), 'dry-wick')).toBe(true);
    const humidity = { returnWetBulb: null, returnRelativeHumidity: 97 };
    expect(has(orificeRequest({ readings: humidity }), 'dry-wick')).toBe(false);
  });

  it('names the wick that is dry', () => {
    const readings = { supplyDryBulb: 58, supplyWetBulb: 58 };
    expect(figuresOf(orificeRequest({ readings }), 'dry-wick')).toEqual({
      readings: { kind: 'readings', value: ['supplyWetBulb'] },
    });
    expect(figuresOf(orificeRequest({ readings: { ...readings, returnWetBulb: 76 } }), 'dry-wick')).toEqual({
      readings: { kind: 'readings', value: ['returnWetBulb', 'supplyWetBulb'] },
    });
  });
});

describe('humidity-contradiction', () => {
  it('comes where wet bulb and relative humidity differ by more than their U; the wet bulb is used', () => {
    // 76 °F and 66 °F wet bulb are 59 % relative humidity
    expect(has(orificeRequest({ readings: { returnRelativeHumidity: 59 } }), 'humidity-contradiction')).toBe(false);
    expect(has(orificeRequest({ readings: { returnRelativeHumidity: 63 } }), 'humidity-contradiction')).toBe(false);
    const request = orificeRequest({ readings: { returnRelativeHumidity: 75 } });
    expect(has(request, 'humidity-contradiction')).toBe(true);
    expect(evaluate(request).derived.returnWetBulb!.value).toBeCloseTo(temperatureToK(66, 'degF'), 9);
  });
});

describe('liquid-colder-than-air', () => {
  it.each([
    [83, false],
    [82.999, true],
    [95, false],
  ])('at 85 °F outdoors and a liquid line at %d °F: %s', (liquid, cold) => {
    expect(has(valveRequest({ readings: { liquidLineTemperature: liquid } }), 'liquid-colder-than-air')).toBe(cold);
  });
});

describe('cool-weather and low-head', () => {
  const outdoor = (degF: number, changes: ReadingChanges = {}) =>
    valveRequest({ readings: { outdoorDryBulb: degF, ...changes } });

  it.each([
    [54.999, false],
    [55, true],
    [69.999, true],
    [70, false],
  ])('at %d °F outdoors: %s', (degF, cool) => {
    expect(has(outdoor(degF), 'cool-weather')).toBe(cool);
  });

  it('takes 55 °F typed in °C for 55 °F', () => {
    const outdoorDryBulb = { value: 12.777777777777777, unit: 'degC' } as const;
    expect(has(valveRequest({ readings: { outdoorDryBulb } }), 'cool-weather')).toBe(true);
  });

  it.each([
    ['R-410A', 118, 278, false],
    ['R-410A', 118, 277.9, true],
    ['R-22', 68, 168, false],
    ['R-22', 68, 167.9, true],
    ['R-32', 118, 200, false],
  ])(
    'a valve of %s with %d psig suction and %d psig liquid in cool weather: %s',
    (refrigerant, suction, liquid, low) => {
      const readings = { suctionPressure: suction, liquidPressure: liquid, outdoorDryBulb: 60 };
      expect(has(valveRequest({ setup: { refrigerant }, readings }), 'low-head')).toBe(low);
      expect(
        has(valveRequest({ setup: { refrigerant }, readings: { ...readings, outdoorDryBulb: 70 } }), 'low-head'),
      ).toBe(false);
      expect(has(orificeRequest({ setup: { refrigerant }, readings }), 'low-head')).toBe(false);
    },
  );
});

describe('setup', () => {
  it('elevation-assumed: neither elevation nor station pressure', () => {
    expect(has(valveRequest({ setup: { elevation: null } }), 'elevation-assumed')).toBe(true);
    const stationPressure = { value: 14.6, unit: 'psia' } as const;
    expect(has(valveRequest({ setup: { elevation: null, stationPressure } }), 'elevation-assumed')).toBe(false);
  });

  it.each(['mode', 'kind', 'stage', 'highSidePort'] as const)(
    'setup-assumed names %s when it was left out',
    (field) => {
      expect(figuresOf(valveRequest({ setup: { [field]: null } }), 'setup-assumed')).toEqual({
        fields: { kind: 'setup', value: [field] },
      });
    },
  );

  it('setup-assumed names an unknown stage', () => {
    expect(has(valveRequest({ setup: { stage: 'unknown' } }), 'setup-assumed')).toBe(true);
  });

  it('long-lines: above 20 ft of lift', () => {
    const lift = (feet: number) => valveRequest({ setup: { lineSet: { lift: { value: feet, unit: 'ft' } } } });
    expect(has(lift(20), 'long-lines')).toBe(false);
    expect(has(lift(20.01), 'long-lines')).toBe(true);
    expect(lengthFromM(figuresOf(lift(25), 'long-lines')['lift']!.value as number, 'ft')).toBeCloseTo(25, 9);
    expect(has(valveRequest({ setup: { lineSet: { length: { value: 80, unit: 'ft' } } } }), 'long-lines')).toBe(false);
  });
});

describe('visit', () => {
  const healthy = valveRequest().visit!;

  it.each([
    ['the running time', { visit: { runningMinutes: null } }],
    ['the pre-flight', { visit: { preflight: null } }],
    ['an empty pre-flight', { visit: { preflight: {} } }],
    ['the outdoor air', { readings: { outdoorDryBulb: null } }],
    ['lowest and present return air', { visit: { lowestReturnDryBulb: null }, readings: { returnDryBulb: null } }],
  ] as const)('conditions-not-recorded: without %s', (_, changes) => {
    expect(has(valveRequest(changes), 'conditions-not-recorded')).toBe(true);
  });

  it('takes the return reading for the lowest return air where that was not recorded', () => {
    expect(has(valveRequest({ visit: { lowestReturnDryBulb: null } }), 'conditions-not-recorded')).toBe(false);
  });

  it.each([
    ['ok', false],
    ['not-ok', true],
    ['not-checked', true],
  ] as const)('gauge-not-zeroed when gaugeZeroed is %s: %s', (gaugeZeroed, caution) => {
    const preflight = { ...healthy.preflight, gaugeZeroed };
    expect(has(valveRequest({ visit: { preflight } }), 'gauge-not-zeroed')).toBe(caution);
  });

  it('filter-or-coil-dirty when it is not ok', () => {
    const request = (filterAndCoil: 'ok' | 'not-ok' | 'not-checked') =>
      valveRequest({ visit: { preflight: { filterAndCoil } } });
    expect(has(request('ok'), 'filter-or-coil-dirty')).toBe(false);
    expect(has(request('not-checked'), 'filter-or-coil-dirty')).toBe(false);
    expect(has(request('not-ok'), 'filter-or-coil-dirty')).toBe(true);
  });

  it.each([
    [365, false],
    [366, true],
  ])('instruments-old after %d days: %s', (days, old) => {
    const request = valveRequest({ visit: { instrumentsCheckedDaysAgo: days } });
    expect(has(request, 'instruments-old')).toBe(old);
    expect(evaluate(request).criteria.find(({ criterion }) => criterion === 'instruments')).toMatchObject(
      old
        ? { byRule: 'fails', finding: 'not-judged', reason: { code: 'instruments-old' } }
        : { byRule: 'passes', finding: 'within', reason: null },
    );
  });
});

describe('refrigerant', () => {
  const cautionsOf = (refrigerant: RefrigerantId): readonly string[] =>
    cautionCodes(
      evaluate(
        valveRequest({
          setup: { refrigerant },
          readings: {
            suctionPressure: psia(dewPressurePa(atF(refrigerant, 40))),
            liquidPressure: psia(bubblePressurePa(atF(refrigerant, 105))),
          },
        }),
      ),
    );

  it.each([
    ['R-410A', []],
    ['R-32', ['flammable']],
    ['R-454B', ['flammable']],
    ['R-290', ['flammable']],
    ['R-717', ['flammable']],
    ['R-417A', ['model-grade']],
    ['R-438A', ['model-grade']],
    ['R-500', ['model-grade', 'model-doubtful']],
  ] as const)('%s: %j', (refrigerant, expected) => {
    expect(cautionsOf(refrigerant)).toEqual(expected);
  });
});

describe('near-limit', () => {
  const limits = (request: EvaluationRequest): readonly number[] =>
    evaluate(request).overall.cautions.flatMap(({ code, figures }) =>
      code === 'near-limit' ? [temperatureFromK(figures.limit.value as number, 'degF')] : [],
    );

  it('comes inside U of 55 °F outdoors and of 70 °F return air, on either side of them', () => {
    // ±1 °F as a limit: U = 2/√3 = 1.155 °F
    for (const [degF, near] of [
      [53.8, false],
      [53.9, true],
      [55, true],
      [56.1, true],
      [56.2, false],
    ] as const) {
      expect(limits(valveRequest({ readings: { outdoorDryBulb: degF } })).length > 0, String(degF)).toBe(near);
    }
    const lowest = (value: number) => valveRequest({ visit: { lowestReturnDryBulb: { value, unit: 'degF' } } });
    expect(limits(lowest(71.2))).toEqual([]);
    expect(limits(lowest(71.1))[0]).toBeCloseTo(70, 9);
  });

  it('comes inside U of the least measured airflow', () => {
    const airflow = (value: number) =>
      evaluate(valveRequest({ setup: { nominalCapacity: { value: 3, unit: 'ton' } }, readings: { airflow: value } }));
    // 1050 cfm, ±7 % as a limit: U = 8.1 %
    expect(cautionCodes(airflow(1150))).not.toContain('near-limit');
    expect(cautionCodes(airflow(1120))).toContain('near-limit');
    expect(cautionCodes(airflow(1000))).toContain('near-limit');
    expect(cautionCodes(airflow(960))).not.toContain('near-limit');
  });

  it('comes where the split is too close to its upper limit, which gates, and not at the lower', () => {
    // target 16.9 and u 1.17 °F: the limit of the gate is 19.9, clear of it is 0.84 u
    const split = (deltaF: number) =>
      cautionCodes(evaluate(valveRequest({ readings: { supplyDryBulb: 76 - deltaF } })));
    expect(split(18.8)).not.toContain('near-limit');
    expect(split(19)).toContain('near-limit');
    expect(split(20.8)).toContain('near-limit');
    expect(split(21)).not.toContain('near-limit');
    expect(split(13.9)).not.toContain('near-limit');
  });
});

describe('airflow-not-proven and faults-may-hide', () => {
  it('airflow-not-proven: neither split nor airflow, in cooling only', () => {
    expect(has(valveRequest({ readings: { supplyDryBulb: null } }), 'airflow-not-proven')).toBe(true);
    expect(has(valveRequest({ readings: { returnWetBulb: null } }), 'airflow-not-proven')).toBe(true);
    expect(
      has(valveRequest({ setup: { mode: 'heating' }, readings: { supplyDryBulb: null } }), 'airflow-not-proven'),
    ).toBe(false);
    const measured = {
      setup: { nominalCapacity: { value: 3, unit: 'ton' } },
      readings: { supplyDryBulb: null, airflow: 1200 },
    } as const;
    expect(has(valveRequest(measured), 'airflow-not-proven')).toBe(false);
  });

  it('faults-may-hide: a fixed orifice found within without subcooling', () => {
    expect(has(orificeRequest({ readings: { liquidPressure: null } }), 'faults-may-hide')).toBe(true);
    expect(has(orificeRequest({ readings: { liquidLineTemperature: null } }), 'faults-may-hide')).toBe(true);
    expect(has(orificeRequest({ setup: { highSidePort: 'discharge' } }), 'faults-may-hide')).toBe(true);
    const discharge = {
      setup: { highSidePort: 'discharge' },
      readings: { liquidPressure: null, dischargePressure: 211 },
    } as const;
    expect(has(orificeRequest(discharge), 'faults-may-hide')).toBe(false);
    const tooClose = { readings: { liquidPressure: null, suctionLineTemperature: 60 } };
    expect(evaluate(orificeRequest(tooClose)).overall.finding).toBe('too-close-to-call');
    expect(has(orificeRequest(tooClose), 'faults-may-hide')).toBe(false);
  });
});

describe('what is unusual', () => {
  it.each([
    ['supplyDryBulb', 40, 75],
    ['returnDryBulb', 65, 95],
    ['returnWetBulb', 45, 80],
  ] as const)('%s outside %d to %d °F', (id, low, high) => {
    for (const [value, unusual] of [
      [low - 0.01, true],
      [low, false],
      [high, false],
      [high + 0.01, true],
    ] as const) {
      const others = { returnDryBulb: 90, returnWetBulb: 60, ...(id === 'returnWetBulb' && { returnDryBulb: 94 }) };
      const beside = id === 'returnDryBulb' && value < 70 ? { returnWetBulb: 55 } : {};
      const request = valveRequest({ readings: { ...others, ...beside, [id]: value } });
      const named = evaluate(request).overall.cautions.flatMap(({ code, figures }) =>
        code === 'unusual-reading' ? (figures.readings.value as readonly string[]) : [],
      );
      expect(named.includes(id), String(value)).toBe(unusual);
    }
  });

  it.each([
    [24.99, true],
    [25.01, false],
    [59.99, false],
    [60.01, true],
  ])('evaporating at %d °F: %s', (degF, unusual) => {
    const readings = { suctionPressure: psia(dewPressurePa(atF('R-410A', degF))), suctionLineTemperature: degF + 12 };
    expect(has(valveRequest({ readings }), 'unusual-evaporating')).toBe(unusual);
  });

  it.each([
    [7.99, true],
    [8.01, false],
    [44.99, false],
    [45.01, true],
  ])('condensing %d °F over the outdoor air: %s', (deltaF, unusual) => {
    const liquidPressure = psia(bubblePressurePa(atF('R-410A', 85 + deltaF)));
    expect(has(valveRequest({ readings: { liquidPressure } }), 'unusual-condensing')).toBe(unusual);
  });

  it.each([
    [20.01, 'unusual-subcooling', true],
    [19.99, 'unusual-subcooling', false],
    [-1.99, 'unusual-liquid-line', false],
    [-2.01, 'unusual-liquid-line', true],
  ] as const)('subcooling of %d °F: %s %s', (deltaF, code, unusual) => {
    const readings = {
      liquidPressure: psia(bubblePressurePa(atF('R-410A', 105))),
      liquidLineTemperature: 105 - deltaF,
    };
    expect(has(valveRequest({ readings }), code)).toBe(unusual);
  });

  it('never changes a finding', () => {
    const request = withPlusMinus(
      valveRequest({ readings: { supplyDryBulb: null, returnDryBulb: null, returnWetBulb: 44 } }),
      {
        temperatureF: 0.3,
        pressurePsi: 0.5,
      },
    );
    expect(cautionCodes(evaluate(request))).toContain('unusual-reading');
    expect(evaluate(request).overall.finding).toBe('within');
  });
});

it('none that belongs to cooling is shown in heating', () => {
  const result = evaluate(
    orificeRequest({
      setup: { mode: 'heating', refrigerant: 'R-32', elevation: null },
      visit: { runningMinutes: null },
      readings: {
        outdoorDryBulb: 30,
        returnDryBulb: 60,
        returnWetBulb: 60,
        supplyDryBulb: 100,
        suctionPressure: 400,
        suctionLineTemperature: 150,
        liquidPressure: 380,
        writtenEvaporatingTemperature: 10,
      },
    }),
  );
  expect(cautionCodes(result)).toEqual(['elevation-assumed', 'conditions-not-recorded', 'flammable']);
});
