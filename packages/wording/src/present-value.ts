import {
  differenceFromK,
  flowFromM3PerS,
  lengthFromM,
  massFromKg,
  powerFromW,
  pressureDifferenceFromPa,
  pressureFromPa,
  specificEnergyDifferenceToBtuPerLb,
  specificVolumeToFt3PerLb,
  temperatureFromK,
  type QuantityKind,
} from '@chargewright/engine';
import type { UnitSystem } from './unit-system';

/** Units that answers use; readings and setups are typed in more (`unitLabel` knows them all). */
export type ContractUnit =
  | 'degF'
  | 'degC'
  | 'deltaF'
  | 'deltaC'
  | 'psia'
  | 'kPaa'
  | 'bara'
  | 'psi'
  | 'kPa'
  | 'bar'
  | '%'
  | '1'
  | 'Btu/lb'
  | 'kJ/kg'
  | 'ft3/lb'
  | 'm3/kg'
  | 'cfm'
  | 'L/s'
  | 'ton'
  | 'kW'
  | 'oz'
  | 'g'
  | 'ft'
  | 'm'
  | 'min'
  | 'd';

export interface PresentedValue {
  readonly value: number;
  readonly unit: ContractUnit;
}

/**
 * Dry air at 0 °C stands 160/9 K above the inch-pound datum (dry air at 0 °F) and has a specific heat of 1.006 kJ/(kg·K)
 * (ASHRAE Fundamentals (2017) ch. 1, eq. 30 SI). Against eq. 30 IP, whose own coefficients are rounded, this stays within 0.04 Btu/lb from 0 to 120 °F.
 */
const DATUM_SHIFT_J_PER_KG = (1006 * 160) / 9;

const inchPound = (kind: QuantityKind, value: number): PresentedValue => {
  switch (kind) {
    case 'temperatureK':
      return { value: temperatureFromK(value, 'degF'), unit: 'degF' };
    case 'differenceK':
      return { value: differenceFromK(value, 'deltaF'), unit: 'deltaF' };
    case 'pressurePa':
      return { value: pressureFromPa(value, 'psia', 0), unit: 'psia' };
    case 'pressureDifferencePa':
      return { value: pressureDifferenceFromPa(value, 'psi'), unit: 'psi' };
    case 'enthalpyJPerKg':
      return { value: specificEnergyDifferenceToBtuPerLb(value + DATUM_SHIFT_J_PER_KG), unit: 'Btu/lb' };
    case 'specificVolumeM3PerKg':
      return { value: specificVolumeToFt3PerLb(value), unit: 'ft3/lb' };
    case 'flowM3PerS':
      return { value: flowFromM3PerS(value, 'cfm'), unit: 'cfm' };
    case 'powerW':
      return { value: powerFromW(value, 'ton'), unit: 'ton' };
    case 'massKg':
      return { value: massFromKg(value, 'oz'), unit: 'oz' };
    case 'lengthM':
      return { value: lengthFromM(value, 'ft'), unit: 'ft' };
    case 'fraction':
    case 'humidityRatio':
    case 'minutes':
    case 'days':
    case 'count':
      return unitless(kind, value);
  }
};

const metric = (kind: QuantityKind, value: number, bar: boolean): PresentedValue => {
  switch (kind) {
    case 'temperatureK':
      return { value: temperatureFromK(value, 'degC'), unit: 'degC' };
    case 'differenceK':
      return { value: differenceFromK(value, 'deltaC'), unit: 'deltaC' };
    case 'pressurePa': {
      const unit = bar ? 'bara' : 'kPaa';
      return { value: pressureFromPa(value, unit, 0), unit };
    }
    case 'pressureDifferencePa': {
      const unit = bar ? 'bar' : 'kPa';
      return { value: pressureDifferenceFromPa(value, unit), unit };
    }
    case 'enthalpyJPerKg':
      return { value: value / 1e3, unit: 'kJ/kg' };
    case 'specificVolumeM3PerKg':
      return { value, unit: 'm3/kg' };
    case 'flowM3PerS':
      return { value: flowFromM3PerS(value, 'L/s'), unit: 'L/s' };
    case 'powerW':
      return { value: powerFromW(value, 'kW'), unit: 'kW' };
    case 'massKg':
      return { value: massFromKg(value, 'g'), unit: 'g' };
    case 'lengthM':
      return { value, unit: 'm' };
    case 'fraction':
    case 'humidityRatio':
    case 'minutes':
    case 'days':
    case 'count':
      return unitless(kind, value);
  }
};

const unitless = (kind: 'fraction' | 'humidityRatio' | 'minutes' | 'days' | 'count', value: number): PresentedValue => {
  switch (kind) {
    case 'fraction':
      return { value: value * 100, unit: '%' };
    case 'humidityRatio':
    case 'count':
      return { value, unit: '1' };
    case 'minutes':
      return { value, unit: 'min' };
    case 'days':
      return { value, unit: 'd' };
  }
};

/**
 * An SI value of the engine in the unit a person or the API reads, unrounded. Pressures stay absolute. Total for finite numbers.
 * An enthalpy is that of moist air on the datum of its unit: use it for states, never for differences.
 */
export const presentValue = (kind: QuantityKind, value: number, system: UnitSystem): PresentedValue =>
  system === 'F-psi' ? inchPound(kind, value) : metric(kind, value, system === 'C-bar');
