/** The air pressure at the site: it makes gauge pressures absolute and enters the wet bulb. */
import type { Known } from '../derivation/quantity';
import { leaf } from '../derivation/quantity';
import { standardAtmospherePressurePa } from '../psychrometrics/standard-atmosphere';
import { isGaugeUnit, lengthToM, pressureAsReadToPa } from '../units';
import type { SetupInput } from './request';

/** Weather on top of the standard atmosphere, ±, as a limit (practice, no source). */
const WEATHER_LIMIT_PA = 1500;
/** A barometer read at the site, ±, as a limit (choice). */
const BAROMETER_LIMIT_PA = 100;
/** Records of sea-level pressure lie about 6 kPa to either side of the standard; past this a barometer shows another elevation (choice). */
export const MOST_WEATHER_PA = 6000;

export type AtmosphereInput = Pick<SetupInput, 'elevation' | 'stationPressure'>;

/** Station pressure where given, else the ICAO standard atmosphere at the elevation, else at sea level. Both are in range: `crossCheck` saw to it. */
export function atmosphereOf(input: AtmosphereInput): Known {
  const fromElevation = input.stationPressure === undefined;
  const limit = fromElevation ? WEATHER_LIMIT_PA : BAROMETER_LIMIT_PA;
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
