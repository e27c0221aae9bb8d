/** What the result says at a glance: one sentence, what to do and where, and the criterion that decides. */
import type { CriterionResult } from '@chargewright/engine';
import type { StepPlace } from './next-step-place';

export interface ResultSummary {
  readonly headline: string;
  readonly notYet: readonly string[];
  readonly step: string;
  /** Why nothing can be judged; empty when something can. */
  readonly reason: string;
  /** Where on this page the step can be done. */
  readonly place: StepPlace | null;
  /** No reading can judge this system. */
  readonly isRefused: boolean;
  readonly isStop: boolean;
  /** Whose ruler is drawn beside the headline. */
  readonly leading: CriterionResult | null;
  /** Its name, where the headline does not say it. */
  readonly leadingName: string;
  /** Why it was found so, against which target, how sure. */
  readonly leadingDetail: string;
}

export const bareSummary = (headline: string): ResultSummary => ({
  headline,
  notYet: [],
  step: '',
  reason: '',
  place: null,
  isRefused: false,
  isStop: false,
  leading: null,
  leadingName: '',
  leadingDetail: '',
});
