import { describe, expect, it } from 'vitest';
import { derive } from '../derivation/derive';
import { isKnown, leaf } from '../derivation/quantity';
import type { RefrigerantId } from '../refrigerants/catalogue';
import { differenceFromK, PA_PER_PSI, temperatureFromK } from '../units';
import {
  condensingBubbleTemperature,
  evaporatingDewTemperature,
  meanEvaporatingTemperature,
  saturationModelError,
} from './cycle-points';

const pressure = (psia: number, halfPsi = 0) =>
  leaf({
    id: 'pressure',
    kind: 'pressurePa',
    value: psia * PA_PER_PSI,
    origin: 'reading',
    parts: halfPsi === 0 ? [] : [{ key: 'gauge', u: halfPsi * PA_PER_PSI, shape: 'rectangular' }],
  });

describe('the model’s own error', () => {
  it.each<[RefrigerantId, number]>([
    ['R-22', 0.25],
    ['R-32', 0.25],
    ['R-410A', 0.8],
    ['R-417A', 1.2],
    ['R-438A', 2],
  ])('of %s is ±%d °F as a limit', (refrigerant, limitF) => {
    const { u, shape, key } = saturationModelError(refrigerant, 'dew');
    expect(differenceFromK(u, 'deltaF')).toBeCloseTo(limitF / Math.sqrt(3), 10);
    expect([shape, key]).toEqual(['rectangular', 'model:dew']);
  });
});

describe('saturation formulas', () => {
  it('of a blend with glide keep bubble, mean and dew apart, of one substance together', () => {
    const at = { pressurePa: 80 * PA_PER_PSI };
    const three = (refrigerant: RefrigerantId) =>
      [condensingBubbleTemperature, meanEvaporatingTemperature, evaporatingDewTemperature].map((of) =>
        temperatureFromK(of(refrigerant).of(at), 'degF'),
      ) as [number, number, number];
    const [bubble, mean, dew] = three('R-407C');
    expect(dew - bubble).toBeGreaterThan(9);
    expect(mean).toBeCloseTo(bubble + 0.6 * (dew - bubble), 9);
    const [one, middle, other] = three('R-22');
    expect(other - one).toBe(0);
    expect(middle).toBeCloseTo(one, 10);
  });

  it('refuse outside the curve, on one side of a wide ± as well, and are known by the other side', () => {
    const formula = evaporatingDewTemperature('R-22');
    expect(derive(formula, { pressurePa: pressure(5) })).toMatchObject({
      state: 'refused',
      error: { details: { reason: 'outside-curve' } },
    });
    const wide = derive(formula, { pressurePa: pressure(80, 100) });
    expect(isKnown(wide) && wide.u).toBeGreaterThan(0);
  });

  it('with a ± beyond vacuum and beyond the curve keep only the bare value', () => {
    const result = derive(evaporatingDewTemperature('R-22'), { pressurePa: pressure(80, 1000) });
    expect(result.state).toBe('refused');
    expect(result).toMatchObject({ value: evaporatingDewTemperature('R-22').of({ pressurePa: 80 * PA_PER_PSI }) });
  });
});
