/** Refrigerant per length of line, exact by the foot and the pound (NIST SP 811 (2008), appendix B.8). */
import { lengthToM, massToKg } from './flow';

export const LINE_RATE_UNITS = ['oz/ft', 'g/m'] as const;
export type LineRateUnit = (typeof LINE_RATE_UNITS)[number];

const LINE_RATE_KG_PER_M: Readonly<Record<LineRateUnit, number>> = {
  'oz/ft': massToKg(1, 'oz') / lengthToM(1, 'ft'),
  'g/m': massToKg(1, 'g'),
};

export const lineRateToKgPerM = (value: number, unit: LineRateUnit): number => value * LINE_RATE_KG_PER_M[unit];
export const lineRateFromKgPerM = (kgPerM: number, unit: LineRateUnit): number => kgPerM / LINE_RATE_KG_PER_M[unit];
