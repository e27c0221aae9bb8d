/** Moist air at the place where it is measured, as steps of a derivation. */
import type { Formula } from '../../derivation/formula';
import { formula } from '../../derivation/formula';
import { assertInRange } from '../../errors';
import { specificVolumeM3PerKg } from '../../psychrometrics/moist-air';
import { HUMIDITY_RATIO_LIMITS } from '../../psychrometrics/moist-air-limits';

export type AirPlace = 'return' | 'supply';

/** J/(kg K) of dry air and of water vapour (ASHRAE Fundamentals (2017) ch. 1, eq. 30, there kJ). */
const DRY_AIR_SPECIFIC_HEAT = 1006;
const VAPOUR_SPECIFIC_HEAT = 1860;

/** Volume of the air in m³ per kg of dry air: density by elevation, temperature and humidity. Refuses as `specificVolumeM3PerKg` does. */
export const airSpecificVolume = (place: AirPlace): Formula<'dryBulbK' | 'humidityRatio' | 'pressurePa'> =>
  formula({
    id: `${place}SpecificVolume`,
    gives: 'specificVolumeM3PerKg',
    text: `v(T_${place}, W, p_atmosphere)`,
    symbols: { dryBulbK: `T_${place}`, humidityRatio: 'W', pressurePa: 'p_atmosphere' },
    source: 'ASHRAE Handbook - Fundamentals (2017), ch. 1, eq. 26',
    of: specificVolumeM3PerKg,
  });

/** Specific heat of moist air in J/K per kg of *dry* air, 1006 + 1860 W: the slope of the enthalpy at constant humidity, exact for eq. 30. */
export const airSpecificHeat = formula({
  id: 'airSpecificHeat',
  gives: 'specificHeatJPerKgK',
  text: 'c_air(W)',
  symbols: { humidityRatio: 'W' },
  source: 'ASHRAE Handbook - Fundamentals (2017), ch. 1, eq. 30: 1.006 + 1.86 W kJ/(kg K)',
  of: ({ humidityRatio }) => {
    assertInRange(humidityRatio, HUMIDITY_RATIO_LIMITS);
    return DRY_AIR_SPECIFIC_HEAT + VAPOUR_SPECIFIC_HEAT * humidityRatio;
  },
});
