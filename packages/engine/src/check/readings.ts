/** The quantities a check can be given, what each measures, and the ± assumed when none is stated. */

export type Dimension = 'temperature' | 'pressure' | 'humidity' | 'airflow' | 'staticPressure' | 'current' | 'voltage';

export const READING_IDS = [
  'returnDryBulb',
  'returnWetBulb',
  'returnRelativeHumidity',
  'supplyDryBulb',
  'supplyWetBulb',
  'supplyRelativeHumidity',
  'outdoorDryBulb',
  'suctionPressure',
  'suctionLineTemperature',
  'liquidPressure',
  'liquidLineTemperature',
  'dischargeLineTemperature',
  'dischargePressure',
  'writtenEvaporatingTemperature',
  'writtenCondensingTemperature',
  'airflow',
  'returnStaticPressure',
  'supplyStaticPressure',
  'compressorCurrent',
  'lineVoltage',
] as const;
export type ReadingId = (typeof READING_IDS)[number];

export const READING_DIMENSIONS: Readonly<Record<ReadingId, Dimension>> = {
  returnDryBulb: 'temperature',
  returnWetBulb: 'temperature',
  returnRelativeHumidity: 'humidity',
  supplyDryBulb: 'temperature',
  supplyWetBulb: 'temperature',
  supplyRelativeHumidity: 'humidity',
  outdoorDryBulb: 'temperature',
  suctionPressure: 'pressure',
  suctionLineTemperature: 'temperature',
  liquidPressure: 'pressure',
  liquidLineTemperature: 'temperature',
  dischargeLineTemperature: 'temperature',
  dischargePressure: 'pressure',
  writtenEvaporatingTemperature: 'temperature',
  writtenCondensingTemperature: 'temperature',
  airflow: 'airflow',
  returnStaticPressure: 'staticPressure',
  supplyStaticPressure: 'staticPressure',
  compressorCurrent: 'current',
  lineVoltage: 'voltage',
};
