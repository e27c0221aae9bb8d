/**
 * The constants of the airflow formulas against the figures the trade works with.
 * 1.08, 4.5, 0.0749 lb/ft³ and 3.413: common practice, no source. The Handbook's volumes and enthalpies: ../psychrometrics/ (ASHRAE Handbook - Fundamentals
 * 2017, ch. 1), quoted there with their provenance.
 */
import { describe, expect, it } from 'vitest';
import { airSpecificHeat, airSpecificVolume } from '../../../packages/engine/src/methods/airflow/air-properties';
import { dryAirMassFlowFromHeat } from '../../../packages/engine/src/methods/airflow/airflow-formulas';
import { STANDARD_AIR_DENSITY, standardAirflow } from '../../../packages/engine/src/methods/airflow/standard-air';
import { standardAtmospherePressurePa } from '../../../packages/engine/src/psychrometrics/standard-atmosphere';
import {
  flowFromM3PerS,
  lengthToM,
  powerFromW,
  powerToW,
  specificVolumeToFt3PerLb,
  temperatureToK,
} from '../../../packages/engine/src/units';
import {
  heatingValueFromJPerM3,
  heatingValueToJPerM3,
  volumeFromM3,
  volumeToM3,
} from '../../../packages/engine/src/units/fuel-gas';
import { lineRateFromKgPerM, lineRateToKgPerM } from '../../../packages/engine/src/units/line-rate';
import { micronsFromPa, micronsToPa } from '../../../packages/engine/src/units/vacuum';

const standardCfm = (btuPerHour: number, riseF: number, humidityRatio: number): number => {
  const dryAirMassFlowKgPerS = dryAirMassFlowFromHeat.of({
    heatW: powerToW(btuPerHour, 'Btu/h'),
    specificHeatJPerKgK: airSpecificHeat.of({ humidityRatio }),
    riseK: (riseF * 5) / 9,
  });
  return flowFromM3PerS(
    standardAirflow.of({ dryAirMassFlowKgPerS, standardDensityKgPerM3: STANDARD_AIR_DENSITY.value }),
    'cfm',
  );
};

describe('heat, rise and standard air', () => {
  it('is Btu/h = 1.08 × cfm × ΔT for dry standard air, within the rounding of 1.08', () => {
    expect(54_000 / (standardCfm(54_000, 50, 0) * 50)).toBeCloseTo(1.08, 2);
    expect(Math.abs(54_000 / (standardCfm(54_000, 50, 0) * 50) - 1.08)).toBeLessThan(0.002);
  });

  it('is 1.10 for the humidity of a cooled house, as some print it', () => {
    expect(54_000 / (standardCfm(54_000, 50, 0.01) * 50)).toBeCloseTo(1.1, 2);
  });

  it('counts 3.412 Btu/h for a watt, of which the trade’s 3.413 is a rounding', () => {
    expect(powerFromW(1, 'Btu/h')).toBeCloseTo(3.412142, 6);
    expect(Math.abs(powerFromW(1, 'Btu/h') - 3.413)).toBeLessThan(0.001);
  });

  it('has 1.2014 kg/m³ for 0.075 lb/ft³, 0.2 % under the 1.204 of SI tables', () => {
    expect(STANDARD_AIR_DENSITY.value).toBeCloseTo(1.2014, 4);
    expect(1.204 / STANDARD_AIR_DENSITY.value).toBeCloseTo(1.002, 3);
  });

  // the share that derates "1.08" by elevation on the job; 0.83 at a mile is common practice, the pressures are the Handbook's table 1
  it.each([
    [0, 14.696],
    [1000, 14.175],
    [3000, 13.173],
    [10_000, 10.108],
  ])('thins the air of %d ft with its pressure, %d psia', (feet, psia) => {
    const volume = (atmospherePa: number): number =>
      airSpecificVolume('return').of({
        dryBulbK: temperatureToK(70, 'degF'),
        humidityRatio: 0,
        pressurePa: atmospherePa,
      });
    const seaLevel = volume(standardAtmospherePressurePa(0));
    const here = volume(standardAtmospherePressurePa(lengthToM(feet, 'ft')));
    expect(here / seaLevel).toBeCloseTo(14.696 / psia, 3);
    // dry air of 70 °F at sea level: 13.35 ft³/lb, 0.0749 lb/ft³
    expect(specificVolumeToFt3PerLb(seaLevel)).toBeCloseTo(13.35, 2);
  });
});

describe('units of the field', () => {
  it('are exact by foot, pound and Btu, and go back', () => {
    expect(volumeToM3(1, 'ft3')).toBeCloseTo(0.028316846592, 15);
    expect(heatingValueToJPerM3(1000, 'Btu/ft3') / 1e6).toBeCloseTo(37.2589, 4);
    expect(lineRateToKgPerM(0.6, 'oz/ft') * 1e3).toBeCloseTo(55.8, 1);
    expect(micronsToPa(500)).toBeCloseTo(66.66, 2);
    expect(volumeFromM3(volumeToM3(2, 'ft3'), 'ft3')).toBeCloseTo(2, 12);
    expect(heatingValueFromJPerM3(heatingValueToJPerM3(38, 'MJ/m3'), 'MJ/m3')).toBeCloseTo(38, 12);
    expect(lineRateFromKgPerM(lineRateToKgPerM(15, 'g/m'), 'g/m')).toBeCloseTo(15, 12);
    expect(micronsFromPa(micronsToPa(300))).toBeCloseTo(300, 12);
  });
});
