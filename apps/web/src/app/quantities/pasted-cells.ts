import { parse } from 'papaparse';

/** The cells of a table copied from a spreadsheet or typed: parted by a tab, by a semicolon where the decimal mark is the comma, else by spaces. */
export function pastedCells(pasted: string): string[][] {
  const lines = pasted.trim().split(/\r\n?|\n/);
  const text = lines.map((line) => line.trimEnd()).join('\n');
  const delimiter = ['\t', ';', ', '].find((mark) => text.includes(mark));
  const source = delimiter === undefined ? text.replace(/[^\S\n]+/g, '\t') : text;
  const { data } = parse<string[]>(source, { delimiter: delimiter?.trim() || '\t', skipEmptyLines: 'greedy' });
  return data.map((line) => line.map((cell) => cell.trim()));
}
