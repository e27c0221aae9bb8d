import { describe, expect, it } from 'vitest';
import { REFRIGERANT_IDS, refrigerantFacts } from './catalogue';
import { saturationModelLimitK } from './model-limit';

describe('the ± of the property model', () => {
  it('grows with what is estimated', () => {
    expect(saturationModelLimitK('R-22') * 1.8).toBeCloseTo(0.25, 12);
    expect(saturationModelLimitK('R-410A') * 1.8).toBeCloseTo(0.8, 12);
    const byGrade = (['A', 'B', 'C'] as const).map((grade) =>
      saturationModelLimitK(
        REFRIGERANT_IDS.find((id) => refrigerantFacts(id).kind === 'blend' && refrigerantFacts(id).grade === grade)!,
      ),
    );
    expect(byGrade.map((limitK) => Math.round(limitK * 18) / 10)).toEqual([0.8, 1.2, 2]);
  });
});
