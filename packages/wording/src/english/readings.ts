/** Where each reading is taken, how, and what usually goes wrong there. Common practice, and RA3.2 of the Californian residential appendices for the places. */
import type { ReadingId } from '@chargewright/engine';

export interface ReadingWords {
  /** Beside the field. */
  readonly label: string;
  /** Inside a sentence. */
  readonly name: string;
  readonly place: string;
  readonly how: string;
  readonly mistake: string;
  /** When something waits for it. */
  readonly missing: string;
}

const reading = (label: string, name: string, place: string, how: string, mistake: string): ReadingWords => ({
  label,
  name,
  place,
  how,
  mistake,
  missing: `Needs the ${name}`,
});

export const readingWords: Readonly<Record<ReadingId, ReadingWords>> = {
  returnDryBulb: reading(
    'Return dry bulb',
    'return dry bulb',
    'return plenum, beside the coil',
    'Hold the probe in the moving air, at several points, and take the mean.',
    'Reading at the thermostat, or at a grille with a hot attic duct between it and the coil.',
  ),
  returnWetBulb: reading(
    'Return wet bulb',
    'return wet bulb',
    'return plenum, beside the coil',
    'Clean wick, clean water, moving air. Wait until the reading stops falling. Take it last: it ages fastest.',
    'A wick that dries out reads too high and looks like low airflow.',
  ),
  returnRelativeHumidity: reading(
    'Return humidity',
    'return relative humidity',
    'return plenum, beside the coil',
    'Let the sensor settle in the moving air, at the same place as the return dry bulb.',
    'A sensor still warm from the truck or the hand reads too dry.',
  ),
  supplyDryBulb: reading(
    'Supply dry bulb',
    'supply dry bulb',
    'supply plenum, out of sight of the coil',
    'Past the first bend if you can, at several points, and take the mean.',
    'A probe that sees the coil or a heat exchanger, or one spot in air that has not mixed.',
  ),
  supplyWetBulb: reading(
    'Supply wet bulb',
    'supply wet bulb',
    'supply plenum, out of sight of the coil',
    'Wet wick, moving air, beside the supply dry bulb.',
    'Water drops carried over from the coil.',
  ),
  supplyRelativeHumidity: reading(
    'Supply humidity',
    'supply relative humidity',
    'supply plenum, out of sight of the coil',
    'Let the sensor settle beside the supply dry bulb. Near 100 % it is slow.',
    'Water on the sensor.',
  ),
  outdoorDryBulb: reading(
    'Air entering',
    'outdoor air temperature',
    'about 1 ft (30 cm) before the outdoor coil',
    'In the shade, on more than one side of the unit, and take the mean.',
    'Sun on the probe, or the hot air the unit blows out.',
  ),
  suctionPressure: reading(
    'Suction pressure',
    'suction pressure',
    'suction service port, the large pipe',
    'Zero the gauge in the open air first. Purge the hose. Gloves and closed glasses when connecting.',
    'A gauge that was never zeroed, or a leaking valve core.',
  ),
  suctionLineTemperature: reading(
    'Suction line',
    'suction line temperature',
    'near the suction service valve',
    'Clean, bare metal, not at the bottom of the pipe. Clamp tight and wrap it.',
    'A loose clamp reads towards the air around it.',
  ),
  liquidPressure: reading(
    'Liquid pressure',
    'liquid pressure',
    'liquid service port, the small pipe',
    'Purge the hose. Make sure it is the liquid port: the pipe is warm, not hot.',
    'A discharge port taken for the liquid port.',
  ),
  liquidLineTemperature: reading(
    'Liquid line',
    'liquid line temperature',
    'within 6 in (15 cm) of the liquid valve',
    'Clean metal, clamp tight, wrapped and shaded.',
    'Sun, or the hot air of the outdoor fan, on the sensor.',
  ),
  dischargeLineTemperature: reading(
    'Discharge line',
    'discharge line temperature',
    'about 6 in (15 cm) from the compressor',
    'Clamp on clean metal and wrap it. This pipe burns skin.',
    'Clamping past the first bend, where the pipe has cooled.',
  ),
  dischargePressure: reading(
    'Discharge pressure',
    'discharge pressure',
    'discharge service port, before the outdoor coil',
    'Purge the hose. The pipe at this port is hot.',
    'Judging it against a target made for the liquid port.',
  ),
  writtenEvaporatingTemperature: reading(
    'Evaporating, as written',
    'evaporating temperature as written',
    'from your gauge or chart',
    'Type what your gauge or chart says for the suction pressure: the dew column.',
    'Reading the bubble column of a blend.',
  ),
  writtenCondensingTemperature: reading(
    'Condensing, as written',
    'condensing temperature as written',
    'from your gauge or chart',
    'Type what your gauge or chart says for the liquid pressure: the bubble column.',
    'Reading the dew column of a blend.',
  ),
  airflow: reading(
    'Airflow',
    'airflow',
    'at the indoor unit',
    'Measured: flow grid, hood, or static pressure with the maker’s fan table. Panels on, cooling speed.',
    'Taking the design figure for a measurement.',
  ),
  returnStaticPressure: reading(
    'Return static',
    'return static pressure',
    'between filter and blower',
    'Probe square to the wall, its tip facing into the air.',
    'Measuring before the filter.',
  ),
  supplyStaticPressure: reading(
    'Supply static',
    'supply static pressure',
    'between blower and coil',
    'Never drill where the coil is. Probe tip facing into the air.',
    'Measuring after the coil, so that its drop is missed.',
  ),
  compressorCurrent: reading(
    'Compressor current',
    'compressor current',
    'one conductor of the compressor',
    'Clamp around one conductor only. Live parts are near: take care.',
    'Clamping around two conductors.',
  ),
  lineVoltage: reading(
    'Line voltage',
    'line voltage',
    'at the contactor’s line side',
    'With the compressor running. Live parts: only if you are qualified for it.',
    'Measuring with the compressor off.',
  ),
};
