import { listSources } from '@chargewright/engine/sources';
import { describe, expect, it } from 'vitest';
import { findRows, sourceRow } from './source-rows';

const rows = listSources().entries.map((entry) => sourceRow(entry, 'F-psi'));
const found = (search: string, standing: Parameters<typeof findRows>[1]['standing'] = 'all') =>
  findRows(rows, { search, standing });

describe('the rows of the sources', () => {
  it('are all there without a search', () => {
    expect(found('')).toHaveLength(rows.length);
    expect(found('  ')).toHaveLength(rows.length);
  });

  it('are found by every word, in any order, whatever the case and the apostrophe', () => {
    const both = found("2008 maker's");
    expect(found("MAKER'S 2008")).toEqual(both);
    expect(found('maker’s 2008')).toEqual(both);
    expect(found('no such word')).toEqual([]);
  });

  it('are narrowed to what stands on one ground', () => {
    const memory = found('', 'memory');
    expect(memory.length).toBeGreaterThan(5);
    expect(new Set(memory.map(({ standing }) => standing))).toEqual(new Set(['memory']));
    expect(found('finer table', 'memory')).toHaveLength(1);
  });

  it('show the print only where it reads otherwise', () => {
    const outdoor = listSources().entries.find(({ id }) => id.startsWith('procedure-figure:conditions.leastOutdoorK'))!;
    expect(sourceRow(outdoor, 'F-psi')).toMatchObject({ value: '55 °F', printed: '' });
    expect(sourceRow(outdoor, 'C-kPa')).toMatchObject({ value: '12.78 °C', printed: '55 °F' });
  });
});
