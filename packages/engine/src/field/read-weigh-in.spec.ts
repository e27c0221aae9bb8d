import { describe, expect, it } from 'vitest';
import { PROCEDURE_IDS } from '../check/procedure-ids';
import type { Quantity } from '../derivation/quantity';
import { isKnown } from '../derivation/quantity';
import { evaluateWeighIn } from '../methods/weigh-in/evaluate-weigh-in';
import { massFromKg, temperatureFromK } from '../units';
import type { LineSetRequest, WeighInRequest } from './field-request';
import { crossCheckWeighIn, readWeighInRequest } from './read-weigh-in';
import { WEIGH_IN_RULES } from './weigh-in-rules';

const REQUEST = {
  refrigerant: 'R-410A',
  kind: 'ducted',
  method: 'adjustment',
  factoryCharge: { value: 6, unit: 'lb' },
  line: {
    installedLength: { value: 45, unit: 'ft' },
    liquidLineSize: '3/8',
    makersRate: { value: 0.6, unit: 'oz/ft' },
    includedLength: { value: 15, unit: 'ft' },
  },
  actualCharge: { value: 18, unit: 'oz' },
  scale: { resolution: { value: 0.5, unit: 'oz' }, plusMinus: { value: 0.5, unit: 'oz' } },
  vacuum: { deepest: { value: 400, unit: 'micron' }, rise: { value: 150, unit: 'micron' }, isolatedMinutes: 5 },
} as const satisfies WeighInRequest;

function resultOf(request: WeighInRequest) {
  const read = readWeighInRequest(request);
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  return evaluateWeighIn(read.input);
}
function oz(quantity: Quantity): number {
  if (!isKnown(quantity)) throw new Error(`not known: ${JSON.stringify(quantity)}`);
  return massFromKg(quantity.value, 'oz');
}

describe('a request for a weigh-in', () => {
  it('is the sum a person writes: 45 ft less 15 ft by 0.60 oz/ft on 6 lb', () => {
    const result = resultOf(REQUEST);
    expect(oz(result.requiredAdjustment)).toBeCloseTo(18, 9);
    expect(oz(result.requiredTotal)).toBeCloseTo(114, 9);
    expect(result.finding).toBe('within');
    expect(result.cautions).toEqual([]);
    expect(result.working?.sizes).toBe('one');
  });

  it('gives the same in metres, grams and pascals', () => {
    const metric = resultOf({
      ...REQUEST,
      factoryCharge: { value: 2721.55422, unit: 'g' },
      line: {
        installedLength: { value: 13.716, unit: 'm' },
        liquidLineSize: '3/8',
        makersRate: { value: (0.6 * 28.349523125) / 0.3048, unit: 'g/m' },
        includedLength: { value: 4.572, unit: 'm' },
      },
      actualCharge: { value: 0.51029141625, unit: 'kg' },
      scale: { resolution: { value: 14.1747615625, unit: 'g' }, plusMinus: { value: 14.1747615625, unit: 'g' } },
      vacuum: { deepest: { value: 53.3, unit: 'Pa' }, rise: { value: 20, unit: 'Pa' }, isolatedMinutes: 5 },
    });
    expect(oz(metric.requiredTotal)).toBeCloseTo(114, 6);
    expect(metric.finding).toBe('within');
    expect(metric.vacuum).toBe('passes');
  });

  it('writes the working of two diameters by each its own rate', () => {
    const result = resultOf({
      ...REQUEST,
      line: {
        ...REQUEST.line,
        liquidLineSize: '1/2',
        makersRate: { value: 1.2, unit: 'oz/ft' },
        includedLiquidLineSize: '3/8',
        makersIncludedRate: { value: 0.6, unit: 'oz/ft' },
      },
    });
    if (result.working?.sizes !== 'two') throw new Error('one size');
    expect(oz(result.working.installedCharge)).toBeCloseTo(54, 9);
    expect(oz(result.working.includedCharge)).toBeCloseTo(9, 9);
    expect(oz(result.lineAdjustment)).toBeCloseTo(45, 9);
  });

  it('takes a ± of the length in feet, in percent, or for k = 2', () => {
    const uOf = (plusMinus: NonNullable<NonNullable<LineSetRequest['installedLength']>['plusMinus']>) => {
      const installedLength = { ...REQUEST.line.installedLength, plusMinus };
      const { required } = resultOf({ ...REQUEST, line: { ...REQUEST.line, installedLength } });
      return isKnown(required) ? massFromKg(required.u, 'oz') : NaN;
    };
    expect(uOf({ value: 2, unit: 'ft' })).toBeCloseTo((2 * 0.6) / Math.sqrt(3), 9);
    expect(uOf({ value: 10, unit: '%' })).toBeCloseTo((4.5 * 0.6) / Math.sqrt(3), 9);
    expect(uOf({ value: 2, unit: 'ft', kind: 'k2' })).toBeCloseTo(0.6, 9);
  });

  it('carries corrections, the label and the shorter line', () => {
    const result = resultOf({
      ...REQUEST,
      refrigerant: 'R-32',
      line: { ...REQUEST.line, installedLength: { value: 10, unit: 'ft' }, shorterLine: 'keep' },
      corrections: { coil: { value: -2, unit: 'oz' }, drier: { value: 6, unit: 'oz' } },
      actualCharge: { value: 4, unit: 'oz' },
      labelMaximum: { value: 99, unit: 'oz' },
    });
    expect(oz(result.requiredTotal)).toBeCloseTo(100, 9);
    expect(result.reason).toEqual({ code: 'above-label-maximum' });
  });

  it('names what is missing', () => {
    const result = resultOf({ refrigerant: 'R-410A', kind: 'ducted', method: 'total' });
    expect(result.reason).toMatchObject({ code: 'inputs-missing' });
    expect(result.cautions).toContain('scale-assumed');
  });
});

describe('the rules', () => {
  const outdoors = (value: number) => ({ outdoorDryBulb: { value, unit: 'degF' } }) as const;
  const by = (procedure: string, change: Partial<WeighInRequest> = {}) =>
    resultOf({ ...REQUEST, procedure, ...change });

  it('cover every procedure, each with standing and source', () => {
    expect(Object.keys(WEIGH_IN_RULES).sort()).toEqual([...PROCEDURE_IDS].sort());
    for (const { source, standing, observesBelow, promisesBelow } of Object.values(WEIGH_IN_RULES)) {
      expect(source).toMatch(/.{10}/);
      expect(['read', 'practice']).toContain(standing);
      for (const figure of [observesBelow, promisesBelow]) {
        if (figure === null) continue;
        expect(figure.printed).toBe(`${Math.round(temperatureFromK(figure.value, 'degF'))} °F`);
        expect(figure.standing).toBe('read');
      }
    }
  });

  it('of 2008 never let a rater weigh in, however cold, whatever was weighed', () => {
    for (const change of [{}, outdoors(30), { kind: 'ductless' } as const]) {
      const result = by('cec-ra3.2-2008-rater', change);
      expect(result.finding).toBe('not-verifiable');
      expect(result.reason).toEqual({ code: 'weigh-in-not-permitted' });
    }
    expect(by('cec-ra3.2-2008-installer').finding).toBe('within');
  });

  it.each([
    [54.9, 'within', null],
    [55, 'not-verifiable', 'too-warm-to-observe'],
    [80, 'not-verifiable', 'too-warm-to-observe'],
  ])('of 2019 let a rater watch at %d °F: %s', (degF, finding, reason) => {
    const result = by('cec-ra3.2-2019-rater', outdoors(degF));
    expect(result.finding).toBe(finding);
    expect(result.reason?.code ?? null).toBe(reason);
    expect(result.cautions).toContain('observe-only');
  });

  it('of 2019 ask a rater for the outdoor temperature, but not at a system that no reading can test', () => {
    expect(by('cec-ra3.2-2019-rater').reason).toEqual({ code: 'inputs-missing', inputs: ['outdoorDryBulb'] });
    expect(by('cec-ra3.2-2019-rater').finding).toBe('not-judged');
    expect(by('cec-ra3.2-2019-rater', { kind: 'ductless', ...outdoors(80) }).finding).toBe('within');
  });

  it('of 2019 have the installer promise to return when it was only cold', () => {
    expect(by('cec-ra3.2-2019-installer', outdoors(40)).cautions).toContain('promise-to-return');
    expect(by('cec-ra3.2-2019-installer', outdoors(55)).cautions).not.toContain('promise-to-return');
    expect(by('cec-ra3.2-2019-installer', { kind: 'ductless', ...outdoors(40) }).cautions).toEqual([]);
    expect(by('general-rules', outdoors(40)).cautions).toEqual([]);
  });

  it('of 2019 want the vacuum on record and judge by equality; general rules advise and know the scale', () => {
    const { vacuum: _, ...unrecorded } = REQUEST;
    expect(resultOf({ ...unrecorded, procedure: 'cec-ra3.2-2019-installer' }).reason?.code).toBe('vacuum-not-recorded');
    expect(resultOf(unrecorded).cautions).toEqual(['vacuum-not-recorded']);
    const slightlyOff = { actualCharge: { value: 18.3, unit: 'oz' } } as const;
    expect(by('cec-ra3.2-2019-installer', slightlyOff).finding).toBe('above');
    expect(by('general-rules', slightlyOff).finding).toBe('within');
  });

  it('put the label’s maximum before anything else', () => {
    const tooMuch = { refrigerant: 'R-32', labelMaximum: { value: 100, unit: 'oz' } } as const;
    expect(by('cec-ra3.2-2008-rater', tooMuch).reason).toEqual({ code: 'above-label-maximum' });
  });
});

describe('what cannot be', () => {
  it('is told all at once, each at its field', () => {
    const faults = crossCheckWeighIn({
      refrigerant: 'R-0',
      procedure: 'by-feel',
      method: 'total',
      outdoorDryBulb: { value: -500, unit: 'degF' },
      factoryCharge: { value: 0, unit: 'lb' },
      line: {
        installedLength: { value: -1, unit: 'ft', plusMinus: { value: -1, unit: 'ft' } },
        includedLength: { value: -1, unit: 'ft' },
        makersRate: { value: 0, unit: 'oz/ft' },
        makersIncludedRate: { value: -1, unit: 'oz/ft' },
      },
      corrections: { coil: { value: NaN, unit: 'oz' } },
      actualCharge: { value: -1, unit: 'oz' },
      scale: { resolution: { value: 0, unit: 'oz' }, plusMinus: { value: -1, unit: 'oz' } },
      vacuum: {
        deepest: { value: -1, unit: 'micron' },
        rise: { value: -1, unit: 'micron' },
        isolatedMinutes: -1,
      },
      labelMaximum: { value: 0, unit: 'lb' },
    });
    expect(faults.map(({ path, code }) => `${path} ${code}`).sort()).toEqual([
      'actualCharge must-not-be-negative',
      'corrections.coil not-a-finite-number',
      'factoryCharge must-be-positive',
      'labelMaximum must-be-positive',
      'line.includedLength must-not-be-negative',
      'line.installedLength must-not-be-negative',
      'line.installedLength.plusMinus must-not-be-negative',
      'line.makersIncludedRate must-be-positive',
      'line.makersRate must-be-positive',
      'outdoorDryBulb below-absolute-zero',
      'procedure unknown-procedure',
      'refrigerant unknown-refrigerant',
      'scale.plusMinus must-not-be-negative',
      'scale.resolution scale-step-not-above-zero',
      'vacuum.deepest must-not-be-negative',
      'vacuum.isolatedMinutes must-not-be-negative',
      'vacuum.rise must-not-be-negative',
    ]);
  });

  it('is not an adjustment that was recovered', () => {
    expect(crossCheckWeighIn({ ...REQUEST, actualCharge: { value: -3, unit: 'oz' } })).toEqual([]);
    expect(readWeighInRequest({ ...REQUEST, refrigerant: 'R-0' }).ok).toBe(false);
  });
});
