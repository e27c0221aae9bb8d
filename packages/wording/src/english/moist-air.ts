/** Air that cannot be, or that two readings do not determine. No blame: two facts, or what would be right. */
import type { MessageTexts } from '../message-texts';

/** What cannot be, with the figures of each sentence. */
export interface AirFigures {
  'dry-bulb-outside-range': 'actual' | 'least' | 'most';
  'dry-bulb-comes-out-of-range': 'actual' | 'least' | 'most';
  'humidity-takes-dry-bulb-out-of-range': 'actual' | 'least' | 'most';
  'wet-bulb-outside-range': 'actual' | 'least' | 'most';
  'wet-bulb-above-dry-bulb': 'actual' | 'dryBulb';
  'wet-bulb-too-low': 'actual' | 'least';
  'dew-point-outside-range': 'actual' | 'least' | 'most';
  'dew-point-above-dry-bulb': 'actual' | 'dryBulb';
  'dew-point-above-wet-bulb': 'actual' | 'wetBulb';
  'dew-point-too-low': 'actual' | 'least';
  'humidity-outside-range': never;
  'humidity-ratio-outside-range': 'actual' | 'least' | 'most';
  'more-than-dry-bulb-holds': 'actual' | 'most';
  'more-than-wet-bulb-holds': 'actual' | 'most';
  'enthalpy-outside-range': 'actual' | 'least' | 'most';
  'enthalpy-below-dry-air': 'actual' | 'least';
  'enthalpy-above-saturation': 'actual' | 'most';
  'enthalpy-below-saturation': 'actual' | 'least';
  'water-boils': never;
  'dew-point-and-humidity-ratio': never;
  'wet-bulb-and-enthalpy': never;
  'dry-air-by-both': never;
}

export const airTexts: MessageTexts<AirFigures> = {
  'dry-bulb-outside-range': (f) => `Dry bulb ${f.actual} is outside ${f.least} to ${f.most}, where moist air is known.`,
  'dry-bulb-comes-out-of-range': (f) =>
    `Together these two give a dry bulb of ${f.actual}, outside ${f.least} to ${f.most}, where moist air is known.`,
  'humidity-takes-dry-bulb-out-of-range': (f) =>
    `With relative humidity ${f.actual} the dry bulb would lie outside ${f.least} to ${f.most}, where moist air is known.`,
  'wet-bulb-outside-range': (f) => `Wet bulb ${f.actual} is outside ${f.least} to ${f.most}, where moist air is known.`,
  'wet-bulb-above-dry-bulb': (f) => `Wet bulb ${f.actual} is above dry bulb ${f.dryBulb}`,
  'wet-bulb-too-low': (f) => `Wet bulb ${f.actual} is below ${f.least}, which perfectly dry air would show.`,
  'dew-point-outside-range': (f) =>
    `Dew point ${f.actual} is outside ${f.least} to ${f.most}, where moist air is known.`,
  'dew-point-above-dry-bulb': (f) => `Dew point ${f.actual} is above dry bulb ${f.dryBulb}`,
  'dew-point-above-wet-bulb': (f) => `Dew point ${f.actual} is above wet bulb ${f.wetBulb}`,
  'dew-point-too-low': (f) => `Dew point ${f.actual} is below ${f.least}, where the formula ends.`,
  'humidity-outside-range': 'Relative humidity lies between 0 and 100 %.',
  'humidity-ratio-outside-range': (f) =>
    `Humidity ratio ${f.actual} is outside ${f.least} to ${f.most}, where moist air is known.`,
  'more-than-dry-bulb-holds': (f) =>
    `Humidity ratio ${f.actual} is above ${f.most}, the most that air of this dry bulb can hold.`,
  'more-than-wet-bulb-holds': (f) =>
    `Humidity ratio ${f.actual} is above ${f.most}, the most that air of this wet bulb can hold.`,
  'enthalpy-outside-range': (f) => `Enthalpy ${f.actual} is outside ${f.least} to ${f.most}, where moist air is known.`,
  'enthalpy-below-dry-air': (f) =>
    `Enthalpy ${f.actual} is below ${f.least}, which perfectly dry air of this dry bulb has.`,
  'enthalpy-above-saturation': (f) =>
    `Enthalpy ${f.actual} is above ${f.most}, which saturated air of this dry bulb has.`,
  'enthalpy-below-saturation': (f) =>
    `Enthalpy ${f.actual} is below ${f.least}, which air saturated with this much water has.`,
  'water-boils': 'Water boils at this temperature and elevation: there would be no air left.',
  'dew-point-and-humidity-ratio':
    'Dew point and humidity ratio say the same thing: at one air pressure each gives the other, and the dry bulb stays open. Give another reading in place of one of them.',
  'wet-bulb-and-enthalpy':
    'Wet bulb and enthalpy hardly differ: lines of one run almost along lines of the other, so the smallest error would move the dry bulb by many degrees. Give another reading in place of one of them.',
  'dry-air-by-both':
    'Perfectly dry air has relative humidity and humidity ratio 0 at any temperature: the dry bulb stays open. Give another reading in place of one of them.',
};
