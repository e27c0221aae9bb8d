/** What the person should know beside the finding: doubtful readings, assumptions, conditions at the edge. Thresholds: common practice or choice. */
import type { Quantity } from '../derivation/quantity';
import { expandedUncertainty, isKnown } from '../derivation/quantity';
import { bracketWetBulb } from '../methods/separating-tests';
import { refrigerantFacts } from '../refrigerants/catalogue';
import type { RefrigerantId } from '../refrigerants/catalogue';
import { differenceToK, lengthToM, pressureDifferenceToPa } from '../units';
import type { UsedReadingId } from './assumed-uncertainty';
import { chargeMethod } from './charge-method';
import type { Caution, CautionCode, Figure } from './codes';
import { LIMIT_SLACK_K } from './conformance';
import { airflowGate } from './criteria/air';
import { conditionsRecorded, leastOutdoorK, nearLimitCautions } from './criteria/conditions';
import type { DerivedQuantities } from './derived-quantities';
import { plausibilityCautions } from './plausibility';
import type { CheckInput } from './input';
import { isFixedOrifice } from './input';
import type { AirflowEvidence } from './procedure';
import { makersChartCautions } from './makers-charts/chart-cautions';
import { isPullDown } from './pull-down';
import { freezeRisk } from './stops';

const WRITTEN_DIFFERS_K = differenceToK(3, 'deltaF');
const WRITTEN_MATCHES_K = differenceToK(1, 'deltaF');
const DAMP_INDOORS = 0.95;
const USUAL_STEP_K = differenceToK(0.1, 'deltaF');
const COLDER_THAN_AIR_K = differenceToK(2, 'deltaF');
const LONG_LIFT_M = lengthToM(20, 'ft');
/** Rounding of the conversions; far below any gauge. */
const SLACK_PA = 1e-3;
const SLACK_M = 1e-9;

/** Liquid less suction pressure that a valve needs to work (CEC Reference Residential Appendices, RA1.2, winter setup: least of its band). */
const LEAST_VALVE_DIFFERENCE_PA: Readonly<Partial<Record<RefrigerantId, number>>> = {
  'R-410A': pressureDifferenceToPa(160, 'psi'),
  'R-22': pressureDifferenceToPa(100, 'psi'),
};

const plain = (code: PlainCautionCode): Caution => ({ code, figures: {} });
type PlainCautionCode = Extract<
  CautionCode,
  | 'pull-down'
  | 'elevation-assumed'
  | 'gauge-not-zeroed'
  | 'airflow-not-proven'
  | 'conditions-not-recorded'
  | 'model-grade'
  | 'model-doubtful'
  | 'flammable'
  | 'filter-or-coil-dirty'
>;

const metres = (value: number) => ({ kind: 'lengthM', value }) as const satisfies Figure;
const temperature = (value: number) => ({ kind: 'temperatureK', value }) as const satisfies Figure;

export function findCautions(
  input: CheckInput,
  derived: DerivedQuantities,
  airflow: AirflowEvidence,
): readonly Caution[] {
  const cooling = input.setup.mode === 'cooling';
  return [
    ...(cooling ? coolingCautions(input, derived, airflow) : []),
    ...nearLimitCautions(input),
    ...setupCautions(input),
    ...makersChartCautions(input),
    ...visitCautions(input),
    ...refrigerantCautions(input.setup.refrigerant),
  ];
}

function coolingCautions(input: CheckInput, derived: DerivedQuantities, airflow: AirflowEvidence): readonly Caution[] {
  const found: (Caution | null)[] = [
    freezeRisk(input, derived),
    writtenTemperature(
      input,
      'writtenEvaporatingTemperature',
      derived.evaporatingDewTemperature,
      derived.evaporatingBubbleTemperature,
    ),
    writtenTemperature(
      input,
      'writtenCondensingTemperature',
      derived.condensingBubbleTemperature,
      derived.condensingDewTemperature,
    ),
    flash(derived),
    dryWick(input, derived),
    wetBulbMoved(input),
    humidityContradiction(input, derived),
    liquidColderThanAir(input),
    isPullDown(input, derived) ? plain('pull-down') : null,
    coolWeather(input),
    lowHead(input),
    airflow === 'nothing' && airflowGate(input.procedure, airflow) === null ? plain('airflow-not-proven') : null,
  ];
  return [...found.filter((caution) => caution !== null), ...plausibilityCautions(input, derived)];
}

/** The saturation temperature written on the paper against the one of the pressure: right column, other column, or another refrigerant. */
function writtenTemperature(
  { readings }: CheckInput,
  id: UsedReadingId,
  right: Quantity,
  otherColumn: Quantity,
): Caution | null {
  const written = readings[id]?.quantity;
  if (written === undefined || !isKnown(right)) return null;
  const matches = (computed: number): boolean =>
    Math.abs(written.value - computed) <= WRITTEN_MATCHES_K + LIMIT_SLACK_K;
  if (matches(right.value)) return null;
  const figures = { written: temperature(written.value), computed: temperature(right.value) };
  // with a glide below the match the columns do not tell apart which was read
  const columnsDiffer = isKnown(otherColumn) && Math.abs(right.value - otherColumn.value) > WRITTEN_MATCHES_K;
  if (columnsDiffer && matches(otherColumn.value)) return { code: 'wrong-column', figures };
  const differs = Math.abs(written.value - right.value) > WRITTEN_DIFFERS_K + LIMIT_SLACK_K;
  return differs ? { code: 'wrong-refrigerant', figures } : null;
}

function flash({ subcooling }: DerivedQuantities): Caution | null {
  if (!isKnown(subcooling) || subcooling.value - expandedUncertainty(subcooling) > 0) return null;
  return { code: 'flash', figures: { subcooling: { kind: 'differenceK', value: subcooling.value } } };
}

/** Wet bulb equal to dry bulb within the step shown, or air damper than a house with cooling on can be. */
function dryWick({ readings }: CheckInput, { returnRelativeHumidity }: DerivedQuantities): Caution | null {
  const pairs = [
    ['returnDryBulb', 'returnWetBulb'],
    ['supplyDryBulb', 'supplyWetBulb'],
  ] as const;
  const equal = pairs.flatMap(([dry, wet]) => {
    const dryBulb = readings[dry];
    const wetBulb = readings[wet];
    if (dryBulb === undefined || wetBulb === undefined) return [];
    const step = wetBulb.resolution > 0 ? wetBulb.resolution : USUAL_STEP_K;
    return dryBulb.quantity.value - wetBulb.quantity.value < step - LIMIT_SLACK_K ? [wet] : [];
  });
  const damp = readings.returnWetBulb && isKnown(returnRelativeHumidity) && returnRelativeHumidity.value > DAMP_INDOORS;
  const wicks = damp && !equal.includes('returnWetBulb') ? (['returnWetBulb', ...equal] as const) : equal;
  return wicks.length === 0 ? null : { code: 'dry-wick', figures: { readings: { kind: 'readings', value: wicks } } };
}

/** The wet bulb before and after the readings outdoors: too far apart for a mean. */
function wetBulbMoved({ readings }: CheckInput): Caution | null {
  const beforeK = readings.returnWetBulbBefore?.quantity;
  const afterK = readings.returnWetBulb?.quantity;
  if (beforeK === undefined || afterK === undefined || bracketWetBulb({ beforeK, afterK }) !== null) return null;
  return { code: 'wet-bulb-moved', figures: { before: temperature(beforeK.value), after: temperature(afterK.value) } };
}

/** Both a wet bulb and a relative humidity were given and they disagree by more than their uncertainty; the wet bulb is used. */
function humidityContradiction(
  { readings }: CheckInput,
  { returnWetBulbFromHumidity }: DerivedQuantities,
): Caution | null {
  const measured = readings.returnWetBulb?.quantity;
  if (measured === undefined || !isKnown(returnWetBulbFromHumidity)) return null;
  const difference = Math.abs(measured.value - returnWetBulbFromHumidity.value);
  const allowed = Math.hypot(expandedUncertainty(measured), expandedUncertainty(returnWetBulbFromHumidity));
  if (difference <= allowed) return null;
  const figures = { measured: temperature(measured.value), fromHumidity: temperature(returnWetBulbFromHumidity.value) };
  return { code: 'humidity-contradiction', figures };
}

function liquidColderThanAir({ readings }: CheckInput): Caution | null {
  const liquid = readings.liquidLineTemperature?.quantity.value;
  const outdoor = readings.outdoorDryBulb?.quantity.value;
  if (liquid === undefined || outdoor === undefined || outdoor - liquid <= COLDER_THAN_AIR_K + LIMIT_SLACK_K) {
    return null;
  }
  return { code: 'liquid-colder-than-air', figures: { liquid: temperature(liquid), outdoor: temperature(outdoor) } };
}

/** Outdoor air warm enough to judge, too cool to move refrigerant on what is read. */
export function isCoolWeather(input: CheckInput): boolean {
  const outdoor = input.readings.outdoorDryBulb?.quantity.value;
  const method = chargeMethod(input);
  const least = leastOutdoorK(input, method) ?? 0;
  // by the maker's data alone his limit says how cool is too cool
  const saidByMaker = input.procedure.assumes === 'nothing' && method?.chart?.leastOutdoorK !== undefined;
  return (
    outdoor !== undefined &&
    !saidByMaker &&
    outdoor >= least - LIMIT_SLACK_K &&
    outdoor < input.procedure.conditions.coolBelowK.value - LIMIT_SLACK_K
  );
}

function coolWeather(input: CheckInput): Caution | null {
  const outdoor = input.readings.outdoorDryBulb?.quantity.value;
  if (outdoor === undefined || !isCoolWeather(input)) return null;
  return { code: 'cool-weather', figures: { outdoor: temperature(outdoor) } };
}

/** In cool weather a valve may not get the pressure difference it needs. */
export function lowHead(input: CheckInput): Caution | null {
  const { setup, readings } = input;
  const least = LEAST_VALVE_DIFFERENCE_PA[setup.refrigerant];
  const suction = readings.suctionPressure?.quantity.value;
  const liquid = readings.liquidPressure?.quantity.value;
  if (isFixedOrifice(setup) || !isCoolWeather(input)) return null;
  if (least === undefined || suction === undefined || liquid === undefined) return null;
  if (liquid - suction >= least - SLACK_PA) return null;
  const pressure = (value: number) => ({ kind: 'pressureDifferencePa', value }) as const;
  return { code: 'low-head', figures: { difference: pressure(liquid - suction), least: pressure(least) } };
}

function setupCautions({ setup, procedure }: CheckInput): readonly Caution[] {
  const found: Caution[] = [];
  if (setup.elevationAssumed) found.push(plain('elevation-assumed'));
  if (setup.assumed.length > 0 && procedure.assumes === 'the-usual') {
    found.push({ code: 'setup-assumed', figures: { fields: { kind: 'setup', value: setup.assumed } } });
  }
  if (setup.liftM !== undefined && setup.liftM > LONG_LIFT_M) {
    found.push({ code: 'long-lines', figures: { lift: metres(setup.liftM) } });
  }
  const { lineLengthM, mostLineLengthM } = setup;
  if (lineLengthM !== undefined && mostLineLengthM !== undefined && lineLengthM > mostLineLengthM + SLACK_M) {
    const figures = { length: metres(lineLengthM), most: metres(mostLineLengthM) };
    found.push({ code: 'line-set-too-long', figures });
  }
  return found;
}

function visitCautions(input: CheckInput): readonly Caution[] {
  const { visit, procedure } = input;
  const found: Caution[] = [];
  if (!conditionsRecorded(input)) found.push(plain('conditions-not-recorded'));
  const { gaugeZeroed, filterAndCoil } = visit.preflight;
  if (gaugeZeroed === 'not-ok' || gaugeZeroed === 'not-checked') found.push(plain('gauge-not-zeroed'));
  if (filterAndCoil === 'not-ok') found.push(plain('filter-or-coil-dirty'));
  const days = visit.instrumentsCheckedDaysAgo;
  if (days !== undefined && days > procedure.instruments.mostDays.value) {
    found.push({ code: 'instruments-old', figures: { days: { kind: 'days', value: days } } });
  }
  return found;
}

function refrigerantCautions(refrigerant: RefrigerantId): readonly Caution[] {
  const { grade, doubtful, safetyClass } = refrigerantFacts(refrigerant);
  const found: Caution[] = [];
  if (grade !== 'A') found.push(plain('model-grade'));
  if (doubtful) found.push(plain('model-doubtful'));
  if (/[23]/.test(safetyClass)) found.push(plain('flammable'));
  return found;
}
