import type { QuantityKind } from '@chargewright/engine';
import { presentValue, type ContractUnit } from './present-value';
import type { UnitSystem } from './unit-system';

/** Decimals on a screen: not more than the instruments show. */
const DECIMALS: Readonly<Record<ContractUnit, number>> = {
  degF: 1,
  degC: 1,
  deltaF: 1,
  deltaC: 1,
  psia: 1,
  kPaa: 0,
  bara: 2,
  psig: 1,
  kPag: 0,
  barg: 2,
  psi: 1,
  kPa: 0,
  bar: 2,
  '%': 0,
  '1': 4,
  'Btu/lb': 1,
  'kJ/kg': 1,
  'ft3/lb': 2,
  'm3/kg': 3,
  cfm: 0,
  'L/s': 0,
  ton: 1,
  kW: 1,
  oz: 1,
  g: 0,
  ft: 0,
  m: 0,
  min: 0,
  d: 0,
  V: 1,
  A: 1,
  W: 0,
  'Btu/h': 0,
  s: 1,
  ft3: 2,
  m3: 3,
  'Btu/ft3': 0,
  'MJ/m3': 1,
  inH2O: 2,
  Pa: 0,
  'lb/ft3': 4,
  'kg/m3': 2,
  'Btu/(lb·°F)': 4,
  'kJ/(kg·K)': 3,
  'lb/h': 0,
  'kg/s': 3,
  'cfm/ton': 0,
  'L/s/kW': 1,
  'oz/ft': 2,
  'g/m': 1,
};

/** Where the printed unit differs from its name in the contract. */
const LABELS: Readonly<Record<string, string>> = {
  degF: '°F',
  degC: '°C',
  deltaF: '°F',
  deltaC: '°C',
  inHgVac: 'inHg vacuum',
  inH2O: 'in. w.c.',
  '1': '',
  'ft3/lb': 'ft³/lb',
  'm3/kg': 'm³/kg',
  'm3/h': 'm³/h',
  ft3: 'ft³',
  m3: 'm³',
  'Btu/ft3': 'Btu/ft³',
  'MJ/m3': 'MJ/m³',
  'lb/ft3': 'lb/ft³',
  'kg/m3': 'kg/m³',
  'L/s/kW': 'L/s per kW',
  d: 'days',
};

/** A unit of the contract as it is printed. */
export const unitLabel = (unit: string): string => LABELS[unit] ?? unit;

/** A number with a true minus sign and never a minus zero. Twelve digits first: a typed 64.25 must not lose its half to the way through kelvin. */
export function formatNumber(value: number, decimals: number): string {
  const text = Number(value.toPrecision(12)).toFixed(decimals);
  return Number(text) === 0 ? text.replace('-', '') : text.replace('-', '−');
}

/** Like `formatNumber`, without zeros at the end. */
export const formatTrimmed = (value: number, decimals: number): string =>
  decimals === 0 ? formatNumber(value, 0) : formatNumber(value, decimals).replace(/\.?0+$/, '');

export const withUnit = (text: string, unit: ContractUnit): string => {
  if (unit === 'd' && text === '1') return '1 day';
  const label = unitLabel(unit);
  return label === '' ? text : `${text} ${label}`;
};

export const decimalsOfUnit = (unit: ContractUnit): number => DECIMALS[unit];

const decimalsOf = (kind: QuantityKind, unit: ContractUnit): number => (kind === 'count' ? 0 : DECIMALS[unit]);

/** "52.0 °F": an SI value of the engine, rounded for the eye. */
export function formatValue(kind: QuantityKind, value: number, system: UnitSystem): string {
  const shown = presentValue(kind, value, system);
  return withUnit(formatNumber(shown.value, decimalsOf(kind, shown.unit)), shown.unit);
}

/** "52 °F", "52.25 °F": what a person stated, said back without zeros at the end; one decimal more than `formatValue`. */
export function formatStated(kind: QuantityKind, value: number, system: UnitSystem): string {
  const shown = presentValue(kind, value, system);
  return withUnit(formatTrimmed(shown.value, decimalsOf(kind, shown.unit) + 1), shown.unit);
}

/** "92 °F": like `formatValue` without zeros at the end, for limits and conditions. */
export function formatShort(kind: QuantityKind, value: number, system: UnitSystem): string {
  const shown = presentValue(kind, value, system);
  return withUnit(formatTrimmed(shown.value, decimalsOf(kind, shown.unit)), shown.unit);
}

/** The bare number of `formatShort`, for scales whose unit stands once. */
export function formatBare(kind: QuantityKind, value: number, system: UnitSystem): string {
  const shown = presentValue(kind, value, system);
  return formatTrimmed(shown.value, decimalsOf(kind, shown.unit));
}

/** "52.0": the bare number of `formatValue`, for figures that keep their width while they change. */
export function formatFigure(kind: QuantityKind, value: number, system: UnitSystem): string {
  const shown = presentValue(kind, value, system);
  return formatNumber(shown.value, decimalsOf(kind, shown.unit));
}

/** A probability is never printed as certain. */
export function formatProbability(probability: number): string {
  const percent = Math.round(probability * 100);
  if (percent >= 100) return 'over 99 %';
  return percent <= 0 ? 'under 1 %' : `${percent} %`;
}
