/** What a person can do to a loose check. Times and ids are in the command, so that applying it twice, or on two tabs, gives the same. */
import type { ReadingId, TestObservations } from '@chargewright/engine';
import type { TypedField } from '@chargewright/contract/typed-fields';
import type { DraftEdit, DraftReading, DraftSetup, DraftVisit, FieldKey, TypedValue, WorkedOut } from './check-draft';

interface Told {
  readonly checkId: string;
  /** ISO 8601 in UTC. */
  readonly at: string;
}

export type CheckCommand = Told &
  (
    | { readonly do: 'open' }
    | { readonly do: 'type'; readonly field: FieldKey; readonly value: TypedValue; readonly editId: string }
    | { readonly do: 'commit'; readonly field: FieldKey; readonly readingId: string }
    | { readonly do: 'bring'; readonly value: TypedValue; readonly workedOut: WorkedOut; readonly readingId: string }
    | { readonly do: 'choose'; readonly setup: Partial<DraftSetup> }
    | { readonly do: 'visit'; readonly patch: Partial<DraftVisit> }
    | { readonly do: 'fill'; readonly example: ExampleCheck; readonly readingIds: readonly string[] }
    | { readonly do: 'keep-first-set' }
    | { readonly do: 'forget-first-set' }
    | { readonly do: 'retake' }
    | {
        readonly do: 'take-back-retake';
        readonly retired: readonly string[];
        readonly runningSince: string | undefined;
        readonly tests: TestObservations | undefined;
      }
    | { readonly do: 'remove' }
    | { readonly do: 'restore' }
  );

/** A check with everything filled in, to show what a finding looks like. */
export interface ExampleCheck {
  readonly setup: DraftSetup;
  readonly visit?: Partial<DraftVisit>;
  readonly typed?: Readonly<Partial<Record<TypedField, TypedValue>>>;
  readonly readings: Readonly<Partial<Record<ReadingId, TypedValue>>>;
}

/** An edit with the id of its row in the store. */
export interface KnownEdit extends DraftEdit {
  readonly id: string;
}

/** All that is known of one check: what `CheckDraft` shows, and what it leaves out (corrected readings, deletion). */
export interface CheckState {
  readonly id: string;
  readonly createdAt: string;
  readonly openedAt: string;
  readonly updatedAt: string;
  readonly deletedAt?: string;
  readonly setup: DraftSetup;
  readonly visit: DraftVisit;
  readonly typed: Readonly<Partial<Record<TypedField, TypedValue>>>;
  /** Every reading ever committed, in the order they were. */
  readonly readings: readonly DraftReading[];
  /** Ids of readings that an adjustment of the system made void; they stay in the history. */
  readonly retired: readonly string[];
  readonly edits: Readonly<Partial<Record<FieldKey, KnownEdit>>>;
}
