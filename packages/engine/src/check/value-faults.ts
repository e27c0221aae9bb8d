/** What cannot be in one value, whichever request it belongs to: each fault at the path of its field. */
import { AIR_PRESSURE_LIMITS } from '../psychrometrics/moist-air-range';
import { ELEVATION_LIMITS, standardAtmospherePressurePa } from '../psychrometrics/standard-atmosphere';
import { isGaugeUnit, lengthToM, pressureAsReadToPa, pressureToPa, temperatureToK } from '../units';
import type { LengthUnit, PressureUnit, TemperatureUnit } from '../units';
import type { AtmosphereInput } from './atmosphere';
import { ATMOSPHERE_FIGURES } from './atmosphere';
import type { FaultMessage } from './codes';
import type { Amount, ReadingInput } from './request';
import type { Dimension } from './readings';
import { UNITS_OF_DIMENSION } from './reading-units';

/** Slack of comparisons in kelvin: rounding of the conversions. */
const SLACK_K = 1e-9;
/** Far past any reading; from here on the conversions and squares of SI numbers would leave the range of a double. */
const LARGEST_NUMBER = 1e12;

/** What turns a pressure as read into an absolute one and says where it ends; unknown while the setup is at fault. */
export interface PressureContext {
  readonly atmospherePa?: number;
  readonly criticalPa?: number;
}

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

  /** A reading with its ±, in the units of what it measures. */
  reading(path: string, dimension: Dimension, reading: ReadingInput, pressures: PressureContext = {}): void {
    const units = UNITS_OF_DIMENSION[dimension];
    this.notNegative(`${path}.plusMinus`, reading.plusMinus?.value);
    if (reading.plusMinus !== undefined && !units.plusMinus.includes(reading.plusMinus.unit)) {
      this.add(`${path}.plusMinus`, { code: 'wrong-unit', figures: {} });
    }
    this.notNegative(`${path}.ageSeconds`, reading.ageSeconds);
    this.notNegative(`${path}.resolution`, reading.resolution);
    if (!units.reading.includes(reading.unit)) {
      this.add(path, { code: 'wrong-unit', figures: {} });
      return;
    }
    switch (dimension) {
      case 'temperature':
        this.temperature(path, reading as Amount<TemperatureUnit>);
        break;
      case 'pressure':
        this.pressure(path, reading as Amount<PressureUnit>, pressures);
        break;
      case 'humidity':
        this.humidity(path, reading.value);
        break;
      case 'airflow':
      case 'current':
      case 'voltage':
        this.notNegative(path, reading.value);
        break;
      case 'staticPressure':
        this.finite(path, reading.value);
        break;
    }
  }

  pressure(path: string, amount: Amount<PressureUnit>, context: PressureContext): void {
    const { value, unit } = amount;
    const { atmospherePa, criticalPa = Infinity } = context;
    if (!this.finite(path, value)) return;
    if (atmospherePa === undefined && isGaugeUnit(unit)) return;
    const pa = pressureToPa(value, unit, atmospherePa ?? 0);
    if (pa <= 0) this.add(path, { code: 'not-above-vacuum', figures: {} });
    if (pa > criticalPa) {
      const figures = {
        actual: { kind: 'pressurePa', value: pa },
        critical: { kind: 'pressurePa', value: criticalPa },
      } as const;
      this.add(path, { code: 'above-critical-pressure', figures });
    }
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
    if (Math.abs(stationPa - expected) <= ATMOSPHERE_FIGURES.mostWeatherPa.value) return true;
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
    const { min, max } = AIR_PRESSURE_LIMITS;
    const pa = pressureAsReadToPa(pressure.value, pressure.unit);
    if (pa >= min && pa <= max) return pa;
    const figures = { least: { kind: 'pressurePa', value: min }, most: { kind: 'pressurePa', value: max } } as const;
    this.add(path, { code: 'barometer-outside-range', figures });
    return null;
  }
}
