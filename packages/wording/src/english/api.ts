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
  'method-not-allowed': 'This address does not take this method; the header Allow says which it takes.',
  'too-many-requests': 'Too many requests from one address. Try again in a second.',
  busy: 'The server has too much to do at once. Try again in a second.',
  'not-ready': 'The server cannot read its data.',
  internal: 'Something went wrong in the server. The log has the details under this id.',
} as const;

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
} as const;

/** What cannot be in a look-up, with the figures of each sentence. */
export interface LookUpFigures {
  'elevation-outside-range': 'actual' | 'least' | 'most';
  'below-absolute-zero': 'actual';
  'not-above-vacuum': never;
  'above-critical-pressure': 'actual' | 'critical';
  'above-critical-temperature': 'actual' | 'critical';
  'dry-bulb-outside-range': 'actual' | 'least' | 'most';
  'humidity-outside-range': never;
  'wet-bulb-above-dry-bulb': 'actual' | 'dryBulb';
  'wet-bulb-too-low': 'actual' | 'least';
  'dew-point-above-dry-bulb': 'actual' | 'dryBulb';
  'dew-point-too-low': 'actual' | 'least';
  'water-boils': never;
}

export const lookUpTexts: MessageTexts<LookUpFigures> = {
  'elevation-outside-range': (f) => `Elevation ${f.actual} is outside ${f.least} to ${f.most}.`,
  'below-absolute-zero': (f) => `Temperature ${f.actual} is below absolute zero.`,
  'not-above-vacuum': 'This pressure is not above a perfect vacuum.',
  'above-critical-pressure': (f) =>
    `Pressure ${f.actual} is above the critical pressure ${f.critical}: there is no liquid any more.`,
  'above-critical-temperature': (f) =>
    `Temperature ${f.actual} is above the critical temperature ${f.critical}: there is no liquid any more.`,
  'dry-bulb-outside-range': (f) => `Dry bulb ${f.actual} is outside ${f.least} to ${f.most}, where moist air is known.`,
  'humidity-outside-range': 'Relative humidity lies between 0 and 100 %.',
  'wet-bulb-above-dry-bulb': (f) => `Wet bulb ${f.actual} is above dry bulb ${f.dryBulb}`,
  'wet-bulb-too-low': (f) => `Wet bulb ${f.actual} is below ${f.least}, which perfectly dry air would show.`,
  'dew-point-above-dry-bulb': (f) => `Dew point ${f.actual} is above dry bulb ${f.dryBulb}`,
  'dew-point-too-low': (f) => `Dew point ${f.actual} is below ${f.least}, where the formula ends.`,
  'water-boils': 'Water boils at this temperature and elevation: there would be no air left.',
};
