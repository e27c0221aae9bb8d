/** The door of teaching: worked examples, loaded only by the pages that teach. */
export * from './worked-examples/worked-example';
export * from './worked-examples/catalogue';
export type { WorkedFigure } from './worked-examples/computed-figures';
export * from './worked-examples/work-example';
