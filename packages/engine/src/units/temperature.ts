/**
 * Temperatures and temperature differences, two disjoint families so that mixing them does not compile.
 * Factors: 1 °F step = 5/9 K, 0 °C = 273.15 K exactly (NIST SP 811 (2008), appendix B.8).
 */

export const TEMPERATURE_UNITS = ['degF', 'degC', 'K'] as const;
export type TemperatureUnit = (typeof TEMPERATURE_UNITS)[number];

export const DIFFERENCE_UNITS = ['deltaF', 'deltaC', 'K'] as const;
export type DifferenceUnit = (typeof DIFFERENCE_UNITS)[number];

/** Kelvin of a temperature on the named scale. Linear, so any finite number is accepted; ranges are checked where they matter. */
export function temperatureToK(value: number, unit: TemperatureUnit): number {
  switch (unit) {
    case 'degF':
      return ((value - 32) * 5) / 9 + 273.15;
    case 'degC':
      return value + 273.15;
    case 'K':
      return value;
  }
}

/** Inverse of `temperatureToK`. */
export function temperatureFromK(kelvin: number, unit: TemperatureUnit): number {
  switch (unit) {
    case 'degF':
      return ((kelvin - 273.15) * 9) / 5 + 32;
    case 'degC':
      return kelvin - 273.15;
    case 'K':
      return kelvin;
  }
}

/** Kelvin of a temperature *difference*. */
export function differenceToK(value: number, unit: DifferenceUnit): number {
  return unit === 'deltaF' ? (value * 5) / 9 : value;
}

/** Inverse of `differenceToK`. */
export function differenceFromK(kelvin: number, unit: DifferenceUnit): number {
  return unit === 'deltaF' ? (kelvin * 9) / 5 : kelvin;
}
