/** A check's state as rows of the phone's store, and back. Pure. */
import type { StoredCheckRow, StoredEditRow, StoredReadingRow, StoredRow } from '@chargewright/contract/stored-check';
import type { CheckState, KnownEdit } from './check-command';
import type { DraftReading, FieldKey } from './check-draft';
import { emptyCheck, summaryOf } from './check-draft-reducer';

const SCHEMA = 1;

export const checkRow = (state: CheckState): StoredCheckRow => {
  const { createdAt, openedAt, updatedAt, deletedAt, setup, visit, typed, retired } = state;
  return {
    id: state.id,
    kind: 'check',
    schema: SCHEMA,
    body: {
      createdAt,
      openedAt,
      updatedAt,
      ...(deletedAt !== undefined && { deletedAt }),
      setup,
      visit,
      typed,
      retired: [...retired],
      readingCount: summaryOf(state).readingCount,
    },
  };
};

const readingRow = (body: DraftReading): StoredReadingRow => ({ id: body.id, kind: 'reading', schema: SCHEMA, body });

const editRow = (checkId: string, field: FieldKey, edit: KnownEdit): StoredEditRow => {
  const { id, text, unit, editedAt } = edit;
  return { id, kind: 'edit', schema: SCHEMA, body: { checkId, field, text, unit, editedAt } };
};

const editsOf = (state: CheckState | undefined) => Object.entries(state?.edits ?? {}) as [FieldKey, KnownEdit][];

/** What has to be written, and which rows fall away, for the store to hold `after` in place of `before`. */
export function rowChanges(
  before: CheckState | undefined,
  after: CheckState,
): { readonly puts: readonly StoredRow[]; readonly deletes: readonly string[] } {
  const known = new Set(before?.readings.map(({ id }) => id));
  const kept = new Set(editsOf(after).map(([, { id }]) => id));
  return {
    puts: [
      checkRow(after),
      ...after.readings.filter(({ id }) => !known.has(id)).map(readingRow),
      ...editsOf(after)
        .filter(([field, edit]) => before?.edits[field] !== edit)
        .map(([field, edit]) => editRow(after.id, field, edit)),
    ],
    deletes: editsOf(before)
      .map(([, { id }]) => id)
      .filter((id) => !kept.has(id)),
  };
}

/** In the order they were committed: the ids are UUIDv7. A reading can have been typed before another and committed after it. */
const byId = (a: DraftReading, b: DraftReading) => (a.id < b.id ? -1 : 1);

/** Stands in for the lost row of a check. */
function salvaged(checkId: string, times: readonly string[]): CheckState | undefined {
  const [first, last] = [times[0], times.at(-1)];
  if (first === undefined || last === undefined) return undefined;
  return { ...emptyCheck(checkId, first), openedAt: last, updatedAt: last };
}

/** The state of one check from its rows; readings and edits stand even where the row of the check itself is lost. */
export function stateFromRows(checkId: string, rows: readonly StoredRow[]): CheckState | undefined {
  const check = rows.find((row) => row.kind === 'check');
  const readings = rows.filter((row) => row.kind === 'reading').map(({ body }) => body);
  const edits = rows.filter((row) => row.kind === 'edit').sort((a, b) => (a.body.editedAt < b.body.editedAt ? -1 : 1));
  const times = [...readings.map(({ takenAt }) => takenAt), ...edits.map(({ body }) => body.editedAt)].sort();
  const own = check?.body ?? salvaged(checkId, times);
  if (!own) return undefined;
  return {
    id: checkId,
    createdAt: own.createdAt,
    openedAt: own.openedAt,
    updatedAt: own.updatedAt,
    ...(own.deletedAt !== undefined && { deletedAt: own.deletedAt }),
    setup: own.setup,
    visit: own.visit,
    typed: own.typed,
    retired: own.retired,
    readings: readings.sort(byId),
    edits: Object.fromEntries(
      edits.map(({ id, body: { field, text, unit, editedAt } }) => [field, { id, text, unit, editedAt }]),
    ),
  };
}
