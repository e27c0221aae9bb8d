import type { TargetRange } from '@chargewright/engine';
import { temperatureToK } from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import { targetRangePhrase } from './english/target-ranges';
import { targetRangeWords } from './target-range-words';
import type { UnitSystem } from './unit-system';

const degF = (value: number) => temperatureToK(value, 'degF');
const range = (change: Partial<TargetRange> = {}): TargetRange => ({
  along: 'outdoorDryBulb',
  lowK: degF(55),
  highK: degF(95),
  presentK: degF(100),
  at: { condition: 'returnWetBulb', valueK: degF(64) },
  ...change,
});
const phrases = (ranges: readonly TargetRange[], system: UnitSystem = 'F-psi') =>
  targetRangeWords(ranges, system).map(targetRangePhrase);

describe('a range of conditions with a target', () => {
  it('is said with what has to change', () => {
    expect(phrases([range()])).toEqual([
      'at 64 °F wet bulb from 55 to 95 °F outdoors (come early or late, when it is cooler)',
    ]);
    expect(phrases([range({ presentK: degF(50), at: null })])).toEqual([
      'from 55 to 95 °F outdoors (come when it is warmer)',
    ]);
    expect(phrases([range({ presentK: degF(95), at: null })])).toEqual(['from 55 to 95 °F outdoors']);
  });

  it('holds whole degrees that lie inside it, in either unit', () => {
    expect(phrases([range({ highK: degF(91.7) })])[0]).toContain('from 55 to 91 °F');
    // 12.8 to 33.2 °C
    expect(phrases([range({ highK: degF(91.7) })], 'C-kPa')[0]).toContain('at 17.8 °C wet bulb from 13 to 33 °C');
  });

  it('is left out where no whole degree lies inside', () => {
    expect(phrases([range({ lowK: degF(95.2), highK: degF(95.9) })])).toEqual([]);
  });
});
