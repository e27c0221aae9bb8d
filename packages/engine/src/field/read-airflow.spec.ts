import { describe, expect, it } from 'vitest';
import type { Known, Quantity } from '../derivation/quantity';
import { isKnown } from '../derivation/quantity';
import { evaluateAirflow } from '../methods/airflow/evaluate-airflow';
import { flowFromM3PerS, temperatureToK } from '../units';
import type { AirflowRequest } from './field-request';
import { crossCheckAirflow, readAirflowRequest } from './read-airflow';

const ELECTRIC = {
  method: 'temperature-rise-electric',
  atCoolingSpeed: 'yes',
  elevation: { value: 0, unit: 'ft' },
  nominalCapacity: { value: 3, unit: 'ton' },
  returnDryBulb: { value: 70, unit: 'degF' },
  supplyDryBulb: { value: 95, unit: 'degF' },
  lineVoltage: { value: 240, unit: 'V' },
  heaterCurrent: { value: 41.7, unit: 'A' },
} as const satisfies AirflowRequest;

const GAS = {
  method: 'temperature-rise-gas',
  returnDryBulb: { value: 70, unit: 'degF' },
  supplyDryBulb: { value: 130, unit: 'degF' },
  dialVolume: { value: 1, unit: 'ft3' },
  gasRevolution: { value: 36, unit: 's' },
  gasHeatingValue: { value: 1000, unit: 'Btu/ft3' },
  furnaceEfficiency: { value: 80, unit: '%' },
} as const satisfies AirflowRequest;

const STATIC = {
  method: 'static-pressure',
  returnDryBulb: { value: 70, unit: 'degF' },
  returnStaticPressure: { value: -0.25, unit: 'inH2O' },
  supplyStaticPressure: { value: 0.25, unit: 'inH2O' },
  fanTable: {
    staticPressureUnit: 'inH2O',
    airflowUnit: 'cfm',
    rows: [
      { staticPressure: 0.3, airflow: 1300 },
      { staticPressure: 0.7, airflow: 1080 },
      { staticPressure: 0.9, airflow: null },
    ],
  },
} as const satisfies AirflowRequest;

function inputOf(request: AirflowRequest) {
  const read = readAirflowRequest(request);
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  return read.input;
}
const resultOf = (request: AirflowRequest) => evaluateAirflow(inputOf(request));

function known(quantity: Quantity): Known {
  if (!isKnown(quantity)) throw new Error(`not known: ${JSON.stringify(quantity)}`);
  return quantity;
}
const cfm = (quantity: Quantity): number => flowFromM3PerS(known(quantity).value, 'cfm');
const codes = (request: Partial<AirflowRequest>) =>
  crossCheckAirflow(request).map(({ path, code }) => `${path} ${code}`);

describe('a request for an airflow', () => {
  it('is the trade’s sum: 10 008 W over 1.08 × 25 °F', () => {
    const result = resultOf(ELECTRIC);
    expect(cfm(result.standardAirflow)).toBeCloseTo((10_008 * 3.412) / (1.08 * 25), -2);
    expect(result.cautions).toEqual(['humidity-assumed']);
    expect(result.reason).toBeNull();
  });

  it('gives the same airflow in °C, kW and m³', () => {
    const metric: AirflowRequest = {
      ...GAS,
      returnDryBulb: { value: temperatureToK(70, 'degF') - 273.15, unit: 'degC' },
      supplyDryBulb: { value: temperatureToK(130, 'degF') - 273.15, unit: 'degC' },
      dialVolume: { value: 0.3048 ** 3, unit: 'm3' },
      gasHeatingValue: { value: (1055.05585262 * 1000) / 0.3048 ** 3 / 1e6, unit: 'MJ/m3' },
      blowerHeat: { value: 0.5, unit: 'kW' },
    };
    const inchPound = resultOf({ ...GAS, blowerHeat: { value: 500, unit: 'W' } });
    const other = resultOf(metric);
    expect(cfm(other.airflow) / cfm(inchPound.airflow)).toBeCloseTo(1, 12);
    expect(known(other.airflow).u / known(inchPound.airflow).u).toBeCloseTo(1, 9);
    expect(cfm(resultOf({ ...GAS, blowerHeat: { value: 1706.07, unit: 'Btu/h' } }).airflow)).toBeCloseTo(
      cfm(inchPound.airflow),
      1,
    );
  });

  it('takes for what is left out: speed not known, sea level, blower in the return air, steady state', () => {
    const result = resultOf(GAS);
    expect(result.statedIn).toBe('return');
    expect(result.cautions).toEqual(['blower-speed-unknown', 'elevation-assumed', 'humidity-assumed']);
    expect(resultOf({ ...GAS, efficiencyIs: 'afue' }).cautions).toContain('afue-for-steady-state');
    expect(resultOf({ ...GAS, statedAt: 'supply' }).statedIn).toBe('supply');
    const site = { stationPressure: { value: 14.6, unit: 'psia' } } as const;
    expect(resultOf({ ...GAS, ...site }).cautions).not.toContain('elevation-assumed');
  });

  it('shows, but does not count, an airflow of another blower speed', () => {
    const result = resultOf({ ...GAS, atCoolingSpeed: 'no' });
    expect(result.reason).toEqual({ code: 'other-blower-speed' });
    expect(cfm(result.airflowAsFound)).toBeGreaterThan(1000);
  });

  it('names what is missing, the fan table too', () => {
    expect(resultOf({ method: 'temperature-rise-gas' }).reason).toMatchObject({
      code: 'inputs-missing',
      inputs: expect.arrayContaining(['dialVolume', 'gasRevolution', 'supplyDryBulb']) as unknown,
    });
    const { fanTable: _, supplyStaticPressure: __, ...without } = STATIC;
    expect(resultOf(without).reason).toEqual({
      code: 'inputs-missing',
      inputs: ['supplyStaticPressure', 'fanTable'],
    });
    expect(resultOf({ method: 'measured' }).reason).toEqual({ code: 'inputs-missing', inputs: ['airflow'] });
  });

  it('reads a maker’s table between its rows and stops at its dash', () => {
    const dense = resultOf(STATIC);
    expect(cfm(dense.airflow)).toBeGreaterThan(1180);
    expect(cfm(dense.airflow)).toBeLessThan(1195);
    expect(dense.cautions).not.toContain('fan-table-rises');
    const beside = resultOf({ ...STATIC, supplyStaticPressure: { value: 0.55, unit: 'inH2O' } });
    expect(beside.reason).toEqual({ code: 'dash' });
    const step = dense.steps.find(({ id }) => id === 'fanTableAirflow')!;
    expect(step.step.formula.source).toBe("Maker's fan table");
    const cited = resultOf({
      ...STATIC,
      fanTable: { ...STATIC.fanTable, source: 'manual, p. 4', blowerTap: 'medium' },
    });
    expect(cited.steps.find(({ id }) => id === 'fanTableAirflow')!.step.formula.source).toBe(
      "Maker's fan table, blower at medium: manual, p. 4",
    );
  });

  it('takes an instrument’s airflow as it shows it: at the return, the supply, or as standard air', () => {
    const measured = { method: 'measured', airflow: { value: 1200, unit: 'cfm' }, atCoolingSpeed: 'yes' } as const;
    const supply = resultOf({
      ...measured,
      airflowIn: 'supply',
      supplyDryBulb: { value: 55, unit: 'degF' },
      supplyWetBulb: { value: 53, unit: 'degF' },
      elevation: { value: 0, unit: 'ft' },
    });
    expect(cfm(supply.airflow)).toBeCloseTo(1200, 9);
    expect(cfm(supply.standardAirflow)).toBeGreaterThan(1210);
    expect(supply.cautions).toEqual([]);
    expect(supply.steps.map(({ id }) => id)).toContain('supplyHumidityRatio');
    const standard = resultOf({ ...measured, airflowIn: 'standard' });
    expect(cfm(standard.standardAirflow)).toBeCloseTo(1200, 9);
    expect(standard.cautions).toEqual([]);
  });

  it('uses a humidity that was read, by wet bulb or by relative humidity, and says how', () => {
    const wet = resultOf({ ...ELECTRIC, returnWetBulb: { value: 58, unit: 'degF' } });
    const relative = resultOf({ ...ELECTRIC, returnRelativeHumidity: { value: 48.3, unit: '%' } });
    expect(wet.cautions).toEqual([]);
    expect(wet.steps.map(({ id }) => id)).toContain('returnHumidityRatio');
    expect(relative.steps.map(({ id }) => id)).toContain('returnWetBulb');
    expect(cfm(relative.airflow) / cfm(wet.airflow)).toBeCloseTo(1, 3);
  });
});

describe('a stated ±', () => {
  const uOf = (heaterCurrent: AirflowRequest['heaterCurrent']) => {
    const input = inputOf({ ...ELECTRIC, ...(heaterCurrent && { heaterCurrent }) });
    return input.method === 'temperature-rise-electric' ? known(input.current).u : NaN;
  };

  it('is a limit, an expanded uncertainty, or the assumed one', () => {
    expect(uOf({ value: 40, unit: 'A' })).toBeCloseTo(0.8 / Math.sqrt(3), 12);
    expect(uOf({ value: 40, unit: 'A', plusMinus: { value: 0.5, unit: 'A' } })).toBeCloseTo(0.5 / Math.sqrt(3), 12);
    expect(uOf({ value: 40, unit: 'A', plusMinus: { value: 0.5, unit: 'A', kind: 'k2' } })).toBeCloseTo(0.25, 12);
  });

  it('in percent is of the figure, of an efficiency its points', () => {
    const input = inputOf({
      ...GAS,
      dialVolume: { value: 2, unit: 'ft3', plusMinus: { value: 5, unit: '%', kind: 'k2' } },
      furnaceEfficiency: { value: 80, unit: '%', plusMinus: { value: 4, unit: '%', kind: 'k2' } },
    });
    if (input.method !== 'temperature-rise-gas') throw new Error('not gas');
    expect(known(input.dialVolume).u / known(input.dialVolume).value).toBeCloseTo(0.025, 12);
    expect(known(input.efficiency).u).toBeCloseTo(0.02, 12);
  });

  it('of a display’s step adds to that of the instrument', () => {
    const stepped = uOf({ value: 40, unit: 'A', plusMinus: { value: 0.3, unit: 'A' }, resolution: 0.8 });
    expect(stepped).toBeCloseTo(Math.hypot(0.3, 0.4) / Math.sqrt(3), 12);
  });
});

describe('what cannot be', () => {
  it('is told all at once, each at its field', () => {
    expect(
      codes({
        elevation: { value: 30_000, unit: 'ft' },
        nominalCapacity: { value: 0, unit: 'ton' },
        returnDryBulb: { value: 70, unit: 'degF' },
        returnWetBulb: { value: 71, unit: 'degF' },
        supplyDryBulb: { value: -500, unit: 'degF' },
        supplyRelativeHumidity: { value: 101, unit: '%' },
        airflow: { value: -1, unit: 'cfm' },
        lineVoltage: { value: -240, unit: 'V', plusMinus: { value: -1, unit: 'V' } },
        heaterCurrent: { value: Infinity, unit: 'A' },
        blowerHeat: { value: -1, unit: 'W' },
        dialVolume: { value: 0, unit: 'ft3' },
        gasRevolution: { value: -3, unit: 's', plusMinus: { value: -1, unit: 's' } },
        gasHeatingValue: { value: NaN, unit: 'Btu/ft3' },
        furnaceEfficiency: { value: 101, unit: '%' },
        returnStaticPressure: { value: 1e300, unit: 'inH2O' },
        fanTable: { ...STATIC.fanTable, rows: [{ staticPressure: 0.3, airflow: null }] },
      }).sort(),
    ).toEqual([
      'airflow must-not-be-negative',
      'blowerHeat must-not-be-negative',
      'dialVolume must-be-positive',
      'elevation elevation-outside-range',
      'fanTable fan-table-too-few-rows',
      'furnaceEfficiency efficiency-outside-range',
      'gasHeatingValue not-a-finite-number',
      'gasRevolution must-be-positive',
      'gasRevolution.plusMinus must-not-be-negative',
      'heaterCurrent not-a-finite-number',
      'lineVoltage must-not-be-negative',
      'lineVoltage.plusMinus must-not-be-negative',
      'nominalCapacity must-be-positive',
      'returnStaticPressure not-a-finite-number',
      'returnWetBulb wet-bulb-above-dry-bulb',
      'supplyDryBulb below-absolute-zero',
      'supplyRelativeHumidity humidity-outside-range',
    ]);
  });

  it.each([
    [
      [
        [0.3, 1300],
        [0.2, 1200],
      ],
      ['fanTable fan-table-statics-not-ascending'],
    ],
    [
      [
        [0.3, 1300],
        [0.5, 0],
      ],
      ['fanTable fan-table-airflow-not-above-zero'],
    ],
    [
      [
        [0.3, NaN],
        [Infinity, 1200],
      ],
      ['fanTable.rows.0.airflow not-a-finite-number', 'fanTable.rows.1.staticPressure not-a-finite-number'],
    ],
    [[], ['fanTable fan-table-too-few-rows']],
  ] as const)('of a table %j: %j', (rows, expected) => {
    const table = rows.map(([staticPressure, airflow]) => ({ staticPressure, airflow }));
    expect(codes({ fanTable: { ...STATIC.fanTable, rows: table } })).toEqual(expected);
  });

  it('in a whole request refuses it', () => {
    expect(readAirflowRequest({ ...ELECTRIC, returnDryBulb: { value: -500, unit: 'degF' } })).toMatchObject({
      ok: false,
      faults: [{ path: 'returnDryBulb', code: 'below-absolute-zero' }],
    });
    expect(codes(ELECTRIC)).toEqual([]);
  });
});
