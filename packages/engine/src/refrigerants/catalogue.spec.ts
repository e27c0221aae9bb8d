import { describe, expect, it } from 'vitest';
import { COMMON_REFRIGERANT_IDS, isRefrigerantId, REFRIGERANT_IDS, refrigerantFacts } from './catalogue';
import { refrigerantModel } from './refrigerant-model';

describe('catalogue', () => {
  it('has 27 pure fluids and 40 blends, each once', () => {
    expect(new Set(REFRIGERANT_IDS).size).toBe(REFRIGERANT_IDS.length);
    const kinds = REFRIGERANT_IDS.map((id) => refrigerantFacts(id).kind);
    expect(kinds.filter((kind) => kind === 'pure')).toHaveLength(27);
    expect(kinds.filter((kind) => kind === 'blend')).toHaveLength(40);
  });

  it('offers eight common ones first, none of them estimated or doubtful', () => {
    expect(new Set(COMMON_REFRIGERANT_IDS).size).toBe(8);
    for (const id of COMMON_REFRIGERANT_IDS)
      expect(refrigerantFacts(id)).toMatchObject({ grade: 'A', doubtful: false });
  });

  it('knows designations as printed and nothing else', () => {
    for (const id of REFRIGERANT_IDS) expect(isRefrigerantId(id)).toBe(true);
    for (const text of ['R410A', 'R-410a', '', 'R-999', 'constructor', 'toString', '__proto__'])
      expect(isRefrigerantId(text)).toBe(false);
  });

  it('marks the estimated and the doubtful ones', () => {
    const estimated = REFRIGERANT_IDS.filter((id) => refrigerantFacts(id).grade === 'C');
    expect(estimated).toEqual(['R-424A', 'R-438A', 'R-453A', 'R-458A']);
    expect(REFRIGERANT_IDS.filter((id) => refrigerantModel(id).estimatedPairs.length > 0)).toEqual(estimated);
    const doubtful = REFRIGERANT_IDS.filter((id) => refrigerantFacts(id).doubtful);
    expect(doubtful).toEqual(['R-500', 'R-502']);
    expect(REFRIGERANT_IDS.filter((id) => refrigerantModel(id).doubt !== undefined)).toEqual(doubtful);
  });

  it('gives facts with their standing', () => {
    expect(refrigerantFacts('R-410A')).toEqual({
      id: 'R-410A',
      kind: 'blend',
      grade: 'A',
      doubtful: false,
      safetyClass: 'A1',
      safetyClassStanding: 'memory',
      criticalTemperatureK: 344.4941,
      criticalPressurePa: expect.closeTo(4.903e6, -4),
      criticalPressureOrigin: 'bubble-curve-extrapolated',
    });
    expect(refrigerantFacts('R-32')).toMatchObject({
      kind: 'pure',
      safetyClass: 'A2L',
      criticalPressurePa: 5_782_000,
      criticalPressureOrigin: 'equation-of-state',
    });
  });

  it('calls no blend of A1 components flammable: a swapped row of the classes would show here', () => {
    for (const id of REFRIGERANT_IDS) {
      const { composition } = refrigerantModel(id);
      if (composition.every(({ id: part }) => refrigerantFacts(part).safetyClass === 'A1'))
        expect(refrigerantFacts(id).safetyClass, id).toBe('A1');
    }
  });
});

describe('refrigerant model', () => {
  it.each(REFRIGERANT_IDS)('%s: fractions sum to 1, every publication is named', (id) => {
    const { composition, citations } = refrigerantModel(id);
    expect(composition.reduce((sum, { massFraction }) => sum + massFraction, 0)).toBeCloseTo(1, 12);
    expect(composition.length > 1).toBe(refrigerantFacts(id).kind === 'blend');
    expect(citations.length).toBeGreaterThan(0);
    for (const citation of citations) expect(citation).toMatch(/\((?:19|20)\d\d\b.*\)/);
  });

  it('gives the composition by mass', () => {
    expect(refrigerantModel('R-407C').composition).toEqual([
      { id: 'R-32', massFraction: 0.23 },
      { id: 'R-125', massFraction: 0.25 },
      { id: 'R-134a', massFraction: 0.52 },
    ]);
    expect(refrigerantModel('R-22').composition).toEqual([{ id: 'R-22', massFraction: 1 }]);
  });
});
