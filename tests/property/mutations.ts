/** What hands and wires do to a request: readings dropped or swapped, numbers at a limit give or take the last digit, nonsense of the right type. */
import type { EvaluationRequest, ReadingId, ReadingsInput } from '@chargewright/engine';
import {
  FLOW_UNITS,
  PRESSURE_DIFFERENCE_UNITS,
  PRESSURE_UNITS,
  READING_DIMENSIONS,
  READING_IDS,
  STATIC_PRESSURE_UNITS,
  TEMPERATURE_UNITS,
} from '@chargewright/engine';
import fc from 'fast-check';
import { mixed } from './draws';
import { CHART_SLIPS, REPEATED, TOO_MANY, withSlip } from './makers-charts';

type Json = Record<string, unknown>;

/** Changes a copy of a request in place. */
type Mutation = (request: Json) => void;

/** Numbers that rules compare with, in the units people type; each stands for itself and both of its neighbours. */
const LIMITS = [
  0, 0.85, 1, 2, 3, 4, 5, 6, 7, 8, 10, 14, 15, 20, 25, 26, 28, 31, 32, 40, 45, 50, 55, 60, 65, 70, 75, 76, 80, 84, 95,
  100, 115, 160, 225, 250, 300, 350, 365, 370, 560, 600, 603, -459.67, -273.15, -14.695948775513, -1500, 18_000,
];
const NONSENSE = [
  NaN,
  Infinity,
  -Infinity,
  -0,
  Number.MIN_VALUE,
  Number.MAX_VALUE,
  -Number.MAX_VALUE,
  1e12,
  -1e12,
  1e9,
  2500,
  450,
  -5,
];

const READING_UNITS = [...TEMPERATURE_UNITS, ...PRESSURE_UNITS, ...FLOW_UNITS, ...STATIC_PRESSURE_UNITS, '%', 'A', 'V'];
const PLUS_MINUS_UNITS = [
  'deltaF',
  'deltaC',
  ...PRESSURE_DIFFERENCE_UNITS,
  ...FLOW_UNITS,
  '%',
  'inH2O',
  'Pa',
  'A',
  'V',
];

const bits = new Float64Array(1);
const words = new BigInt64Array(bits.buffer);

/** The double next to `value`, away from zero for `direction` 1. */
function neighbour(value: number, direction: 1 | -1): number {
  if (value === 0) return direction * Number.MIN_VALUE;
  bits[0] = value;
  words[0] = words[0]! + BigInt(direction);
  return bits[0];
}

const index = fc.nat({ max: 1_000_000 });
const pick = <T>(list: readonly T[], k: number): T | undefined => list[k % list.length];

const readingsOf = (request: Json): Record<string, Json> => request['readings'] as Record<string, Json>;

/** Every number of the request, as the object that holds it and its key. */
function numbersIn(value: unknown, found: (readonly [Json, string])[] = []): readonly (readonly [Json, string])[] {
  if (typeof value !== 'object' || value === null) return found;
  for (const [key, entry] of Object.entries(value)) {
    if (typeof entry === 'number') found.push([value as Json, key]);
    else numbersIn(entry, found);
  }
  return found;
}

const drop = index.map((k): Mutation => (request) => {
  const readings = readingsOf(request);
  const id = pick(Object.keys(readings), k);
  if (id !== undefined) delete readings[id];
});

/** Mostly two readings of one dimension, as on a sheet of paper; else any two, which a careless client may do. */
const swap = fc
  .tuple(index, index, mixed([9, fc.constant(true)], [1, fc.constant(false)]))
  .map(([j, k, alike]): Mutation => (request) => {
    const readings = readingsOf(request);
    const ids = Object.keys(readings) as ReadingId[];
    const a = pick(ids, j);
    const others = ids.filter((id) => !alike || (a !== undefined && READING_DIMENSIONS[id] === READING_DIMENSIONS[a]));
    const b = pick(others, k);
    if (a === undefined || b === undefined) return;
    const [first, second] = [readings[a]!, readings[b]!];
    readings[a] = second;
    readings[b] = first;
  });

const number = fc
  .tuple(index, fc.oneof(fc.constantFrom(...NONSENSE), limits()))
  .map(([k, value]): Mutation => (request) => {
    const place = pick(numbersIn(request), k);
    if (place !== undefined) place[0][place[1]] = value;
  });

function limits(): fc.Arbitrary<number> {
  return fc
    .tuple(fc.constantFrom(...LIMITS), fc.constantFrom<(1 | -1 | 0)[]>(-1, 0, 1))
    .map(([limit, direction]) => (direction === 0 ? limit : neighbour(limit, direction)));
}

/** A reading at a limit, which chance would seldom choose among all the numbers. */
const readingAtLimit = fc.tuple(index, limits()).map(([k, value]): Mutation => (request) => {
  const reading = pick(Object.values(readingsOf(request)), k);
  if (reading !== undefined) reading['value'] = value;
});

const unit = fc.tuple(index, index).map(([j, k]): Mutation => (request) => {
  const reading = pick(Object.values(readingsOf(request)), j);
  if (reading === undefined) return;
  const plusMinus = reading['plusMinus'] as Json | undefined;
  if (plusMinus !== undefined && k % 2 === 0) plusMinus['unit'] = pick(PLUS_MINUS_UNITS, k);
  else reading['unit'] = pick(READING_UNITS, k);
});

/** A reading that is at hand, given for another one of its dimension. */
const stray = fc.tuple(fc.constantFrom(...READING_IDS), index).map(([id, k]): Mutation => (request) => {
  const readings = readingsOf(request);
  const alike = (Object.keys(readings) as ReadingId[]).filter(
    (other) => READING_DIMENSIONS[other] === READING_DIMENSIONS[id],
  );
  const other = pick(alike, k);
  if (other !== undefined) readings[id] = { ...readings[other] };
});

const setup =
  (change: (setup: Json) => void): Mutation =>
  (request) =>
    change(request['setup'] as Json);

/** Fields whose mistakes are not numbers, or need two fields at once. */
const field = fc.constantFrom<Mutation[]>(
  setup((fields) => (fields['refrigerant'] = 'R-0')),
  (request) => (request['procedure'] = 'no-such-procedure'),
  setup((fields) => (fields['stationPressure'] = { value: 29.9, unit: 'psig' })),
  setup((fields) => (fields['stationPressure'] = { value: 200, unit: 'kPaa' })),
  setup((fields) => {
    fields['stationPressure'] = { value: 101.3, unit: 'kPaa' };
    fields['elevation'] = { value: 5280, unit: 'ft' };
  }),
  setup((fields) => (fields['elevation'] = { value: 60_000, unit: 'ft' })),
  setup((fields) => (fields['superheatRange'] = { low: 20, high: 8, unit: 'deltaF' })),
  setup((fields) => (fields['factoryCharge'] = { value: 0, unit: 'lb' })),
  (request) => (request['visit'] = {}),
  (request) => delete request['visit'],
);

/** A maker's table that was typed wrong. */
const table = fc.constantFrom<Mutation[]>(
  ...CHART_SLIPS.map((slip) => setup((fields) => withSlip(fields, slip))),
  setup((fields) => Object.assign(fields, structuredClone(REPEATED))),
  setup((fields) => Object.assign(fields, structuredClone(TOO_MANY))),
);

const mutation: fc.Arbitrary<Mutation> = mixed<Mutation>(
  [6, drop],
  [4, swap],
  [5, number],
  [5, readingAtLimit],
  [3, unit],
  [2, stray],
  [1, field],
  [1, table],
);

/** None, for as many systems as not, or up to three. */
export const mutations: fc.Arbitrary<readonly Mutation[]> = mixed<readonly Mutation[]>(
  [5, fc.constant([])],
  [3, mutation.map((one) => [one])],
  [2, fc.array(mutation, { minLength: 2, maxLength: 3 })],
);

/** The request after the mutations; the original stays as it was. Its shape is still that of a request, its units are at worst of another quantity. */
export function mutated(request: EvaluationRequest, changes: readonly Mutation[]): EvaluationRequest {
  if (changes.length === 0) return request;
  const copy = structuredClone(request);
  for (const change of changes) change(copy as unknown as Json);
  return copy;
}

export const withoutReadings = (request: EvaluationRequest): EvaluationRequest => {
  const { earlier: _, ...visit } = request.visit ?? {};
  return { ...request, visit, readings: {} satisfies ReadingsInput };
};
