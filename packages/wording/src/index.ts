/**
 * The door: every text a person sees, by language and unit system. Whole files only (`export *`): a name picked out of a file ties the door itself, and
 * with it every text there is, to the first download.
 */
export * from './unit-system';
export * from './present-value';
export * from './format-value';
export * from './derivation-lines';
export * from './criterion-parts';
export * from './sentences';
export * from './fault-sentences';
export * from './api-texts';
export * from './english/api';
export * from './air-refusal';
export * from './format-amount';
export * from './format-gauge';
export * from './saturation-fault';
export type { StructureFault, StructureFaultKind } from './structure-fault';
export type { Language } from './language';
export * from './load-reading-help';
export type { ReadingHelp } from './english/reading-help';
export * from './english/readings';
export * from './english/procedures';
export * from './english/setup';
export * from './english/safety';
export * from './english/check-page';
export * from './english/loose-checks';
export * from './english/makers-charts';
export * from './english/offline';
export * from './english/makers-data-page';
export * from './english/page-menu';
export * from './english/glance';
export * from './english/owner';
export * from './english/target-comparison';
export * from './owners-text';
// For the pages and routes of airflow, capacity and weigh-in.
export * from './field-sentences';
export * from './format-mass';
export * from './weigh-in-sum';
export * from './english/airflow';
export * from './english/field-inputs';
export * from './english/weigh-in';
export * from './diagnosis-sentences';
export * from './english/separating-tests';
export * from './english/properties';
export * from './english/worked-examples';
export * from './english/worked-example-stories';
export * from './worked-example-rows';
export * from './english/field-safety';
export * from './english/worksheets';
export * from './english/airflow-page';
export * from './english/moist-air';
export * from './english/moist-air-page';
export * from './english/weigh-in-page';
export * from './english/sources';
export * from './source-lines';
