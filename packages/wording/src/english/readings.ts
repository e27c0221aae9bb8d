/** What each reading is called and where it is taken. Common practice, and RA3.2 of the Californian residential appendices for the places. */
import type { ReadingId } from '@chargewright/engine';

export interface ReadingWords {
  /** Beside the field. */
  readonly label: string;
  /** Inside a sentence. */
  readonly name: string;
  readonly place: string;
}

const reading = (label: string, name: string, place: string): ReadingWords => ({ label, name, place });

export const readingWords: Readonly<Record<ReadingId, ReadingWords>> = {
  returnDryBulb: reading('Return dry bulb', 'return dry bulb', 'return plenum, beside the coil'),
  returnWetBulb: reading('Return wet bulb', 'return wet bulb', 'return plenum, beside the coil'),
  returnRelativeHumidity: reading('Return humidity', 'return relative humidity', 'return plenum, beside the coil'),
  supplyDryBulb: reading('Supply dry bulb', 'supply dry bulb', 'supply plenum, out of sight of the coil'),
  supplyWetBulb: reading('Supply wet bulb', 'supply wet bulb', 'supply plenum, out of sight of the coil'),
  supplyRelativeHumidity: reading(
    'Supply humidity',
    'supply relative humidity',
    'supply plenum, out of sight of the coil',
  ),
  outdoorDryBulb: reading('Air entering', 'outdoor air temperature', 'about 1 ft (30 cm) before the outdoor coil'),
  suctionPressure: reading('Suction pressure', 'suction pressure', 'suction service port, the large pipe'),
  suctionLineTemperature: reading('Suction line', 'suction line temperature', 'near the suction service valve'),
  liquidPressure: reading('Liquid pressure', 'liquid pressure', 'liquid service port, the small pipe'),
  liquidLineTemperature: reading('Liquid line', 'liquid line temperature', 'within 6 in (15 cm) of the liquid valve'),
  dischargeLineTemperature: reading(
    'Discharge line',
    'discharge line temperature',
    'about 6 in (15 cm) from the compressor',
  ),
  dischargePressure: reading(
    'Discharge pressure',
    'discharge pressure',
    'discharge service port, before the outdoor coil',
  ),
  writtenEvaporatingTemperature: reading(
    'Evaporating, as written',
    'evaporating temperature as written',
    'from your gauge or chart',
  ),
  writtenCondensingTemperature: reading(
    'Condensing, as written',
    'condensing temperature as written',
    'from your gauge or chart',
  ),
  airflow: reading('Airflow', 'airflow', 'at the indoor unit'),
  returnStaticPressure: reading('Return static', 'return static pressure', 'between filter and blower'),
  supplyStaticPressure: reading('Supply static', 'supply static pressure', 'between blower and coil'),
  compressorCurrent: reading('Compressor current', 'compressor current', 'one conductor of the compressor'),
  lineVoltage: reading('Line voltage', 'line voltage', 'at the contactor’s line side'),
  returnWetBulbBefore: reading('Return wet bulb, before', 'return wet bulb before', 'return plenum, beside the coil'),
  drierInletTemperature: reading('Before the drier', 'temperature before the drier', 'liquid line, towards the coil'),
  drierOutletTemperature: reading('After the drier', 'temperature after the drier', 'liquid line, away from the coil'),
  standingPressure: reading('Standing pressure', 'standing pressure', 'liquid service port'),
  standingOutdoorCoilTemperature: reading('Outdoor coil', 'outdoor coil temperature', 'on a return bend of the coil'),
  standingIndoorCoilTemperature: reading('Indoor coil', 'indoor coil temperature', 'on a return bend of the coil'),
};
