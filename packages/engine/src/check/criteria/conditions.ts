/** Weather, house and running time: whether the procedure's conditions hold. They gate by the rule, on the measured value. */
import type { Known } from '../../derivation/quantity';
import { expandedUncertainty } from '../../derivation/quantity';
import type { Caution, Reason } from '../codes';
import { LIMIT_SLACK_K } from '../conformance';
import type { CheckInput } from '../input';
import { isFixedOrifice } from '../input';
import type { CriterionResult } from '../result';
import { unjudged } from './criterion';

interface LeastTemperature {
  readonly code: 'return-too-cool' | 'outdoor-too-cold';
  readonly actual: Known;
  readonly leastK: number;
}

/** The lowest return air of the test: the recorded one, unless the return reading is lower still; without a record, the return reading. */
function lowestReturn({ visit, readings }: CheckInput): Known | undefined {
  const recorded = visit.lowestReturn;
  const now = readings.returnDryBulb?.quantity;
  if (recorded === undefined || now === undefined) return recorded ?? now;
  return now.value < recorded.value ? now : recorded;
}

function leastTemperatures(input: CheckInput): readonly LeastTemperature[] {
  const { conditions } = input.procedure;
  const returnAir = lowestReturn(input);
  const outdoor = input.readings.outdoorDryBulb?.quantity;
  const limits: LeastTemperature[] = [];
  if (outdoor !== undefined) {
    limits.push({ code: 'outdoor-too-cold', actual: outdoor, leastK: conditions.leastOutdoorK.value });
  }
  if (returnAir !== undefined) {
    limits.push({ code: 'return-too-cool', actual: returnAir, leastK: conditions.leastReturnK.value });
  }
  return limits;
}

/** The first condition that shuts the test, or `null`. What was not recorded does not shut it under general rules. */
export function conditionsGate(input: CheckInput): Reason | null {
  const { procedure, visit } = input;
  const least = procedure.conditions.leastRunningMinutes.value;
  if (visit.runningMinutes !== undefined && visit.runningMinutes < least) {
    const minutes = { kind: 'minutes', value: visit.runningMinutes } as const;
    return { code: 'running-time', figures: { minutes, least: { kind: 'minutes', value: least } } };
  }
  for (const { code, actual, leastK } of leastTemperatures(input)) {
    if (actual.value < leastK - LIMIT_SLACK_K) {
      return { code, figures: { actual: temperature(actual.value), least: temperature(leastK) } };
    }
  }
  return tooHotOutdoors(input);
}

function tooHotOutdoors({ procedure, setup, readings }: CheckInput): Reason | null {
  const most = procedure.conditions.mostOutdoorForSuperheatK;
  const outdoor = readings.outdoorDryBulb?.quantity;
  if (most === null || outdoor === undefined || !isFixedOrifice(setup)) return null;
  if (outdoor.value <= most.value + LIMIT_SLACK_K) return null;
  return { code: 'outdoor-too-hot', figures: { actual: temperature(outdoor.value), most: temperature(most.value) } };
}

/** What the procedure wants on record before it judges: conditions, the access hole, instruments in date. `null` when nothing is lacking. */
export function recordGate(input: CheckInput): Reason | null {
  const { procedure, visit } = input;
  const { unrecorded, accessHole } = procedure.conditions;
  if (unrecorded === 'gate' && !conditionsRecorded(input)) return { code: 'conditions-not-recorded', figures: {} };
  if (accessHole && visit.preflight.accessHole !== 'ok') return { code: 'access-hole-missing', figures: {} };
  return procedure.instruments.beyond === 'gate' ? instrumentsReason(input) : null;
}

function instrumentsReason({ visit, procedure }: CheckInput): Reason | null {
  const days = visit.instrumentsCheckedDaysAgo;
  const most = procedure.instruments.mostDays.value;
  if (days === undefined) return { code: 'instruments-not-recorded', figures: {} };
  if (days <= most) return null;
  return { code: 'instruments-old', figures: { days: { kind: 'days', value: days } } };
}

/** A caution for each condition whose limit lies inside the reading's uncertainty, on either side. */
export const nearLimitCautions = (input: CheckInput): readonly Caution[] =>
  leastTemperatures(input)
    .filter(({ actual, leastK }) => Math.abs(actual.value - leastK) < expandedUncertainty(actual))
    .map(({ actual, leastK }) => ({
      code: 'near-limit',
      figures: { actual: temperature(actual.value), limit: temperature(leastK) },
    }));

/** Running time, return air, outdoor air and the pre-flight: what an honest record needs. */
export function conditionsRecorded(input: CheckInput): boolean {
  const { visit, readings } = input;
  return (
    visit.runningMinutes !== undefined &&
    lowestReturn(input) !== undefined &&
    readings.outdoorDryBulb !== undefined &&
    Object.keys(visit.preflight).length > 0
  );
}

export function judgeConditions(input: CheckInput): CriterionResult {
  // the limits are those of a cooling test
  if (input.setup.mode === 'heating') {
    return unjudged('conditions', false, 'not-verifiable', { code: 'heating-mode', figures: {} });
  }
  const shut = conditionsGate(input);
  if (shut !== null) return { ...unjudged('conditions', false, 'not-verifiable', shut), byRule: 'fails' };
  const unrecorded = unjudged('conditions', false, 'not-judged', { code: 'conditions-not-recorded', figures: {} });
  return conditionsRecorded(input) ? { ...unrecorded, byRule: 'passes', finding: 'within', reason: null } : unrecorded;
}

export function judgeInstruments(input: CheckInput): CriterionResult {
  const reason = instrumentsReason(input);
  if (reason === null)
    return { ...unjudged('instruments', false, 'not-judged', null), byRule: 'passes', finding: 'within' };
  const judged = unjudged('instruments', false, 'not-judged', reason);
  if (reason.code === 'instruments-not-recorded') return judged;
  const gate = input.procedure.instruments.beyond === 'gate';
  return { ...judged, byRule: 'fails', finding: gate ? 'not-verifiable' : 'not-judged' };
}

const temperature = (value: number) => ({ kind: 'temperatureK', value }) as const;
