/** From the request, as a person or a client states it, to SI quantities with their uncertainty. */
import { derive } from '../derivation/derive';
import type { Known } from '../derivation/quantity';
import { isKnown, leaf } from '../derivation/quantity';
import { absolutePressure } from '../methods/cycle-points';
import type { RefrigerantId } from '../refrigerants/catalogue';
import {
  differenceToK,
  flowToM3PerS,
  isGaugeUnit,
  lengthToM,
  massToKg,
  powerToW,
  pressureAsReadToPa,
  pressureToPa,
  temperatureToK,
} from '../units';
import type { FlowUnit, PressureUnit, TemperatureUnit } from '../units';
import type { UsedReadingId } from './assumed-uncertainty';
import { readingErrorParts } from './assumed-uncertainty';
import { atmosphereOf } from './atmosphere';
import type { Fault, SetupField } from './codes';
import { crossCheck } from './cross-check';
import type { CheckInput, CheckReading, CheckReadings, CheckSetup, CheckVisit } from './input';
import { readMakersCharts } from './makers-charts/read-makers-charts';
import { present } from './present';
import { DEFAULT_PROCEDURE, findProcedure } from './procedure-catalogue';
import type {
  DifferenceAmount,
  EvaluationRequest,
  ReadingInput,
  ReadingsInput,
  SetupInput,
  VisitInput,
} from './request';
import type { Dimension } from './readings';
import { READING_DIMENSIONS, READING_IDS } from './readings';

export type ReadRequest =
  { readonly ok: true; readonly input: CheckInput } | { readonly ok: false; readonly faults: readonly Fault[] };

/** Reads a request of the right shape; answers every fault of its values at once. Total. */
export function readRequest(request: EvaluationRequest): ReadRequest {
  const faults = crossCheck(request);
  if (faults.length > 0) return { ok: false, faults };
  const setup = readSetup(request.setup);
  const input: CheckInput = {
    procedure: findProcedure(request.procedure ?? DEFAULT_PROCEDURE.id) ?? DEFAULT_PROCEDURE,
    setup,
    visit: readVisit(request.visit ?? {}, setup.atmosphere),
    readings: readReadings(request.readings, setup.atmosphere, ''),
  };
  return { ok: true, input };
}

function readSetup(setup: SetupInput): CheckSetup {
  const { mode, kind, stage, highSidePort, superheatRange } = setup;
  const assumed: SetupField[] = [];
  if (mode === undefined) assumed.push('mode');
  if (kind === undefined) assumed.push('kind');
  if (stage === undefined || stage === 'unknown') assumed.push('stage');
  if (highSidePort === undefined) assumed.push('highSidePort');
  const atmosphere = atmosphereOf(setup);
  return {
    // crossCheck has refused any other id
    refrigerant: setup.refrigerant as RefrigerantId,
    meteringDevice: setup.meteringDevice,
    mode: mode ?? 'cooling',
    kind: kind ?? 'split',
    stage: stage ?? 'full',
    highSidePort: highSidePort ?? 'liquid',
    assumed,
    atmosphere,
    elevationAssumed: setup.elevation === undefined && setup.stationPressure === undefined,
    makersCharts: readMakersCharts(setup),
    alteration: setup.alteration ?? false,
    highVelocity: setup.highVelocity ?? false,
    ...present('airflowPath', setup.airflowPath),
    targetSubcoolingPort: setup.targetSubcoolingPort ?? 'liquid',
    ...present('targetSuperheat', enteredTarget('targetSuperheat', setup.targetSuperheat)),
    ...present('targetSubcooling', enteredTarget('targetSubcooling', setup.targetSubcooling)),
    ...present(
      'superheatRange',
      superheatRange && {
        lowK: differenceToK(superheatRange.low, superheatRange.unit),
        highK: differenceToK(superheatRange.high, superheatRange.unit),
      },
    ),
    ...present('nominalCapacityW', convert(setup.nominalCapacity, powerToW)),
    ...present('designAirflowM3PerS', convert(setup.designAirflow, flowToM3PerS)),
    ...present('factoryChargeKg', convert(setup.factoryCharge, massToKg)),
    ...present('expectedCompressorCurrentA', setup.expectedCompressorCurrent?.value),
    ...present(
      'maxHighPressurePa',
      convert(setup.maxHighPressure, (value, unit) => pressureToPa(value, unit, atmosphere.value)),
    ),
    ...present('chargeMode', setup.chargeMode),
    ...present('liftM', convert(setup.lineSet?.lift, lengthToM)),
    ...present('lineLengthM', convert(setup.lineSet?.length, lengthToM)),
    ...present('mostLineLengthM', convert(setup.lineSet?.mostLength, lengthToM)),
  };
}

function readVisit(visit: VisitInput, atmosphere: Known): CheckVisit {
  const { lowestReturnDryBulb, earlier } = visit;
  return {
    preflight: visit.preflight ?? {},
    addedThisVisitKg: convert(visit.addedThisVisit, massToKg) ?? 0,
    // an amount from before speaks of an earlier visit also where nobody counted
    additionsOnEarlierVisits: visit.additionsOnEarlierVisits ?? ((visit.addedBefore?.value ?? 0) > 0 ? 1 : 0),
    commissioning: visit.commissioning ?? false,
    hoursOff: visit.hoursOff ?? 0,
    headRaised: visit.headRaised ?? false,
    iceSeen: visit.iceSeen ?? false,
    tests: visit.tests ?? {},
    ...present('runningMinutes', visit.runningMinutes),
    ...present(
      'lowestReturn',
      lowestReturnDryBulb && readReading('returnDryBulb', lowestReturnDryBulb, atmosphere, 'lowest:').quantity,
    ),
    ...present('instrumentsCheckedDaysAgo', visit.instrumentsCheckedDaysAgo),
    ...present('leakSearch', visit.leakSearch),
    ...present(
      'earlier',
      earlier && { minutesAgo: earlier.minutesAgo, readings: readReadings(earlier.readings, atmosphere, 'earlier:') },
    ),
  };
}

function readReadings(readings: ReadingsInput, atmosphere: Known, prefix: string): CheckReadings {
  const read: Partial<Record<UsedReadingId, CheckReading>> = {};
  for (const id of READING_IDS) {
    const reading = readings[id];
    if (reading !== undefined && isUsed(id)) read[id] = readReading(id, reading, atmosphere, prefix);
  }
  return read;
}

const isUsed = (id: (typeof READING_IDS)[number]): id is UsedReadingId => {
  const dimension = READING_DIMENSIONS[id];
  return dimension !== 'staticPressure' && dimension !== 'voltage';
};

/** One reading in SI with its uncertainty, absolute where it is a pressure. Its unit fits its dimension. */
export function readReading(id: UsedReadingId, reading: ReadingInput, atmosphere: Known, prefix: string): CheckReading {
  const dimension = READING_DIMENSIONS[id];
  const valueSi = toSi(dimension, reading.value, reading);
  // the step of an affine scale is the difference of two of its values
  const resolution = Math.abs(toSi(dimension, reading.value + (reading.resolution ?? 0), reading) - valueSi);
  const quantity = leaf({
    id: `${prefix}${id}`,
    kind: KIND_OF[dimension],
    value: valueSi,
    origin: 'reading',
    parts: readingErrorParts({ id, dimension, reading, valueSi, resolutionSi: resolution }),
  });
  const absolute =
    dimension === 'pressure' && isGaugeUnit(reading.unit as PressureUnit)
      ? derive(absolutePressure(`${prefix}${id}`), { gaugePa: quantity, atmospherePa: atmosphere })
      : quantity;
  // a sum of two known numbers is known
  if (!isKnown(absolute)) throw new RangeError(`reading ${id} has no absolute pressure`);
  return { quantity: absolute, resolution, ...present('ageSeconds', reading.ageSeconds) };
}

const KIND_OF = {
  temperature: 'temperatureK',
  pressure: 'pressurePa',
  humidity: 'fraction',
  airflow: 'flowM3PerS',
  staticPressure: 'pressureDifferencePa',
  current: 'currentA',
  voltage: 'voltageV',
} as const satisfies Record<Dimension, string>;

/** The unit fits the dimension: the contract and the page see to it. */
function toSi(dimension: Dimension, value: number, { unit }: ReadingInput): number {
  switch (dimension) {
    case 'temperature':
      return temperatureToK(value, unit as TemperatureUnit);
    case 'pressure':
      return pressureAsReadToPa(value, unit as PressureUnit);
    case 'humidity':
      return value / 100;
    case 'airflow':
      return flowToM3PerS(value, unit as FlowUnit);
    case 'staticPressure':
    case 'current':
    case 'voltage':
      return value;
  }
}

const enteredTarget = (id: string, amount: DifferenceAmount | undefined): Known | undefined =>
  amount && leaf({ id, kind: 'differenceK', value: differenceToK(amount.value, amount.unit), origin: 'entered' });

function convert<Unit extends string>(
  amount: { readonly value: number; readonly unit: Unit } | undefined,
  toSiUnit: (value: number, unit: Unit) => number,
): number | undefined {
  return amount && toSiUnit(amount.value, amount.unit);
}
