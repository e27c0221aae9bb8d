import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { attempt } from '../result';
import {
  humidityRatioFromRelativeHumidity,
  humidityRatioFromVapourPressure,
  relativeHumidityFromHumidityRatio,
  vapourPressurePaFromDewPoint,
  vapourPressurePaFromHumidityRatio,
  vapourPressurePaFromRelativeHumidity,
} from './humidity-ratio';
import { waterVapourSaturationPressurePa } from './saturation-pressure';

const between = (low: number, high: number) =>
  fc.integer({ min: 0, max: 1_000_000 }).map((k) => low + ((high - low) * k) / 1_000_000);

/** Kind and reason of a refusal; anything that does not refuse fails the test. */
function refusal(compute: () => unknown): string {
  const result = attempt(compute);
  if (result.ok) throw new Error(`not refused: ${String(result.value)}`);
  return `${result.error.kind} ${result.error.details.quantity} ${result.error.details.reason}`;
}

describe('humidity ratio and vapour pressure', () => {
  it('undo each other', () => {
    fc.assert(
      fc.property(between(0, 0.99), between(50e3, 110e3), (fraction, pressurePa) => {
        const vapourPressurePa = fraction * pressurePa;
        const humidityRatio = humidityRatioFromVapourPressure({ vapourPressurePa, pressurePa });
        const back = vapourPressurePaFromHumidityRatio({ humidityRatio, pressurePa });
        expect(Math.abs(back - vapourPressurePa)).toBeLessThan(1e-12 * pressurePa);
      }),
    );
  });

  it('are both zero for dry air', () => {
    expect(humidityRatioFromVapourPressure({ vapourPressurePa: 0, pressurePa: 101_325 })).toBe(0);
    expect(vapourPressurePaFromHumidityRatio({ humidityRatio: 0, pressurePa: 101_325 })).toBe(0);
  });

  it('refuse vapour that leaves no dry air', () => {
    const at = (vapourPressurePa: number) => () =>
      humidityRatioFromVapourPressure({ vapourPressurePa, pressurePa: 60e3 });
    expect(refusal(at(60e3))).toBe('inconsistent-inputs vapourPressurePa vapour-pressure-not-below-total');
    expect(refusal(at(70e3))).toBe('inconsistent-inputs vapourPressurePa vapour-pressure-not-below-total');
    expect(at(60e3 * (1 - Number.EPSILON))()).toBeGreaterThan(1e15);
  });

  it.each([-1e-300, Number.NaN])('refuse %d', (value) => {
    expect(refusal(() => humidityRatioFromVapourPressure({ vapourPressurePa: value, pressurePa: 1e5 }))).toMatch(
      /^out-of-range/,
    );
    expect(refusal(() => vapourPressurePaFromHumidityRatio({ humidityRatio: value, pressurePa: 1e5 }))).toMatch(
      /^out-of-range/,
    );
  });

  it('refuse an infinite humidity ratio', () => {
    expect(refusal(() => vapourPressurePaFromHumidityRatio({ humidityRatio: Infinity, pressurePa: 1e5 }))).toMatch(
      /^out-of-range/,
    );
  });
});

describe('relative humidity', () => {
  it('comes back from the humidity ratio', () => {
    fc.assert(
      fc.property(
        between(213.15, 363.15),
        between(0, 1),
        between(50e3, 110e3),
        (dryBulbK, relativeHumidityRatio, pressurePa) => {
          fc.pre(relativeHumidityRatio * waterVapourSaturationPressurePa(dryBulbK) < 0.99 * pressurePa);
          const humidityRatio = humidityRatioFromRelativeHumidity({ dryBulbK, relativeHumidityRatio, pressurePa });
          const back = relativeHumidityFromHumidityRatio({ dryBulbK, humidityRatio, pressurePa });
          expect(Math.abs(back - relativeHumidityRatio)).toBeLessThan(1e-12);
          expect(back).toBeLessThanOrEqual(1);
        },
      ),
    );
  });

  it('takes rounding above saturation as saturation, and refuses more', () => {
    const air = { dryBulbK: 300, pressurePa: 1e5 };
    const saturated = humidityRatioFromRelativeHumidity({ ...air, relativeHumidityRatio: 1 });
    const at = (factor: number) => () =>
      relativeHumidityFromHumidityRatio({ ...air, humidityRatio: factor * saturated });
    expect(at(1 + 4 * Number.EPSILON)()).toBe(1);
    expect(refusal(at(1 + 1e-11))).toBe('inconsistent-inputs humidityRatio above-saturation');
  });

  it.each([-Number.MIN_VALUE, 1 + Number.EPSILON, Number.NaN])('of %d is refused', (relativeHumidityRatio) => {
    expect(refusal(() => vapourPressurePaFromRelativeHumidity({ dryBulbK: 300, relativeHumidityRatio }))).toBe(
      'out-of-range relativeHumidityRatio outside-0-to-1',
    );
  });

  it('that would boil the air dry is refused', () => {
    const hot = { dryBulbK: 363.15, relativeHumidityRatio: 0.9, pressurePa: 60e3 };
    expect(refusal(() => humidityRatioFromRelativeHumidity(hot))).toMatch(/vapour-pressure-not-below-total$/);
  });
});

describe('vapourPressurePaFromDewPoint', () => {
  it('is the saturation pressure at the dew point', () => {
    expect(vapourPressurePaFromDewPoint({ dryBulbK: 300, dewPointK: 290 })).toBe(waterVapourSaturationPressurePa(290));
    expect(vapourPressurePaFromDewPoint({ dryBulbK: 300, dewPointK: 300 })).toBe(waterVapourSaturationPressurePa(300));
  });

  it('refuses a dew point above the dry bulb, below −100 °C and NaN', () => {
    const at = (dewPointK: number) => () => vapourPressurePaFromDewPoint({ dryBulbK: 300, dewPointK });
    expect(refusal(at(300 * (1 + Number.EPSILON)))).toBe('inconsistent-inputs dewPointK dew-point-above-dry-bulb');
    expect(refusal(at(500))).toBe('inconsistent-inputs dewPointK dew-point-above-dry-bulb');
    expect(refusal(at(173.14))).toBe('out-of-range dewPointK outside-saturation-equation');
    expect(refusal(at(Number.NaN))).toBe('out-of-range dewPointK outside-saturation-equation');
  });
});
