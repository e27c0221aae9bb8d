/**
 * A worked example: what is given, what each number is held against, and what the engine has to find. Sentences are in `packages/wording`;
 * tests/reference/worked-examples checks every figure against its print and every finding against its key.
 */
import type { CautionCode, CriterionId, NextStepCode, OverallFinding, ReasonCode, StopCode } from '../../check/codes';
import type { EvaluationRequest } from '../../check/request';
import type { Cause } from '../../diagnosis/diagnosis-codes';
import type { FigureStanding } from '../../methods/sourced-figure';
import type { WeighInInput } from '../../methods/weigh-in/evaluate-weigh-in';
import type { WeighInFinding } from '../../methods/weigh-in/weigh-in-codes';

export const WORKED_EXAMPLE_IDS = [
  'handbook-moist-air',
  'healthy-orifice',
  'healthy-valve-metric',
  'low-airflow-floods',
  'valve-hides-low-charge',
  'undercharge-low-split',
  'restriction-with-ice',
  'overcharge-or-air',
  'formula-in-a-dash',
  'sea-level-chart',
  'wrong-column',
  'wide-glide-wrong-column',
  'wrong-scale',
  'too-close-to-call',
  'dry-house',
  'printed-sum',
] as const;
export type WorkedExampleId = (typeof WORKED_EXAMPLE_IDS)[number];

/** Numbers of an example that are held against something. */
export type WorkedFigureId =
  | 'evaporatingDewTemperature'
  | 'evaporatingBubbleTemperature'
  | 'condensingBubbleTemperature'
  | 'condensingDewTemperature'
  | 'superheat'
  | 'superheatFromBubble'
  | 'subcooling'
  | 'subcoolingFromDew'
  | 'temperatureSplit'
  | 'condensingOverAmbient'
  | 'targetSuperheat'
  | 'targetTemperatureSplit'
  | 'superheatDeviation'
  | 'subcoolingDeviation'
  | 'splitDeviation'
  | 'shortFormula'
  | 'atmosphere'
  | 'standingBubblePressure'
  | 'standingExcess'
  | 'humidityRatio'
  | 'relativeHumidity'
  | 'dewPoint'
  | 'enthalpy'
  | 'specificVolume'
  | 'lineCharge';

export type WorkedFigureUnit =
  'degF' | 'degC' | 'deltaF' | 'deltaC' | 'psia' | 'psig' | '%' | '1' | 'Btu/lb' | 'ft3/lb' | 'oz';

/** As of any figure, or worked out `by-hand` from figures and readings of the same example. */
export type WorkedStanding = FigureStanding | 'by-hand';

/** A number as it is printed, or worked out from what is printed. */
export interface CheckedFigure {
  readonly what: WorkedFigureId;
  /** Of the readings with this slip, or of this line, in place of the example's own. */
  readonly of?: string;
  readonly value: number;
  readonly unit: WorkedFigureUnit;
  readonly standing: WorkedStanding;
  readonly source: string;
  /** The engine may differ by this, in `unit`: rounding of the print, and what is known of the print against the model. */
  readonly within: number;
  /** The print is wrong: the engine must differ by more. */
  readonly misprint?: true;
}

/** What has to come out. */
export interface CheckKey {
  readonly overall: OverallFinding;
  /** The criterion that decides, or would. */
  readonly criterion: CriterionId;
  readonly byRule: 'passes' | 'fails' | null;
  readonly reason: ReasonCode | null;
  readonly stops: readonly StopCode[];
  readonly nextStep: NextStepCode;
  /** Those that belong to the lesson; there may be others. */
  readonly cautions: readonly CautionCode[];
  /** All that the diagnosis lists, in its order. */
  readonly causes: readonly Cause[];
}

export const SLIP_IDS = [
  'wick-dried-out',
  'judged-as-orifice',
  'without-liquid-pair',
  'rule-without-floor',
  'without-supply-air',
  'liquid-line-warm',
  'gauge-at-sea-level',
  'scale-of-r410a',
  'cooler-liquid-line',
  'standing-as-printed',
  'standing-too-high',
] as const;
export type SlipId = (typeof SLIP_IDS)[number];

/** The same system read or set up in another way, or tested further: what would be concluded then. */
export interface Slip {
  readonly id: SlipId;
  /** Its further readings are given with the others: the question is what they tell. */
  readonly given?: true;
  readonly request: EvaluationRequest;
  readonly key: Pick<CheckKey, 'overall' | 'nextStep'> & Partial<CheckKey>;
}

interface Example {
  readonly id: WorkedExampleId;
  readonly figures: readonly CheckedFigure[];
}

export interface CheckExample extends Example {
  readonly kind: 'check';
  readonly request: EvaluationRequest;
  readonly key: CheckKey;
  readonly slips: readonly Slip[];
}

export interface MoistAirExample extends Example {
  readonly kind: 'moist-air';
  readonly given: { readonly dryBulbF: number; readonly wetBulbF: number; readonly pressurePsia: number };
}

/** One line set: what its maker printed as the sum, and what the sum is. */
export interface WeighInPart {
  readonly id: 'thin-line' | 'thick-line';
  readonly input: WeighInInput;
  readonly finding: WeighInFinding;
  /** Sums that were printed, wrong, in kg, with what comes out where they are weighed in. */
  readonly misprintsKg: readonly number[];
  readonly misprintFinding: WeighInFinding;
}

export interface WeighInExample extends Example {
  readonly kind: 'weigh-in';
  readonly parts: readonly WeighInPart[];
}

export type WorkedExample = CheckExample | MoistAirExample | WeighInExample;
