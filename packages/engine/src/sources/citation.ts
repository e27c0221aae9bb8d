import type { Citation } from './source-entry';

/** "2008", "03/2010": the first year a citation states, with its month; digits of document numbers and DOIs are not alone. */
const EDITION = /(?<![\d./-])(?:\d{2}\/)?(?:19|20)\d{2}(?![\d.-])/;

export const citation = (text: string): Citation => ({ text, edition: EDITION.exec(text)?.[0] ?? null });
