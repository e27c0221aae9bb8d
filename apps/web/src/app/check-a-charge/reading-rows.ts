/** What the page shows of each field: words, what was typed, how old it is, and what is wrong with it. */
import { TEST_READING_IDS, type Fault, type ReadingId } from '@chargewright/engine';
import {
  checkPageWords,
  faultText,
  formatTrimmed,
  readingWords,
  setupWords,
  unitLabel,
  type UnitSystem,
} from '@chargewright/wording';
import type { TypedField } from '@chargewright/contract/typed-fields';
import type { CheckDraft, FieldKey, TypedValue } from '../loose-checks/check-draft';
import { canBeNegative, systemOfUnit, unitsOf } from '../quantities/field-units';
import type { NumberProblem } from '../quantities/parse-number';
import type { Evaluation } from './evaluation';
import { pathOf, readingKey, valueIn } from './field-key';
import { ageSeconds } from './request-from-draft';

/** As the procedures have it: a reading older than this is stale. */
const STALE_AFTER_SECONDS = 600;

/** What a row shows. */
export interface RowView {
  /** Id of the input on the page. */
  readonly id: string;
  readonly label: string;
  readonly value: TypedValue | undefined;
  readonly units: readonly [string, ...string[]];
  readonly signed: boolean;
  /** Beside the label: the place while nothing is read, then how old it is. */
  readonly note: string;
  readonly stale: boolean;
  readonly complaints: readonly string[];
  /** The reading whose "where and how" can be opened; null for a number of setup or visit. */
  readonly reading: ReadingId | null;
}

export interface FieldView extends RowView {
  readonly key: FieldKey;
}

export const PROBLEM_TEXTS: Readonly<Record<NumberProblem, string>> = {
  'not-a-number': checkPageWords.readings.notANumber,
  'too-long': checkPageWords.readings.tooLong,
  'thousands-mark': checkPageWords.readings.thousandsMark,
};

export const inputId = (key: FieldKey): string => key.replace(':', '-');

const belongsTo = (fault: Fault, key: FieldKey): boolean => {
  const path = pathOf(key);
  // a fault of a range belongs to both of its ends
  return fault.path === path || fault.path.startsWith(`${path}.`) || path.startsWith(`${fault.path}.`);
};

/** What is wrong with a field, in words; an empty list when nothing is. */
export function complaintsOf(key: FieldKey, evaluation: Evaluation, system: UnitSystem): readonly string[] {
  const problem = evaluation.problems.get(key);
  const faults = evaluation.faults.filter((fault) => belongsTo(fault, key)).map((fault) => faultText(fault, system));
  return problem ? [PROBLEM_TEXTS[problem], ...faults] : faults;
}

export interface PageState {
  readonly draft: CheckDraft;
  readonly evaluation: Evaluation;
  readonly system: UnitSystem;
  readonly nowMs: number;
}

const blank = (value: TypedValue | undefined): boolean => (value?.text.trim() ?? '') === '';

export function fieldView(key: FieldKey, page: PageState): FieldView {
  const { draft, evaluation, system, nowMs } = page;
  const value = valueIn(draft, key);
  const shared = {
    key,
    id: inputId(key),
    value,
    units: unitsOf(key, system),
    signed: canBeNegative(key),
    complaints: complaintsOf(key, evaluation, value ? systemOfUnit(key, value.unit, system) : system),
  };
  const name = key.slice(key.indexOf(':') + 1);
  if (!key.startsWith('reading:')) {
    const { label, hint } = setupWords.numbers[name as TypedField];
    return { ...shared, label, note: hint, stale: false, reading: null };
  }
  const id = name as ReadingId;
  const words = readingWords[id];
  const brought = workedOut(draft, id);
  if (brought) return { ...shared, label: words.label, note: brought, stale: false, reading: id };
  const age = blank(value) ? undefined : ageSeconds(draft, id, nowMs);
  const stale = isStale(id, age);
  return { ...shared, label: words.label, note: noteOf(draft, key, id, age, words.place), stale, reading: id };
}

/** Brought from the airflow page, with its ±: it is one of blower and ducts and does not age as the weather does. */
function workedOut({ edits, readings }: CheckDraft, id: ReadingId): string | undefined {
  const reading = readings[id];
  if (!reading?.workedOut || edits[readingKey(id)]) return undefined;
  const plusMinus = `${formatTrimmed(reading.workedOut.plusMinus, 0)} ${unitLabel(reading.unit)}`;
  return checkPageWords.readings.workedOut(plusMinus);
}

/** A test holds until the next adjustment, and a reading from before is meant to be old. */
const AGELESS: ReadonlySet<ReadingId> = new Set([...TEST_READING_IDS, 'returnWetBulbBefore']);

const isStale = (id: ReadingId, age: number | undefined): boolean =>
  age !== undefined && age > STALE_AFTER_SECONDS && !AGELESS.has(id);

function noteOf(draft: CheckDraft, key: FieldKey, id: ReadingId, age: number | undefined, place: string): string {
  const words = checkPageWords.readings;
  if (age === undefined) return place;
  const minutes = Math.floor(age / 60);
  // Typed and left before it was committed, as by a dead battery: its age counts, not that it is in a field.
  if (draft.edits[key] && minutes < 1) return words.editing;
  if (isStale(id, age)) return words.staleAgo(minutes);
  return draft.readings[id]?.source === 'example' ? words.example : words.typedAgo(minutes);
}

/** Whether a reading still has to be taken: nothing stands there, it is too old, or it cannot be. */
export const isOpen = (view: FieldView): boolean => blank(view.value) || view.stale || view.complaints.length > 0;
