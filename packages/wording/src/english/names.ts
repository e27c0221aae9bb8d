import type { FigureNames } from '../message-texts';
import { makersChartWords } from './makers-charts';
import { readingWords } from './readings';
import { listWords, setupWords } from './setup';
import { targetRangePhrase } from './target-ranges';

const { mode, kind, stage, highSidePort, numbers } = setupWords;

/** Names of readings, look-over items and setup fields inside a sentence. */
export const names: FigureNames = {
  reading: readingWords,
  preflight: setupWords.preflight,
  setup: { mode, kind, stage, highSidePort, elevation: numbers.elevation },
  makersChart: makersChartWords.kinds,
  targetRange: targetRangePhrase,
  list: listWords,
};
