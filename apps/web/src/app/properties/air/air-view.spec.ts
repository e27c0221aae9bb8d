import { describe, expect, it } from 'vitest';
import {
  MOIST_AIR_PAIRS,
  MOIST_AIR_READINGS,
  moistAirFromDryBulbAndWetBulb,
  type MoistAirReading,
} from '@chargewright/engine';
import { airTexts, propertiesWords } from '@chargewright/wording';
import type { TypedValue } from '../../loose-checks/check-draft';
import { airLines } from './air-lines';
import { airView, type AirPair, type AirQuestion } from './air-view';
import { drawChart } from './chart-drawing';
import { frameOf } from './chart-frames';
import { chartTable } from './chart-table';

const SEA_LEVEL_PA = 101_325;
const kelvin = (degF: number) => ((degF - 32) * 5) / 9 + 273.15;
const RETURN_AIR = moistAirFromDryBulbAndWetBulb({
  dryBulbK: kelvin(80),
  wetBulbK: kelvin(67),
  pressurePa: SEA_LEVEL_PA,
});

const view = (pair: AirPair, values: AirQuestion['values'], more: Partial<AirQuestion> = {}) =>
  airView({ pair, values, atmospherePa: SEA_LEVEL_PA, system: 'F-psi', ...more });

/** The air of the AHRI rating point, 80 °F and 67 °F wet bulb, as a person would type it. */
const TYPED: Readonly<Record<MoistAirReading, TypedValue>> = {
  dryBulbK: { text: '80', unit: 'degF' },
  wetBulbK: { text: '67', unit: 'degF' },
  dewPointK: { text: '60.31', unit: 'degF' },
  relativeHumidityRatio: { text: '51,1', unit: '%' },
  humidityRatio: { text: '78.2', unit: 'gr/lb' },
  enthalpyJPerKg: { text: '31.45', unit: 'Btu/lb' },
};

describe('air from two typed readings', () => {
  it.each(MOIST_AIR_PAIRS)('%s and %s', (...pair) => {
    const { air, complaints, note } = view(pair, TYPED);
    expect(note).toBe('');
    expect(Object.values(complaints).join('')).toBe('');
    expect(Math.abs((air?.dryBulbK ?? NaN) - RETURN_AIR.dryBulbK)).toBeLessThan(0.15);
    expect(Math.abs((air?.humidityRatio ?? NaN) / RETURN_AIR.humidityRatio - 1)).toBeLessThan(0.005);
  });

  it('takes the two in either order', () => {
    expect(view(['wetBulbK', 'dryBulbK'], TYPED).air).toEqual(view(['dryBulbK', 'wetBulbK'], TYPED).air);
  });

  it('says why a pair settles nothing, before anything is typed', () => {
    expect(view(['enthalpyJPerKg', 'wetBulbK'], {}).note).toBe(airTexts['wet-bulb-and-enthalpy']);
    expect(view(['dewPointK', 'humidityRatio'], {}).note).toBe(airTexts['dew-point-and-humidity-ratio']);
  });

  it('says what cannot be at its field, in the units it was typed in', () => {
    const said = (pair: AirPair, values: AirQuestion['values'], system: AirQuestion['system'] = 'F-psi') =>
      view(pair, values, { system }).complaints;
    const celsius = { dryBulbK: { text: '20', unit: 'degC' }, wetBulbK: { text: '21', unit: 'degC' } };
    expect(said(['dryBulbK', 'wetBulbK'], celsius)).toMatchObject({
      wetBulbK: 'Wet bulb 21 °C is above dry bulb 20 °C',
    });
    const wet = { dryBulbK: { text: '80', unit: 'degF' }, humidityRatio: { text: '225', unit: 'gr/lb' } };
    expect(said(['dryBulbK', 'humidityRatio'], wet, 'C-bar').humidityRatio).toMatch(
      /225 gr\/lb is above 155\.68 gr\/lb/,
    );
    expect(said(['dryBulbK', 'wetBulbK'], { ...TYPED, wetBulbK: { text: 'wet', unit: 'degF' } }).wetBulbK).toMatch(
      /not a number/,
    );
  });

  it('waits for the air pressure, and for both values', () => {
    expect(view(['dryBulbK', 'wetBulbK'], TYPED, { atmospherePa: null })).toMatchObject({
      air: null,
      note: propertiesWords.place.unknown,
    });
    expect(view(['dryBulbK', 'wetBulbK'], { dryBulbK: TYPED.dryBulbK })).toMatchObject({ air: null, note: '' });
  });

  it('is printed with every property in both unit systems', () => {
    const texts = airLines(RETURN_AIR, 'F-psi').map(({ name, value, more }) =>
      [name, value, more].filter(Boolean).join(' '),
    );
    expect(texts).toEqual([
      'Dry bulb 80.0 °F',
      'Wet bulb 67.0 °F',
      'Dew point 60.3 °F',
      'Relative humidity 51.1 %',
      'Humidity ratio 78.2 gr/lb 0.0112 lb/lb',
      'Enthalpy 31.4 Btu/lb',
      'Specific volume 13.85 ft³/lb',
      'Vapor pressure 0.259 psia',
      'Air pressure 14.7 psia',
    ]);
    const metric = airLines(RETURN_AIR, 'C-kPa').map(({ value }) => value);
    expect(metric[0]).toBe('26.7 °C');
    expect(metric[5]).toBe('55.3 kJ/kg');
  });
});

describe('the chart', () => {
  const at = (dryBulbF: number, relativeHumidityRatio: number) => {
    const { air } = view(['dryBulbK', 'relativeHumidityRatio'], {
      dryBulbK: { text: String(dryBulbF), unit: 'degF' },
      relativeHumidityRatio: { text: String(100 * relativeHumidityRatio), unit: '%' },
    });
    if (air === null) throw new Error('no air');
    return air;
  };

  it('is the ordinary one for room air, a colder or hotter one where the air lies there, none beyond', () => {
    expect(frameOf(at(80, 0.5), 'F-psi')).toMatchObject({ low: 30, high: 120 });
    expect(frameOf(at(80, 0.5), 'C-kPa')).toMatchObject({ low: 0, high: 50 });
    expect(frameOf(at(10, 0.5), 'F-psi')).toMatchObject({ low: -60 });
    expect(frameOf(at(160, 0.3), 'F-psi')).toMatchObject({ high: 190 });
    expect(frameOf(at(185, 0.99), 'F-psi')).toBeNull();
  });

  it.each([358, 700])('keeps every line and label inside %d pixels, and the mark on the state', (width) => {
    const air = at(80, 0.5);
    const frame = frameOf(air, 'F-psi');
    const drawing = drawChart(air, frame!, width);
    const { left, right, top, bottom } = drawing.plot;
    const lines = [...drawing.relativeHumidities, ...drawing.wetBulbs];
    expect(drawing.relativeHumidities.length).toBe(width < 520 ? 4 : 9);
    expect(drawing.wetBulbs.length).toBeGreaterThan(5);
    for (const path of [drawing.saturation, drawing.state.wetBulb, ...lines.map((line) => line.path)]) {
      expect(path).not.toMatch(/NaN|undefined/);
      for (const [, x, y] of path.matchAll(/[ML](-?[\d.]+),(-?[\d.]+)/g)) {
        expect(Number(x)).toBeGreaterThanOrEqual(left - 0.01);
        expect(Number(x)).toBeLessThanOrEqual(right + 0.01);
        expect(Number(y)).toBeGreaterThanOrEqual(top - 0.01);
        expect(Number(y)).toBeLessThanOrEqual(bottom + 0.01);
      }
    }
    const labels = lines.flatMap(({ label }) => (label === null ? [] : [label]));
    for (const { x, y } of labels) {
      expect(x).toBeGreaterThan(left);
      expect(x).toBeLessThan(right);
      expect(y).toBeGreaterThan(0);
    }
    // 80 of 30 to 120 °F
    expect((drawing.state.x - left) / (right - left)).toBeCloseTo(50 / 90, 6);
  });

  it('is recomputed for the elevation: the same relative humidity stands for more water', () => {
    const frame = frameOf(at(80, 0.5), 'F-psi')!;
    const [sea, high] = [SEA_LEVEL_PA, 83_400].map((pressurePa) => chartTable(frame, pressurePa));
    const row = (rows: typeof sea, dryBulb: string) => rows!.find((each) => each.dryBulb === dryBulb)!;
    expect(Number(row(high, '80').humidityRatios[2])).toBeGreaterThan(1.2 * Number(row(sea, '80').humidityRatios[2]));
    expect(Number(row(high, '80').wetBulbs[2])).toBeLessThan(Number(row(sea, '80').wetBulbs[2]));
    expect(row(sea, '80').wetBulbs[4]).toBe('80.0');
  });

  it('has every reading of the page in the engine’s list', () => {
    expect(Object.keys(TYPED).sort()).toEqual([...MOIST_AIR_READINGS].sort());
  });
});
