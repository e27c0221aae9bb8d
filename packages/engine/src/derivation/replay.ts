import type { ErrorPart, Known } from './quantity';

/** The standardised error of one source: mean 0, standard deviation 1, the same number each time it is asked for one key. */
export type DrawError = (part: ErrorPart) => number;

/**
 * The value a derivation would have had with other errors of its sources: the whole chain of formulas is computed again.
 * With random draws this is the Monte Carlo method of JCGM 101:2008. Throws the `EngineError` of a formula that refuses.
 */
export function replay(quantity: Known, draw: DrawError): number {
  const { step } = quantity;
  let value = quantity.value;
  if (step.type === 'derived') {
    const at: Record<string, number> = {};
    for (const [name, input] of Object.entries(step.from)) at[name] = replay(input, draw);
    value = step.formula.of(at);
  }
  for (const part of step.parts) value += part.u * draw(part);
  return value;
}
