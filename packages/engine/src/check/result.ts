import type { Known } from '../derivation/quantity';
import type { DerivationStep } from '../derivation/steps';
import type { Caution, CriterionId, Finding, NextStepMessage, NotYetCode, OverallFinding, Reason, Stop } from './codes';
import type { ProcedureId } from './procedure-ids';

export const DERIVED_IDS = [
  'evaporatingDewTemperature',
  'condensingBubbleTemperature',
  'superheat',
  'subcooling',
  'temperatureSplit',
  'condensingOverAmbient',
  'returnWetBulb',
  'returnRelativeHumidity',
  'returnHumidityRatio',
  'returnEnthalpy',
] as const;
export type DerivedId = (typeof DERIVED_IDS)[number];

export type TargetSource =
  | 'entered'
  | 'makers-chart-a'
  | 'finer-table'
  | 'makers-data'
  | 'split-table'
  | 'procedure-window'
  | 'entered-range'
  | 'window-and-range'
  | 'design-airflow'
  | 'airflow-per-capacity';

/** The procedure's own figure, the maker's as entered, that of the general rules until his is entered, or our choice where neither has one. */
export type ToleranceSource = 'procedure' | 'makers-data' | 'general-rules' | 'choice';

/** Limits of the deviation, in its unit; `null` on a side without a limit. */
export interface Tolerance {
  readonly low: number | null;
  readonly high: number | null;
  /** The lower limit is the least the measured value may be, not the tolerance of the target. */
  readonly floored: boolean;
  readonly source: ToleranceSource;
}

export interface CriterionResult {
  readonly criterion: CriterionId;
  /** Whether the overall finding waits for this criterion. */
  readonly required: boolean;
  readonly actual: Known | null;
  readonly target: Known | null;
  readonly targetSource: TargetSource | null;
  readonly deviation: Known | null;
  readonly tolerance: Tolerance | null;
  readonly byRule: 'passes' | 'fails' | null;
  /** Probability that the true deviation lies inside the tolerance and a target exists (JCGM 106:2012). */
  readonly probabilityWithin: number | null;
  /** The finding is by the rule alone, and its certainty is below what the procedure calls clear. */
  readonly onlyJust: boolean;
  readonly finding: Finding;
  readonly reason: Reason | null;
}

export type NextStep = NextStepMessage & {
  /** At most two, shown before the step itself. */
  readonly notYet: readonly NotYetCode[];
};

export interface CheckResult {
  readonly engineVersion: string;
  readonly procedure: { readonly id: ProcedureId; readonly version: number };
  /** Holds only what could be computed. */
  readonly derived: Readonly<Partial<Record<DerivedId, Known>>>;
  readonly criteria: readonly CriterionResult[];
  readonly overall: {
    readonly finding: OverallFinding;
    readonly nextStep: NextStep;
    readonly stops: readonly Stop[];
    readonly cautions: readonly Caution[];
  };
  readonly derivation: readonly DerivationStep[];
}
