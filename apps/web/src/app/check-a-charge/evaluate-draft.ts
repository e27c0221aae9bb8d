import { evaluateCheck, readRequest, type CheckResult, type EvaluationRequest, type Fault } from '@chargewright/engine';
import type { CheckDraft, FieldKey } from '../loose-checks/check-draft';
import type { NumberProblem } from '../quantities/parse-number';
import { requestFromDraft, withoutPaths } from './request-from-draft';

export interface Evaluation {
  /** What is not a number, by field. */
  readonly problems: ReadonlyMap<FieldKey, NumberProblem>;
  /** What cannot be, as the engine names it; these entries are left out and the rest is judged. */
  readonly faults: readonly Fault[];
  /** Null before the setup is chosen, and when it failed. */
  readonly result: CheckResult | null;
  /** The engine threw: a mistake of ours. The readings stay. */
  readonly failed: boolean;
}

/** `readings.returnWetBulb.plusMinus` belongs to the entry `readings.returnWetBulb`. */
const entryOf = (path: string): string => path.split('.').slice(0, 2).join('.');

/** Without these nothing can be asked, so they cannot be left out. */
const NEEDED: ReadonlySet<string> = new Set(['setup.refrigerant', 'setup.meteringDevice']);

/** Judges what can be: entries that cannot be are named and left out, until the rest is sound. */
function judge(request: EvaluationRequest): Pick<Evaluation, 'faults' | 'result'> {
  const faults: Fault[] = [];
  let rest = request;
  for (;;) {
    const read = readRequest(rest);
    if (read.ok) return { faults, result: evaluateCheck(read.input) };
    faults.push(...read.faults);
    const paths = new Set(read.faults.map(({ path }) => entryOf(path)));
    const next = withoutPaths(rest, paths);
    if ([...paths].some((path) => NEEDED.has(path)) || JSON.stringify(next) === JSON.stringify(rest)) {
      return { faults, result: null };
    }
    rest = next;
  }
}

/** What the page knows about a draft at a moment. Never throws: a page without an answer still has to show what was typed. */
export function evaluateDraft(draft: CheckDraft, nowMs: number): Evaluation {
  const { request, problems, faults } = requestFromDraft(draft, nowMs);
  if (!request) return { problems, faults, result: null, failed: false };
  try {
    const judged = judge(request);
    return { problems, faults: [...faults, ...judged.faults], result: judged.result, failed: false };
  } catch (error) {
    // An error here is a fault of the engine, not of what was typed: said on the page, kept in the console for a report.
    console.error(error);
    return { problems, faults, result: null, failed: true };
  }
}
