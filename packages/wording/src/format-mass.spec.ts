import { massToKg } from '@chargewright/engine';
import { describe, expect, it } from 'vitest';
import { formatMass, formatMassBoth, formatMassPlain } from './format-mass';

describe('refrigerant as it is weighed', () => {
  it.each([
    [0, '0 oz', '0 oz'],
    [6.25, '6.3 oz', '6.3 oz'],
    [15.94, '15.9 oz', '15.9 oz'],
    // rounded first: no "0 lb 16 oz"
    [15.96, '1 lb 0 oz', '16 oz'],
    [16, '1 lb 0 oz', '16 oz'],
    [18, '1 lb 2 oz', '18 oz'],
    [100, '6 lb 4 oz', '100 oz'],
    [111.97, '7 lb 0 oz', '112 oz'],
    [114.5, '7 lb 2.5 oz', '114.5 oz'],
    [-3, '−3 oz', '−3 oz'],
    [-18, '−1 lb 2 oz', '−18 oz'],
  ])('%d oz is %s or %s', (oz, split, plain) => {
    expect(formatMass(massToKg(oz, 'oz'), 'F-psi')).toBe(split);
    expect(formatMassPlain(massToKg(oz, 'oz'), 'F-psi')).toBe(plain);
  });

  it.each([
    [0, '0 g'],
    [0.5103, '510 g'],
    [0.9994, '999 g'],
    [0.9996, '1 kg'],
    [2.8355, '2.836 kg'],
    [-0.085, '−85 g'],
    [-1.25, '−1.25 kg'],
  ])('%d kg is %s', (kg, text) => {
    expect(formatMass(kg, 'C-kPa')).toBe(text);
    expect(formatMass(kg, 'C-bar')).toBe(text);
  });

  it('is said both ways only where they differ', () => {
    expect(formatMassBoth(massToKg(18, 'oz'), 'F-psi')).toBe('1 lb 2 oz (18 oz)');
    expect(formatMassBoth(massToKg(12, 'oz'), 'F-psi')).toBe('12 oz');
    expect(formatMassBoth(1.5, 'C-kPa')).toBe('1.5 kg (1500 g)');
    expect(formatMassBoth(0.5, 'C-kPa')).toBe('500 g');
  });
});
