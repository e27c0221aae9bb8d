/** Which readings are asked, and in which order: design.md's order of the method, trade/trade-practice.md 1. */
import type { ReadingId } from '@chargewright/engine';
import type { CheckDraft, DraftSetup, FieldKey } from '../loose-checks/check-draft';
import { readingKey, valueIn } from './field-key';

export type SectionId = 'outdoors' | 'indoors' | 'more';

export interface ReadingSection {
  readonly id: SectionId;
  readonly fields: readonly FieldKey[];
}

const reading = readingKey;

const SUCTION_PAIR: readonly FieldKey[] = [reading('suctionPressure'), reading('suctionLineTemperature')];
const OUTDOOR: readonly FieldKey[] = [reading('outdoorDryBulb')];
const MORE: readonly ReadingId[] = [
  'dischargeLineTemperature',
  'airflow',
  'writtenEvaporatingTemperature',
  'writtenCondensingTemperature',
];

/** The high-side pair as the port gives it; a discharge port's pressure is another quantity than a liquid port's. */
function liquidPair({ highSidePort }: DraftSetup): readonly FieldKey[] {
  if (highSidePort === 'none') return [reading('liquidLineTemperature')];
  const pressure = highSidePort === 'discharge' ? 'dischargePressure' : 'liquidPressure';
  return [reading(pressure), reading('liquidLineTemperature')];
}

function outdoors(setup: DraftSetup): readonly FieldKey[] {
  // A fixed orifice is judged by superheat, a valve by subcooling: what judges is read first.
  return setup.meteringDevice === 'fixed-orifice'
    ? [...SUCTION_PAIR, ...OUTDOOR, ...liquidPair(setup)]
    : [...liquidPair(setup), 'typed:targetSubcooling', ...OUTDOOR, ...SUCTION_PAIR];
}

/** Relative humidity takes the place of wet bulb when the person chose it, or typed one and no wet bulb. */
export function humidityShown(draft: CheckDraft, chosen: boolean | undefined): boolean {
  if (chosen !== undefined) return chosen;
  return (
    valueIn(draft, reading('returnRelativeHumidity')) !== undefined &&
    valueIn(draft, reading('returnWetBulb')) === undefined
  );
}

/** Readings that a changed setup no longer asks stay visible while they hold a value: nothing counts unseen. */
function leftOver(draft: CheckDraft, asked: readonly FieldKey[]): readonly FieldKey[] {
  const candidates: readonly ReadingId[] = [
    'liquidPressure',
    'dischargePressure',
    'returnWetBulb',
    'returnRelativeHumidity',
  ];
  return candidates
    .map(reading)
    .filter((key) => !asked.includes(key) && (valueIn(draft, key)?.text.trim() ?? '') !== '');
}

export function readingSections(draft: CheckDraft, byHumidity: boolean): readonly ReadingSection[] {
  const humidity = reading(byHumidity ? 'returnRelativeHumidity' : 'returnWetBulb');
  const outdoorFields = outdoors(draft.setup);
  const indoorFields = [reading('returnDryBulb'), humidity, reading('supplyDryBulb')];
  return [
    { id: 'outdoors', fields: outdoorFields },
    { id: 'indoors', fields: indoorFields },
    { id: 'more', fields: [...MORE.map(reading), ...leftOver(draft, [...outdoorFields, ...indoorFields])] },
  ];
}
