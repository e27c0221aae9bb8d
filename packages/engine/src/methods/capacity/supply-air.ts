/** State of the supply air from its readings: the counterparts of those of the return air. */
import { formula } from '../../derivation/formula';
import { enthalpyJPerKg } from '../../psychrometrics/moist-air';
import { humidityRatioFromWetBulb, wetBulbKFromRelativeHumidity } from '../../psychrometrics/wet-bulb';

export const supplyWetBulbFromHumidity = formula({
  id: 'supplyWetBulb',
  gives: 'temperatureK',
  text: 'T_wb(T_supply, RH, p_atmosphere)',
  symbols: { dryBulbK: 'T_supply', relativeHumidityRatio: 'RH', pressurePa: 'p_atmosphere' },
  source: 'ASHRAE Handbook - Fundamentals (2017), ch. 1, eqs. 5, 6, 22, 33, 35',
  of: wetBulbKFromRelativeHumidity,
});

export const supplyHumidityRatio = formula({
  id: 'supplyHumidityRatio',
  gives: 'humidityRatio',
  text: 'W(T_supply, T_wb, p_atmosphere)',
  symbols: { dryBulbK: 'T_supply', wetBulbK: 'T_wb', pressurePa: 'p_atmosphere' },
  source: 'ASHRAE Handbook - Fundamentals (2017), ch. 1, eqs. 33, 35',
  of: humidityRatioFromWetBulb,
});

export const supplyEnthalpy = formula({
  id: 'supplyEnthalpy',
  gives: 'enthalpyJPerKg',
  text: 'h(T_supply, W)',
  symbols: { dryBulbK: 'T_supply', humidityRatio: 'W' },
  source: 'ASHRAE Handbook - Fundamentals (2017), ch. 1, eq. 30',
  of: enthalpyJPerKg,
});
