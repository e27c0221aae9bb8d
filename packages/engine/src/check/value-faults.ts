/** What cannot be in one value, whichever request it belongs to: each fault at the path of its field. */
import { PRESSURE_LIMITS } from '../psychrometrics/moist-air-limits';
import { ELEVATION_LIMITS, standardAtmospherePressurePa } from '../psychrometrics/standard-atmosphere';
import { isGaugeUnit, lengthToM, pressureAsReadToPa, temperatureToK } from '../units';
import type { LengthUnit, PressureUnit, TemperatureUnit } from '../units';
import type { AtmosphereInput } from './atmosphere';
import { MOST_WEATHER_PA } from './atmosphere';
import type { FaultMessage } from './codes';
import type { Amount } from './request';

/** Slack of comparisons in kelvin: rounding of the conversions. */
const SLACK_K = 1e-9;
/** Far past any reading; from here on the conversions and squares of SI numbers would leave the range of a double. */
const LARGEST_NUMBER = 1e12;

/** Collects faults; `More` are messages of requests other than a check's. */
export class Faults<More = never> {
  readonly list: ((FaultMessage | More) & { readonly path: string })[] = [];

  add(path: string, message: FaultMessage | More): void {
    this.list.push({ ...message, path });
  }

  finite(path: string, value: number): boolean {
    if (Math.abs(value) <= LARGEST_NUMBER) return true;
    this.add(path, { code: 'not-a-finite-number', figures: {} });
    return false;
  }

  positive(path: string, amount: Amount<string> | undefined): void {
    if (amount === undefined || !this.finite(path, amount.value)) return;
    if (amount.value <= 0) this.add(path, { code: 'must-be-positive', figures: {} });
  }

  notNegative(path: string, value: number | undefined): void {
    if (value === undefined || !this.finite(path, value)) return;
    if (value < 0) this.add(path, { code: 'must-not-be-negative', figures: {} });
  }

  temperature(path: string, { value, unit }: Amount<TemperatureUnit>): void {
    if (!this.finite(path, value)) return;
    const kelvin = temperatureToK(value, unit);
    if (kelvin >= 0) return;
    this.add(path, { code: 'below-absolute-zero', figures: { actual: { kind: 'temperatureK', value: kelvin } } });
  }

  /** In percent. */
  humidity(path: string, percent: number): void {
    if (!this.finite(path, percent) || (percent >= 0 && percent <= 100)) return;
    this.add(path, { code: 'humidity-outside-range', figures: {} });
  }

  /** At the path of the wet bulb. */
  wetBulb(
    path: string,
    dryBulb: Amount<TemperatureUnit> | undefined,
    wetBulb: Amount<TemperatureUnit> | undefined,
  ): void {
    if (dryBulb === undefined || wetBulb === undefined) return;
    const dryBulbK = temperatureToK(dryBulb.value, dryBulb.unit);
    const wetBulbK = temperatureToK(wetBulb.value, wetBulb.unit);
    // what is not a number, or not a temperature, has its own fault
    if (!(wetBulbK > dryBulbK + SLACK_K && Number.isFinite(wetBulbK - dryBulbK))) return;
    const figures = {
      wetBulb: { kind: 'temperatureK', value: wetBulbK },
      dryBulb: { kind: 'temperatureK', value: dryBulbK },
    } as const;
    this.add(path, { code: 'wet-bulb-above-dry-bulb', figures });
  }

  /** Whether the air pressure at the site is known. `root` is what stands before its two fields. */
  atmosphere(root: string, { elevation, stationPressure }: AtmosphereInput): boolean {
    const elevationM = elevation === undefined ? undefined : this.#elevation(`${root}elevation`, elevation);
    const path = `${root}stationPressure`;
    const stationPa = stationPressure === undefined ? undefined : this.#barometer(path, stationPressure);
    if (elevationM === null || stationPa === null) return false;
    if (elevationM === undefined || stationPa === undefined) return true;
    const expected = standardAtmospherePressurePa(elevationM);
    if (Math.abs(stationPa - expected) <= MOST_WEATHER_PA) return true;
    const figures = {
      stated: { kind: 'pressurePa', value: stationPa },
      expected: { kind: 'pressurePa', value: expected },
    } as const;
    this.add(path, { code: 'barometer-contradicts-elevation', figures });
    return false;
  }

  #elevation(path: string, elevation: Amount<LengthUnit>): number | null {
    if (!this.finite(path, elevation.value)) return null;
    const { min, max } = ELEVATION_LIMITS;
    const metres = lengthToM(elevation.value, elevation.unit);
    if (metres >= min && metres <= max) return metres;
    const figures = { least: { kind: 'lengthM', value: min }, most: { kind: 'lengthM', value: max } } as const;
    this.add(path, { code: 'elevation-outside-range', figures });
    return null;
  }

  #barometer(path: string, pressure: Amount<PressureUnit>): number | null {
    if (!this.finite(path, pressure.value)) return null;
    if (isGaugeUnit(pressure.unit)) {
      this.add(path, { code: 'gauge-unit-on-absolute', figures: {} });
      return null;
    }
    const { min, max } = PRESSURE_LIMITS;
    const pa = pressureAsReadToPa(pressure.value, pressure.unit);
    if (pa >= min && pa <= max) return pa;
    const figures = { least: { kind: 'pressurePa', value: min }, most: { kind: 'pressurePa', value: max } } as const;
    this.add(path, { code: 'barometer-outside-range', figures });
    return null;
  }
}
