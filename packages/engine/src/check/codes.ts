/**
 * Every code a check can emit, with the figures that belong to it. The engine never writes a sentence: `packages/wording` has one for each code,
 * and the compiler holds the two lists together.
 */
import type { QuantityKind } from '../derivation/quantity';
import type { MakersChartKind } from '../methods/makers-chart/kinds';
import type { PreflightItem } from './request';
import type { ReadingId } from './readings';

export const CRITERION_IDS = [
  'superheat',
  'subcooling',
  'liquid-line-approach',
  'suction-line-temperature',
  'liquid-pressure',
  'heating-discharge-pressure',
  'heating-discharge-temperature',
  'temperature-split',
  'superheat-window',
  'airflow',
  'conditions',
  'instruments',
  'weigh-in',
] as const;
export type CriterionId = (typeof CRITERION_IDS)[number];

export const FINDINGS = ['within', 'above', 'below', 'too-close-to-call', 'not-verifiable', 'not-judged'] as const;
export type Finding = (typeof FINDINGS)[number];
export type OverallFinding = Finding | 'stop';

export type SetupField = 'mode' | 'kind' | 'stage' | 'highSidePort';
/** What is taken as usual where it is not stated. */
export type AssumedField = SetupField | 'elevation';

/** A number, or a list of names, inside a message. */
export type Figure =
  | { readonly kind: QuantityKind; readonly value: number }
  | { readonly kind: 'readings'; readonly value: readonly ReadingId[] }
  | { readonly kind: 'preflight'; readonly value: readonly PreflightItem[] }
  | { readonly kind: 'setup'; readonly value: readonly AssumedField[] }
  | { readonly kind: 'makersCharts'; readonly value: readonly MakersChartKind[] }
  | { readonly kind: 'targetRanges'; readonly value: readonly TargetRange[] };

/** What one can wait for or come back to; pressures and line temperatures only follow. */
export type AwaitedCondition = 'outdoorDryBulb' | 'returnWetBulb' | 'returnDryBulb';

/** From where to where one condition may lie for a target to exist, if the other stays as it is. */
export interface TargetRange {
  readonly along: AwaitedCondition;
  readonly lowK: number;
  readonly highK: number;
  readonly presentK: number;
  /** `null`: the table has one condition. */
  readonly at: { readonly condition: AwaitedCondition; readonly valueK: number } | null;
}

/** A message of a catalogue `Names`: code → names of its figures (`never` for none). */
export type MessageOf<Names> = {
  [Code in keyof Names & string]: {
    readonly code: Code;
    readonly figures: Readonly<Record<Names[Code] & string, Figure>>;
  };
}[keyof Names & string];

/** Why a criterion is *not verifiable* or *not judged*. */
export interface ReasonFigures {
  // not judged: something is missing
  'readings-missing': 'readings';
  'target-missing': never;
  'capacity-missing': never;
  // by the maker's data alone: what general rules would take as usual
  'setup-not-stated': 'fields';
  'superheat-range-missing': never;
  'design-airflow-missing': never;
  'makers-limits-missing': never;
  'split-not-by-these-rules': never;
  'conditions-not-recorded': never;
  'instruments-not-recorded': never;
  'target-for-other-port': never;
  'suction-port-only': never;
  'outside-curve': never;
  'outside-range': never;
  'instruments-old': 'days';
  // not verifiable: the system or the conditions do not allow the test
  'heating-mode': never;
  'metered-outdoors': never;
  'not-in-scope': never;
  'part-stage': never;
  'not-in-charge-mode': never;
  'port-not-stated': never;
  'liquid-reading-at-discharge-port': never;
  'not-ready': 'items';
  'running-time': 'minutes' | 'least';
  'return-too-cool': 'actual' | 'least';
  'return-too-warm': 'actual' | 'most';
  'outdoor-too-cold': 'actual' | 'least';
  stale: 'readings';
  'ports-swapped': never;
  'saturation-impossible': never;
  'no-target-here': never;
  'target-may-not-exist': 'probability';
  'airflow-too-low': never;
  'airflow-not-proven': never;
  'outdoor-too-hot': 'actual' | 'most';
  'access-hole-missing': never;
  'split-above': never;
  freezing: never;
  /** The measured subcooling is negative: it is about zero, and nothing that rests on it is called *within*. */
  flash: never;
}
export type Reason = MessageOf<ReasonFigures>;
export type ReasonCode = keyof ReasonFigures;

export interface StopFigures {
  'liquid-return': 'superheat' | 'uncertainty';
  freezing: 'evaporating';
  'high-pressure': 'condensing';
  'hot-discharge': 'discharge';
}
export type Stop = MessageOf<StopFigures>;
export type StopCode = keyof StopFigures;

export interface CautionFigures {
  'saturation-impossible': never;
  'ports-swapped': 'suction' | 'liquid';
  'freeze-risk': 'evaporating';
  'wrong-refrigerant': 'written' | 'computed';
  'wrong-column': 'written' | 'computed';
  flash: 'subcooling';
  'dry-wick': 'readings';
  'wet-bulb-moved': 'before' | 'after';
  'humidity-contradiction': 'measured' | 'fromHumidity';
  'liquid-colder-than-air': 'liquid' | 'outdoor';
  'pull-down': never;
  'cool-weather': 'outdoor';
  'low-head': 'difference' | 'least';
  'long-lines': 'lift';
  'line-set-too-long': 'length' | 'most';
  'makers-chart-not-by-these-rules': 'charts';
  'makers-chart-for-orifice': 'charts';
  'makers-chart-for-other-port': 'charts';
  'makers-chart-odd': 'charts';
  'elevation-assumed': never;
  'gauge-not-zeroed': never;
  'instruments-old': 'days';
  'airflow-not-proven': never;
  'split-above': never;
  'split-below': never;
  'setup-assumed': 'fields';
  'conditions-not-recorded': never;
  'faults-may-hide': never;
  'model-grade': never;
  'model-doubtful': never;
  flammable: never;
  'near-limit': 'actual' | 'limit';
  'filter-or-coil-dirty': never;
  'unusual-reading': 'readings' | 'actual';
  'unusual-evaporating': 'actual';
  'unusual-condensing': 'actual';
  'unusual-liquid-line': 'actual';
  'unusual-subcooling': 'actual';
  'unusual-superheat': 'actual';
}
export type Caution = MessageOf<CautionFigures>;
export type CautionCode = keyof CautionFigures;

/** The one thing to do next. */
export interface NextStepFigures {
  // not fit for the test: the method that is valid
  'cooling-season-or-weigh-in': never;
  'weigh-in': never;
  'choose-other-rules': never;
  'bring-to-full-stage': never;
  'bring-to-charge-mode': never;
  'state-the-port': never;
  'state-the-setup': 'fields';
  'read-discharge-pressure': never;
  'mend-before-test': 'items';
  'find-suction-line-table': never;
  // impossible readings
  'check-hoses': never;
  'check-refrigerant-and-probes': never;
  // stops
  'thaw-then-airflow': never;
  'thaw-then-leak-search': never;
  'thaw-then-drier-drop': never;
  'thaw-then-diagnose': never;
  'shut-down-high-pressure': never;
  'shut-down-hot-discharge': never;
  'come-back-at-higher-target': 'least' | 'ranges';
  'reread-wet-bulb-then-airflow': never;
  'check-overcharge-or-air': never;
  'check-metering': never;
  // conditions
  'run-longer': 'minutes';
  'warm-the-house': 'least';
  'cool-the-house': 'most';
  'wait-for-warmer-weather': 'least';
  'wait-for-cooler-weather': 'most';
  'check-instruments': never;
  'make-access-hole': never;
  'reach-a-target': 'ranges';
  'record-conditions': never;
  // readings and targets
  'take-readings': 'readings';
  'take-readings-again': 'readings';
  'find-nameplate-target': never;
  'find-target-for-this-port': never;
  // airflow
  'raise-airflow': never;
  'measure-airflow': never;
  'suspect-probes': never;
  // data quality
  'confirm-refrigerant': never;
  'wet-the-wick': never;
  'bracket-wet-bulb-again': never;
  'place-liquid-probe-again': never;
  'read-twice': never;
  // shown by a separating test
  'recover-air-weigh-in': never;
  'mend-bulb': never;
  // too close
  'settle-with-another-reading': never;
  'settle-with-better-instrument': never;
  // outside
  'read-liquid-pair': never;
  'read-suction-pair': never;
  'cool-weather-hold': never;
  'raise-head': never;
  'leak-first': never;
  'mend-recover-weigh-in': never;
  'add-in-steps': never;
  'locate-mend-weigh-in': never;
  'recover-and-weigh-in': never;
  'measure-drier-drop': never;
  'find-restriction': never;
  'air-test-then-recover': never;
  'recover-in-steps': never;
  'check-orifice': never;
  'check-orifice-compressor-condenser': never;
  'check-bulb-and-valve': never;
  'check-valve': never;
  'check-bulb-and-screen': never;
  'check-bulb-screen-drier': never;
  'check-bulb-and-airflow': never;
  'find-restriction-recover-nothing': never;
  'check-bulb-then-recover': never;
  'weigh-in-after-heating': never;
  // within
  'read-supply-or-airflow': never;
  'record-heating': never;
  record: never;
}
export type NextStepMessage = MessageOf<NextStepFigures>;
export type NextStepCode = keyof NextStepFigures;

/** What must not be done yet, shown before the next step. */
export const NOT_YET_CODES = [
  'add-nothing',
  'recover-nothing',
  'move-no-refrigerant',
  'shut-down',
  'do-not-judge-yet',
] as const;
export type NotYetCode = (typeof NOT_YET_CODES)[number];

/** What cannot be: refused before anything is judged. */
export interface FaultFigures {
  'unknown-refrigerant': never;
  'unknown-procedure': never;
  'not-a-finite-number': never;
  'wrong-unit': never;
  'below-absolute-zero': 'actual';
  'wet-bulb-above-dry-bulb': 'wetBulb' | 'dryBulb';
  'above-critical-pressure': 'actual' | 'critical';
  'not-above-vacuum': never;
  'humidity-outside-range': never;
  'elevation-outside-range': 'least' | 'most';
  'barometer-outside-range': 'least' | 'most';
  'barometer-contradicts-elevation': 'stated' | 'expected';
  'gauge-unit-on-absolute': never;
  'must-be-positive': never;
  'must-not-be-negative': never;
  'low-above-high': never;
  // the shape of a maker's table
  'axis-missing': never;
  'axis-not-used': never;
  'axis-too-short': 'least';
  'axis-not-ascending': 'place';
  'table-too-large': 'most';
  'wrong-number-of-rows': 'given' | 'wanted';
  'wrong-length-of-row': 'row' | 'given' | 'wanted';
  'no-cell-printed': never;
  'port-does-not-fit': never;
  'too-many-tables': 'most';
  'table-given-twice': never;
}
export type FaultMessage = MessageOf<FaultFigures>;
export type Fault = FaultMessage & { readonly path: string };
