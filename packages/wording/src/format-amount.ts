import type { EnthalpyUnit, HumidityRatioUnit } from '@chargewright/engine';
import { decimalsOfUnit, formatNumber, formatTrimmed, unitLabel } from './format-value';
import { presentValue } from './present-value';
import type { UnitSystem } from './unit-system';

/** Units whose value the SI one and the unit system alone do not tell: an inch-pound enthalpy has its own datum, a humidity ratio several units. */
export type AmountUnit = EnthalpyUnit | HumidityRatioUnit;

const DECIMALS: Readonly<Record<HumidityRatioUnit, number>> = { 'kg/kg': 4, 'lb/lb': 4, 'g/kg': 1, 'gr/lb': 1 };

const decimalsOf = (unit: AmountUnit): number =>
  unit === 'Btu/lb' || unit === 'kJ/kg' ? decimalsOfUnit(unit) : DECIMALS[unit];

/** "31.4 Btu/lb": an amount that is in its unit already, rounded for the eye. */
export const formatAmount = (value: number, unit: AmountUnit): string =>
  `${formatNumber(value, decimalsOf(unit))} ${unitLabel(unit)}`;

/** "31.25 Btu/lb": what a person stated, said back without zeros at the end; one decimal more than `formatAmount`. */
export const formatStatedAmount = (value: number, unit: AmountUnit): string =>
  `${formatTrimmed(value, decimalsOf(unit) + 1)} ${unitLabel(unit)}`;

/** "+0.77 °F": how far one value lies from another, with one decimal more than a value has, and its sign. */
export function formatShift(kelvin: number, system: UnitSystem): string {
  const { value, unit } = presentValue('differenceK', kelvin, system);
  const text = formatNumber(value, decimalsOfUnit(unit) + 1);
  const sign = Number(text) > 0 ? '+' : '';
  return `${sign}${text} ${unitLabel(unit)}`;
}

/** "0.257 psia", "1.77 kPaa": the pressure of water vapour, of which a gauge's decimals would leave little. */
export const formatVapourPressure = (pressurePa: number, system: UnitSystem): string =>
  system === 'F-psi'
    ? `${formatNumber(presentValue('pressurePa', pressurePa, system).value, 3)} ${unitLabel('psia')}`
    : `${formatNumber(presentValue('pressurePa', pressurePa, 'C-kPa').value, 2)} ${unitLabel('kPaa')}`;
