import { describe, expect, it } from 'vitest';
import type { Finding, ReasonCode } from '../codes';
import type { Changes } from '../testing/healthy-systems';
import { criterionOf, evaluate, valveRequest } from '../testing/healthy-systems';

const lowest = (value: number): Changes => ({ visit: { lowestReturnDryBulb: { value, unit: 'degF' } } });

describe('the conditions of the test', () => {
  it.each<[string, Changes, ReasonCode | null]>([
    ['14.99 minutes of running', { visit: { runningMinutes: 14.99 } }, 'running-time'],
    ['15 minutes of running', { visit: { runningMinutes: 15 } }, null],
    ['54.99 °F outdoors', { readings: { outdoorDryBulb: 54.99 } }, 'outdoor-too-cold'],
    ['55 °F outdoors', { readings: { outdoorDryBulb: 55 } }, null],
    ['a lowest return air of 69.99 °F', lowest(69.99), 'return-too-cool'],
    ['a lowest return air of 70 °F', lowest(70), null],
    [
      'a return reading of 69.9 °F, the lowest not recorded',
      { visit: { lowestReturnDryBulb: null }, readings: { returnDryBulb: 69.9, returnWetBulb: 62 } },
      'return-too-cool',
    ],
    [
      'a return reading of 69.9 °F below the lowest that was recorded',
      { ...lowest(74), readings: { returnDryBulb: 69.9, returnWetBulb: 62 } },
      'return-too-cool',
    ],
    ['nothing recorded', { visit: { runningMinutes: null, lowestReturnDryBulb: null, preflight: null } }, null],
  ])('%s', (_, changes, reason) => {
    const result = evaluate(valveRequest(changes));
    const { finding, reason: found } = criterionOf(result, 'subcooling');
    if (reason === null) expect(found).toBeNull();
    else expect([finding, found?.code]).toEqual(['not-verifiable', reason]);
  });

  it('stand on the measured value, whatever the uncertainty', () => {
    for (const half of [0, 1, 20]) {
      const reading = (value: number) => ({ value, unit: 'degF', plusMinus: { value: half, unit: 'deltaF' } }) as const;
      const finding = (value: number): Finding =>
        criterionOf(evaluate(valveRequest({ readings: { outdoorDryBulb: reading(value) } })), 'subcooling').finding;
      expect(finding(54.9)).toBe('not-verifiable');
      expect(finding(55.1)).toBe('within');
    }
  });

  it('say how much is missing', () => {
    const { reason } = criterionOf(evaluate(valveRequest({ visit: { runningMinutes: 4 } })), 'conditions');
    expect(reason).toEqual({
      code: 'running-time',
      figures: { minutes: { kind: 'minutes', value: 4 }, least: { kind: 'minutes', value: 15 } },
    });
    expect(evaluate(valveRequest({ visit: { runningMinutes: 4 } })).overall.nextStep).toMatchObject({
      code: 'run-longer',
      figures: { minutes: { kind: 'minutes', value: 11 } },
    });
  });
});

describe('the conditions and instruments criteria', () => {
  it.each<[string, Changes, Finding, ReasonCode | null, 'passes' | 'fails' | null]>([
    ['recorded and met', {}, 'within', null, 'passes'],
    ['not met', { visit: { runningMinutes: 4 } }, 'not-verifiable', 'running-time', 'fails'],
    ['not recorded', { visit: { runningMinutes: null } }, 'not-judged', 'conditions-not-recorded', null],
  ])('conditions %s', (_, changes, finding, reason, byRule) => {
    expect(criterionOf(evaluate(valveRequest(changes)), 'conditions')).toMatchObject({
      finding,
      reason: reason === null ? null : { code: reason },
      byRule,
      required: false,
    });
  });

  it('instruments not recorded', () => {
    const result = evaluate(valveRequest({ visit: { instrumentsCheckedDaysAgo: null } }));
    expect(criterionOf(result, 'instruments')).toMatchObject({
      finding: 'not-judged',
      reason: { code: 'instruments-not-recorded' },
      byRule: null,
      required: false,
    });
  });
});
