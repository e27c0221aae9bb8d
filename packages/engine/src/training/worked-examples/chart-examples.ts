/** Charts and formulas used where they do not hold: in a dash, and at an elevation they were not printed for. The readings are our own numbers. */
import { SPLIT_TABLE } from '../../methods/data/split-table';
import { cellOf, difference, exactDifference, read } from './figures';
import { AT_SEA_LEVEL, LOOKED_OVER, readInchPound, SPLIT_IN_COOLING } from './givens';
import { R22_SATURATED, R22_ZERO_SUPERHEAT_ROW, SHORT_FORMULA, STANDARD_ATMOSPHERE } from './sources';
import type { CheckExample } from './worked-example';

/** Hot and dry: every printed chart has a dash at 100 °F outdoors and 64 °F wet bulb, the short formula a number. */
export const FORMULA_IN_A_DASH: CheckExample = {
  id: 'formula-in-a-dash',
  kind: 'check',
  request: {
    setup: { ...SPLIT_IN_COOLING, ...AT_SEA_LEVEL, refrigerant: 'R-22', meteringDevice: 'fixed-orifice' },
    visit: LOOKED_OVER,
    readings: readInchPound({
      suctionPressure: 76,
      suctionLineTemperature: 57,
      outdoorDryBulb: 100,
      liquidPressure: 305.2,
      liquidLineTemperature: 122,
      returnDryBulb: 80,
      returnWetBulb: 64,
      supplyDryBulb: 60,
    }),
  },
  key: {
    overall: 'not-verifiable',
    criterion: 'superheat',
    byRule: null,
    reason: 'no-target-here',
    stops: [],
    nextStep: 'reach-a-target',
    cautions: [],
    causes: ['overcharge', 'air-in-system', 'condenser-air'],
  },
  figures: [
    read(R22_ZERO_SUPERHEAT_ROW, { what: 'evaporatingDewTemperature', value: 45, unit: 'degF', within: 0.06 }),
    difference({ what: 'superheat', value: 12, within: 0.06 }),
    {
      what: 'shortFormula',
      value: 6,
      unit: 'deltaF',
      standing: 'practice',
      source: SHORT_FORMULA,
      within: 1e-6,
    },
    read(R22_SATURATED, { what: 'condensingBubbleTemperature', value: 132, unit: 'degF', within: 0.14 }),
    difference({ what: 'subcooling', value: 10, within: 0.14 }),
    exactDifference({ what: 'temperatureSplit', value: 20 }),
    cellOf(SPLIT_TABLE, { what: 'targetTemperatureSplit', value: 20.6 }),
  ],
  slips: [],
};

const MILE_HIGH_SETUP = {
  ...SPLIT_IN_COOLING,
  elevation: { value: 5280, unit: 'ft' },
  refrigerant: 'R-22',
  meteringDevice: 'fixed-orifice',
  targetSuperheat: { value: 12, unit: 'deltaF' },
} as const satisfies CheckExample['request']['setup'];

const MILE_HIGH_REQUEST = {
  setup: MILE_HIGH_SETUP,
  visit: LOOKED_OVER,
  readings: readInchPound({
    suctionPressure: 64.2,
    suctionLineTemperature: 53,
    outdoorDryBulb: 85,
    liquidPressure: 220.6,
    liquidLineTemperature: 104,
    returnDryBulb: 76,
    returnWetBulb: 62,
    supplyDryBulb: 56.5,
  }),
} as const satisfies CheckExample['request'];

/** A gauge zeroed a mile high reads from thinner air than the printed table counts from. */
export const SEA_LEVEL_CHART: CheckExample = {
  id: 'sea-level-chart',
  kind: 'check',
  request: MILE_HIGH_REQUEST,
  key: {
    overall: 'above',
    criterion: 'superheat',
    byRule: 'fails',
    reason: null,
    stops: [],
    nextStep: 'leak-first',
    cautions: [],
    causes: ['low-charge'],
  },
  figures: [
    {
      what: 'atmosphere',
      value: 12.1,
      unit: 'psia',
      standing: 'computed',
      source: STANDARD_ATMOSPHERE,
      within: 0.01,
    },
    // 64.2 psig here is 61.6 psig at sea level, between 61.5 psig at 35 °F and 64.2 at 37 of the table
    read(R22_ZERO_SUPERHEAT_ROW, { what: 'evaporatingDewTemperature', value: 35.1, unit: 'degF', within: 0.08 }),
    difference({ what: 'superheat', value: 17.9, within: 0.08 }),
    difference({ what: 'superheatDeviation', value: 5.9, within: 0.08 }),
    read(R22_ZERO_SUPERHEAT_ROW, {
      what: 'evaporatingDewTemperature',
      of: 'gauge-at-sea-level',
      value: 37,
      unit: 'degF',
      within: 0.08,
    }),
    difference({ what: 'superheat', of: 'gauge-at-sea-level', value: 16, within: 0.08 }),
    difference({ what: 'superheatDeviation', of: 'gauge-at-sea-level', value: 4, within: 0.08 }),
    read(R22_SATURATED, {
      what: 'condensingBubbleTemperature',
      of: 'gauge-at-sea-level',
      value: 108,
      unit: 'degF',
      within: 0.2,
    }),
  ],
  slips: [
    {
      id: 'gauge-at-sea-level',
      request: { ...MILE_HIGH_REQUEST, setup: { ...MILE_HIGH_SETUP, ...AT_SEA_LEVEL } },
      key: { overall: 'within', nextStep: 'record', criterion: 'superheat', byRule: 'passes', causes: [] },
    },
  ],
};
