import { describe, expect, it } from 'vitest';
import { temperatureToK } from '../units/temperature';
import { relativeHumidityCurve, wetBulbCurve, type ChartFrame } from './chart-curves';
import { moistAirFromDryBulbAndRelativeHumidity, moistAirFromDryBulbAndWetBulb } from './moist-air';

const degF = (value: number) => temperatureToK(value, 'degF');
const FRAME: ChartFrame = {
  pressurePa: 101_325,
  leastDryBulbK: degF(30),
  mostDryBulbK: degF(120),
  mostHumidityRatio: 0.03,
};

const inside = (points: readonly { dryBulbK: number; humidityRatio: number }[], frame = FRAME) => {
  for (const { dryBulbK, humidityRatio } of points) {
    expect(dryBulbK).toBeGreaterThanOrEqual(frame.leastDryBulbK);
    expect(dryBulbK).toBeLessThanOrEqual(frame.mostDryBulbK);
    expect(humidityRatio).toBeGreaterThanOrEqual(0);
    expect(humidityRatio).toBeLessThanOrEqual(frame.mostHumidityRatio);
  }
};

describe('a line of constant relative humidity', () => {
  it.each([0.1, 0.5, 1])('lies in the frame, rises, and has its relative humidity at every point: %d', (ratio) => {
    const points = relativeHumidityCurve(FRAME, ratio);
    inside(points);
    expect(points[0]?.dryBulbK).toBe(FRAME.leastDryBulbK);
    points.forEach(({ dryBulbK, humidityRatio }, k) => {
      if (k > 0) expect(humidityRatio).toBeGreaterThan(points[k - 1]!.humidityRatio);
      const state = moistAirFromDryBulbAndRelativeHumidity({
        dryBulbK,
        relativeHumidityRatio: ratio,
        pressurePa: FRAME.pressurePa,
      });
      expect(humidityRatio).toBeCloseTo(state.humidityRatio, 9);
    });
  });

  it('leaves through the top or the right edge', () => {
    expect(relativeHumidityCurve(FRAME, 1).at(-1)?.humidityRatio).toBeCloseTo(0.03, 9);
    expect(relativeHumidityCurve(FRAME, 0.1).at(-1)?.dryBulbK).toBe(FRAME.mostDryBulbK);
  });

  it('is empty above the frame, and holds more water in thinner air', () => {
    expect(relativeHumidityCurve({ ...FRAME, leastDryBulbK: degF(110) }, 1)).toEqual([]);
    const high = relativeHumidityCurve({ ...FRAME, pressurePa: 83_400 }, 0.5);
    const sea = relativeHumidityCurve(FRAME, 0.5);
    expect(high[10]!.humidityRatio / sea[10]!.humidityRatio).toBeGreaterThan(1.15);
  });
});

describe('a line of constant wet bulb', () => {
  it.each([40, 67, 80, 88])('lies in the frame, falls, and has its wet bulb at every point: %d °F', (wetBulbF) => {
    const points = wetBulbCurve(FRAME, degF(wetBulbF));
    expect(points.length).toBeGreaterThan(5);
    inside(points);
    points.forEach(({ dryBulbK, humidityRatio }, k) => {
      if (k > 0) expect(humidityRatio).toBeLessThan(points[k - 1]!.humidityRatio);
      const state = moistAirFromDryBulbAndWetBulb({
        dryBulbK,
        wetBulbK: degF(wetBulbF),
        pressurePa: FRAME.pressurePa,
      });
      expect(humidityRatio).toBeCloseTo(state.humidityRatio, 9);
    });
  });

  it('starts on the saturation line or at the top, ends dry or at the right edge', () => {
    const cool = wetBulbCurve(FRAME, degF(50));
    expect(cool[0]?.dryBulbK).toBe(degF(50));
    expect(cool.at(-1)?.humidityRatio).toBeCloseTo(0, 9);
    const warm = wetBulbCurve(FRAME, degF(92));
    expect(warm[0]?.humidityRatio).toBeCloseTo(0.03, 9);
    expect(warm.at(-1)?.dryBulbK).toBe(FRAME.mostDryBulbK);
  });

  it('is cut at the left edge, and empty where none of it is inside', () => {
    expect(wetBulbCurve({ ...FRAME, leastDryBulbK: degF(60) }, degF(50))[0]?.dryBulbK).toBe(degF(60));
    expect(wetBulbCurve({ ...FRAME, leastDryBulbK: degF(110) }, degF(40))).toEqual([]);
    expect(wetBulbCurve(FRAME, degF(125))).toEqual([]);
  });
});
