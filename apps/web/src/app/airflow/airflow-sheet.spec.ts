import { describe, expect, it } from 'vitest';
import type { TypedValue } from '../loose-checks/check-draft';
import { EMPTY_WORKSHEET, type Worksheet } from '../loose-checks/worksheet';
import { sheetRows, type FilledSheet } from '../worksheets/sheet-fields';
import { airflowChoices, airflowRequest, fanTableOf, methodFields, SITE_FIELDS } from './airflow-sheet';
import { capacityFields, humidityBy } from './capacity-sheet';
import { evaluateAirflowSheet, evaluateCapacitySheet, tableUnits } from './evaluate-sheet';
import { broughtAirflow } from './bring-airflow';
import { isKnown } from '@chargewright/engine';

const typed = (values: Readonly<Record<string, readonly [text: string, unit: string]>>): Worksheet['typed'] =>
  Object.fromEntries(Object.entries(values).map(([key, [text, unit]]) => [key, { text, unit }]));

const filled = (sheet: Partial<Worksheet>, known: Readonly<Record<string, TypedValue>> = {}): FilledSheet => ({
  sheet: { ...EMPTY_WORKSHEET, ...sheet },
  known,
});

const UNITS = { staticPressureUnit: 'inH2O', airflowUnit: 'cfm' } as const;
const ELECTRIC = {
  choices: { method: 'temperature-rise-electric', atCoolingSpeed: 'yes' },
  typed: typed({
    lineVoltage: ['238', 'V'],
    heaterCurrent: ['41,5', 'A'],
    riseReturn: ['70.2', 'degF'],
    riseSupply: ['95.4', 'degF'],
    elevation: ['650', 'ft'],
  }),
};

describe('the request of a sheet', () => {
  it('has what was typed, with the step its decimals tell, at the names of the interface', () => {
    expect(airflowRequest(filled(ELECTRIC), 'temperature-rise-electric', UNITS)).toEqual({
      method: 'temperature-rise-electric',
      atCoolingSpeed: 'yes',
      lineVoltage: { value: 238, unit: 'V', resolution: 1 },
      heaterCurrent: { value: 41.5, unit: 'A', resolution: 0.1 },
      returnDryBulb: { value: 70.2, unit: 'degF', resolution: 0.1 },
      supplyDryBulb: { value: 95.4, unit: 'degF', resolution: 0.1 },
      elevation: { value: 650, unit: 'ft', resolution: 1 },
    });
  });

  it('leaves out what is no number, or in a unit of something else', () => {
    const sheet = { typed: typed({ lineVoltage: ['about 240', 'V'], heaterCurrent: ['41', 'degF'] }) };
    expect(airflowRequest(filled(sheet), 'temperature-rise-electric', UNITS)).toEqual({
      method: 'temperature-rise-electric',
    });
  });

  it('takes from the check what is known there, until something else is typed', () => {
    const known = { nominalCapacity: { text: '3', unit: 'ton' }, elevation: { text: '5280', unit: 'ft' } };
    const request = airflowRequest(filled(ELECTRIC, known), 'temperature-rise-electric', UNITS);
    expect(request.nominalCapacity).toMatchObject({ value: 3, unit: 'ton' });
    expect(request.elevation).toMatchObject({ value: 650 });
    // a blank field was emptied on purpose
    const emptied = filled({ typed: typed({ nominalCapacity: ['', 'ton'] }) }, known);
    expect(airflowRequest(emptied, 'measured', UNITS)).not.toHaveProperty('nominalCapacity');
  });

  it('reads a measured airflow in the air it is stated in, with the instrument’s ±', () => {
    const sheet = {
      choices: { method: 'measured', airflowIn: 'supply' },
      typed: typed({ airflow: ['1200', 'cfm'], airflowPlusMinus: ['5', '%'], measuredAir: ['55', 'degF'] }),
    };
    expect(airflowRequest(filled(sheet), 'measured', UNITS)).toMatchObject({
      airflow: { value: 1200, plusMinus: { value: 5, unit: '%' } },
      airflowIn: 'supply',
      supplyDryBulb: { value: 55 },
    });
    const standard = airflowChoices({ ...EMPTY_WORKSHEET, choices: { method: 'measured', airflowIn: 'standard' } });
    expect(methodFields(standard).map(({ key }) => key)).toEqual(['airflow', 'airflowPlusMinus']);
  });

  it('does not take a choice the page does not have', () => {
    const choices = airflowChoices({ ...EMPTY_WORKSHEET, choices: { method: 'by feel', atCoolingSpeed: 'maybe' } });
    expect(choices).toMatchObject({ method: undefined, atCoolingSpeed: undefined, airflowIn: 'return' });
  });
});

describe('the fan table of a sheet', () => {
  const table = (rows: Worksheet['rows']) => fanTableOf({ ...EMPTY_WORKSHEET, rows }, UNITS);

  it('has its rows, an empty airflow or a printed dash as a dash, empty rows as none', () => {
    expect(
      table([
        ['0.3', '1300'],
        ['', ''],
        ['0,5', '–'],
        ['0.7', ''],
      ])?.rows,
    ).toEqual([
      { staticPressure: 0.3, airflow: 1300 },
      { staticPressure: 0.5, airflow: null },
      { staticPressure: 0.7, airflow: null },
    ]);
  });

  it.each([[[]], [[['', '']]], [[['', '1300']]], [[['0.3', 'high']]]])('is none yet from %j', (rows) => {
    expect(table(rows)).toBeUndefined();
  });

  it('has the units that were chosen, else those of the person', () => {
    expect(tableUnits(filled({}), 'C-kPa')).toEqual({ staticPressureUnit: 'Pa', airflowUnit: 'm3/h' });
    const chosen = filled({ choices: { staticPressureUnit: 'inH2O', airflowUnit: 'L/s' } });
    expect(tableUnits(chosen, 'C-kPa')).toEqual({ staticPressureUnit: 'inH2O', airflowUnit: 'L/s' });
  });
});

describe('the airflow of a sheet', () => {
  it('is found from what is sound; what cannot be is said at its field', () => {
    const faulty = filled({
      ...ELECTRIC,
      typed: { ...ELECTRIC.typed, ...typed({ elevation: ['99000', 'ft'], nominalCapacity: ['0', 'ton'] }) },
    });
    const { result, faults } = evaluateAirflowSheet(faulty, 'F-psi');
    expect(result && isKnown(result.airflow)).toBe(true);
    expect(faults.map(({ path }) => path)).toEqual(['elevation', 'nominalCapacity']);
    const rows = sheetRows(SITE_FIELDS, { filled: faulty, faults, system: 'F-psi' });
    expect(rows.map(({ key, complaints }) => [key, complaints.length])).toEqual([
      ['elevation', 1],
      ['nominalCapacity', 1],
    ]);
    expect(rows[1]?.complaints).toEqual(['Nominal capacity must be more than zero.']);
  });

  it('keeps a fault of the ± at the field of the ±', () => {
    const sheet = filled({
      choices: { method: 'measured' },
      typed: typed({ airflow: ['1200', 'cfm'], airflowPlusMinus: ['-5', '%'] }),
    });
    const { faults } = evaluateAirflowSheet(sheet, 'F-psi');
    const rows = sheetRows(methodFields(airflowChoices(sheet.sheet)), { filled: sheet, faults, system: 'F-psi' });
    expect(rows.filter(({ complaints }) => complaints.length > 0).map(({ key }) => key)).toEqual(['airflowPlusMinus']);
  });

  it('says a number that is none, in its place', () => {
    const sheet = filled({ ...ELECTRIC, typed: typed({ lineVoltage: ['240V', 'V'] }) });
    const [volts] = sheetRows(methodFields(airflowChoices(sheet.sheet)), {
      filled: sheet,
      faults: [],
      system: 'F-psi',
    });
    expect(volts?.complaints).toHaveLength(1);
    expect(volts?.value?.text).toBe('240V');
  });

  it('comes into a check as a whole number with its ±, in the unit of the check’s field', () => {
    const { result } = evaluateAirflowSheet(filled(ELECTRIC), 'F-psi');
    if (!result || !isKnown(result.airflow)) throw new Error('no airflow');
    const { value, workedOut } = broughtAirflow(result.airflow, result.method, 'F-psi');
    expect(value).toEqual({ text: '1267', unit: 'cfm' });
    expect(workedOut.method).toBe('temperature-rise-electric');
    expect(workedOut.plusMinus).toBeCloseTo(128, 0);
    const metric = broughtAirflow(result.airflow, result.method, 'C-kPa');
    expect(metric.value.unit).toBe('m3/h');
    expect(Number(metric.value.text)).toBeCloseTo(1267 * 1.699, -1);
    expect(metric.workedOut.plusMinus / workedOut.plusMinus).toBeCloseTo(1.699, 3);
  });
});

describe('the capacity of a sheet', () => {
  const air = typed({
    capacityReturnDry: ['80', 'degF'],
    capacityReturnWet: ['67', 'degF'],
    capacitySupplyDry: ['58', 'degF'],
    capacitySupplyWet: ['57', 'degF'],
  });

  it('rests on the airflow above, with its ±', () => {
    const sheet = filled({ ...ELECTRIC, typed: { ...ELECTRIC.typed, ...air } });
    const airflow = evaluateAirflowSheet(sheet, 'F-psi').result;
    const { result } = evaluateCapacitySheet(sheet, airflow);
    if (!result || !isKnown(result.totalW) || !airflow || !isKnown(airflow.airflow)) throw new Error('no capacity');
    expect(result.totalW.value).toBeGreaterThan(8_000);
    expect(result.totalW.u / result.totalW.value).toBeGreaterThan(airflow.airflow.u / airflow.airflow.value);
  });

  it('has none where the airflow does not count', () => {
    const other = { ...ELECTRIC.choices, atCoolingSpeed: 'no' };
    const sheet = filled({ ...ELECTRIC, choices: other, typed: { ...ELECTRIC.typed, ...air } });
    expect(evaluateCapacitySheet(sheet, evaluateAirflowSheet(sheet, 'F-psi').result).result).toBeNull();
    expect(evaluateCapacitySheet(sheet, null).result).toBeNull();
  });

  it('asks for the humidity the check has, or as chosen', () => {
    const humid = { capacityReturnHumidity: { text: '50', unit: '%' } };
    expect(humidityBy(filled({}))).toBe('wet-bulb');
    expect(humidityBy(filled({}, humid))).toBe('humidity');
    expect(humidityBy(filled({ choices: { humidityBy: 'wet-bulb' } }, humid))).toBe('wet-bulb');
    expect(capacityFields('humidity').map(({ path }) => path)).toEqual([
      'returnDryBulb',
      'returnRelativeHumidity',
      'supplyDryBulb',
      'supplyRelativeHumidity',
    ]);
  });
});
