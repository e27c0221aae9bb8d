import type { WeighInRequest } from '@chargewright/engine';
import { evaluateWeighIn, readWeighInRequest } from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import type { UnitSystem } from './unit-system';
import { weighInSum } from './weigh-in-sum';

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
} as const satisfies WeighInRequest;

function sum(change: Partial<WeighInRequest>, system: UnitSystem = 'F-psi'): readonly string[] {
  const read = readWeighInRequest({ ...REQUEST, ...change });
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  return weighInSum(evaluateWeighIn(read.input), system).map(({ about, text }) => `${about}: ${text}`);
}
const line = (change: Partial<NonNullable<WeighInRequest['line']>>) => ({ line: { ...REQUEST.line, ...change } });

describe('the sum on paper', () => {
  it('goes from lengths over the rate to ounces, and on to the whole charge', () => {
    expect(sum({})).toEqual([
      'Line set: 45 ft − 15 ft = 30 ft × 0.60 oz/ft = 18 oz',
      'Whole charge: 6 lb 0 oz (factory) + 18 oz = 7 lb 2 oz (114 oz)',
    ]);
  });

  it('goes on to what was put in', () => {
    expect(sum({ actualCharge: { value: 20, unit: 'oz' } }).slice(2)).toEqual([
      'Weighed in less required: 1 lb 4 oz − 1 lb 2 oz = 2 oz',
      'Whole charge now: 6 lb 0 oz (factory) + 20 oz = 7 lb 4 oz (116 oz)',
    ]);
    expect(sum({ method: 'total', actualCharge: { value: 114, unit: 'oz' } }).at(-1)).toBe(
      'Weighed in less required: 7 lb 2 oz − 7 lb 2 oz = 0 oz',
    );
  });

  // a maker's own printed example has 45 ft × 0.40 as 9 oz, and as 4.5 oz elsewhere, and 25 ft × 0.60 as 13.5 oz
  it.each([
    [45, 0.4, 'Line set: 45 ft − 0 ft = 45 ft × 0.40 oz/ft = 18 oz'],
    [25, 0.6, 'Line set: 25 ft − 0 ft = 25 ft × 0.60 oz/ft = 15 oz'],
  ])('shows its own sum for %d ft at %d oz/ft, whatever a printed example says', (feet, rate, shown) => {
    const change = line({
      installedLength: { value: feet, unit: 'ft' },
      includedLength: { value: 0, unit: 'ft' },
      makersRate: { value: rate, unit: 'oz/ft' },
    });
    expect(sum(change)[0]).toBe(shown);
  });

  it('keeps half a foot and the digits of a rate, so that the line can be checked with a pencil', () => {
    const change = line({
      installedLength: { value: 45.5, unit: 'ft' },
      makersRate: { value: 0.285, unit: 'oz/ft' },
    });
    expect(sum(change)[0]).toBe('Line set: 45.5 ft − 15 ft = 30.5 ft × 0.285 oz/ft = 8.7 oz');
  });

  it('subtracts for a shorter line, or says that this maker keeps the charge', () => {
    const shorter = { installedLength: { value: 10, unit: 'ft' } } as const;
    expect(sum(line({ ...shorter, shorterLine: 'subtract' }))).toEqual([
      'Line set: 10 ft − 15 ft = −5 ft × 0.60 oz/ft = −3 oz',
      'Whole charge: 6 lb 0 oz (factory) − 3 oz = 5 lb 13 oz (93 oz)',
    ]);
    expect(sum(line({ ...shorter, shorterLine: 'keep' }))[0]).toBe(
      'Line set: 10 ft − 15 ft = −5 ft × 0.60 oz/ft = 0 oz (shorter, and this maker keeps the factory charge)',
    );
    // nobody said which: no more than the lengths
    expect(sum(line(shorter))).toEqual(['Line set: 10 ft − 15 ft = −5 ft']);
  });

  it('takes two diameters one after the other', () => {
    const two = {
      liquidLineSize: '1/2',
      makersRate: { value: 1.2, unit: 'oz/ft' },
      includedLiquidLineSize: '3/8',
      makersIncludedRate: { value: 0.6, unit: 'oz/ft' },
    } as const;
    expect(sum(line(two)).slice(0, 3)).toEqual([
      'Installed line: 45 ft × 1.20 oz/ft = 54 oz',
      'Included line: 15 ft × 0.60 oz/ft = 9 oz',
      'Line set: 54 oz − 9 oz = 45 oz',
    ]);
    const kept = line({ ...two, installedLength: { value: 5, unit: 'ft' }, shorterLine: 'keep' });
    expect(sum(kept)[2]).toBe('Line set: 6 oz − 9 oz = 0 oz (shorter, and this maker keeps the factory charge)');
  });

  it('adds the corrections by name', () => {
    const corrections = { coil: { value: -4, unit: 'oz' }, drier: { value: 6, unit: 'oz' } } as const;
    expect(sum({ corrections })[1]).toBe('With corrections: 18 oz − 4 oz (coil) + 6 oz (drier) = 20 oz');
  });

  it('shows where a rate by density comes from', () => {
    const { makersRate: _, ...rest } = REQUEST.line;
    expect(sum({ refrigerant: 'R-32', line: rest }).slice(0, 2)).toEqual([
      'Rate by liquid density: 0.60 oz/ft (R-410A) × 56.4 ÷ 61.7 lb/ft³ = 0.548 oz/ft',
      'Line set: 45 ft − 15 ft = 30 ft × 0.548 oz/ft = 16.5 oz',
    ]);
  });

  it('is in metres, grams and kilograms for those who read °C', () => {
    const metric: Partial<WeighInRequest> = {
      factoryCharge: { value: 2.7, unit: 'kg' },
      line: {
        installedLength: { value: 12, unit: 'm' },
        liquidLineSize: '3/8',
        makersRate: { value: 54, unit: 'g/m' },
        includedLength: { value: 5, unit: 'm' },
      },
    };
    expect(sum(metric, 'C-bar')).toEqual([
      'Line set: 12 m − 5 m = 7 m × 54 g/m = 378 g',
      'Whole charge: 2.7 kg (factory) + 378 g = 3.078 kg (3078 g)',
    ]);
  });

  it('leaves out what is not known yet', () => {
    expect(sum({ line: {} })).toEqual([]);
    const { factoryCharge: _, ...without } = REQUEST;
    const read = readWeighInRequest(without);
    expect(read.ok && weighInSum(evaluateWeighIn(read.input), 'F-psi')).toHaveLength(1);
  });
});
