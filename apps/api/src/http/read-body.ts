import { structureFault } from '@chargewright/contract/problem';
import type * as z from 'zod';
import { HttpProblem } from './http-problem';
import { structureErrors } from './structure-errors';

/** The body in the shape of a schema. Throws the problem `invalid-input` with every fault of its shape. */
export function readBody<Body>(schema: z.ZodType<Body>, body: unknown): Body {
  const parsed = schema.safeParse(body);
  if (parsed.success) return parsed.data;
  const faults = parsed.error.issues.map((issue) => structureFault(issue, body));
  throw new HttpProblem('invalid-input', { errors: structureErrors(faults) });
}
