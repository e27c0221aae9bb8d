/** A subcooling so near its limit that these instruments cannot tell on which side it lies. The readings are our own numbers. */
import { difference, read } from './figures';
import { AT_SEA_LEVEL, LOOKED_OVER, readInchPound, SPLIT_IN_COOLING, withReadings } from './givens';
import { R410A_TABLE } from './sources';
import type { CheckExample } from './worked-example';

const REQUEST = {
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
    liquidLineTemperature: 102.5,
    outdoorDryBulb: 92,
    suctionPressure: 118,
    suctionLineTemperature: 50,
    returnDryBulb: 76,
    returnWetBulb: 64,
    supplyDryBulb: 58,
  }),
} as const satisfies CheckExample['request'];

export const TOO_CLOSE_TO_CALL: CheckExample = {
  id: 'too-close-to-call',
  kind: 'check',
  request: REQUEST,
  key: {
    overall: 'too-close-to-call',
    criterion: 'subcooling',
    byRule: 'passes',
    reason: null,
    stops: [],
    nextStep: 'settle-with-another-reading',
    cautions: [],
    causes: [],
  },
  figures: [
    read(R410A_TABLE, { what: 'condensingBubbleTemperature', value: 110, unit: 'degF', within: 0.32 }),
    difference({ what: 'subcooling', value: 7.5, within: 0.32 }),
    difference({ what: 'subcoolingDeviation', value: -2.5, within: 0.32 }),
    difference({ what: 'subcooling', of: 'cooler-liquid-line', value: 9, within: 0.32 }),
  ],
  slips: [
    {
      id: 'cooler-liquid-line',
      request: withReadings(REQUEST, readInchPound({ liquidLineTemperature: 101 })),
      key: { overall: 'within', nextStep: 'record', criterion: 'subcooling', byRule: 'passes' },
    },
  ],
};
