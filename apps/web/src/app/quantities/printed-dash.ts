/** What stands for a printed dash: there is no value here. */
export const DASH = '–';
const DASHES = /^(?:[-\u2010-\u2015\u2212]|--)$/;

/** A dash however it was typed or copied. */
export const isDash = (text: string): boolean => DASHES.test(text.trim());
