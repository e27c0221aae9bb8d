import { TEMPERATURE_UNITS } from '@chargewright/engine';
import type * as z from 'zod';

/** What kind of value a field takes. */
export type ExpectedType = 'number' | 'text' | 'true-or-false' | 'object' | 'list';

/** A fault of the request's shape, found before anything is computed. */
export interface StructureFault {
  readonly kind:
    | 'missing'
    | 'null'
    | 'wrong-type'
    | 'unknown-value'
    | 'wrong-unit'
    | 'temperature-unit-on-difference'
    | 'too-long'
    | 'give-one-of'
    | 'give-only-one-of'
    | 'give-two-of'
    | 'give-only-two-of';
  /** Dotted, down to the field: an amount answers as one. Empty for the whole body. */
  readonly path: string;
  /** Dotted, down to the very part that is at fault. */
  readonly part: string;
  readonly expected?: ExpectedType;
  /** Values, units or names that would be right. */
  readonly allowed?: readonly string[];
}

/** Parts of an amount, which answers as one field. */
const AMOUNT_PARTS: readonly PropertyKey[] = ['value', 'unit', 'low', 'high'];

const EXPECTED_TYPES: Readonly<Record<string, ExpectedType>> = {
  number: 'number',
  string: 'text',
  boolean: 'true-or-false',
  object: 'object',
  array: 'list',
};

/** The fault a person is told for an issue of zod. */
export function structureFault(issue: z.core.$ZodIssue, input: unknown): StructureFault {
  const last = issue.path.at(-1);
  const holder = issue.path.at(-2);
  // the unit of a table is one field of it among others
  const inTable = typeof holder === 'number' || holder === 'makersChart';
  const inAmount = (issue.path.length > 1 && !inTable && AMOUNT_PARTS.includes(last ?? '')) || holder === 'plusMinus';
  const where = {
    path: (inAmount ? issue.path.slice(0, -1) : issue.path).join('.'),
    part: issue.path.join('.'),
  };
  const given = valueAt(input, issue.path);
  if (given === undefined) return { ...where, kind: 'missing' };
  // a body cannot be left out, so of a null only its type can be said
  if (given === null && last !== undefined) return { ...where, kind: 'null' };
  if (issue.code === 'invalid_type') {
    return { ...where, kind: 'wrong-type', expected: EXPECTED_TYPES[issue.expected] ?? 'object' };
  }
  if (issue.code === 'invalid_value') {
    const allowed = issue.values.map(String);
    return { ...where, kind: last === 'unit' ? wrongUnit(given, allowed) : 'unknown-value', allowed };
  }
  if (issue.code === 'too_big') return { ...where, kind: 'too-long' };
  throw new Error(`the contract has no fault for the zod issue ${issue.code} at ${where.part}`);
}

function wrongUnit(given: unknown, allowed: readonly string[]): StructureFault['kind'] {
  const isTemperature = TEMPERATURE_UNITS.some((unit) => unit === given);
  return isTemperature && allowed.includes('deltaF') ? 'temperature-unit-on-difference' : 'wrong-unit';
}

/** The value at a path, also through the rows of a table; undefined where there is none. */
export function valueAt(input: unknown, path: readonly PropertyKey[]): unknown {
  let value = input;
  for (const key of path) value = isContainer(value) && Object.hasOwn(value, key) ? value[key] : undefined;
  return value;
}

/** What has parts: an object or a list. */
export const isContainer = (value: unknown): value is Record<PropertyKey, unknown> =>
  typeof value === 'object' && value !== null;

export const isRecord = (value: unknown): value is Record<PropertyKey, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);
