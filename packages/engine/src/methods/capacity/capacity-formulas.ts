/**
 * Cooling delivered to the air, from its states before and after the coil; per kg of dry air. Where the supply is read beyond the blower, the
 * blower's heat is inside: the result is what the house gets, not what the coil does.
 */
import { formula } from '../../derivation/formula';
import { assertPositive } from '../airflow/assert-positive';

/** J/(kg K), liquid water near 10 °C, counted from 0 °C as enthalpies of moist air are (from memory; rounding of 4.19). */
const WATER_SPECIFIC_HEAT = 4190;
const FREEZING_K = 273.15;

const AIR_ENTHALPY_METHOD =
  'Air-enthalpy method: mass flow of dry air × enthalpy difference (ANSI/ASHRAE 37, from memory)';

/** Total cooling in W; the enthalpy the condensate takes down the drain is neglected. */
export const totalCapacity = formula({
  id: 'totalCapacity',
  gives: 'powerW',
  text: 'm × (h_return − h_supply)',
  symbols: { dryAirMassFlowKgPerS: 'm', returnEnthalpyJPerKg: 'h_return', supplyEnthalpyJPerKg: 'h_supply' },
  source: AIR_ENTHALPY_METHOD,
  of: ({ dryAirMassFlowKgPerS, returnEnthalpyJPerKg, supplyEnthalpyJPerKg }) =>
    dryAirMassFlowKgPerS * (returnEnthalpyJPerKg - supplyEnthalpyJPerKg),
});

/** Enthalpy of the condensate over that of water at 0 °C, in J per kg of dry air; it leaves at the supply air's temperature. Nothing condensed: 0. */
export const condensateEnthalpy = formula({
  id: 'condensateEnthalpy',
  gives: 'enthalpyDifferenceJPerKg',
  text: 'max(W_return − W_supply, 0) × h_water(T_supply)',
  symbols: { returnHumidityRatio: 'W_return', supplyHumidityRatio: 'W_supply', supplyDryBulbK: 'T_supply' },
  source:
    'Water balance of the coil, ASHRAE Handbook - Fundamentals (2017), ch. 1, moist air cooling (from memory); water 4.19 kJ/(kg K)',
  of: ({ returnHumidityRatio, supplyHumidityRatio, supplyDryBulbK }) =>
    Math.max(returnHumidityRatio - supplyHumidityRatio, 0) * WATER_SPECIFIC_HEAT * (supplyDryBulbK - FREEZING_K),
});

/** Total cooling in W of the coil, with what leaves as condensate taken off. */
export const totalCapacityLessCondensate = formula({
  id: 'totalCapacity',
  gives: 'powerW',
  text: 'm × (h_return − h_supply − h_condensate)',
  symbols: {
    dryAirMassFlowKgPerS: 'm',
    returnEnthalpyJPerKg: 'h_return',
    supplyEnthalpyJPerKg: 'h_supply',
    condensateJPerKg: 'h_condensate',
  },
  source: 'Energy balance of the coil, ASHRAE Handbook - Fundamentals (2017), ch. 1, moist air cooling (from memory)',
  of: ({ dryAirMassFlowKgPerS, returnEnthalpyJPerKg, supplyEnthalpyJPerKg, condensateJPerKg }) =>
    dryAirMassFlowKgPerS * (returnEnthalpyJPerKg - supplyEnthalpyJPerKg - condensateJPerKg),
});

/**
 * Sensible cooling in W. The specific heat is that of the supply air's humidity: then sensible and latent add up to the total exactly (the vapour that
 * condenses is taken out at the return temperature). With the return's humidity it would be 0.5 to 1 % more; conventions differ.
 */
export const sensibleCapacity = formula({
  id: 'sensibleCapacity',
  gives: 'powerW',
  text: 'm × c × dT',
  symbols: { dryAirMassFlowKgPerS: 'm', specificHeatJPerKgK: 'c', splitK: 'dT' },
  source: AIR_ENTHALPY_METHOD,
  of: ({ dryAirMassFlowKgPerS, specificHeatJPerKgK, splitK }) => dryAirMassFlowKgPerS * specificHeatJPerKgK * splitK,
});

/** Sensible over total. A total that is not above zero has no such ratio: `EngineError` `out-of-range`, reason `not-above-zero`. */
export const sensibleHeatRatio = formula({
  id: 'sensibleHeatRatio',
  gives: 'fraction',
  text: 'Q_sensible / Q_total',
  symbols: { sensibleW: 'Q_sensible', totalW: 'Q_total' },
  source: 'Definition',
  of: ({ sensibleW, totalW }) => {
    assertPositive(totalW, 'totalW');
    return sensibleW / totalW;
  },
});

/** Delivered over nominal, both total cooling; the nominal one holds at the rating conditions only. */
export const capacityRatio = formula({
  id: 'capacityRatio',
  gives: 'fraction',
  text: 'Q_total / Q_nominal',
  symbols: { totalW: 'Q_total', nominalW: 'Q_nominal' },
  source: 'Definition',
  of: ({ totalW, nominalW }) => {
    assertPositive(nominalW, 'nominalW');
    return totalW / nominalW;
  },
});

/** Dry air in kg/s in a flow stated as standard air. */
export const dryAirMassFlowFromStandard = formula({
  id: 'dryAirMassFlow',
  gives: 'massFlowKgPerS',
  text: 'V_standard × rho_standard',
  symbols: { standardAirflowM3PerS: 'V_standard', standardDensityKgPerM3: 'rho_standard' },
  source: 'Definition of standard air: 0.075 lb/ft³, from memory of ANSI/AMCA 210 and ANSI/ASHRAE 51',
  of: ({ standardAirflowM3PerS, standardDensityKgPerM3 }) => {
    assertPositive(standardAirflowM3PerS, 'standardAirflowM3PerS');
    return standardAirflowM3PerS * standardDensityKgPerM3;
  },
});
