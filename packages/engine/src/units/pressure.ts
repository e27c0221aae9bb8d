/**
 * Pressures. Inside the engine a pressure is absolute, in Pa; a gauge value becomes absolute once, with a stated atmosphere.
 * Factors: NIST SP 811 (2008), appendix B.8: 1 psi = 6894.757 293 168 Pa, 1 inHg (32 °F) = 3386.389 Pa, 1 inH2O (4 °C) = 249.082 Pa.
 */

export const PRESSURE_UNITS = ['psig', 'psia', 'kPag', 'kPaa', 'barg', 'bara', 'inHgVac'] as const;
export type PressureUnit = (typeof PRESSURE_UNITS)[number];

export const PRESSURE_DIFFERENCE_UNITS = ['psi', 'kPa', 'bar'] as const;
export type PressureDifferenceUnit = (typeof PRESSURE_DIFFERENCE_UNITS)[number];

export const STATIC_PRESSURE_UNITS = ['inH2O', 'Pa'] as const;
export type StaticPressureUnit = (typeof STATIC_PRESSURE_UNITS)[number];

export const PA_PER_PSI = 6894.757293168;
export const PA_PER_INHG = 3386.389;
export const PA_PER_INH2O = 249.082;

interface PressureScale {
  readonly paPerUnit: number;
  readonly gauge: boolean;
}

const SCALES: Readonly<Record<PressureUnit, PressureScale>> = {
  psig: { paPerUnit: PA_PER_PSI, gauge: true },
  psia: { paPerUnit: PA_PER_PSI, gauge: false },
  kPag: { paPerUnit: 1e3, gauge: true },
  kPaa: { paPerUnit: 1e3, gauge: false },
  barg: { paPerUnit: 1e5, gauge: true },
  bara: { paPerUnit: 1e5, gauge: false },
  // inches of mercury of vacuum count downwards from the local atmosphere
  inHgVac: { paPerUnit: -PA_PER_INHG, gauge: true },
};

export const isGaugeUnit = (unit: PressureUnit): boolean => SCALES[unit].gauge;

/** Pa of the number as read: gauge pressure for gauge units, absolute for the others. */
export const pressureAsReadToPa = (value: number, unit: PressureUnit): number => value * SCALES[unit].paPerUnit;

/** Absolute Pa of a pressure as read, given the atmosphere where the sensor was zeroed. */
export const pressureToPa = (value: number, unit: PressureUnit, atmospherePa: number): number =>
  pressureAsReadToPa(value, unit) + (SCALES[unit].gauge ? atmospherePa : 0);

/** Inverse of `pressureToPa`. */
export const pressureFromPa = (pa: number, unit: PressureUnit, atmospherePa: number): number =>
  (pa - (SCALES[unit].gauge ? atmospherePa : 0)) / SCALES[unit].paPerUnit;

const DIFFERENCE_PA: Readonly<Record<PressureDifferenceUnit, number>> = { psi: PA_PER_PSI, kPa: 1e3, bar: 1e5 };

/** Pa of a pressure difference, e.g. of an instrument's ±. */
export const pressureDifferenceToPa = (value: number, unit: PressureDifferenceUnit): number =>
  value * DIFFERENCE_PA[unit];

export const pressureDifferenceFromPa = (pa: number, unit: PressureDifferenceUnit): number => pa / DIFFERENCE_PA[unit];

/** Pa of a duct's static pressure. */
export const staticPressureToPa = (value: number, unit: StaticPressureUnit): number =>
  unit === 'inH2O' ? value * PA_PER_INH2O : value;
