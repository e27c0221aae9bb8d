import { EngineError } from './errors';

/** What a public door answers: a value, or the physics' refusal with its numbers. */
export type Result<T> = { readonly ok: true; readonly value: T } | { readonly ok: false; readonly error: EngineError };

/** Runs formulas and returns their refusal as data. Anything but an `EngineError` is a bug and passes through. */
export function attempt<T>(compute: () => T): Result<T> {
  try {
    return { ok: true, value: compute() };
  } catch (error) {
    if (error instanceof EngineError) return { ok: false, error };
    throw error;
  }
}
