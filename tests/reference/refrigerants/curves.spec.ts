import { readFileSync, readdirSync } from 'node:fs';
import { gzipSync } from 'node:zlib';
import { describe, expect, it } from 'vitest';
import {
  extrapolatedCriticalPressurePa,
  fitSaturation,
  largestErrorK,
} from '../../../packages/engine/generators/fit-saturation';
import { generateCurves, GENERATED } from '../../../packages/engine/generators/generate-curves';
import { leastSquares } from '../../../packages/engine/generators/least-squares';
import { referenceTableSource } from '../../../packages/engine/generators/reference-table-source';
import {
  CHECK_POINTS,
  INPUT_HASH,
  SATURATION_MODELS,
} from '../../../packages/engine/src/refrigerants/generated/saturation-curves';
import { isRefrigerantId } from '../../../packages/engine/src/refrigerants/catalogue';
import { saturationCurve } from '../../../packages/engine/src/refrigerants/saturation-curve';

const source = referenceTableSource();

describe('generated curves', () => {
  it('are what the script makes of the committed tables, byte for byte', () => {
    const texts = generateCurves();
    expect(readdirSync(GENERATED).sort()).toEqual([...texts.keys()].sort());
    for (const [name, text] of texts) expect(readFileSync(new URL(name, GENERATED), 'utf8') === text, name).toBe(true);
    expect(INPUT_HASH).toBe(source.inputHash);
  });

  it('carry check points that are states of the tables', () => {
    for (const { id, states } of source.refrigerants) {
      if (!isRefrigerantId(id)) throw new Error(`no curve for ${id}`);
      for (const point of CHECK_POINTS[id]) expect(states).toContainEqual(point);
    }
  });

  it('weigh at most 12 kB gzipped, of the 60 kB allowed', () => {
    const bytes = gzipSync(readFileSync(new URL('saturation-curves.ts', GENERATED)), { level: 9 }).length;
    expect(bytes).toBeLessThanOrEqual(12_000);
  });
});

describe('the fit', () => {
  it.each(source.refrigerants)(
    'of $id predicts the states it has not seen within 0.003 K, near the critical point too',
    (refrigerant) => {
      const { states } = refrigerant;
      const seen = states.filter((_, k) => k % 2 === 0 || k === states.length - 1);
      const unseen = states.filter((state) => !seen.includes(state));
      expect(unseen.length).toBeGreaterThan(20);
      const model = fitSaturation({ ...refrigerant, states: seen });
      expect(largestErrorK(saturationCurve(model, model.bubble), unseen, (s) => s.bubblePressurePa)).toBeLessThan(
        0.003,
      );
      expect(
        largestErrorK(saturationCurve(model, model.dew ?? model.bubble), unseen, (s) => s.dewPressurePa),
      ).toBeLessThan(0.003);
    },
  );

  it('of a pure fluid, continued to the critical point, meets the published critical pressure', () => {
    const off = source.refrigerants.flatMap(({ id, states, criticalTemperatureK, criticalPressurePa }) =>
      criticalPressurePa === undefined
        ? []
        : [{ id, share: extrapolatedCriticalPressurePa(states, criticalTemperatureK) / criticalPressurePa - 1 }],
    );
    expect(off).toHaveLength(27);
    expect(Math.max(...off.map(({ share }) => Math.abs(share)))).toBeLessThan(0.004);
    expect(off.filter(({ share }) => Math.abs(share) > 0.001).map(({ id }) => id)).toEqual([
      'R-11',
      'R-123',
      'R-152a',
      'R-236fa',
    ]);
  });

  it('uses few terms', () => {
    const terms = Object.values(SATURATION_MODELS).flatMap(({ bubble, dew }) =>
      [bubble, ...(dew === undefined ? [] : [dew])].map(({ coefficients }) => coefficients.length),
    );
    expect(Math.max(...terms)).toBeLessThanOrEqual(10);
  });

  it('solves least squares: a line through four points by hand', () => {
    // y = 3.5 + 1.4 x is the textbook answer for (1, 6), (2, 5), (3, 7), (4, 10).
    const x = leastSquares(
      [1, 2, 3, 4].map((t) => [1, t]),
      [6, 5, 7, 10],
    );
    expect(x[0]).toBeCloseTo(3.5, 12);
    expect(x[1]).toBeCloseTo(1.4, 12);
  });
});
