/** What is wrong with the shape of a request: said to a programmer, in words a technician understands. */
import type { StructureFaultWords } from '../language';

const structure: StructureFaultWords['structure'] = {
  missing: (f) => `${f.field} is missing.`,
  'wrong-type': (f) => `${f.field} has the wrong type${f.allowed && `: give ${f.allowed}`}.`,
  null: (f) => `${f.field} is null: leave it out when it is not known.`,
  'unknown-value': (f) => `${f.field} has an unknown value${f.allowed && `: give ${f.allowed}`}.`,
  'wrong-unit': (f) => `${f.field} has a unit that does not fit${f.allowed && `: give ${f.allowed}`}.`,
  'temperature-unit-on-difference': (f) =>
    `${f.field} is a temperature difference: give it in deltaF or deltaC, not in a unit of temperature.`,
  'too-long': (f) => `${f.field} is too long.`,
};

/** "a, b or c" */
const alternatives = (allowed: readonly string[]): string =>
  allowed.length < 2 ? (allowed[0] ?? '') : `${allowed.slice(0, -1).join(', ')} or ${allowed.at(-1)}`;

export const structureFaultWords: StructureFaultWords = { structure, alternatives };
