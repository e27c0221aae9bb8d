/** Weather, house and running time: whether the procedure's conditions hold. They gate by the rule, on the measured value. */
import type { Known } from '../../derivation/quantity';
import { expandedUncertainty } from '../../derivation/quantity';
import { MAKERS_CHART_FACTS } from '../../methods/makers-chart/kinds';
import type { ChargeMethod } from '../charge-method';
import { chargeMethod } from '../charge-method';
import type { Caution, Reason } from '../codes';
import { LIMIT_SLACK_K } from '../conformance';
import type { CheckInput } from '../input';
import { isFixedOrifice } from '../input';
import type { CriterionResult } from '../result';
import { unjudged } from './criterion';

interface TemperatureLimit {
  readonly code: 'return-too-cool' | 'return-too-warm' | 'outdoor-too-cold' | 'outdoor-too-hot';
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

/**
 * The limits that hold for a method: those the maker states beside its table take the place of the procedure's, since the maker comes first. The
 * procedure's are those of a cooling test.
 */
function temperatureLimits(input: CheckInput, method: ChargeMethod | null): readonly TemperatureLimit[] {
  const limits: TemperatureLimit[] = [];
  const add = (code: TemperatureLimit['code'], actual: Known | undefined, limitK: number | undefined): void => {
    if (actual !== undefined && limitK !== undefined) limits.push({ code, actual, limitK });
  };
  const outdoor = input.readings.outdoorDryBulb?.quantity;
  const stated = method?.chart;
  add('outdoor-too-cold', outdoor, leastOutdoorK(input, method));
  add('return-too-cool', lowestReturn(input), stated?.leastReturnK ?? leastReturnK(input));
  add('outdoor-too-hot', outdoor, mostOutdoorK(input, method));
  add('return-too-warm', input.readings.returnDryBulb?.quantity, stated?.mostReturnK);
  return limits;
}

/** The maker's limit; else the procedure's, or that of the method where it is higher. */
export function leastOutdoorK({ procedure, setup }: CheckInput, method: ChargeMethod | null): number | undefined {
  if (method?.chart?.leastOutdoorK !== undefined) return method.chart.leastOutdoorK;
  const ofProcedure = setup.mode === 'cooling' ? procedure.conditions.leastOutdoorK?.value : undefined;
  const ofMethod = method === null ? undefined : MAKERS_CHART_FACTS[method.kind].leastOutdoorK?.value;
  const both = [ofProcedure, ofMethod].filter((limit) => limit !== undefined);
  return both.length === 0 ? undefined : Math.max(...both);
}

const leastReturnK = ({ procedure, setup }: CheckInput): number | undefined =>
  setup.mode === 'cooling' ? procedure.conditions.leastReturnK?.value : undefined;

/** The maker's limit, else the procedure's. */
export function mostOutdoorK({ procedure, setup }: CheckInput, method: ChargeMethod | null): number | undefined {
  if (method?.chart?.mostOutdoorK !== undefined) return method.chart.mostOutdoorK;
  const bySuperheat = setup.mode === 'cooling' && isFixedOrifice(setup);
  return bySuperheat ? procedure.conditions.mostOutdoorForSuperheatK?.value : undefined;
}

/** The first condition that shuts the test, or `null`. What was not recorded does not shut it here. */
export function conditionsGate(input: CheckInput, method = chargeMethod(input)): Reason | null {
  const { procedure, visit } = input;
  const least = procedure.conditions.leastRunningMinutes.value;
  if (visit.runningMinutes !== undefined && visit.runningMinutes < least) {
    const minutes = { kind: 'minutes', value: visit.runningMinutes } as const;
    return { code: 'running-time', figures: { minutes, least: { kind: 'minutes', value: least } } };
  }
  return (
    temperatureLimits(input, method)
      .map(beyondLimit)
      .find((reason) => reason !== null) ?? null
  );
}

function beyondLimit({ code, actual, limitK }: TemperatureLimit): Reason | null {
  const [at, limit] = [temperature(actual.value), temperature(limitK)];
  if (code === 'outdoor-too-hot' || code === 'return-too-warm') {
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
  temperatureLimits(input, chargeMethod(input))
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
  // without a heating table there is nothing that the limits would be of
  if (input.setup.mode === 'heating' && chargeMethod(input) === null) {
    return unjudged('conditions', false, 'not-verifiable', { code: 'heating-mode', figures: {} });
  }
  const required = input.procedure.conditions.unrecorded === 'gate';
  const shut = conditionsGate(input);
  if (shut !== null) return { ...unjudged('conditions', required, 'not-verifiable', shut), byRule: 'fails' };
  if (!conditionsRecorded(input)) {
    return unjudged('conditions', required, 'not-judged', { code: 'conditions-not-recorded', figures: {} });
  }
  if (input.procedure.assumes === 'nothing' && temperatureLimits(input, chargeMethod(input)).length === 0) {
    return unjudged('conditions', required, 'not-judged', { code: 'makers-limits-missing', figures: {} });
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
