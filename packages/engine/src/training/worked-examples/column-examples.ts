/** Blends read in the wrong column or on another refrigerant's scale. No producer's table was found: saturation is by the equations of state. */
import { SUPERHEAT_CHART_A } from '../../methods/data/superheat-chart-a';
import { cellOf, difference, modelled, read } from './figures';
import { AT_SEA_LEVEL, LOOKED_OVER, readInchPound, SPLIT_IN_COOLING } from './givens';
import { R410A_TABLE } from './sources';
import type { CheckExample } from './worked-example';

const R454B_VALVE = {
  ...SPLIT_IN_COOLING,
  ...AT_SEA_LEVEL,
  refrigerant: 'R-454B',
  meteringDevice: 'txv',
  targetSubcooling: { value: 10, unit: 'deltaF' },
} as const satisfies CheckExample['request']['setup'];

const INDOORS = { returnDryBulb: 76, returnWetBulb: 64, supplyDryBulb: 58 };

/** Dew read for bubble: the glide of 2.7 °F fills up most of what is missing. */
export const WRONG_COLUMN: CheckExample = {
  id: 'wrong-column',
  kind: 'check',
  request: {
    setup: R454B_VALVE,
    visit: LOOKED_OVER,
    readings: readInchPound({
      liquidPressure: 348.6,
      liquidLineTemperature: 105,
      outdoorDryBulb: 92,
      suctionPressure: 107.5,
      suctionLineTemperature: 50,
      ...INDOORS,
      writtenCondensingTemperature: 112.6,
    }),
  },
  key: {
    overall: 'below',
    criterion: 'subcooling',
    byRule: 'fails',
    reason: null,
    stops: [],
    nextStep: 'leak-first',
    cautions: ['wrong-column', 'flammable'],
    causes: ['low-charge'],
  },
  figures: [
    modelled({ what: 'condensingBubbleTemperature', value: 110, unit: 'degF', within: 0.06 }),
    difference({ what: 'subcooling', value: 5, within: 0.06 }),
    difference({ what: 'subcoolingDeviation', value: -5, within: 0.06 }),
    modelled({ what: 'condensingDewTemperature', value: 112.6, unit: 'degF', within: 0.1 }),
    difference({ what: 'subcoolingFromDew', value: 7.6, within: 0.1 }),
    modelled({ what: 'evaporatingDewTemperature', value: 40, unit: 'degF', within: 0.06 }),
    difference({ what: 'superheat', value: 10, within: 0.06 }),
  ],
  slips: [],
};

/** Bubble read for dew on a blend with a wide glide: a right charge looks low by far. */
export const WIDE_GLIDE_WRONG_COLUMN: CheckExample = {
  id: 'wide-glide-wrong-column',
  kind: 'check',
  request: {
    setup: { ...SPLIT_IN_COOLING, ...AT_SEA_LEVEL, refrigerant: 'R-407C', meteringDevice: 'fixed-orifice' },
    visit: LOOKED_OVER,
    readings: readInchPound({
      suctionPressure: 63.2,
      suctionLineTemperature: 53,
      outdoorDryBulb: 90,
      liquidPressure: 260.2,
      liquidLineTemperature: 100,
      returnDryBulb: 78,
      returnWetBulb: 66,
      supplyDryBulb: 60,
      writtenEvaporatingTemperature: 29,
    }),
  },
  key: {
    overall: 'within',
    criterion: 'superheat',
    byRule: 'passes',
    reason: null,
    stops: [],
    nextStep: 'record',
    cautions: ['wrong-column'],
    causes: [],
  },
  figures: [
    modelled({ what: 'evaporatingDewTemperature', value: 40, unit: 'degF', within: 0.06 }),
    difference({ what: 'superheat', value: 13, within: 0.06 }),
    cellOf(SUPERHEAT_CHART_A, { what: 'targetSuperheat', value: 13 }),
    modelled({ what: 'evaporatingBubbleTemperature', value: 29, unit: 'degF', within: 0.15 }),
    difference({ what: 'superheatFromBubble', value: 24, within: 0.15 }),
    modelled({ what: 'condensingBubbleTemperature', value: 110, unit: 'degF', within: 0.06 }),
    difference({ what: 'subcooling', value: 10, within: 0.06 }),
  ],
  slips: [],
};

const WRONG_SCALE_REQUEST = {
  setup: R454B_VALVE,
  visit: LOOKED_OVER,
  readings: readInchPound({
    liquidPressure: 348.6,
    liquidLineTemperature: 101,
    outdoorDryBulb: 92,
    suctionPressure: 107.5,
    suctionLineTemperature: 50,
    ...INDOORS,
    writtenCondensingTemperature: 106.7,
    writtenEvaporatingTemperature: 35.2,
  }),
} as const satisfies CheckExample['request'];

/** The gauge still stands on the scale of R-410A: a right charge looks low. */
export const WRONG_SCALE: CheckExample = {
  id: 'wrong-scale',
  kind: 'check',
  request: WRONG_SCALE_REQUEST,
  key: {
    overall: 'within',
    criterion: 'subcooling',
    byRule: 'passes',
    reason: null,
    stops: [],
    nextStep: 'confirm-refrigerant',
    cautions: ['wrong-refrigerant', 'flammable'],
    causes: [],
  },
  figures: [
    modelled({ what: 'condensingBubbleTemperature', value: 110, unit: 'degF', within: 0.06 }),
    difference({ what: 'subcooling', value: 9, within: 0.06 }),
    difference({ what: 'subcoolingDeviation', value: -1, within: 0.06 }),
    // the table prints 331.0 psig at 103 °F and 365.0 at 110 °F
    read(R410A_TABLE, {
      what: 'condensingBubbleTemperature',
      of: 'scale-of-r410a',
      value: 106.7,
      unit: 'degF',
      within: 0.35,
    }),
    difference({ what: 'subcooling', of: 'scale-of-r410a', value: 5.7, within: 0.35 }),
    difference({ what: 'subcoolingDeviation', of: 'scale-of-r410a', value: -4.3, within: 0.35 }),
    modelled({ what: 'evaporatingDewTemperature', value: 40, unit: 'degF', within: 0.06 }),
    read(R410A_TABLE, {
      what: 'evaporatingDewTemperature',
      of: 'scale-of-r410a',
      value: 35.2,
      unit: 'degF',
      within: 0.35,
    }),
  ],
  slips: [
    {
      id: 'scale-of-r410a',
      request: { ...WRONG_SCALE_REQUEST, setup: { ...R454B_VALVE, refrigerant: 'R-410A' } },
      key: {
        overall: 'below',
        nextStep: 'leak-first',
        criterion: 'subcooling',
        byRule: 'fails',
        causes: ['low-charge'],
      },
    },
  ],
};
