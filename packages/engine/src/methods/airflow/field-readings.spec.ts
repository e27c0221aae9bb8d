import { describe, expect, it } from 'vitest';
import { covariance } from '../../derivation/quantity';
import { ASSUMED_FIELD_LIMITS, FIELD_READING_IDS, fieldReading } from './field-readings';

describe('a field reading', () => {
  it('takes the assumed ± where none is stated: ±1 % of 240 V, ±0.5 s of a revolution', () => {
    expect(fieldReading('lineVoltage', { value: 240 }).u).toBeCloseTo(2.4 / Math.sqrt(3), 12);
    expect(fieldReading('gasRevolution', { value: 36 }).u).toBeCloseTo(0.5 / Math.sqrt(3), 12);
    expect(fieldReading('returnStaticPressure', { value: -60 }).u).toBeCloseTo((0.02 * 249.082) / Math.sqrt(3), 12);
  });

  it('takes the stated ± at its word, zero too', () => {
    expect(fieldReading('heaterCurrent', { value: 40, limit: 0.3 }).u).toBeCloseTo(0.3 / Math.sqrt(3), 12);
    expect(fieldReading('heaterCurrent', { value: 40, limit: 0 }).u).toBe(0);
  });

  it('shares the error of one instrument between the readings of a kind', () => {
    const [a, b] = (['returnStaticPressure', 'supplyStaticPressure'] as const).map((id) =>
      fieldReading(id, { value: 60, instrumentId: 'manometer' }),
    );
    expect(covariance(a!, b!)).toBeCloseTo(a!.u * b!.u, 12);
    expect(covariance(a!, fieldReading('supplyStaticPressure', { value: 60 }))).toBe(0);
  });

  it('names the standing of each assumed ±', () => {
    for (const id of FIELD_READING_IDS) expect(ASSUMED_FIELD_LIMITS[id].standing).toBe('choice');
  });
});
