/** The air pressure at the site: it makes gauge pressures absolute and enters the wet bulb. */
import type { Known } from '../derivation/quantity';
import { leaf } from '../derivation/quantity';
import { COMMON_PRACTICE, OUR_CHOICE } from '../methods/sourced-figure';
import { standardAtmospherePressurePa } from '../psychrometrics/standard-atmosphere';
import { isGaugeUnit, lengthToM, pressureAsReadToPa } from '../units';
import { plainRule } from './procedure';
import type { SetupInput } from './request';

export const ATMOSPHERE_FIGURES = {
  /** Weather on top of the standard atmosphere, ±, as a limit. */
  weatherPa: plainRule(1500, '±1.5 kPa', ['practice', COMMON_PRACTICE]),
  /** A barometer read at the site, ±, as a limit. */
  barometerPa: plainRule(100, '±0.1 kPa', ['choice', OUR_CHOICE]),
  /** Records of sea-level pressure lie about this far to either side of the standard; past it a barometer shows another elevation. */
  mostWeatherPa: plainRule(6000, '6 kPa', ['choice', OUR_CHOICE]),
} as const;

export type AtmosphereInput = Pick<SetupInput, 'elevation' | 'stationPressure'>;

/** Station pressure where given, else the ICAO standard atmosphere at the elevation, else at sea level. Both are in range: `crossCheck` saw to it. */
export function atmosphereOf(input: AtmosphereInput): Known {
  const fromElevation = input.stationPressure === undefined;
  const limit = fromElevation ? ATMOSPHERE_FIGURES.weatherPa.value : ATMOSPHERE_FIGURES.barometerPa.value;
  return leaf({
    id: 'atmosphere',
    kind: 'pressurePa',
    value: atmospherePa(input),
    origin: fromElevation ? 'constant' : 'entered',
    parts: [{ key: 'atmosphere', u: limit / Math.sqrt(3), shape: 'rectangular' }],
  });
}

function atmospherePa({ elevation, stationPressure }: AtmosphereInput): number {
  if (stationPressure !== undefined && !isGaugeUnit(stationPressure.unit)) {
    return pressureAsReadToPa(stationPressure.value, stationPressure.unit);
  }
  const elevationM = elevation === undefined ? 0 : lengthToM(elevation.value, elevation.unit);
  return standardAtmospherePressurePa(elevationM);
}
