import { moistAirEnthalpyBtuPerLb, temperatureToK, type QuantityKind } from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import { presentValue } from './present-value';
import { UNIT_SYSTEMS, type UnitSystem } from './unit-system';

const KINDS: readonly QuantityKind[] = [
  'temperatureK',
  'differenceK',
  'pressurePa',
  'pressureDifferencePa',
  'fraction',
  'humidityRatio',
  'enthalpyJPerKg',
  'specificVolumeM3PerKg',
  'flowM3PerS',
  'powerW',
  'massKg',
  'lengthM',
  'voltageV',
  'currentA',
  'electricPowerW',
  'heatRateW',
  'durationS',
  'gasVolumeM3',
  'heatingValueJPerM3',
  'staticPressurePa',
  'densityKgPerM3',
  'specificHeatJPerKgK',
  'enthalpyDifferenceJPerKg',
  'massFlowKgPerS',
  'flowPerCapacityM3PerSPerW',
  'chargeRateKgPerM',
  'minutes',
  'days',
  'count',
];

describe('presentValue', () => {
  it.each<[QuantityKind, number, UnitSystem, number, string]>([
    ['temperatureK', 273.15, 'F-psi', 32, 'degF'],
    ['temperatureK', 273.15, 'C-kPa', 0, 'degC'],
    ['temperatureK', 273.15, 'C-bar', 0, 'degC'],
    ['differenceK', 5, 'F-psi', 9, 'deltaF'],
    ['differenceK', 5, 'C-bar', 5, 'deltaC'],
    ['pressurePa', 101_325, 'F-psi', 14.6959487755, 'psia'],
    ['pressurePa', 101_325, 'C-kPa', 101.325, 'kPaa'],
    ['pressurePa', 101_325, 'C-bar', 1.01325, 'bara'],
    ['pressureDifferencePa', 101_325, 'F-psi', 14.6959487755, 'psi'],
    ['pressureDifferencePa', 101_325, 'C-kPa', 101.325, 'kPa'],
    ['pressureDifferencePa', 101_325, 'C-bar', 1.01325, 'bar'],
    ['fraction', 0.48, 'F-psi', 48, '%'],
    ['humidityRatio', 0.0112, 'F-psi', 0.0112, '1'],
    ['enthalpyJPerKg', 50_000, 'C-kPa', 50, 'kJ/kg'],
    // 0.3048³ m³ in 0.45359237 kg
    ['specificVolumeM3PerKg', 0.028316846592 / 0.45359237, 'F-psi', 1, 'ft3/lb'],
    ['specificVolumeM3PerKg', 0.85, 'C-bar', 0.85, 'm3/kg'],
    ['flowM3PerS', 0.5, 'C-kPa', 500, 'L/s'],
    // 400 cfm
    ['flowM3PerS', (400 * 0.028316846592) / 60, 'F-psi', 400, 'cfm'],
    ['powerW', 3516.8528420667, 'F-psi', 1, 'ton'],
    ['powerW', 3500, 'C-bar', 3.5, 'kW'],
    ['massKg', 0.45359237, 'F-psi', 16, 'oz'],
    ['massKg', 0.45359237, 'C-kPa', 453.59237, 'g'],
    ['lengthM', 3.048, 'F-psi', 10, 'ft'],
    ['lengthM', 3.048, 'C-bar', 3.048, 'm'],
    ['heatRateW', 1055.05585262 / 3.6, 'F-psi', 1000, 'Btu/h'],
    ['heatRateW', 5000, 'C-kPa', 5, 'kW'],
    ['electricPowerW', 5000, 'F-psi', 5000, 'W'],
    ['voltageV', 240, 'C-bar', 240, 'V'],
    ['currentA', 20.8, 'F-psi', 20.8, 'A'],
    ['durationS', 36, 'F-psi', 36, 's'],
    ['gasVolumeM3', 0.028316846592, 'F-psi', 1, 'ft3'],
    ['gasVolumeM3', 0.01, 'C-kPa', 0.01, 'm3'],
    // 1 Btu = 1055.05585262 J in a cubic foot
    ['heatingValueJPerM3', (1000 * 1055.05585262) / 0.028316846592, 'F-psi', 1000, 'Btu/ft3'],
    ['heatingValueJPerM3', 38e6, 'C-kPa', 38, 'MJ/m3'],
    ['staticPressurePa', 124.541, 'F-psi', 0.5, 'inH2O'],
    ['staticPressurePa', 125, 'C-kPa', 125, 'Pa'],
    ['densityKgPerM3', (0.075 * 0.45359237) / 0.028316846592, 'F-psi', 0.075, 'lb/ft3'],
    ['densityKgPerM3', 1.2, 'C-bar', 1.2, 'kg/m3'],
    ['specificHeatJPerKgK', 4186.8, 'F-psi', 1, 'Btu/(lb·°F)'],
    ['specificHeatJPerKgK', 1006, 'C-kPa', 1.006, 'kJ/(kg·K)'],
    ['enthalpyDifferenceJPerKg', 2326, 'F-psi', 1, 'Btu/lb'],
    ['enthalpyDifferenceJPerKg', 250, 'C-kPa', 0.25, 'kJ/kg'],
    ['massFlowKgPerS', 0.45359237, 'F-psi', 3600, 'lb/h'],
    ['massFlowKgPerS', 0.6, 'C-kPa', 0.6, 'kg/s'],
    ['flowPerCapacityM3PerSPerW', (400 * 0.028316846592) / 60 / 3516.8528420667, 'F-psi', 400, 'cfm/ton'],
    ['flowPerCapacityM3PerSPerW', 5e-5, 'C-kPa', 50, 'L/s/kW'],
    ['chargeRateKgPerM', (0.6 * 0.45359237) / 16 / 0.3048, 'F-psi', 0.6, 'oz/ft'],
    ['chargeRateKgPerM', 0.015, 'C-bar', 15, 'g/m'],
    ['minutes', 15, 'F-psi', 15, 'min'],
    ['days', 31, 'C-bar', 31, 'd'],
    ['count', 2, 'C-bar', 2, '1'],
  ])('%s %d in %s is %d %s', (kind, si, system, value, unit) => {
    const shown = presentValue(kind, si, system);
    expect(shown.value).toBeCloseTo(value, 9);
    expect(shown.unit).toBe(unit);
  });

  it('has a unit for every kind in every system', () => {
    for (const kind of KINDS) {
      for (const system of UNIT_SYSTEMS) expect(presentValue(kind, 1, system).unit, `${kind} ${system}`).toBeTruthy();
    }
  });

  it('puts an enthalpy on the inch-pound datum, within what the rounded coefficients of the handbook leave open', () => {
    for (const dryBulbF of [0, 32, 60, 80, 100, 120]) {
      for (const humidityRatio of [0, 0.005, 0.01, 0.02]) {
        const celsius = temperatureToK(dryBulbF, 'degF') - 273.15;
        // ASHRAE Fundamentals (2017) ch. 1, eq. 30 SI
        const si = 1006 * celsius + humidityRatio * (2_501_000 + 1860 * celsius);
        const shown = presentValue('enthalpyJPerKg', si, 'F-psi').value;
        expect(Math.abs(shown - moistAirEnthalpyBtuPerLb(dryBulbF, humidityRatio))).toBeLessThan(0.04);
      }
    }
  });
});
