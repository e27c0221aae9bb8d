/** A field of this page: what was typed, read as a number, and what to say where it is none. */
import { checkPageWords } from '@chargewright/wording';
import type { TypedValue } from '../loose-checks/check-draft';
import { parseNumber, type NumberProblem } from '../quantities/parse-number';

const PROBLEM_TEXTS: Readonly<Record<NumberProblem, string>> = {
  'not-a-number': checkPageWords.readings.notANumber,
  'too-long': checkPageWords.readings.tooLong,
  'thousands-mark': checkPageWords.readings.thousandsMark,
};

export interface ReadNumber {
  readonly value: number | undefined;
  readonly complaint: string;
}

export function readNumber(typed: TypedValue | undefined): ReadNumber {
  const parsed = parseNumber(typed?.text ?? '');
  if (parsed.state === 'problem') return { value: undefined, complaint: PROBLEM_TEXTS[parsed.problem] };
  return { value: parsed.state === 'number' ? parsed.number.value : undefined, complaint: '' };
}

export const isTypedValue = (stored: unknown): stored is TypedValue =>
  typeof stored === 'object' &&
  stored !== null &&
  'text' in stored &&
  'unit' in stored &&
  typeof stored.text === 'string' &&
  typeof stored.unit === 'string';

export const isBlank = (typed: TypedValue | undefined): boolean => (typed?.text ?? '').trim() === '';

/** The unit of one of these, else undefined: what was stored may be of an older version. */
export const unitAmong = <Unit extends string>(units: readonly Unit[], unit: string | undefined): Unit | undefined =>
  units.find((each) => each === unit);
