/** What ends the check at once: the compressor, the coil or the person is at risk. */
import type { Quantity } from '../derivation/quantity';
import { bareValue, expandedUncertainty, isKnown } from '../derivation/quantity';
import { SUPERHEAT_CHART_A } from '../methods/data/superheat-chart-a';
import { COMMON_PRACTICE, OUR_CHOICE } from '../methods/sourced-figure';
import type { RefrigerantId } from '../refrigerants/catalogue';
import { pressureDifferenceToPa } from '../units';
import type { Caution, Stop } from './codes';
import { LIMIT_SLACK_K } from './conformance';
import type { DerivedQuantities } from './derived-quantities';
import type { CheckInput } from './input';
import { isFixedOrifice } from './input';
import { differenceRule, plainRule, temperatureRule } from './procedure';
import type { Rule } from './procedure';

const gaugePressure = (psig: number): Rule =>
  plainRule(pressureDifferenceToPa(psig, 'psi'), `${psig} psig`, ['choice', OUR_CHOICE]);

const HIGH_SIDE = gaugePressure(560);
const HIGH_SIDE_OLDER = gaugePressure(370);

export const STOP_FIGURES = {
  /** Mean evaporating temperature at which frost is certain to grow, and at which it may. */
  freezingStopK: temperatureRule(28, 'degF', ['choice', OUR_CHOICE]),
  freezingK: temperatureRule(32, 'degF', ['practice', 'Freezing point of water']),
  /** Fall of the suction pressure from one set of readings to the next that is more than its needle's unrest. */
  fallPa: plainRule(pressureDifferenceToPa(2, 'psi'), '2 psi', ['choice', OUR_CHOICE]),
  /** Least superheat at the suction port of a fixed orifice, whatever the procedure. */
  floorK: differenceRule(5, 'deltaF', ['read', SUPERHEAT_CHART_A.source]),
  mostCondensingOverAirK: differenceRule(45, 'deltaF', ['choice', OUR_CHOICE]),
  mostDischargeK: temperatureRule(225, 'degF', ['practice', COMMON_PRACTICE]),
} as const;

/** High-side gauge pressure without a limit of the unit's own. */
export const MOST_HIGH_SIDE_GAUGE_PA: Readonly<Partial<Record<RefrigerantId, Rule>>> = {
  'R-410A': HIGH_SIDE,
  'R-32': HIGH_SIDE,
  'R-454B': HIGH_SIDE,
  'R-22': HIGH_SIDE_OLDER,
  'R-407C': HIGH_SIDE_OLDER,
};

/** Metered at the coil at full speed: elsewhere the usual figures of the cycle do not hold. */
const atFullStage = ({ setup }: CheckInput): boolean =>
  setup.stage !== 'part' && (setup.kind === 'split' || setup.kind === 'packaged');

/** A stopped system makes most stops meaningless; heating turns the cycle around. */
const inFullCooling = (input: CheckInput): boolean =>
  input.setup.mode === 'cooling' && atFullStage(input) && input.visit.runningMinutes !== 0;

export function findStops(input: CheckInput, derived: DerivedQuantities): readonly Stop[] {
  return [
    liquidReturn(input, derived),
    freezing(input, derived),
    highPressure(input, derived),
    hotDischarge(input),
  ].filter((stop) => stop !== null);
}

/** Superheat about zero, or under the floor of a fixed orifice (maker's chart: never under 5 °F at the suction port). */
function liquidReturn(input: CheckInput, { superheat }: DerivedQuantities): Stop | null {
  if (!inFullCooling(input) || !isKnown(superheat)) return null;
  const uncertainty = expandedUncertainty(superheat);
  // far below zero the readings contradict each other: `saturation-impossible` says so
  if (superheat.value < -uncertainty) return null;
  const floor = isFixedOrifice(input.setup) ? STOP_FIGURES.floorK.value : 0;
  if (superheat.value - uncertainty > 0 && superheat.value >= floor - LIMIT_SLACK_K) return null;
  return {
    code: 'liquid-return',
    figures: {
      superheat: { kind: 'differenceK', value: superheat.value },
      uncertainty: { kind: 'differenceK', value: uncertainty },
    },
  };
}

/** Whether the compressor must be off at once; a superheat under the floor but clear of zero leaves time to act. */
export const mustShutDown = ({ code }: Stop, { superheat }: DerivedQuantities): boolean =>
  code !== 'liquid-return' || (isKnown(superheat) && superheat.value <= expandedUncertainty(superheat));

/** Any system in cooling, a mini-split and a part stage too. */
function freezing(input: CheckInput, { meanEvaporatingTemperature }: DerivedQuantities): Stop | null {
  const mean = coolingCoil(input, meanEvaporatingTemperature);
  if (mean === null) return null;
  const worsening = input.visit.iceSeen || isFalling(input);
  if (mean > STOP_FIGURES.freezingStopK.value && !(mean <= STOP_FIGURES.freezingK.value && worsening)) return null;
  return { code: 'freezing', figures: { evaporating: { kind: 'temperatureK', value: mean } } };
}

/** The coil is at the freezing point but neither iced nor getting colder. */
export function freezeRisk(input: CheckInput, derived: DerivedQuantities): Caution | null {
  const mean = coolingCoil(input, derived.meanEvaporatingTemperature);
  if (mean === null || mean > STOP_FIGURES.freezingK.value || freezing(input, derived) !== null) return null;
  return { code: 'freeze-risk', figures: { evaporating: { kind: 'temperatureK', value: mean } } };
}

const coolingCoil = ({ setup, visit }: CheckInput, mean: Quantity): number | null =>
  setup.mode === 'cooling' && visit.runningMinutes !== 0 ? (bareValue(mean) ?? null) : null;

/** Suction pressure, and with it the coil, lower than in the earlier readings. By the bare values: a poorer gauge must not lift a stop. */
function isFalling({ visit, readings }: CheckInput): boolean {
  const before = visit.earlier?.readings.suctionPressure?.quantity;
  const now = readings.suctionPressure?.quantity;
  return before !== undefined && now !== undefined && before.value - now.value > STOP_FIGURES.fallPa.value;
}

function highPressure(input: CheckInput, derived: DerivedQuantities): Stop | null {
  const { setup, visit, readings } = input;
  const pressures = [readings.liquidPressure, readings.dischargePressure].flatMap((r) => (r ? [r.quantity.value] : []));
  const highest = Math.max(...pressures);
  const { condensingBubbleTemperature, condensingOverAmbient } = derived;
  const overAirK = bareValue(condensingOverAmbient) ?? 0;
  const overAir = inFullCooling(input) && !visit.headRaised && overAirK > STOP_FIGURES.mostCondensingOverAirK.value;
  const generalLimit = inFullCooling(input) ? MOST_HIGH_SIDE_GAUGE_PA[setup.refrigerant]?.value : undefined;
  const limit = setup.maxHighPressurePa ?? (generalLimit && generalLimit + setup.atmosphere.value);
  if (!overAir && !(limit !== undefined && highest > limit)) return null;
  const condensingK = bareValue(condensingBubbleTemperature);
  const condensing =
    condensingK === undefined
      ? ({ kind: 'pressurePa', value: highest } as const)
      : ({ kind: 'temperatureK', value: condensingK } as const);
  return { code: 'high-pressure', figures: { condensing } };
}

/** In cooling and in heating alike; an inverter or a part stage has its own figure. */
function hotDischarge(input: CheckInput): Stop | null {
  const discharge = input.readings.dischargeLineTemperature?.quantity;
  if (discharge === undefined || !atFullStage(input) || discharge.value <= STOP_FIGURES.mostDischargeK.value)
    return null;
  return { code: 'hot-discharge', figures: { discharge: { kind: 'temperatureK', value: discharge.value } } };
}
