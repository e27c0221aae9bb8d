/**
 * Length, airflow, power and mass. Exact by definition of the foot (0.3048 m) and the pound (0.453 592 37 kg);
 * 1 ton of refrigeration = 12 000 Btu/h, 1 Btu = 1055.055 852 62 J (IT) (NIST SP 811 (2008), appendix B.8).
 */

export const LENGTH_UNITS = ['ft', 'm'] as const;
export type LengthUnit = (typeof LENGTH_UNITS)[number];
export const FLOW_UNITS = ['cfm', 'm3/h', 'L/s'] as const;
export type FlowUnit = (typeof FLOW_UNITS)[number];
export const POWER_UNITS = ['ton', 'kW', 'Btu/h'] as const;
export type PowerUnit = (typeof POWER_UNITS)[number];
export const MASS_UNITS = ['oz', 'lb', 'kg', 'g'] as const;
export type MassUnit = (typeof MASS_UNITS)[number];

const M_PER_FT = 0.3048;
const KG_PER_LB = 0.45359237;
export const J_PER_BTU = 1055.05585262;

const LENGTH_M: Readonly<Record<LengthUnit, number>> = { ft: M_PER_FT, m: 1 };
const FLOW_M3_PER_S: Readonly<Record<FlowUnit, number>> = { cfm: M_PER_FT ** 3 / 60, 'm3/h': 1 / 3600, 'L/s': 1e-3 };
const POWER_W: Readonly<Record<PowerUnit, number>> = {
  ton: (12_000 * J_PER_BTU) / 3600,
  kW: 1e3,
  'Btu/h': J_PER_BTU / 3600,
};
const MASS_KG: Readonly<Record<MassUnit, number>> = { oz: KG_PER_LB / 16, lb: KG_PER_LB, kg: 1, g: 1e-3 };

export const lengthToM = (value: number, unit: LengthUnit): number => value * LENGTH_M[unit];
export const lengthFromM = (metres: number, unit: LengthUnit): number => metres / LENGTH_M[unit];
export const flowToM3PerS = (value: number, unit: FlowUnit): number => value * FLOW_M3_PER_S[unit];
export const flowFromM3PerS = (m3PerS: number, unit: FlowUnit): number => m3PerS / FLOW_M3_PER_S[unit];
export const powerToW = (value: number, unit: PowerUnit): number => value * POWER_W[unit];
export const powerFromW = (watts: number, unit: PowerUnit): number => watts / POWER_W[unit];
export const massToKg = (value: number, unit: MassUnit): number => value * MASS_KG[unit];
const OZ_PER_LB = 16;
/** Pounds and ounces as a nameplate prints them, in ounces: the ounces go the way of the pounds, also of a pound that is −0. */
export const ouncesOfPoundsAndOunces = (pounds: number, ounces: number): number =>
  OZ_PER_LB * pounds + (pounds < 0 || Object.is(pounds, -0) ? -ounces : ounces);
export const massFromKg = (kg: number, unit: MassUnit): number => kg / MASS_KG[unit];
