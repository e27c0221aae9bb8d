import type { Citation } from './source-entry';

/** "2008", "03/2010", "rev. 07"; digits of document numbers and DOIs do not stand alone. */
const EDITIONS = /(?<![\d./-])(?:\d{2}\/)?(?:19|20)\d{2}(?![\d.-])|rev\. \d+/g;

/** A citation of several publications has the editions of all, in their order. */
export function citation(text: string): Citation {
  const found = new Set(text.match(EDITIONS));
  return { text, edition: found.size === 0 ? null : [...found].join(', ') };
}
