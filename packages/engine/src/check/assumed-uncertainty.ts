/**
 * The ± of a reading as standard uncertainties: stated by the person, else what a digital instrument of the trade is usually good for
 * (limits; practice or choice, no published source), and the step it shows.
 */
import type { ErrorPart } from '../derivation/quantity';
import { differenceToK, flowToM3PerS, pressureDifferenceToPa } from '../units';
import type { PlusMinus, ReadingInput } from './request';
import type { ReadingId } from './readings';

const AIR_LIMIT_K = differenceToK(1, 'deltaF');
const PIPE_LIMIT_K = differenceToK(1, 'deltaF');
const SUCTION_LIMIT_PA = pressureDifferenceToPa(2, 'psi');
const LIQUID_LIMIT_PA = pressureDifferenceToPa(4, 'psi');
const HUMIDITY_LIMIT = 0.03;
const AIRFLOW_LIMIT_FRACTION = 0.07;
const CURRENT_LIMIT_FRACTION = 0.03;

/** Readings that enter a computation. The others are kept with the check. */
export type UsedReadingId = Exclude<ReadingId, 'returnStaticPressure' | 'supplyStaticPressure' | 'lineVoltage'>;

function assumedLimit(id: UsedReadingId, value: number): number {
  switch (id) {
    case 'returnDryBulb':
    case 'returnWetBulb':
    case 'returnWetBulbBefore':
    case 'supplyDryBulb':
    case 'supplyWetBulb':
    case 'outdoorDryBulb':
      return AIR_LIMIT_K;
    case 'suctionLineTemperature':
    case 'liquidLineTemperature':
    case 'dischargeLineTemperature':
    case 'drierInletTemperature':
    case 'drierOutletTemperature':
    case 'standingOutdoorCoilTemperature':
    case 'standingIndoorCoilTemperature':
      return PIPE_LIMIT_K;
    case 'writtenEvaporatingTemperature':
    case 'writtenCondensingTemperature':
      return 0;
    case 'suctionPressure':
      return SUCTION_LIMIT_PA;
    case 'liquidPressure':
    case 'dischargePressure':
    case 'standingPressure':
      return LIQUID_LIMIT_PA;
    case 'returnRelativeHumidity':
    case 'supplyRelativeHumidity':
      return HUMIDITY_LIMIT;
    case 'airflow':
      return AIRFLOW_LIMIT_FRACTION * Math.abs(value);
    case 'compressorCurrent':
      return CURRENT_LIMIT_FRACTION * value;
  }
}

/** Half-width of a stated ± in the SI unit of the reading. `%` of an airflow is relative to it, of a humidity absolute. */
function statedHalfWidth({ value, unit }: PlusMinus, id: UsedReadingId, reading: number): number {
  switch (unit) {
    case 'deltaF':
    case 'deltaC':
      return differenceToK(value, unit);
    case 'psi':
    case 'kPa':
    case 'bar':
      return pressureDifferenceToPa(value, unit);
    case '%':
      return (value / 100) * (id === 'airflow' ? Math.abs(reading) : 1);
    case 'cfm':
    case 'm3/h':
    case 'L/s':
      return flowToM3PerS(value, unit);
    case 'A':
      return value;
    case 'inH2O':
    case 'Pa':
    case 'V':
      throw new RangeError(`a ± in ${unit} does not belong to ${id}`);
  }
}

/**
 * Error parts of a reading in SI. One instrument named for several readings of a kind is one error for all of them (JCGM 100:2008, 5.2.2):
 * its part has the instrument's key, the rounding of the display stays the reading's own.
 */
export function readingErrorParts(input: {
  readonly id: UsedReadingId;
  readonly dimension: string;
  readonly reading: ReadingInput;
  readonly valueSi: number;
  readonly resolutionSi: number;
}): readonly ErrorPart[] {
  const { id, dimension, reading, valueSi, resolutionSi } = input;
  const { plusMinus, instrumentId } = reading;
  const half = plusMinus === undefined ? assumedLimit(id, valueSi) : statedHalfWidth(plusMinus, id, valueSi);
  const normal = plusMinus?.kind === 'k2';
  // the wet bulb before and the one after are read with one instrument: its error does not average out
  const own = id === 'returnWetBulbBefore' ? 'returnWetBulb' : id;
  const key = instrumentId === undefined ? `reading:${own}` : `instrument:${dimension}:${instrumentId}`;
  const parts: ErrorPart[] = [];
  if (half > 0) {
    parts.push({ key, u: normal ? half / 2 : half / Math.sqrt(3), shape: normal ? 'normal' : 'rectangular' });
  }
  if (resolutionSi > 0) {
    parts.push({ key: `resolution:${id}`, u: resolutionSi / 2 / Math.sqrt(3), shape: 'rectangular' });
  }
  return parts;
}
