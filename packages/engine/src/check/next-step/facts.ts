/** What the next-step table looks at: a handful of closed facts, each with a few values, drawn from the finished criteria. */
import { isKnown } from '../../derivation/quantity';
import { probabilityBetween } from '../../numerics/normal-distribution';
import { isCoolWeather, lowHead } from '../cautions';
import type { Caution, OverallFinding, Reason, ReasonCode, Stop, StopCode } from '../codes';
import { conditionsGate, recordGate } from '../criteria/conditions';
import { airflowGate } from '../criteria/air';
import { differenceRule, plainRule } from '../procedure';
import type { AirflowEvidence, SplitEvidence } from '../procedure';
import { guidingWindow } from '../criteria/charge';
import type { ChargeTarget } from '../criteria/charge-target';
import { NEWER_REFRIGERANTS } from '../../diagnosis/usual-bands';
import { MAKERS_CHART_FACTS } from '../../methods/makers-chart/kinds';
import { OUR_CHOICE } from '../../methods/sourced-figure';
import type { ChargeMethod } from '../charge-method';
import { LIMIT_SLACK_K } from '../conformance';
import type { DerivedQuantities } from '../derived-quantities';
import type { CheckInput } from '../input';
import { isFixedOrifice } from '../input';
import type { CriterionResult } from '../result';
import { airTest, drierTest } from '../separating-tests';
import { mustShutDown } from '../stops';

export interface Facts {
  readonly unfit: ReasonCode | 'none';
  readonly impossible: 'none' | 'ports-swapped' | 'saturation-impossible';
  readonly stop: StopCode | 'none';
  readonly shutDown: 'yes' | 'no';
  readonly condition:
    'open' | 'running-time' | 'return-too-cool' | 'return-too-warm' | 'outdoor-too-cold' | 'outdoor-too-hot';
  /** What the procedure wants on record and is not. */
  readonly record: 'open' | 'conditions' | 'access-hole' | 'instruments';
  /** Whether the procedure shuts the test for want of proof. */
  readonly airflowProof: 'enough' | 'wanted';
  readonly runningTime: 'recorded' | 'unrecorded';
  /** Why a required criterion has no number, or `none`. */
  readonly lacking:
    | 'none'
    | 'setup'
    | 'readings'
    | 'stale'
    | 'nameplate-target'
    | 'target-port'
    | 'port'
    | 'outside-tables'
    | 'suction-line-table';
  readonly superheatTarget: 'clear' | 'near-floor' | 'none-here' | 'not-used';
  readonly metering: 'orifice' | 'valve';
  /** What decides: superheat of an orifice or subcooling of a valve, another method of the maker, or one in heating. */
  readonly method: 'own' | 'makers' | 'heating';
  /** Whether a maker's table has a target here. */
  readonly makersTarget: 'clear' | 'none-here';
  /** How full the system is by the maker's method, where that decides. */
  readonly charge: 'unknown' | 'low' | 'within' | 'high';
  /** Where nothing counts, what the split shows: it may still tell the cause of a stop; of a stop alone, where these rules do not judge by it. */
  readonly airflow: AirflowEvidence;
  readonly airSeen: 'yes' | 'no';
  readonly quality:
    'good' | 'wrong-refrigerant' | 'dry-wick' | 'wet-bulb-moved' | 'liquid-colder-than-air' | 'pull-down';
  readonly overall: OverallFinding;
  readonly settling: 'possible' | 'impossible';
  readonly superheat: Side;
  /** By the target where one was entered, see `subcoolingLevel` for the rest; on a valve by whatever decides how full the system is. */
  readonly subcooling: Side;
  readonly subcoolingLevel: 'unread' | 'unreadable' | 'low' | 'unclear' | 'clear' | 'high';
  /** `warm` also stands for a valve whose head was raised by the maker's method. */
  readonly weather: 'warm' | 'cool' | 'low-head';
  readonly leak: 'search' | 'found' | 'add' | 'locate' | 'recover';
  readonly head: 'usual' | 'high';
  /** What the separating tests have shown; `open` where one was not made, or cannot count. */
  readonly drier: 'open' | 'small' | 'drop';
  readonly air: 'open' | 'none' | 'found' | 'below';
  readonly bulb: 'open' | 'right' | 'wrong';
}

export type Side = 'unknown' | 'within' | 'above' | 'below';

export interface Evidence {
  readonly input: CheckInput;
  readonly derived: DerivedQuantities;
  readonly criteria: readonly CriterionResult[];
  /** By what the charge is decided, and its target; `null` in heating without a heating table. */
  readonly method: ChargeMethod | null;
  readonly target: ChargeTarget | null;
  readonly unfit: Reason | null;
  readonly impossible: Reason | null;
  readonly stops: readonly Stop[];
  readonly cautions: readonly Caution[];
  readonly airflow: AirflowEvidence;
  readonly split: SplitEvidence;
  readonly overall: OverallFinding;
}

export const NEXT_STEP_FIGURES = {
  /** Up to this target even a right charge runs near the floor. */
  nearFloorTargetK: differenceRule(7, 'deltaF', ['choice', "Our choice, by the ± and the floor of the makers' chart"]),
  /** A target this high can be told from the floor. */
  clearTargetK: differenceRule(8, 'deltaF', ['choice', "Our choice, by the ± and the floor of the makers' chart"]),
  /** Steps of one visit add up to at most this part of the factory charge before the charge is recovered and weighed. */
  mostAddedFraction: plainRule(0.1, '10 %', ['choice', OUR_CHOICE]),
  /** Condensing over outdoor air that suggests air in the system when subcooling is high: of newer systems, and of others. */
  highHeadK: differenceRule(20, 'deltaF', ['choice', OUR_CHOICE]),
  highHeadOlderK: differenceRule(30, 'deltaF', ['choice', OUR_CHOICE]),
} as const;

/** Rounding of the conversions; far below any scale. */
const SLACK_KG = 1e-9;

export function gatherFacts(evidence: Evidence): Facts {
  const { input, derived, criteria, overall, airflow } = evidence;
  const { setup, visit, readings } = input;
  return {
    unfit: evidence.unfit?.code ?? 'none',
    impossible: impossibility(evidence.impossible),
    stop: evidence.stops[0]?.code ?? 'none',
    shutDown: evidence.stops.some((stop) => mustShutDown(stop, derived)) ? 'yes' : 'no',
    condition: conditionFact(conditionsGate(input)?.code),
    record: recordFact(input),
    airflowProof: airflowGate(input.procedure, airflow)?.code === 'airflow-not-proven' ? 'wanted' : 'enough',
    runningTime: visit.runningMinutes === undefined ? 'unrecorded' : 'recorded',
    lacking: whatIsLacking(criteria),
    superheatTarget: superheatTargetFact(evidence),
    metering: isFixedOrifice(setup) ? 'orifice' : 'valve',
    method: methodFact(evidence),
    makersTarget: makersTargetFact(evidence),
    charge: chargeFact(evidence),
    airflow: airflow === 'nothing' ? splitShown(evidence) : airflow,
    airSeen: readings.supplyDryBulb !== undefined || readings.airflow !== undefined ? 'yes' : 'no',
    quality: readingQuality(evidence.cautions),
    overall,
    settling: canSettle(evidence) ? 'possible' : 'impossible',
    superheat: superheatSide(evidence),
    subcooling: subcoolingSide(evidence),
    subcoolingLevel: subcoolingLevel(evidence),
    weather: weatherFact(input),
    leak: leakFact(input),
    head: isHeadHigh(input, derived) ? 'high' : 'usual',
    drier: drierFact(input),
    air: airFact(input),
    bulb: bulbFact(input),
  };
}

function conditionFact(code: ReasonCode | undefined): Facts['condition'] {
  const shut =
    code === 'running-time' ||
    code === 'return-too-cool' ||
    code === 'return-too-warm' ||
    code === 'outdoor-too-cold' ||
    code === 'outdoor-too-hot';
  return shut ? code : 'open';
}

function recordFact(input: CheckInput): Facts['record'] {
  const code = recordGate(input)?.code;
  if (code === undefined) return 'open';
  if (code === 'access-hole-missing') return 'access-hole';
  return code === 'conditions-not-recorded' ? 'conditions' : 'instruments';
}

const impossibility = (reason: Reason | null): Facts['impossible'] =>
  reason === null ? 'none' : reason.code === 'ports-swapped' ? 'ports-swapped' : 'saturation-impossible';

/** The first required criterion without a finding says what is lacking; readings come before targets. */
function whatIsLacking(criteria: readonly CriterionResult[]): Facts['lacking'] {
  const codes = criteria.filter(({ required }) => required).map(({ reason }) => reason?.code);
  if (codes.includes('setup-not-stated')) return 'setup';
  if (codes.includes('readings-missing')) return 'readings';
  if (codes.includes('stale')) return 'stale';
  if (codes.includes('target-for-other-port')) return 'target-port';
  if (codes.includes('target-missing')) return 'nameplate-target';
  if (codes.includes('liquid-reading-at-discharge-port')) return 'port';
  if (codes.includes('suction-port-only')) return 'suction-line-table';
  return codes.includes('outside-curve') || codes.includes('outside-range') ? 'outside-tables' : 'none';
}

function superheatTargetFact({ method, target, criteria }: Evidence): Facts['superheatTarget'] {
  if (method?.kind !== 'superheat' || target === null) return 'not-used';
  const reason = criteria.find(({ criterion }) => criterion === 'superheat')?.reason?.code;
  if (target.quantity.state === 'refused' && target.source !== 'entered') return 'none-here';
  if (reason === 'no-target-here' || reason === 'target-may-not-exist') return 'none-here';
  const nearFloor =
    isKnown(target.quantity) && target.quantity.value <= NEXT_STEP_FIGURES.nearFloorTargetK.value + LIMIT_SLACK_K;
  return nearFloor ? 'near-floor' : 'clear';
}

function methodFact({ input, method }: Evidence): Facts['method'] {
  if (input.setup.mode === 'heating') return 'heating';
  return method === null || method.kind === 'superheat' || method.kind === 'subcooling' ? 'own' : 'makers';
}

function makersTargetFact({ method, criteria }: Evidence): Facts['makersTarget'] {
  const reason = criteria.find(({ criterion }) => criterion === method?.kind)?.reason?.code;
  const none = reason === 'no-target-here' || reason === 'target-may-not-exist';
  return method?.chart != null && none ? 'none-here' : 'clear';
}

/** What a deviation from the maker's table means: which side is too much differs from method to method. */
function chargeFact({ method, criteria }: Evidence): Facts['charge'] {
  if (method === null || method.kind === 'superheat' || method.kind === 'subcooling') return 'unknown';
  const side = sideOf(criteria, method.kind);
  if (side === 'unknown' || side === 'within') return side;
  return side === MAKERS_CHART_FACTS[method.kind].overchargeIs ? 'high' : 'low';
}

const splitShown = ({ input, split, stops }: Evidence): SplitEvidence =>
  input.procedure.temperatureSplit.judged || stops.length > 0 ? split : 'nothing';

/** Of a valve whose superheat is not judged: against the usual window. */
function superheatSide({ input, derived, criteria }: Evidence): Side {
  const window = guidingWindow(input);
  if (window === null) return sideOf(criteria, isFixedOrifice(input.setup) ? 'superheat' : 'superheat-window');
  const { superheat } = derived;
  if (!isKnown(superheat)) return 'unknown';
  if (superheat.value < window.lowK - LIMIT_SLACK_K) return 'below';
  return superheat.value > window.highK + LIMIT_SLACK_K ? 'above' : 'within';
}

const SUBCOOLING_OF_CHARGE = { unknown: 'unknown', low: 'below', within: 'within', high: 'above' } as const;

function subcoolingSide(evidence: Evidence): Side {
  const valve = !isFixedOrifice(evidence.input.setup);
  return valve && methodFact(evidence) === 'makers'
    ? SUBCOOLING_OF_CHARGE[chargeFact(evidence)]
    : sideOf(evidence.criteria, 'subcooling');
}

function readingQuality(cautions: readonly Caution[]): Facts['quality'] {
  const has = (code: Caution['code']): boolean => cautions.some((caution) => caution.code === code);
  if (has('wrong-refrigerant')) return 'wrong-refrigerant';
  if (has('dry-wick')) return 'dry-wick';
  if (has('wet-bulb-moved')) return 'wet-bulb-moved';
  if (has('liquid-colder-than-air')) return 'liquid-colder-than-air';
  return has('pull-down') ? 'pull-down' : 'good';
}

/** Whether these instruments could ever call the criterion within: at the middle of its band, at these conditions. */
function canSettle({ criteria, input, method, target }: Evidence): boolean {
  const guard = input.procedure.decision.clearFrom.value;
  return criteria
    .filter(({ required, finding }) => required && finding === 'too-close-to-call')
    .every(({ criterion, tolerance, deviation, actual }) => {
      const measured = deviation ?? actual;
      if (measured === null || tolerance?.low == null || tolerance.high === null) return true;
      const middle = 0.5 * (tolerance.low + tolerance.high);
      const most = probabilityBetween(middle, measured.u, tolerance.low, tolerance.high);
      return most * (criterion === method?.kind && target !== null ? 1 - target.probabilityOfNoTarget : 1) >= guard;
    });
}

/** A clear finding, else what the rule says of the number. */
function sideOf(criteria: readonly CriterionResult[], id: CriterionResult['criterion']): Side {
  const result = criteria.find(({ criterion }) => criterion === id);
  if (result?.byRule == null || result.tolerance === null) return 'unknown';
  if (result.finding === 'above' || result.finding === 'below') return result.finding;
  if (result.byRule === 'passes') return 'within';
  const measured = result.deviation ?? result.actual;
  const { high } = result.tolerance;
  return measured !== null && high !== null && measured.value > high ? 'above' : 'below';
}

/** On a fixed orifice against its target, where one was entered; else by the general levels. */
function subcoolingLevel({ input, derived, criteria }: Evidence): Facts['subcoolingLevel'] {
  const { subcooling } = derived;
  if (!isKnown(subcooling)) return input.setup.highSidePort === 'none' ? 'unreadable' : 'unread';
  const side = isFixedOrifice(input.setup) ? sideOf(criteria, 'subcooling') : 'unknown';
  if (side !== 'unknown') return LEVEL_BY_TARGET[side];
  const { lowBelowK, clearFromK, highAboveK } = input.procedure.subcooling;
  if (subcooling.value < lowBelowK.value) return 'low';
  if (subcooling.value < clearFromK.value) return 'unclear';
  return subcooling.value > highAboveK.value ? 'high' : 'clear';
}

const LEVEL_BY_TARGET = { below: 'low', within: 'clear', above: 'high' } as const;

/** A leak that was found is mended first, whatever else; the charge of a new line set needs no search and has no cap. */
function leakFact({ setup, visit }: CheckInput): Facts['leak'] {
  if (visit.leakSearch === 'found') return 'found';
  if (visit.commissioning) return 'add';
  if (visit.additionsOnEarlierVisits > 0) return 'locate';
  if (visit.leakSearch !== 'none-found') return 'search';
  const { factoryChargeKg } = setup;
  const used =
    factoryChargeKg !== undefined &&
    visit.addedThisVisitKg >= NEXT_STEP_FIGURES.mostAddedFraction.value * factoryChargeKg - SLACK_KG;
  return used ? 'recover' : 'add';
}

/** A head raised on purpose makes a valve's reading count in cool weather; an orifice is judged by the outdoor air, which it does not change. */
function weatherFact(input: CheckInput): Facts['weather'] {
  if (!isCoolWeather(input)) return 'warm';
  if (lowHead(input) !== null) return 'low-head';
  return input.visit.headRaised && !isFixedOrifice(input.setup) ? 'warm' : 'cool';
}

function isHeadHigh({ setup }: CheckInput, { condensingOverAmbient }: DerivedQuantities): boolean {
  const { highHeadK, highHeadOlderK } = NEXT_STEP_FIGURES;
  const limit = (NEWER_REFRIGERANTS.includes(setup.refrigerant) ? highHeadK : highHeadOlderK).value;
  return isKnown(condensingOverAmbient) && condensingOverAmbient.value > limit;
}

function drierFact(input: CheckInput): Facts['drier'] {
  const { finding } = drierTest(input);
  return finding === 'drop' || finding === 'small' ? finding : 'open';
}

function airFact(input: CheckInput): Facts['air'] {
  const { finding } = airTest(input);
  return finding === 'found' || finding === 'none' || finding === 'below' ? finding : 'open';
}

function bulbFact({ visit }: CheckInput): Facts['bulb'] {
  const { bulb } = visit.tests;
  if (bulb === undefined) return 'open';
  return bulb === 'right' ? 'right' : 'wrong';
}
