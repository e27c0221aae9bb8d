/** Codes of the engine as sentences. The last argument is the language; English when left out. */
import type {
  Caution,
  CheckResult,
  CriterionId,
  CriterionResult,
  NextStep,
  NotYetCode,
  OverallFinding,
  Reason,
  Stop,
} from '@chargewright/engine';
import { criterionParts } from './criterion-parts';
import { cautionTexts } from './english/cautions';
import { findingPhrases } from './english/findings';
import { names } from './english/names';
import { nextStepWords } from './english/next-steps';
import { reasonTexts } from './english/reasons';
import { stopTexts } from './english/stops';
import type { Language } from './language';
import { messageText, sayIn } from './message-texts';
import type { UnitSystem } from './unit-system';

type Saying<Section extends keyof Language> = Pick<Language, Section>;

export const reasonText = (
  reason: Reason,
  system: UnitSystem,
  language: Saying<'reasons' | 'names'> = { reasons: reasonTexts, names },
): string => messageText(language.reasons, reason, { system, names: language.names });

export const stopText = (
  stop: Stop,
  system: UnitSystem,
  language: Saying<'stops' | 'names'> = { stops: stopTexts, names },
): string => messageText(language.stops, stop, { system, names: language.names });

export const cautionText = (
  caution: Caution,
  system: UnitSystem,
  language: Saying<'cautions' | 'names'> = { cautions: cautionTexts, names },
): string => messageText(language.cautions, caution, { system, names: language.names });

export const notYetText = (code: NotYetCode, language: Saying<'nextSteps'> = { nextSteps: nextStepWords }): string =>
  language.nextSteps.notYet[code];

export interface NextStepLines {
  /** At most two, shown first. */
  readonly notYet: readonly string[];
  /** Its first sentence serves as a title. */
  readonly step: string;
  readonly why: string;
}

export function nextStepLines(
  step: NextStep,
  system: UnitSystem,
  language: Saying<'nextSteps' | 'names'> = { nextSteps: nextStepWords, names },
): NextStepLines {
  const [what, why] = language.nextSteps.steps[step.code];
  return {
    notYet: step.notYet.map((code) => notYetText(code, language)),
    step: messageText({ [step.code]: what }, step, { system, names: language.names }),
    why: typeof why === 'string' ? why : why(sayIn(system)),
  };
}

export function nextStepText(
  step: NextStep,
  system: UnitSystem,
  language: Saying<'nextSteps' | 'names'> = { nextSteps: nextStepWords, names },
): string {
  const lines = nextStepLines(step, system, language);
  return [...lines.notYet, lines.step, lines.why].join(' ');
}

export const findingWord = (
  finding: OverallFinding,
  criterion?: CriterionId,
  language: Saying<'findings'> = { findings: findingPhrases },
): string => (criterion && language.findings.wordsOf[criterion]?.[finding]) ?? language.findings.words[finding];

export const criterionName = (
  criterion: CriterionId,
  language: Saying<'findings'> = { findings: findingPhrases },
): string => language.findings.criteria[criterion];

/** One sentence a customer could read. */
export const criterionHeadline = (
  criterion: CriterionResult,
  system: UnitSystem,
  language: Saying<'findings'> = { findings: findingPhrases },
): string => language.findings.headline(criterionParts(criterion, system));

/** Why, against which target, and how sure. Empty when there is nothing to add. */
export function criterionDetail(
  criterion: CriterionResult,
  system: UnitSystem,
  language: Saying<'findings' | 'reasons' | 'names'> = { findings: findingPhrases, reasons: reasonTexts, names },
): string {
  const reason = criterion.reason === null ? '' : reasonText(criterion.reason, system, language);
  return language.findings.detail(criterionParts(criterion, system), reason, sayIn(system));
}

/** What the tolerance ruler shows, for those who do not see it. */
export const rulerText = (
  criterion: CriterionResult,
  system: UnitSystem,
  language: Saying<'findings'> = { findings: findingPhrases },
): string => language.findings.ruler(criterionParts(criterion, system));

/** The sentence on top: the stop, or the criterion that decides. */
export function overallHeadline(
  { overall, criteria }: Pick<CheckResult, 'overall' | 'criteria'>,
  system: UnitSystem,
  language: Saying<'findings'> = { findings: findingPhrases },
): string {
  const [stop] = overall.stops;
  if (overall.finding === 'stop' && stop !== undefined) return language.findings.stops[stop.code];
  const deciding = criteria.find(({ required, finding }) => required && finding === overall.finding);
  return deciding === undefined
    ? language.findings.overall[overall.finding]
    : criterionHeadline(deciding, system, language);
}
