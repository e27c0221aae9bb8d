import { describe, expect, it } from 'vitest';
import { referenceTableSource } from '../../../packages/engine/generators/reference-table-source';
import {
  BLEND_RECORD_F,
  measureRefrigerants,
  RECORD_ROUNDING_F,
  TRADE_LIMITS,
  tradeDifferenceF,
  tradePoints,
} from './measure';

const rows = measureRefrigerants();

describe('saturation curves against their sources', () => {
  it.each(rows)('$quantity, $source: within $limit $unit', ({ max, limit }) => {
    expect(max).toBeLessThanOrEqual(limit);
  });

  it('looks at every state of the tables: bubble and dew of 67 refrigerants', () => {
    const [tables, nearCritical, boiling] = rows;
    const states = referenceTableSource().refrigerants.reduce((sum, refrigerant) => sum + refrigerant.states.length, 0);
    expect(states).toBe(4675 + 67 * 4);
    expect(tables!.n).toBe(2 * 4675);
    expect(nearCritical!.n).toBe(2 * 67 * 4);
    expect(boiling!.n).toBe(119);
  });
});

describe('saturation curves against printed charts', () => {
  const points = tradePoints();

  it('looks at every row and knows every source', () => {
    expect(points.filter(({ phase }) => phase === 'bubble')).toHaveLength(391);
    expect(new Set(points.map(({ source }) => source))).toEqual(new Set(Object.keys(TRADE_LIMITS)));
  });

  it('finds each published row as far from the model as its record says', () => {
    const recorded = points.filter(({ recordedDifferenceF }) => recordedDifferenceF !== undefined);
    expect(recorded).toHaveLength(263);
    for (const point of recorded) {
      const drift = Math.abs(tradeDifferenceF(point) - point.recordedDifferenceF!);
      const allowed =
        point.refrigerant === 'R-410A' || point.refrigerant === 'R-407C' ? BLEND_RECORD_F : RECORD_ROUNDING_F;
      if (!(drift <= allowed)) expect.fail(`${JSON.stringify(point)} drifts by ${drift} °F`);
    }
  });
});
