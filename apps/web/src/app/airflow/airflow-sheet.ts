/** What the airflow page asks for by each method, and the request it makes of what was typed. */
import { AIR_STATED_IN, AIRFLOW_METHODS, COOLING_SPEED_ANSWERS, EFFICIENCY_KINDS } from '@chargewright/engine';
import type {
  AirflowMethod,
  AirflowRequest,
  AirStatedIn,
  CoolingSpeedAnswer,
  FanTableInput,
  FlowUnit,
  StaticPressureUnit,
} from '@chargewright/engine';
import { fieldInputWords, setupWords } from '@chargewright/wording';
import { parseNumber } from '../quantities/parse-number';
import { isDash } from '../quantities/printed-dash';
import { amountsOf, type FilledSheet, type SheetDimension, type SheetField } from '../worksheets/sheet-fields';
import type { Worksheet } from '../loose-checks/worksheet';

type InputKey = keyof typeof fieldInputWords;

const field = (
  key: InputKey,
  dimension: SheetDimension,
  more: Partial<Pick<SheetField, 'path' | 'optional' | 'signed'>> = {},
): SheetField => ({ key, words: fieldInputWords[key], dimension, path: key, ...more });

const RISE: readonly SheetField[] = [
  field('riseReturn', 'temperature', { path: 'returnDryBulb' }),
  field('riseSupply', 'temperature', { path: 'supplyDryBulb' }),
];
const BLOWER_HEAT = field('blowerHeat', 'heat', { optional: true });
const HUMIDITY = field('airHumidity', 'humidity', { path: 'returnRelativeHumidity', optional: true });

const MEASURED: readonly SheetField[] = [
  field('airflow', 'airflow'),
  field('airflowPlusMinus', 'percent', { path: 'airflow.plusMinus', optional: true }),
];

/** What is read, by method and by the air a measured airflow is stated in: standard air needs no more. */
export function methodFields({ method, airflowIn }: AirflowChoices): readonly SheetField[] {
  switch (method) {
    case undefined:
      return [];
    case 'measured':
      return airflowIn === 'standard'
        ? MEASURED
        : [
            ...MEASURED,
            field('measuredAir', 'temperature', { path: `${airflowIn}DryBulb`, optional: true }),
            field('airHumidity', 'humidity', { path: `${airflowIn}RelativeHumidity`, optional: true }),
          ];
    case 'temperature-rise-electric':
      return [field('lineVoltage', 'voltage'), field('heaterCurrent', 'current'), ...RISE, BLOWER_HEAT, HUMIDITY];
    case 'temperature-rise-gas':
      return [
        field('dialVolume', 'gasVolume'),
        field('gasRevolution', 'seconds'),
        field('gasHeatingValue', 'heatingValue'),
        field('furnaceEfficiency', 'percent'),
        ...RISE,
        BLOWER_HEAT,
        HUMIDITY,
      ];
    case 'static-pressure':
      return [
        field('returnStaticPressure', 'staticPressure', { signed: true }),
        field('supplyStaticPressure', 'staticPressure', { signed: true }),
        field('blowerAir', 'temperature', { path: 'returnDryBulb' }),
        HUMIDITY,
      ];
  }
}

/** Of the site and the system; known from the check where they stand there. */
export const SITE_FIELDS: readonly SheetField[] = [
  { key: 'elevation', words: setupWords.numbers.elevation, dimension: 'elevation', signed: true, path: 'elevation' },
  {
    key: 'nominalCapacity',
    words: setupWords.numbers.nominalCapacity,
    dimension: 'power',
    optional: true,
    path: 'nominalCapacity',
  },
];

export interface AirflowChoices {
  readonly method: AirflowMethod | undefined;
  readonly atCoolingSpeed: CoolingSpeedAnswer | undefined;
  readonly airflowIn: AirStatedIn;
  readonly efficiencyIs: (typeof EFFICIENCY_KINDS)[number];
  readonly staticPressureUnit: StaticPressureUnit | undefined;
  readonly airflowUnit: FlowUnit | undefined;
}

const oneOf = <Value extends string>(values: readonly Value[], chosen: string | undefined): Value | undefined =>
  values.find((value) => value === chosen);

export const STATIC_UNITS = ['inH2O', 'Pa'] as const satisfies readonly StaticPressureUnit[];
export const TABLE_FLOW_UNITS = ['cfm', 'm3/h', 'L/s'] as const satisfies readonly FlowUnit[];

/** What was chosen; what a damaged store cannot mean counts as not chosen. */
export const airflowChoices = ({ choices }: Worksheet): AirflowChoices => ({
  method: oneOf(AIRFLOW_METHODS, choices['method']),
  atCoolingSpeed: oneOf(COOLING_SPEED_ANSWERS, choices['atCoolingSpeed']),
  airflowIn: oneOf(AIR_STATED_IN, choices['airflowIn']) ?? 'return',
  efficiencyIs: oneOf(EFFICIENCY_KINDS, choices['efficiencyIs']) ?? 'steady-state',
  staticPressureUnit: oneOf(STATIC_UNITS, choices['staticPressureUnit']),
  airflowUnit: oneOf(TABLE_FLOW_UNITS, choices['airflowUnit']),
});

/** A printed dash, or a place left empty for one. */
export const isBlankOrDash = (text: string): boolean => text.trim() === '' || isDash(text);

/** The table as entered; rows without a static pressure are not rows yet, a cell that is no number makes it no table yet. */
export function fanTableOf(
  { rows, choices }: Worksheet,
  units: { readonly staticPressureUnit: StaticPressureUnit; readonly airflowUnit: FlowUnit },
): FanTableInput | undefined {
  const read: { staticPressure: number; airflow: number | null }[] = [];
  for (const [pressureText = '', flowText = ''] of rows) {
    if (pressureText.trim() === '' && flowText.trim() === '') continue;
    const pressure = parseNumber(pressureText);
    const flow = parseNumber(flowText);
    if (pressure.state !== 'number' || (flow.state !== 'number' && !isBlankOrDash(flowText))) return undefined;
    read.push({
      staticPressure: pressure.number.value,
      airflow: flow.state === 'number' ? flow.number.value : null,
    });
  }
  if (read.length === 0) return undefined;
  return {
    ...units,
    ...(choices['tableSource'] && { source: choices['tableSource'] }),
    ...(choices['blowerTap'] && { blowerTap: choices['blowerTap'] }),
    rows: read,
  };
}

/** The request a method makes of the sheet: only what was typed and is a number. */
export function airflowRequest(
  filled: FilledSheet,
  method: AirflowMethod,
  tableUnits: { readonly staticPressureUnit: StaticPressureUnit; readonly airflowUnit: FlowUnit },
): AirflowRequest {
  const choices = airflowChoices(filled.sheet);
  const fields = [...methodFields({ ...choices, method }), ...SITE_FIELDS];
  const { 'airflow.plusMinus': accuracy, airflow, ...others } = amountsOf(filled, fields);
  const plusMinus = accuracy && { plusMinus: { value: accuracy.value, unit: '%' as const } };
  const fanTable = method === 'static-pressure' ? fanTableOf(filled.sheet, tableUnits) : undefined;
  return {
    ...others,
    ...(airflow && { airflow: { ...airflow, ...plusMinus } }),
    method,
    ...(choices.atCoolingSpeed && { atCoolingSpeed: choices.atCoolingSpeed }),
    ...(method === 'measured' && { airflowIn: choices.airflowIn }),
    ...(method === 'temperature-rise-gas' && { efficiencyIs: choices.efficiencyIs }),
    ...(fanTable && { fanTable }),
  };
}
