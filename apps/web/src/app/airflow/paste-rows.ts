/** Two columns copied from a spreadsheet, or typed with spaces, as the rows of a fan table. */
import { parse } from 'papaparse';
import { parseNumber } from '../quantities/parse-number';
import { isDash } from './airflow-sheet';

const isNumber = (text: string): boolean => parseNumber(text).state === 'number';

/** A tab is a spreadsheet's, a semicolon that of one whose decimal mark is the comma; else what stands apart by spaces. */
function cellsOf(text: string): readonly (readonly string[])[] {
  const delimiter = ['\t', ';', ', '].find((mark) => text.includes(mark));
  const source = delimiter === undefined ? text.replace(/[^\S\n]+/g, '\t') : text;
  const { data } = parse<string[]>(source.trim(), { delimiter: delimiter?.trim() || '\t', skipEmptyLines: 'greedy' });
  return data.map((line) => line.map((cell) => cell.trim()));
}

/** The rows found, in the order of their static pressures; titles fall away. Empty: there are no two columns of numbers. */
export function pastedRows(text: string): readonly (readonly [staticPressure: string, airflow: string])[] {
  const rows = cellsOf(text.replace(/\r\n?/g, '\n')).flatMap(([pressure = '', flow = '']) =>
    isNumber(pressure) && (isNumber(flow) || isDash(flow)) ? [[pressure, flow] as const] : [],
  );
  if (rows.filter(([, flow]) => isNumber(flow)).length < 2) return [];
  const at = ([pressure]: readonly [string, string]): number => {
    const parsed = parseNumber(pressure);
    return parsed.state === 'number' ? parsed.number.value : 0;
  };
  return rows.toSorted((a, b) => at(a) - at(b));
}
