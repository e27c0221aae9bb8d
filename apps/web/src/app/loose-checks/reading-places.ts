import type { ReadingId } from '@chargewright/engine';

export type ReadingPlace = 'return' | 'supply' | 'air-handler' | 'outdoor-unit';

/** Where each quantity is read; stored with the reading, as outposts and sensors will store theirs. */
export const READING_PLACES: Readonly<Record<ReadingId, ReadingPlace>> = {
  returnDryBulb: 'return',
  returnWetBulb: 'return',
  returnRelativeHumidity: 'return',
  supplyDryBulb: 'supply',
  supplyWetBulb: 'supply',
  supplyRelativeHumidity: 'supply',
  outdoorDryBulb: 'outdoor-unit',
  suctionPressure: 'outdoor-unit',
  suctionLineTemperature: 'outdoor-unit',
  liquidPressure: 'outdoor-unit',
  liquidLineTemperature: 'outdoor-unit',
  dischargeLineTemperature: 'outdoor-unit',
  dischargePressure: 'outdoor-unit',
  writtenEvaporatingTemperature: 'outdoor-unit',
  writtenCondensingTemperature: 'outdoor-unit',
  airflow: 'air-handler',
  returnStaticPressure: 'return',
  supplyStaticPressure: 'supply',
  compressorCurrent: 'outdoor-unit',
  lineVoltage: 'outdoor-unit',
  returnWetBulbBefore: 'return',
  drierInletTemperature: 'outdoor-unit',
  drierOutletTemperature: 'outdoor-unit',
  standingPressure: 'outdoor-unit',
  standingOutdoorCoilTemperature: 'outdoor-unit',
  standingIndoorCoilTemperature: 'air-handler',
};
