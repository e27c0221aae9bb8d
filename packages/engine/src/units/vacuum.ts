/** Deep vacuum in microns: thousandths of a millimetre of mercury, absolute. 1 mmHg (conventional) = 133.3224 Pa (NIST SP 811 (2008), appendix B.8). */
const PA_PER_MICRON = 0.1333224;

export const micronsToPa = (microns: number): number => microns * PA_PER_MICRON;
export const micronsFromPa = (pa: number): number => pa / PA_PER_MICRON;
