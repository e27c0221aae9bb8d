/** Weather, house and running time: whether the procedure's conditions hold. They gate by the rule, on the measured value. */
import type { Known } from '../../derivation/quantity';
import { expandedUncertainty } from '../../derivation/quantity';
import type { Caution, Reason } from '../codes';
import { LIMIT_SLACK_K } from '../conformance';
import type { CheckInput } from '../input';
import { isFixedOrifice } from '../input';
import type { CriterionResult } from '../result';
import { unjudged } from './criterion';

interface TemperatureLimit {
  readonly code: 'return-too-cool' | 'outdoor-too-cold' | 'outdoor-too-hot';
  readonly actual: Known;
  readonly limitK: number;
}

/** The lowest return air of the test: the recorded one, unless the return reading is lower still; without a record, the return reading. */
function lowestReturn({ visit, readings }: CheckInput): Known | undefined {
  const recorded = visit.lowestReturn;
  const now = readings.returnDryBulb?.quantity;
  if (recorded === undefined || now === undefined) return recorded ?? now;
  return now.value < recorded.value ? now : recorded;
}

function temperatureLimits(input: CheckInput): readonly TemperatureLimit[] {
  const { leastOutdoorK, leastReturnK, mostOutdoorForSuperheatK } = input.procedure.conditions;
  const returnAir = lowestReturn(input);
  const outdoor = input.readings.outdoorDryBulb?.quantity;
  const limits: TemperatureLimit[] = [];
  if (outdoor !== undefined) {
    limits.push({ code: 'outdoor-too-cold', actual: outdoor, limitK: leastOutdoorK.value });
  }
  if (returnAir !== undefined) {
    limits.push({ code: 'return-too-cool', actual: returnAir, limitK: leastReturnK.value });
  }
  if (outdoor !== undefined && mostOutdoorForSuperheatK !== null && isFixedOrifice(input.setup)) {
    limits.push({ code: 'outdoor-too-hot', actual: outdoor, limitK: mostOutdoorForSuperheatK.value });
  }
  return limits;
}

/** The first condition that shuts the test, or `null`. What was not recorded does not shut it here. */
export function conditionsGate(input: CheckInput): Reason | null {
  const { procedure, visit } = input;
  const least = procedure.conditions.leastRunningMinutes.value;
  if (visit.runningMinutes !== undefined && visit.runningMinutes < least) {
    const minutes = { kind: 'minutes', value: visit.runningMinutes } as const;
    return { code: 'running-time', figures: { minutes, least: { kind: 'minutes', value: least } } };
  }
  return (
    temperatureLimits(input)
      .map(beyondLimit)
      .find((reason) => reason !== null) ?? null
  );
}

function beyondLimit({ code, actual, limitK }: TemperatureLimit): Reason | null {
  const [at, limit] = [temperature(actual.value), temperature(limitK)];
  if (code === 'outdoor-too-hot') {
    return actual.value > limitK + LIMIT_SLACK_K ? { code, figures: { actual: at, most: limit } } : null;
  }
  return actual.value < limitK - LIMIT_SLACK_K ? { code, figures: { actual: at, least: limit } } : null;
}

/** What the procedure wants on record before it judges: conditions, the access hole, instruments in date. `null` when nothing is lacking. */
export function recordGate(input: CheckInput): Reason | null {
  const { unrecorded } = input.procedure.conditions;
  if (unrecorded === 'gate' && !conditionsRecorded(input)) return { code: 'conditions-not-recorded', figures: {} };
  return accessHoleReason(input) ?? (input.procedure.instruments.beyond === 'gate' ? instrumentsReason(input) : null);
}

const accessHoleReason = ({ procedure, visit }: CheckInput): Reason | null =>
  procedure.conditions.accessHole && visit.preflight.accessHole !== 'ok'
    ? { code: 'access-hole-missing', figures: {} }
    : null;

function instrumentsReason({ visit, procedure }: CheckInput): Reason | null {
  const days = visit.instrumentsCheckedDaysAgo;
  const most = procedure.instruments.mostDays.value;
  if (days === undefined) return { code: 'instruments-not-recorded', figures: {} };
  if (days <= most) return null;
  return { code: 'instruments-old', figures: { days: { kind: 'days', value: days } } };
}

/** A caution for each condition whose limit lies inside the reading's uncertainty, on either side. */
export const nearLimitCautions = (input: CheckInput): readonly Caution[] =>
  temperatureLimits(input)
    .filter(({ actual, limitK }) => Math.abs(actual.value - limitK) < expandedUncertainty(actual))
    .map(({ actual, limitK }) => ({
      code: 'near-limit',
      figures: { actual: temperature(actual.value), limit: temperature(limitK) },
    }));

/** Running time, return air, outdoor air and the pre-flight: what an honest record needs. A procedure that gates on it wants the lowest return air itself. */
export function conditionsRecorded(input: CheckInput): boolean {
  const { visit, readings, procedure } = input;
  const returnAir = procedure.conditions.unrecorded === 'gate' ? visit.lowestReturn : lowestReturn(input);
  return (
    visit.runningMinutes !== undefined &&
    returnAir !== undefined &&
    readings.outdoorDryBulb !== undefined &&
    Object.keys(visit.preflight).length > 0
  );
}

export function judgeConditions(input: CheckInput): CriterionResult {
  // the limits are those of a cooling test
  if (input.setup.mode === 'heating') {
    return unjudged('conditions', false, 'not-verifiable', { code: 'heating-mode', figures: {} });
  }
  const required = input.procedure.conditions.unrecorded === 'gate';
  const shut = conditionsGate(input);
  if (shut !== null) return { ...unjudged('conditions', required, 'not-verifiable', shut), byRule: 'fails' };
  if (!conditionsRecorded(input)) {
    return unjudged('conditions', required, 'not-judged', { code: 'conditions-not-recorded', figures: {} });
  }
  const noHole = accessHoleReason(input);
  if (noHole === null) return met('conditions', required);
  return input.visit.preflight.accessHole === 'not-ok'
    ? { ...unjudged('conditions', required, 'not-verifiable', noHole), byRule: 'fails' }
    : unjudged('conditions', required, 'not-judged', noHole);
}

export function judgeInstruments(input: CheckInput): CriterionResult {
  const required = input.procedure.instruments.beyond === 'gate';
  const reason = instrumentsReason(input);
  if (reason === null) return met('instruments', required);
  if (reason.code === 'instruments-not-recorded') return unjudged('instruments', required, 'not-judged', reason);
  const finding = required ? 'not-verifiable' : 'not-judged';
  return { ...unjudged('instruments', required, finding, reason), byRule: 'fails' };
}

const met = (criterion: 'conditions' | 'instruments', required: boolean): CriterionResult => ({
  ...unjudged(criterion, required, 'not-judged', null),
  byRule: 'passes',
  finding: 'within',
});

const temperature = (value: number) => ({ kind: 'temperatureK', value }) as const;
