/** The Monte Carlo method of JCGM 101:2008 over the derivations of one check: the same draws for all its quantities. */
import type { ErrorPart, Known } from '@chargewright/engine';
import { EngineError, replay } from '@chargewright/engine';
import type { DrawError } from '../../packages/engine/src/derivation/replay';

/** Mulberry32 (T. Ettinger, public domain): a small generator with a seed, good enough for 20,000 draws of a dozen errors. */
function seededUniform(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), state | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

/** One set of standardised errors: asked twice for a key it answers the same. */
function drawErrors(uniform: () => number): DrawError {
  const drawn = new Map<string, number>();
  return ({ key, shape }: ErrorPart) => {
    const known = drawn.get(key);
    if (known !== undefined) return known;
    const error = shape === 'rectangular' ? Math.sqrt(3) * (2 * uniform() - 1) : standardNormal(uniform);
    drawn.set(key, error);
    return error;
  };
}

/** Box and Muller (1958), one of the pair. */
const standardNormal = (uniform: () => number): number =>
  Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform());

/** Draws of each quantity, in order; `null` where a formula of its chain refused. */
export function simulate(
  quantities: readonly Known[],
  { draws, seed }: { readonly draws: number; readonly seed: number },
): readonly (readonly (number | null)[])[] {
  const uniform = seededUniform(seed);
  const values = quantities.map((): (number | null)[] => []);
  for (let k = 0; k < draws; k++) {
    const draw = drawErrors(uniform);
    quantities.forEach((quantity, i) => values[i]!.push(replayOrNull(quantity, draw)));
  }
  return values;
}

function replayOrNull(quantity: Known, draw: DrawError): number | null {
  try {
    return replay(quantity, draw);
  } catch (error) {
    // outside a chart or a curve there is no value: the caller counts it
    if (error instanceof EngineError) return null;
    throw error;
  }
}

export function standardDeviation(values: readonly number[]): number {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  return Math.sqrt(values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (values.length - 1));
}
