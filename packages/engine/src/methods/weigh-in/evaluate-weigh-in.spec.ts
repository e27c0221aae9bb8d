import { describe, expect, it } from 'vitest';
import type { Known, Quantity } from '../../derivation/quantity';
import { isKnown } from '../../derivation/quantity';
import { lengthToM, massFromKg, massToKg } from '../../units';
import { lineRateFromKgPerM, lineRateToKgPerM } from '../../units/line-rate';
import { micronsToPa } from '../../units/vacuum';
import type { WeighInInput, WeighInResult } from './evaluate-weigh-in';
import { evaluateWeighIn } from './evaluate-weigh-in';

const oz = (value: number): number => massToKg(value, 'oz');
const ft = (value: number): number => lengthToM(value, 'ft');
const ozPerFt = (value: number): number => lineRateToKgPerM(value, 'oz/ft');

function known(quantity: Quantity): Known {
  if (!isKnown(quantity)) throw new Error(`not known: ${JSON.stringify(quantity)}`);
  return quantity;
}
const inOz = (quantity: Quantity): number => massFromKg(known(quantity).value, 'oz');

/** 96 oz for 15 ft; 45 ft of 3/8 in. at this maker's 0.60 oz/ft; 114 oz required in all, 18 to add. */
const INPUT: WeighInInput = {
  refrigerant: 'R-410A',
  kind: 'ducted',
  method: 'adjustment',
  factoryChargeKg: oz(96),
  line: {
    installedLengthM: ft(45),
    includedLengthM: ft(15),
    size: '3/8',
    makersRateKgPerM: ozPerFt(0.6),
  },
  actualKg: oz(18),
  scale: { resolutionKg: oz(0.5), limitKg: oz(0.5) },
  vacuum: { deepestPa: micronsToPa(420), risePa: micronsToPa(180), isolatedMinutes: 5 },
  decision: 'guarded',
  vacuumRecord: 'required',
};
const without = <K extends keyof WeighInInput>(...keys: readonly K[]): WeighInInput =>
  Object.fromEntries(Object.entries(INPUT).filter(([key]) => !keys.includes(key as K))) as unknown as WeighInInput;
const withLine = (line: Partial<WeighInInput['line']>): WeighInInput => ({
  ...INPUT,
  line: { ...INPUT.line, ...line },
});
const generalRate = (change: Partial<WeighInInput> = {}): WeighInInput => {
  const { makersRateKgPerM: _, ...line } = INPUT.line;
  return { ...INPUT, ...change, line: { ...line, ...change.line } };
};
const steps = ({ steps }: WeighInResult): readonly string[] => steps.map(({ id }) => id);

describe('the sum', () => {
  it('is factory charge + extra length × rate, in the order a person writes it', () => {
    const result = evaluateWeighIn(INPUT);
    expect(inOz(result.lineAdjustment)).toBeCloseTo(18, 9);
    expect(inOz(result.requiredTotal)).toBeCloseTo(114, 9);
    expect(inOz(result.actualTotal)).toBeCloseTo(114, 9);
    expect(steps(result)).toEqual(['lineAdjustment', 'requiredCharge', 'chargeDifference', 'chargeAfterAdjustment']);
    expect(result.finding).toBe('within');
    expect(result.weight?.byRule).toBe('passes');
    expect(result.cautions).toEqual([]);
  });

  // a maker's own printed example shows a 45 ft × 0.40 oz/ft line as 9 oz in one place and 4.5 oz in another, and 25 ft × 0.60 oz/ft as 13.5 oz
  it.each([
    [45, 0.4, 18, [9, 4.5]],
    [25, 0.6, 15, [13.5]],
  ])('of %d ft × %d oz/ft is %d oz, whatever a printed example says', (feet, rate, sum, misprints) => {
    const line = { installedLengthM: ft(feet), includedLengthM: 0, makersRateKgPerM: ozPerFt(rate) };
    const right = evaluateWeighIn({ ...withLine(line), actualKg: oz(sum) });
    expect(inOz(right.lineAdjustment)).toBeCloseTo(sum, 9);
    expect(right.finding).toBe('within');
    for (const misprint of misprints) {
      const wrong = evaluateWeighIn({ ...withLine(line), actualKg: oz(misprint) });
      expect(wrong.weight?.byRule).toBe('fails');
      expect(wrong.finding).toBe('below');
      expect(inOz(wrong.difference)).toBeCloseTo(misprint - sum, 9);
    }
  });

  it('adds the corrections the maker gives, and only those', () => {
    const result = evaluateWeighIn({ ...INPUT, corrections: { coil: oz(-4), drier: oz(6) }, actualKg: oz(20) });
    expect(inOz(result.requiredAdjustment)).toBeCloseTo(20, 9);
    const step = result.steps.find(({ id }) => id === 'requiredAdjustment')!.step;
    expect(step.formula.text).toBe('m_line + m_coil + m_drier');
    expect(result.finding).toBe('within');
    // no drier, no +6 oz
    expect(inOz(evaluateWeighIn(INPUT).requiredAdjustment)).toBeCloseTo(18, 9);
  });

  it('compares totals where an evacuated system was charged', () => {
    const result = evaluateWeighIn({ ...INPUT, method: 'total', actualKg: oz(114) });
    expect(result.required).toBe(result.requiredTotal);
    expect(result.finding).toBe('within');
    expect(evaluateWeighIn({ ...INPUT, method: 'total', actualKg: oz(18) }).finding).toBe('below');
  });

  it('takes each diameter by its own rate where they differ', () => {
    const line = {
      size: '1/2',
      makersRateKgPerM: ozPerFt(1.2),
      includedSize: '3/8',
      makersIncludedRateKgPerM: ozPerFt(0.6),
    } as const;
    const result = evaluateWeighIn(withLine(line));
    expect(inOz(result.lineAdjustment)).toBeCloseTo(45 * 1.2 - 15 * 0.6, 9);
    // one diameter, named twice, is one rate
    expect(inOz(evaluateWeighIn(withLine({ includedSize: '3/8' })).lineAdjustment)).toBeCloseTo(18, 9);
  });
});

describe('a shorter line', () => {
  const shorter = { installedLengthM: ft(10) };
  it('needs the maker’s word', () => {
    const result = evaluateWeighIn(withLine(shorter));
    expect(result.finding).toBe('not-judged');
    expect(result.reason).toEqual({ code: 'shorter-line-rule-needed' });
    expect(result.requiredTotal.state).toBe('missing');
  });

  it('subtracts at the same rate', () => {
    const result = evaluateWeighIn({ ...withLine({ ...shorter, shorterLine: 'subtract' }), actualKg: oz(-3) });
    expect(inOz(result.requiredTotal)).toBeCloseTo(93, 9);
    expect(result.finding).toBe('within');
  });

  it('or keeps the factory charge', () => {
    const result = evaluateWeighIn({ ...withLine({ ...shorter, shorterLine: 'keep' }), actualKg: 0 });
    expect(inOz(result.requiredTotal)).toBeCloseTo(96, 9);
    expect(result.finding).toBe('within');
    expect(inOz(evaluateWeighIn(withLine({ shorterLine: 'keep' })).requiredTotal)).toBeCloseTo(114, 9);
  });

  it('of exactly the included length needs no word', () => {
    expect(evaluateWeighIn({ ...withLine({ installedLengthM: ft(15) }), actualKg: 0 }).finding).toBe('within');
  });
});

describe('the rate', () => {
  it.each([
    ['ducted', '1/4', 0.285],
    ['ducted', '5/16', 0.4],
    ['ducted', '3/8', 0.6],
    ['ducted', '1/2', 1.2],
    ['ductless', '1/4', 0.16],
    ['ductless', '3/8', 0.32],
  ] as const)('of R-410A, %s %s in., is %d oz/ft as makers print it', (kind, size, rate) => {
    const result = evaluateWeighIn(generalRate({ kind, line: { size } }));
    expect(lineRateFromKgPerM(known(result.rate!.rate).value, 'oz/ft')).toBeCloseTo(rate, 9);
    expect(result.rate).toMatchObject({ origin: 'r410a-makers', standing: 'read' });
    expect(result.cautions).toEqual(['rate-not-this-makers']);
    expect(known(result.rate!.rate).u).toBeGreaterThan(0);
  });

  it('of another refrigerant goes by the liquid density, and says so', () => {
    const result = evaluateWeighIn(generalRate({ refrigerant: 'R-32', labelMaximumKg: oz(200) }));
    const rate = known(result.rate!.rate);
    // liquid at 100 °F: 903.906 and 988.849 kg/m³
    expect(lineRateFromKgPerM(rate.value, 'oz/ft')).toBeCloseTo((0.6 * 903.906) / 988.849, 9);
    expect(rate.u / rate.value).toBeCloseTo(Math.hypot(0.2, 0.05) / Math.sqrt(3), 6);
    expect(result.rate).toMatchObject({ origin: 'liquid-density', standing: 'computed' });
    expect(result.cautions).toEqual(['rate-by-density']);
    expect(steps(result)[0]).toBe('lineRate');
  });

  it('is the maker’s alone for a ductless system of another refrigerant, an odd size, or a fluid without liquid at 100 °F', () => {
    for (const input of [
      generalRate({ refrigerant: 'R-32', kind: 'ductless' }),
      generalRate({ line: { size: 'other' } }),
      generalRate({ kind: 'ductless', line: { size: '1/2' } }),
      generalRate({ refrigerant: 'R-744' }),
    ]) {
      const result = evaluateWeighIn(input);
      expect(result.reason).toEqual({ code: 'rate-needed' });
      expect(result.finding).toBe('not-judged');
      expect(result.rate).toBeNull();
    }
    const entered = { size: 'other', makersRateKgPerM: ozPerFt(0.5) } as const;
    expect(evaluateWeighIn({ ...withLine(entered), refrigerant: 'R-744', actualKg: oz(15) }).finding).toBe('within');
  });

  it('mixed from the maker’s and the general one is cautioned', () => {
    const result = evaluateWeighIn(withLine({ size: '1/2', includedSize: '3/8', makersRateKgPerM: ozPerFt(1.1) }));
    expect(result.rate?.origin).toBe('maker');
    expect(result.includedRate?.origin).toBe('r410a-makers');
    expect(result.cautions).toContain('rate-not-this-makers');
  });
});

describe('against the scale', () => {
  it.each([
    // required 18 oz, step 0.5 oz; U of this scale 0.65 oz
    ['guarded', 18.6, 'within', 'fails'],
    ['guarded', 18.2, 'within', 'passes'],
    ['guarded', 17.4, 'within', 'fails'],
    ['guarded', 18.7, 'above', 'fails'],
    ['guarded', 17.3, 'below', 'fails'],
    ['simple', 18.2, 'within', 'passes'],
    ['simple', 18.3, 'above', 'fails'],
    ['simple', 17.7, 'below', 'fails'],
    ['simple', 17.8, 'within', 'passes'],
  ] as const)('%s: %d oz put in for 18 is %s, by the rule %s', (decision, put, finding, byRule) => {
    const result = evaluateWeighIn({ ...INPUT, decision, actualKg: oz(put) });
    expect(result.finding).toBe(finding);
    expect(result.weight?.byRule).toBe(byRule);
  });

  it('rounds before it compares: 18.2 required and 18.0 put in are both 18.0 on a scale of 0.5 oz', () => {
    const input = { ...withLine({ installedLengthM: ft(15 + 18.2 / 0.6) }), decision: 'simple' } as const;
    const result = evaluateWeighIn(input);
    expect(massFromKg(result.weight!.requiredRoundedKg, 'oz')).toBeCloseTo(18, 9);
    expect(result.finding).toBe('within');
    expect(evaluateWeighIn({ ...input, scale: { resolutionKg: oz(0.1), limitKg: oz(0.5) } }).finding).toBe('below');
  });

  it('is too close to call where the rate, not the scale, is uncertain', () => {
    const result = evaluateWeighIn(generalRate({ refrigerant: 'R-454B', labelMaximumKg: oz(200) }));
    expect(inOz(result.required)).toBeCloseTo(16.93, 1);
    expect(result.finding).toBe('too-close-to-call');
    const far = evaluateWeighIn(generalRate({ refrigerant: 'R-454B', labelMaximumKg: oz(200), actualKg: oz(24) }));
    expect(far.finding).toBe('above');
  });

  it('counts the ± of the length', () => {
    const input = { ...withLine({ lengthLimitM: ft(5) }), actualKg: oz(19.5) };
    expect(evaluateWeighIn(input).finding).toBe('too-close-to-call');
    expect(evaluateWeighIn({ ...INPUT, actualKg: oz(19.5) }).finding).toBe('above');
  });

  it('never finds within by a scale too coarse for it', () => {
    const result = evaluateWeighIn({ ...INPUT, scale: { resolutionKg: oz(4), limitKg: oz(4) } });
    expect(result.cautions).toEqual(['scale-coarse']);
    expect(result.finding).toBe('too-close-to-call');
    const far = evaluateWeighIn({ ...INPUT, scale: { resolutionKg: oz(4), limitKg: oz(4) }, actualKg: oz(30) });
    expect(far.finding).toBe('above');
    // a scale of ±1 oz is what a field scale should be
    expect(evaluateWeighIn({ ...INPUT, scale: { resolutionKg: oz(1), limitKg: oz(1) } }).finding).toBe('within');
  });

  it('takes a usual scale where none is described', () => {
    const result = evaluateWeighIn(without('scale'));
    expect(result.cautions).toEqual(['scale-assumed']);
    expect(massFromKg(result.scale.resolutionKg, 'oz')).toBeCloseTo(0.5, 12);
  });
});

describe('what is missing or cannot be', () => {
  it('is named', () => {
    const result = evaluateWeighIn({ ...without('factoryChargeKg', 'actualKg'), line: {} });
    expect(result.finding).toBe('not-judged');
    expect(result.reason?.code).toBe('inputs-missing');
    const { inputs } = result.reason as { inputs: readonly string[] };
    expect([...inputs].sort()).toEqual([
      'actualCharge',
      'factoryCharge',
      'includedLength',
      'installedLength',
      'liquidLineSize',
    ]);
  });

  it('still shows what is required before anything was put in', () => {
    const result = evaluateWeighIn(without('actualKg'));
    expect(inOz(result.requiredTotal)).toBeCloseTo(114, 9);
    expect(result.reason).toEqual({ code: 'inputs-missing', inputs: ['actualCharge'] });
    expect(result.weight).toBeNull();
  });

  it.each([
    withLine({ installedLengthM: ft(-1), shorterLine: 'subtract' }),
    withLine({ includedLengthM: ft(-1) }),
    withLine({ makersRateKgPerM: 0 }),
    { ...INPUT, factoryChargeKg: 0 },
    { ...INPUT, corrections: { other: oz(-200) } },
  ])('is not judged: %#', (input) => {
    const result = evaluateWeighIn(input);
    expect(result.finding).toBe('not-judged');
    expect(result.reason).toEqual({ code: 'outside-range' });
  });

  it('is a bug of the caller where it is not a number', () => {
    expect(() => evaluateWeighIn({ ...INPUT, actualKg: Number.NaN })).toThrow(RangeError);
  });

  it('cautions about an adjustment beyond 200 oz', () => {
    expect(evaluateWeighIn(withLine({ installedLengthM: ft(350) })).cautions).toEqual(['adjustment-unusual']);
  });
});

describe('the vacuum', () => {
  const judged = (deepest: number | undefined, rise: number | undefined, minutes: number | undefined) =>
    evaluateWeighIn({
      ...INPUT,
      vacuum: {
        ...(deepest === undefined ? {} : { deepestPa: micronsToPa(deepest) }),
        ...(rise === undefined ? {} : { risePa: micronsToPa(rise) }),
        ...(minutes === undefined ? {} : { isolatedMinutes: minutes }),
      },
    });

  it.each([
    [500, 300, 5, 'passes'],
    [500, 300, 12, 'passes'],
    [501, 0, 5, 'fails'],
    [501, undefined, undefined, 'fails'],
    [400, 301, 5, 'fails'],
    [400, 301, 2, 'fails'],
    [400, 100, 4, 'not-proven'],
    [400, 400, 10, 'not-proven'],
    [400, 400, undefined, 'not-recorded'],
    [undefined, 100, 5, 'not-recorded'],
    [undefined, undefined, undefined, 'not-recorded'],
  ] as const)('of %s microns that rises %s in %s min: %s', (deepest, rise, minutes, outcome) => {
    expect(judged(deepest, rise, minutes).vacuum).toBe(outcome);
  });

  it('that failed shuts the weigh-in, and the weights still stand', () => {
    const result = judged(900, 100, 5);
    expect(result.finding).toBe('not-verifiable');
    expect(result.reason).toEqual({ code: 'vacuum-failed' });
    expect(result.weight?.byRule).toBe('passes');
  });

  it('that failed is said before anything is put in', () => {
    const { actualKg: _, ...before } = INPUT;
    const result = evaluateWeighIn({ ...before, vacuum: { deepestPa: micronsToPa(900) } });
    expect(result.finding).toBe('not-verifiable');
    expect(result.reason).toEqual({ code: 'vacuum-failed' });
  });

  it('that nobody recorded shuts it where a record is required, and cautions elsewhere', () => {
    expect(evaluateWeighIn(without('vacuum')).reason).toEqual({ code: 'vacuum-not-recorded' });
    expect(judged(400, 100, 4).reason).toEqual({ code: 'vacuum-not-proven' });
    const advised = evaluateWeighIn({ ...without('vacuum'), vacuumRecord: 'advised' });
    expect(advised.finding).toBe('within');
    expect(advised.cautions).toEqual(['vacuum-not-recorded']);
  });
});

describe('the label of a flammable refrigerant', () => {
  const r32 = (labelOz: number | undefined, change: Partial<WeighInInput> = {}): WeighInResult =>
    evaluateWeighIn({
      ...INPUT,
      refrigerant: 'R-32',
      ...(labelOz === undefined ? {} : { labelMaximumKg: oz(labelOz) }),
      ...change,
    });

  it('holds the total, not the adjustment', () => {
    expect(r32(120).label).toBe('within');
    expect(r32(120).finding).toBe('within');
    expect(r32(113).label).toBe('above');
    expect(r32(113).finding).toBe('not-verifiable');
    expect(r32(113).reason).toEqual({ code: 'above-label-maximum' });
  });

  it('is kept at equality, with the caution that the scale cannot tell', () => {
    expect(r32(114).label).toBe('near');
    expect(r32(114).cautions).toEqual(['near-label-maximum']);
    expect(r32(114).finding).toBe('within');
  });

  it('is exceeded by what was put in, or by what is required already, before anything else is said', () => {
    expect(r32(120, { actualKg: oz(25) }).reason).toEqual({ code: 'above-label-maximum' });
    const { actualKg: _, ...before } = INPUT;
    expect(evaluateWeighIn({ ...before, refrigerant: 'R-32', labelMaximumKg: oz(113) }).reason).toEqual({
      code: 'above-label-maximum',
    });
  });

  it('is asked for', () => {
    expect(r32(undefined).label).toBe('not-recorded');
    expect(r32(undefined).cautions).toEqual(['label-maximum-not-recorded']);
    expect(evaluateWeighIn({ ...without('factoryChargeKg'), refrigerant: 'R-290', labelMaximumKg: oz(9) }).label).toBe(
      'not-recorded',
    );
  });

  it('does not concern R-410A, unless one is entered', () => {
    expect(evaluateWeighIn(INPUT).label).toBe('not-applicable');
    expect(evaluateWeighIn({ ...INPUT, labelMaximumKg: oz(100) }).label).toBe('above');
  });
});
