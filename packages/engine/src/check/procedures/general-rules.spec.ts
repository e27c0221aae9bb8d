import { describe, expect, it } from 'vitest';
import { differenceFromK, flowFromM3PerS, powerFromW, temperatureFromK } from '../../units';
import type { Rule } from '../procedure';
import { GENERAL_RULES } from './general-rules';

const { superheat, subcooling, superheatWindow, temperatureSplit, airflow, conditions, instruments } = GENERAL_RULES;
const deltaF = (rule: Rule | null): number => differenceFromK(rule?.value ?? Number.NaN, 'deltaF');
const degF = (rule: Rule | null): number => temperatureFromK(rule?.value ?? Number.NaN, 'degF');

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
    ['design airflow fraction', airflow.leastDesignFraction?.value, 0.85],
    ['days', instruments.mostDays.value, 365],
    ['age', GENERAL_RULES.mostReadingAgeSeconds.value, 600],
    ['guard', GENERAL_RULES.decision.clearFrom.value, 0.8],
    ['no target', GENERAL_RULES.mostProbabilityOfNoTarget.value, 0.2],
  ])('%s: %d is %d', (_, value, printed) => {
    expect(value).toBeCloseTo(printed, 9);
  });

  it('decide with a guard, by the printed chart or an entered target, and never gate on what is not recorded', () => {
    expect(GENERAL_RULES.decision.type).toBe('guarded');
    expect(superheat).toMatchObject({ enteredTarget: true, chart: 'makers-chart-a' });
    expect(superheatWindow.makersRange).toBe('replaces');
    expect(conditions).toMatchObject({ unrecorded: 'caution', accessHole: false, mostOutdoorForSuperheatK: null });
    expect(instruments.beyond).toBe('caution');
    expect(GENERAL_RULES.packaged).toBe(true);
  });

  it('ask for 350 cfm for each ton', () => {
    const wattsOfATon = 1 / powerFromW(1, 'ton');
    expect(flowFromM3PerS(airflow.leastM3PerSPerW!.value * wattsOfATon, 'cfm')).toBeCloseTo(350, 9);
  });
});
