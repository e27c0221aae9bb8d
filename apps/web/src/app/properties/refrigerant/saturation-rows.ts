/** Rows of a pressure-temperature table at whole temperatures of a unit system. */
import {
  attempt,
  bubblePressurePa,
  dewPressurePa,
  saturationRange,
  temperatureFromK,
  temperatureToK,
  type RefrigerantId,
  type TemperatureUnit,
} from '@chargewright/engine';
import { formatGaugeFigure, formatNumber, type UnitSystem } from '@chargewright/wording';

export interface SaturationRow {
  /** In the scale's degrees; unique in its table. */
  readonly degrees: number;
  readonly temperature: string;
  readonly bubble: string;
  readonly dew: string;
}

export interface SaturationTable {
  readonly refrigerant: RefrigerantId;
  readonly atmospherePa: number;
  readonly system: UnitSystem;
}

const scaleOf = (system: UnitSystem): TemperatureUnit => (system === 'F-psi' ? 'degF' : 'degC');

/** Null at a temperature the curves do not reach. */
function row({ refrigerant, atmospherePa, system }: SaturationTable, degrees: number): SaturationRow | null {
  const temperatureK = temperatureToK(degrees, scaleOf(system));
  const bubble = attempt(() => bubblePressurePa({ refrigerant, temperatureK }));
  const dew = attempt(() => dewPressurePa({ refrigerant, temperatureK }));
  if (!bubble.ok || !dew.ok) return null;
  return {
    degrees,
    temperature: formatNumber(degrees, 0),
    bubble: formatGaugeFigure(bubble.value, atmospherePa, system),
    dew: formatGaugeFigure(dew.value, atmospherePa, system),
  };
}

const rows = (table: SaturationTable, degrees: readonly number[]): readonly SaturationRow[] =>
  degrees.map((each) => row(table, each)).filter((each) => each !== null);

const ROWS_EACH_WAY = 7;

/** Whole degrees to both sides of a temperature, as far as the curves reach. */
export function rowsAround(table: SaturationTable, temperatureK: number): readonly SaturationRow[] {
  const nearest = nearestDegrees(table.system, temperatureK);
  return rows(
    table,
    Array.from({ length: 2 * ROWS_EACH_WAY + 1 }, (_, k) => nearest - ROWS_EACH_WAY + k),
  );
}

export const nearestDegrees = (system: UnitSystem, temperatureK: number): number =>
  Math.round(temperatureFromK(temperatureK, scaleOf(system)));

/** What air conditioners, heat pumps and coolers meet; a card with more would not fit a page. */
const CARD_SPAN: Readonly<
  Record<TemperatureUnit & ('degF' | 'degC'), readonly [low: number, high: number, step: number]>
> = {
  degF: [-50, 160, 2],
  degC: [-45, 70, 1],
};

/** The whole table of a card, as far as the curves reach within its span. */
export function cardRows(table: SaturationTable): readonly SaturationRow[] {
  const scale = table.system === 'F-psi' ? 'degF' : 'degC';
  const [low, high, step] = CARD_SPAN[scale];
  const { minTemperatureK, maxTemperatureK } = saturationRange(table.refrigerant);
  const first = Math.max(low, Math.ceil(temperatureFromK(minTemperatureK, scale) / step) * step);
  const last = Math.min(high, temperatureFromK(maxTemperatureK, scale));
  const count = Math.floor((last - first) / step) + 1;
  return rows(
    table,
    Array.from({ length: count }, (_, k) => first + k * step),
  );
}
