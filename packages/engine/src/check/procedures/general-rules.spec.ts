import { describe, expect, it } from 'vitest';
import { differenceFromK, flowFromM3PerS, powerFromW, temperatureFromK } from '../../units';
import type { Rule } from '../procedure';
import { findProcedure, PROCEDURES } from '../procedure-catalogue';
import { GENERAL_RULES } from './general-rules';

const { superheat, subcooling, superheatWindow, temperatureSplit, airflow, conditions, instruments } = GENERAL_RULES;
const deltaF = (rule: Rule): number => differenceFromK(rule.value, 'deltaF');
const degF = (rule: Rule): number => temperatureFromK(rule.value, 'degF');

/** Every rule of a procedure, at any depth. */
function rulesIn(value: object): readonly Rule[] {
  return Object.values(value).flatMap((inner: unknown) => {
    if (typeof inner !== 'object' || inner === null) return [];
    return 'standing' in inner ? [inner as Rule] : rulesIn(inner);
  });
}

describe('general rules', () => {
  it.each([
    ['superheat ±', deltaF(superheat.toleranceK), 5],
    ['superheat floor', deltaF(superheat.floorK), 5],
    ['subcooling ±', deltaF(subcooling.toleranceK), 3],
    ['subcooling low below', deltaF(subcooling.lowBelowK), 5],
    ['subcooling clear from', deltaF(subcooling.clearFromK), 8],
    ['subcooling high above', deltaF(subcooling.highAboveK), 14],
    ['window from', deltaF(superheatWindow.lowK), 4],
    ['window to', deltaF(superheatWindow.highK), 25],
    ['split ±', deltaF(temperatureSplit.toleranceK), 3],
    ['outdoors at least', degF(conditions.leastOutdoorK), 55],
    ['cool below', degF(conditions.coolBelowK), 70],
    ['return at least', degF(conditions.leastReturnK), 70],
    ['minutes', conditions.leastRunningMinutes.value, 15],
    ['design airflow fraction', airflow.leastDesignFraction.value, 0.85],
    ['days', instruments.cautionAfterDays.value, 365],
    ['age', GENERAL_RULES.mostReadingAgeSeconds.value, 600],
    ['guard', GENERAL_RULES.guardProbability.value, 0.8],
    ['no target', GENERAL_RULES.mostProbabilityOfNoTarget.value, 0.2],
  ])('%s: %d is %d', (_, value, printed) => {
    expect(value).toBeCloseTo(printed, 9);
  });

  it('ask for 350 cfm for each ton', () => {
    const wattsOfATon = 1 / powerFromW(1, 'ton');
    expect(flowFromM3PerS(airflow.leastM3PerSPerW.value * wattsOfATon, 'cfm')).toBeCloseTo(350, 9);
  });

  it('say of every figure how it is printed, where it stands and where it is from', () => {
    const rules = rulesIn(GENERAL_RULES);
    expect(rules).toHaveLength(19);
    for (const { printed, source, standing } of rules) {
      expect(printed).toMatch(/\d/);
      expect(source.length).toBeGreaterThan(10);
      expect(['read', 'memory', 'practice', 'choice']).toContain(standing);
    }
  });

  it('print the figure that they compute with', () => {
    for (const rule of rulesIn(GENERAL_RULES)) {
      if (/^\d+ °F$/.test(rule.printed)) {
        const printed = Number.parseFloat(rule.printed);
        const near = [deltaF(rule), degF(rule)].map((value) => Math.abs(value - printed));
        expect(Math.min(...near), rule.printed).toBeLessThan(1e-9);
      }
    }
  });

  it('are found by their id, the newest version of each once', () => {
    expect(findProcedure('general-rules')).toBe(GENERAL_RULES);
    expect(findProcedure('')).toBeUndefined();
    expect(new Set(PROCEDURES.map(({ id }) => id)).size).toBe(PROCEDURES.length);
  });
});
