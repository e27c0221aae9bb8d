/** What most examples have in common, and readings as instruments of a tenth of a degree or psi show them. */
import type { EvaluationRequest, ReadingInput, ReadingsInput, SetupInput, VisitInput } from '../../check/request';
import type { ReadingId } from '../../check/readings';
import { READING_DIMENSIONS } from '../../check/readings';

type Values = Readonly<Partial<Record<ReadingId, number>>>;

const TENTH = 0.1;

const inchPound = (id: ReadingId, value: number): ReadingInput => ({
  value,
  unit: READING_DIMENSIONS[id] === 'pressure' ? 'psig' : 'degF',
  resolution: TENTH,
});

const metric = (id: ReadingId, value: number): ReadingInput =>
  READING_DIMENSIONS[id] === 'pressure'
    ? { value, unit: 'kPag', resolution: 1 }
    : { value, unit: 'degC', resolution: TENTH };

const readings = (values: Values, of: (id: ReadingId, value: number) => ReadingInput): ReadingsInput =>
  Object.fromEntries((Object.entries(values) as [ReadingId, number][]).map(([id, value]) => [id, of(id, value)]));

/** Temperatures in °F, pressures in psig. */
export const readInchPound = (values: Values): ReadingsInput => readings(values, inchPound);
/** Temperatures in °C, pressures in kPa gauge. */
export const readMetric = (values: Values): ReadingsInput => readings(values, metric);

export const SPLIT_IN_COOLING = {
  mode: 'cooling',
  kind: 'split',
  stage: 'full',
  highSidePort: 'liquid',
} as const satisfies Partial<SetupInput>;

export const AT_SEA_LEVEL = { elevation: { value: 0, unit: 'ft' } } as const satisfies Partial<SetupInput>;

/** Running long enough and looked over, so that the lesson is about something else. */
export const LOOKED_OVER: VisitInput = {
  runningMinutes: 20,
  preflight: { filterAndCoil: 'ok', panelsOn: 'ok', gaugeZeroed: 'ok', condenserDryAndClean: 'ok' },
};

export const withReadings = (request: EvaluationRequest, changed: ReadingsInput): EvaluationRequest => ({
  ...request,
  readings: { ...request.readings, ...changed },
});

export const withoutReadings = (request: EvaluationRequest, ...left: readonly ReadingId[]): EvaluationRequest => ({
  ...request,
  readings: Object.fromEntries(Object.entries(request.readings).filter(([id]) => !left.includes(id as ReadingId))),
});
