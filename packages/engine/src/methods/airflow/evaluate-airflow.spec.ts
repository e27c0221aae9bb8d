import { describe, expect, it } from 'vitest';
import type { Known, Quantity } from '../../derivation/quantity';
import { bareValue, isKnown, leaf, missing } from '../../derivation/quantity';
import { replay } from '../../derivation/replay';
import { standardAtmospherePressurePa } from '../../psychrometrics/standard-atmosphere';
import {
  flowFromM3PerS,
  flowToM3PerS,
  lengthToM,
  powerFromW,
  powerToW,
  staticPressureToPa,
  temperatureToK,
} from '../../units';
import { heatingValueToJPerM3, volumeToM3 } from '../../units/fuel-gas';
import type { AirflowResult } from './evaluate-airflow';
import { evaluateAirflow } from './evaluate-airflow';
import type { ElectricTemperatureRise, GasTemperatureRise, StaticPressureAirflow } from './airflow-input';
import type { FanTable } from './fan-table';
import { fieldReading } from './field-readings';

const exactly = (id: string, kind: Known['kind'], value: number, u = 0): Known =>
  leaf({ id, kind, value, origin: 'reading', parts: u > 0 ? [{ key: `reading:${id}`, u, shape: 'rectangular' }] : [] });
const degF = (id: string, value: number, u = 0): Known => exactly(id, 'temperatureK', temperatureToK(value, 'degF'), u);
const atmosphere = (feet: number): Known =>
  exactly('atmosphere', 'pressurePa', standardAtmospherePressurePa(lengthToM(feet, 'ft')));
const humidity = (value: number): Known => exactly('humidityRatio', 'humidityRatio', value);
const tons = (value: number): Known => exactly('nominalCapacity', 'powerW', powerToW(value, 'ton'));

function known(quantity: Quantity): Known {
  if (!isKnown(quantity)) throw new Error(`not known: ${JSON.stringify(quantity)}`);
  return quantity;
}
const cfm = (quantity: Quantity): number => flowFromM3PerS(known(quantity).value, 'cfm');

/** 240.0 V × 41.7 A = 10 008 W; 70 °F in, 95 °F out. */
const ELECTRIC: ElectricTemperatureRise = {
  method: 'temperature-rise-electric',
  voltage: fieldReading('lineVoltage', { value: 240, limit: 0 }),
  current: fieldReading('heaterCurrent', { value: 41.7, limit: 0 }),
  returnDryBulb: degF('returnDryBulb', 70),
  supplyDryBulb: degF('supplyDryBulb', 95),
  statedAt: 'return',
  atmosphere: atmosphere(0),
  humidityRatio: humidity(0),
  atCoolingSpeed: 'yes',
  nominalCapacity: tons(3),
};

/** One revolution of a 1 ft³ dial in 36 s, 1000 Btu/ft³: 100 000 Btu/h in, 80 000 out at 80 %. 70 °F in, 130 °F out. */
const GAS: GasTemperatureRise = {
  method: 'temperature-rise-gas',
  dialVolume: fieldReading('dialVolume', { value: volumeToM3(1, 'ft3'), limit: 0 }),
  revolution: fieldReading('gasRevolution', { value: 36, limit: 0 }),
  heatingValue: fieldReading('gasHeatingValue', { value: heatingValueToJPerM3(1000, 'Btu/ft3'), limit: 0 }),
  efficiency: fieldReading('furnaceEfficiency', { value: 0.8, limit: 0 }),
  efficiencyIs: 'steady-state',
  returnDryBulb: degF('returnDryBulb', 70),
  supplyDryBulb: degF('supplyDryBulb', 130),
  statedAt: 'return',
  atmosphere: atmosphere(0),
  humidityRatio: humidity(0),
  atCoolingSpeed: 'yes',
  nominalCapacity: tons(3),
};

const steps = ({ steps }: AirflowResult): readonly string[] => steps.map(({ id }) => id);
const stepValue = ({ steps }: AirflowResult, id: string): number => steps.find((step) => step.id === id)!.result.value;

describe('temperature rise with electric heat', () => {
  it('is volts × amps over the heat of the air: Btu/h / (1.08 × 25 °F) for standard air at sea level', () => {
    const result = evaluateAirflow(ELECTRIC);
    expect(stepValue(result, 'electricHeat')).toBeCloseTo(10_008, 9);
    const byRuleOfThumb = powerFromW(10_008, 'Btu/h') / (1.08 * 25);
    expect(cfm(result.standardAirflow) / byRuleOfThumb).toBeCloseTo(1, 2);
    expect(result.reason).toBeNull();
    expect(result.cautions).toEqual([]);
    expect(result.statedIn).toBe('return');
  });

  it('writes the steps in the order a person does', () => {
    expect(steps(evaluateAirflow(ELECTRIC))).toEqual([
      'electricHeat',
      'airSpecificHeat',
      'temperatureRise',
      'dryAirMassFlow',
      'returnSpecificVolume',
      'returnAirflow',
      'standardAirflow',
      'airflowPerCapacity',
    ]);
  });

  it('finds more cubic feet in thin air for the same heat, but the same standard air', () => {
    const low = evaluateAirflow(ELECTRIC);
    const high = evaluateAirflow({ ...ELECTRIC, atmosphere: atmosphere(5280) });
    const ratio = standardAtmospherePressurePa(0) / standardAtmospherePressurePa(lengthToM(5280, 'ft'));
    expect(ratio).toBeGreaterThan(1.2);
    expect(cfm(high.airflow) / cfm(low.airflow)).toBeCloseTo(ratio, 10);
    expect(cfm(high.standardAirflow)).toBeCloseTo(cfm(low.standardAirflow), 9);
  });

  it('states the warmer supply air as the larger volume, by the ratio of the absolute temperatures', () => {
    const atReturn = evaluateAirflow(ELECTRIC);
    const atSupply = evaluateAirflow({ ...ELECTRIC, statedAt: 'supply' });
    expect(cfm(atSupply.airflow) / cfm(atReturn.airflow)).toBeCloseTo((95 + 459.67) / (70 + 459.67), 10);
    expect(steps(atSupply)).toContain('supplySpecificVolume');
  });

  it('adds the heat of the blower where it is not in the amps', () => {
    const result = evaluateAirflow({ ...ELECTRIC, blowerHeat: fieldReading('blowerHeat', { value: 500, limit: 0 }) });
    expect(cfm(result.airflow) / cfm(evaluateAirflow(ELECTRIC).airflow)).toBeCloseTo(10_508 / 10_008, 10);
  });

  it('gives cfm per ton', () => {
    const result = evaluateAirflow(ELECTRIC);
    const cfmPerTon = flowFromM3PerS(known(result.perCapacity).value * powerToW(1, 'ton'), 'cfm');
    expect(cfmPerTon).toBeCloseTo(cfm(result.airflow) / 3, 9);
    const { nominalCapacity: _, ...without } = ELECTRIC;
    expect(evaluateAirflow(without).perCapacity).toEqual(missing('nominalCapacity'));
  });

  it('hardly depends on a humidity nobody gave', () => {
    const { humidityRatio: _, ...without } = ELECTRIC;
    const assumed = evaluateAirflow(without);
    expect(assumed.cautions).toEqual(['humidity-assumed']);
    for (const [w, most] of [
      [0, 0.002],
      [0.012, 0.002],
    ] as const) {
      const result = evaluateAirflow({ ...ELECTRIC, humidityRatio: humidity(w) });
      expect(Math.abs(cfm(result.airflow) / cfm(assumed.airflow) - 1)).toBeLessThan(most);
    }
    expect(known(assumed.airflow).u / known(assumed.airflow).value).toBeGreaterThan(0);
  });

  it('carries the ± of the rise: two thermometers of ±1 °F and the plenum’s ±1.5 °F make 4.8 % on 25 °F', () => {
    const third = 5 / 9 / Math.sqrt(3);
    const result = evaluateAirflow({
      ...ELECTRIC,
      returnDryBulb: degF('returnDryBulb', 70, third),
      supplyDryBulb: degF('supplyDryBulb', 95, third),
    });
    const airflow = known(result.airflow);
    // the return thermometer counts a little more: its air's volume is stated too
    const ofReturn = 1 + 25 / (70 + 459.67);
    expect(airflow.u / airflow.value).toBeCloseTo(Math.sqrt((ofReturn ** 2 + 1 + 1.5 ** 2) / 3) / 25, 3);
  });

  it('agrees with a Monte Carlo of the whole chain within 5 % on the standard uncertainty', () => {
    const third = 5 / 9 / Math.sqrt(3);
    const airflow = known(
      evaluateAirflow({
        ...ELECTRIC,
        voltage: fieldReading('lineVoltage', { value: 240 }),
        current: fieldReading('heaterCurrent', { value: 41.7 }),
        returnDryBulb: degF('returnDryBulb', 70, third),
        supplyDryBulb: degF('supplyDryBulb', 95, third),
      }).airflow,
    );
    let state = 7;
    const next = (): number => (state = (state * 48271) % 2147483647) / 2147483647;
    const drawn = Array.from({ length: 20_000 }, () => {
      const errors = new Map<string, number>();
      return replay(airflow, ({ key }) => {
        const error = errors.get(key) ?? (2 * next() - 1) * Math.sqrt(3);
        errors.set(key, error);
        return error;
      });
    });
    const mean = drawn.reduce((sum, x) => sum + x, 0) / drawn.length;
    const deviation = Math.sqrt(drawn.reduce((sum, x) => sum + (x - mean) ** 2, 0) / (drawn.length - 1));
    expect(Math.abs(airflow.u / deviation - 1)).toBeLessThan(0.05);
  });

  it.each([70, 65])('refuses a supply of %d °F over a return of 70', (supplyF) => {
    const result = evaluateAirflow({ ...ELECTRIC, supplyDryBulb: degF('supplyDryBulb', supplyF) });
    expect(result.airflow.state).toBe('refused');
    expect(result.reason).toEqual({ code: 'no-temperature-rise' });
  });

  it('refuses what cannot be: no current', () => {
    const result = evaluateAirflow({ ...ELECTRIC, current: fieldReading('heaterCurrent', { value: 0 }) });
    expect(result.reason).toEqual({ code: 'outside-range' });
  });

  it('says what is missing', () => {
    const result = evaluateAirflow({
      ...ELECTRIC,
      current: missing('heaterCurrent'),
      supplyDryBulb: missing('supplyDryBulb'),
    });
    expect(result.reason).toEqual({ code: 'inputs-missing', inputs: ['heaterCurrent', 'supplyDryBulb'] });
    expect(steps(result)).toEqual([]);
  });
});

describe('the blower speed', () => {
  it('of heating does not count: shown as found, and no gate can get at it', () => {
    const result = evaluateAirflow({ ...ELECTRIC, atCoolingSpeed: 'no' });
    expect(result.reason).toEqual({ code: 'other-blower-speed' });
    for (const refused of [result.airflow, result.standardAirflow, result.perCapacity]) {
      expect(refused.state).toBe('refused');
      expect(bareValue(refused)).toBeUndefined();
    }
    expect(cfm(result.airflowAsFound)).toBeCloseTo(cfm(evaluateAirflow(ELECTRIC).airflow), 9);
  });

  it('nobody knows is a caution', () => {
    const result = evaluateAirflow({ ...ELECTRIC, atCoolingSpeed: 'unknown' });
    expect(result.cautions).toEqual(['blower-speed-unknown']);
    expect(result.airflow.state).toBe('known');
  });
});

describe('temperature rise with gas heat', () => {
  it('clocks the meter: 3600 / 36 s × 1 ft³ × 1000 Btu/ft³ = 100 000 Btu/h, of which 80 % reach the air', () => {
    const result = evaluateAirflow(GAS);
    expect(powerFromW(stepValue(result, 'gasInput'), 'Btu/h')).toBeCloseTo(100_000, 6);
    expect(powerFromW(stepValue(result, 'gasHeat'), 'Btu/h')).toBeCloseTo(80_000, 6);
    expect(cfm(result.standardAirflow) / (80_000 / (1.08 * 60))).toBeCloseTo(1, 2);
  });

  it('takes half the heat from a dial that takes twice as long', () => {
    const slow = evaluateAirflow({ ...GAS, revolution: fieldReading('gasRevolution', { value: 72, limit: 0 }) });
    expect(cfm(slow.airflow)).toBeCloseTo(cfm(evaluateAirflow(GAS).airflow) / 2, 9);
  });

  it('says that AFUE stands in for the steady-state efficiency', () => {
    expect(evaluateAirflow({ ...GAS, efficiencyIs: 'afue' }).cautions).toEqual(['afue-for-steady-state']);
  });

  it.each([0, -0.8, 1.01, 80])('refuses an efficiency of %d', (value) => {
    const efficiency = fieldReading('furnaceEfficiency', { value, limit: 0 });
    expect(evaluateAirflow({ ...GAS, efficiency }).reason).toEqual({ code: 'outside-range' });
  });

  it.each(['dialVolume', 'gasRevolution', 'gasHeatingValue'] as const)('refuses a %s of zero', (id) => {
    const field = { dialVolume: 'dialVolume', gasRevolution: 'revolution', gasHeatingValue: 'heatingValue' }[id];
    const result = evaluateAirflow({ ...GAS, [field]: fieldReading(id, { value: 0, limit: 0 }) });
    expect(result.reason).toEqual({ code: 'outside-range' });
  });
});

describe('measured airflow', () => {
  const measured = exactly(
    'airflow',
    'flowM3PerS',
    flowToM3PerS(1200, 'cfm'),
    flowToM3PerS(1200 * 0.07, 'cfm') / Math.sqrt(3),
  );
  const input = {
    method: 'measured',
    measured,
    shows: 'return',
    dryBulb: degF('returnDryBulb', 70),
    atmosphere: atmosphere(0),
    humidityRatio: humidity(0),
    atCoolingSpeed: 'yes',
    nominalCapacity: tons(3),
  } as const;

  it('passes through with its instrument’s ±', () => {
    const result = evaluateAirflow(input);
    expect(result.airflow).toBe(measured);
    const perTon = known(result.perCapacity);
    expect(flowFromM3PerS(perTon.value * powerToW(1, 'ton'), 'cfm')).toBeCloseTo(400, 9);
    expect(perTon.u / perTon.value).toBeCloseTo(0.07 / Math.sqrt(3), 9);
  });

  it('is a little less of standard air: dry air of 70 °F at sea level is 0.0749 lb/ft³', () => {
    expect((0.075 * cfm(evaluateAirflow(input).standardAirflow)) / 1200).toBeCloseTo(0.0749, 4);
  });

  it('has no standard air without the temperature, and needs none where the instrument shows it', () => {
    expect(evaluateAirflow({ ...input, dryBulb: missing('returnDryBulb') }).standardAirflow).toEqual(
      missing('returnDryBulb'),
    );
    const standard = evaluateAirflow({ ...input, shows: 'standard', dryBulb: missing('returnDryBulb') });
    expect(standard.standardAirflow).toBe(measured);
    expect(standard.statedIn).toBe('standard');
  });
});

describe('static pressure with the fan table', () => {
  const inWc = (value: number): number => staticPressureToPa(value, 'inH2O');
  const STANDARD_KG_PER_M3 = (0.075 * 0.45359237) / 0.3048 ** 3;
  const table: FanTable = {
    source: 'made up for this test',
    blowerTap: 'medium',
    rows: [
      { staticPa: inWc(0.3), airflowM3PerS: flowToM3PerS(1300, 'cfm') },
      { staticPa: inWc(0.5), airflowM3PerS: flowToM3PerS(1200, 'cfm') },
      { staticPa: inWc(0.7), airflowM3PerS: flowToM3PerS(1080, 'cfm') },
      { staticPa: inWc(0.9), airflowM3PerS: null },
    ],
  };
  const input = (returnWc: number, supplyWc: number): StaticPressureAirflow => ({
    method: 'static-pressure',
    returnStatic: fieldReading('returnStaticPressure', { value: inWc(returnWc), limit: 0 }),
    supplyStatic: fieldReading('supplyStaticPressure', { value: inWc(supplyWc), limit: 0 }),
    table,
    dryBulb: degF('returnDryBulb', 70),
    place: 'return',
    // the pressure that makes dry air of 70 °F standard air
    atmosphere: exactly('atmosphere', 'pressurePa', STANDARD_KG_PER_M3 * 287.042 * temperatureToK(70, 'degF')),
    humidityRatio: humidity(0),
    atCoolingSpeed: 'yes',
  });

  it.each([
    [-0.25, 0.25, 1200],
    [0.25, 0.25, 1200],
    [-0.3, 0.3, 1140],
    [-0.1, 0.3, 1250],
    [-0.1, 0.2, 1300],
    [-0.35, 0.35, 1080],
  ])('return %d and supply %d in. w.c. add their sizes: %d cfm', (returnWc, supplyWc, expected) => {
    const result = evaluateAirflow(input(returnWc, supplyWc));
    expect(cfm(result.airflow)).toBeCloseTo(expected, 3);
    expect(result.reason).toBeNull();
  });

  it('refuses beyond the table and beside its dash', () => {
    expect(evaluateAirflow(input(-0.1, 0.19)).reason).toEqual({ code: 'outside-table' });
    expect(evaluateAirflow(input(-0.5, 0.5)).reason).toEqual({ code: 'outside-table' });
    expect(evaluateAirflow(input(-0.4, 0.4)).reason).toEqual({ code: 'dash' });
    expect(evaluateAirflow(input(-0.45, 0.45)).reason).toEqual({ code: 'dash' });
  });

  it('carries the ± of the table', () => {
    const airflow = known(evaluateAirflow(input(-0.25, 0.25)).airflow);
    expect(airflow.u / airflow.value).toBeCloseTo(0.05 / Math.sqrt(3), 9);
  });

  it('brings a static read in thin air to the table’s standard air: 0.50 in. w.c. at 5,280 ft stands for 0.61', () => {
    const thin = evaluateAirflow({ ...input(-0.25, 0.25), atmosphere: atmosphere(5280) });
    const external = stepValue(thin, 'staticInStandardAir');
    expect(external / inWc(1)).toBeCloseTo(0.607, 2);
    expect(cfm(thin.airflow)).toBeLessThan(1150);
  });

  it('cautions where the supply side is not above the room, or the table rises', () => {
    expect(evaluateAirflow(input(-0.25, -0.25)).cautions).toEqual(['supply-static-not-above-room']);
    const rows = [...table.rows.slice(0, 2), { staticPa: inWc(0.7), airflowM3PerS: flowToM3PerS(1250, 'cfm') }];
    expect(evaluateAirflow({ ...input(-0.25, 0.25), table: { ...table, rows } }).cautions).toEqual(['fan-table-rises']);
  });

  it('refuses a table that is none', () => {
    const result = evaluateAirflow({ ...input(-0.25, 0.25), table: { ...table, rows: table.rows.slice(0, 1) } });
    expect(result.reason).toEqual({ code: 'table-not-usable' });
  });
});
