import { describe, expect, it } from 'vitest';
import { attempt } from '../result';
import { enthalpyJPerKg, SI_ENTHALPY } from './enthalpy';
import { enthalpyLimits } from './enthalpy-pairs';
import { moistAirFromDryBulbAndRelativeHumidity, type MoistAir } from './moist-air';
import { moistAirFromPair, type MoistAirPair, type MoistAirReading } from './moist-air-pairs';

const SEA_LEVEL_PA = 101_325;
const LOWEST_K = -60 + 273.15;
const HIGHEST_K = 90 + 273.15;

const from = (pair: MoistAirPair, pressurePa = SEA_LEVEL_PA): MoistAir => moistAirFromPair({ pressurePa, ...pair });

function refusal(pair: MoistAirPair, pressurePa = SEA_LEVEL_PA) {
  const result = attempt(() => from(pair, pressurePa));
  if (result.ok) throw new Error(`not refused: ${JSON.stringify(result.value)}`);
  const { kind, details } = result.error;
  return {
    code: `${kind} ${details.quantity} ${details.reason}`,
    value: details.value,
    min: details.min,
    max: details.max,
  };
}

const stateAt = (dryBulbK: number, relativeHumidityRatio: number, pressurePa = SEA_LEVEL_PA) =>
  moistAirFromDryBulbAndRelativeHumidity({ dryBulbK, relativeHumidityRatio, pressurePa });

const up = (value: number) => value * (1 + Number.EPSILON);
const down = (value: number) => value * (1 - Number.EPSILON);

/** [pair, what is moved, which way leads beyond the limit, what is refused] */
type Edge = readonly [readonly [MoistAirReading, MoistAirReading], MoistAirReading, 'up' | 'down', MoistAirReading];

function expectEdge(state: MoistAir, [pair, moved, beyond, refused]: Edge) {
  const step = (beyond === 'up' ? 1e-8 : -1e-8) * Math.abs(state[moved]!);
  const moveBy = (by: number) =>
    ({ [pair[0]]: state[pair[0]], [pair[1]]: state[pair[1]], [moved]: state[moved]! + by }) as unknown as MoistAirPair;
  expect(from(moveBy(-step)).dryBulbK).toBeCloseTo(state.dryBulbK, 3);
  const { code, value, min, max } = refusal(moveBy(step));
  expect(code).toBe(`out-of-range ${refused} outside-moist-air-range`);
  expect(value < (min ?? -Infinity) || value > (max ?? Infinity)).toBe(true);
}

describe('a dry bulb that comes out of range', () => {
  it.each<Edge>([
    [['wetBulbK', 'dewPointK'], 'dewPointK', 'down', 'dryBulbK'],
    [['wetBulbK', 'relativeHumidityRatio'], 'relativeHumidityRatio', 'down', 'relativeHumidityRatio'],
    [['wetBulbK', 'humidityRatio'], 'humidityRatio', 'down', 'dryBulbK'],
    [['dewPointK', 'relativeHumidityRatio'], 'relativeHumidityRatio', 'down', 'relativeHumidityRatio'],
    [['dewPointK', 'enthalpyJPerKg'], 'enthalpyJPerKg', 'up', 'dryBulbK'],
    [['relativeHumidityRatio', 'humidityRatio'], 'humidityRatio', 'up', 'relativeHumidityRatio'],
    [['relativeHumidityRatio', 'enthalpyJPerKg'], 'enthalpyJPerKg', 'up', 'enthalpyJPerKg'],
    [['humidityRatio', 'enthalpyJPerKg'], 'enthalpyJPerKg', 'up', 'dryBulbK'],
  ])('just above 90 °C: %s, moving %s %s, refuses %s', (...edge) => expectEdge(stateAt(HIGHEST_K, 0.3), edge));

  it.each<Edge>([
    [['dewPointK', 'relativeHumidityRatio'], 'relativeHumidityRatio', 'up', 'relativeHumidityRatio'],
    [['dewPointK', 'enthalpyJPerKg'], 'enthalpyJPerKg', 'down', 'dryBulbK'],
    [['relativeHumidityRatio', 'humidityRatio'], 'humidityRatio', 'down', 'relativeHumidityRatio'],
    [['relativeHumidityRatio', 'enthalpyJPerKg'], 'enthalpyJPerKg', 'down', 'enthalpyJPerKg'],
    [['humidityRatio', 'enthalpyJPerKg'], 'enthalpyJPerKg', 'down', 'dryBulbK'],
  ])('just below −60 °C: %s, moving %s %s, refuses %s', (...edge) => expectEdge(stateAt(LOWEST_K, 0.5), edge));

  it('is named by the humidity ratio where it alone asks for more than 90 °C', () => {
    const most = stateAt(HIGHEST_K, 1).humidityRatio;
    expect(from({ relativeHumidityRatio: 1, humidityRatio: most * (1 - 1e-12) }).dryBulbK).toBeCloseTo(HIGHEST_K, 8);
    const { code, max } = refusal({ relativeHumidityRatio: 1, humidityRatio: most * (1 + 1e-12) });
    expect(code).toMatch(/^out-of-range humidityRatio/);
    expect(max).toBeCloseTo(most, 9);
  });
});

describe('readings out of range', () => {
  it('wet bulb outside −60 to 90 °C', () => {
    for (const rest of [{ dewPointK: 200 }, { relativeHumidityRatio: 1 }, { humidityRatio: 1e-6 }]) {
      expect(from({ wetBulbK: LOWEST_K, ...rest }).dryBulbK).toBeLessThan(LOWEST_K + 0.05);
      for (const wetBulbK of [down(LOWEST_K), up(HIGHEST_K)]) {
        expect(refusal({ wetBulbK, ...rest }).code).toMatch(/^out-of-range wetBulbK/);
      }
    }
    expect(from({ wetBulbK: HIGHEST_K, relativeHumidityRatio: 1 }).dryBulbK).toBe(HIGHEST_K);
  });

  it('keeps all but the last 0.05 K of the dry bulb: so much lies the wet bulb below it at −60 °C', () => {
    const { wetBulbK } = stateAt(LOWEST_K, 0, 50e3);
    expect(LOWEST_K - wetBulbK).toBeGreaterThan(0.02);
    expect(LOWEST_K - wetBulbK).toBeLessThan(0.05);
  });

  it('dew point outside −100 to 90 °C', () => {
    const lowest = -100 + 273.15;
    expect(from({ dewPointK: lowest, enthalpyJPerKg: 0 }).dryBulbK).toBeCloseTo(273.15, 4);
    for (const rest of [{ wetBulbK: 280 }, { relativeHumidityRatio: 0.5 }, { enthalpyJPerKg: 5e4 }]) {
      for (const dewPointK of [down(lowest), up(HIGHEST_K)]) {
        expect(refusal({ dewPointK, ...rest }).code).toMatch(/^out-of-range dewPointK/);
      }
    }
    expect(from({ dewPointK: HIGHEST_K, relativeHumidityRatio: 1 }).dryBulbK).toBe(HIGHEST_K);
  });

  it('relative humidity outside 0 to 1', () => {
    for (const rest of [{ wetBulbK: 290 }, { dewPointK: 280 }, { humidityRatio: 0.01 }, { enthalpyJPerKg: 5e4 }]) {
      expect(from({ relativeHumidityRatio: 1, ...rest }).relativeHumidityRatio).toBe(1);
      for (const relativeHumidityRatio of [-Number.MIN_VALUE, up(1)]) {
        const { code } = refusal({ relativeHumidityRatio, ...rest });
        expect(code).toBe('out-of-range relativeHumidityRatio outside-0-to-1');
      }
    }
  });

  it('humidity ratio outside 0 to 400', () => {
    const boiling = [{ dryBulbK: 360 }, { wetBulbK: 360 }, { relativeHumidityRatio: 0.9 }, { enthalpyJPerKg: 1e9 }];
    for (const rest of boiling) {
      for (const humidityRatio of [-Number.MIN_VALUE, up(400)]) {
        const { code } = refusal({ humidityRatio, ...rest }, 50e3);
        expect(code).toBe('out-of-range humidityRatio outside-moist-air-range');
      }
    }
    expect(from({ humidityRatio: 400, dryBulbK: 360 }, 50e3).vapourPressurePa).toBeCloseTo(
      50e3 * (400 / 400.621945),
      6,
    );
    expect(from({ humidityRatio: 400, relativeHumidityRatio: 0.9 }, 50e3).dryBulbK).toBeGreaterThan(355);
    expect(from({ humidityRatio: 0, dryBulbK: 300 }).relativeHumidityRatio).toBe(0);
    expect(from({ humidityRatio: 0, enthalpyJPerKg: 0 }).dryBulbK).toBe(273.15);
    expect(from({ humidityRatio: 0, wetBulbK: 290 }).dryBulbK).toBeGreaterThan(310);
  });

  it('enthalpy outside that of dry air at −60 °C to 1 GJ/kg', () => {
    const { min, max } = enthalpyLimits(SI_ENTHALPY);
    expect(min).toBeCloseTo(-60_360, 6);
    expect(from({ dryBulbK: LOWEST_K, enthalpyJPerKg: min }).humidityRatio).toBe(0);
    expect(from({ relativeHumidityRatio: 0, enthalpyJPerKg: min }).dryBulbK).toBeCloseTo(LOWEST_K, 9);
    expect(from({ humidityRatio: 0, enthalpyJPerKg: min }).dryBulbK).toBe(LOWEST_K);
    const boiling = from({ relativeHumidityRatio: 1, enthalpyJPerKg: max }, 50e3);
    expect(boiling.humidityRatio).toBeGreaterThan(300);
    expect(enthalpyJPerKg(boiling) / max).toBeCloseTo(1, 6);
    expect(from({ dryBulbK: 360, enthalpyJPerKg: max }, 50e3).humidityRatio).toBeGreaterThan(300);
    for (const rest of [{ dryBulbK: 300 }, { dewPointK: 180 }, { relativeHumidityRatio: 0.9 }, { humidityRatio: 0 }]) {
      for (const beyond of [up(min), up(max)]) {
        const { code } = refusal({ enthalpyJPerKg: beyond, ...rest }, 50e3);
        expect(code).toBe('out-of-range enthalpyJPerKg outside-moist-air-range');
      }
    }
  });
});

describe('readings that contradict each other', () => {
  const saturated = stateAt(300, 1);
  const dry = stateAt(300, 0);

  it('more humidity than the dry bulb or the wet bulb can hold', () => {
    for (const reading of [{ dryBulbK: 300 }, { wetBulbK: 300 }]) {
      const at = (factor: number): MoistAirPair => ({ ...reading, humidityRatio: factor * saturated.humidityRatio });
      expect(from(at(1 - 1e-9)).dryBulbK).toBeCloseTo(300, 6);
      const { code, max } = refusal(at(1 + 1e-9));
      expect(code).toBe('inconsistent-inputs humidityRatio above-saturation');
      expect(max).toBeCloseTo(saturated.humidityRatio, 12);
    }
  });

  it('an enthalpy below that of dry air or above that of saturated air at the dry bulb', () => {
    const at = (enthalpy: number): MoistAirPair => ({ dryBulbK: 300, enthalpyJPerKg: enthalpy });
    expect(from(at(dry.enthalpyJPerKg + 1e-4)).humidityRatio).toBeCloseTo(3.92e-11, 12);
    expect(from(at(saturated.enthalpyJPerKg - 1e-2)).relativeHumidityRatio).toBeCloseTo(1, 6);
    expect(refusal(at(dry.enthalpyJPerKg - 1e-4))).toMatchObject({
      code: 'inconsistent-inputs enthalpyJPerKg below-dry-air',
      min: dry.enthalpyJPerKg,
    });
    expect(refusal(at(saturated.enthalpyJPerKg + 1e-2))).toMatchObject({
      code: 'inconsistent-inputs enthalpyJPerKg above-saturation',
      max: saturated.enthalpyJPerKg,
    });
  });

  it('an enthalpy below that of air saturated at the dew point', () => {
    for (const reading of [{ dewPointK: 300 }, { humidityRatio: saturated.humidityRatio }]) {
      const at = (enthalpy: number): MoistAirPair => ({ ...reading, enthalpyJPerKg: enthalpy });
      expect(from(at(saturated.enthalpyJPerKg + 1e-2)).dryBulbK).toBeCloseTo(300, 4);
      const { code, min } = refusal(at(saturated.enthalpyJPerKg - 1e-2));
      expect(code).toBe('inconsistent-inputs enthalpyJPerKg below-saturation');
      expect(min).toBeCloseTo(saturated.enthalpyJPerKg, 4);
    }
  });

  it('a dew point above the wet bulb', () => {
    expect(from({ wetBulbK: 290, dewPointK: 290 - 1e-8 }).dryBulbK).toBeCloseTo(290, 6);
    expect(refusal({ wetBulbK: 290, dewPointK: 290 + 1e-8 })).toMatchObject({
      code: 'inconsistent-inputs dewPointK dew-point-above-wet-bulb',
      max: 290,
    });
  });

  it('dry air by one reading and humid air by the other, or dry air by both', () => {
    const outside = 'out-of-range relativeHumidityRatio outside-moist-air-range';
    expect(refusal({ dewPointK: 280, relativeHumidityRatio: 0 }).code).toBe(outside);
    expect(refusal({ relativeHumidityRatio: 0, humidityRatio: 0.01 }).code).toBe(outside);
    expect(refusal({ relativeHumidityRatio: 0.5, humidityRatio: 0 })).toMatchObject({ code: outside, max: 0 });
    expect(refusal({ relativeHumidityRatio: 0, humidityRatio: 0 }).code).toBe(
      'not-supported humidityRatio dependent-pair',
    );
  });

  it('vapour that leaves no dry air', () => {
    for (const boiling of [
      { wetBulbK: 360, dewPointK: 300 },
      { wetBulbK: 360, relativeHumidityRatio: 0.5 },
      { wetBulbK: 360, humidityRatio: 0.5 },
      { dewPointK: 360, relativeHumidityRatio: 0.95 },
      { dewPointK: 360, enthalpyJPerKg: 1e8 },
    ]) {
      expect(refusal(boiling as MoistAirPair, 50e3).code).toBe(
        'inconsistent-inputs vapourPressurePa vapour-pressure-not-below-total',
      );
    }
  });
});
