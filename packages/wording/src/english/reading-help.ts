/** How each reading is taken, and what usually goes wrong there. Common practice. A module of its own, so that the page opens without it. */
import type { ReadingId } from '@chargewright/engine';

export interface ReadingHelp {
  readonly how: string;
  readonly mistake: string;
}

const help = (how: string, mistake: string): ReadingHelp => ({ how, mistake });

export const readingHelp: Readonly<Record<ReadingId, ReadingHelp>> = {
  returnDryBulb: help(
    'Hold the probe in the moving air, at several points, and take the mean.',
    'Reading at the thermostat, or at a grille with a hot attic duct between it and the coil.',
  ),
  returnWetBulb: help(
    'Clean wick, clean water, moving air. Wait until the reading stops falling. Take it last: it ages fastest.',
    'A wick that dries out reads too high and looks like low airflow.',
  ),
  returnRelativeHumidity: help(
    'Let the sensor settle in the moving air, at the same place as the return dry bulb.',
    'A sensor still warm from the truck or the hand reads too dry.',
  ),
  supplyDryBulb: help(
    'Past the first bend if you can, at several points, and take the mean.',
    'A probe that sees the coil or a heat exchanger, or one spot in air that has not mixed.',
  ),
  supplyWetBulb: help('Wet wick, moving air, beside the supply dry bulb.', 'Water drops carried over from the coil.'),
  supplyRelativeHumidity: help(
    'Let the sensor settle beside the supply dry bulb. Near 100 % it is slow.',
    'Water on the sensor.',
  ),
  outdoorDryBulb: help(
    'In the shade, on more than one side of the unit, and take the mean.',
    'Sun on the probe, or the hot air the unit blows out.',
  ),
  suctionPressure: help(
    'Zero the gauge in the open air first. Purge the hose. Gloves and closed glasses when connecting.',
    'A gauge that was never zeroed, or a leaking valve core.',
  ),
  suctionLineTemperature: help(
    'Clean, bare metal, not at the bottom of the pipe. Clamp tight and wrap it.',
    'A loose clamp reads towards the air around it.',
  ),
  liquidPressure: help(
    'Purge the hose. Make sure it is the liquid port: the pipe is warm, not hot.',
    'A discharge port taken for the liquid port.',
  ),
  liquidLineTemperature: help(
    'Clean metal, clamp tight, wrapped and shaded.',
    'Sun, or the hot air of the outdoor fan, on the sensor.',
  ),
  dischargeLineTemperature: help(
    'Clamp on clean metal and wrap it. This pipe burns skin.',
    'Clamping past the first bend, where the pipe has cooled.',
  ),
  dischargePressure: help(
    'Purge the hose. The pipe at this port is hot.',
    'Judging it against a target made for the liquid port.',
  ),
  writtenEvaporatingTemperature: help(
    'Type what your gauge or chart says for the suction pressure: the dew column.',
    'Reading the bubble column of a blend.',
  ),
  writtenCondensingTemperature: help(
    'Type what your gauge or chart says for the liquid pressure: the bubble column.',
    'Reading the dew column of a blend.',
  ),
  airflow: help(
    'Measured: flow grid, hood, or static pressure with the maker’s fan table. Panels on, cooling speed.',
    'Taking the design figure for a measurement.',
  ),
  returnStaticPressure: help('Probe square to the wall, its tip facing into the air.', 'Measuring before the filter.'),
  supplyStaticPressure: help(
    'Never drill where the coil is. Probe tip facing into the air.',
    'Measuring after the coil, so that its drop is missed.',
  ),
  compressorCurrent: help(
    'Clamp around one conductor only. Live parts are near: take care.',
    'Clamping around two conductors.',
  ),
  lineVoltage: help(
    'With the compressor running. Live parts: only if you are qualified for it.',
    'Measuring with the compressor off.',
  ),
  returnWetBulbBefore: help(
    'The same wick at the same place, before you go outdoors. Read the return wet bulb again when you come back.',
    'Another instrument for the second reading: then the two differ by more than the air did.',
  ),
  drierInletTemperature: help(
    'Clamp on clean pipe within a few inches, wrapped, system running. The same clamp for both places is best.',
    'A drier in the sun or beside the hot discharge line.',
  ),
  drierOutletTemperature: help(
    'Clamp on clean pipe within a few inches, wrapped, system running. The same clamp for both places is best.',
    'A long piece of line between the two places: it cools by itself.',
  ),
  standingPressure: help(
    'Compressor off, outdoor fan on, until pressure and coil no longer change: about 10 to 15 minutes.',
    'Reading it while the coil is still warm from running.',
  ),
  standingOutdoorCoilTemperature: help(
    'Clamp on a bend in the middle of the coil, out of the sun, and compare with the air: they should agree.',
    'The air temperature alone, while the coil is still warm.',
  ),
  standingIndoorCoilTemperature: help(
    'Clamp on a bend of the indoor coil, blower on. With the liquid shut into the outdoor coil it is not needed.',
    'A cool indoor coil that nobody measured: the charge gathers there and sets the pressure.',
  ),
};
