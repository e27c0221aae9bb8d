import type { ReadingHelp } from './english/reading-help';
import type { ReadingId } from '@chargewright/engine';

/** How each reading is taken and its usual mistake: the longest of the page's texts, so a page loads them after its first paint. */
export const loadReadingHelp = async (): Promise<Readonly<Record<ReadingId, ReadingHelp>>> =>
  (await import('./english/reading-help')).readingHelp;
