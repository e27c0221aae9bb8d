/** A request with wider ±: of one reading, now or earlier, or of all of them. Readings by one instrument share its error, so they widen together. */
import type { EvaluationRequest, ReadingInput, ReadingsInput } from '@chargewright/engine';
import fc from 'fast-check';
import { mixed } from './draws';

export interface Widening {
  readonly factor: number;
  /** Which reading, by its place among all of them; `null` for all. */
  readonly which: number | null;
}

export const widening: fc.Arbitrary<Widening> = fc.record({
  factor: fc.integer({ min: 1, max: 3000 }).map((k) => 1 + k / 1000),
  which: mixed<number | null>([2, fc.nat({ max: 1000 })], [1, fc.constant(null)]),
});

export function widened(request: EvaluationRequest, { factor, which }: Widening): EvaluationRequest {
  const earlier = request.visit?.earlier;
  const readings = Object.values(request.readings);
  const all = [...readings, ...Object.values(earlier?.readings ?? {})];
  const one = which === null ? undefined : all[which % Math.max(all.length, 1)];
  const isMeant = (reading: ReadingInput): boolean =>
    which === null || reading === one || (one?.instrumentId !== undefined && reading.instrumentId === one.instrumentId);
  const widen = (from: ReadingsInput): ReadingsInput =>
    Object.fromEntries(
      Object.entries(from).map(([id, reading]) => [id, isMeant(reading) ? scaled(reading, factor) : reading]),
    );
  return {
    ...request,
    ...(request.visit && {
      visit: { ...request.visit, ...(earlier && { earlier: { ...earlier, readings: widen(earlier.readings) } }) },
    }),
    readings: widen(request.readings),
  };
}

function scaled(reading: ReadingInput, factor: number): ReadingInput {
  const { plusMinus } = reading;
  return plusMinus === undefined
    ? reading
    : { ...reading, plusMinus: { ...plusMinus, value: factor * plusMinus.value } };
}
