/** Bodies of airflow, capacity and weigh-in as a technician would fill them in. */
export const AIRFLOW_EXAMPLE = {
  method: 'temperature-rise-electric',
  atCoolingSpeed: 'yes',
  elevation: { value: 650, unit: 'ft' },
  nominalCapacity: { value: 3, unit: 'ton' },
  returnDryBulb: { value: 70.2, unit: 'degF' },
  supplyDryBulb: { value: 95.4, unit: 'degF', plusMinus: { value: 1, unit: 'deltaF' } },
  lineVoltage: { value: 238, unit: 'V' },
  heaterCurrent: { value: 41.5, unit: 'A', plusMinus: { value: 0.8, unit: 'A' }, resolution: 0.1 },
} as const;

export const CAPACITY_EXAMPLE = {
  airflow: { value: 1180, unit: 'cfm', plusMinus: { value: 80, unit: 'cfm', kind: 'k2' } },
  elevation: { value: 650, unit: 'ft' },
  nominalCapacity: { value: 3, unit: 'ton' },
  returnDryBulb: { value: 78, unit: 'degF' },
  returnWetBulb: { value: 65, unit: 'degF' },
  supplyDryBulb: { value: 58, unit: 'degF' },
  supplyRelativeHumidity: { value: 92, unit: '%' },
} as const;

export const WEIGH_IN_EXAMPLE = {
  refrigerant: 'R-410A',
  kind: 'ducted',
  method: 'adjustment',
  factoryCharge: { value: 6, unit: 'lb' },
  line: {
    installedLength: { value: 45, unit: 'ft' },
    liquidLineSize: '3/8',
    makersRate: { value: 0.6, unit: 'oz/ft' },
    includedLength: { value: 15, unit: 'ft' },
  },
  actualCharge: { value: 18, unit: 'oz' },
  scale: { resolution: { value: 0.5, unit: 'oz' }, plusMinus: { value: 0.5, unit: 'oz' } },
  vacuum: { deepest: { value: 400, unit: 'micron' }, rise: { value: 150, unit: 'micron' }, isolatedMinutes: 5 },
} as const;
