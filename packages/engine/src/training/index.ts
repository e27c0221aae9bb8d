/** The door of teaching: worked examples, loaded only by the pages that teach. */
export * from './worked-examples/worked-example';
export { findWorkedExample, WORKED_EXAMPLES } from './worked-examples/catalogue';
export type { WorkedFigure } from './worked-examples/computed-figures';
export * from './worked-examples/work-example';
