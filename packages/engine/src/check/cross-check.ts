/**
 * What cannot be, in the values of a request whose shape is right: every fault at once, each at the path of its field. What is possible but odd
 * is a caution of the result instead.
 */
import { isRefrigerantId, refrigerantFacts } from '../refrigerants/catalogue';
import type { TemperatureUnit } from '../units';
import { atmosphereOf } from './atmosphere';
import type { Fault } from './codes';
import type { ChartsInput } from './makers-charts/chart-faults';
import { checkMakersCharts } from './makers-charts/chart-faults';
import { findProcedure } from './procedure-catalogue';
import type { Amount, ReadingsInput, SetupInput, VisitInput } from './request';
import type { ReadingId } from './readings';
import { READING_DIMENSIONS, READING_IDS } from './readings';
import type { PressureContext } from './value-faults';
import { Faults } from './value-faults';

/** A request of which some fields may be left out because their own shape was at fault. */
export interface PartialRequest {
  readonly procedure?: string;
  readonly setup?: PartialSetup;
  readonly visit?: VisitInput;
  readonly readings?: ReadingsInput;
}

export type PartialSetup = Partial<Omit<SetupInput, 'makersChart' | 'makersCharts'>> & ChartsInput;

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

function checkSetup(faults: Faults, setup: PartialSetup): PressureContext {
  const { refrigerant, superheatRange, lineSet } = setup;
  const context: { atmospherePa?: number; criticalPa?: number } = {};
  if (refrigerant !== undefined) {
    if (isRefrigerantId(refrigerant)) context.criticalPa = refrigerantFacts(refrigerant).criticalPressurePa;
    else faults.add('setup.refrigerant', { code: 'unknown-refrigerant', figures: {} });
  }
  if (faults.atmosphere('setup.', setup)) context.atmospherePa = atmosphereOf(setup).value;
  faults.notNegative('setup.targetSuperheat', setup.targetSuperheat?.value);
  faults.notNegative('setup.targetSubcooling', setup.targetSubcooling?.value);
  faults.positive('setup.nominalCapacity', setup.nominalCapacity);
  faults.positive('setup.designAirflow', setup.designAirflow);
  faults.positive('setup.factoryCharge', setup.factoryCharge);
  faults.positive('setup.expectedCompressorCurrent', setup.expectedCompressorCurrent);
  if (setup.maxHighPressure !== undefined) {
    faults.pressure('setup.maxHighPressure', setup.maxHighPressure, { ...context, criticalPa: Infinity });
  }
  if (superheatRange !== undefined) {
    const path = 'setup.superheatRange';
    if (faults.finite(path, superheatRange.low) && faults.finite(path, superheatRange.high)) {
      if (superheatRange.low > superheatRange.high) faults.add(path, { code: 'low-above-high', figures: {} });
    }
  }
  checkMakersCharts(faults, setup);
  faults.notNegative('setup.lineSet.length', lineSet?.length?.value);
  faults.notNegative('setup.lineSet.mostLength', lineSet?.mostLength?.value);
  faults.notNegative('setup.lineSet.included', lineSet?.included?.value);
  if (lineSet?.lift !== undefined) faults.finite('setup.lineSet.lift', lineSet.lift.value);
  return context;
}

function checkVisit(faults: Faults, visit: VisitInput, pressures: PressureContext): void {
  faults.notNegative('visit.runningMinutes', visit.runningMinutes);
  faults.notNegative('visit.instrumentsCheckedDaysAgo', visit.instrumentsCheckedDaysAgo);
  faults.notNegative('visit.addedThisVisit', visit.addedThisVisit?.value);
  faults.notNegative('visit.addedBefore', visit.addedBefore?.value);
  faults.notNegative('visit.additionsOnEarlierVisits', visit.additionsOnEarlierVisits);
  faults.notNegative('visit.hoursOff', visit.hoursOff);
  if (visit.lowestReturnDryBulb !== undefined) {
    faults.temperature('visit.lowestReturnDryBulb', visit.lowestReturnDryBulb);
  }
  if (visit.earlier !== undefined) {
    faults.notNegative('visit.earlier.minutesAgo', visit.earlier.minutesAgo);
    checkReadings(faults, visit.earlier.readings, 'visit.earlier.readings', pressures);
  }
}

function checkReadings(faults: Faults, readings: ReadingsInput, root: string, pressures: PressureContext): void {
  for (const id of READING_IDS) {
    const reading = readings[id];
    if (reading !== undefined) faults.reading(`${root}.${id}`, READING_DIMENSIONS[id], reading, pressures);
  }
  const bulb = (id: ReadingId) => readings[id] as Amount<TemperatureUnit> | undefined;
  faults.wetBulb(`${root}.returnWetBulb`, bulb('returnDryBulb'), bulb('returnWetBulb'));
  faults.wetBulb(`${root}.supplyWetBulb`, bulb('supplyDryBulb'), bulb('supplyWetBulb'));
}
