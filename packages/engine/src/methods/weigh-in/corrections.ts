/** What a maker corrects the charge for besides the line. */
export const CORRECTIONS = ['coil', 'drier', 'other'] as const;
export type Correction = (typeof CORRECTIONS)[number];
