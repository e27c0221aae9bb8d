import { describe, expect, it } from 'vitest';
import { deriveQuantities } from './derived-quantities';
import { isPullDown } from './pull-down';
import type { EvaluationRequest, ReadingsInput, VisitInput } from './request';
import type { Changes } from './testing/healthy-systems';
import { cautionCodes, evaluate, inputOf, orificeRequest } from './testing/healthy-systems';

function pullsDown(changes: Changes): boolean {
  const input = inputOf(orificeRequest(changes));
  return isPullDown(input, deriveQuantities(input.setup, input.readings));
}

const WARM = { returnDryBulb: 81, returnWetBulb: 68 };

/** The readings of the request some minutes ago, some of them changed. */
function earlierOf(
  request: EvaluationRequest,
  minutesAgo: number,
  changed: Readonly<Record<string, number>> = {},
): VisitInput['earlier'] {
  const readings = Object.fromEntries(
    Object.entries(request.readings).map(([id, reading]) => [
      id,
      { ...reading, value: reading.value + (changed[id] ?? 0) },
    ]),
  ) as ReadingsInput;
  return { minutesAgo, readings };
}

describe('pull-down', () => {
  it.each([
    [80, false],
    [80.01, true],
  ])('with return air at %d °F and no other set: %s', (returnDryBulb, pullDown) => {
    expect(pullsDown({ readings: { returnDryBulb } })).toBe(pullDown);
  });

  it.each([
    [2, 70, true],
    [1.9, 70, false],
    [2, 66, false],
  ])('off for %d hours with a wet bulb of %d °F at 76 °F: %s', (hoursOff, returnWetBulb, pullDown) => {
    // 66 °F are 59 % relative humidity, 70 °F 74 %
    expect(pullsDown({ visit: { hoursOff }, readings: { returnWetBulb } })).toBe(pullDown);
  });

  it('ends with a second set five minutes later that agrees', () => {
    const request = orificeRequest({ readings: WARM });
    expect(pullsDown({ readings: WARM, visit: { earlier: earlierOf(request, 5)! } })).toBe(false);
    expect(pullsDown({ readings: WARM, visit: { earlier: earlierOf(request, 4.9)! } })).toBe(true);
  });

  it('does not end with a second set that leaves out something read now', () => {
    const { returnWetBulb: _, ...readings } = orificeRequest({ readings: WARM }).readings;
    expect(pullsDown({ readings: WARM, visit: { earlier: { minutesAgo: 6, readings } } })).toBe(true);
    expect(pullsDown({ readings: WARM, visit: { earlier: { minutesAgo: 6, readings: {} } } })).toBe(true);
    expect(pullsDown({ visit: { earlier: { minutesAgo: 6, readings: {} } } })).toBe(false);
  });

  it.each([
    ['wet bulb', { returnWetBulb: 0.5 }, false],
    ['wet bulb', { returnWetBulb: 0.51 }, true],
    ['wet bulb', { returnWetBulb: -0.51 }, true],
    ['return air', { returnDryBulb: 1, supplyDryBulb: 1 }, false],
    ['return air', { returnDryBulb: 1.01, supplyDryBulb: 1 }, true],
    ['split', { supplyDryBulb: 1 }, false],
    ['split', { supplyDryBulb: 1.01 }, true],
    ['superheat', { suctionLineTemperature: 1 }, false],
    ['superheat', { suctionLineTemperature: -1.01 }, true],
    ['subcooling', { liquidLineTemperature: 1 }, false],
    ['subcooling', { liquidLineTemperature: 1.01 }, true],
  ])('%s that moved (%j) in five minutes: %s', (_, moved, pullDown) => {
    const earlier = earlierOf(orificeRequest(), 5, moved);
    expect(pullsDown({ visit: { earlier: earlier! } })).toBe(pullDown);
  });

  it('shows a move at once, also before five minutes are over', () => {
    const earlier = earlierOf(orificeRequest(), 2, { returnWetBulb: 2 });
    expect(pullsDown({ visit: { earlier: earlier! } })).toBe(true);
  });

  it('is a caution, and asks for two sets', () => {
    const result = evaluate(orificeRequest({ readings: { ...WARM, supplyDryBulb: 61.5 } }));
    expect(cautionCodes(result)).toContain('pull-down');
    expect(result.overall.nextStep.code).toBe('read-twice');
  });
});
