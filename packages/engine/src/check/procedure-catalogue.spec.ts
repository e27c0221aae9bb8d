import { describe, expect, it } from 'vitest';
import { differenceFromK, temperatureFromK } from '../units';
import type { Rule } from './procedure';
import { PROCEDURE_IDS } from './procedure-ids';
import { DEFAULT_PROCEDURE, findProcedure, PROCEDURES } from './procedure-catalogue';

/** Every rule of a procedure, at any depth. */
function rulesIn(value: object): readonly Rule[] {
  return Object.values(value).flatMap((inner: unknown) => {
    if (typeof inner !== 'object' || inner === null) return [];
    return 'standing' in inner ? [inner as Rule] : rulesIn(inner);
  });
}

/** How many figures each holds: one that is added or lost is looked at here. */
const FIGURES: Readonly<Record<(typeof PROCEDURE_IDS)[number], number>> = {
  'general-rules': 23,
  manufacturer: 20,
  'cec-ra3.2-2008-installer': 17,
  'cec-ra3.2-2008-rater': 17,
  'cec-ra3.2-2019-installer': 20,
  'cec-ra3.2-2019-rater': 21,
};

describe.each(PROCEDURES.map((procedure) => ({ id: procedure.id, procedure })))('$id', ({ id, procedure }) => {
  const rules = rulesIn(procedure);

  it('says of every figure how it is printed, where it stands and where it is from', () => {
    expect(rules).toHaveLength(FIGURES[id]);
    for (const { printed, source, standing } of rules) {
      expect(printed).toMatch(/\d/);
      expect(source.length).toBeGreaterThan(10);
      expect(['read', 'memory', 'practice', 'choice']).toContain(standing);
    }
  });

  it('prints the figure that it computes with', () => {
    const degrees = rules.filter(({ printed }) => /^\d+ °F$/.test(printed));
    expect(degrees.length).toBeGreaterThanOrEqual(9);
    for (const { printed, value } of degrees) {
      const near = [differenceFromK(value, 'deltaF'), temperatureFromK(value, 'degF')].map((each) =>
        Math.abs(each - Number.parseFloat(printed)),
      );
      expect(Math.min(...near), printed).toBeLessThan(1e-9);
    }
  });

  it('is found by its id', () => {
    expect(findProcedure(id)).toBe(procedure);
  });
});

describe('the catalogue', () => {
  it('has every id once, and general rules where none is chosen', () => {
    expect(PROCEDURES.map(({ id }) => id)).toEqual([...PROCEDURE_IDS]);
    expect(new Set(PROCEDURE_IDS).size).toBe(PROCEDURE_IDS.length);
    expect(DEFAULT_PROCEDURE.id).toBe('general-rules');
    expect(findProcedure('')).toBeUndefined();
  });
});
