/** A figure of a method as data: how it was printed, and on what it stands. */

/** `read` in the named source, recalled from `memory`, common `practice` without a source, our own `choice`, or `computed` from published figures. */
export type FigureStanding = 'read' | 'memory' | 'practice' | 'choice' | 'computed';

/** What stands in the place of a source where there is none to name. */
export const COMMON_PRACTICE = 'Common practice, no source';
export const OUR_CHOICE = 'Our choice, open to better evidence';

export interface SourcedFigure {
  /** SI, as the name of its place says. */
  readonly value: number;
  readonly printed: string;
  readonly standing: FigureStanding;
  readonly source: string;
}
