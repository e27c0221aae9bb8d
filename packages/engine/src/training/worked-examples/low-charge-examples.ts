/** Too little refrigerant: in plain sight on a fixed orifice, behind a fine superheat on a valve. The readings are our own numbers. */
import { SPLIT_TABLE } from '../../methods/data/split-table';
import { SUPERHEAT_CHART_A } from '../../methods/data/superheat-chart-a';
import { cellOf, difference, exactDifference, read } from './figures';
import { AT_SEA_LEVEL, LOOKED_OVER, readInchPound, SPLIT_IN_COOLING, withoutReadings } from './givens';
import { R22_SATURATED, R22_ZERO_SUPERHEAT_ROW, R410A_TABLE } from './sources';
import type { CheckExample } from './worked-example';

const VALVE_REQUEST = {
  setup: {
    ...SPLIT_IN_COOLING,
    ...AT_SEA_LEVEL,
    refrigerant: 'R-410A',
    meteringDevice: 'txv',
    targetSubcooling: { value: 10, unit: 'deltaF' },
  },
  visit: LOOKED_OVER,
  readings: readInchPound({
    liquidPressure: 321.8,
    liquidLineTemperature: 97,
    outdoorDryBulb: 85,
    suctionPressure: 118,
    suctionLineTemperature: 50,
    returnDryBulb: 76,
    returnWetBulb: 64,
    supplyDryBulb: 58,
  }),
} as const satisfies CheckExample['request'];

const { targetSubcooling: _, ...SETUP_WITHOUT_TARGET } = VALVE_REQUEST.setup;

export const VALVE_HIDES_LOW_CHARGE: CheckExample = {
  id: 'valve-hides-low-charge',
  kind: 'check',
  request: VALVE_REQUEST,
  key: {
    overall: 'below',
    criterion: 'subcooling',
    byRule: 'fails',
    reason: null,
    stops: [],
    nextStep: 'leak-first',
    cautions: [],
    causes: ['low-charge'],
  },
  figures: [
    read(R410A_TABLE, { what: 'evaporatingDewTemperature', value: 40, unit: 'degF', within: 0.37 }),
    difference({ what: 'superheat', value: 10, within: 0.37 }),
    read(R410A_TABLE, { what: 'condensingBubbleTemperature', value: 101, unit: 'degF', within: 0.31 }),
    difference({ what: 'subcooling', value: 4, within: 0.31 }),
    difference({ what: 'subcoolingDeviation', value: -6, within: 0.31 }),
    exactDifference({ what: 'temperatureSplit', value: 18 }),
    cellOf(SPLIT_TABLE, { what: 'targetTemperatureSplit', value: 18.5 }),
    cellOf(SUPERHEAT_CHART_A, { what: 'targetSuperheat', of: 'judged-as-orifice', value: 11 }),
  ],
  slips: [
    {
      id: 'judged-as-orifice',
      request: { ...VALVE_REQUEST, setup: { ...SETUP_WITHOUT_TARGET, meteringDevice: 'fixed-orifice' } },
      key: { overall: 'within', nextStep: 'record', criterion: 'superheat', byRule: 'passes', causes: [] },
    },
    {
      id: 'without-liquid-pair',
      request: withoutReadings(VALVE_REQUEST, 'liquidPressure', 'liquidLineTemperature'),
      key: { overall: 'not-judged', nextStep: 'take-readings', reason: 'readings-missing' },
    },
  ],
};

export const UNDERCHARGE_LOW_SPLIT: CheckExample = {
  id: 'undercharge-low-split',
  kind: 'check',
  request: {
    setup: { ...SPLIT_IN_COOLING, ...AT_SEA_LEVEL, refrigerant: 'R-22', meteringDevice: 'fixed-orifice' },
    visit: LOOKED_OVER,
    readings: readInchPound({
      suctionPressure: 64.2,
      suctionLineTemperature: 65,
      outdoorDryBulb: 85,
      liquidPressure: 185.2,
      liquidLineTemperature: 93,
      returnDryBulb: 78,
      returnWetBulb: 66,
      supplyDryBulb: 66,
    }),
  },
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
    read(R22_ZERO_SUPERHEAT_ROW, { what: 'evaporatingDewTemperature', value: 37, unit: 'degF', within: 0.08 }),
    difference({ what: 'superheat', value: 28, within: 0.08 }),
    cellOf(SUPERHEAT_CHART_A, { what: 'targetSuperheat', value: 15 }),
    difference({ what: 'superheatDeviation', value: 13, within: 0.08 }),
    read(R22_SATURATED, { what: 'condensingBubbleTemperature', value: 96, unit: 'degF', within: 0.25 }),
    difference({ what: 'subcooling', value: 3, within: 0.25 }),
    exactDifference({ what: 'temperatureSplit', value: 12 }),
    cellOf(SPLIT_TABLE, { what: 'targetTemperatureSplit', value: 18 }),
    exactDifference({ what: 'splitDeviation', value: -6 }),
  ],
  slips: [],
};
