/** The next step of a check: the row of the table that holds, with the figures its sentence needs. */
import type { CriterionResult, NextStep } from '../result';
import type { Figure, NextStepCode, NextStepFigures, NextStepMessage } from '../codes';
import { conditionsGate } from '../criteria/conditions';
import { unstatedReason } from '../fit-for-test';
import type { CheckInput } from '../input';
import type { ReadingId } from '../readings';
import type { Evidence } from './facts';
import { gatherFacts, NEXT_STEP_FIGURES } from './facts';
import { findRow } from './next-step-table';
import { targetRanges } from './target-ranges';

export function findNextStep(evidence: Evidence): NextStep {
  const { step, notYet } = findRow(gatherFacts(evidence));
  return { ...withFigures(step, evidence), notYet };
}

type PlainStep = { [Code in NextStepCode]: [NextStepFigures[Code]] extends [never] ? Code : never }[NextStepCode];

function withFigures(code: NextStepCode, evidence: Evidence): NextStepMessage {
  const { input, criteria, unfit } = evidence;
  if (code === 'run-longer') return { code, figures: { minutes: { kind: 'minutes', value: minutesLeft(input) } } };
  if (code === 'take-readings' || code === 'take-readings-again') {
    return { code, figures: { readings: { kind: 'readings', value: readingsToTake(criteria) } } };
  }
  if (code === 'mend-before-test') {
    const items = unfit?.code === 'not-ready' ? unfit.figures.items : ({ kind: 'preflight', value: [] } as const);
    return { code, figures: { items } };
  }
  if (code === 'state-the-setup') {
    const reason = unstatedReason(input);
    const fields =
      reason?.code === 'setup-not-stated' ? reason.figures.fields : ({ kind: 'setup', value: [] } as const);
    return { code, figures: { fields } };
  }
  if (code === 'warm-the-house' || code === 'wait-for-warmer-weather') {
    return { code, figures: { least: limitOf(input, 'least') } };
  }
  if (code === 'cool-the-house' || code === 'wait-for-cooler-weather') {
    return { code, figures: { most: limitOf(input, 'most') } };
  }
  if (code === 'reach-a-target') return { code, figures: { ranges: rangesFigure(evidence) } };
  if (code === 'come-back-at-higher-target') {
    const { value } = NEXT_STEP_FIGURES.clearTargetK;
    return { code, figures: { least: { kind: 'differenceK', value }, ranges: rangesFigure(evidence, value) } };
  }
  // a union of messages without figures; the compiler cannot spread the code over its members
  return { code: code satisfies PlainStep, figures: {} } as NextStepMessage;
}

const rangesFigure = (evidence: Evidence, leastK?: number): Figure => ({
  kind: 'targetRanges',
  value: targetRanges(evidence, leastK),
});

/** The limit of the gate that is shut: the maker's where he states one, else that of the procedure or the method. */
function limitOf(input: CheckInput, end: 'least' | 'most'): Figure {
  const figures: Readonly<Partial<Record<'least' | 'most', Figure>>> = conditionsGate(input)?.figures ?? {};
  const limit = figures[end];
  if (limit === undefined) throw new RangeError(`no ${end} limit is passed by these conditions`);
  return limit;
}

const minutesLeft = ({ visit, procedure }: CheckInput): number =>
  procedure.conditions.leastRunningMinutes.value - (visit.runningMinutes ?? 0);

/** All that required criteria wait for, in the order of the criteria. */
function readingsToTake(criteria: readonly CriterionResult[]): readonly ReadingId[] {
  const readings = criteria.flatMap(({ required, reason }) => {
    if (!required || (reason?.code !== 'readings-missing' && reason?.code !== 'stale')) return [];
    return reason.figures.readings.kind === 'readings' ? reason.figures.readings.value : [];
  });
  return [...new Set(readings)];
}
