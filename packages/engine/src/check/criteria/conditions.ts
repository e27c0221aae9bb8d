/** Weather, house and running time: whether the procedure's conditions hold. They gate by the rule, on the measured value. */
import type { Known } from '../../derivation/quantity';
import { expandedUncertainty } from '../../derivation/quantity';
import type { Caution, Reason } from '../codes';
import { LIMIT_SLACK_K } from '../conformance';
import type { CheckInput } from '../input';
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
  return null;
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

export function judgeInstruments({ visit, procedure }: CheckInput): CriterionResult {
  const days = visit.instrumentsCheckedDaysAgo;
  if (days === undefined) {
    return unjudged('instruments', false, 'not-judged', { code: 'instruments-not-recorded', figures: {} });
  }
  const old = unjudged('instruments', false, 'not-judged', {
    code: 'instruments-old',
    figures: { days: { kind: 'days', value: days } },
  });
  if (days > procedure.instruments.cautionAfterDays.value) return { ...old, byRule: 'fails' };
  return { ...old, byRule: 'passes', finding: 'within', reason: null };
}

const temperature = (value: number) => ({ kind: 'temperatureK', value }) as const;
