/**
 * Moist air from any two of dry bulb, wet bulb, dew point, relative humidity, humidity ratio and enthalpy at a known pressure. Of the 15 pairs 13 determine
 * a state; two are refused:
 * - dew point with humidity ratio: at one pressure they say the same, whatever the dry bulb (ASHRAE Fundamentals (2017) ch. 1, eqs. 20 and 36);
 * - wet bulb with enthalpy: their lines are nearly parallel. At 20 °C wet bulb and sea level all dry bulbs from 20 to 56 °C lie within 1.5 kJ/kg, the
 *   worth of half a kelvin of wet bulb; at 0 °C all have one enthalpy (eqs. 30 and 33).
 *
 * Each of the 13 has one solution. Where one humidity has two wet bulbs, a wet and an iced one, a given wet bulb is taken at its word (below 0 °C iced) and a
 * derived one is the wet one, as wet-bulb.ts says; the state names it.
 */
import { EngineError } from '../errors';
import { SI_ENTHALPY } from './enthalpy';
import type { EnthalpyEquation } from './enthalpy';
import {
  moistAirFromDewPointAndEnthalpy,
  moistAirFromDryBulbAndEnthalpy,
  moistAirFromHumidityRatioAndEnthalpy,
  moistAirFromRelativeHumidityAndEnthalpy,
} from './enthalpy-pairs';
import type { WithEnthalpy } from './enthalpy-pairs';
import {
  moistAirFromDewPointAndRelativeHumidity,
  moistAirFromDryBulbAndHumidityRatio,
  moistAirFromRelativeHumidityAndHumidityRatio,
} from './humidity-pairs';
import {
  moistAirFromDryBulbAndDewPoint,
  moistAirFromDryBulbAndRelativeHumidity,
  moistAirFromDryBulbAndWetBulb,
} from './moist-air';
import type { MoistAir } from './moist-air-state';
import {
  moistAirFromWetBulbAndDewPoint,
  moistAirFromWetBulbAndHumidityRatio,
  moistAirFromWetBulbAndRelativeHumidity,
} from './wet-bulb-pairs';

export interface MoistAirReadings {
  readonly dryBulbK: number;
  readonly wetBulbK: number;
  /** Frost point below 0.01 °C. */
  readonly dewPointK: number;
  /** 0 to 1, over ice below 0.01 °C dry bulb. */
  readonly relativeHumidityRatio: number;
  /** kg of water vapour per kg of dry air. */
  readonly humidityRatio: number;
  /** Per kg of dry air; zero is dry air at 0 °C with liquid water at 0 °C. */
  readonly enthalpyJPerKg: number;
}

export type MoistAirReading = keyof MoistAirReadings;

/** In the order in which the pairs name them. */
export const MOIST_AIR_READINGS = [
  'dryBulbK',
  'wetBulbK',
  'dewPointK',
  'relativeHumidityRatio',
  'humidityRatio',
  'enthalpyJPerKg',
] as const satisfies readonly MoistAirReading[];

/** The pairs that determine a state. */
export const MOIST_AIR_PAIRS = [
  ['dryBulbK', 'wetBulbK'],
  ['dryBulbK', 'dewPointK'],
  ['dryBulbK', 'relativeHumidityRatio'],
  ['dryBulbK', 'humidityRatio'],
  ['dryBulbK', 'enthalpyJPerKg'],
  ['wetBulbK', 'dewPointK'],
  ['wetBulbK', 'relativeHumidityRatio'],
  ['wetBulbK', 'humidityRatio'],
  ['dewPointK', 'relativeHumidityRatio'],
  ['dewPointK', 'enthalpyJPerKg'],
  ['relativeHumidityRatio', 'humidityRatio'],
  ['relativeHumidityRatio', 'enthalpyJPerKg'],
  ['humidityRatio', 'enthalpyJPerKg'],
] as const satisfies readonly (readonly [MoistAirReading, MoistAirReading])[];

/** The pairs that do not, with the reason that the refusal carries. */
export const REFUSED_MOIST_AIR_PAIRS = [
  { pair: ['wetBulbK', 'enthalpyJPerKg'], reason: 'near-parallel-pair' },
  { pair: ['dewPointK', 'humidityRatio'], reason: 'dependent-pair' },
] as const satisfies readonly {
  readonly pair: readonly [MoistAirReading, MoistAirReading];
  readonly reason: string;
}[];

type PairNames = (typeof MOIST_AIR_PAIRS)[number] | (typeof REFUSED_MOIST_AIR_PAIRS)[number]['pair'];

type Exactly<Names extends PairNames> = Names extends PairNames
  ? Pick<MoistAirReadings, Names[number]> & { readonly [Name in Exclude<MoistAirReading, Names[number]>]?: never }
  : never;

/** Exactly two readings; which two may be found out by the keys. */
export type MoistAirPair = Exactly<PairNames>;

type Door = (x: MoistAirReadings & { readonly pressurePa: number }) => MoistAir;

const refused =
  (quantity: MoistAirReading, reason: (typeof REFUSED_MOIST_AIR_PAIRS)[number]['reason']): Door =>
  (x) => {
    throw new EngineError('not-supported', { quantity, value: x[quantity], reason });
  };

/** The door of a pair that has an enthalpy, for the SI one. */
const bySiEnthalpy =
  (door: (equation: EnthalpyEquation, x: Omit<MoistAirReadings, 'enthalpyJPerKg'> & WithEnthalpy) => MoistAir): Door =>
  ({ enthalpyJPerKg, ...x }) =>
    door(SI_ENTHALPY, { ...x, enthalpy: enthalpyJPerKg });

const DOORS: { readonly [Names in PairNames as `${Names[0]}+${Names[1]}`]: Door } = {
  'dryBulbK+wetBulbK': moistAirFromDryBulbAndWetBulb,
  'dryBulbK+dewPointK': moistAirFromDryBulbAndDewPoint,
  'dryBulbK+relativeHumidityRatio': moistAirFromDryBulbAndRelativeHumidity,
  'dryBulbK+humidityRatio': moistAirFromDryBulbAndHumidityRatio,
  'dryBulbK+enthalpyJPerKg': bySiEnthalpy(moistAirFromDryBulbAndEnthalpy),
  'wetBulbK+dewPointK': moistAirFromWetBulbAndDewPoint,
  'wetBulbK+relativeHumidityRatio': moistAirFromWetBulbAndRelativeHumidity,
  'wetBulbK+humidityRatio': moistAirFromWetBulbAndHumidityRatio,
  'wetBulbK+enthalpyJPerKg': refused('enthalpyJPerKg', 'near-parallel-pair'),
  'dewPointK+relativeHumidityRatio': moistAirFromDewPointAndRelativeHumidity,
  'dewPointK+humidityRatio': refused('humidityRatio', 'dependent-pair'),
  'dewPointK+enthalpyJPerKg': bySiEnthalpy(moistAirFromDewPointAndEnthalpy),
  'relativeHumidityRatio+humidityRatio': moistAirFromRelativeHumidityAndHumidityRatio,
  'relativeHumidityRatio+enthalpyJPerKg': bySiEnthalpy(moistAirFromRelativeHumidityAndEnthalpy),
  'humidityRatio+enthalpyJPerKg': bySiEnthalpy(moistAirFromHumidityRatioAndEnthalpy),
};

/**
 * The state of moist air from its pressure and exactly two readings, which come back to the last digit.
 * Example: `moistAirFromPair({ pressurePa: 101_325, wetBulbK: 292.6, dewPointK: 288.9 }).dryBulbK` is about 299.8.
 * Throws `EngineError`: a pair of `REFUSED_MOIST_AIR_PAIRS` `not-supported` with its reason; readings out of range or in contradiction as the function of the
 * pair says. Not exactly two readings is the caller's fault: `TypeError`.
 */
export function moistAirFromPair(x: MoistAirPair & { readonly pressurePa: number }): MoistAir {
  const given = MOIST_AIR_READINGS.filter((name) => x[name] !== undefined);
  if (given.length !== 2) throw new TypeError(`two readings of moist air are needed, given: ${given.join(', ')}`);
  // each door reads only the two of its name
  return DOORS[given.join('+') as keyof typeof DOORS](x as Parameters<Door>[0]);
}
