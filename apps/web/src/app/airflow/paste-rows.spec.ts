import { describe, expect, it } from 'vitest';
import { pastedRows } from './paste-rows';

describe('cells from a spreadsheet', () => {
  it.each([
    ['0.3\t1300\n0.5\t1200\n0.7\t–'],
    ['ESP (in. w.c.)\tcfm\n0.3\t1300\n0.5\t1200\n0.7\t\n'],
    ['0.3;1300\r\n0.5;1200\r\n0.7;-\r\n'],
    ['0.3 1300\n0.5   1200\n0.7 –'],
    ['0.7\t–\n0.5\t1200\n0.3\t1300'],
  ])('are rows by their static pressure: %j', (text) => {
    const rows = pastedRows(text).map(([pressure, flow]) => [pressure, flow === '' || flow === '-' ? '–' : flow]);
    expect(rows).toEqual([
      ['0.3', '1300'],
      ['0.5', '1200'],
      ['0.7', '–'],
    ]);
  });

  it('keep the text as it was, a decimal comma too', () => {
    expect(pastedRows('0,30;1300\n0,50;1200')).toEqual([
      ['0,30', '1300'],
      ['0,50', '1200'],
    ]);
  });

  it.each([[''], ['blower'], ['0.3\t1300'], ['a\tb\nc\td'], ['1,300\t0.3\n1,200\t0.5']])('are none in %j', (text) => {
    expect(pastedRows(text)).toEqual([]);
  });
});
