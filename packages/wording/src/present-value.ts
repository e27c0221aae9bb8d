import {
  differenceFromK,
  differenceToK,
  flowFromM3PerS,
  heatingValueFromJPerM3,
  lengthFromM,
  lineRateFromKgPerM,
  massFromKg,
  PA_PER_INH2O,
  powerFromW,
  powerToW,
  pressureDifferenceFromPa,
  pressureFromPa,
  specificEnergyDifferenceToBtuPerLb,
  specificVolumeToFt3PerLb,
  temperatureFromK,
  volumeFromM3,
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
  | 'psig'
  | 'kPag'
  | 'barg'
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
  | 'd'
  | 'V'
  | 'A'
  | 'W'
  | 'Btu/h'
  | 's'
  | 'ft3'
  | 'm3'
  | 'Btu/ft3'
  | 'MJ/m3'
  | 'inH2O'
  | 'Pa'
  | 'lb/ft3'
  | 'kg/m3'
  | 'Btu/(lb·°F)'
  | 'kJ/(kg·K)'
  | 'lb/h'
  | 'kg/s'
  | 'cfm/ton'
  | 'L/s/kW'
  | 'oz/ft'
  | 'g/m';

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
    case 'gaugePressurePa':
      return { value: pressureDifferenceFromPa(value, 'psi'), unit: 'psig' };
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
    case 'heatRateW':
      return { value: powerFromW(value, 'Btu/h'), unit: 'Btu/h' };
    case 'gasVolumeM3':
      return { value: volumeFromM3(value, 'ft3'), unit: 'ft3' };
    case 'heatingValueJPerM3':
      return { value: heatingValueFromJPerM3(value, 'Btu/ft3'), unit: 'Btu/ft3' };
    case 'staticPressurePa':
      return { value: value / PA_PER_INH2O, unit: 'inH2O' };
    case 'densityKgPerM3':
      return { value: 1 / specificVolumeToFt3PerLb(1 / value), unit: 'lb/ft3' };
    case 'specificHeatJPerKgK':
      return { value: differenceToK(specificEnergyDifferenceToBtuPerLb(value), 'deltaF'), unit: 'Btu/(lb·°F)' };
    case 'enthalpyDifferenceJPerKg':
      return { value: specificEnergyDifferenceToBtuPerLb(value), unit: 'Btu/lb' };
    case 'massFlowKgPerS':
      return { value: 3600 * massFromKg(value, 'lb'), unit: 'lb/h' };
    case 'flowPerCapacityM3PerSPerW':
      return { value: flowFromM3PerS(value * powerToW(1, 'ton'), 'cfm'), unit: 'cfm/ton' };
    case 'chargeRateKgPerM':
      return { value: lineRateFromKgPerM(value, 'oz/ft'), unit: 'oz/ft' };
    case 'voltageV':
    case 'currentA':
    case 'electricPowerW':
    case 'durationS':
      return electrical(kind, value);
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
    case 'gaugePressurePa':
      return bar
        ? { value: pressureDifferenceFromPa(value, 'bar'), unit: 'barg' }
        : { value: pressureDifferenceFromPa(value, 'kPa'), unit: 'kPag' };
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
    case 'heatRateW':
      return { value: powerFromW(value, 'kW'), unit: 'kW' };
    case 'gasVolumeM3':
      return { value, unit: 'm3' };
    case 'heatingValueJPerM3':
      return { value: heatingValueFromJPerM3(value, 'MJ/m3'), unit: 'MJ/m3' };
    case 'staticPressurePa':
      return { value, unit: 'Pa' };
    case 'densityKgPerM3':
      return { value, unit: 'kg/m3' };
    case 'specificHeatJPerKgK':
      return { value: value / 1e3, unit: 'kJ/(kg·K)' };
    case 'enthalpyDifferenceJPerKg':
      return { value: value / 1e3, unit: 'kJ/kg' };
    case 'massFlowKgPerS':
      return { value, unit: 'kg/s' };
    case 'flowPerCapacityM3PerSPerW':
      return { value: flowFromM3PerS(value * powerToW(1, 'kW'), 'L/s'), unit: 'L/s/kW' };
    case 'chargeRateKgPerM':
      return { value: lineRateFromKgPerM(value, 'g/m'), unit: 'g/m' };
    case 'voltageV':
    case 'currentA':
    case 'electricPowerW':
    case 'durationS':
      return electrical(kind, value);
    case 'fraction':
    case 'humidityRatio':
    case 'minutes':
    case 'days':
    case 'count':
      return unitless(kind, value);
  }
};

const ELECTRICAL = { voltageV: 'V', currentA: 'A', electricPowerW: 'W', durationS: 's' } as const;

/** The same on both sides of the ocean. */
const electrical = (kind: keyof typeof ELECTRICAL, value: number): PresentedValue => ({
  value,
  unit: ELECTRICAL[kind],
});

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
 * An SI value of the engine in the unit a person or the API reads, unrounded. A pressure is absolute unless it is a gauge one. Total for finite numbers.
 * An enthalpy is that of moist air on the datum of its unit: use it for states, never for differences.
 */
export const presentValue = (kind: QuantityKind, value: number, system: UnitSystem): PresentedValue =>
  system === 'F-psi' ? inchPound(kind, value) : metric(kind, value, system === 'C-bar');
