/** The door of the sources: what everything rests on, loaded only by the page and the route that list it. */
export * from './source-entry';
export * from './list-sources';
export type { NamedFigureId } from './named-figures';
export type { ProcedureFigureId, ProcedureSummary } from './procedure-figures';
export type { SourceFormulaId } from './source-formulas';
