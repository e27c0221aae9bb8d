import { describe, expect, it } from 'vitest';
import {
  DIFFERENCE_UNITS,
  differenceFromK,
  differenceToK,
  FLOW_UNITS,
  flowFromM3PerS,
  flowToM3PerS,
  isGaugeUnit,
  HUMIDITY_RATIO_UNITS,
  humidityRatioToKgPerKg,
  humidityRatioFromKgPerKg,
  LENGTH_UNITS,
  lengthFromM,
  lengthToM,
  MASS_UNITS,
  massFromKg,
  massToKg,
  moistAirEnthalpyBtuPerLb,
  POWER_UNITS,
  powerFromW,
  powerToW,
  PRESSURE_DIFFERENCE_UNITS,
  PRESSURE_UNITS,
  pressureAsReadToPa,
  pressureDifferenceFromPa,
  pressureDifferenceToPa,
  pressureFromPa,
  pressureToPa,
  specificEnergyDifferenceToBtuPerLb,
  specificVolumeToFt3PerLb,
  staticPressureToPa,
  TEMPERATURE_UNITS,
  temperatureFromK,
  temperatureToK,
  ouncesOfPoundsAndOunces,
} from './index';

describe('fixed points', () => {
  it('of the temperature scales: −40 is one temperature, water freezes at 32, a step is 5/9', () => {
    expect(temperatureToK(-40, 'degF')).toBeCloseTo(temperatureToK(-40, 'degC'), 12);
    expect(temperatureToK(32, 'degF')).toBe(273.15);
    expect(temperatureToK(-459.67, 'degF')).toBeCloseTo(0, 10);
    expect(differenceToK(9, 'deltaF')).toBe(5);
    expect(differenceToK(9, 'deltaC')).toBe(9);
  });

  it.each([
    ['a pound of force per square inch', pressureDifferenceToPa(1, 'psi'), (0.45359237 * 9.80665) / 0.0254 ** 2],
    ['a bar', pressureDifferenceToPa(1, 'bar'), 1e5],
    ['an inch of water', staticPressureToPa(1, 'inH2O'), 249.082],
    ['a pascal', staticPressureToPa(1, 'Pa'), 1],
    ['a foot', lengthToM(1, 'ft'), 12 * 0.0254],
    ['a cubic foot a minute', flowToM3PerS(1, 'cfm'), (12 * 0.0254) ** 3 / 60],
    ['a ton of refrigeration', powerToW(1, 'ton'), (12_000 * 1055.05585262) / 3600],
    ['an ounce', massToKg(1, 'oz'), 0.028349523125],
    ['a gram', massToKg(1, 'g'), 0.001],
  ])('%s', (_, converted, si) => {
    expect(converted / si).toBeCloseTo(1, 11);
  });

  it('of pressures: gauge counts from the atmosphere given, vacuum downwards', () => {
    expect(pressureToPa(0, 'psig', 101_325)).toBe(101_325);
    expect(pressureToPa(14.695949, 'psia', 0)).toBeCloseTo(101_325, 1);
    // 29.921 inches of mercury are one atmosphere
    expect(Math.abs(pressureToPa(29.9213, 'inHgVac', 101_325))).toBeLessThan(1);
    expect(pressureAsReadToPa(1, 'barg')).toBe(1e5);
    expect(PRESSURE_UNITS.filter(isGaugeUnit)).toEqual(['psig', 'kPag', 'barg', 'inHgVac']);
  });

  it('of moist air: the handbook’s 100 °F and 0.00523 lb/lb hold 29.80 Btu/lb, 14.22 ft³/lb are 0.8877 m³/kg', () => {
    expect(moistAirEnthalpyBtuPerLb(100, 0.00523)).toBeCloseTo(29.8, 1);
    expect(specificVolumeToFt3PerLb(0.8877)).toBeCloseTo(14.22, 2);
    expect(specificEnergyDifferenceToBtuPerLb(2326)).toBeCloseTo(1, 6);
    expect(humidityRatioToKgPerKg(70, 'gr/lb')).toBeCloseTo(0.01, 15);
    expect(humidityRatioToKgPerKg(10, 'g/kg')).toBeCloseTo(0.01, 15);
  });
});

it.each([
  [6, 4, 100],
  [0, 12, 12],
  [-1, 8, -24],
  [-0, 8, -8],
])('%d lb and %d oz are %d oz', (pounds, ounces, together) =>
  expect(ouncesOfPoundsAndOunces(pounds, ounces)).toBe(together),
);

it('every unit comes back as it went', () => {
  const there: (readonly [string, number])[] = [
    ...TEMPERATURE_UNITS.map((unit) => [unit, temperatureFromK(temperatureToK(71.3, unit), unit)] as const),
    ...DIFFERENCE_UNITS.map((unit) => [unit, differenceFromK(differenceToK(71.3, unit), unit)] as const),
    ...PRESSURE_UNITS.map((unit) => [unit, pressureFromPa(pressureToPa(71.3, unit, 98_765), unit, 98_765)] as const),
    ...PRESSURE_DIFFERENCE_UNITS.map(
      (unit) => [unit, pressureDifferenceFromPa(pressureDifferenceToPa(71.3, unit), unit)] as const,
    ),
    ...LENGTH_UNITS.map((unit) => [unit, lengthFromM(lengthToM(71.3, unit), unit)] as const),
    ...FLOW_UNITS.map((unit) => [unit, flowFromM3PerS(flowToM3PerS(71.3, unit), unit)] as const),
    ...POWER_UNITS.map((unit) => [unit, powerFromW(powerToW(71.3, unit), unit)] as const),
    ...MASS_UNITS.map((unit) => [unit, massFromKg(massToKg(71.3, unit), unit)] as const),
    ...HUMIDITY_RATIO_UNITS.map(
      (unit) => [unit, humidityRatioFromKgPerKg(humidityRatioToKgPerKg(71.3, unit), unit)] as const,
    ),
  ];
  expect(there.length).toBeGreaterThan(25);
  for (const [unit, back] of there) expect(back, unit).toBeCloseTo(71.3, 9);
});
