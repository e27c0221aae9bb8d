/** A table copied from a spreadsheet or typed with spaces, as rows, columns and cells. An empty cell is a dash. */
import { parseNumber } from '../quantities/parse-number';
import { pastedCells } from '../quantities/pasted-cells';
import { DASH, isDash } from '../quantities/printed-dash';

export interface PastedTable {
  readonly rows: readonly string[];
  /** `null`: one value a row. */
  readonly columns: readonly string[] | null;
  readonly cells: readonly (readonly string[])[];
}

export type PasteProblem = 'empty' | 'no-table' | 'no-heads' | 'ragged' | 'not-a-number' | 'too-large';
export type ParsedPaste =
  | { readonly state: 'table'; readonly table: PastedTable }
  | { readonly state: 'problem'; readonly problem: PasteProblem; readonly place?: string };

const MOST_LINES = 40;

const isNumber = (text: string): boolean => parseNumber(text).state === 'number';
const problem = (of: PasteProblem, place?: string): ParsedPaste => ({
  state: 'problem',
  problem: of,
  ...(place !== undefined && { place }),
});

/** Titles above or beside the figures fall away. */
const withoutTitles = (lines: string[][]): string[][] => {
  const first = lines.findIndex((line) => line.filter(isNumber).length >= 2 || line.every((cell) => isNumber(cell)));
  return first < 0 ? [] : lines.slice(first);
};

const trimmed = (line: readonly string[]): string[] => {
  const last = line.findLastIndex((cell) => cell !== '');
  return line.slice(0, last + 1);
};

/** `twoWays`: the kind of table has a condition along the top as well. */
export function parsePaste(text: string, twoWays: boolean): ParsedPaste {
  if (text.trim() === '') return problem('empty');
  const lines = withoutTitles(pastedCells(text));
  if (lines.length < 2) return problem('no-table');
  return twoWays ? twoWayTable(lines) : oneWayTable(lines);
}

function twoWayTable(lines: readonly string[][]): ParsedPaste {
  const [head = [], ...body] = lines;
  const names = trimmed(head);
  const width = Math.max(...body.map((line) => trimmed(line).length));
  // the corner may hold a word, or be left out
  const columns = isNumber(names[0] ?? '') && names.length === width - 1 ? names : names.slice(1);
  if (columns.length === 0) return problem('no-heads');
  return checked({
    rows: body.map((line) => line[0] ?? ''),
    columns,
    cells: body.map((line) =>
      [...line.slice(1), ...Array<string>(columns.length).fill('')].slice(
        0,
        Math.max(columns.length, trimmed(line).length - 1),
      ),
    ),
  });
}

/** Two columns of figures, or the same lying on its side. */
function oneWayTable(lines: readonly string[][]): ParsedPaste {
  const lying = lines.length === 2 && trimmed(lines[0] ?? []).length > 2;
  const [first = [], second = []] = lines.map(trimmed);
  const pairs = lying
    ? first.map((row, at) => [row, second[at] ?? '']).filter(([row]) => isNumber(row ?? ''))
    : lines.map(trimmed);
  return checked({
    rows: pairs.map(([row]) => row ?? ''),
    columns: null,
    cells: pairs.map((line) => (line.length < 2 ? [''] : line.slice(1))),
  });
}

function checked({ rows, columns, cells }: PastedTable): ParsedPaste {
  const width = columns?.length ?? 1;
  if (rows.length > MOST_LINES || width > MOST_LINES) return problem('too-large');
  const ragged = cells.findIndex((line) => line.length !== width);
  if (ragged >= 0) return problem('ragged', rows[ragged]);
  const heads = [...rows, ...(columns ?? [])].find((text) => !isNumber(text));
  if (heads !== undefined) return heads === '' ? problem('no-heads') : problem('not-a-number', heads);
  const odd = cells.flat().find((text) => text !== '' && !isDash(text) && !isNumber(text));
  if (odd !== undefined) return problem('not-a-number', odd);
  const printed = cells.map((line) => line.map((text) => (text === '' || isDash(text) ? DASH : text)));
  return { state: 'table', table: { rows, columns, cells: printed } };
}
