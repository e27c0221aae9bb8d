/** What the capacity asks for, below the airflow, and the request it makes of it. */
import { expandedUncertainty, flowFromM3PerS } from '@chargewright/engine';
import type { AirflowResult, CapacityRequest, Known } from '@chargewright/engine';
import { airflowPageWords, type InputWords } from '@chargewright/wording';
import { amountsOf, type FilledSheet, type SheetField } from '../worksheets/sheet-fields';
import { SITE_FIELDS } from './airflow-sheet';

const words = airflowPageWords.capacity;

export const HUMIDITY_BY = ['wet-bulb', 'humidity'] as const;
export type HumidityBy = (typeof HUMIDITY_BY)[number];

const plain = (label: string): InputWords => ({ label, name: label.toLowerCase(), hint: '' });

const DRY_BULBS = {
  return: { key: 'capacityReturnDry', words: plain(words.returnDry), dimension: 'temperature', path: 'returnDryBulb' },
  supply: { key: 'capacitySupplyDry', words: plain(words.supplyDry), dimension: 'temperature', path: 'supplyDryBulb' },
} as const satisfies Readonly<Record<string, SheetField>>;

const SECOND: Readonly<Record<HumidityBy, readonly [SheetField, SheetField]>> = {
  'wet-bulb': [
    { key: 'capacityReturnWet', words: plain(words.returnWet), dimension: 'temperature', path: 'returnWetBulb' },
    { key: 'capacitySupplyWet', words: plain(words.supplyWet), dimension: 'temperature', path: 'supplyWetBulb' },
  ],
  humidity: [
    {
      key: 'capacityReturnHumidity',
      words: plain(words.returnHumidity),
      dimension: 'humidity',
      path: 'returnRelativeHumidity',
    },
    {
      key: 'capacitySupplyHumidity',
      words: plain(words.supplyHumidity),
      dimension: 'humidity',
      path: 'supplyRelativeHumidity',
    },
  ],
};

export function capacityFields(by: HumidityBy): readonly SheetField[] {
  const [ofReturn, ofSupply] = SECOND[by];
  return [DRY_BULBS.return, ofReturn, DRY_BULBS.supply, ofSupply];
}

/** By the wet bulb, unless something else was chosen or only the humidity is known from the check. */
export function humidityBy({ sheet, known }: FilledSheet): HumidityBy {
  const chosen = HUMIDITY_BY.find((by) => by === sheet.choices['humidityBy']);
  if (chosen) return chosen;
  return known['capacityReturnHumidity'] && !known['capacityReturnWet'] ? 'humidity' : 'wet-bulb';
}

export function capacityRequest(
  filled: FilledSheet,
  airflow: Known,
  statedIn: AirflowResult['statedIn'],
): CapacityRequest {
  return {
    ...amountsOf(filled, [...capacityFields(humidityBy(filled)), ...SITE_FIELDS]),
    airflow: {
      value: flowFromM3PerS(airflow.value, 'L/s'),
      unit: 'L/s',
      plusMinus: { value: flowFromM3PerS(expandedUncertainty(airflow), 'L/s'), unit: 'L/s', kind: 'k2' },
    },
    airflowIn: statedIn,
  };
}
