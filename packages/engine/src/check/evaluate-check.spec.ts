import { describe, expect, it } from 'vitest';
import { differenceFromK, temperatureFromK } from '../units';
import { crossCheck } from './cross-check';
import { evaluateCheck } from './evaluate-check';
import { engineVersion } from './engine-version';
import type { EvaluationRequest, ReadingInput, SetupInput } from './request';
import type { CheckResult } from './result';
import { criterionOf, evaluate, inputOf, orificeRequest, stopCodes, valveRequest } from './testing/healthy-systems';

const deltaF = (known: { readonly value: number } | null | undefined): number =>
  differenceFromK(known?.value ?? Number.NaN, 'deltaF');
const degF = (known: { readonly value: number } | null | undefined): number =>
  temperatureFromK(known?.value ?? Number.NaN, 'degF');
/** A standard uncertainty of a temperature or difference in °F. */
const uF = (known: { readonly u: number } | null | undefined): number => 1.8 * (known?.u ?? Number.NaN);

describe('R-22, fixed orifice, healthy', () => {
  // a heat-pump installation guide prints 70.0 psig at 41 °F and a chiller manual 220.6 psig at 108 °F; chart A prints 15 at 85/66
  const request = orificeRequest({
    readings: { suctionPressure: 70, suctionLineTemperature: 56, liquidPressure: 220.6, liquidLineTemperature: 98 },
  });
  const result = evaluate(request);
  const superheat = criterionOf(result, 'superheat');

  it('has the superheat and subcooling of the printed tables: 56 − 41 and 108 − 98', () => {
    expect(degF(result.derived.evaporatingDewTemperature)).toBeCloseTo(41, 1);
    expect(deltaF(result.derived.superheat)).toBeCloseTo(15, 1);
    expect(Math.abs(deltaF(result.derived.subcooling) - 10)).toBeLessThan(0.2);
    expect(Math.abs(deltaF(result.derived.condensingOverAmbient) - 23)).toBeLessThan(0.2);
    expect(deltaF(result.derived.temperatureSplit)).toBeCloseTo(16.9, 9);
  });

  it('has the uncertainty that adds up by hand', () => {
    // superheat: ±1 °F line; ±2 psi at 4 °F per 5.9 psi (39 and 43 °F: 67.1 and 73.0 psig); ±1.5 kPa atmosphere; ±0.25 °F model; all over √3
    const perPsi = 4 / 5.9;
    const parts = [1, 2 * perPsi, (1.5 / 6.895) * perPsi, 0.25].map((limit) => limit / Math.sqrt(3));
    const byHand = Math.hypot(...parts);
    expect(byHand).toBeCloseTo(0.987, 3);
    expect(uF(result.derived.superheat) / byHand).toBeCloseTo(1, 2);
    // deviation: also the chart, 2 °F per °F of wet bulb and −½ per °F outdoors about 85/66, and its rounding of ±0.5 °F
    const deviation = Math.hypot(byHand, ...[2, 0.5, 0.5].map((limit) => limit / Math.sqrt(3)));
    expect(uF(superheat.deviation) / deviation).toBeCloseTo(1, 2);
    expect(superheat.probabilityWithin).toBeCloseTo(0.9985, 3);
  });

  it('is within, and to be recorded', () => {
    expect(superheat).toMatchObject({
      byRule: 'passes',
      finding: 'within',
      reason: null,
      targetSource: 'makers-chart-a',
    });
    expect(result.overall).toEqual({
      finding: 'within',
      nextStep: { code: 'record', figures: {}, notYet: [] },
      stops: [],
      cautions: [],
    });
  });

  it('shows its math: inputs before what uses them', () => {
    expect(result.derivation.map(({ id }) => id)).toEqual([
      'suctionPressureAbsolute',
      'evaporatingDewTemperature',
      'superheat',
      'targetSuperheat',
      'superheatDeviation',
      'liquidPressureAbsolute',
      'condensingBubbleTemperature',
      'subcooling',
      'temperatureSplit',
      'targetTemperatureSplit',
      'temperature-splitDeviation',
      'returnHumidityRatio',
      'returnRelativeHumidity',
    ]);
  });
});

describe('R-410A, valve', () => {
  // a maker’s table prints 118.0 psig at 40 °F and 317.2 psig at 100 °F; the equation of state lies 0.35 and 0.29 °F below it
  const request = valveRequest({
    readings: { suctionPressure: 118, liquidPressure: 317.2, liquidLineTemperature: 90, outdoorDryBulb: 80 },
  });

  it('has the superheat and subcooling of the printed table within its difference from the model', () => {
    const { derived, overall } = evaluate(request);
    expect(Math.abs(degF(derived.evaporatingDewTemperature) - 40)).toBeLessThan(0.4);
    expect(Math.abs(deltaF(derived.superheat) - 12)).toBeLessThan(0.4);
    expect(Math.abs(deltaF(derived.subcooling) - 10)).toBeLessThan(0.4);
    expect(overall.finding).toBe('within');
  });

  it('at 5000 ft reads 1.1 °F more superheat off the same gauge', () => {
    // figure of the trade notes for R-410A at 40 °F: a table for sea level shifts saturation by 1.1 °F
    const high = evaluate({ ...request, setup: { ...request.setup, elevation: { value: 5000, unit: 'ft' } } });
    expect(deltaF(high.derived.superheat) - deltaF(evaluate(request).derived.superheat)).toBeCloseTo(1.1, 1);
  });
});

describe('R-407C, valve', () => {
  // a published equation for the blend as one fluid puts the dew point of 63.2 psig at 40 °F, a maker’s table the bubble point of 249 psig at
  // 108 °F (its table lies up to 1.14 °F from the equations); the other column would be 10 and 8 °F off
  it('counts superheat from the dew point and subcooling from the bubble point', () => {
    const { derived } = evaluate(
      valveRequest({
        setup: { refrigerant: 'R-407C' },
        readings: { suctionPressure: 63.2, suctionLineTemperature: 52, liquidPressure: 249, liquidLineTemperature: 98 },
      }),
    );
    expect(Math.abs(deltaF(derived.superheat) - 12)).toBeLessThan(0.15);
    expect(Math.abs(deltaF(derived.subcooling) - 10)).toBeLessThan(1.2);
  });
});

describe('the example of the interface', () => {
  const request: EvaluationRequest = {
    procedure: 'general-rules',
    setup: {
      refrigerant: 'R-410A',
      meteringDevice: 'fixed-orifice',
      mode: 'cooling',
      kind: 'split',
      stage: 'full',
      highSidePort: 'liquid',
      elevation: { value: 650, unit: 'ft' },
      targetSubcooling: { value: 10, unit: 'deltaF' },
      nominalCapacity: { value: 3, unit: 'ton' },
    },
    visit: {
      runningMinutes: 22,
      lowestReturnDryBulb: { value: 74, unit: 'degF' },
      instrumentsCheckedDaysAgo: 12,
      preflight: { filterAndCoil: 'ok', panelsOn: 'ok', gaugeZeroed: 'not-checked' },
    },
    readings: {
      returnDryBulb: { value: 78, unit: 'degF' },
      returnWetBulb: {
        value: 65,
        unit: 'degF',
        plusMinus: { value: 1, unit: 'deltaF', kind: 'limit' },
        ageSeconds: 40,
      },
      supplyDryBulb: { value: 58.4, unit: 'degF' },
      outdoorDryBulb: { value: 95, unit: 'degF' },
      suctionPressure: { value: 118, unit: 'psig' },
      suctionLineTemperature: { value: 52, unit: 'degF' },
      liquidPressure: { value: 395, unit: 'psig' },
      liquidLineTemperature: { value: 106, unit: 'degF' },
    },
  };

  it('is too close to call: target 8 between 6 and 10, floored to −3, actual about 12', () => {
    const result = evaluate(request);
    const superheat = criterionOf(result, 'superheat');
    expect(deltaF(superheat.target)).toBeCloseTo(8, 9);
    expect(deltaF({ value: superheat.tolerance!.low! })).toBeCloseTo(-3, 9);
    expect(deltaF({ value: superheat.tolerance!.high! })).toBeCloseTo(5, 9);
    expect(superheat).toMatchObject({ byRule: 'passes', finding: 'too-close-to-call', tolerance: { floored: true } });
    expect(superheat.probabilityWithin).toBeCloseTo(0.65, 2);
    expect(result.overall.finding).toBe('too-close-to-call');
    expect(result.overall.cautions.map(({ code }) => code)).toEqual(['gauge-not-zeroed']);
  });
});

describe('unit systems', () => {
  const toSi = (reading: ReadingInput): ReadingInput => {
    const { value, plusMinus, resolution, ...rest } = reading;
    const temperature = reading.unit === 'degF';
    const scale = temperature ? 5 / 9 : 6.894757293168;
    const bands = {
      ...(plusMinus && {
        plusMinus: { ...plusMinus, value: plusMinus.value * scale, unit: temperature ? 'deltaC' : 'kPa' } as const,
      }),
      ...(resolution !== undefined && { resolution: resolution * scale }),
    };
    return temperature
      ? { ...rest, ...bands, value: ((value - 32) * 5) / 9, unit: 'degC' }
      : { ...rest, ...bands, value: value * scale, unit: 'kPag' };
  };
  const inSi = ({ setup, visit, readings }: EvaluationRequest): EvaluationRequest => {
    const { targetSubcooling, elevation, ...rest } = setup;
    const si: SetupInput = {
      ...rest,
      ...(elevation && { elevation: { value: elevation.value * 0.3048, unit: 'm' } }),
      ...(targetSubcooling && { targetSubcooling: { value: (targetSubcooling.value * 5) / 9, unit: 'deltaC' } }),
    };
    const lowest = visit!.lowestReturnDryBulb!;
    return {
      setup: si,
      visit: { ...visit, lowestReturnDryBulb: { value: ((lowest.value - 32) * 5) / 9, unit: 'degC' } },
      readings: Object.fromEntries(Object.entries(readings).map(([id, reading]) => [id, toSi(reading)])),
    };
  };
  const numbers = (result: CheckResult): readonly (readonly [string, number])[] => [
    ...Object.entries(result.derived).flatMap(([id, { value, u }]): [string, number][] => [
      [id, value],
      [`${id} u`, u],
    ]),
    ...result.criteria.flatMap(({ criterion, probabilityWithin, deviation, target }): [string, number][] => [
      [`${criterion} P`, probabilityWithin ?? -1],
      [`${criterion} deviation`, deviation?.value ?? -1],
      [`${criterion} target`, target?.value ?? -1],
    ]),
  ];

  it.each<[string, EvaluationRequest]>([
    ['a healthy orifice', orificeRequest()],
    ['a healthy valve at an elevation', valveRequest({ setup: { elevation: { value: 3000, unit: 'ft' } } })],
    ['limits met exactly', orificeRequest({ readings: { outdoorDryBulb: 55, supplyDryBulb: null } })],
    [
      'stated ± and steps',
      orificeRequest({
        readings: {
          returnWetBulb: {
            value: 66.4,
            unit: 'degF',
            resolution: 0.1,
            plusMinus: { value: 0.7, unit: 'deltaF', kind: 'k2' },
          },
          suctionPressure: { value: 71.5, unit: 'psig', resolution: 0.5, plusMinus: { value: 1.5, unit: 'psi' } },
        },
      }),
    ],
    ['a low charge', valveRequest({ readings: { liquidLineTemperature: 101 } })],
  ])('%s in °F and psi is what it is in °C and kPa, to 1e-9', (_, request) => {
    const [imperial, metric] = [evaluate(request), evaluate(inSi(request))];
    const pairs = numbers(imperial).map(([name, value], k) => [name, value, numbers(metric)[k]![1]] as const);
    expect(pairs.length).toBeGreaterThan(20);
    for (const [name, a, b] of pairs)
      expect(Math.abs(a - b), name).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(a)));
    const findings = ({ criteria, overall }: CheckResult) => [
      criteria.map(({ finding, byRule, reason }) => [finding, byRule, reason?.code]),
      overall.finding,
      overall.nextStep.code,
      overall.cautions.map(({ code }) => code),
    ];
    expect(findings(metric)).toEqual(findings(imperial));
  });
});

describe('the overall finding', () => {
  it('is the first that applies: stop, not verifiable, not judged, outside, too close to call, within', () => {
    const high = { suctionLineTemperature: 75 };
    expect(evaluate(orificeRequest()).overall.finding).toBe('within');
    expect(evaluate(orificeRequest({ readings: { suctionLineTemperature: 60 } })).overall.finding).toBe(
      'too-close-to-call',
    );
    expect(evaluate(orificeRequest({ readings: high })).overall.finding).toBe('above');
    expect(evaluate(orificeRequest({ readings: { ...high, returnWetBulb: null } })).overall.finding).toBe('not-judged');
    expect(evaluate(orificeRequest({ readings: { ...high, returnDryBulb: 69 } })).overall.finding).toBe(
      'not-verifiable',
    );
    expect(
      evaluate(orificeRequest({ readings: { ...high, returnDryBulb: 69, dischargeLineTemperature: 230 } })).overall
        .finding,
    ).toBe('stop');
  });

  it('of a valve waits for both of its criteria: the worse one counts', () => {
    const overall = (liquid: number | null, suctionLine: number | null) =>
      evaluate(valveRequest({ readings: { liquidLineTemperature: liquid, suctionLineTemperature: suctionLine } }))
        .overall.finding;
    expect(overall(95, 52)).toBe('within');
    expect(overall(101, 52)).toBe('below');
    expect(overall(101, 70)).toBe('below');
    expect(overall(95, 70)).toBe('above');
    expect(overall(95, null)).toBe('not-judged');
    expect(overall(null, 70)).toBe('not-judged');
    expect(overall(98, 52)).toBe('too-close-to-call');
  });

  it('with nothing read is not judged, and asks for what is needed', () => {
    const { overall } = evaluate({ setup: orificeRequest().setup, readings: {} });
    expect(overall.finding).toBe('not-judged');
    expect(overall.nextStep).toMatchObject({
      code: 'take-readings',
      figures: {
        readings: { value: ['suctionLineTemperature', 'suctionPressure', 'returnWetBulb', 'outdoorDryBulb'] },
      },
    });
  });
});

describe('a result', () => {
  it('holds only what could be computed', () => {
    const { derived } = evaluate({
      setup: valveRequest().setup,
      readings: { outdoorDryBulb: { value: 90, unit: 'degF' } },
    });
    expect(derived).toEqual({});
  });

  it('is the same for the same input, and does not change the input', () => {
    const input = inputOf(orificeRequest());
    const before = JSON.stringify(input);
    const text = (result: CheckResult): string =>
      JSON.stringify(result, (_, value: unknown) => (value instanceof Map ? [...value] : value));
    expect(text(evaluateCheck(input))).toBe(text(evaluateCheck(input)));
    expect(JSON.stringify(input)).toBe(before);
  });

  it('names the rules and tables it came from', () => {
    const { engineVersion: version, procedure } = evaluate(orificeRequest());
    expect(version).toBe(engineVersion());
    expect(version).toMatch(/^\d+\.\d+\.\d+\+[0-9a-f]{8}$/);
    expect(procedure).toEqual({ id: 'general-rules', version: 1 });
  });

  it('of a pressure between the curve’s end and the critical point is not judged', () => {
    // R-410A: the curve ends at 0.99 of the critical temperature, 4.9 MPa is the critical pressure
    const request = valveRequest({ readings: { liquidPressure: { value: 4880, unit: 'kPaa' } } });
    expect(crossCheck(request)).toEqual([]);
    const result = evaluate(request);
    expect(criterionOf(result, 'subcooling')).toMatchObject({
      finding: 'not-judged',
      reason: { code: 'outside-curve' },
    });
    expect(stopCodes(result)).toEqual(['high-pressure']);
  });
});
