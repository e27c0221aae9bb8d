import { readFileSync } from 'node:fs';

/** Rows of a table beside this file by column name; lines that start with # are its provenance. A row of another length throws. */
export function readTable(name: string): Readonly<Record<string, string>>[] {
  const text = readFileSync(new URL(name, import.meta.url), 'utf8');
  const [header = '', ...lines] = text.split('\n').filter((line) => line !== '' && !line.startsWith('#'));
  const columns = cellsOf(header);
  return lines.map((line) => {
    const cells = cellsOf(line);
    if (cells.length !== columns.length) throw new Error(`${name}: unreadable row: ${line}`);
    return Object.fromEntries(columns.map((column, k) => [column, cells[k]!]));
  });
}

const cellsOf = (line: string): string[] =>
  [...line.matchAll(/(?:^|,)(?:"([^"]*)"|([^,]*))/g)].map((match) => match[1] ?? match[2] ?? '');

/** A number that must be there: an empty or unreadable cell throws, so that no row passes by having no figure. */
export function figure(row: Readonly<Record<string, string>>, column: string): number {
  const cell = row[column];
  const value = cell === undefined || cell === '' ? Number.NaN : Number(cell);
  if (!Number.isFinite(value)) throw new Error(`no figure in column ${column}: ${JSON.stringify(row)}`);
  return value;
}
