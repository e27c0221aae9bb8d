/** Every code a diagnosis can say, with the figures that belong to it. `packages/wording` has a sentence for each. */
import type { QuantityKind } from '../derivation/quantity';

/** In the order in which they are listed, whatever the readings: the order of the fault table says nothing about likelihood. */
export const CAUSES = [
  'low-charge',
  'overcharge',
  'restriction',
  'air-in-system',
  'low-airflow',
  'condenser-air',
  'compressor',
  'valve-closed',
  'valve-open',
] as const;
export type Cause = (typeof CAUSES)[number];

/** What speaks for or against a cause: a reading, or what a separating test has shown. */
export interface EvidenceFigures {
  'superheat-above-target': 'deviation' | 'uncertainty';
  'superheat-below-target': 'deviation' | 'uncertainty';
  'superheat-on-target': 'deviation' | 'uncertainty';
  'superheat-above-window': 'superheat' | 'uncertainty';
  'superheat-below-window': 'superheat' | 'uncertainty';
  'superheat-in-window': 'superheat' | 'uncertainty';
  'subcooling-above-target': 'deviation' | 'uncertainty';
  'subcooling-below-target': 'deviation' | 'uncertainty';
  'subcooling-on-target': 'deviation' | 'uncertainty';
  // without a target, by the general levels
  'subcooling-high': 'subcooling' | 'uncertainty';
  'subcooling-low': 'subcooling' | 'uncertainty';
  'subcooling-not-low': 'subcooling' | 'uncertainty';
  'split-above': 'deviation' | 'uncertainty';
  'split-below': 'deviation' | 'uncertainty';
  'split-on-target': 'deviation' | 'uncertainty';
  'suction-low': 'difference' | 'uncertainty';
  'suction-high': 'difference' | 'uncertainty';
  'head-high': 'difference' | 'uncertainty';
  'head-low': 'difference' | 'uncertainty';
  'approach-wide': 'difference' | 'uncertainty';
  'approach-narrow': 'difference' | 'uncertainty';
  'current-high': 'deviation' | 'uncertainty';
  'current-low': 'deviation' | 'uncertainty';
  'current-as-expected': 'deviation' | 'uncertainty';
  'drier-drop': 'difference' | 'uncertainty';
  'no-drier-drop': 'difference' | 'uncertainty';
  'air-found': 'difference' | 'uncertainty';
  'no-air': 'difference' | 'uncertainty';
  'airflow-low': 'airflow' | 'least';
  'airflow-enough': 'airflow' | 'least';
  'filter-or-coil-dirty': never;
  'bulb-loose': never;
  'bulb-charge-lost': never;
  'valve-hunting': never;
}
export type EvidenceCode = keyof EvidenceFigures;

export interface EvidenceFigure {
  readonly kind: QuantityKind;
  readonly value: number;
}

export type Evidence = {
  [Code in EvidenceCode]: {
    readonly code: Code;
    readonly figures: Readonly<Record<EvidenceFigures[Code] & string, EvidenceFigure>>;
  };
}[EvidenceCode];

/** What would best separate the causes that are listed. */
export const MEASUREMENTS = [
  'state-port',
  'confirm-refrigerant',
  'liquid-pair',
  'supply-and-wet-bulb',
  'airflow',
  'drier-drop',
  'air-test',
  'bulb-and-hunting',
  'compressor-current',
  'condenser-look',
  'orifice-look',
  'leak-search',
] as const;
export type Measurement = (typeof MEASUREMENTS)[number];

/** What there is to say besides the causes, or in their place. */
export const DIAGNOSIS_NOTES = [
  // no diagnosis
  'unfit',
  'impossible-readings',
  'outside-conditions',
  'not-steady',
  'too-little-read',
  'nothing-outside',
  'unclear',
  // beside the causes
  'no-single-cause',
  'no-pattern',
  'one-sign',
  'frozen',
  'pull-down',
  'refrigerant-in-doubt',
  'subcooling-apparent',
  'hunting',
] as const;
export type DiagnosisNote = (typeof DIAGNOSIS_NOTES)[number];

export interface CauseFinding {
  readonly cause: Cause;
  readonly fits: readonly Evidence[];
  readonly doesNotFit: readonly Evidence[];
  /** `null` where nothing more would separate it. */
  readonly nextMeasurement: Measurement | null;
}

/** Causes to check, never ranked. */
export interface Diagnosis {
  readonly causes: readonly CauseFinding[];
  readonly notes: readonly DiagnosisNote[];
}
