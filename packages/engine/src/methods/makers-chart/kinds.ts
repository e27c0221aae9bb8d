/**
 * The tables a maker prints for one unit: what their rows, columns and cells are, and for which port they hold. An editor of such a table and its
 * reader both look here.
 */
import type { SourcedFigure } from '../sourced-figure';
import { temperatureToK } from '../../units';
import type { ChartDimension } from './chart-units';

export const MAKERS_CHART_KINDS = [
  'superheat',
  'subcooling',
  'liquid-line-approach',
  'suction-line-temperature',
  'liquid-pressure',
  'heating-discharge-pressure',
  'heating-discharge-temperature',
] as const;
export type MakersChartKind = (typeof MAKERS_CHART_KINDS)[number];

/** Readings that such a table is entered with. */
export type ChartCondition =
  'outdoorDryBulb' | 'returnWetBulb' | 'returnDryBulb' | 'suctionPressure' | 'liquidLineTemperature';

export const DIMENSION_OF_CONDITION: Readonly<Record<ChartCondition, ChartDimension>> = {
  outdoorDryBulb: 'temperature',
  returnWetBulb: 'temperature',
  returnDryBulb: 'temperature',
  suctionPressure: 'pressure',
  liquidLineTemperature: 'temperature',
};

export const CHART_PORTS = ['liquid', 'discharge', 'suction'] as const;
export type ChartPort = (typeof CHART_PORTS)[number];

export interface MakersChartKindFacts {
  readonly mode: 'cooling' | 'heating';
  readonly rows: ChartCondition;
  /** `null`: one value a row. */
  readonly columns: ChartCondition | null;
  readonly cells: ChartDimension;
  /** Ports it can hold for; the first is meant where none is stated. */
  readonly ports: readonly [ChartPort, ...ChartPort[]];
  /** Coldest outdoor air the method is good for, unless the maker says otherwise. */
  readonly leastOutdoorK: SourcedFigure | null;
  /** Which way of a deviation means too much refrigerant. */
  readonly overchargeIs: 'above' | 'below';
  /** Which way the cells go as the condition of the rows, or of the columns, rises; `null` where makers differ. */
  readonly trend: { readonly rows: ChartTrend | null; readonly columns: ChartTrend | null };
}
export type ChartTrend = 'rises' | 'falls';

const outdoorLimit = (degF: number): SourcedFigure => ({
  value: temperatureToK(degF, 'degF'),
  printed: `${degF} °F`,
  standing: 'read',
  source: 'Installation manuals of several makers',
});

export const MAKERS_CHART_FACTS: Readonly<Record<MakersChartKind, MakersChartKindFacts>> = {
  superheat: {
    mode: 'cooling',
    rows: 'outdoorDryBulb',
    columns: 'returnWetBulb',
    cells: 'difference',
    ports: ['suction'],
    leastOutdoorK: null,
    overchargeIs: 'below',
    trend: { rows: 'falls', columns: 'rises' },
  },
  subcooling: {
    mode: 'cooling',
    rows: 'outdoorDryBulb',
    columns: null,
    cells: 'difference',
    ports: ['liquid', 'discharge'],
    leastOutdoorK: outdoorLimit(55),
    overchargeIs: 'above',
    trend: { rows: null, columns: null },
  },
  // liquid line less outdoor air: a condenser short of liquid leaves it warm
  'liquid-line-approach': {
    mode: 'cooling',
    rows: 'outdoorDryBulb',
    columns: null,
    cells: 'difference',
    ports: ['liquid'],
    leastOutdoorK: outdoorLimit(65),
    overchargeIs: 'below',
    trend: { rows: null, columns: null },
  },
  'suction-line-temperature': {
    mode: 'cooling',
    rows: 'suctionPressure',
    columns: 'outdoorDryBulb',
    cells: 'temperature',
    ports: ['suction'],
    leastOutdoorK: null,
    overchargeIs: 'below',
    trend: { rows: 'rises', columns: null },
  },
  'liquid-pressure': {
    mode: 'cooling',
    rows: 'liquidLineTemperature',
    columns: null,
    cells: 'pressure',
    ports: ['liquid', 'discharge'],
    leastOutdoorK: null,
    overchargeIs: 'above',
    trend: { rows: 'rises', columns: null },
  },
  'heating-discharge-pressure': {
    mode: 'heating',
    rows: 'outdoorDryBulb',
    columns: 'returnDryBulb',
    cells: 'pressure',
    ports: ['discharge'],
    leastOutdoorK: null,
    overchargeIs: 'above',
    trend: { rows: 'rises', columns: 'rises' },
  },
  // hot gas of a starved compressor leaves hotter (common practice, no source)
  'heating-discharge-temperature': {
    mode: 'heating',
    rows: 'outdoorDryBulb',
    columns: 'returnDryBulb',
    cells: 'temperature',
    ports: ['discharge'],
    leastOutdoorK: null,
    overchargeIs: 'below',
    trend: { rows: null, columns: null },
  },
};
