/** The units a person reads in. Chosen per screen or answer and passed along: there is no global mode. */
export const UNIT_SYSTEMS = ['F-psi', 'C-kPa', 'C-bar'] as const;
export type UnitSystem = (typeof UNIT_SYSTEMS)[number];
