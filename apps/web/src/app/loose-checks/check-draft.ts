/**
 * A check on the page, as the person typed it. Text and unit are the truth; numbers are made from them when the engine is asked.
 * The same shapes are stored on the phone (see `@chargewright/contract/stored-check`).
 */
import type { TypedField } from '@chargewright/contract/typed-fields';
import type {
  AirflowMethod,
  AirflowPath,
  ChartPort,
  ChartUnit,
  HighSidePort,
  LeakSearch,
  MakersChartKind,
  MeteringDevice,
  Mode,
  PreflightItem,
  PreflightState,
  ProcedureId,
  ReadingId,
  Stage,
  SystemKind,
  TestObservations,
} from '@chargewright/engine';

/** What stands in a field: the text as typed and the unit it was typed in. */
export interface TypedValue {
  readonly text: string;
  readonly unit: string;
}

/** An edit that is not committed yet, and when its last key was pressed. */
export interface DraftEdit extends TypedValue {
  /** ISO 8601 in UTC. */
  readonly editedAt: string;
}

/** A field that can be typed into: a reading, or a number of the setup or visit. */
export type FieldKey = `reading:${ReadingId}` | `typed:${TypedField}`;

/** Whether an inverter runs in its maker's charge mode. */
export const CHARGE_MODES = ['on', 'off', 'no-inverter'] as const;
export type ChargeMode = (typeof CHARGE_MODES)[number];

/** Ports that a target subcooling can hold for. */
export const TARGET_PORTS = ['liquid', 'discharge'] as const satisfies readonly HighSidePort[];
export type TargetPort = (typeof TARGET_PORTS)[number];

/** How the airflow is shown; a path in its place only where the rules permit one. */
export const AIRFLOW_PROOFS = ['measured', 'duct-table', 'best-possible'] as const satisfies readonly (
  AirflowPath | 'measured'
)[];
export type AirflowProof = (typeof AIRFLOW_PROOFS)[number];

/** The choices of the setup; nothing is chosen for the person. */
export interface DraftSetup {
  readonly refrigerant?: string;
  readonly meteringDevice?: MeteringDevice;
  readonly mode?: Mode;
  readonly kind?: SystemKind;
  readonly stage?: Stage;
  readonly highSidePort?: HighSidePort;
  readonly targetSubcoolingPort?: TargetPort;
  readonly chargeMode?: ChargeMode;
  /** The rules the check is judged by; general rules where nothing is chosen. */
  readonly procedure?: ProcedureId;
  readonly alteration?: boolean;
  readonly highVelocity?: boolean;
  readonly airflowPath?: AirflowProof;
  /** What the maker prints for this unit, as typed. */
  readonly makersCharts?: readonly TypedChart[];
}

export interface TypedAxis {
  readonly unit: ChartUnit;
  readonly values: readonly string[];
}

/** A maker's table in the words of the person who types it off: it may be unfinished. */
export interface TypedChart extends Readonly<Partial<Record<ChartLimit, TypedValue>>> {
  readonly kind: MakersChartKind;
  /** Left out: one figure that always holds. */
  readonly rows?: TypedAxis;
  readonly columns?: TypedAxis;
  readonly unit: ChartUnit;
  readonly cells: readonly (readonly string[])[];
  readonly port?: ChartPort;
  readonly tolerance?: TypedValue;
}

/** Weather and house that the maker allows for a table. */
export const CHART_LIMITS = ['leastOutdoor', 'mostOutdoor', 'leastReturn', 'mostReturn'] as const;
export type ChartLimit = (typeof CHART_LIMITS)[number];

export interface DraftVisit {
  /** When the system was started or last adjusted, ISO 8601 in UTC: the visit clock. */
  readonly runningSince?: string;
  readonly preflight: Readonly<Partial<Record<PreflightItem, PreflightState>>>;
  readonly iceSeen?: boolean;
  readonly leakSearch?: LeakSearch;
  readonly commissioning?: boolean;
  /** The head was raised on purpose, by the maker's method. */
  readonly headRaised?: boolean;
  /** A set of readings kept to compare the next one with. */
  readonly firstSet?: FirstSet;
  /** What was done and seen in the separating tests. */
  readonly tests?: TestObservations;
}

export interface FirstSet {
  /** ISO 8601 in UTC. */
  readonly takenAt: string;
  readonly readings: Readonly<Partial<Record<ReadingId, TypedValue>>>;
}

/** Not shown by an instrument but found on the airflow page. */
export interface WorkedOut {
  readonly method: AirflowMethod;
  /** In the unit of the reading, k = 2. */
  readonly plusMinus: number;
}

/** One committed reading. Append-only: a correction is a new reading that supersedes an old one. */
export interface DraftReading {
  readonly id: string;
  readonly checkId: string;
  readonly quantity: ReadingId;
  readonly text: string;
  readonly unit: string;
  readonly place: string;
  /** ISO 8601 in UTC. */
  readonly takenAt: string;
  readonly source: 'typed' | 'example';
  readonly instrumentId?: string;
  readonly workedOut?: WorkedOut;
  readonly supersedes?: string;
}

export interface CheckDraft {
  readonly id: string;
  readonly createdAt: string;
  readonly updatedAt: string;
  readonly setup: DraftSetup;
  readonly visit: DraftVisit;
  /** Committed numbers of setup and visit. */
  readonly typed: Readonly<Partial<Record<TypedField, TypedValue>>>;
  /** The reading of each quantity that stands, after corrections. */
  readonly readings: Readonly<Partial<Record<ReadingId, DraftReading>>>;
  /** Typed and not committed yet: every keystroke lands here and is stored within a second. */
  readonly edits: Readonly<Partial<Record<FieldKey, DraftEdit>>>;
}

/** One line of the list of loose checks. */
export interface CheckSummary {
  readonly id: string;
  readonly createdAt: string;
  readonly updatedAt: string;
  readonly refrigerant?: string;
  readonly meteringDevice?: MeteringDevice;
  /** How many readings stand. */
  readonly readingCount: number;
}
