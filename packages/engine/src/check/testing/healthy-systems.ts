/** For specs: two healthy systems as a technician would type them, each changed only in what a case is about. */
import { evaluateCheck } from '../evaluate-check';
import type { CheckInput } from '../input';
import type { ProcedureId } from '../procedure-ids';
import type { EvaluationRequest, ReadingInput, ReadingsInput, ReadingUnit, SetupInput, VisitInput } from '../request';
import type { ReadingId } from '../readings';
import { readRequest } from '../read-request';
import type { CheckResult } from '../result';

/** A number keeps the unit of the healthy system; `null` leaves the field out. */
export interface Changes {
  readonly procedure?: ProcedureId;
  readonly setup?: { readonly [Key in keyof SetupInput]?: SetupInput[Key] | null };
  readonly visit?: { readonly [Key in keyof VisitInput]?: VisitInput[Key] | null };
  readonly readings?: ReadingChanges;
}
export type ReadingChanges = Readonly<Partial<Record<ReadingId, number | ReadingInput | null>>>;

const UNITS: Readonly<Record<ReadingId, ReadingUnit>> = {
  returnDryBulb: 'degF',
  returnWetBulb: 'degF',
  returnRelativeHumidity: '%',
  supplyDryBulb: 'degF',
  supplyWetBulb: 'degF',
  supplyRelativeHumidity: '%',
  outdoorDryBulb: 'degF',
  suctionPressure: 'psig',
  suctionLineTemperature: 'degF',
  liquidPressure: 'psig',
  liquidLineTemperature: 'degF',
  dischargeLineTemperature: 'degF',
  dischargePressure: 'psig',
  writtenEvaporatingTemperature: 'degF',
  writtenCondensingTemperature: 'degF',
  airflow: 'cfm',
  returnStaticPressure: 'inH2O',
  supplyStaticPressure: 'inH2O',
  compressorCurrent: 'A',
  lineVoltage: 'V',
  returnWetBulbBefore: 'degF',
  drierInletTemperature: 'degF',
  drierOutletTemperature: 'degF',
  standingPressure: 'psig',
  standingOutdoorCoilTemperature: 'degF',
  standingIndoorCoilTemperature: 'degF',
};

const VISIT: VisitInput = {
  runningMinutes: 22,
  lowestReturnDryBulb: { value: 74, unit: 'degF' },
  instrumentsCheckedDaysAgo: 12,
  preflight: { filterAndCoil: 'ok', panelsOn: 'ok', gaugeZeroed: 'ok' },
};

/**
 * R-22 at sea level. Chart A prints 15 °F at 85 °F outdoors and 66 °F wet bulb, the split table 16.9 °F at 76 °F and 66 °F; makers' tables
 * print 68.5 psig at 40 °F and 210.8 psig at 105 °F. So: superheat 15, subcooling 10, split 16.9, condensing 20 °F over the outdoor air.
 */
const ORIFICE: EvaluationRequest = {
  setup: {
    refrigerant: 'R-22',
    meteringDevice: 'fixed-orifice',
    mode: 'cooling',
    kind: 'split',
    stage: 'full',
    highSidePort: 'liquid',
    elevation: { value: 0, unit: 'ft' },
  },
  visit: VISIT,
  readings: typed({
    returnDryBulb: 76,
    returnWetBulb: 66,
    supplyDryBulb: 59.1,
    outdoorDryBulb: 85,
    suctionPressure: 68.5,
    suctionLineTemperature: 55,
    liquidPressure: 210.8,
    liquidLineTemperature: 95,
  }),
};

/** R-410A at sea level with a valve and a nameplate subcooling of 10 °F; 118 psig at 40 °F and 340 psig at about 105 °F. */
const VALVE: EvaluationRequest = {
  setup: {
    ...ORIFICE.setup,
    refrigerant: 'R-410A',
    meteringDevice: 'txv',
    targetSubcooling: { value: 10, unit: 'deltaF' },
  },
  visit: VISIT,
  readings: {
    ...ORIFICE.readings,
    ...typed({ suctionPressure: 118, suctionLineTemperature: 52, liquidPressure: 340 }),
  },
};

export const orificeRequest = (changes: Changes = {}): EvaluationRequest => changed(ORIFICE, changes);
export const valveRequest = (changes: Changes = {}): EvaluationRequest => changed(VALVE, changes);

/** The input of a request that has no fault; a fault throws and is printed. */
export function inputOf(request: EvaluationRequest): CheckInput {
  const read = readRequest(request);
  if (!read.ok) throw new Error(`the request is at fault: ${JSON.stringify(read.faults)}`);
  return read.input;
}

export const evaluate = (request: EvaluationRequest): CheckResult => evaluateCheck(inputOf(request));

export function criterionOf(
  result: CheckResult,
  id: CheckResult['criteria'][number]['criterion'],
): CheckResult['criteria'][number] {
  const found = result.criteria.find(({ criterion }) => criterion === id);
  if (found === undefined) throw new Error(`no criterion ${id}`);
  return found;
}

export const cautionCodes = (result: CheckResult): readonly string[] => result.overall.cautions.map(({ code }) => code);
export const stopCodes = (result: CheckResult): readonly string[] => result.overall.stops.map(({ code }) => code);

/** The same ± on every reading, in the units of the healthy systems. */
export function withPlusMinus(
  request: EvaluationRequest,
  half: { readonly temperatureF: number; readonly pressurePsi: number },
): EvaluationRequest {
  const entries = Object.entries(request.readings).map(([id, reading]): [string, ReadingInput] => {
    if (reading.unit === 'degF') {
      return [id, { ...reading, plusMinus: { value: half.temperatureF, unit: 'deltaF' } }];
    }
    return reading.unit === 'psig'
      ? [id, { ...reading, plusMinus: { value: half.pressurePsi, unit: 'psi' } }]
      : [id, reading];
  });
  return { ...request, readings: Object.fromEntries(entries) };
}

function changed(
  request: EvaluationRequest,
  { procedure, setup = {}, visit = {}, readings = {} }: Changes,
): EvaluationRequest {
  return {
    ...(procedure && { procedure }),
    setup: merged<SetupInput>(request.setup, setup),
    visit: merged(request.visit ?? {}, visit),
    readings: merged(request.readings, typed(readings)),
  };
}

function merged<T extends object>(base: T, changes: object): T {
  const entries: [string, unknown][] = Object.entries({ ...base, ...changes });
  return Object.fromEntries(entries.filter(([, value]) => value !== null)) as T;
}

function typed(readings: ReadingChanges): ReadingsInput {
  const entries = Object.entries(readings).map(([id, reading]) => [
    id,
    typeof reading === 'number' ? { value: reading, unit: UNITS[id as ReadingId] } : reading,
  ]);
  return Object.fromEntries(entries) as ReadingsInput;
}
