import { describe, expect, it } from 'vitest';
import type { Known, QuantityKind } from '../derivation/quantity';
import { leaf } from '../derivation/quantity';
import { dewPressurePa } from '../refrigerants/saturation';
import { differenceToK, PA_PER_PSI, temperatureToK } from '../units';
import type { DerivedQuantities } from './derived-quantities';
import { deriveQuantities } from './derived-quantities';
import { findStops, freezeRisk, mustShutDown } from './stops';
import type { EvaluationRequest, ReadingInput } from './request';
import type { Changes } from './testing/healthy-systems';
import { cautionCodes, evaluate, inputOf, orificeRequest, stopCodes, valveRequest } from './testing/healthy-systems';

/** A derived quantity of exactly this value, so that a limit can be met exactly; u in the unit of the value. */
const exactly = (value: number, kind: QuantityKind, u = 0): Known =>
  leaf({
    id: 'exactly',
    kind,
    value,
    origin: 'reading',
    parts: u === 0 ? [] : [{ key: 'exactly', u, shape: 'normal' }],
  });
const differenceF = (value: number, u = 0): Known =>
  exactly(differenceToK(value, 'deltaF'), 'differenceK', differenceToK(u, 'deltaF'));
const temperatureF = (value: number): Known => exactly(temperatureToK(value, 'degF'), 'temperatureK');

function derivedWith(request: EvaluationRequest, quantities: Partial<DerivedQuantities>) {
  const input = inputOf(request);
  return { input, derived: { ...deriveQuantities(input.setup, input.readings), ...quantities } };
}

function stopsWith(request: EvaluationRequest, quantities: Partial<DerivedQuantities> = {}): readonly string[] {
  const { input, derived } = derivedWith(request, quantities);
  return findStops(input, derived).map(({ code }) => code);
}

/** R-22 is one substance: bubble, dew and mean evaporating temperature are one. */
const evaporatingAtF = (degF: number): ReadingInput => ({
  value: dewPressurePa({ refrigerant: 'R-22', temperatureK: temperatureToK(degF, 'degF') }) / PA_PER_PSI,
  unit: 'psia',
});

const SYSTEMS: readonly (readonly [string, Changes, full: boolean, cooling: boolean])[] = [
  ['a split system', {}, true, true],
  ['a packaged unit', { setup: { kind: 'packaged' } }, true, true],
  ['an assumed stage', { setup: { stage: 'unknown' } }, true, true],
  ['a mini-split', { setup: { kind: 'mini-split' } }, false, true],
  ['a multi-split', { setup: { kind: 'multi-split' } }, false, true],
  ['a part stage', { setup: { stage: 'part' } }, false, true],
  ['a stopped system', { visit: { runningMinutes: 0 } }, false, false],
  ['heating', { setup: { mode: 'heating' } }, false, false],
];

it('a healthy system has no stop', () => {
  expect(stopsWith(orificeRequest())).toEqual([]);
  expect(stopsWith(valveRequest())).toEqual([]);
});

describe('liquid-return', () => {
  it.each([
    [5, 0.5, false],
    [5 - 1e-6, 0.5, true],
    [4, 0.5, true],
    [6, 2.99, false],
    [6, 3, true],
  ])('on a fixed orifice at %d °F of superheat with u = %d °F: %s', (superheat, u, stop) => {
    expect(stopsWith(orificeRequest(), { superheat: differenceF(superheat, u) }).includes('liquid-return')).toBe(stop);
  });

  it('takes 5 °F for 5 °F, though it comes back from kelvin an ulp below', () => {
    const superheatK = temperatureToK(46, 'degF') - temperatureToK(41, 'degF');
    expect(superheatK).toBeLessThan(differenceToK(5, 'deltaF'));
    expect(stopsWith(orificeRequest(), { superheat: exactly(superheatK, 'differenceK') })).toEqual([]);
  });

  it.each([
    [1.01, 0.5, false],
    [1, 0.5, true],
    [0, 0.5, true],
    [-1, 0.5, true],
    [-1.01, 0.5, false],
  ])('on a valve at %d °F with u = %d °F: %s (below −U the readings are impossible instead)', (superheat, u, stop) => {
    expect(stopsWith(valveRequest(), { superheat: differenceF(superheat, u) }).includes('liquid-return')).toBe(stop);
  });

  it('carries the superheat and its U', () => {
    const { input, derived } = derivedWith(orificeRequest(), { superheat: differenceF(3, 0.5) });
    const [stop] = findStops(input, derived);
    expect(stop).toMatchObject({
      code: 'liquid-return',
      figures: {
        superheat: { kind: 'differenceK', value: expect.closeTo(3 / 1.8, 10) as number },
        uncertainty: { kind: 'differenceK', value: expect.closeTo(1 / 1.8, 10) as number },
      },
    });
  });

  it.each(SYSTEMS)('holds for %s only at full stage in cooling', (_, changes, full) => {
    expect(stopsWith(orificeRequest(changes), { superheat: differenceF(1, 0.1) }).includes('liquid-return')).toBe(full);
  });

  it('means shutting down at once only where the superheat is no more than U', () => {
    const superheat = (value: number) => derivedWith(orificeRequest(), { superheat: differenceF(value, 0.5) });
    for (const [value, must] of [
      [1.01, false],
      [0.99, true],
    ] as const) {
      const { input, derived } = superheat(value);
      expect(findStops(input, derived).map((stop) => mustShutDown(stop, derived))).toEqual([must]);
    }
  });
});

describe('freezing', () => {
  const mean = (degF: number) => ({ meanEvaporatingTemperature: temperatureF(degF) });

  it.each([
    [28, true],
    [28.001, false],
    [20, true],
    [40, false],
  ])('at a mean evaporating temperature of %d °F: %s', (degF, stop) => {
    expect(stopsWith(valveRequest(), mean(degF)).includes('freezing')).toBe(stop);
  });

  it.each([
    [32, true],
    [32.001, false],
    [29, true],
  ])('with ice seen at %d °F: %s', (degF, stop) => {
    expect(stopsWith(valveRequest({ visit: { iceSeen: true } }), mean(degF)).includes('freezing')).toBe(stop);
  });

  it.each([
    [118, false],
    [119, false],
    [121, true],
    [110, false],
  ])('at 31 °F with a suction pressure that was %d psig and is 118: %s', (before, stop) => {
    const readings = { suctionPressure: { value: before, unit: 'psig' } } as const;
    const request = valveRequest({ visit: { earlier: { minutesAgo: 5, readings } } });
    expect(stopsWith(request, mean(31)).includes('freezing')).toBe(stop);
  });

  it.each(SYSTEMS)('holds for %s in cooling, at any stage', (_, changes, __, cooling) => {
    expect(stopsWith(orificeRequest(changes), mean(27)).includes('freezing')).toBe(cooling);
  });

  it('means the middle between inlet and dew point: half of bubble + 0.2 glide + dew', () => {
    // R-407C has 10 °F of glide: the dew point alone would stand 4 °F higher
    const request = valveRequest({
      setup: { refrigerant: 'R-407C' },
      readings: { suctionPressure: 50, suctionLineTemperature: 45, liquidPressure: 240 },
    });
    const { input, derived } = derivedWith(request, {});
    const [bubble, dew, middle] = [
      derived.evaporatingBubbleTemperature,
      derived.evaporatingDewTemperature,
      derived.meanEvaporatingTemperature,
    ].map((quantity) => (quantity.state === 'known' ? quantity.value : Number.NaN)) as [number, number, number];
    expect(middle).toBeCloseTo((bubble + 0.2 * (dew - bubble) + dew) / 2, 10);
    expect(dew - middle).toBeCloseTo(0.4 * (dew - bubble), 10);
    expect(findStops(input, derived).map(({ code }) => code)).toEqual(['freezing']);
  });

  it('is a caution at 32 °F and below without ice, not a stop', () => {
    const riskAt = (degF: number, visit = {}) => {
      const { input, derived } = derivedWith(valveRequest({ visit }), mean(degF));
      return freezeRisk(input, derived)?.code;
    };
    expect(riskAt(32.001)).toBeUndefined();
    expect(riskAt(32)).toBe('freeze-risk');
    expect(riskAt(28.001)).toBe('freeze-risk');
    expect(riskAt(28)).toBeUndefined();
    expect(riskAt(31, { iceSeen: true })).toBeUndefined();
  });

  it('leaves no finding on the charge, and the numbers for diagnosis', () => {
    const result = evaluate(
      orificeRequest({ readings: { suctionPressure: evaporatingAtF(27), suctionLineTemperature: 42 } }),
    );
    expect(stopCodes(result)).toEqual(['freezing']);
    expect(result.overall.finding).toBe('stop');
    expect(result.criteria[0]).toMatchObject({
      criterion: 'superheat',
      finding: 'not-verifiable',
      reason: { code: 'freezing' },
    });
    expect(result.criteria[0]!.actual!.value).toBeCloseTo(15 / 1.8, 6);
    expect(result.criteria[0]!.probabilityWithin).not.toBeNull();
  });
});

describe('high-pressure', () => {
  const overAir = (deltaF: number) => ({ condensingOverAmbient: differenceF(deltaF) });

  it.each([
    [45, false],
    [45.001, true],
  ])('with condensing %d °F over the outdoor air: %s', (deltaF, stop) => {
    expect(stopsWith(valveRequest(), overAir(deltaF)).includes('high-pressure')).toBe(stop);
  });

  it.each([
    ['R-410A', 560, false],
    ['R-410A', 560.01, true],
    ['R-32', 560.01, true],
    ['R-32', 559.99, false],
    ['R-454B', 560.01, true],
    ['R-454B', 559.99, false],
    ['R-22', 370.01, true],
    ['R-22', 369.99, false],
    ['R-407C', 370.01, true],
    ['R-407C', 369.99, false],
    ['R-134a', 400, false],
  ])('of %s at %d psig, without a limit of the unit’s own: %s', (refrigerant, psig, stop) => {
    const request = valveRequest({ setup: { refrigerant }, readings: { liquidPressure: psig, outdoorDryBulb: 110 } });
    expect(stopsWith(request, overAir(20)).includes('high-pressure')).toBe(stop);
  });

  it('by the unit’s own limit takes the place of the general one, above and below it', () => {
    const at = (limit: number, psig: number) => {
      const maxHighPressure = { value: limit, unit: 'psig' } as const;
      const request = valveRequest({ setup: { maxHighPressure }, readings: { liquidPressure: psig } });
      return stopsWith(request, overAir(20)).includes('high-pressure');
    };
    expect(at(450, 450)).toBe(false);
    expect(at(450, 450.01)).toBe(true);
    expect(at(600, 599)).toBe(false);
    expect(at(600, 600.01)).toBe(true);
  });

  it('counts gauge limits from the local atmosphere', () => {
    const elevation = { value: 5000, unit: 'ft' } as const;
    const at = (psig: number) =>
      stopsWith(valveRequest({ setup: { elevation }, readings: { liquidPressure: psig } }), overAir(20));
    expect(at(559.99)).toEqual([]);
    expect(at(560.01)).toEqual(['high-pressure']);
  });

  it('looks at the higher of liquid and discharge pressure', () => {
    const request = valveRequest({ readings: { dischargePressure: 561 } });
    expect(stopsWith(request, overAir(20))).toEqual(['high-pressure']);
  });

  it.each(SYSTEMS)(
    'for %s: the general figures only at full stage in cooling, the unit’s limit always',
    (_, changes, full) => {
      expect(stopsWith(orificeRequest(changes), overAir(46)).includes('high-pressure')).toBe(full);
      const high = { ...changes, readings: { liquidPressure: 371 } };
      expect(stopsWith(orificeRequest(high), overAir(20)).includes('high-pressure')).toBe(full);
      const maxHighPressure = { value: 370, unit: 'psig' } as const;
      const limited = { ...high, setup: { ...changes.setup, maxHighPressure } };
      expect(stopsWith(orificeRequest(limited), overAir(20)).includes('high-pressure')).toBe(true);
    },
  );

  it('with the head raised on purpose looks at the absolute pressure only', () => {
    const visit = { headRaised: true };
    expect(stopsWith(orificeRequest({ visit }), overAir(46))).toEqual([]);
    expect(stopsWith(orificeRequest({ visit, readings: { liquidPressure: 371 } }), overAir(46))).toEqual([
      'high-pressure',
    ]);
  });
});

describe('hot-discharge', () => {
  it.each([
    [225, false],
    [225.001, true],
    [180, false],
  ])('at a discharge line of %d °F: %s', (degF, stop) => {
    const request = valveRequest({ readings: { dischargeLineTemperature: degF } });
    expect(stopsWith(request).includes('hot-discharge')).toBe(stop);
  });

  it.each([
    ['holds in heating', { setup: { mode: 'heating' } }, true],
    ['holds on a packaged unit', { setup: { kind: 'packaged' } }, true],
    ['does not hold on a mini-split', { setup: { kind: 'mini-split' } }, false],
    ['does not hold on a multi-split', { setup: { kind: 'multi-split' } }, false],
    ['does not hold at a part stage', { setup: { stage: 'part' } }, false],
  ] as const)('%s', (_, changes, stop) => {
    const request = valveRequest({ ...changes, readings: { dischargeLineTemperature: 240 } });
    expect(stopsWith(request).includes('hot-discharge')).toBe(stop);
  });
});

it('a stop outranks every finding and every other caution stays', () => {
  const result = evaluate(valveRequest({ setup: { elevation: null }, readings: { dischargeLineTemperature: 240 } }));
  expect(result.overall.finding).toBe('stop');
  expect(result.overall.nextStep.code).toBe('shut-down-hot-discharge');
  expect(cautionCodes(result)).toContain('elevation-assumed');
  expect(result.criteria.map(({ finding }) => finding)).toContain('within');
});
