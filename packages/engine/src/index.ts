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
// What follows is for the pages and routes of airflow, capacity and weigh-in: nothing of Check a charge uses it.
export * from './field/field-codes';
export * from './field/field-request';
export { crossCheckAirflow, readAirflowRequest } from './field/read-airflow';
export type { ReadAirflowRequest } from './field/read-airflow';
export { crossCheckCapacity, readCapacityRequest } from './field/read-capacity';
export type { ReadCapacityRequest } from './field/read-capacity';
export { crossCheckWeighIn, readWeighInRequest } from './field/read-weigh-in';
export type { ReadWeighInRequest } from './field/read-weigh-in';
export { WEIGH_IN_RULES } from './field/weigh-in-rules';
export type { WeighInRules } from './field/weigh-in-rules';
export * from './methods/airflow/airflow-codes';
export { ASSUMED_FIELD_LIMITS } from './methods/airflow/field-readings';
export { evaluateAirflow } from './methods/airflow/evaluate-airflow';
export type { AirflowResult } from './methods/airflow/evaluate-airflow';
export { evaluateCapacity } from './methods/capacity/evaluate-capacity';
export type { CapacityCaution, CapacityReason, CapacityResult } from './methods/capacity/evaluate-capacity';
export { CORRECTIONS } from './methods/weigh-in/charge-formulas';
export type { Correction } from './methods/weigh-in/charge-formulas';
export { R410A_LINE_RATES } from './methods/weigh-in/data/line-rates';
export { evaluateWeighIn } from './methods/weigh-in/evaluate-weigh-in';
export type { WeighInResult } from './methods/weigh-in/evaluate-weigh-in';
export type { LabelOutcome } from './methods/weigh-in/label-maximum';
export type { VacuumOutcome } from './methods/weigh-in/vacuum';
export * from './methods/weigh-in/weigh-in-codes';
