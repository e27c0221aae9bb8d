/** Systems as they should be: each method once, and a dry house whose split only looks wrong. The readings are our own numbers. */
import { SPLIT_TABLE } from '../../methods/data/split-table';
import { SUPERHEAT_CHART_A } from '../../methods/data/superheat-chart-a';
import { cellOf, difference, exactDifference, read } from './figures';
import { AT_SEA_LEVEL, LOOKED_OVER, readInchPound, readMetric, SPLIT_IN_COOLING, withReadings } from './givens';
import { DEFINITION, R22_SATURATED, R22_ZERO_SUPERHEAT_ROW, R32_SATURATION_LINE, R410A_TABLE } from './sources';
import type { CheckExample } from './worked-example';

const ALL_WELL = {
  overall: 'within',
  byRule: 'passes',
  reason: null,
  stops: [],
  nextStep: 'record',
  cautions: [],
  causes: [],
} as const;

export const HEALTHY_ORIFICE: CheckExample = {
  id: 'healthy-orifice',
  kind: 'check',
  request: {
    setup: { ...SPLIT_IN_COOLING, ...AT_SEA_LEVEL, refrigerant: 'R-22', meteringDevice: 'fixed-orifice' },
    visit: LOOKED_OVER,
    readings: readInchPound({
      suctionPressure: 76,
      suctionLineTemperature: 59,
      outdoorDryBulb: 95,
      liquidPressure: 260.5,
      liquidLineTemperature: 110,
      returnDryBulb: 78,
      returnWetBulb: 68,
      supplyDryBulb: 61.5,
    }),
  },
  key: { ...ALL_WELL, criterion: 'superheat' },
  figures: [
    read(R22_ZERO_SUPERHEAT_ROW, { what: 'evaporatingDewTemperature', value: 45, unit: 'degF', within: 0.06 }),
    difference({ what: 'superheat', value: 14, within: 0.06 }),
    cellOf(SUPERHEAT_CHART_A, { what: 'targetSuperheat', value: 14 }),
    difference({ what: 'superheatDeviation', value: 0, within: 0.06 }),
    read(R22_SATURATED, { what: 'condensingBubbleTemperature', value: 120, unit: 'degF', within: 0.16 }),
    difference({ what: 'subcooling', value: 10, within: 0.16 }),
    exactDifference({ what: 'temperatureSplit', value: 16.5 }),
    cellOf(SPLIT_TABLE, { what: 'targetTemperatureSplit', value: 16.3 }),
  ],
  slips: [],
};

/** The same lesson for a valve, read on instruments in °C and kPa. */
export const HEALTHY_VALVE_METRIC: CheckExample = {
  id: 'healthy-valve-metric',
  kind: 'check',
  request: {
    setup: {
      ...SPLIT_IN_COOLING,
      elevation: { value: 0, unit: 'm' },
      refrigerant: 'R-32',
      meteringDevice: 'eev',
      targetSubcooling: { value: 5.5, unit: 'deltaC' },
    },
    visit: LOOKED_OVER,
    readings: readMetric({
      liquidPressure: 2377,
      liquidLineTemperature: 34.5,
      outdoorDryBulb: 30,
      suctionPressure: 852,
      suctionLineTemperature: 11,
      returnDryBulb: 26,
      returnWetBulb: 18,
      supplyDryBulb: 15,
    }),
  },
  key: { ...ALL_WELL, criterion: 'subcooling' },
  figures: [
    // the pressures are the printed ones, kept to 0.1 psi and rounded to a kilopascal
    read(R32_SATURATION_LINE, { what: 'condensingBubbleTemperature', value: 40, unit: 'degC', within: 0.05 }),
    { what: 'subcooling', value: 5.5, unit: 'deltaC', standing: 'by-hand', source: DEFINITION, within: 0.05 },
    { what: 'subcoolingDeviation', value: 0, unit: 'deltaC', standing: 'by-hand', source: DEFINITION, within: 0.05 },
    read(R32_SATURATION_LINE, { what: 'evaporatingDewTemperature', value: 5, unit: 'degC', within: 0.1 }),
    { what: 'superheat', value: 6, unit: 'deltaC', standing: 'by-hand', source: DEFINITION, within: 0.1 },
    { what: 'temperatureSplit', value: 11, unit: 'deltaC', standing: 'by-hand', source: DEFINITION, within: 1e-6 },
  ],
  slips: [],
};

const DRY_HOUSE_REQUEST = {
  setup: {
    ...SPLIT_IN_COOLING,
    ...AT_SEA_LEVEL,
    refrigerant: 'R-410A',
    meteringDevice: 'txv',
    targetSubcooling: { value: 10, unit: 'deltaF' },
  },
  visit: LOOKED_OVER,
  readings: readInchPound({
    liquidPressure: 365,
    liquidLineTemperature: 100,
    outdoorDryBulb: 92,
    suctionPressure: 118,
    suctionLineTemperature: 50,
    returnDryBulb: 80,
    returnWetBulb: 57,
    supplyDryBulb: 56,
  }),
} as const satisfies CheckExample['request'];

export const DRY_HOUSE: CheckExample = {
  id: 'dry-house',
  kind: 'check',
  request: DRY_HOUSE_REQUEST,
  key: { ...ALL_WELL, criterion: 'subcooling' },
  figures: [
    exactDifference({ what: 'temperatureSplit', value: 24 }),
    cellOf(SPLIT_TABLE, { what: 'targetTemperatureSplit', value: 24.6 }),
    exactDifference({ what: 'splitDeviation', value: -0.6 }),
    cellOf(SPLIT_TABLE, { what: 'targetTemperatureSplit', of: 'wick-dried-out', value: 20.6 }),
    exactDifference({ what: 'splitDeviation', of: 'wick-dried-out', value: 3.4 }),
    read(R410A_TABLE, { what: 'condensingBubbleTemperature', value: 110, unit: 'degF', within: 0.32 }),
    difference({ what: 'subcooling', value: 10, within: 0.32 }),
    read(R410A_TABLE, { what: 'evaporatingDewTemperature', value: 40, unit: 'degF', within: 0.37 }),
    difference({ what: 'superheat', value: 10, within: 0.37 }),
  ],
  slips: [
    {
      id: 'wick-dried-out',
      request: withReadings(DRY_HOUSE_REQUEST, readInchPound({ returnWetBulb: 64 })),
      key: { overall: 'not-verifiable', nextStep: 'reread-wet-bulb-then-airflow', reason: 'split-above' },
    },
  ],
};
