/** The request that the contract of the evaluation interface shows. */
export const EVALUATION_EXAMPLE = {
  procedure: 'general-rules',
  setup: {
    refrigerant: 'R-410A',
    meteringDevice: 'fixed-orifice',
    mode: 'cooling',
    kind: 'split',
    stage: 'full',
    highSidePort: 'liquid',
    elevation: { value: 650, unit: 'ft' },
    targetSubcooling: { value: 10, unit: 'deltaF' },
    nominalCapacity: { value: 3, unit: 'ton' },
  },
  visit: {
    runningMinutes: 22,
    lowestReturnDryBulb: { value: 74, unit: 'degF' },
    instrumentsCheckedDaysAgo: 12,
    preflight: { filterAndCoil: 'ok', panelsOn: 'ok', gaugeZeroed: 'not-checked' },
  },
  readings: {
    returnDryBulb: { value: 78, unit: 'degF' },
    returnWetBulb: { value: 65, unit: 'degF', plusMinus: { value: 1, unit: 'deltaF', kind: 'limit' }, ageSeconds: 40 },
    supplyDryBulb: { value: 58.4, unit: 'degF' },
    outdoorDryBulb: { value: 95, unit: 'degF' },
    suctionPressure: { value: 118, unit: 'psig' },
    suctionLineTemperature: { value: 52, unit: 'degF' },
    liquidPressure: { value: 395, unit: 'psig' },
    liquidLineTemperature: { value: 106, unit: 'degF' },
  },
} as const;
