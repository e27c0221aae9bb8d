/** What the open check already knows of the site, the system and the air: shown in the sheet until something else is typed there. */
import type { ReadingId } from '@chargewright/engine';
import type { TypedField } from '@chargewright/contract/typed-fields';
import { readingKey, typedKey, valueIn } from '../check-a-charge/field-key';
import type { CheckDraft, TypedValue } from '../loose-checks/check-draft';

const FROM_SETUP: Readonly<Record<string, TypedField>> = {
  elevation: 'elevation',
  nominalCapacity: 'nominalCapacity',
};

/** Readings in cooling: of no use for a temperature rise. */
const FROM_READINGS: Readonly<Record<string, ReadingId>> = {
  capacityReturnDry: 'returnDryBulb',
  capacityReturnWet: 'returnWetBulb',
  capacityReturnHumidity: 'returnRelativeHumidity',
  capacitySupplyDry: 'supplyDryBulb',
  capacitySupplyWet: 'supplyWetBulb',
  capacitySupplyHumidity: 'supplyRelativeHumidity',
};

export function knownFromCheck(draft: CheckDraft): Readonly<Record<string, TypedValue>> {
  const known: Record<string, TypedValue> = {};
  const note = (key: string, value: TypedValue | undefined): void => {
    if (value && value.text.trim() !== '') known[key] = { text: value.text, unit: value.unit };
  };
  for (const [key, field] of Object.entries(FROM_SETUP)) note(key, valueIn(draft, typedKey(field)));
  for (const [key, id] of Object.entries(FROM_READINGS)) note(key, valueIn(draft, readingKey(id)));
  return known;
}
