/** What the API says when it refuses: to a programmer who reads the answer, and to a person a program shows it to. */
import type { MessageTexts } from '../message-texts';

/** One sentence for each code of a problem (RFC 9457 `detail`). */
export const problemDetails = {
  'invalid-input': 'Some of what was given cannot be; errors says what and where.',
  'malformed-json': 'The body is not valid JSON.',
  'malformed-request': 'The address or the body cannot be read.',
  'body-too-large': 'The body is larger than 100 kB.',
  'not-json': 'The body has to be JSON in UTF-8, declared as Content-Type: application/json.',
  'unknown-refrigerant':
    'There are no curves for this refrigerant. Its designation is written as in the list, such as R-410A.',
  'not-found': 'There is nothing at this address.',
  'sign-in-refused': 'No one signs in with this address and password.',
  'signed-out': 'Sign in first.',
  'wrong-origin': 'This request came from a page of another server.',
  forbidden: 'None of your roles may do this.',
  wait: 'Too many failed attempts. The header Retry-After says how many seconds to wait.',
  'method-not-allowed': 'This address does not take this method; the header Allow says which it takes.',
  'too-many-requests': 'Too many requests from one address. Try again in a second.',
  busy: 'The server has too much to do at once. Try again in a second.',
  'not-ready': 'The server cannot read its data.',
  internal: 'Something went wrong in the server. The log has the details under this id.',
} as const;

export const passwordTooShort = (least: number): string => `A password has at least ${least} characters.`;

/** What a field takes, after “give”. */
export const typeNames = {
  number: 'a number',
  text: 'a text',
  'true-or-false': 'true or false',
  object: 'an object',
  list: 'a list',
} as const;

export const parameterTexts = {
  'give-one-of': (names: string) => `Give ${names}.`,
  'give-only-one-of': (names: string) => `Give only one of ${names}.`,
  'give-two-of': (names: string) => `Give two of ${names}.`,
  'give-only-two-of': (names: string) => `Give only two of ${names}.`,
} as const;

/** What cannot be in a look-up, with the figures of each sentence. */
export interface LookUpFigures {
  'elevation-outside-range': 'actual' | 'least' | 'most';
  'below-absolute-zero': 'actual';
  'not-above-vacuum': never;
  'above-critical-pressure': 'actual' | 'critical';
  'above-critical-temperature': 'actual' | 'critical';
}

export const lookUpTexts: MessageTexts<LookUpFigures> = {
  'elevation-outside-range': (f) => `Elevation ${f.actual} is outside ${f.least} to ${f.most}.`,
  'below-absolute-zero': (f) => `Temperature ${f.actual} is below absolute zero.`,
  'not-above-vacuum': 'This pressure is not above a perfect vacuum.',
  'above-critical-pressure': (f) =>
    `Pressure ${f.actual} is above the critical pressure ${f.critical}: there is no liquid any more.`,
  'above-critical-temperature': (f) =>
    `Temperature ${f.actual} is above the critical temperature ${f.critical}: there is no liquid any more.`,
};
