/** The tables a maker prints for one unit: their names, what stands along them, and what looks odd in one. */
import type { ChartCondition, ChartOddityCode, ChartPort, MakersChartKind } from '@chargewright/engine';

export interface MakersChartKindWords {
  readonly label: string;
  /** Inside a sentence. */
  readonly name: string;
  readonly hint: string;
}

const kind = (label: string, name: string, hint: string): MakersChartKindWords => ({ label, name, hint });

const kinds: Readonly<Record<MakersChartKind, MakersChartKindWords>> = {
  superheat: kind(
    'Target superheat',
    'table of target superheat',
    'For a fixed orifice, by outdoor air and return wet bulb.',
  ),
  subcooling: kind('Target subcooling', 'table of target subcooling', 'By outdoor air, or one figure.'),
  'liquid-line-approach': kind(
    'Liquid line over outdoor air',
    'table of the liquid line over outdoor air',
    'Liquid line less outdoor air, by outdoor air, or one figure.',
  ),
  'suction-line-temperature': kind(
    'Suction line temperature',
    'table of suction line temperature',
    'By suction pressure and outdoor air.',
  ),
  'liquid-pressure': kind('Liquid pressure', 'curve of liquid pressure', 'By the temperature of the liquid line.'),
  'heating-discharge-pressure': kind(
    'Discharge pressure in heating',
    'table of discharge pressure in heating',
    'By outdoor air and return air.',
  ),
  'heating-discharge-temperature': kind(
    'Discharge line in heating',
    'table of discharge line temperature in heating',
    'By outdoor air and return air.',
  ),
};

const conditions: Readonly<Record<ChartCondition, string>> = {
  outdoorDryBulb: 'Outdoor air',
  returnWetBulb: 'Return wet bulb',
  returnDryBulb: 'Return dry bulb',
  suctionPressure: 'Suction pressure',
  liquidLineTemperature: 'Liquid line',
};

const ports: Readonly<Record<ChartPort, string>> = {
  liquid: 'Liquid line',
  discharge: 'Discharge line',
  suction: 'Suction line',
};

/** `unit` is the likely one, as it is printed. */
const oddities: Readonly<Record<ChartOddityCode, (unit: string) => string>> = {
  'unit-slip': (unit) => `These figures look like ${unit}.`,
  unusual: () => 'This figure is unusual. Look at the print once more.',
  'against-neighbours': () => 'This figure does not fit its neighbors. Look at the print once more.',
  'wrong-way': () => 'These figures go the other way than expected. Are they in the right order?',
  hole: () => 'A dash among figures is unusual. Look at the print once more.',
};

export const makersChartWords = { kinds, conditions, ports, oddities };
