import { EngineError } from '../errors';
import type { Formula } from './formula';
import type { ErrorPart, Known, Quantity, Refused } from './quantity';
import { bareValue, known, missing } from './quantity';

/** Below these a secant measures rounding noise instead of a slope. */
const SMALLEST_RELATIVE_STEP = 1e-6;
const SMALLEST_STEP = 1e-9;

/**
 * Mean of |x| in standard uncertainties: 0.80 normal, 0.87 rectangular. At the kink of a table the mean of the values lies off the value in the
 * middle by this part of what the secant over ±u shows; a smooth curve bends too little over a reading's ± for the difference to matter.
 */
const MEAN_ABSOLUTE = 0.83;

/**
 * Value, uncertainty and derivation of a formula in one go. Slopes are secants over ± one standard uncertainty, so that a kink of a table
 * counts as far as the reading can reach it; where one side is refused the other side alone gives the slope.
 *
 * A missing input makes the result missing; a refused input, or a formula that throws `EngineError`, makes it refused.
 * Source: law of propagation of uncertainty, JCGM 100:2008, 5.1.2 and 5.2.2, with secants in place of derivatives (5.1.3, note 2).
 */
export function derive<Name extends string>(
  formula: Formula<Name>,
  from: Readonly<Record<Name, Quantity>>,
  parts: readonly ErrorPart[] = [],
): Quantity {
  const names = Object.keys(formula.symbols) as Name[];
  // a target that nobody entered is missing without naming a reading
  const lacking = names.map((name): Quantity => from[name]).filter((input) => input.state === 'missing');
  if (lacking.length > 0) return missing(...new Set(lacking.flatMap(({ inputs }) => inputs)));
  const at = {} as Record<Name, number>;
  let refused: Refused | undefined;
  for (const name of names) {
    const input = from[name];
    const value = bareValue(input);
    if (input.state === 'refused') {
      if (value === undefined) return input;
      refused ??= input;
    }
    if (value !== undefined) at[name] = value;
  }
  try {
    const value = evaluate(formula, at);
    if (refused !== undefined) return { ...refused, value };
    const contributions = new Map<string, number>();
    let meanShift = 0;
    for (const name of names) {
      const input = from[name] as Known;
      if (input.u === 0) continue;
      const secant = secantOver(formula, at, name, { value, u: input.u });
      if (secant instanceof EngineError) return { state: 'refused', error: secant, value };
      const { slope, bend } = secant;
      meanShift += slope * input.meanShift + MEAN_ABSOLUTE * bend;
      for (const [key, c] of input.contributions) contributions.set(key, (contributions.get(key) ?? 0) + slope * c);
    }
    const step = { type: 'derived', formula, from: from as Readonly<Record<Name, Known>>, parts } as const;
    return known({ kind: formula.gives, value, contributions, meanShift, step, parts });
  } catch (error) {
    // the physics' own refusal becomes data; anything else is a bug
    if (error instanceof EngineError) return { state: 'refused', error };
    throw error;
  }
}

function evaluate<Name extends string>(formula: Formula<Name>, at: Readonly<Record<Name, number>>): number {
  const value = formula.of(at);
  if (!Number.isFinite(value)) throw new RangeError(`formula ${formula.id} gave ${value}`);
  return value;
}

interface Secant {
  readonly slope: number;
  /** Mean of the values at both ends less the value in the middle; 0 where one end is refused. */
  readonly bend: number;
}

/** The secant over ± u, or the refusal of the upper side when both sides are refused. */
function secantOver<Name extends string>(
  formula: Formula<Name>,
  at: Record<Name, number>,
  name: Name,
  centre: { readonly value: number; readonly u: number },
): Secant | EngineError {
  const x = at[name];
  const step = Math.max(centre.u, SMALLEST_RELATIVE_STEP * Math.abs(x), SMALLEST_STEP);
  // one object for all evaluations: copying it cost more than most formulas
  at[name] = x + step;
  const above = evaluateOrRefuse(formula, at);
  at[name] = x - step;
  const below = evaluateOrRefuse(formula, at);
  at[name] = x;
  if (above instanceof EngineError) {
    return below instanceof EngineError ? above : { slope: (centre.value - below) / step, bend: 0 };
  }
  if (below instanceof EngineError) return { slope: (above - centre.value) / step, bend: 0 };
  return { slope: (above - below) / (2 * step), bend: 0.5 * (above + below) - centre.value };
}

function evaluateOrRefuse<Name extends string>(
  formula: Formula<Name>,
  at: Readonly<Record<Name, number>>,
): number | EngineError {
  try {
    return evaluate(formula, at);
  } catch (error) {
    // a refusal on one side of the secant is an answer: the other side gives the slope
    if (error instanceof EngineError) return error;
    throw error;
  }
}
