/**
 * Rows of a check as a phone keeps them. Every row is `{ id, kind, schema, body }`; a reading has the same shape in loose checks and in
 * records. Rows are parsed whenever they are read, since the store of a browser outlives the version of the page that wrote it.
 */
import {
  AIRFLOW_METHODS,
  AIRFLOW_PATHS,
  BULB_STATES,
  CHART_PORTS,
  CHART_UNITS,
  HIGH_SIDE_PORTS,
  LEAK_SEARCHES,
  MAKERS_CHART_KINDS,
  METERING_DEVICES,
  MODES,
  PREFLIGHT_ITEMS,
  PREFLIGHT_STATES,
  PROCEDURE_IDS,
  READING_IDS,
  STAGES,
  SYSTEM_KINDS,
  VALVE_MOVES,
} from '@chargewright/engine';
import type { ChartDimension } from '@chargewright/engine';
import * as z from 'zod';
import { TYPED_FIELDS } from './typed-fields';

// zod would try `new Function`, which the page's content security policy reports as a violation.
z.config({ jitless: true });

/** The version of the row shapes below; it rises with every change that older rows do not fulfil. */
export const STORED_CHECK_SCHEMA = 1;
/** Of worksheets. They came later: a page from before would set aside a row of a kind it does not know, but leaves a newer schema alone. */
export const STORED_WORKSHEET_SCHEMA = 2;
/** Pages that keep a sheet beside a check. */
export const WORKSHEET_PAGES = ['airflow', 'weigh-in'] as const;
export type WorksheetPage = (typeof WORKSHEET_PAGES)[number];

const MAX_TEXT = 200;
const MAX_READINGS = 10_000;
/** Room beyond what the engine takes, so that nothing typed is lost. */
const MOST_LINES = 60;
const MOST_TABLES = 20;

const id = z.uuidv7();
const text = z.string().max(MAX_TEXT);
const time = z.iso.datetime();
const typedValue = { text, unit: text };
const fieldKey = z.union([
  z.templateLiteral(['reading:', z.enum(READING_IDS)]),
  z.templateLiteral(['typed:', z.enum(TYPED_FIELDS)]),
]);

const chartUnit = z.enum(
  (Object.keys(CHART_UNITS) as ChartDimension[]).flatMap((dimension) => CHART_UNITS[dimension].units),
);
const lineOfTexts = z.array(text).max(MOST_LINES).readonly();
const typedAxis = z.object({ unit: chartUnit, values: lineOfTexts });

/** A maker's table as it is typed off, finished or not. */
const typedChart = z.object({
  kind: z.enum(MAKERS_CHART_KINDS),
  rows: z.exactOptional(typedAxis),
  columns: z.exactOptional(typedAxis),
  unit: chartUnit,
  cells: z.array(lineOfTexts).max(MOST_LINES).readonly(),
  port: z.exactOptional(z.enum(CHART_PORTS)),
  tolerance: z.exactOptional(z.object(typedValue)),
  leastOutdoor: z.exactOptional(z.object(typedValue)),
  mostOutdoor: z.exactOptional(z.object(typedValue)),
  leastReturn: z.exactOptional(z.object(typedValue)),
  mostReturn: z.exactOptional(z.object(typedValue)),
});

const setup = z.object({
  refrigerant: z.exactOptional(text),
  meteringDevice: z.exactOptional(z.enum(METERING_DEVICES)),
  mode: z.exactOptional(z.enum(MODES)),
  kind: z.exactOptional(z.enum(SYSTEM_KINDS)),
  stage: z.exactOptional(z.enum(STAGES)),
  highSidePort: z.exactOptional(z.enum(HIGH_SIDE_PORTS)),
  targetSubcoolingPort: z.exactOptional(z.enum(['liquid', 'discharge'])),
  chargeMode: z.exactOptional(z.enum(['on', 'off', 'no-inverter'])),
  procedure: z.exactOptional(z.enum(PROCEDURE_IDS)),
  alteration: z.exactOptional(z.boolean()),
  highVelocity: z.exactOptional(z.boolean()),
  airflowPath: z.exactOptional(z.enum([...AIRFLOW_PATHS, 'measured'])),
  makersCharts: z.exactOptional(z.array(typedChart).max(MOST_TABLES).readonly()),
});

const visit = z.object({
  runningSince: z.exactOptional(time),
  preflight: z.partialRecord(z.enum(PREFLIGHT_ITEMS), z.enum(PREFLIGHT_STATES)),
  iceSeen: z.exactOptional(z.boolean()),
  leakSearch: z.exactOptional(z.enum(LEAK_SEARCHES)),
  commissioning: z.exactOptional(z.boolean()),
  headRaised: z.exactOptional(z.boolean()),
  tests: z.exactOptional(
    z.object({
      liquidShutIn: z.exactOptional(z.boolean()),
      bulb: z.exactOptional(z.enum(BULB_STATES)),
      valve: z.exactOptional(z.enum(VALVE_MOVES)),
    }),
  ),
  firstSet: z.exactOptional(
    z.object({ takenAt: time, readings: z.partialRecord(z.enum(READING_IDS), z.object(typedValue)) }),
  ),
});

const row = <Kind extends string, Body extends z.ZodType>(kind: Kind, body: Body) =>
  z.object({ id, kind: z.literal(kind), schema: z.literal(STORED_CHECK_SCHEMA), body });

/** The check itself; its id is the row's. */
export const storedCheckRow = row(
  'check',
  z.object({
    createdAt: time,
    openedAt: time,
    updatedAt: time,
    deletedAt: z.exactOptional(time),
    setup,
    visit,
    typed: z.partialRecord(z.enum(TYPED_FIELDS), z.object(typedValue)),
    /** Readings that an adjustment of the system made void. */
    retired: z.array(id).max(MAX_READINGS),
    /** How many readings stand, kept here so that a list need not read them all. */
    readingCount: z.int().nonnegative(),
  }),
);

/** One committed value. Append-only: a correction is a new reading that names the one it supersedes; a blank text takes the value away. */
export const storedReadingRow = row(
  'reading',
  z.object({
    id,
    checkId: id,
    quantity: z.enum(READING_IDS),
    ...typedValue,
    place: text,
    takenAt: time,
    source: z.enum(['typed', 'example']),
    instrumentId: z.exactOptional(text),
    /** Not shown by an instrument but found on the airflow page: how, and its ± in the unit of the reading, k = 2. */
    workedOut: z.exactOptional(
      z.object({ method: z.enum(AIRFLOW_METHODS), plusMinus: z.number().nonnegative().max(1e9) }),
    ),
    supersedes: z.exactOptional(id),
  }),
);

/** What stands in a field and is not committed yet. */
export const storedEditRow = row('edit', z.object({ checkId: id, field: fieldKey, ...typedValue, editedAt: time }));

const MAX_FIELDS = 100;
const mostFields = (fields: object): boolean => Object.keys(fields).length <= MAX_FIELDS;

/** What stands on a page beside a check, as it was typed and chosen. */
export const storedWorksheetRow = z.object({
  id,
  kind: z.literal('worksheet'),
  schema: z.literal(STORED_WORKSHEET_SCHEMA),
  body: z.object({
    checkId: id,
    page: z.enum(WORKSHEET_PAGES),
    updatedAt: time,
    typed: z.record(text, z.object(typedValue)).refine(mostFields),
    choices: z.record(text, text).refine(mostFields),
    /** Of a table, a text a cell. */
    rows: z.array(z.array(text).max(MAX_FIELDS)).max(MAX_FIELDS),
  }),
});

export const storedRow = z.discriminatedUnion('kind', [
  storedCheckRow,
  storedReadingRow,
  storedEditRow,
  storedWorksheetRow,
]);

/** Whether a newer version of the page wrote a row: not this one's to judge. */
export function isNewerRow(row: unknown): boolean {
  if (typeof row !== 'object' || row === null || !('schema' in row) || typeof row.schema !== 'number') return false;
  const isWorksheet = 'kind' in row && row.kind === 'worksheet';
  return row.schema > (isWorksheet ? STORED_WORKSHEET_SCHEMA : STORED_CHECK_SCHEMA);
}

export type StoredCheckRow = z.infer<typeof storedCheckRow>;
export type StoredReadingRow = z.infer<typeof storedReadingRow>;
export type StoredEditRow = z.infer<typeof storedEditRow>;
export type StoredWorksheetRow = z.infer<typeof storedWorksheetRow>;
export type StoredRow = z.infer<typeof storedRow>;
