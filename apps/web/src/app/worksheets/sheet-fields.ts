/** Fields of a sheet: what each holds, what stands in it, and what is wrong with it. */
import type { FieldFault } from '@chargewright/engine';
import { fieldFaultText, worksheetWords, type InputWords, type UnitSystem } from '@chargewright/wording';
import type { RowView } from '../check-a-charge/reading-rows';
import { PROBLEM_TEXTS } from '../check-a-charge/reading-rows';
import type { TypedValue } from '../loose-checks/check-draft';
import type { Worksheet } from '../loose-checks/worksheet';
import { parseNumber, type TypedNumber } from '../quantities/parse-number';

export type SheetDimension =
  | 'temperature'
  | 'humidity'
  | 'percent'
  | 'airflow'
  | 'voltage'
  | 'current'
  | 'heat'
  | 'gasVolume'
  | 'seconds'
  | 'heatingValue'
  | 'staticPressure'
  | 'elevation'
  | 'power'
  | 'length'
  | 'rate'
  | 'mass'
  | 'ounces'
  | 'vacuum'
  | 'minutes';

type Units = readonly [string, ...string[]];

const INCH_POUND: Readonly<Record<SheetDimension, Units>> = {
  temperature: ['degF'],
  humidity: ['%'],
  percent: ['%'],
  airflow: ['cfm'],
  voltage: ['V'],
  current: ['A'],
  heat: ['W'],
  gasVolume: ['ft3'],
  seconds: ['s'],
  heatingValue: ['Btu/ft3'],
  staticPressure: ['inH2O'],
  elevation: ['ft'],
  power: ['ton', 'Btu/h'],
  length: ['ft'],
  rate: ['oz/ft'],
  mass: ['oz', 'lb'],
  ounces: ['oz'],
  vacuum: ['micron'],
  minutes: ['min'],
};

const METRIC: Readonly<Record<SheetDimension, Units>> = {
  ...INCH_POUND,
  temperature: ['degC'],
  airflow: ['m3/h', 'L/s'],
  gasVolume: ['m3'],
  heatingValue: ['MJ/m3'],
  staticPressure: ['Pa'],
  elevation: ['m'],
  power: ['kW'],
  length: ['m'],
  rate: ['g/m'],
  mass: ['g', 'kg'],
  vacuum: ['micron', 'Pa'],
};

export const sheetUnits = (dimension: SheetDimension, system: UnitSystem): Units =>
  (system === 'F-psi' ? INCH_POUND : METRIC)[dimension];

/** Whether a stored unit belongs to a dimension: a damaged entry is left out instead of misread. */
const isUnitOf = (dimension: SheetDimension, unit: string): boolean =>
  INCH_POUND[dimension].includes(unit) || METRIC[dimension].includes(unit);

/** One field of a sheet. */
export interface SheetField {
  /** In the sheet, and of the input on the page. */
  readonly key: string;
  readonly words: InputWords;
  readonly dimension: SheetDimension;
  readonly signed?: boolean;
  readonly optional?: boolean;
  /** Where the request has it; a fault there belongs to this field. */
  readonly path: string;
}

/** A sheet with what the open check already knows; what was typed here outranks it. */
export interface FilledSheet {
  readonly sheet: Worksheet;
  readonly known: Readonly<Record<string, TypedValue>>;
}

export const valueOf = ({ sheet, known }: FilledSheet, key: string): TypedValue | undefined =>
  sheet.typed[key] ?? known[key];

const isFromCheck = ({ sheet, known }: FilledSheet, key: string): boolean =>
  sheet.typed[key] === undefined && known[key] !== undefined;

export interface SheetRow extends RowView {
  readonly key: string;
  readonly optional: boolean;
}

export interface SheetState {
  readonly filled: FilledSheet;
  readonly faults: readonly FieldFault[];
  readonly system: UnitSystem;
}

/** The rows of some fields. A fault of a part (`airflow.plusMinus`) belongs to the field of that part, where it has one. */
export function sheetRows(fields: readonly SheetField[], state: SheetState): readonly SheetRow[] {
  const paths = new Set(fields.map(({ path }) => path));
  return fields.map((field) => {
    const faults = state.faults.filter(
      ({ path }) => path === field.path || (path.startsWith(`${field.path}.`) && !paths.has(path)),
    );
    return sheetRow(field, { ...state, faults });
  });
}

function sheetRow(field: SheetField, { filled, faults, system }: SheetState): SheetRow {
  const { key, words, dimension } = field;
  const value = valueOf(filled, key);
  const parsed = value && parseNumber(value.text);
  return {
    key,
    id: `sheet-${key}`,
    label: words.label,
    value,
    units: sheetUnits(dimension, system),
    signed: field.signed ?? dimension === 'temperature',
    note: isFromCheck(filled, key) ? fromCheckNote(words.hint) : words.hint,
    stale: false,
    complaints: [
      ...(parsed?.state === 'problem' ? [PROBLEM_TEXTS[parsed.problem]] : []),
      ...faults.map((fault) => fieldFaultText(fault, system)),
    ],
    reading: null,
    optional: field.optional ?? false,
  };
}

const fromCheckNote = (hint: string): string =>
  hint === '' ? worksheetWords.fromCheck : `${worksheetWords.fromCheck}. ${hint}`;

export interface Entry extends TypedNumber {
  readonly unit: string;
}

/** The number in a field with its unit; undefined where there is none, or none of its kind. */
export function entryOf(
  filled: FilledSheet,
  { key, dimension }: Pick<SheetField, 'key' | 'dimension'>,
): Entry | undefined {
  const value = valueOf(filled, key);
  const parsed = value && parseNumber(value.text);
  if (parsed?.state !== 'number' || !isUnitOf(dimension, value!.unit)) return undefined;
  return { ...parsed.number, unit: value!.unit };
}

/** A typed number for a request. The dimension has held the unit to those of its name, which a type by name cannot know. */
export interface SheetAmount extends TypedNumber {
  readonly unit: never;
}

/** What stands in the fields as numbers, by the paths of a request. */
export function amountsOf(filled: FilledSheet, fields: readonly SheetField[]): Readonly<Record<string, SheetAmount>> {
  return Object.fromEntries(
    fields.flatMap((field) => {
      const entry = entryOf(filled, field);
      return entry ? [[field.path, { ...entry, unit: entry.unit as never }]] : [];
    }),
  );
}
