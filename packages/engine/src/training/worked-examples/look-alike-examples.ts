/** Faults that pass for something else: low airflow for a right charge, a restriction for a low one, air for a high one. The readings are our own numbers. */
import { SPLIT_TABLE } from '../../methods/data/split-table';
import { SUPERHEAT_CHART_A } from '../../methods/data/superheat-chart-a';
import { cellOf, difference, exactDifference, read } from './figures';
import { AT_SEA_LEVEL, LOOKED_OVER, readInchPound, SPLIT_IN_COOLING, withoutReadings, withReadings } from './givens';
import { R22_SATURATED, R410A_TABLE } from './sources';
import type { CheckExample } from './worked-example';

const LOW_AIRFLOW_REQUEST = {
  setup: { ...SPLIT_IN_COOLING, ...AT_SEA_LEVEL, refrigerant: 'R-410A', meteringDevice: 'fixed-orifice' },
  visit: { ...LOOKED_OVER, lowestReturnDryBulb: { value: 76, unit: 'degF' } },
  readings: readInchPound({
    suctionPressure: 107.1,
    suctionLineTemperature: 39.5,
    outdoorDryBulb: 90,
    liquidPressure: 331,
    liquidLineTemperature: 92,
    returnDryBulb: 76,
    returnWetBulb: 64,
    supplyDryBulb: 53,
  }),
} as const satisfies CheckExample['request'];

/** The deviation stays inside ±5 °F, and the compressor gets liquid all the same. */
export const LOW_AIRFLOW_FLOODS: CheckExample = {
  id: 'low-airflow-floods',
  kind: 'check',
  request: LOW_AIRFLOW_REQUEST,
  key: {
    overall: 'stop',
    criterion: 'superheat',
    byRule: 'fails',
    reason: 'split-above',
    stops: ['liquid-return'],
    nextStep: 'reread-wet-bulb-then-airflow',
    cautions: [],
    causes: ['low-airflow'],
  },
  figures: [
    read(R410A_TABLE, { what: 'evaporatingDewTemperature', value: 35, unit: 'degF', within: 0.31 }),
    difference({ what: 'superheat', value: 4.5, within: 0.31 }),
    cellOf(SUPERHEAT_CHART_A, { what: 'targetSuperheat', value: 9 }),
    difference({ what: 'superheatDeviation', value: -4.5, within: 0.31 }),
    exactDifference({ what: 'temperatureSplit', value: 23 }),
    cellOf(SPLIT_TABLE, { what: 'targetTemperatureSplit', value: 18.5 }),
    exactDifference({ what: 'splitDeviation', value: 4.5 }),
    read(R410A_TABLE, { what: 'condensingBubbleTemperature', value: 103, unit: 'degF', within: 0.32 }),
    difference({ what: 'subcooling', value: 11, within: 0.32 }),
  ],
  slips: [
    {
      id: 'rule-without-floor',
      request: { ...LOW_AIRFLOW_REQUEST, procedure: 'cec-ra3.2-2008-installer' },
      key: {
        overall: 'stop',
        nextStep: 'reread-wet-bulb-then-airflow',
        criterion: 'superheat',
        byRule: 'passes',
        stops: ['liquid-return'],
      },
    },
    {
      id: 'without-supply-air',
      request: withoutReadings(LOW_AIRFLOW_REQUEST, 'supplyDryBulb'),
      key: { overall: 'stop', nextStep: 'check-metering', stops: ['liquid-return'], causes: [] },
    },
  ],
};

const ICE_REQUEST = {
  setup: { ...SPLIT_IN_COOLING, ...AT_SEA_LEVEL, refrigerant: 'R-22', meteringDevice: 'fixed-orifice' },
  visit: { ...LOOKED_OVER, iceSeen: true },
  readings: readInchPound({
    suctionPressure: 47.6,
    suctionLineTemperature: 62,
    outdoorDryBulb: 90,
    liquidPressure: 220.6,
    liquidLineTemperature: 96,
    returnDryBulb: 78,
    returnWetBulb: 66,
    supplyDryBulb: 68,
  }),
} as const satisfies CheckExample['request'];

/** Starved and iced like a low charge; the liquid upstream of the restriction tells them apart. */
export const RESTRICTION_WITH_ICE: CheckExample = {
  id: 'restriction-with-ice',
  kind: 'check',
  request: ICE_REQUEST,
  key: {
    overall: 'stop',
    criterion: 'superheat',
    byRule: 'fails',
    reason: 'freezing',
    stops: ['freezing'],
    nextStep: 'thaw-then-drier-drop',
    cautions: [],
    causes: ['restriction'],
  },
  figures: [
    read(R22_SATURATED, { what: 'evaporatingDewTemperature', value: 24, unit: 'degF', within: 0.06 }),
    difference({ what: 'superheat', value: 38, within: 0.06 }),
    cellOf(SUPERHEAT_CHART_A, { what: 'targetSuperheat', value: 13 }),
    read(R22_SATURATED, { what: 'condensingBubbleTemperature', value: 108, unit: 'degF', within: 0.2 }),
    difference({ what: 'subcooling', value: 12, within: 0.2 }),
    exactDifference({ what: 'temperatureSplit', value: 10 }),
    cellOf(SPLIT_TABLE, { what: 'targetTemperatureSplit', value: 18 }),
    exactDifference({ what: 'splitDeviation', value: -8 }),
    difference({ what: 'subcooling', of: 'liquid-line-warm', value: 3, within: 0.2 }),
  ],
  slips: [
    {
      id: 'liquid-line-warm',
      request: withReadings(ICE_REQUEST, readInchPound({ liquidLineTemperature: 105 })),
      key: { overall: 'stop', nextStep: 'thaw-then-leak-search', stops: ['freezing'], causes: ['low-charge'] },
    },
  ],
};

const HIGH_HEAD_REQUEST = {
  setup: {
    ...SPLIT_IN_COOLING,
    ...AT_SEA_LEVEL,
    refrigerant: 'R-410A',
    meteringDevice: 'txv',
    targetSubcooling: { value: 10, unit: 'deltaF' },
  },
  visit: LOOKED_OVER,
  readings: readInchPound({
    liquidPressure: 380.2,
    liquidLineTemperature: 95,
    outdoorDryBulb: 85,
    suctionPressure: 118,
    suctionLineTemperature: 50,
    returnDryBulb: 76,
    returnWetBulb: 64,
    supplyDryBulb: 58,
  }),
} as const satisfies CheckExample['request'];

const standing = (pressurePsig: number): CheckExample['request'] =>
  withReadings(
    HIGH_HEAD_REQUEST,
    readInchPound({
      standingPressure: pressurePsig,
      standingOutdoorCoilTemperature: 85,
      standingIndoorCoilTemperature: 85,
    }),
  );

/** One set of readings, two causes: only the standing pressure of the stopped system tells them apart. */
export const OVERCHARGE_OR_AIR: CheckExample = {
  id: 'overcharge-or-air',
  kind: 'check',
  request: HIGH_HEAD_REQUEST,
  key: {
    overall: 'above',
    criterion: 'subcooling',
    byRule: 'fails',
    reason: null,
    stops: [],
    nextStep: 'air-test-then-recover',
    cautions: [],
    causes: ['overcharge', 'air-in-system'],
  },
  figures: [
    read(R410A_TABLE, { what: 'condensingBubbleTemperature', value: 113, unit: 'degF', within: 0.33 }),
    difference({ what: 'subcooling', value: 18, within: 0.33 }),
    difference({ what: 'subcoolingDeviation', value: 8, within: 0.33 }),
    difference({ what: 'condensingOverAmbient', value: 28, within: 0.33 }),
    read(R410A_TABLE, { what: 'evaporatingDewTemperature', value: 40, unit: 'degF', within: 0.37 }),
    difference({ what: 'superheat', value: 10, within: 0.37 }),
    read(R410A_TABLE, {
      what: 'standingBubblePressure',
      of: 'standing-as-printed',
      value: 254.1,
      unit: 'psig',
      within: 1.4,
    }),
    difference({ what: 'standingExcess', of: 'standing-as-printed', value: 0, within: 0.35 }),
    // the table prints 290.8 psig at 94 °F
    difference({ what: 'standingExcess', of: 'standing-too-high', value: 9, within: 0.32 }),
  ],
  slips: [
    {
      id: 'standing-as-printed',
      given: true,
      request: standing(254.1),
      key: { overall: 'above', nextStep: 'recover-in-steps', causes: ['overcharge'] },
    },
    {
      id: 'standing-too-high',
      given: true,
      request: standing(290.8),
      key: { overall: 'above', nextStep: 'recover-air-weigh-in', causes: ['air-in-system'] },
    },
  ],
};
