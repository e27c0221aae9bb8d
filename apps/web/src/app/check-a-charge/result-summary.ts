/** What the result says at a glance: one sentence, what to do, and the criterion that decides. */
import type { CheckResult, CriterionResult } from '@chargewright/engine';
import { checkPageWords, nextStepLines, overallHeadline, type UnitSystem } from '@chargewright/wording';
import type { Evaluation } from './evaluate-draft';
import { firstSentence } from './next-step-note';

export interface ResultSummary {
  readonly headline: string;
  readonly notYet: readonly string[];
  readonly step: string;
  readonly isStop: boolean;
  /** Whose ruler is drawn beside the headline. */
  readonly leading: CriterionResult | null;
}

const words = checkPageWords.result;

const bare = (headline: string): ResultSummary => ({ headline, notYet: [], step: '', isStop: false, leading: null });

/** The criterion the overall finding comes from; else the first with a number. */
function leadingCriterion({ overall, criteria }: CheckResult): CriterionResult | null {
  const withNumber = criteria.filter(({ actual }) => actual !== null);
  return (
    withNumber.find(({ required, finding }) => required && finding === overall.finding) ??
    withNumber.find(({ required }) => required) ??
    withNumber[0] ??
    null
  );
}

export function summarise(evaluation: Evaluation, readingCount: number, system: UnitSystem): ResultSummary {
  const { result, failed, faults } = evaluation;
  if (failed) return bare(words.failed);
  if (!result) return bare(faults.length > 0 ? words.needsMending(faults.length) : words.noSetup);
  const { notYet, step } = nextStepLines(result.overall.nextStep, system);
  return {
    headline: readingCount === 0 ? words.noReadings : overallHeadline(result, system),
    notYet: readingCount === 0 ? [] : notYet,
    step: firstSentence(step),
    isStop: result.overall.finding === 'stop',
    leading: leadingCriterion(result),
  };
}
