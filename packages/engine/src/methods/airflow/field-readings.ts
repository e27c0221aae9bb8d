/** Readings of the airflow methods as leaves, with what a digital instrument of the trade is usually good for where the person states nothing. */
import type { ErrorPart, Known, QuantityKind } from '../../derivation/quantity';
import { leaf } from '../../derivation/quantity';
import { staticPressureToPa } from '../../units';
import type { SourcedFigure } from '../sourced-figure';

export const FIELD_READING_IDS = [
  'lineVoltage',
  'heaterCurrent',
  'blowerHeat',
  'dialVolume',
  'gasRevolution',
  'gasHeatingValue',
  'furnaceEfficiency',
  'returnStaticPressure',
  'supplyStaticPressure',
] as const;
export type FieldReadingId = (typeof FIELD_READING_IDS)[number];

interface Assumed extends SourcedFigure {
  readonly of: 'reading' | 'absolute';
}

const choice = (value: number, of: Assumed['of'], printed: string): Assumed => ({
  value,
  of,
  printed,
  standing: 'choice',
  source: 'Our choice, open to better evidence',
});

/** ± assumed when none is stated, as a limit: a part of the reading, or in its SI unit. */
export const ASSUMED_FIELD_LIMITS: Readonly<Record<FieldReadingId, Assumed>> = {
  lineVoltage: choice(0.01, 'reading', '±1 %'),
  heaterCurrent: choice(0.02, 'reading', '±2 %'),
  blowerHeat: choice(0.2, 'reading', '±20 %'),
  // the meter's own error
  dialVolume: choice(0.01, 'reading', '±1 %'),
  // a thumb on a stopwatch, at both ends
  gasRevolution: choice(0.5, 'absolute', '±0.5 s'),
  gasHeatingValue: choice(0.02, 'reading', '±2 %'),
  furnaceEfficiency: choice(0.03, 'absolute', '±3 points of percent'),
  returnStaticPressure: choice(staticPressureToPa(0.02, 'inH2O'), 'absolute', '±0.02 in. w.c.'),
  supplyStaticPressure: choice(staticPressureToPa(0.02, 'inH2O'), 'absolute', '±0.02 in. w.c.'),
};

const KINDS: Readonly<Record<FieldReadingId, QuantityKind>> = {
  lineVoltage: 'voltageV',
  heaterCurrent: 'currentA',
  blowerHeat: 'heatRateW',
  dialVolume: 'gasVolumeM3',
  gasRevolution: 'durationS',
  gasHeatingValue: 'heatingValueJPerM3',
  furnaceEfficiency: 'fraction',
  returnStaticPressure: 'staticPressurePa',
  supplyStaticPressure: 'staticPressurePa',
};

export interface FieldReadingInput {
  /** SI. */
  readonly value: number;
  /** Stated ± in the unit of the value, as a limit (rectangular); left out, the assumed one is taken. */
  readonly limit?: number;
  /** Stated ± as an expanded uncertainty, k = 2 (normal), in place of a limit. */
  readonly expanded?: number;
  /** Smallest step the instrument shows. */
  readonly resolution?: number;
  /** All readings of a kind by one instrument share its error (JCGM 100:2008, 5.2.2). */
  readonly instrumentId?: string;
}

/** A reading in SI as a quantity with its uncertainty. */
export function fieldReading(id: FieldReadingId, reading: FieldReadingInput): Known {
  const { value, instrumentId, resolution = 0 } = reading;
  const kind = KINDS[id];
  const key = instrumentId === undefined ? `reading:${id}` : `instrument:${kind}:${instrumentId}`;
  const own = instrumentError(id, reading);
  const parts: ErrorPart[] = own.u > 0 ? [{ key, ...own }] : [];
  if (resolution > 0) {
    parts.push({ key: `resolution:${id}`, u: resolution / 2 / Math.sqrt(3), shape: 'rectangular' });
  }
  return leaf({ id, kind, value, origin: 'reading', parts });
}

function instrumentError(id: FieldReadingId, { value, limit, expanded }: FieldReadingInput): Omit<ErrorPart, 'key'> {
  if (expanded !== undefined) return { u: expanded / 2, shape: 'normal' };
  const assumed = ASSUMED_FIELD_LIMITS[id];
  const half = limit ?? (assumed.of === 'reading' ? assumed.value * Math.abs(value) : assumed.value);
  return { u: half / Math.sqrt(3), shape: 'rectangular' };
}
