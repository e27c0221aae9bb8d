/** The state of moist air from dry and wet bulb, step by step. The relations of the Handbook count in °C, so each stands as a named function. */
import { formula } from '../../derivation/formula';
import { derive } from '../../derivation/derive';
import type { Known, Quantity } from '../../derivation/quantity';
import { isKnown, leaf } from '../../derivation/quantity';
import type { DerivationStep } from '../../derivation/steps';
import { derivationSteps } from '../../derivation/steps';
import { dewPointKFromVapourPressure } from '../../psychrometrics/dew-point';
import {
  relativeHumidityFromHumidityRatio,
  vapourPressurePaFromHumidityRatio,
} from '../../psychrometrics/humidity-ratio';
import { enthalpyJPerKg, specificVolumeM3PerKg } from '../../psychrometrics/moist-air';
import { humidityRatioFromWetBulb } from '../../psychrometrics/wet-bulb';
import { pressureAsReadToPa, temperatureToK } from '../../units';
import type { MoistAirExample, WorkedFigureId } from './worked-example';

const CHAPTER_1 = 'ASHRAE Handbook - Fundamentals (2017), ch. 1';

export const humidityRatioStep = formula({
  id: 'humidityRatio',
  gives: 'humidityRatio',
  text: 'W(T, T_wb, p)',
  symbols: { dryBulbK: 'T', wetBulbK: 'T_wb', pressurePa: 'p' },
  source: `${CHAPTER_1}, eqs. 33, 35`,
  of: humidityRatioFromWetBulb,
});

export const relativeHumidityStep = formula({
  id: 'relativeHumidity',
  gives: 'fraction',
  text: 'RH(T, W, p)',
  symbols: { dryBulbK: 'T', humidityRatio: 'W', pressurePa: 'p' },
  source: `${CHAPTER_1}, eqs. 20, 22`,
  of: relativeHumidityFromHumidityRatio,
});

export const dewPointStep = formula({
  id: 'dewPoint',
  gives: 'temperatureK',
  text: 'T_dp(W, p)',
  symbols: { humidityRatio: 'W', pressurePa: 'p' },
  source: `${CHAPTER_1}, eqs. 20, 36`,
  of: (x) => dewPointKFromVapourPressure(vapourPressurePaFromHumidityRatio(x)),
});

export const enthalpyStep = formula({
  id: 'enthalpy',
  gives: 'enthalpyJPerKg',
  text: 'h(T, W)',
  symbols: { dryBulbK: 'T', humidityRatio: 'W' },
  source: `${CHAPTER_1}, eq. 30`,
  of: enthalpyJPerKg,
});

export const specificVolumeStep = formula({
  id: 'specificVolume',
  gives: 'specificVolumeM3PerKg',
  text: 'v(T, W, p)',
  symbols: { dryBulbK: 'T', humidityRatio: 'W', pressurePa: 'p' },
  source: `${CHAPTER_1}, eq. 26`,
  of: specificVolumeM3PerKg,
});

/** The state's numbers by the id of their step, and the steps in their order. The given readings count as exact. */
export function moistAirSteps({ given }: MoistAirExample): {
  readonly results: Readonly<Partial<Record<WorkedFigureId, Quantity>>>;
  readonly steps: readonly DerivationStep[];
} {
  const exact = (id: string, kind: 'temperatureK' | 'pressurePa', value: number): Known =>
    leaf({ id, kind, value, origin: 'entered' });
  const dryBulbK = exact('dryBulb', 'temperatureK', temperatureToK(given.dryBulbF, 'degF'));
  const wetBulbK = exact('wetBulb', 'temperatureK', temperatureToK(given.wetBulbF, 'degF'));
  const pressurePa = exact('pressure', 'pressurePa', pressureAsReadToPa(given.pressurePsia, 'psia'));
  const humidityRatio = derive(humidityRatioStep, { dryBulbK, wetBulbK, pressurePa });
  const results = {
    humidityRatio,
    relativeHumidity: derive(relativeHumidityStep, { dryBulbK, humidityRatio, pressurePa }),
    dewPoint: derive(dewPointStep, { humidityRatio, pressurePa }),
    enthalpy: derive(enthalpyStep, { dryBulbK, humidityRatio }),
    specificVolume: derive(specificVolumeStep, { dryBulbK, humidityRatio, pressurePa }),
  };
  return { results, steps: derivationSteps(Object.values(results).filter(isKnown)) };
}
