/** From heat and temperature rise to airflow, and between volume and mass. Mass is that of the dry air, which neither heating nor drying changes. */
import type { ErrorPart } from '../../derivation/quantity';
import type { Formula } from '../../derivation/formula';
import { formula } from '../../derivation/formula';
import { EngineError } from '../../errors';
import { SINGLE_POINT_SAMPLING } from '../air-side';
import type { AirPlace } from './air-properties';
import { assertPositive } from './assert-positive';

/** As for the split, by its own error: the rise is read at another time. */
export const RISE_SAMPLING: ErrorPart = { ...SINGLE_POINT_SAMPLING, key: 'placement:rise' };

export const temperatureRise = formula({
  id: 'temperatureRise',
  gives: 'differenceK',
  text: 'T_supply − T_return',
  symbols: { supplyDryBulbK: 'T_supply', returnDryBulbK: 'T_return' },
  source: 'Definition',
  of: ({ supplyDryBulbK, returnDryBulbK }) => supplyDryBulbK - returnDryBulbK,
});

/** Dry air in kg/s that a heat in W warms by a rise in K. A rise that is not above zero: `EngineError` `inconsistent-inputs`, reason `no-temperature-rise`. */
export const dryAirMassFlowFromHeat = formula({
  id: 'dryAirMassFlow',
  gives: 'massFlowKgPerS',
  text: 'Q / (c × dT)',
  symbols: { heatW: 'Q', specificHeatJPerKgK: 'c', riseK: 'dT' },
  source: 'Heat balance of the air; common practice as cfm = Btu/h / (1.08 × ΔT) for standard air',
  of: ({ heatW, specificHeatJPerKgK, riseK }) => {
    assertPositive(heatW, 'heatW');
    if (!(riseK > 0)) {
      const reason = 'no-temperature-rise';
      throw new EngineError('inconsistent-inputs', { quantity: 'riseK', value: riseK, min: 0, reason });
    }
    return heatW / (specificHeatJPerKgK * riseK);
  },
});

/** Actual m³/s at a place from the dry air that passes in kg/s. */
export const airflowFromMass = (place: AirPlace): Formula<'dryAirMassFlowKgPerS' | 'specificVolumeM3PerKg'> =>
  formula({
    id: `${place}Airflow`,
    gives: 'flowM3PerS',
    text: 'm × v',
    symbols: { dryAirMassFlowKgPerS: 'm', specificVolumeM3PerKg: 'v' },
    source: 'Definition of the specific volume, per mass of dry air',
    of: ({ dryAirMassFlowKgPerS, specificVolumeM3PerKg }) => dryAirMassFlowKgPerS * specificVolumeM3PerKg,
  });

/** Dry air in kg/s in an actual flow of m³/s, with the specific volume of the place where the flow was measured. */
export const dryAirMassFlowFromVolume = formula({
  id: 'dryAirMassFlow',
  gives: 'massFlowKgPerS',
  text: 'V_air / v',
  symbols: { airflowM3PerS: 'V_air', specificVolumeM3PerKg: 'v' },
  source: 'Definition of the specific volume, per mass of dry air',
  of: ({ airflowM3PerS, specificVolumeM3PerKg }) => {
    assertPositive(airflowM3PerS, 'airflowM3PerS');
    return airflowM3PerS / specificVolumeM3PerKg;
  },
});

/** (m³/s)/W of nominal cooling capacity: cfm per ton on a screen. */
export const airflowPerCapacity = formula({
  id: 'airflowPerCapacity',
  gives: 'flowPerCapacityM3PerSPerW',
  text: 'V_air / Q_nominal',
  symbols: { airflowM3PerS: 'V_air', nominalCapacityW: 'Q_nominal' },
  source: 'Definition',
  of: ({ airflowM3PerS, nominalCapacityW }) => {
    assertPositive(nominalCapacityW, 'nominalCapacityW');
    return airflowM3PerS / nominalCapacityW;
  },
});
