import { describe, expect, it } from 'vitest';
import { leaf } from '../derivation/quantity';
import { differenceToK } from '../units';
import { judgeConformance, LIMIT_SLACK_K } from './conformance';
import type { Decision } from './procedure';
import { plainRule } from './procedure';

type JudgeArguments = [value: number, u: number, low?: number | null, high?: number | null, noTarget?: number];

const judgeBy = (
  type: Decision['type'],
  value: number,
  u: number,
  low: number | null = -3,
  high: number | null = 3,
  noTarget = 0,
) =>
  judgeConformance({
    measured: leaf({
      id: 'deviation',
      kind: 'differenceK',
      value,
      origin: 'reading',
      parts: u === 0 ? [] : [{ key: 'deviation', u, shape: 'normal' }],
    }),
    tolerance: { low, high, floored: false, source: 'procedure' },
    decision: { type, clearFrom: plainRule(0.8, '0.80', ['choice', 'the specs']) },
    probabilityOfNoTarget: noTarget,
  });

const judge = (...[value, u, low, high, noTarget]: JudgeArguments) => judgeBy('guarded', value, u, low, high, noTarget);
const judgeSimply = (...[value, u, low, high, noTarget]: JudgeArguments) =>
  judgeBy('simple', value, u, low, high, noTarget);

describe('by the rule', () => {
  it('limits pass, and what lies beyond them by more than the slack fails', () => {
    for (const value of [-3, 3, 3 + LIMIT_SLACK_K / 2, -3 - LIMIT_SLACK_K / 2])
      expect(judge(value, 0).byRule).toBe('passes');
    for (const value of [-3 - 3e-9, 3 + 3e-9]) expect(judge(value, 0).byRule).toBe('fails');
  });

  it('every deviation of exactly 5 °F passes a tolerance of 5 °F, whatever the doubles of kelvin make of it', () => {
    const limit = differenceToK(5, 'deltaF');
    for (let target = 5; target < 205; target++) {
      const deviation = differenceToK(target + 5, 'deltaF') - differenceToK(target, 'deltaF');
      expect(judge(deviation, 0, -limit, limit)).toMatchObject({
        byRule: 'passes',
        probabilityWithin: 1,
        finding: 'within',
      });
    }
  });

  it('does not depend on the uncertainty', () => {
    expect(judge(2.9, 50).byRule).toBe('passes');
    expect(judge(3.1, 50).byRule).toBe('fails');
  });
});

describe('probability', () => {
  // standard normal table: Φ(1) = 0.841345, Φ(2) = 0.977250, Φ(3) = 0.998650
  it('is that of the normal distribution between the limits', () => {
    expect(judge(0, 1).probabilityWithin).toBeCloseTo(2 * 0.99865 - 1, 5);
    expect(judge(2, 1).probabilityWithin).toBeCloseTo(0.841345, 5);
    expect(judge(3, 1).probabilityWithin).toBeCloseTo(0.5, 5);
    expect(judge(5, 1).probabilityWithin).toBeCloseTo(1 - 0.97725, 5);
  });

  it('is one-sided where one limit is open', () => {
    expect(judge(1, 1, 0, null).probabilityWithin).toBeCloseTo(0.841345, 5);
    expect(judge(1, 1, null, 0).probabilityWithin).toBeCloseTo(1 - 0.841345, 5);
  });

  it('of an exact deviation is 0 or 1', () => {
    expect(judge(2.9, 0)).toEqual({
      byRule: 'passes',
      probabilityWithin: 1,
      onlyJust: false,
      finding: 'within',
    });
    expect(judge(3.1, 0)).toEqual({
      byRule: 'fails',
      probabilityWithin: 0,
      onlyJust: false,
      finding: 'above',
    });
    expect(judge(-3.1, 0).finding).toBe('below');
  });

  it('counts a target that may not exist as not within, but not as outside', () => {
    expect(judge(0, 0.1, -3, 3, 0.15)).toMatchObject({ finding: 'within' });
    expect(judge(0, 0.1, -3, 3, 0.15).probabilityWithin).toBeCloseTo(0.85, 10);
    expect(judge(0, 0.1, -3, 3, 0.25).finding).toBe('too-close-to-call');
    expect(judge(0, 0.1, -3, 3, 0.95).finding).toBe('too-close-to-call');
    expect(judge(9, 0.1, -3, 3, 0.95).finding).toBe('above');
  });
});

describe('guarded finding', () => {
  // Φ(0.8416) = 0.80: the guard stands 0.8416 u inside and outside the limit
  it.each([
    [3 - 0.85, 'within'],
    [3 - 0.83, 'too-close-to-call'],
    [3, 'too-close-to-call'],
    [3 + 0.83, 'too-close-to-call'],
    [3 + 0.85, 'above'],
    [-3 + 0.85, 'within'],
    [-3 + 0.83, 'too-close-to-call'],
    [-3 - 0.83, 'too-close-to-call'],
    [-3 - 0.85, 'below'],
  ])('of %d with u = 1 in a band of ±3 is %s', (value, finding) => {
    expect(judge(value, 1).finding).toBe(finding);
  });

  it('of a one-sided limit has one side', () => {
    expect(judge(-0.85, 1, 0, null).finding).toBe('below');
    expect(judge(0.85, 1, 0, null).finding).toBe('within');
    expect(judge(100, 1, 0, null).finding).toBe('within');
    expect(judge(0.85, 1, null, 0).finding).toBe('above');
  });

  it('calls no side when the instrument cannot tell the sides apart, though the band is improbable', () => {
    expect(judge(0, 20).probabilityWithin).toBeLessThan(0.2);
    expect(judge(0, 20).finding).toBe('too-close-to-call');
    expect(judge(2, 20).finding).toBe('too-close-to-call');
    expect(judge(5, 40).finding).toBe('too-close-to-call');
    expect(judge(-5, 40).finding).toBe('too-close-to-call');
    expect(judge(40, 40).finding).toBe('above');
    expect(judge(-40, 40).finding).toBe('below');
  });

  it('never says outside of what passes by the rule, nor within of what fails', () => {
    for (const u of [0, 1e-12, 0.01, 0.5, 1, 3, 10, 100])
      for (let value = -8; value <= 8; value += 0.25) {
        const { byRule, finding } = judge(value, u);
        if (finding === 'within') expect(byRule).toBe('passes');
        if (finding === 'above' || finding === 'below') expect(byRule).toBe('fails');
      }
  });

  it('with wider uncertainty never becomes within', () => {
    for (let value = -6; value <= 6; value += 0.25) {
      let wasWithin = true;
      for (let u = 0.01; u < 50; u *= 1.3) {
        const within = judge(value, u).finding === 'within';
        expect(within && !wasWithin).toBe(false);
        wasWithin = within;
      }
    }
  });
});

describe('simple finding', () => {
  // the certainty of either answer is 0.80 at 0.8416 u from the limit
  it.each([
    [0, 'within', false],
    [3 - 0.85, 'within', false],
    [3 - 0.83, 'within', true],
    [3, 'within', true],
    [3 + 0.01, 'above', true],
    [3 + 0.83, 'above', true],
    [3 + 0.85, 'above', false],
    [-3 + 0.83, 'within', true],
    [-3, 'within', true],
    [-3 - 0.01, 'below', true],
    [-3 - 0.85, 'below', false],
  ])('of %d with u = 1 in a band of ±3 is %s, only just: %s', (value, finding, onlyJust) => {
    expect(judgeSimply(value, 1)).toMatchObject({ finding, onlyJust });
  });

  it('follows the rule whatever the uncertainty and the doubt about the target', () => {
    for (const u of [0, 0.01, 1, 10, 100])
      for (const noTarget of [0, 0.19, 0.9])
        for (let value = -8; value <= 8; value += 0.25) {
          const { byRule, finding, onlyJust } = judgeSimply(value, u, -3, 3, noTarget);
          expect(byRule).toBe(Math.abs(value) <= 3 ? 'passes' : 'fails');
          expect(finding).toBe(value > 3 ? 'above' : value < -3 ? 'below' : 'within');
          if (u === 0 && noTarget < 0.2) expect(onlyJust).toBe(false);
        }
  });

  it('is the surer of a pass the less a target is in doubt; of a fail the doubt takes nothing', () => {
    expect(judgeSimply(0, 0.1, -3, 3, 0.19).onlyJust).toBe(false);
    expect(judgeSimply(0, 0.1, -3, 3, 0.21).onlyJust).toBe(true);
    expect(judgeSimply(9, 0.1, -3, 3, 0.9).onlyJust).toBe(false);
  });

  it('within limits that contradict each other nothing passes', () => {
    for (const value of [25.2, 24, 27]) {
      expect(judgeSimply(value, 1, 26, 25)).toMatchObject({ byRule: 'fails', probabilityWithin: 0, onlyJust: false });
      expect(judge(value, 1, 26, 25).finding).not.toBe('within');
    }
  });
});

describe('a mean shifted by a kink', () => {
  const shifted = (value: number, u: number, meanShift: number) => {
    const measured = leaf({
      id: 'deviation',
      kind: 'differenceK',
      value,
      origin: 'reading',
      parts: [{ key: 'deviation', u, shape: 'normal' }],
    });
    return judgeConformance({
      measured: { ...measured, meanShift },
      tolerance: { low: -3, high: 3, floored: false, source: 'procedure' },
      decision: { type: 'guarded', clearFrom: plainRule(0.8, '0.80', ['choice', 'the specs']) },
    });
  };

  it('counts in the probability, not by the rule', () => {
    // Φ(1) = 0.841345
    expect(shifted(2.5, 1, -0.5)).toMatchObject({ byRule: 'passes' });
    expect(shifted(2.5, 1, -0.5).probabilityWithin).toBeCloseTo(0.841345, 5);
    expect(shifted(3.1, 1, -1.1).byRule).toBe('fails');
  });

  it('takes the finding within away, and never gives it', () => {
    expect(shifted(2.1, 1, 0).finding).toBe('within');
    expect(shifted(2.1, 1, 0.2).finding).toBe('too-close-to-call');
    expect(shifted(2.2, 1, -0.5).finding).toBe('too-close-to-call');
  });
});
