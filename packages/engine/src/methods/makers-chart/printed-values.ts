/** From the figures of a maker's table to SI and back. */
import {
  differenceFromK,
  differenceToK,
  pressureAsReadToPa,
  pressureFromPa,
  pressureToPa,
  temperatureFromK,
  temperatureToK,
} from '../../units';
import type { ChartUnit } from './chart-units';

/**
 * Gauge pressures of a printed table count from the standard atmosphere at sea level (ICAO, 101 325 Pa), as printed pressure-temperature tables do
 * (common practice, no source): the maker did not know the elevation of this site.
 */
export const PRINTED_ATMOSPHERE_PA = 101_325;

/** SI value of a printed figure: K, K of a difference, or absolute Pa. */
export function printedToSi(value: number, unit: ChartUnit): number {
  switch (unit) {
    case 'degF':
    case 'degC':
      return temperatureToK(value, unit);
    case 'deltaF':
    case 'deltaC':
      return differenceToK(value, unit);
    case 'psig':
    case 'psia':
    case 'kPag':
    case 'kPaa':
    case 'barg':
    case 'bara':
      return pressureToPa(value, unit, PRINTED_ATMOSPHERE_PA);
  }
}

/** Inverse of `printedToSi`. */
export function printedFromSi(si: number, unit: ChartUnit): number {
  switch (unit) {
    case 'degF':
    case 'degC':
      return temperatureFromK(si, unit);
    case 'deltaF':
    case 'deltaC':
      return differenceFromK(si, unit);
    case 'psig':
    case 'psia':
    case 'kPag':
    case 'kPaa':
    case 'barg':
    case 'bara':
      return pressureFromPa(si, unit, PRINTED_ATMOSPHERE_PA);
  }
}

/** SI size of a printed step, such as the last digit: the same everywhere on these scales. */
export function printedStepToSi(step: number, unit: ChartUnit): number {
  switch (unit) {
    case 'degF':
    case 'deltaF':
      return differenceToK(step, 'deltaF');
    case 'degC':
    case 'deltaC':
      return step;
    case 'psig':
    case 'psia':
    case 'kPag':
    case 'kPaa':
    case 'barg':
    case 'bara':
      return pressureAsReadToPa(step, unit);
  }
}
