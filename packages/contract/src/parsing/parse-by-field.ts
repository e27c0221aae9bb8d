import type * as z from 'zod';
import { isContainer, isRecord, structureFault, valueAt } from './structure-fault';
import type { StructureFault } from './structure-fault';

export interface ParsedByField<Whole, Rest> {
  /** Everything, when there is no fault. */
  readonly whole: Whole | undefined;
  /** What parsed, with the faulty fields left out. */
  readonly rest: Rest;
  readonly faults: readonly StructureFault[];
}

/**
 * Parses every field by itself: all faults at once, and what parsed, so that the cross-checks can run on it.
 * `restSchema` is `schema` with every field optional. Neither may have refinements: zod skips them as soon as a field fails.
 */
export function parseByField<Whole extends Rest, Rest>(
  schema: z.ZodType<Whole>,
  restSchema: z.ZodType<Rest>,
  input: unknown,
): ParsedByField<Whole, Rest> {
  const parsed = schema.safeParse(input);
  if (parsed.success) return { whole: parsed.data, rest: parsed.data, faults: [] };
  const faults = parsed.error.issues.map((issue) => structureFault(issue, input));
  return { whole: undefined, rest: parseRest(restSchema, input), faults };
}

/** Drops what is faulty, then what cannot stand without it, until the rest parses. Every round removes something, so it ends. */
function parseRest<Rest>(schema: z.ZodType<Rest>, input: unknown): Rest {
  let rest: unknown = isRecord(input) ? input : {};
  for (;;) {
    const parsed = schema.safeParse(rest);
    if (parsed.success) return parsed.data;
    const round = rest;
    // of a missing value the object that should hold it is dropped
    const faulty = parsed.error.issues.map(({ path }) => (holds(round, path) ? path : path.slice(0, -1)));
    for (const path of faulty) rest = without(rest, path);
    if (rest === undefined) throw new Error('a field of the rest schema is not optional');
  }
}

/** Whether there is something at the path to take away; of a list its entry, whose place stays. */
function holds(input: unknown, path: readonly PropertyKey[]): boolean {
  const parent = valueAt(input, path.slice(0, -1));
  const last = path.at(-1);
  if (last === undefined || !isContainer(parent) || !Object.hasOwn(parent, last)) return false;
  return !Array.isArray(parent) || parent[last] !== undefined;
}

/** The input without the value at `path`. Copies only along the path. */
function without(input: unknown, path: readonly PropertyKey[]): unknown {
  const [key, ...below] = path;
  if (key === undefined) return undefined;
  if (Array.isArray(input)) {
    // an entry leaves its place behind, so that the others keep theirs; where the place may not be empty, the next round takes the list
    return input.map((entry: unknown, at) => (at === key ? without(entry, below) : entry));
  }
  if (!isRecord(input) || !Object.hasOwn(input, key)) return input;
  const { [key]: held, ...others } = input;
  const value = without(held, below);
  return value === undefined ? others : { ...others, [key]: value };
}
