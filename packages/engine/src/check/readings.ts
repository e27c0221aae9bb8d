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
  'returnWetBulbBefore',
  'drierInletTemperature',
  'drierOutletTemperature',
  'standingPressure',
  'standingOutdoorCoilTemperature',
  'standingIndoorCoilTemperature',
] as const;
export type ReadingId = (typeof READING_IDS)[number];

/** What the separating tests measure: it holds however long ago, until the system is adjusted. */
export const TEST_READING_IDS = [
  'drierInletTemperature',
  'drierOutletTemperature',
  'standingPressure',
  'standingOutdoorCoilTemperature',
  'standingIndoorCoilTemperature',
] as const satisfies readonly ReadingId[];

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
  returnWetBulbBefore: 'temperature',
  drierInletTemperature: 'temperature',
  drierOutletTemperature: 'temperature',
  standingPressure: 'pressure',
  standingOutdoorCoilTemperature: 'temperature',
  standingIndoorCoilTemperature: 'temperature',
};
