/** Deep vacuum in microns: thousandths of a millimetre of mercury, absolute. 1 mmHg (conventional) = 133.3224 Pa (NIST SP 811 (2008), appendix B.8). */
const PA_PER_MICRON = 0.1333224;

export const VACUUM_UNITS = ['micron', 'Pa'] as const;
export type VacuumUnit = (typeof VACUUM_UNITS)[number];

export const micronsToPa = (microns: number): number => microns * PA_PER_MICRON;
export const micronsFromPa = (pa: number): number => pa / PA_PER_MICRON;
export const vacuumToPa = (value: number, unit: VacuumUnit): number => (unit === 'micron' ? micronsToPa(value) : value);
