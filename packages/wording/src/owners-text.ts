/** The result in a few sentences for the owner of the building, to be sent at once. */
import type { CautionCode, CheckResult, CriterionResult, TargetSource } from '@chargewright/engine';
import { criterionParts } from './criterion-parts';
import { ownerWords, type OwnerParts } from './english/owner';
import { procedureWords } from './english/procedures';
import { criterionHeadline, criterionName, overallHeadline, reasonText } from './sentences';
import type { UnitSystem } from './unit-system';

const PUBLISHED: readonly TargetSource[] = ['makers-chart-a', 'finer-table', 'split-table'];

const withoutColon = (text: string): string => text.replace(/^[^:]+: (.)/, (_, first: string) => first.toUpperCase());

/** `date` as it is printed, since nothing here has a clock. */
export function ownersText(result: CheckResult, { date, system }: { date: string; system: UnitSystem }): string {
  const { overall, criteria, procedure } = result;
  const deciding =
    criteria.find(({ required, finding }) => required && finding === overall.finding) ??
    criteria.find(({ required, actual }) => required && actual !== null);
  const isStop = overall.finding === 'stop';
  const parts: OwnerParts = {
    date,
    rules: procedureWords[procedure.id].short,
    headline: isStop ? withoutColon(overallHeadline(result, system)) : headlineOf(deciding, system),
    name: deciding === undefined ? '' : nameOf(deciding),
    numbers: numbersOf(deciding, system),
    reason: deciding?.reason == null ? '' : reasonText(deciding.reason, system),
  };
  const has = (code: CautionCode): boolean => overall.cautions.some((caution) => caution.code === code);
  const judged = overall.finding === 'within' || overall.finding === 'above' || overall.finding === 'below';
  const source = deciding?.targetSource;
  return [
    ownerWords.opening(parts),
    ownerWords.found(overall.finding, parts),
    ...(judged && source != null && PUBLISHED.includes(source) ? [ownerWords.publishedTable] : []),
    ...(has('faults-may-hide') ? [ownerWords.faultsMayHide] : []),
    ...(has('airflow-not-proven') ? [ownerWords.airflowNotProven] : []),
    ownerWords.limits,
  ].join(' ');
}

const headlineOf = (deciding: CriterionResult | undefined, system: UnitSystem): string =>
  deciding === undefined ? '' : criterionHeadline(deciding, system);

/** A window is one of superheat. */
const nameOf = ({ criterion }: CriterionResult): string =>
  criterionName(criterion === 'superheat-window' ? 'superheat' : criterion).toLowerCase();

function numbersOf(deciding: CriterionResult | undefined, system: UnitSystem): string {
  if (deciding === undefined) return '';
  const { actual, plusMinus, target } = criterionParts(deciding, system);
  if (actual === null || plusMinus === null) return '';
  return ownerWords.numbers(actual, plusMinus, target);
}
