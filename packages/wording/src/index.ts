/** The door: every text a person sees, by language and unit system. */
export * from './unit-system';
export * from './present-value';
export * from './format-value';
export * from './derivation-lines';
export * from './criterion-parts';
export * from './sentences';
export * from './api-texts';
export { problemDetails, typeNames } from './english/api';
export type { StructureFault, StructureFaultKind } from './structure-fault';
export type { Language } from './language';
export type { ReadingWords } from './english/readings';
export type { ChoiceWords, SetupFieldWords } from './english/setup';
export { readingWords } from './english/readings';
export { listWords, setupWords } from './english/setup';
export * as safetyWords from './english/safety';
export { checkPageWords } from './english/check-page';
export { looseChecksWords } from './english/loose-checks';
export { offlineWords } from './english/offline';
