/**
 * The rules a check is judged by: data, versioned, immutable once published. Every figure keeps how it was printed, its standing and its source.
 */
import type { DifferenceUnit, TemperatureUnit } from '../units';
import { differenceToK, temperatureToK } from '../units';
import type { ProcedureId } from './procedure-ids';
import type { AirflowPath } from './request';

/** `read` in the named source, recalled from `memory`, common `practice` without a source, or our own `choice`, open to better evidence. */
export type Standing = 'read' | 'memory' | 'practice' | 'choice';

export interface Rule {
  /** SI, as the name of its place says. */
  readonly value: number;
  readonly printed: string;
  readonly standing: Standing;
  readonly source: string;
  /** Whose figure stands in until the maker's own is entered. */
  readonly takenFrom?: 'general-rules';
}

type Basis = readonly [standing: Standing, source: string];

/** How a deviation becomes a finding (JCGM 106:2012, 8.2 and 8.3). */
export interface Decision {
  /** `simple`: by the rule alone. `guarded`: clear only at a probability of `clearFrom` or more; between that and its complement too close to call. */
  readonly type: 'simple' | 'guarded';
  /** Under `simple` a certainty below this is called only just. */
  readonly clearFrom: Rule;
}

/** What a procedure does with something that is not as it should be, or not recorded. */
export type Consequence = 'gate' | 'caution';

/** What the temperature split says of the airflow. */
export type SplitEvidence = 'split-above' | 'split-within' | 'split-too-close' | 'split-below' | 'nothing';

/** What is known about the airflow when the charge is to be judged. */
export type AirflowEvidence = 'measured-low' | 'measured-enough' | 'permitted-path' | SplitEvidence;

/** A way to show the airflow other than measuring enough of it. */
export interface PermittedPath {
  readonly path: AirflowPath;
  readonly alterationOnly: boolean;
  /** Whether it holds although a measurement stayed below the limit. */
  readonly despiteLowMeasurement: boolean;
}

export interface AirflowRules {
  /** Least airflow per nominal capacity, m³/s per W: of a new system, of an alteration, of a small-duct high-velocity system; `null`: none. */
  readonly leastM3PerSPerW: Rule | null;
  readonly leastOfAlterationM3PerSPerW: Rule | null;
  readonly leastOfHighVelocityM3PerSPerW: Rule | null;
  /** Part of the design airflow that is enough where one was entered. */
  readonly leastDesignFraction: Rule | null;
  /** Whether the limit itself is enough. */
  readonly limitPasses: boolean;
  /** What the two that follow rest on. */
  readonly evidenceBasis: Basis;
  /** Which evidence shuts the charge criteria. */
  readonly gates: readonly AirflowEvidence[];
  /** Whether the temperature split is evidence at all. */
  readonly splitCounts: boolean;
  /** Which splits are worth a caution although the test stays open. */
  readonly splitCautions: readonly ('split-above' | 'split-below')[];
  /** A split that is open stands in for a measured airflow that is low. */
  readonly eitherSuffices: boolean;
  readonly permittedPaths: readonly PermittedPath[];
}

export interface MakersTolerances {
  readonly liquidLineApproachK: Rule;
  readonly suctionLineTemperatureK: Rule;
  readonly heatingDischargeTemperatureK: Rule;
  /** Of a pressure: as the saturation temperature that it stands for. */
  readonly pressureAsSaturationK: Rule;
}

export interface Procedure {
  readonly id: ProcedureId;
  readonly version: number;
  /** Whether packaged units are in its scope. */
  readonly packaged: boolean;
  /** What happens where something was not stated: the usual is taken, with a caution, or what hangs on it is not judged. */
  readonly assumes: 'the-usual' | 'nothing';
  readonly decision: Decision;
  readonly superheat: {
    readonly toleranceK: Rule;
    readonly floorK: Rule | null;
    readonly enteredTarget: boolean;
    /** Whether the maker's own table gives the target; that of subcooling always may. */
    readonly makersTable: boolean;
    /** The printed chart that gives the target where there is no other; `null`: none does. */
    readonly chart: SuperheatChartId | null;
  };
  readonly subcooling: {
    readonly toleranceK: Rule;
    /** The measured subcooling itself must reach this. */
    readonly leastK: Rule | null;
    /** Guidance without a target: low, clear, high. */
    readonly lowBelowK: Rule;
    readonly clearFromK: Rule;
    readonly highAboveK: Rule;
  };
  /** `judged`: whether the published table is a target here. Where it is not, it still helps to find the cause of a fault. */
  readonly temperatureSplit: { readonly toleranceK: Rule; readonly judged: boolean };
  /** The maker's methods beside superheat and subcooling: ± where the maker states none. `null`: these rules do not judge by them. */
  readonly makersMethods: MakersTolerances | null;
  readonly superheatWindow: {
    readonly lowK: Rule;
    readonly highK: Rule;
    /** The maker's range for the valve takes the window's place, must hold as well, or is all that is judged by: the window then only guides. */
    readonly makersRange: 'replaces' | 'also' | 'only';
  };
  readonly airflow: AirflowRules;
  readonly conditions: {
    readonly leastOutdoorK: Rule | null;
    /** Warmest outdoor air for a superheat test. */
    readonly mostOutdoorForSuperheatK: Rule | null;
    readonly coolBelowK: Rule;
    readonly leastReturnK: Rule | null;
    readonly leastRunningMinutes: Rule;
    /** Running time, lowest return air, outdoor air, pre-flight: what happens when they are not recorded. */
    readonly unrecorded: Consequence;
    /** A marked access hole beside the coil is part of the test. */
    readonly accessHole: boolean;
  };
  readonly instruments: { readonly mostDays: Rule; readonly beyond: Consequence };
  readonly mostReadingAgeSeconds: Rule;
  /** Above this probability that no target exists, the criterion is not verifiable. */
  readonly mostProbabilityOfNoTarget: Rule;
}

export type SuperheatChartId = 'makers-chart-a' | 'finer-table';

export const differenceRule = (value: number, unit: Exclude<DifferenceUnit, 'K'>, basis: Basis): Rule => ({
  value: differenceToK(value, unit),
  printed: `${value} ${unit === 'deltaF' ? '°F' : '°C'}`,
  standing: basis[0],
  source: basis[1],
});

export const temperatureRule = (value: number, unit: Exclude<TemperatureUnit, 'K'>, basis: Basis): Rule => ({
  value: temperatureToK(value, unit),
  printed: `${value} ${unit === 'degF' ? '°F' : '°C'}`,
  standing: basis[0],
  source: basis[1],
});

/** A figure of the general rules in rules that go by the maker's: it holds until his own is entered, and is marked in every result. */
export const asGeneralRules = (rule: Rule): Rule => ({ ...rule, takenFrom: 'general-rules' });

export const plainRule = (value: number, printed: string, basis: Basis): Rule => ({
  value,
  printed,
  standing: basis[0],
  source: basis[1],
});
