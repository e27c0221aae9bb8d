/** The draft as the engine is asked about it: texts become numbers, times become ages. Whatever is not a number is left out and named. */
import type {
  Amount,
  EvaluationRequest,
  Fault,
  ReadingId,
  ReadingInput,
  ReadingsInput,
  SetupInput,
  VisitInput,
} from '@chargewright/engine';
import { READING_IDS } from '@chargewright/engine';
import type { TypedField } from '@chargewright/contract/typed-fields';
import type { CheckDraft, DraftSetup, FieldKey, FirstSet, TypedChart } from '../loose-checks/check-draft';
import { readTypedChart } from '../makers-data/read-typed-chart';
import { isUnitOf } from '../quantities/field-units';
import { parseNumber, type NumberProblem, type TypedNumber } from '../quantities/parse-number';
import { ALL_FIELD_KEYS, pathOf, readingKey, typedKey, valueIn } from './field-key';

export interface DraftReadAsRequest {
  /** Null until refrigerant and metering device are chosen: without them there is nothing to ask. */
  readonly request: EvaluationRequest | null;
  readonly problems: ReadonlyMap<FieldKey, NumberProblem>;
  /** Entries whose stored unit is not one of their field. */
  readonly faults: readonly Fault[];
}

interface Entry extends TypedNumber {
  readonly unit: string;
}

const MS_PER_SECOND = 1000;
const MS_PER_MINUTE = 60_000;

/** The page's clock ticks every few seconds, so a value typed since the last tick would lie in its future: it is new. */
const elapsedMs = (since: string, nowMs: number): number => Math.max(0, nowMs - Date.parse(since));

/** Age of what stands in the field of a reading, counted from the last keystroke while it is being typed. */
export function ageSeconds(draft: CheckDraft, id: ReadingId, nowMs: number): number | undefined {
  const takenAt = draft.edits[readingKey(id)]?.editedAt ?? draft.readings[id]?.takenAt;
  if (takenAt === undefined) return undefined;
  const age = elapsedMs(takenAt, nowMs) / MS_PER_SECOND;
  return Number.isFinite(age) ? age : undefined;
}

/** Minutes since the visit clock was started; undefined without a start or with an unreadable one. */
export function runningMinutes(draft: CheckDraft, nowMs: number): number | undefined {
  const { runningSince } = draft.visit;
  if (runningSince === undefined) return undefined;
  const minutes = elapsedMs(runningSince, nowMs) / MS_PER_MINUTE;
  return Number.isFinite(minutes) ? minutes : undefined;
}

/** Only at a discharge port does a target for the liquid port differ from one for this port. An answer to a question out of sight does not count. */
export const asksTargetPort = ({ highSidePort, meteringDevice }: DraftSetup): boolean =>
  highSidePort === 'discharge' && (meteringDevice === 'txv' || meteringDevice === 'eev');

/** In heating, and where the refrigerant is metered outdoors, the charge is not judged by readings anyway. */
export const asksChargeMode = ({ mode, kind }: DraftSetup): boolean =>
  mode !== 'heating' && kind !== 'mini-split' && kind !== 'multi-split';

/** Only the certificates of 2019 ask less airflow of some systems, and permit a way in place of measuring it. */
export const asksAirflowProof = ({ procedure }: DraftSetup): boolean =>
  procedure === 'cec-ra3.2-2019-installer' || procedure === 'cec-ra3.2-2019-rater';

export function requestFromDraft(draft: CheckDraft, nowMs: number): DraftReadAsRequest {
  const entries = new Map<FieldKey, Entry>();
  const problems = new Map<FieldKey, NumberProblem>();
  const faults: Fault[] = [];
  for (const key of ALL_FIELD_KEYS) {
    const typed = valueIn(draft, key);
    if (!typed) continue;
    const parsed = parseNumber(typed.text);
    if (parsed.state === 'problem') problems.set(key, parsed.problem);
    if (parsed.state !== 'number') continue;
    if (isUnitOf(key, typed.unit)) entries.set(key, { ...parsed.number, unit: typed.unit });
    else faults.push({ code: 'wrong-unit', figures: {}, path: pathOf(key) });
  }

  const {
    refrigerant,
    meteringDevice,
    chargeMode,
    targetSubcoolingPort,
    procedure,
    airflowPath,
    makersCharts,
    ...choices
  } = draft.setup;
  if (refrigerant === undefined || meteringDevice === undefined) return { request: null, problems, faults };

  const setup: SetupInput = {
    ...choices,
    refrigerant,
    meteringDevice,
    ...(targetSubcoolingPort && asksTargetPort(draft.setup) && { targetSubcoolingPort }),
    ...(chargeMode &&
      chargeMode !== 'no-inverter' &&
      asksChargeMode(draft.setup) && { chargeMode: chargeMode === 'on' }),
    ...(airflowPath && airflowPath !== 'measured' && asksAirflowProof(draft.setup) && { airflowPath }),
    ...makersTables(makersCharts),
    ...superheatRange(entries, faults),
    ...lineSet(entries),
    ...amounts(entries, [
      'elevation',
      'stationPressure',
      'targetSubcooling',
      'targetSuperheat',
      'nominalCapacity',
      'designAirflow',
      'factoryCharge',
      'maxHighPressure',
      'expectedCompressorCurrent',
    ]),
  };
  const request = {
    ...(procedure && { procedure }),
    setup,
    visit: visitOf(draft, entries, nowMs),
    readings: readingsOf(draft, entries, nowMs),
  };
  return { request, problems, faults };
}

/** The units were checked when the entries were made; the type of an amount cannot say which field it is for. */
const amounts = (entries: ReadonlyMap<FieldKey, Entry>, fields: readonly TypedField[]) =>
  Object.fromEntries(
    fields.flatMap((field) => {
      const entry = entries.get(typedKey(field));
      return entry ? [[field, { value: entry.value, unit: entry.unit }]] : [];
    }),
  ) as Readonly<Record<string, Amount<never>>>;

/** Numbers whose unit is in their name. */
const counts = (entries: ReadonlyMap<FieldKey, Entry>, fields: readonly TypedField[]) =>
  Object.fromEntries(
    fields.flatMap((field) => {
      const entry = entries.get(typedKey(field));
      return entry ? [[field, entry.value]] : [];
    }),
  );

/** The finished ones; one that is still being typed is not judged by. */
function makersTables(charts: readonly TypedChart[] = []): Pick<SetupInput, 'makersCharts'> {
  const complete = charts.flatMap((chart) => {
    const reading = readTypedChart(chart);
    return reading.state === 'complete' ? [reading.chart] : [];
  });
  return complete.length === 0 ? {} : { makersCharts: complete };
}

/** A range takes both of its ends, in one unit. */
function superheatRange(entries: ReadonlyMap<FieldKey, Entry>, faults: Fault[]): Pick<SetupInput, 'superheatRange'> {
  const low = entries.get('typed:superheatLow');
  const high = entries.get('typed:superheatHigh');
  if (!low || !high) return {};
  if (low.unit !== high.unit) {
    faults.push({ code: 'wrong-unit', figures: {}, path: pathOf('typed:superheatHigh') });
    return {};
  }
  const unit = low.unit as NonNullable<SetupInput['superheatRange']>['unit'];
  return { superheatRange: { low: low.value, high: high.value, unit } };
}

function lineSet(entries: ReadonlyMap<FieldKey, Entry>): Pick<SetupInput, 'lineSet'> {
  const {
    lineLength: length,
    mostLineLength: mostLength,
    lift,
  } = amounts(entries, ['lineLength', 'mostLineLength', 'lift']);
  if (!length && !mostLength && !lift) return {};
  return { lineSet: { ...(length && { length }), ...(mostLength && { mostLength }), ...(lift && { lift }) } };
}

/** The set kept before, as old as it was when the first of the present readings was taken. */
function earlierOf(
  draft: CheckDraft,
  { takenAt, readings }: FirstSet,
  nowMs: number,
): NonNullable<VisitInput['earlier']> {
  const times = Object.values(draft.readings).map((reading) => Date.parse(reading.takenAt));
  const until = Math.min(nowMs, ...times.filter((time) => time > Date.parse(takenAt)));
  const read: Partial<Record<ReadingId, ReadingInput>> = {};
  for (const id of READING_IDS) {
    const typed = readings[id];
    const parsed = typed && parseNumber(typed.text);
    if (parsed?.state !== 'number' || !isUnitOf(readingKey(id), typed!.unit)) continue;
    read[id] = {
      value: parsed.number.value,
      unit: typed!.unit as ReadingInput['unit'],
      resolution: parsed.number.resolution,
    };
  }
  return { minutesAgo: elapsedMs(takenAt, until) / MS_PER_MINUTE, readings: read };
}

function visitOf(draft: CheckDraft, entries: ReadonlyMap<FieldKey, Entry>, nowMs: number): VisitInput {
  const { runningSince: _, preflight, firstSet, ...choices } = draft.visit;
  const minutes = runningMinutes(draft, nowMs);
  return {
    ...choices,
    preflight,
    ...(minutes !== undefined && { runningMinutes: minutes }),
    ...counts(entries, ['instrumentsCheckedDaysAgo', 'hoursOff', 'additionsOnEarlierVisits']),
    ...(firstSet && { earlier: earlierOf(draft, firstSet, nowMs) }),
    ...amounts(entries, ['lowestReturnDryBulb', 'addedThisVisit']),
  };
}

function readingsOf(draft: CheckDraft, entries: ReadonlyMap<FieldKey, Entry>, nowMs: number): ReadingsInput {
  const readings: Partial<Record<ReadingId, ReadingInput>> = {};
  for (const id of READING_IDS) {
    const entry = entries.get(readingKey(id));
    if (!entry) continue;
    const unit = entry.unit as ReadingInput['unit'];
    readings[id] = { value: entry.value, unit, resolution: entry.resolution, ...provenance(draft, id, nowMs) };
  }
  return readings;
}

/** An instrument's reading ages. What was worked out on the airflow page has its ± and is one of blower and ducts, which stay as they are. */
function provenance(draft: CheckDraft, id: ReadingId, nowMs: number): Pick<ReadingInput, 'ageSeconds' | 'plusMinus'> {
  const reading = draft.edits[readingKey(id)] ? undefined : draft.readings[id];
  if (reading?.workedOut) {
    // the page brings it in a unit of airflow, and `isUnitOf` has held it to one
    const unit = reading.unit as NonNullable<ReadingInput['plusMinus']>['unit'];
    return { plusMinus: { value: reading.workedOut.plusMinus, unit, kind: 'k2' } };
  }
  const age = ageSeconds(draft, id, nowMs);
  return age === undefined ? {} : { ageSeconds: age };
}

/** The request without the entries at these paths (`readings.returnWetBulb`), so that one fault does not hold up the rest. */
export function withoutPaths(request: EvaluationRequest, paths: ReadonlySet<string>): EvaluationRequest {
  const keep = <Part extends object>(family: string, part: Part): Part =>
    Object.fromEntries(Object.entries(part).filter(([name]) => !paths.has(`${family}.${name}`))) as Part;
  return {
    ...request,
    setup: keep('setup', request.setup),
    ...(request.visit && { visit: keep('visit', request.visit) }),
    readings: keep('readings', request.readings),
  };
}
