import { parseNumber, withSignTurned } from './parse-number';

const numberOf = (text: string) => {
  const parsed = parseNumber(text);
  return parsed.state === 'number' ? parsed.number : parsed;
};

describe('parseNumber', () => {
  it.each([
    ['64.50', 64.5, 0.01],
    ['64,5', 64.5, 0.1],
    ['395', 395, 1],
    [' 92.0 ', 92, 0.1],
    ['-4', -4, 1],
    ['\u22124.5', -4.5, 0.1],
    ['\u20134', -4, 1],
    ['+7', 7, 1],
    ['.5', 0.5, 0.1],
    ['57.', 57, 1],
    ['1234.5', 1234.5, 0.1],
    ['0,125', 0.125, 0.001],
    ['2.723', 2.723, 0.001],
  ])('reads "%s" as %d in steps of %d', (text, value, resolution) => {
    expect(numberOf(text)).toEqual({ value, resolution });
  });

  it.each(['', '   '])('takes "%s" as nothing typed', (text) => {
    expect(parseNumber(text)).toEqual({ state: 'blank' });
  });

  it.each(['abc', '-', '.', '1e3', '5..2', '12,5,1', '78 F', 'NaN', 'Infinity', '0x10', '- 4', '6-4'])(
    'refuses "%s"',
    (text) => {
      expect(parseNumber(text)).toEqual({ state: 'problem', problem: 'not-a-number' });
    },
  );

  it.each(['2,723', '1,234,567', '1,234.5', '1.234,5', '1.234.567'])('does not guess what "%s" means', (text) => {
    expect(parseNumber(text)).toEqual({ state: 'problem', problem: 'thousands-mark' });
  });

  it('refuses what is longer than any reading', () => {
    expect(parseNumber('1234567890.123')).toEqual({ state: 'problem', problem: 'too-long' });
  });
});

describe('withSignTurned', () => {
  it.each([
    ['5.0', '-5.0'],
    ['-5.0', '5.0'],
    ['\u22125', '5'],
    ['+5', '-5'],
    ['', '-'],
    ['-', ''],
  ])('turns "%s" into "%s"', (text, turned) => {
    expect(withSignTurned(text)).toBe(turned);
  });
});
