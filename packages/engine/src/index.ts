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
export * from './check/makers-charts/plausibility';
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
export * from './methods/makers-chart/chart-units';
export * from './methods/makers-chart/kinds';
export * from './methods/target-comparison';
export * from './refrigerants/refrigerant-model';
// For the pages and routes of airflow, capacity and weigh-in.
export * from './field/field-codes';
export * from './field/field-request';
export * from './field/field-version';
export * from './field/read-airflow';
export * from './field/read-capacity';
export * from './field/read-weigh-in';
export * from './field/weigh-in-rules';
export * from './methods/airflow/airflow-codes';
export * from './methods/airflow/evaluate-airflow';
export * from './methods/capacity/evaluate-capacity';
export * from './methods/weigh-in/corrections';
export * from './methods/weigh-in/data/line-rates';
export * from './methods/weigh-in/evaluate-weigh-in';
export type { LabelOutcome } from './methods/weigh-in/label-maximum';
export type { VacuumOutcome } from './methods/weigh-in/vacuum';
export * from './methods/weigh-in/weigh-in-codes';
export * from './refrigerants/model-limit';
export * from './refrigerants/printed-difference';
export type { PrintedTable } from './refrigerants/data/printed-tables';
export * from './check/site-atmosphere';
