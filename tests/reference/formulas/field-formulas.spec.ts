/** The formulas of airflow, capacity and weigh-in: each `text`, evaluated by mathjs with its symbols, against the function that computes it. */
import { compile } from 'mathjs';
import { describe, expect, it } from 'vitest';
import type { Formula } from '../../../packages/engine/src/derivation/formula';
import * as airProperties from '../../../packages/engine/src/methods/airflow/air-properties';
import * as airflowFormulas from '../../../packages/engine/src/methods/airflow/airflow-formulas';
import * as fanTable from '../../../packages/engine/src/methods/airflow/fan-table';
import * as heatInput from '../../../packages/engine/src/methods/airflow/heat-input';
import * as standardAir from '../../../packages/engine/src/methods/airflow/standard-air';
import * as capacityFormulas from '../../../packages/engine/src/methods/capacity/capacity-formulas';
import * as supplyAir from '../../../packages/engine/src/methods/capacity/supply-air';
import * as chargeFormulas from '../../../packages/engine/src/methods/weigh-in/charge-formulas';
import { lineRateByDensity } from '../../../packages/engine/src/methods/weigh-in/line-rate';
import {
  moistAirFromDryBulbAndRelativeHumidity,
  moistAirFromDryBulbAndWetBulb,
} from '../../../packages/engine/src/psychrometrics/moist-air';

const TABLE: fanTable.FanTable = {
  source: 'made up for this test',
  blowerTap: '2',
  rows: [
    { staticPa: 0, airflowM3PerS: 0.8 },
    { staticPa: 100, airflowM3PerS: 0.7 },
    { staticPa: 300, airflowM3PerS: 0.3 },
  ],
};

/** What the functions of the texts stand for: the published line written out, or another door of the engine. */
const FUNCTIONS = {
  // eq. 26 of ch. 1
  v: (dryBulbK: number, w: number, pressurePa: number) => (287.042 * dryBulbK * (1 + 1.607858 * w)) / pressurePa,
  c_air: (w: number) => 1000 * (1.006 + 1.86 * w),
  h: (dryBulbK: number, w: number) => 1000 * (1.006 * (dryBulbK - 273.15) + w * (2501 + 1.86 * (dryBulbK - 273.15))),
  h_water: (dryBulbK: number) => 4190 * (dryBulbK - 273.15),
  table: (pa: number) => (pa <= 100 ? 0.8 - 0.001 * pa : 0.7 - 0.002 * (pa - 100)),
  T_wb: (dryBulbK: number, relativeHumidityRatio: number, pressurePa: number) =>
    moistAirFromDryBulbAndRelativeHumidity({ dryBulbK, relativeHumidityRatio, pressurePa }).wetBulbK,
  W: (dryBulbK: number, wetBulbK: number, pressurePa: number) =>
    moistAirFromDryBulbAndWetBulb({ dryBulbK, wetBulbK, pressurePa }).humidityRatio,
};

/** Where each input is drawn from, by its symbol. */
const RANGES: Readonly<Record<string, readonly [low: number, high: number]>> = {
  p_atmosphere: [8e4, 1.02e5],
  T_return: [295, 300],
  T_supply: [302, 330],
  T_wb: [296, 300],
  RH: [0.1, 1],
  W: [0.002, 0.014],
  W_return: [0.004, 0.014],
  W_supply: [0.004, 0.014],
  m: [0.2, 2],
  v: [0.8, 1],
  c: [1000, 1030],
  dT: [5, 30],
  Q: [3e3, 3e4],
  Q_heater: [3e3, 3e4],
  Q_blower: [0, 800],
  Q_gas: [3e3, 3e4],
  Q_nominal: [5e3, 2e4],
  Q_total: [5e3, 2e4],
  Q_sensible: [4e3, 2e4],
  eta: [0.5, 1],
  U: [200, 250],
  I: [10, 80],
  V_dial: [0.01, 0.06],
  t: [10, 200],
  H_gas: [3e7, 4.5e7],
  V_air: [0.2, 1],
  V_standard: [0.2, 1],
  rho_standard: [1, 1.3],
  P_return: [-100, 100],
  P_supply: [-100, 100],
  P_external: [20, 250],
  P: [0, 300],
  h_return: [4e4, 6e4],
  h_supply: [3e4, 4e4],
  h_condensate: [50, 300],
  L: [0, 30],
  L_included: [0, 15],
  r: [0.01, 0.1],
  r_included: [0.01, 0.1],
  r_410A: [0.01, 0.1],
  rho: [400, 1500],
  rho_410A: [950, 1000],
  m_line: [-0.5, 2],
  m_coil: [-0.5, 0.5],
  m_drier: [-0.5, 0.5],
  m_other: [-0.5, 0.5],
  m_factory: [2, 5],
  m_adjustment: [-1, 2],
  m_put_in: [-1, 2],
  m_actual: [0, 5],
  m_required: [0, 5],
};

const FORMULAS: readonly Formula[] = [
  ...(['return', 'supply'] as const).flatMap((place) => [
    airProperties.airSpecificVolume(place),
    airflowFormulas.airflowFromMass(place),
  ]),
  airProperties.airSpecificHeat,
  airflowFormulas.temperatureRise,
  airflowFormulas.dryAirMassFlowFromHeat,
  airflowFormulas.dryAirMassFlowFromVolume,
  airflowFormulas.airflowPerCapacity,
  standardAir.standardAirflow,
  heatInput.electricHeat,
  heatInput.gasInput,
  heatInput.gasHeat,
  heatInput.totalHeat,
  fanTable.totalExternalStatic,
  fanTable.staticInStandardAir,
  fanTable.fanTableAirflow(TABLE),
  supplyAir.supplyWetBulbFromHumidity,
  supplyAir.supplyHumidityRatio,
  supplyAir.supplyEnthalpy,
  capacityFormulas.totalCapacity,
  capacityFormulas.condensateEnthalpy,
  capacityFormulas.totalCapacityLessCondensate,
  capacityFormulas.sensibleCapacity,
  capacityFormulas.sensibleHeatRatio,
  capacityFormulas.capacityRatio,
  capacityFormulas.dryAirMassFlowFromStandard,
  chargeFormulas.extraLength,
  chargeFormulas.lineCharge('installed'),
  chargeFormulas.lineCharge('included'),
  ...(['subtract', 'keep'] as const).flatMap((rule) => [
    chargeFormulas.lineAdjustment(rule),
    chargeFormulas.lineAdjustmentOfTwoSizes(rule),
  ]),
  chargeFormulas.requiredAdjustment(['drier']),
  chargeFormulas.requiredAdjustment(['coil', 'drier', 'other']),
  chargeFormulas.requiredCharge,
  chargeFormulas.chargeAfterAdjustment,
  chargeFormulas.chargeDifference,
  lineRateByDensity('lineRate'),
  lineRateByDensity('includedLineRate'),
];

const isFormula = (value: unknown): value is Formula =>
  typeof value === 'object' && value !== null && 'text' in value && 'of' in value;

describe('the list', () => {
  it('has every formula that these files export as one', () => {
    const exported = [airProperties, airflowFormulas, fanTable, heatInput, standardAir, supplyAir, capacityFormulas]
      .flatMap((module) => Object.values<unknown>(module))
      .concat(Object.values<unknown>(chargeFormulas))
      .filter(isFormula);
    expect(exported.length).toBeGreaterThan(20);
    for (const formula of exported) expect(FORMULAS).toContain(formula);
  });
});

describe.each(FORMULAS.map((formula) => [`${formula.id}: ${formula.text}`, formula] as const))('%s', (_, formula) => {
  const expression = compile(formula.text.replaceAll('−', '-').replaceAll('×', '*'));
  const names = Object.keys(formula.symbols);

  it('names every input in its text, by symbols of their own', () => {
    for (const symbol of Object.values(formula.symbols)) expect(formula.text).toContain(symbol);
    expect(new Set(Object.values(formula.symbols)).size).toBe(names.length);
  });

  it('computes what it says, on 200 random inputs', () => {
    let state = 1;
    const next = (): number => (state = (state * 48271) % 2147483647) / 2147483647;
    for (let i = 0; i < 200; i++) {
      const inputs = Object.fromEntries(
        names.map((name) => {
          const range = RANGES[formula.symbols[name]!];
          if (range === undefined) throw new Error(`no range for ${formula.symbols[name]}`);
          return [name, range[0] + next() * (range[1] - range[0])];
        }),
      );
      const scope = new Map<string, unknown>(names.map((name) => [formula.symbols[name]!, inputs[name]]));
      for (const [name, of] of Object.entries(FUNCTIONS)) if (formula.text.includes(`${name}(`)) scope.set(name, of);
      const shown = expression.evaluate(scope) as number;
      expect(Math.abs(shown - formula.of(inputs))).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(shown)));
    }
  });
});
