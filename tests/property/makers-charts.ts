/**
 * Maker's tables around a system that was drawn: at its conditions each says what the system shows, give or take an offset, so that every finding
 * is met. Printed in °F and psi or in °C and bar; the two say the same.
 */
import type {
  ChartCondition,
  ChartDimension,
  ChartPort,
  ChartUnit,
  MakersChartInput,
  MakersChartKind,
} from '@chargewright/engine';
import {
  CHART_PORTS,
  differenceFromK,
  differenceToK,
  MAKERS_CHART_FACTS,
  MAKERS_CHART_KINDS,
  pressureDifferenceFromPa,
  pressureDifferenceToPa,
  pressureFromPa,
  pressureToPa,
  temperatureFromK,
  temperatureToK,
} from '@chargewright/engine';
import fc from 'fast-check';
import { between, mixed } from './draws';
import type { UnitSystem } from './request-of-system';
import type { SiReadings } from './plausible-system';

/** In °F, or for a pressure in steps of 5 psi, which is about 1 °F of saturation. */
export interface DrawnChart {
  readonly kind: MakersChartKind;
  readonly offset: number;
  /** One figure for all conditions. */
  readonly isFigure: boolean;
  /** Cells that are dashes: a corner of the table, or all but the far end. */
  readonly dashes: 'none' | 'corner' | 'most';
  readonly port: ChartPort | undefined;
  readonly tolerance: number | undefined;
  readonly leastOutdoorF: number | undefined;
  readonly mostOutdoorF: number | undefined;
  readonly leastReturnF: number | undefined;
  readonly mostReturnF: number | undefined;
  /** One cell far off the others. */
  readonly slip: boolean;
}

const sometimes = <T>(percent: number, arbitrary: fc.Arbitrary<T>): fc.Arbitrary<T | undefined> =>
  mixed<T | undefined>([percent, arbitrary], [100 - percent, fc.constant(undefined)]);

export const chartOf = (kind: fc.Arbitrary<MakersChartKind>): fc.Arbitrary<DrawnChart> =>
  kind.chain((chosen) =>
    fc.record({
      kind: fc.constant(chosen),
      offset: mixed([4, between(-2, 2)], [3, between(-9, 9)]),
      isFigure: mixed([1, fc.constant(true)], [5, fc.constant(false)]),
      dashes: mixed<DrawnChart['dashes']>([8, fc.constant('none')], [2, fc.constantFrom('corner', 'most')]),
      port: sometimes(30, fc.constantFrom(...MAKERS_CHART_FACTS[chosen].ports)),
      tolerance: sometimes(30, between(2, 6)),
      leastOutdoorF: sometimes(10, between(40, 70)),
      mostOutdoorF: sometimes(10, between(85, 110)),
      leastReturnF: sometimes(8, between(66, 74)),
      mostReturnF: sometimes(8, between(76, 84)),
      slip: mixed([1, fc.constant(true)], [15, fc.constant(false)]),
    }),
  );

export const anyChart = chartOf(fc.constantFrom(...MAKERS_CHART_KINDS));

const AXES: Readonly<Record<ChartCondition, readonly number[]>> = {
  outdoorDryBulb: [50, 65, 75, 85, 95, 105, 115],
  returnWetBulb: [52, 58, 62, 66, 70, 76],
  returnDryBulb: [66, 72, 78, 84],
  suctionPressure: [20, 60, 90, 120, 150, 190],
  liquidLineTemperature: [60, 80, 95, 110, 130],
};

/** Change of a cell for one step of the axis: °F, or 5 psi, for each °F or psi. */
const SLOPES: Readonly<Record<MakersChartKind, readonly [row: number, column: number]>> = {
  superheat: [-0.5, 1.3],
  subcooling: [-0.05, 0],
  'liquid-line-approach': [0.02, 0],
  'suction-line-temperature': [0.35, -0.2],
  'liquid-pressure': [1, 0],
  'heating-discharge-pressure': [0.7, 0.4],
  'heating-discharge-temperature': [0.6, 0.3],
};

const PSI_A_STEP = 5;
const USUAL: Readonly<Record<MakersChartKind, number>> = {
  superheat: 12,
  subcooling: 10,
  'liquid-line-approach': 8,
  'suction-line-temperature': 55,
  'liquid-pressure': 70,
  'heating-discharge-pressure': 66,
  'heating-discharge-temperature': 150,
};

/** Where a table is entered with what was read; where it was not read, with something usual. */
function conditionOf(condition: ChartCondition, readings: SiReadings, wetBulbK: number): number {
  const read = condition === 'returnWetBulb' ? wetBulbK : readings[condition]?.value;
  const axis = AXES[condition];
  if (read === undefined) return axis[2]!;
  return condition === 'suctionPressure' ? pressureFromPa(read, 'psig', 101_325) : temperatureFromK(read, 'degF');
}

export interface ChartSite {
  readonly readings: SiReadings;
  readonly wetBulbK: number;
  readonly superheatK: number | undefined;
  readonly subcoolingK: number | undefined;
}

/** What the system shows of the quantity that the table prints, in its steps. */
function shown(kind: MakersChartKind, { readings, superheatK, subcoolingK }: ChartSite): number | undefined {
  const fahrenheit = (kelvin: number | undefined) =>
    kelvin === undefined ? undefined : temperatureFromK(kelvin, 'degF');
  const difference = (kelvin: number | undefined) =>
    kelvin === undefined ? undefined : differenceFromK(kelvin, 'deltaF');
  const steps = (pa: number | undefined) =>
    pa === undefined ? undefined : pressureFromPa(pa, 'psig', 101_325) / PSI_A_STEP;
  const liquid = readings.liquidLineTemperature?.value;
  const outdoor = readings.outdoorDryBulb?.value;
  switch (kind) {
    case 'superheat':
      return difference(superheatK);
    case 'subcooling':
      return difference(subcoolingK);
    case 'liquid-line-approach':
      return liquid === undefined || outdoor === undefined ? undefined : difference(liquid - outdoor);
    case 'suction-line-temperature':
      return fahrenheit(readings.suctionLineTemperature?.value);
    case 'liquid-pressure':
      return steps((readings.liquidPressure ?? readings.dischargePressure)?.value);
    case 'heating-discharge-pressure':
      return steps(readings.dischargePressure?.value);
    case 'heating-discharge-temperature':
      return fahrenheit(readings.dischargeLineTemperature?.value);
  }
}

export function makersChartInput(chart: DrawnChart, site: ChartSite, system: UnitSystem): MakersChartInput {
  const { kind, offset } = chart;
  const { rows, columns, cells } = MAKERS_CHART_FACTS[kind];
  const least = cells === 'difference' ? 0 : 4;
  const here = (shown(kind, site) ?? USUAL[kind]) + offset;
  const printed = (steps: number): number => toUnit(cells === 'pressure' ? steps * PSI_A_STEP : steps, cells, system);
  const [rowSlope, columnSlope] = SLOPES[kind];
  const row0 = conditionOf(rows, site.readings, site.wetBulbK);
  const column0 = columns === null ? 0 : conditionOf(columns, site.readings, site.wetBulbK);
  const across = columns === null ? [0] : AXES[columns];
  const value = (row: number, column: number): number =>
    Math.max(here + rowSlope * (row - row0) + columnSlope * (column - column0), least);
  const grid = AXES[rows].map((row, r) =>
    across.map((column, c) => {
      if (isDash(chart.dashes, r / (AXES[rows].length - 1), c / Math.max(across.length - 1, 1))) return null;
      return printed(chart.slip && r === 1 && c === 0 ? 4 * value(row, column) + 40 : value(row, column));
    }),
  );
  const axis = (condition: ChartCondition) => {
    const dimension = condition === 'suctionPressure' ? 'pressure' : 'temperature';
    return { unit: UNITS[system][dimension], values: AXES[condition].map((each) => toUnit(each, dimension, system)) };
  };
  const temperature = (fahrenheit: number) =>
    ({ value: toUnit(fahrenheit, 'temperature', system), unit: UNITS[system].temperature }) as const;
  return {
    kind,
    unit: UNITS[system][cells],
    ...(chart.isFigure
      ? { cells: [[printed(Math.max(here, least))]] }
      : { rows: axis(rows), ...(columns && { columns: axis(columns) }), cells: grid }),
    resolution: stepIn(cells, system),
    ...(chart.port && { port: chart.port }),
    ...(chart.tolerance !== undefined && { tolerance: toleranceIn(chart.tolerance, cells, system) }),
    ...(chart.leastOutdoorF !== undefined && { leastOutdoor: temperature(chart.leastOutdoorF) }),
    ...(chart.mostOutdoorF !== undefined && { mostOutdoor: temperature(chart.mostOutdoorF) }),
    ...(chart.leastReturnF !== undefined && { leastReturn: temperature(chart.leastReturnF) }),
    ...(chart.mostReturnF !== undefined && { mostReturn: temperature(chart.mostReturnF) }),
  };
}

/** By how far down and across the table a cell lies, from 0 to 1: dashes stand where targets are low, or nearly everywhere. */
function isDash(dashes: DrawnChart['dashes'], down: number, across: number): boolean {
  if (dashes === 'none') return false;
  return dashes === 'corner' ? down - across > 0.45 : down < 0.8;
}

const UNITS = {
  'inch-pound': { temperature: 'degF', difference: 'deltaF', pressure: 'psig' },
  metric: { temperature: 'degC', difference: 'deltaC', pressure: 'barg' },
} as const satisfies Record<UnitSystem, Record<ChartDimension, ChartUnit>>;

function toUnit(value: number, dimension: ChartDimension, system: UnitSystem): number {
  if (system === 'inch-pound') return value;
  switch (dimension) {
    case 'temperature':
      return temperatureFromK(temperatureToK(value, 'degF'), 'degC');
    case 'difference':
      return differenceFromK(differenceToK(value, 'deltaF'), 'deltaC');
    case 'pressure':
      return pressureFromPa(pressureToPa(value, 'psig', 101_325), 'barg', 101_325);
  }
}

/** Whole °F or psi. */
const stepIn = (dimension: ChartDimension, system: UnitSystem): number => {
  if (system === 'inch-pound') return 1;
  return dimension === 'pressure'
    ? pressureDifferenceFromPa(pressureDifferenceToPa(1, 'psi'), 'bar')
    : differenceFromK(differenceToK(1, 'deltaF'), 'deltaC');
};

function toleranceIn(
  steps: number,
  cells: ChartDimension,
  system: UnitSystem,
): NonNullable<MakersChartInput['tolerance']> {
  if (cells === 'pressure') {
    const unit = system === 'inch-pound' ? 'psi' : 'bar';
    return { value: pressureDifferenceFromPa(pressureDifferenceToPa(steps * PSI_A_STEP, 'psi'), unit), unit };
  }
  const unit = UNITS[system].difference;
  return { value: differenceFromK(differenceToK(steps, 'deltaF'), unit), unit };
}

type Json = Record<string, unknown>;

const SMALL: MakersChartInput = {
  kind: 'superheat',
  rows: { unit: 'degF', values: [75, 95] },
  columns: { unit: 'degF', values: [60, 70] },
  unit: 'deltaF',
  cells: [
    [12, 27],
    [5, 18],
  ],
};

/** Slips of a hand that types a table. Each makes a copy of a small table wrong in one way. */
export const CHART_SLIPS: readonly ((chart: Json) => void)[] = [
  (chart) => delete chart['columns'],
  (chart) => delete chart['rows'],
  (chart) => Object.assign(chart, { kind: 'subcooling' }),
  (chart) => Object.assign(chart, { rows: { unit: 'degF', values: [75] }, cells: [[12, 27]] }),
  (chart) => Object.assign(chart, { rows: { unit: 'degF', values: [95, 75] } }),
  (chart) => Object.assign(chart, { rows: { unit: 'degF', values: Array.from({ length: 41 }, (_, k) => k) } }),
  (chart) => Object.assign(chart, { cells: [[12, 27]] }),
  (chart) => Object.assign(chart, { cells: [[12, 27], [5]] }),
  (chart) => Object.assign(chart, { cells: [[null, null], [null, null]] }), // prettier-ignore
  (chart) => Object.assign(chart, { port: 'liquid' }),
  (chart) => Object.assign(chart, { unit: 'psig' }),
  (chart) => Object.assign(chart, { tolerance: { value: 3, unit: 'psi' } }),
  (chart) => Object.assign(chart, { cells: [[12, 27], [-5, 1e300]] }), // prettier-ignore
  (chart) =>
    Object.assign(chart, { leastReturn: { value: 80, unit: 'degF' }, mostReturn: { value: 70, unit: 'degF' } }),
];

export function withSlip(setup: Json, slip: (chart: Json) => void): void {
  const chart = structuredClone(SMALL) as unknown as Json;
  slip(chart);
  setup['makersChart'] = chart;
}

/** The same table twice, and too many of them. */
export const REPEATED = { makersCharts: [SMALL, SMALL] } as const;
export const TOO_MANY = { makersCharts: CHART_PORTS.flatMap(() => [SMALL, SMALL, SMALL, SMALL]) } as const;
