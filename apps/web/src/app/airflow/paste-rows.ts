/** Two columns copied from a spreadsheet, or typed with spaces, as the rows of a fan table. */
import { parseNumber } from '../quantities/parse-number';
import { pastedCells } from '../quantities/pasted-cells';
import { isBlankOrDash } from './airflow-sheet';

const isNumber = (text: string): boolean => parseNumber(text).state === 'number';

/** The rows found, in the order of their static pressures; titles fall away. Empty: there are no two columns of numbers. */
export function pastedRows(text: string): readonly (readonly [staticPressure: string, airflow: string])[] {
  const rows = pastedCells(text).flatMap(([pressure = '', flow = '']) =>
    isNumber(pressure) && (isNumber(flow) || isBlankOrDash(flow)) ? [[pressure, flow] as const] : [],
  );
  if (rows.filter(([, flow]) => isNumber(flow)).length < 2) return [];
  const at = ([pressure]: readonly [string, string]): number => {
    const parsed = parseNumber(pressure);
    return parsed.state === 'number' ? parsed.number.value : 0;
  };
  return rows.toSorted((a, b) => at(a) - at(b));
}
