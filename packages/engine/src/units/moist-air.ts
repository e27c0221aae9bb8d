/** Moist-air properties per mass of dry air, between SI and inch-pound (NIST SP 811 (2008), appendix B.8). */
import { J_PER_BTU } from './flow';

const KG_PER_LB = 0.45359237;
const M3_PER_FT3 = 0.3048 ** 3;
/** The ASHRAE inch-pound datum is dry air at 0 °F, the SI datum dry air at 0 °C (ASHRAE Fundamentals (2017) ch. 1, eqs. 30 SI and IP): enthalpy does not convert by the factor alone. */
const DRY_AIR_BTU_PER_LB_F = 0.24;

/** Btu/lb of a specific energy difference in J/kg. */
export const specificEnergyDifferenceToBtuPerLb = (jPerKg: number): number => (jPerKg / J_PER_BTU) * KG_PER_LB;

/** ft³/lb of a specific volume in m³/kg. */
export const specificVolumeToFt3PerLb = (m3PerKg: number): number => (m3PerKg / M3_PER_FT3) * KG_PER_LB;

/** Moist-air enthalpy in Btu/lb on the inch-pound datum, from the dry bulb in °F and the humidity ratio (ASHRAE Fundamentals (2017) ch. 1, eq. 30 IP). */
export const moistAirEnthalpyBtuPerLb = (dryBulbF: number, humidityRatio: number): number =>
  DRY_AIR_BTU_PER_LB_F * dryBulbF + humidityRatio * (1061 + 0.444 * dryBulbF);
