/**
 * The ± of a reading as standard uncertainties: stated by the person, else what a digital instrument of the trade is usually good for, and the step it
 * shows.
 */
import type { ErrorPart } from '../derivation/quantity';
import { COMMON_PRACTICE, OUR_CHOICE } from '../methods/sourced-figure';
import type { SourcedFigure } from '../methods/sourced-figure';
import { differenceToK, flowToM3PerS, pressureDifferenceToPa } from '../units';
import type { PlusMinus, ReadingInput } from './request';
import type { ReadingId } from './readings';

/** Readings that enter a computation. The others are kept with the check. */
export type UsedReadingId = Exclude<ReadingId, 'returnStaticPressure' | 'supplyStaticPressure' | 'lineVoltage'>;

export interface AssumedLimit extends SourcedFigure {
  readonly of: 'reading' | 'absolute';
}

const limit = (value: number, of: AssumedLimit['of'], printed: string): AssumedLimit => ({
  value,
  of,
  printed,
  standing: 'choice',
  source: OUR_CHOICE,
});

/** As instruments of the trade are usually sold. */
const practice = (value: number, printed: string): AssumedLimit => ({
  ...limit(value, 'absolute', printed),
  standing: 'practice',
  source: COMMON_PRACTICE,
});

const AIR = limit(differenceToK(1, 'deltaF'), 'absolute', '±1 °F');
const PIPE = practice(differenceToK(1, 'deltaF'), '±1 °F');
const LIQUID = practice(pressureDifferenceToPa(4, 'psi'), '±4 psi');
const HUMIDITY = practice(0.03, '±3 points of percent');

/** ± taken where the person states none, as a limit: a part of the reading, or in its SI unit. What a person wrote down as a saturation has none of its own. */
export const ASSUMED_LIMITS: Readonly<
  Record<Exclude<UsedReadingId, 'writtenEvaporatingTemperature' | 'writtenCondensingTemperature'>, AssumedLimit>
> = {
  returnDryBulb: AIR,
  returnWetBulb: AIR,
  returnWetBulbBefore: AIR,
  supplyDryBulb: AIR,
  supplyWetBulb: AIR,
  outdoorDryBulb: AIR,
  suctionLineTemperature: PIPE,
  liquidLineTemperature: PIPE,
  dischargeLineTemperature: PIPE,
  drierInletTemperature: PIPE,
  drierOutletTemperature: PIPE,
  standingOutdoorCoilTemperature: PIPE,
  standingIndoorCoilTemperature: PIPE,
  suctionPressure: limit(pressureDifferenceToPa(2, 'psi'), 'absolute', '±2 psi'),
  liquidPressure: LIQUID,
  dischargePressure: LIQUID,
  standingPressure: LIQUID,
  returnRelativeHumidity: HUMIDITY,
  supplyRelativeHumidity: HUMIDITY,
  airflow: limit(0.07, 'reading', '±7 %'),
  compressorCurrent: limit(0.03, 'reading', '±3 %'),
};

function assumedLimit(id: UsedReadingId, reading: number): number {
  if (id === 'writtenEvaporatingTemperature' || id === 'writtenCondensingTemperature') return 0;
  const { value, of } = ASSUMED_LIMITS[id];
  return of === 'reading' ? value * Math.abs(reading) : value;
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
