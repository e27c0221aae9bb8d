/** Puts a judgement into the few words that the page shows first. */
import type { CheckResult, CriterionResult, Reason, ReasonCode } from '@chargewright/engine';
import {
  checkPageWords,
  criterionDetail,
  criterionName,
  nextStepLines,
  overallHeadline,
  reasonText,
  type UnitSystem,
} from '@chargewright/wording';
import type { Evaluation } from './evaluation';
import { firstSentence } from './first-sentence';
import { isRefusal, placeOfStep } from './next-step-place';
import { bareSummary, type ResultSummary } from './result-summary';

const words = checkPageWords.result;

const decides = ({ overall }: CheckResult, { required, finding }: CriterionResult): boolean =>
  required && finding === overall.finding;

/** The criterion the overall finding comes from; else the first with a number. */
function leadingCriterion(result: CheckResult): CriterionResult | null {
  const withNumber = result.criteria.filter(({ actual }) => actual !== null);
  return (
    withNumber.find((criterion) => decides(result, criterion)) ??
    withNumber.find(({ required }) => required) ??
    withNumber[0] ??
    null
  );
}

/** The step of these repeats the reason. */
const SAID_BY_STEP: ReadonlySet<ReasonCode> = new Set([
  'port-not-stated',
  'part-stage',
  'not-in-charge-mode',
  'not-ready',
  'running-time',
  'stale',
]);

/** Why nothing is judged, where headline and step do not say it already. */
function reasonToSay(reason: Reason | null, { overall }: CheckResult, system: UnitSystem): string {
  if (reason === null) return '';
  const isNews = overall.finding === 'not-verifiable' && !SAID_BY_STEP.has(reason.code);
  return isNews || reason.code === 'target-for-other-port' ? reasonText(reason, system) : '';
}

const decidingCriterion = (result: CheckResult): CriterionResult | null =>
  result.criteria.find((criterion) => decides(result, criterion)) ?? null;

/** Before the first reading there is nothing to report: what comes first is the headline. */
function beforeReadings(result: CheckResult, system: UnitSystem): ResultSummary {
  const { nextStep } = result.overall;
  const deciding = decidingCriterion(result);
  if (nextStep.code === 'take-readings') return bareSummary(words.noReadings);
  return {
    ...bareSummary(firstSentence(nextStepLines(nextStep, system).step)),
    reason: reasonToSay(deciding?.reason ?? null, result, system),
    place: placeOfStep(nextStep.code, deciding),
    isRefused: isRefusal(nextStep.code),
  };
}

export function summarise(evaluation: Evaluation, hasReadings: boolean, system: UnitSystem): ResultSummary {
  const { result, failed, faults } = evaluation;
  if (failed) return bareSummary(words.failed);
  if (!result) return bareSummary(faults.length > 0 ? words.needsMending(faults.length) : words.noSetup);
  if (!hasReadings) return beforeReadings(result, system);
  const { nextStep } = result.overall;
  const { notYet, step } = nextStepLines(nextStep, system);
  const deciding = decidingCriterion(result);
  const headline = overallHeadline(result, system);
  const leading = leadingCriterion(result);
  const leadingName = leading ? criterionName(leading.criterion) : '';
  return {
    headline,
    notYet,
    step: firstSentence(step),
    reason: reasonToSay(deciding?.reason ?? null, result, system),
    place: placeOfStep(nextStep.code, deciding),
    isRefused: isRefusal(nextStep.code),
    isStop: result.overall.finding === 'stop',
    leading,
    leadingName: headline.startsWith(leadingName) ? '' : leadingName,
    leadingDetail: leading ? criterionDetail(leading, system) : '',
  };
}
