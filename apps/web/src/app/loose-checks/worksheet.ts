/** What stands on a page beside a check: airflow, weigh-in. Text and unit are the truth, as in the check itself. */
import type { TypedValue } from './check-draft';

export interface Worksheet {
  readonly typed: Readonly<Record<string, TypedValue>>;
  readonly choices: Readonly<Record<string, string>>;
  /** Of a table, a text a cell. */
  readonly rows: readonly (readonly string[])[];
}

export const EMPTY_WORKSHEET: Worksheet = { typed: {}, choices: {}, rows: [] };

/** A change of a sheet; applied in order, by the page and by the store alike. */
export type WorksheetPatch =
  | { readonly do: 'type'; readonly field: string; readonly value: TypedValue }
  | { readonly do: 'choose'; readonly name: string; readonly value: string }
  | { readonly do: 'set-rows'; readonly rows: Worksheet['rows'] }
  | { readonly do: 'replace'; readonly sheet: Worksheet };

export function patched(sheet: Worksheet, patch: WorksheetPatch): Worksheet {
  switch (patch.do) {
    case 'type':
      return { ...sheet, typed: { ...sheet.typed, [patch.field]: patch.value } };
    case 'choose':
      return { ...sheet, choices: { ...sheet.choices, [patch.name]: patch.value } };
    case 'set-rows':
      return { ...sheet, rows: patch.rows };
    case 'replace':
      return patch.sheet;
  }
}

export const isEmptySheet = ({ typed, choices, rows }: Worksheet): boolean =>
  Object.keys(typed).length === 0 && Object.keys(choices).length === 0 && rows.length === 0;
