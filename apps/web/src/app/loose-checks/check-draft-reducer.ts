/** Commands to states, and states to what the page shows. Pure: the page and the phone's store apply the same commands by it. */
import { READING_IDS, TEST_READING_IDS, type ReadingId } from '@chargewright/engine';
import type { CheckCommand, CheckState, ExampleCheck, KnownEdit } from './check-command';
import type { TypedField } from '@chargewright/contract/typed-fields';
import type {
  CheckDraft,
  CheckSummary,
  DraftEdit,
  DraftReading,
  DraftVisit,
  FieldKey,
  TypedValue,
} from './check-draft';
import { READING_PLACES } from './reading-places';

type Field = { readonly reading: ReadingId } | { readonly typed: TypedField };

const fieldOf = (key: FieldKey): Field => {
  const name = key.slice(key.indexOf(':') + 1);
  return key.startsWith('reading:') ? { reading: name as ReadingId } : { typed: name as TypedField };
};

export const emptyCheck = (id: string, at: string): CheckState => ({
  id,
  createdAt: at,
  openedAt: at,
  updatedAt: at,
  setup: {},
  visit: { preflight: {} },
  typed: {},
  readings: [],
  retired: [],
  edits: {},
});

/** The last reading of a quantity since the last adjustment; a blank one says that the value was taken away. */
function lastReading(state: CheckState, quantity: ReadingId): DraftReading | undefined {
  const superseded = new Set(state.readings.map(({ supersedes }) => supersedes));
  return state.readings.findLast(
    ({ id, quantity: of }) => of === quantity && !superseded.has(id) && !state.retired.includes(id),
  );
}

function standingReadings(state: CheckState): Partial<Record<ReadingId, DraftReading>> {
  const standing: Partial<Record<ReadingId, DraftReading>> = {};
  for (const quantity of READING_IDS) {
    const last = lastReading(state, quantity);
    if (last && last.text.trim() !== '') standing[quantity] = last;
  }
  return standing;
}

function appendReading(
  state: CheckState,
  quantity: ReadingId,
  { text, unit }: TypedValue,
  { id, at, source, workedOut }: Pick<DraftReading, 'id' | 'source' | 'workedOut'> & { readonly at: string },
): CheckState {
  const before = lastReading(state, quantity);
  if (text.trim() === '' && (before === undefined || before.text.trim() === '')) return state;
  const reading: DraftReading = {
    id,
    checkId: state.id,
    quantity,
    text,
    unit,
    place: READING_PLACES[quantity],
    takenAt: at,
    source,
    ...(workedOut && { workedOut }),
    ...(before && { supersedes: before.id }),
  };
  return { ...state, readings: [...state.readings, reading] };
}

function setTyped(state: CheckState, field: TypedField, value: TypedValue): CheckState {
  const { [field]: _, ...others } = state.typed;
  return { ...state, typed: value.text.trim() === '' ? others : { ...others, [field]: value } };
}

function type(state: CheckState, key: FieldKey, value: TypedValue, edit: { id: string; at: string }): CheckState {
  const next: KnownEdit = {
    id: state.edits[key]?.id ?? edit.id,
    text: value.text,
    unit: value.unit,
    editedAt: edit.at,
  };
  return { ...state, edits: { ...state.edits, [key]: next } };
}

/** A reading is as old as its last keystroke: a value that a dead battery left in its field was not taken when somebody leaves the field at last. */
function commit(state: CheckState, key: FieldKey, id: string): CheckState {
  const { [key]: edit, ...edits } = state.edits;
  if (!edit) return state;
  const { text, unit, editedAt } = edit;
  const field = fieldOf(key);
  const without = { ...state, edits };
  return 'reading' in field
    ? appendReading(without, field.reading, { text, unit }, { id, at: editedAt, source: 'typed' })
    : setTyped(without, field.typed, { text, unit });
}

/** What is being typed in the field gives way to what was worked out. */
function bring(
  state: CheckState,
  { value, workedOut, readingId, at }: Extract<CheckCommand, { do: 'bring' }>,
): CheckState {
  const { 'reading:airflow': _, ...edits } = state.edits;
  return appendReading({ ...state, edits }, 'airflow', value, { id: readingId, at, source: 'typed', workedOut });
}

const mergeVisit = (visit: DraftVisit, patch: Partial<DraftVisit>): DraftVisit => ({
  ...visit,
  ...patch,
  preflight: { ...visit.preflight, ...patch.preflight },
});

function fill(state: CheckState, example: ExampleCheck, ids: readonly string[], at: string): CheckState {
  const quantities = READING_IDS.filter((quantity) => example.readings[quantity]);
  return quantities.reduce<CheckState>(
    (filled, quantity, index) => {
      const value = example.readings[quantity];
      const id = ids[index];
      return value && id ? appendReading(filled, quantity, value, { id, at, source: 'example' }) : filled;
    },
    {
      ...state,
      setup: { ...state.setup, ...example.setup },
      visit: mergeVisit(state.visit, example.visit ?? {}),
      typed: { ...state.typed, ...example.typed },
    },
  );
}

const retire = (state: CheckState): CheckState => ({ ...state, retired: state.readings.map(({ id }) => id) });

/** After an adjustment what was read does not count any more, nor what was seen in the separating tests. */
function retake(state: CheckState): CheckState {
  const { tests: _, ...visit } = state.visit;
  return retire({ ...state, visit });
}

const IN_TESTS: ReadonlySet<ReadingId> = new Set(TEST_READING_IDS);

/** What stands is set aside to be compared with, and asked again; the clock runs on. A separating test need not be made twice. */
function keepFirstSet(state: CheckState, at: string): CheckState {
  const readings = Object.fromEntries(
    Object.entries(standingReadings(state)).map(([id, { text, unit }]) => [id, { text, unit }]),
  );
  const again = state.readings.filter(({ id, quantity }) => !IN_TESTS.has(quantity) || state.retired.includes(id));
  const visit = { ...state.visit, firstSet: { takenAt: at, readings } };
  return { ...state, visit, retired: again.map(({ id }) => id) };
}

function forgetFirstSet(state: CheckState): CheckState {
  const { firstSet: _, ...visit } = state.visit;
  return { ...state, visit };
}

/** What stood before the adjustment stands again; what was read since then stays, too. */
function takeBackRetake(state: CheckState, before: Extract<CheckCommand, { do: 'take-back-retake' }>): CheckState {
  const { retired, runningSince, tests } = before;
  const { runningSince: _, ...visit } = state.visit;
  const stood = { ...(runningSince !== undefined && { runningSince }), ...(tests && { tests }) };
  return { ...state, retired, visit: { ...visit, ...stood } };
}

function restored(state: CheckState): CheckState {
  const { deletedAt: _, ...others } = state;
  return others;
}

function entered(state: CheckState, command: Exclude<CheckCommand, { do: 'open' | 'remove' }>): CheckState {
  switch (command.do) {
    case 'type':
      return type(state, command.field, command.value, { id: command.editId, at: command.at });
    case 'commit':
      return commit(state, command.field, command.readingId);
    case 'bring':
      return bring(state, command);
    case 'choose':
      return { ...state, setup: { ...state.setup, ...command.setup } };
    case 'visit':
      return { ...state, visit: mergeVisit(state.visit, command.patch) };
    case 'fill':
      return fill(state, command.example, command.readingIds, command.at);
    case 'keep-first-set':
      return keepFirstSet(state, command.at);
    case 'forget-first-set':
      return forgetFirstSet(state);
    case 'retake':
      return retake(state);
    case 'take-back-retake':
      return takeBackRetake(state, command);
    case 'restore':
      return state;
  }
}

/** The check after a command; without a state, the command is the first of a new check. */
export function applyCommand(state: CheckState | undefined, command: CheckCommand): CheckState {
  const before = state ?? emptyCheck(command.checkId, command.at);
  if (command.do === 'open') return { ...before, openedAt: command.at };
  if (command.do === 'remove') return { ...before, deletedAt: command.at };
  // Entering something brings a check back that another tab has removed: nothing typed is lost.
  return { ...restored(entered(before, command)), updatedAt: command.at };
}

const withoutId = ({ text, unit, editedAt }: KnownEdit): DraftEdit => ({ text, unit, editedAt });

/** What the page shows of a check. */
export const draftOf = (state: CheckState): CheckDraft => ({
  id: state.id,
  createdAt: state.createdAt,
  updatedAt: state.updatedAt,
  setup: state.setup,
  visit: state.visit,
  typed: state.typed,
  readings: standingReadings(state),
  edits: Object.fromEntries(Object.entries(state.edits).map(([key, edit]) => [key, withoutId(edit)])),
});

/** One line of the list of checks. */
export const summaryOf = (state: CheckState): CheckSummary => ({
  id: state.id,
  createdAt: state.createdAt,
  updatedAt: state.updatedAt,
  ...(state.setup.refrigerant !== undefined && { refrigerant: state.setup.refrigerant }),
  ...(state.setup.meteringDevice !== undefined && { meteringDevice: state.setup.meteringDevice }),
  readingCount: Object.keys(standingReadings(state)).length,
});

/** Nothing was chosen, typed or read yet. */
export const isEmpty = (state: CheckState): boolean =>
  state.readings.length === 0 &&
  Object.keys(state.edits).length === 0 &&
  Object.keys(state.typed).length === 0 &&
  Object.keys(state.setup).length === 0 &&
  Object.keys(state.visit).length === 1 &&
  Object.keys(state.visit.preflight).length === 0;
