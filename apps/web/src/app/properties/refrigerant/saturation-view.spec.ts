import { describe, expect, it } from 'vitest';
import { propertiesWords, type UnitSystem } from '@chargewright/wording';
import { cardRows, nearestDegrees, rowsAround } from './saturation-rows';
import { saturationView, type SaturationQuestion } from './saturation-view';

const SEA_LEVEL_PA = 101_325;

const ask = (text: string, unit: string, more: Partial<SaturationQuestion> = {}) =>
  saturationView({
    refrigerant: 'R-22',
    side: /^(deg)/.test(unit) ? 'temperature' : 'pressure',
    typed: { text, unit },
    atmospherePa: SEA_LEVEL_PA,
    system: 'F-psi',
    ...more,
  });

const lines = (text: string, unit: string, more: Partial<SaturationQuestion> = {}) =>
  ask(text, unit, more).lines.map(({ name, value, more: beside }) => [name, value, beside].filter(Boolean).join(' '));

describe('saturation at what was typed', () => {
  it('is one temperature for a pure fluid', () => {
    // 68.6 psig at 40 °F: published R-22 tables
    expect(lines('68.6', 'psig')).toEqual(['Saturation 40.0 °F', `Glide ${propertiesWords.saturation.noGlide}`]);
    expect(ask('68.6', 'psig').at).toBe('At 68.6 psig (83.3 psia)');
    expect(ask('68.6', 'psig').workedOut).toBe('worked out: 40.0 °F');
  });

  it('is bubble point, dew point and glide for a blend, each with its use', () => {
    const { lines: found, workedOut } = ask('118', 'psig', { refrigerant: 'R-407C' });
    expect(found.map(({ name }) => name)).toEqual(['Bubble point', 'Dew point', 'Glide']);
    expect(found.filter(({ use }) => use !== '')).toHaveLength(2);
    expect(workedOut).toMatch(/^worked out: bubble .* °F, dew .* °F$/);
  });

  it('is gauge and absolute pressure at a temperature', () => {
    expect(lines('40', 'degF')).toEqual(['Saturation pressure 68.6 psig 83.3 psia']);
    expect(lines('4,5', 'degC', { system: 'C-bar' })).toEqual(['Saturation pressure 4.74 barg 5.75 bara']);
  });

  it('counts a gauge from the air at the site, and an absolute pressure from nothing', () => {
    const high = { atmospherePa: 83_400 };
    expect(lines('68.6', 'psig', high)[0]).toBe('Saturation 38.2 °F');
    expect(lines('83.3', 'psia', high)[0]).toBe(lines('83.3', 'psia')[0]);
    expect(lines('83.3', 'psia', { atmospherePa: null })[0]).toBe(lines('83.3', 'psia')[0]);
    expect(ask('68.6', 'psig', { atmospherePa: null }).complaint).toBe(propertiesWords.place.unknown);
  });

  it('reads a vacuum in inches of mercury', () => {
    expect(lines('5', 'inHgVac')[0]).toMatch(/^Saturation −4\d\.\d °F$/);
  });

  it.each([
    ['', 'psig', 'F-psi', ''],
    ['a lot', 'psig', 'F-psi', 'This is not a number yet. It stays as you typed it.'],
    ['-14.8', 'psig', 'F-psi', 'This pressure is not above a perfect vacuum.'],
    [
      '900',
      'psig',
      'F-psi',
      'Pressure 914.7 psia is above the critical pressure 723.74 psia: there is no liquid any more.',
    ],
    [
      '120',
      'degC',
      'C-kPa',
      'Temperature 120 °C is above the critical temperature 96.14 °C: there is no liquid any more.',
    ],
    ['-60', 'degC', 'C-kPa', 'Outside the range this refrigerant’s properties are known for: −50.0 °C to 92.5 °C.'],
  ] as const)('says of %j %s in %s: %s', (text, unit, system: UnitSystem, complaint) => {
    const view = ask(text, unit, { system });
    expect(view.complaint).toBe(complaint);
    expect(view.lines).toEqual([]);
    expect(view.temperatureK).toBeNull();
  });
});

describe('tables', () => {
  const table = { refrigerant: 'R-22', atmospherePa: SEA_LEVEL_PA, system: 'F-psi' } as const;

  it('stand at whole degrees around the point, and end where the curves end', () => {
    const kelvin = (degF: number) => ((degF - 32) * 5) / 9 + 273.15;
    expect(nearestDegrees('F-psi', kelvin(39.6))).toBe(40);
    const around = rowsAround(table, kelvin(39.6));
    expect(around.map(({ degrees }) => degrees)).toEqual(Array.from({ length: 15 }, (_, k) => 33 + k));
    expect(around[7]).toEqual({ degrees: 40, temperature: '40', bubble: '68.6', dew: '68.6' });
    expect(rowsAround(table, kelvin(-57))[0]?.degrees).toBe(-57);
  });

  it('of the card take in what the curves reach, in steps of two degrees or one', () => {
    const rows = cardRows(table);
    expect(rows[0]?.temperature).toBe('−50');
    expect(rows[0]?.dew).toMatch(/inHg vacuum$/);
    expect(rows.at(-1)?.temperature).toBe('160');
    expect(new Set(rows.slice(1).map(({ degrees }, k) => degrees - rows[k]!.degrees))).toEqual(new Set([2]));
    const cold = cardRows({ ...table, refrigerant: 'R-744', system: 'C-bar' });
    expect(cold.at(-1)?.degrees).toBe(27);
    expect(cold).toHaveLength(73);
  });
});
