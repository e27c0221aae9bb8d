/** What ends the check at once: the compressor, the coil or the person is at risk. Figures: see each; `choice` is ours, open to better evidence. */
import type { Quantity } from '../derivation/quantity';
import { bareValue, expandedUncertainty, isKnown } from '../derivation/quantity';
import type { RefrigerantId } from '../refrigerants/catalogue';
import { differenceToK, pressureDifferenceToPa, temperatureToK } from '../units';
import type { Caution, Stop } from './codes';
import { LIMIT_SLACK_K } from './conformance';
import type { DerivedQuantities } from './derived-quantities';
import type { CheckInput } from './input';
import { isFixedOrifice } from './input';

/** Mean evaporating temperature at which frost is certain to grow (choice), and at which it may (water's freezing point). */
const FREEZING_STOP_K = temperatureToK(28, 'degF');
const FREEZING_K = temperatureToK(32, 'degF');
/** Fall of the suction pressure from one set of readings to the next that is more than its needle's unrest (choice). */
const FALL_PA = pressureDifferenceToPa(2, 'psi');
/** Least superheat at the suction port of a fixed orifice (makers' chart, copy A), whatever the procedure. */
const FLOOR_K = differenceToK(5, 'deltaF');
/** Condensing over outdoor air (choice). */
const MOST_CONDENSING_OVER_AIR_K = differenceToK(45, 'deltaF');
/** Discharge line (common practice, no source). */
const MOST_DISCHARGE_K = temperatureToK(225, 'degF');

/** High-side gauge pressure without a limit of the unit's own (choice). */
const MOST_HIGH_SIDE_GAUGE_PA: Readonly<Partial<Record<RefrigerantId, number>>> = {
  'R-410A': pressureDifferenceToPa(560, 'psi'),
  'R-32': pressureDifferenceToPa(560, 'psi'),
  'R-454B': pressureDifferenceToPa(560, 'psi'),
  'R-22': pressureDifferenceToPa(370, 'psi'),
  'R-407C': pressureDifferenceToPa(370, 'psi'),
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
  const floor = isFixedOrifice(input.setup) ? FLOOR_K : 0;
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
  if (mean > FREEZING_STOP_K && !(mean <= FREEZING_K && worsening)) return null;
  return { code: 'freezing', figures: { evaporating: { kind: 'temperatureK', value: mean } } };
}

/** The coil is at the freezing point but neither iced nor getting colder. */
export function freezeRisk(input: CheckInput, derived: DerivedQuantities): Caution | null {
  const mean = coolingCoil(input, derived.meanEvaporatingTemperature);
  if (mean === null || mean > FREEZING_K || freezing(input, derived) !== null) return null;
  return { code: 'freeze-risk', figures: { evaporating: { kind: 'temperatureK', value: mean } } };
}

const coolingCoil = ({ setup, visit }: CheckInput, mean: Quantity): number | null =>
  setup.mode === 'cooling' && visit.runningMinutes !== 0 ? (bareValue(mean) ?? null) : null;

/** Suction pressure, and with it the coil, lower than in the earlier readings. By the bare values: a poorer gauge must not lift a stop. */
function isFalling({ visit, readings }: CheckInput): boolean {
  const before = visit.earlier?.readings.suctionPressure?.quantity;
  const now = readings.suctionPressure?.quantity;
  return before !== undefined && now !== undefined && before.value - now.value > FALL_PA;
}

function highPressure(input: CheckInput, derived: DerivedQuantities): Stop | null {
  const { setup, visit, readings } = input;
  const pressures = [readings.liquidPressure, readings.dischargePressure].flatMap((r) => (r ? [r.quantity.value] : []));
  const highest = Math.max(...pressures);
  const { condensingBubbleTemperature, condensingOverAmbient } = derived;
  const overAirK = bareValue(condensingOverAmbient) ?? 0;
  const overAir = inFullCooling(input) && !visit.headRaised && overAirK > MOST_CONDENSING_OVER_AIR_K;
  const generalLimit = inFullCooling(input) ? MOST_HIGH_SIDE_GAUGE_PA[setup.refrigerant] : undefined;
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
  if (discharge === undefined || !atFullStage(input) || discharge.value <= MOST_DISCHARGE_K) return null;
  return { code: 'hot-discharge', figures: { discharge: { kind: 'temperatureK', value: discharge.value } } };
}
