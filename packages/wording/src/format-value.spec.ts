import { differenceToK, lengthToM, temperatureToK } from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import { formatNumber, formatProbability, formatShort, formatStated, formatValue, unitLabel } from './format-value';

const f = (value: number) => temperatureToK(value, 'degF');

describe('formatNumber', () => {
  it('writes a true minus sign and no minus zero', () => {
    expect(formatNumber(-3.25, 1)).toBe('−3.3');
    expect(formatNumber(-0.04, 1)).toBe('0.0');
    expect(formatNumber(0, 0)).toBe('0');
  });

  it('keeps the half of a number that came through kelvin', () => {
    for (let tenths = -400; tenths <= 2500; tenths += 1) {
      const typed = tenths / 20;
      expect(formatValue('temperatureK', f(typed), 'F-psi')).toBe(`${formatNumber(typed, 1)} °F`);
    }
  });
});

describe('formatValue', () => {
  it('rounds to what instruments show', () => {
    expect(formatValue('temperatureK', f(52), 'F-psi')).toBe('52.0 °F');
    expect(formatValue('temperatureK', f(-40), 'C-bar')).toBe('−40.0 °C');
    expect(formatValue('pressurePa', 902_500, 'F-psi')).toBe('130.9 psia');
    expect(formatValue('pressurePa', 902_500, 'C-kPa')).toBe('903 kPaa');
    expect(formatValue('pressurePa', 902_500, 'C-bar')).toBe('9.03 bara');
    expect(formatValue('fraction', 0.476, 'C-bar')).toBe('48 %');
    expect(formatValue('humidityRatio', 0.01012, 'C-bar')).toBe('0.0101');
    expect(formatValue('lengthM', lengthToM(650, 'ft'), 'F-psi')).toBe('650 ft');
    expect(formatValue('count', 3, 'F-psi')).toBe('3');
    expect(formatValue('days', 1, 'F-psi')).toBe('1 day');
    expect(formatValue('days', 400, 'F-psi')).toBe('400 days');
  });

  it('prints a difference without an offset', () => {
    expect(formatValue('differenceK', differenceToK(9.5, 'deltaF'), 'F-psi')).toBe('9.5 °F');
    expect(formatValue('differenceK', 5, 'C-kPa')).toBe('5.0 °C');
  });
});

describe('formatStated and formatShort', () => {
  it('say a number back as it was typed', () => {
    expect(formatStated('temperatureK', f(81), 'F-psi')).toBe('81 °F');
    expect(formatStated('temperatureK', f(78.04), 'F-psi')).toBe('78.04 °F');
    expect(formatStated('temperatureK', f(100), 'F-psi')).toBe('100 °F');
    expect(formatShort('temperatureK', f(92), 'F-psi')).toBe('92 °F');
    expect(formatShort('flowM3PerS', 0.5, 'C-bar')).toBe('500 L/s');
  });
});

describe('formatProbability', () => {
  it('is never certain', () => {
    expect(formatProbability(0.9999)).toBe('over 99 %');
    expect(formatProbability(0.0001)).toBe('under 1 %');
    expect(formatProbability(0.694)).toBe('69 %');
  });
});

describe('unitLabel', () => {
  it('prints what the contract spells', () => {
    expect(unitLabel('deltaF')).toBe('°F');
    expect(unitLabel('m3/h')).toBe('m³/h');
    expect(unitLabel('psig')).toBe('psig');
  });
});
