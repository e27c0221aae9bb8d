/**
 * What cannot be, in the values of a request whose shape is right: every fault at once, each at the path of its field. What is possible but odd
 * is a caution of the result instead.
 */
import { ELEVATION_LIMITS, standardAtmospherePressurePa } from '../psychrometrics/standard-atmosphere';
import { PRESSURE_LIMITS } from '../psychrometrics/moist-air-limits';
import { isRefrigerantId, refrigerantFacts } from '../refrigerants/catalogue';
import { isGaugeUnit, lengthToM, pressureAsReadToPa, pressureToPa, temperatureToK } from '../units';
import type { LengthUnit, PressureUnit, TemperatureUnit } from '../units';
import { atmosphereOf, MOST_WEATHER_PA } from './atmosphere';
import type { Fault, FaultMessage } from './codes';
import { findProcedure } from './procedure-catalogue';
import type { Amount, ReadingInput, ReadingsInput, SetupInput, VisitInput } from './request';
import type { ReadingId } from './readings';
import { READING_DIMENSIONS, READING_IDS } from './readings';
import { UNITS_OF_DIMENSION } from './reading-units';

/** A request of which some fields may be left out because their own shape was at fault. */
export interface PartialRequest {
  readonly procedure?: string;
  readonly setup?: Partial<SetupInput>;
  readonly visit?: VisitInput;
  readonly readings?: ReadingsInput;
}

/** Slack of comparisons in kelvin: rounding of the conversions. */
const SLACK_K = 1e-9;
/** Far past any reading; from here on the conversions and squares of SI numbers would leave the range of a double. */
const LARGEST_NUMBER = 1e12;

class Faults {
  readonly list: Fault[] = [];

  add(path: string, message: FaultMessage): void {
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
}

/** Every fault of the values; an empty list means that the request can be judged. Total: never throws for a well-typed request. */
export function crossCheck(request: PartialRequest): readonly Fault[] {
  const faults = new Faults();
  const { procedure, setup = {}, visit = {}, readings = {} } = request;
  if (procedure !== undefined && findProcedure(procedure) === undefined) {
    faults.add('procedure', { code: 'unknown-procedure', figures: {} });
  }
  const pressures = checkSetup(faults, setup);
  checkVisit(faults, visit, pressures);
  checkReadings(faults, readings, 'readings', pressures);
  return faults.list;
}

/** What turns a pressure as read into an absolute one and says where it ends; unknown while the setup is at fault. */
interface PressureContext {
  readonly atmospherePa?: number;
  readonly criticalPa?: number;
}

function checkSetup(faults: Faults, setup: Partial<SetupInput>): PressureContext {
  const { refrigerant, superheatRange, lineSet } = setup;
  const context: { atmospherePa?: number; criticalPa?: number } = {};
  if (refrigerant !== undefined) {
    if (isRefrigerantId(refrigerant)) context.criticalPa = refrigerantFacts(refrigerant).criticalPressurePa;
    else faults.add('setup.refrigerant', { code: 'unknown-refrigerant', figures: {} });
  }
  if (checkAtmosphere(faults, setup)) context.atmospherePa = atmosphereOf(setup).value;
  faults.notNegative('setup.targetSuperheat', setup.targetSuperheat?.value);
  faults.notNegative('setup.targetSubcooling', setup.targetSubcooling?.value);
  faults.positive('setup.nominalCapacity', setup.nominalCapacity);
  faults.positive('setup.designAirflow', setup.designAirflow);
  faults.positive('setup.factoryCharge', setup.factoryCharge);
  if (setup.maxHighPressure !== undefined) {
    checkPressure(faults, 'setup.maxHighPressure', setup.maxHighPressure, { ...context, criticalPa: Infinity });
  }
  if (superheatRange !== undefined) {
    const path = 'setup.superheatRange';
    if (faults.finite(path, superheatRange.low) && faults.finite(path, superheatRange.high)) {
      if (superheatRange.low > superheatRange.high) faults.add(path, { code: 'low-above-high', figures: {} });
    }
  }
  faults.notNegative('setup.lineSet.length', lineSet?.length?.value);
  faults.notNegative('setup.lineSet.included', lineSet?.included?.value);
  if (lineSet?.lift !== undefined) faults.finite('setup.lineSet.lift', lineSet.lift.value);
  return context;
}

function checkAtmosphere(faults: Faults, { elevation, stationPressure }: Partial<SetupInput>): boolean {
  const elevationM = elevation === undefined ? undefined : checkElevation(faults, elevation);
  const stationPa = stationPressure === undefined ? undefined : checkBarometer(faults, stationPressure);
  if (elevationM === null || stationPa === null) return false;
  if (elevationM === undefined || stationPa === undefined) return true;
  const expected = standardAtmospherePressurePa(elevationM);
  if (Math.abs(stationPa - expected) <= MOST_WEATHER_PA) return true;
  const figures = {
    stated: { kind: 'pressurePa', value: stationPa },
    expected: { kind: 'pressurePa', value: expected },
  } as const;
  faults.add('setup.stationPressure', { code: 'barometer-contradicts-elevation', figures });
  return false;
}

function checkElevation(faults: Faults, elevation: Amount<LengthUnit>): number | null {
  const path = 'setup.elevation';
  if (!faults.finite(path, elevation.value)) return null;
  const { min, max } = ELEVATION_LIMITS;
  const metres = lengthToM(elevation.value, elevation.unit);
  if (metres >= min && metres <= max) return metres;
  const figures = { least: { kind: 'lengthM', value: min }, most: { kind: 'lengthM', value: max } } as const;
  faults.add(path, { code: 'elevation-outside-range', figures });
  return null;
}

function checkBarometer(faults: Faults, pressure: Amount<PressureUnit>): number | null {
  const path = 'setup.stationPressure';
  if (!faults.finite(path, pressure.value)) return null;
  if (isGaugeUnit(pressure.unit)) {
    faults.add(path, { code: 'gauge-unit-on-absolute', figures: {} });
    return null;
  }
  const { min, max } = PRESSURE_LIMITS;
  const pa = pressureAsReadToPa(pressure.value, pressure.unit);
  if (pa >= min && pa <= max) return pa;
  const figures = { least: { kind: 'pressurePa', value: min }, most: { kind: 'pressurePa', value: max } } as const;
  faults.add(path, { code: 'barometer-outside-range', figures });
  return null;
}

function checkVisit(faults: Faults, visit: VisitInput, pressures: PressureContext): void {
  faults.notNegative('visit.runningMinutes', visit.runningMinutes);
  faults.notNegative('visit.instrumentsCheckedDaysAgo', visit.instrumentsCheckedDaysAgo);
  faults.notNegative('visit.addedThisVisit', visit.addedThisVisit?.value);
  faults.notNegative('visit.addedBefore', visit.addedBefore?.value);
  faults.notNegative('visit.additionsOnEarlierVisits', visit.additionsOnEarlierVisits);
  faults.notNegative('visit.hoursOff', visit.hoursOff);
  if (visit.lowestReturnDryBulb !== undefined) {
    checkTemperature(faults, 'visit.lowestReturnDryBulb', visit.lowestReturnDryBulb);
  }
  if (visit.earlier !== undefined) {
    faults.notNegative('visit.earlier.minutesAgo', visit.earlier.minutesAgo);
    checkReadings(faults, visit.earlier.readings, 'visit.earlier.readings', pressures);
  }
}

function checkReadings(faults: Faults, readings: ReadingsInput, root: string, pressures: PressureContext): void {
  for (const id of READING_IDS) {
    const reading = readings[id];
    if (reading !== undefined) checkReading(faults, `${root}.${id}`, id, reading, pressures);
  }
  checkWetBulb(faults, readings, root, 'returnDryBulb', 'returnWetBulb');
  checkWetBulb(faults, readings, root, 'supplyDryBulb', 'supplyWetBulb');
}

function checkReading(
  faults: Faults,
  path: string,
  id: ReadingId,
  reading: ReadingInput,
  pressures: PressureContext,
): void {
  const dimension = READING_DIMENSIONS[id];
  const units = UNITS_OF_DIMENSION[dimension];
  faults.notNegative(`${path}.plusMinus`, reading.plusMinus?.value);
  if (reading.plusMinus !== undefined && !units.plusMinus.includes(reading.plusMinus.unit)) {
    faults.add(`${path}.plusMinus`, { code: 'wrong-unit', figures: {} });
  }
  faults.notNegative(`${path}.ageSeconds`, reading.ageSeconds);
  faults.notNegative(`${path}.resolution`, reading.resolution);
  if (!units.reading.includes(reading.unit)) {
    faults.add(path, { code: 'wrong-unit', figures: {} });
    return;
  }
  switch (dimension) {
    case 'temperature':
      checkTemperature(faults, path, reading as Amount<TemperatureUnit>);
      break;
    case 'pressure':
      checkPressure(faults, path, reading as Amount<PressureUnit>, pressures);
      break;
    case 'humidity':
      if (faults.finite(path, reading.value) && !(reading.value >= 0 && reading.value <= 100)) {
        faults.add(path, { code: 'humidity-outside-range', figures: {} });
      }
      break;
    case 'airflow':
    case 'current':
    case 'voltage':
      faults.notNegative(path, reading.value);
      break;
    case 'staticPressure':
      faults.finite(path, reading.value);
      break;
  }
}

function checkTemperature(faults: Faults, path: string, { value, unit }: Amount<TemperatureUnit>): void {
  if (!faults.finite(path, value)) return;
  const kelvin = temperatureToK(value, unit);
  if (kelvin >= 0) return;
  faults.add(path, { code: 'below-absolute-zero', figures: { actual: { kind: 'temperatureK', value: kelvin } } });
}

function checkPressure(faults: Faults, path: string, amount: Amount<PressureUnit>, context: PressureContext): void {
  const { value, unit } = amount;
  const { atmospherePa, criticalPa = Infinity } = context;
  if (!faults.finite(path, value)) return;
  if (atmospherePa === undefined && isGaugeUnit(unit)) return;
  const pa = pressureToPa(value, unit, atmospherePa ?? 0);
  if (pa <= 0) faults.add(path, { code: 'not-above-vacuum', figures: {} });
  if (pa > criticalPa) {
    const figures = {
      actual: { kind: 'pressurePa', value: pa },
      critical: { kind: 'pressurePa', value: criticalPa },
    } as const;
    faults.add(path, { code: 'above-critical-pressure', figures });
  }
}

function checkWetBulb(faults: Faults, readings: ReadingsInput, root: string, dry: ReadingId, wet: ReadingId): void {
  const dryBulb = readings[dry] as Amount<TemperatureUnit> | undefined;
  const wetBulb = readings[wet] as Amount<TemperatureUnit> | undefined;
  if (dryBulb === undefined || wetBulb === undefined) return;
  const dryBulbK = temperatureToK(dryBulb.value, dryBulb.unit);
  const wetBulbK = temperatureToK(wetBulb.value, wetBulb.unit);
  // what is not a number, or not a temperature, has its own fault
  if (!(wetBulbK > dryBulbK + SLACK_K && Number.isFinite(wetBulbK - dryBulbK))) return;
  const figures = {
    wetBulb: { kind: 'temperatureK', value: wetBulbK },
    dryBulb: { kind: 'temperatureK', value: dryBulbK },
  } as const;
  faults.add(`${root}.${wet}`, { code: 'wet-bulb-above-dry-bulb', figures });
}
