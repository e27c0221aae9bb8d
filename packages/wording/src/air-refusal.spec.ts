import {
  attempt,
  MOIST_AIR_PAIRS,
  moistAirFromInchPoundEnthalpy,
  moistAirFromPair,
  temperatureToK,
} from '@chargewright/engine';
import type { MoistAir, MoistAirReading } from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import { airRefusal, refusedPairText } from './air-refusal';
import { airTexts } from './english/moist-air';
import { names } from './english/names';
import { formatAmount, formatShift, formatStatedAmount, formatVapourPressure } from './format-amount';

const pressurePa = 101_325;
const degF = (value: number) => temperatureToK(value, 'degF');

function refusalOf(make: () => MoistAir) {
  const result = attempt(make);
  if (result.ok) throw new Error('not refused');
  return result.error;
}

describe('why two readings give no air', () => {
  it('is said in the unit of the humidity ratio as it was given', () => {
    const refusal = refusalOf(() => moistAirFromPair({ pressurePa, dryBulbK: degF(80), humidityRatio: 225 / 7000 }));
    const pair = ['dryBulbK', 'humidityRatio'] as const;
    expect(airRefusal(refusal, { pair, system: 'F-psi', humidityRatioUnit: 'gr/lb' })).toEqual({
      at: 'humidityRatio',
      text: 'Humidity ratio 225 gr/lb is above 155.68 gr/lb, the most that air of this dry bulb can hold.',
    });
    expect(airRefusal(refusal, { pair, system: 'C-kPa' })?.text).toContain('kg/kg');
  });

  it('names the enthalpy of an inch-pound refusal, in Btu/lb whatever the unit system', () => {
    const refusal = refusalOf(() =>
      moistAirFromInchPoundEnthalpy({ pressurePa, dryBulbK: degF(80), enthalpyBtuPerLb: 12.5 }),
    );
    expect(airRefusal(refusal, { pair: ['dryBulbK', 'enthalpyJPerKg'], system: 'C-bar' })).toEqual({
      at: 'enthalpyJPerKg',
      text: 'Enthalpy 12.5 Btu/lb is below 19.2 Btu/lb, which perfectly dry air of this dry bulb has.',
    });
  });

  it('is none of the readings’ where the air pressure is refused', () => {
    const refusal = refusalOf(() => moistAirFromPair({ pressurePa: 2e5, dryBulbK: 300, wetBulbK: 290 }));
    expect(airRefusal(refusal, { pair: ['dryBulbK', 'wetBulbK'], system: 'F-psi' })).toBeNull();
  });

  it('is known of two pairs before anything is typed', () => {
    expect(refusedPairText(['enthalpyJPerKg', 'wetBulbK'])).toMatch(/^Wet bulb and enthalpy hardly differ/);
    expect(refusedPairText(['dewPointK', 'humidityRatio'])).toMatch(/^Dew point and humidity ratio say the same/);
    for (const pair of MOIST_AIR_PAIRS) expect(refusedPairText(pair)).toBe('');
  });

  it('can be said in another language', () => {
    const refusal = refusalOf(() => moistAirFromPair({ pressurePa, wetBulbK: 290, enthalpyJPerKg: 45e3 }));
    const pair: readonly [MoistAirReading, MoistAirReading] = ['wetBulbK', 'enthalpyJPerKg'];
    const language = { air: { ...airTexts, 'wet-bulb-and-enthalpy': 'Elija otro.' }, names };
    expect(airRefusal(refusal, { pair, system: 'C-kPa' }, language)).toEqual({
      at: 'enthalpyJPerKg',
      text: 'Elija otro.',
    });
  });
});

describe('an amount in its own unit', () => {
  it('is rounded for the eye, or said back as stated', () => {
    expect(formatAmount(31.4449, 'Btu/lb')).toBe('31.4 Btu/lb');
    expect(formatAmount(0.01118, 'lb/lb')).toBe('0.0112 lb/lb');
    expect(formatAmount(78.26, 'gr/lb')).toBe('78.3 gr/lb');
    expect(formatStatedAmount(31.25, 'kJ/kg')).toBe('31.25 kJ/kg');
    expect(formatStatedAmount(9, 'g/kg')).toBe('9 g/kg');
  });

  it('is fine enough for the pressure of water vapour', () => {
    expect(formatVapourPressure(1771, 'F-psi')).toBe('0.257 psia');
    expect(formatVapourPressure(1771, 'C-bar')).toBe('1.77 kPaa');
  });

  it('has a sign where it is a shift', () => {
    expect(formatShift(0.4277, 'F-psi')).toBe('+0.77 °F');
    expect(formatShift(-0.6333, 'C-bar')).toBe('−0.63 °C');
    expect(formatShift(0.001, 'C-kPa')).toBe('0.00 °C');
  });
});
