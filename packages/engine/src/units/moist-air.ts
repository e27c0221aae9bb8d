/** Moist-air properties per mass of dry air, between SI and inch-pound (NIST SP 811 (2008), appendix B.8). */
import { J_PER_BTU } from './flow';

const KG_PER_LB = 0.45359237;
const M3_PER_FT3 = 0.3048 ** 3;
/** The ASHRAE inch-pound datum is dry air at 0 °F, the SI datum dry air at 0 °C (ASHRAE Fundamentals (2017) ch. 1, eqs. 30 SI and IP): enthalpy does not convert by the factor alone. */
const DRY_AIR_BTU_PER_LB_F = 0.24;

/** Water vapour per mass of dry air; 1 lb = 7000 gr exactly (NIST SP 811 (2008), appendix B.8). */
export const HUMIDITY_RATIO_UNITS = ['kg/kg', 'g/kg', 'lb/lb', 'gr/lb'] as const;
export type HumidityRatioUnit = (typeof HUMIDITY_RATIO_UNITS)[number];
const PER_KG_PER_KG: Readonly<Record<HumidityRatioUnit, number>> = {
  'kg/kg': 1,
  'g/kg': 1000,
  'lb/lb': 1,
  'gr/lb': 7000,
};

export const humidityRatioToKgPerKg = (value: number, unit: HumidityRatioUnit): number => value / PER_KG_PER_KG[unit];
export const humidityRatioFromKgPerKg = (humidityRatio: number, unit: HumidityRatioUnit): number =>
  humidityRatio * PER_KG_PER_KG[unit];

/** Units of a moist-air enthalpy, each with its datum. */
export const ENTHALPY_UNITS = ['Btu/lb', 'kJ/kg'] as const;
export type EnthalpyUnit = (typeof ENTHALPY_UNITS)[number];

/** Btu/lb of a specific energy difference in J/kg. */
export const specificEnergyDifferenceToBtuPerLb = (jPerKg: number): number => (jPerKg / J_PER_BTU) * KG_PER_LB;

/** ft³/lb of a specific volume in m³/kg. */
export const specificVolumeToFt3PerLb = (m3PerKg: number): number => (m3PerKg / M3_PER_FT3) * KG_PER_LB;

/** Moist-air enthalpy in Btu/lb on the inch-pound datum, from the dry bulb in °F and the humidity ratio (ASHRAE Fundamentals (2017) ch. 1, eq. 30 IP). */
export const moistAirEnthalpyBtuPerLb = (dryBulbF: number, humidityRatio: number): number =>
  DRY_AIR_BTU_PER_LB_F * dryBulbF + humidityRatio * (1061 + 0.444 * dryBulbF);
