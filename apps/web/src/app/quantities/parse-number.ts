/** What a person typed, as a number: decimal point or comma, true minus or hyphen, and the step its decimals tell. */

export interface TypedNumber {
  readonly value: number;
  /** Step of the last decimal typed: 0.01 for "64.50", 1 for "395". */
  readonly resolution: number;
}

export type NumberProblem = 'not-a-number' | 'too-long' | 'thousands-mark';

export type ParsedNumber =
  | { readonly state: 'blank' }
  | { readonly state: 'number'; readonly number: TypedNumber }
  | { readonly state: 'problem'; readonly problem: NumberProblem };

/** Longer than any reading; a paste of something else. */
const MOST_CHARACTERS = 12;

const MINUS_SIGNS = /^[-\u2212\u2013]/;
const DECIMAL = /^[+-]?(?:\d+[.,]?\d*|[.,]\d+)$/;
/** "2,723" is 2.723 to some and 2723 to others: nobody's reading is guessed. A zero in front settles it. */
const THOUSANDS_MARK =
  /^[+-]?(?:[1-9]\d{0,2}(?:,\d{3})+(?:\.\d*)?|[1-9]\d{0,2}(?:\.\d{3})+,\d*|[1-9]\d{0,2}(?:\.\d{3}){2,})$/;

const decimalsOf = (text: string): number => {
  const mark = text.search(/[.,]/);
  return mark < 0 ? 0 : text.length - mark - 1;
};

/** Reads typed text as a number; never throws, and never guesses between two readings of one text. */
export function parseNumber(typed: string): ParsedNumber {
  const text = typed.trim().replace(MINUS_SIGNS, '-');
  if (text === '') return { state: 'blank' };
  if (text.length > MOST_CHARACTERS) return { state: 'problem', problem: 'too-long' };
  if (THOUSANDS_MARK.test(text)) return { state: 'problem', problem: 'thousands-mark' };
  if (!DECIMAL.test(text)) return { state: 'problem', problem: 'not-a-number' };
  const value = Number(text.replace(',', '.'));
  return { state: 'number', number: { value, resolution: Number(`1e-${decimalsOf(text)}`) } };
}

/** The text with its sign turned: decimal keypads of phones have no minus. */
export function withSignTurned(typed: string): string {
  const text = typed.trim();
  return MINUS_SIGNS.test(text) ? text.slice(1) : `-${text.replace(/^\+/, '')}`;
}
