import { pressureToPa } from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import { formatGauge, formatGaugeFigure, gaugeUnit } from './format-gauge';

const ATMOSPHERE_PA = 101_325;

describe('a pressure as a gauge shows it', () => {
  it.each([
    ['F-psi', '118.0 psig'],
    ['C-kPa', '814 kPag'],
    ['C-bar', '8.14 barg'],
  ] as const)('in %s', (system, text) => {
    expect(formatGauge(pressureToPa(118, 'psig', ATMOSPHERE_PA), ATMOSPHERE_PA, system)).toBe(text);
    expect(text.endsWith(gaugeUnit(system))).toBe(true);
  });

  it('counts inches of mercury below the atmosphere in inch-pound units, and below zero in the others', () => {
    const vacuum = pressureToPa(5.1, 'inHgVac', ATMOSPHERE_PA);
    expect(formatGauge(vacuum, ATMOSPHERE_PA, 'F-psi')).toBe('5.1 inHg vacuum');
    expect(formatGauge(vacuum, ATMOSPHERE_PA, 'C-kPa')).toBe('−17 kPag');
    expect(formatGauge(ATMOSPHERE_PA - 1, ATMOSPHERE_PA, 'F-psi')).toBe('0.0 psig');
    expect(formatGaugeFigure(ATMOSPHERE_PA, ATMOSPHERE_PA, 'C-bar')).toBe('0.00');
  });
});
