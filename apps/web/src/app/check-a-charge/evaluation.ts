/** What the page knows of a draft once it is judged. Apart from the judging, which comes after the first paint. */
import type { CheckInput, CheckResult, Fault } from '@chargewright/engine';
import type { FieldKey } from '../loose-checks/check-draft';
import type { NumberProblem } from '../quantities/parse-number';

export interface Evaluation {
  /** What is not a number, by field. */
  readonly problems: ReadonlyMap<FieldKey, NumberProblem>;
  /** What cannot be, as the engine names it; these entries are left out and the rest is judged. */
  readonly faults: readonly Fault[];
  /** Null before the setup is chosen, and when it failed. */
  readonly result: CheckResult | null;
  /** What the result was made from: null without one. */
  readonly input: CheckInput | null;
  /** The engine threw: a mistake of ours. The readings stay. */
  readonly failed: boolean;
}

/** Nothing asked, nothing found. */
export const NOTHING: Evaluation = { problems: new Map(), faults: [], input: null, result: null, failed: false };
