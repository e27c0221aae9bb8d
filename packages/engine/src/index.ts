/**
 * The door of the phone: everything Check a charge computes. Whole files only (`export *`): a name picked out of a file ties the door itself, and with it
 * the whole engine, to the first download.
 */
export * from './errors';
export * from './result';
export * from './units';
export * from './derivation/quantity';
export type { Formula } from './derivation/formula';
export type { DerivationStep } from './derivation/steps';
export * from './derivation/replay';
export * from './check/codes';
export * from './check/readings';
export * from './check/request';
export * from './check/result';
export * from './check/procedure-catalogue';
export * from './check/procedure-ids';
export type { Procedure, Rule, Standing } from './check/procedure';
export * from './check/cross-check';
export * from './check/read-request';
export type { CheckInput } from './check/input';
export * from './check/evaluate-check';
export * from './check/engine-version';
export * from './refrigerants/catalogue';
export * from './refrigerants/saturation';
export * from './psychrometrics/moist-air';
export * from './psychrometrics/moist-air-pairs';
export * from './psychrometrics/inch-pound-enthalpy';
export * from './psychrometrics/moist-air-range';
export * from './psychrometrics/standard-atmosphere';
export * from './methods/target-comparison';
export * from './refrigerants/refrigerant-model';
