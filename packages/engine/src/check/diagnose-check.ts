/** The diagnosis of a check: from its criteria, its readings and the separating tests to the causes worth looking at. Total. */
import { bareValue, isKnown } from '../derivation/quantity';
import { diagnose } from '../diagnosis/diagnose';
import type { Diagnosis, DiagnosisNote, Measurement } from '../diagnosis/diagnosis-codes';
import { MEASUREMENTS } from '../diagnosis/diagnosis-codes';
import type { Symptom, SymptomReadings } from '../diagnosis/read-symptoms';
import { readSymptoms } from '../diagnosis/read-symptoms';
import type { Observations } from '../diagnosis/shown-by-tests';
import { shownByTests } from '../diagnosis/shown-by-tests';
import { LIMIT_SLACK_K } from './conformance';
import { conditionsGate } from './criteria/conditions';
import type { DerivedQuantities } from './derived-quantities';
import { deriveQuantities } from './derived-quantities';
import { unfitReason } from './fit-for-test';
import type { CheckInput } from './input';
import { isFixedOrifice } from './input';
import type { CheckResult, CriterionResult } from './result';
import { impossibleReadings } from './saturation-plausibility';
import { airTest, drierTest } from './separating-tests';
import { criterionOf, heldBy, symptomReadings } from './symptom-readings';

/** After thawing a system is read at minutes 10 to 15 for the diagnosis, before its charge can be judged; practice, no source. */
const LEAST_MINUTES = 10;

/** `result` is that of `evaluateCheck` for the same input. */
export function diagnoseCheck(input: CheckInput, result: CheckResult): Diagnosis {
  const derived = deriveQuantities(input.setup, input.readings);
  const shut = whyNone(input, derived);
  if (shut !== null) return { causes: [], notes: [shut] };
  const readings = symptomReadings(input, derived, result);
  const observed = observations(input, result);
  const symptoms = readSymptoms(readings);
  const open = openMeasurements(input, readings, observed);
  const { causes, notes } = diagnose({
    metering: observed.metering,
    symptoms,
    shown: shownByTests(observed),
    isSubcoolingHigh: subcoolingIsHigh(input, derived, result),
    subcoolingDoubts: subcoolingDoubts(input, result, { symptoms, open }),
    open,
  });
  return { causes, notes: [...notes, ...notesBeside(input, result, observed)] };
}

function whyNone(input: CheckInput, derived: DerivedQuantities): DiagnosisNote | null {
  const { runningMinutes, ...visit } = input.visit;
  if (unfitReason(input) !== null) return 'unfit';
  if (impossibleReadings(input, derived) !== null) return 'impossible-readings';
  if (runningMinutes !== undefined && runningMinutes < LEAST_MINUTES) return 'not-steady';
  return conditionsGate({ ...input, visit }) === null ? null : 'outside-conditions';
}

function observations(input: CheckInput, { criteria }: CheckResult): Observations {
  const { setup, visit } = input;
  return {
    metering: isFixedOrifice(setup) ? 'orifice' : 'valve',
    drier: drierTest(input),
    air: airTest(input),
    bulb: visit.tests.bulb ?? null,
    isHunting: visit.tests.valve === 'hunting',
    filterOrCoilDirty: visit.preflight.filterAndCoil === 'not-ok',
    airflow: measuredAirflow(criterionOf(criteria, 'airflow')),
  };
}

const measuredAirflow = (airflow: CriterionResult | undefined): Observations['airflow'] =>
  airflow?.actual && airflow.deviation ? { measured: airflow.actual, overLeast: airflow.deviation } : null;

/** By the rule, or without a target over the highest general level. */
function subcoolingIsHigh({ procedure }: CheckInput, derived: DerivedQuantities, { criteria }: CheckResult): boolean {
  const held = heldBy(criteria, 'subcooling');
  if (held !== null) return held.measured.value > held.high + LIMIT_SLACK_K;
  return (bareValue(derived.subcooling) ?? 0) > procedure.subcooling.highAboveK.value + LIMIT_SLACK_K;
}

/** Why a high subcooling may not be one, as what would clear it up. */
function subcoolingDoubts(
  { setup }: CheckInput,
  { overall }: CheckResult,
  { symptoms, open }: { readonly symptoms: readonly Symptom[]; readonly open: ReadonlySet<Measurement> },
): readonly Measurement[] {
  const doubts: Measurement[] = [];
  if (setup.assumed.includes('highSidePort')) doubts.push('state-port');
  if (overall.cautions.some(({ code }) => code === 'wrong-refrigerant')) doubts.push('confirm-refrigerant');
  const isHeadHigh = symptoms.some(({ column, possible }) => column === 'head' && possible.every((c) => c === 'up'));
  if (isHeadHigh && open.has('air-test')) doubts.push('air-test');
  return doubts;
}

function openMeasurements(
  input: CheckInput,
  readings: SymptomReadings,
  observed: Observations,
): ReadonlySet<Measurement> {
  const { setup, visit } = input;
  const valve = observed.metering === 'valve';
  const isOpen: Readonly<Partial<Record<Measurement, boolean>>> = {
    'liquid-pair': setup.highSidePort !== 'none' && readings.subcooling === null && readings.subcoolingLevels === null,
    'supply-and-wet-bulb': readings.split === null,
    airflow: observed.airflow === null,
    'drier-drop': observed.drier.finding === 'unmeasured' || observed.drier.finding === 'unclear',
    'air-test': observed.air.finding !== 'found' && observed.air.finding !== 'none',
    'bulb-and-hunting': valve && observed.bulb === null,
    'compressor-current': !isKnown(readings.currentOffExpected),
    'condenser-look': visit.preflight.condenserDryAndClean !== 'ok',
    'orifice-look': !valve,
    'leak-search': visit.leakSearch === undefined || visit.leakSearch === 'not-done',
  };
  return new Set(MEASUREMENTS.filter((measurement) => isOpen[measurement]));
}

function notesBeside({ visit }: CheckInput, { overall }: CheckResult, { air }: Observations): DiagnosisNote[] {
  const notes: DiagnosisNote[] = [];
  if (overall.stops.some(({ code }) => code === 'freezing')) notes.push('frozen');
  if (overall.cautions.some(({ code }) => code === 'pull-down')) notes.push('pull-down');
  if (air.finding === 'below') notes.push('refrigerant-in-doubt');
  if (air.finding === 'found') notes.push('subcooling-apparent');
  if (visit.tests.valve === 'hunting') notes.push('hunting');
  return notes;
}
