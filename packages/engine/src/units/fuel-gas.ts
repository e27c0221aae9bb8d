/** What a gas meter and a gas bill show: volumes (exact by the foot, 0.3048 m) and heating values (1 Btu = 1055.055 852 62 J (IT); NIST SP 811 (2008), appendix B.8). */
import { J_PER_BTU } from './flow';

export const VOLUME_UNITS = ['ft3', 'm3'] as const;
export type VolumeUnit = (typeof VOLUME_UNITS)[number];
export const HEATING_VALUE_UNITS = ['Btu/ft3', 'MJ/m3'] as const;
export type HeatingValueUnit = (typeof HEATING_VALUE_UNITS)[number];

const M3_PER_FT3 = 0.3048 ** 3;
const VOLUME_M3: Readonly<Record<VolumeUnit, number>> = { ft3: M3_PER_FT3, m3: 1 };
const HEATING_VALUE_J_PER_M3: Readonly<Record<HeatingValueUnit, number>> = {
  'Btu/ft3': J_PER_BTU / M3_PER_FT3,
  'MJ/m3': 1e6,
};

export const volumeToM3 = (value: number, unit: VolumeUnit): number => value * VOLUME_M3[unit];
export const volumeFromM3 = (m3: number, unit: VolumeUnit): number => m3 / VOLUME_M3[unit];
export const heatingValueToJPerM3 = (value: number, unit: HeatingValueUnit): number =>
  value * HEATING_VALUE_J_PER_M3[unit];
export const heatingValueFromJPerM3 = (jPerM3: number, unit: HeatingValueUnit): number =>
  jPerM3 / HEATING_VALUE_J_PER_M3[unit];
