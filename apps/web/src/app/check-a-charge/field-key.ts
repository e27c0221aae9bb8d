import type { ReadingId } from '@chargewright/engine';
import { READING_IDS } from '@chargewright/engine';
import { TYPED_FIELDS, type TypedField } from '@chargewright/contract/typed-fields';
import type { CheckDraft, FieldKey, TypedValue } from '../loose-checks/check-draft';

export const readingKey = (id: ReadingId): FieldKey => `reading:${id}`;
export const typedKey = (field: TypedField): FieldKey => `typed:${field}`;

export const ALL_FIELD_KEYS: readonly FieldKey[] = [...READING_IDS.map(readingKey), ...TYPED_FIELDS.map(typedKey)];

/** Where a field stands in a request, as faults name it. */
export function pathOf(key: FieldKey): string {
  const [family, name] = key.split(':') as ['reading' | 'typed', string];
  if (family === 'reading') return `readings.${name}`;
  return TYPED_PATHS[name as TypedField] ?? `setup.${name}`;
}

/** Where they do not stand in the setup by their own name. */
const TYPED_PATHS: Readonly<Partial<Record<TypedField, string>>> = {
  superheatLow: 'setup.superheatRange.low',
  superheatHigh: 'setup.superheatRange.high',
  lineLength: 'setup.lineSet.length',
  mostLineLength: 'setup.lineSet.mostLength',
  lift: 'setup.lineSet.lift',
  lowestReturnDryBulb: 'visit.lowestReturnDryBulb',
  instrumentsCheckedDaysAgo: 'visit.instrumentsCheckedDaysAgo',
  hoursOff: 'visit.hoursOff',
  addedThisVisit: 'visit.addedThisVisit',
  additionsOnEarlierVisits: 'visit.additionsOnEarlierVisits',
};

/** What stands in a field now: what is being typed, else what was committed. */
export function valueIn(draft: CheckDraft, key: FieldKey): TypedValue | undefined {
  const edit = draft.edits[key];
  if (edit) return edit;
  const name = key.slice(key.indexOf(':') + 1);
  return key.startsWith('reading:') ? draft.readings[name as ReadingId] : draft.typed[name as TypedField];
}
