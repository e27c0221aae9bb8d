/** What every refused request answers: `application/problem+json` (RFC 9457). */
import * as z from 'zod';
import { object } from './parsing/object';

export { structureFault } from './parsing/structure-fault';
export type { ExpectedType, StructureFault } from './parsing/structure-fault';

export const PROBLEM_CODES = [
  'invalid-input',
  'malformed-json',
  'malformed-request',
  'body-too-large',
  'not-json',
  'unknown-refrigerant',
  'not-found',
  'sign-in-refused',
  'signed-out',
  'wrong-origin',
  'forbidden',
  'wait',
  'method-not-allowed',
  'too-many-requests',
  'busy',
  'not-ready',
  'internal',
] as const;
export type ProblemCode = (typeof PROBLEM_CODES)[number];

const problemError = object({
  path: z.string().meta({
    description: 'Dotted path of the field, such as readings.returnWetBulb, or the name of the query parameter.',
  }),
  message: z.string(),
});

export const problem = object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string(),
  code: z.enum(PROBLEM_CODES),
  id: z.string().meta({ description: 'Names this answer; the server’s log has the same id.' }),
  errors: z.exactOptional(z.array(problemError).meta({ description: 'Every fault at once.' })),
}).meta({ id: 'Problem' });
export type Problem = z.infer<typeof problem>;
export type ProblemError = z.infer<typeof problemError>;
