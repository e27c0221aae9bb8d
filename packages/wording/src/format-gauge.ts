import { pressureFromPa } from '@chargewright/engine';
import type { PressureUnit } from '@chargewright/engine';
import { formatNumber, unitLabel } from './format-value';
import type { UnitSystem } from './unit-system';

const GAUGE: Readonly<Record<UnitSystem, readonly [unit: PressureUnit, decimals: number]>> = {
  'F-psi': ['psig', 1],
  'C-kPa': ['kPag', 0],
  'C-bar': ['barg', 2],
};

/** The unit of gauge pressures in a unit system: "psig". */
export const gaugeUnit = (system: UnitSystem): string => unitLabel(GAUGE[system][0]);

/** "118.0": an absolute pressure as a gauge shows it; below the atmosphere, in inch-pound units, "5.1 inHg vacuum" as the gauge counts there. */
export function formatGaugeFigure(pressurePa: number, atmospherePa: number, system: UnitSystem): string {
  const [unit, decimals] = GAUGE[system];
  const text = formatNumber(pressureFromPa(pressurePa, unit, atmospherePa), decimals);
  if (system !== 'F-psi' || !text.startsWith('−')) return text;
  return `${formatNumber(pressureFromPa(pressurePa, 'inHgVac', atmospherePa), 1)} ${unitLabel('inHgVac')}`;
}

/** "118.0 psig" */
export function formatGauge(pressurePa: number, atmospherePa: number, system: UnitSystem): string {
  const figure = formatGaugeFigure(pressurePa, atmospherePa, system);
  return /[a-z]/i.test(figure) ? figure : `${figure} ${gaugeUnit(system)}`;
}
