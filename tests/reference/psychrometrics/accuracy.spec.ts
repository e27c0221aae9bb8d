import { describe, expect, it } from 'vitest';
import { EngineError } from '../../../packages/engine/src/errors';
import { humidityRatioFromWetBulb } from '../../../packages/engine/src/psychrometrics/wet-bulb';
import { handbookValues } from './handbook-values';
import { measurePsychrometrics, REFUSED_ELEVATIONS } from './measure';
import { oracle } from './oracle';
import { readTable } from './read-table';
import { exampleAnswers } from './worked-states';

const rows = measurePsychrometrics();
const rowsOf = (start: string) => rows.filter(({ quantity }) => quantity.startsWith(start));

describe('moist air against its sources', () => {
  it.each(rows)('$quantity, $source: within $limit $unit', ({ max, limit }) => {
    expect(max).toBeLessThanOrEqual(limit);
  });

  it('looks at every single value of the Handbook, or sees it refused', () => {
    const values = handbookValues();
    const handbook = rows.filter(({ source }) => /Table [123]$/.test(source));
    expect(values).toHaveLength(53);
    expect(handbook.reduce((sum, { n }) => sum + n, 0)).toBe(53 - REFUSED_ELEVATIONS.length);
  });

  it.each(REFUSED_ELEVATIONS)('refuses the standard atmosphere at %s, beyond −1,500 to 18,000 ft', (elevation) => {
    const value = handbookValues().find(({ quantity }) => quantity.endsWith(` ${elevation}`));
    expect(value?.computed).toThrow(EngineError);
  });

  it('looks at every worked state and at 10,000 random ones', () => {
    expect(readTable('psychrometric-states.csv')).toHaveLength(63);
    expect(rowsOf('humidity ratio, room air').map(({ n }) => n)).toEqual([63, 63]);
    expect(rows.filter(({ source }) => source.includes('random states')).every(({ n }) => n >= 10_000)).toBe(true);
  });

  it.each(exampleAnswers())('answers $printed of Example 1 within $allowed', ({ printed, allowed, computed }) => {
    expect(Math.abs(computed - printed)).toBeLessThanOrEqual(allowed);
  });
});

describe('the iced bulb against an independent writing of eq. 35', () => {
  // The oracle's solver is not trusted near 0 °C; this is its closed formula, so only rounding may differ.
  const dryBulbsC = [-40, -20, -10, -5, -1, 0, 2, 5, 8];
  const depressionsK = [0.01, 0.05, 0.1, 0.2, 0.4];
  const cases = dryBulbsC.flatMap((dryBulbC) =>
    depressionsK.map((depressionK) => ({ dryBulbC, wetBulbC: Math.min(dryBulbC, 0) - depressionK })),
  );

  it.each([50e3, 101_325, 110e3])('gives the same humidity ratio at %d Pa', (pressurePa) => {
    const expected = cases
      .map((each) => ({ ...each, W: oracle.GetHumRatioFromTWetBulb(each.dryBulbC, each.wetBulbC, pressurePa) }))
      .filter(({ W }) => W > 1e-7);
    expect(expected.length).toBeGreaterThan(20);
    for (const { dryBulbC, wetBulbC, W } of expected) {
      const ours = humidityRatioFromWetBulb({ dryBulbK: dryBulbC + 273.15, wetBulbK: wetBulbC + 273.15, pressurePa });
      expect(Math.abs(ours / W - 1)).toBeLessThan(1e-10);
    }
  });
});
