import { evaluateCheck, readRequest, type EvaluationRequest, type Fault } from '@chargewright/engine';
import type { CheckDraft } from '../loose-checks/check-draft';
import { NOTHING, type Evaluation } from './evaluation';
import { requestFromDraft, withoutPaths } from './request-from-draft';

/** `readings.returnWetBulb.plusMinus` belongs to the entry `readings.returnWetBulb`. */
const entryOf = (path: string): string => path.split('.').slice(0, 2).join('.');

/** Without these nothing can be asked, so they cannot be left out. */
const NEEDED: ReadonlySet<string> = new Set(['setup.refrigerant', 'setup.meteringDevice']);

/** Judges what can be: entries that cannot be are named and left out, until the rest is sound. */
function judge(request: EvaluationRequest): Pick<Evaluation, 'faults' | 'result' | 'input'> {
  const faults: Fault[] = [];
  let rest = request;
  for (;;) {
    const read = readRequest(rest);
    if (read.ok) return { faults, input: read.input, result: evaluateCheck(read.input) };
    faults.push(...read.faults);
    const paths = new Set(read.faults.map(({ path }) => entryOf(path)));
    const next = withoutPaths(rest, paths);
    if ([...paths].some((path) => NEEDED.has(path)) || JSON.stringify(next) === JSON.stringify(rest)) {
      return { faults, input: null, result: null };
    }
    rest = next;
  }
}

/** What the page knows about a draft at a moment. Never throws: a page without an answer still has to show what was typed. */
export function evaluateDraft(draft: CheckDraft, nowMs: number): Evaluation {
  const { request, problems, faults } = requestFromDraft(draft, nowMs);
  if (!request) return { ...NOTHING, problems, faults };
  try {
    const judged = judge(request);
    return { ...judged, problems, faults: [...faults, ...judged.faults], failed: false };
  } catch (error) {
    // An error here is a fault of the engine, not of what was typed: said on the page, kept in the console for a report.
    console.error(error);
    return { ...NOTHING, problems, faults, failed: true };
  }
}
