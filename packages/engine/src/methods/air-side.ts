/** What the air readings at the coil tell: the split across it and the state of the return air. */
import type { ErrorPart } from '../derivation/quantity';
import { formula } from '../derivation/formula';
import { relativeHumidityFromHumidityRatio } from '../psychrometrics/humidity-ratio';
import { enthalpyJPerKg } from '../psychrometrics/moist-air';
import { humidityRatioFromWetBulb, wetBulbKFromRelativeHumidity } from '../psychrometrics/wet-bulb';
import { differenceToK } from '../units';
import { COMMON_PRACTICE } from './sourced-figure';
import type { SourcedFigure } from './sourced-figure';

/** Sampling a plenum at one point, ±, as a limit. */
export const SINGLE_POINT_LIMIT: SourcedFigure = {
  value: differenceToK(1.5, 'deltaF'),
  printed: '±1.5 °F',
  standing: 'practice',
  source: COMMON_PRACTICE,
};

export const SINGLE_POINT_SAMPLING: ErrorPart = {
  key: 'placement:split',
  u: SINGLE_POINT_LIMIT.value / Math.sqrt(3),
  shape: 'rectangular',
};

export const temperatureSplit = formula({
  id: 'temperatureSplit',
  gives: 'differenceK',
  text: 'T_return − T_supply',
  symbols: { returnDryBulbK: 'T_return', supplyDryBulbK: 'T_supply' },
  source: 'CEC Reference Residential Appendices, RA3.2 (2008)',
  of: ({ returnDryBulbK, supplyDryBulbK }) => returnDryBulbK - supplyDryBulbK,
});

export const returnWetBulbFromHumidity = formula({
  id: 'returnWetBulb',
  gives: 'temperatureK',
  text: 'T_wb(T_return, RH, p_atmosphere)',
  symbols: { dryBulbK: 'T_return', relativeHumidityRatio: 'RH', pressurePa: 'p_atmosphere' },
  source: 'ASHRAE Handbook - Fundamentals (2017), ch. 1, eqs. 5, 6, 22, 33, 35',
  of: wetBulbKFromRelativeHumidity,
});

export const returnHumidityRatio = formula({
  id: 'returnHumidityRatio',
  gives: 'humidityRatio',
  text: 'W(T_return, T_wb, p_atmosphere)',
  symbols: { dryBulbK: 'T_return', wetBulbK: 'T_wb', pressurePa: 'p_atmosphere' },
  source: 'ASHRAE Handbook - Fundamentals (2017), ch. 1, eqs. 33, 35',
  of: humidityRatioFromWetBulb,
});

export const returnRelativeHumidity = formula({
  id: 'returnRelativeHumidity',
  gives: 'fraction',
  text: 'RH(T_return, W, p_atmosphere)',
  symbols: { dryBulbK: 'T_return', humidityRatio: 'W', pressurePa: 'p_atmosphere' },
  source: 'ASHRAE Handbook - Fundamentals (2017), ch. 1, eqs. 20, 22',
  of: relativeHumidityFromHumidityRatio,
});

export const returnEnthalpy = formula({
  id: 'returnEnthalpy',
  gives: 'enthalpyJPerKg',
  text: 'h(T_return, W)',
  symbols: { dryBulbK: 'T_return', humidityRatio: 'W' },
  source: 'ASHRAE Handbook - Fundamentals (2017), ch. 1, eq. 30',
  of: enthalpyJPerKg,
});
