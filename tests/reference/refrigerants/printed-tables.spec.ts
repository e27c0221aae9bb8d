/** The printed tables that the page of properties shows are the read rows of this folder, row for row. */
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { PRINTED_TABLES } from '../../../packages/engine/src/refrigerants/data/printed-tables';

const text = readFileSync(new URL('./saturation-tables.csv', import.meta.url), 'utf8');
const [, ...rows] = text
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'))
  .map((line) => [...line.matchAll(/(?:^|,)(?:"([^"]*)"|([^,]*))/g)].map((match) => match[1] ?? match[2] ?? ''));

/** E1 is computed, not printed. */
const read = rows.filter(([, , , , source]) => source !== 'E1');

describe('the printed tables of the engine', () => {
  it('are all of them', () => {
    expect(new Set(read.map(([, , , , source]) => source))).toEqual(new Set(PRINTED_TABLES.map(({ id }) => id)));
    expect(read.length).toBe(PRINTED_TABLES.reduce((sum, table) => sum + table.rows.length, 0));
    expect(read.length).toBeGreaterThan(250);
  });

  it.each(PRINTED_TABLES)('$id, $refrigerant: every figure, and where it was read', (table) => {
    const own = read.filter(([, , , , source]) => source === table.id);
    expect(new Set(own.map(([refrigerant]) => refrigerant))).toEqual(new Set([table.refrigerant]));
    const figures = own.map(([, degF, bubble, dew = '']) => {
      const ofItsOwn = table.columns === 'both' && dew !== '';
      if (table.columns === 'one') expect(dew).toBe(bubble);
      if (table.columns === 'bubble') expect(dew).toBe('');
      return [Number(degF), Number(bubble), ...(ofItsOwn ? [Number(dew)] : [])];
    });
    expect(table.rows).toEqual(figures);
    expect(text).toContain(`#   ${table.id.padEnd(3)} ${table.source}`);
    const hows = own.map(([, , , , , how = '']) => how);
    expect(hows.some((how) => how.includes('derived'))).toBe(table.how === 'derived');
    expect(hows.some((how) => how.includes('converted'))).toBe(table.how === 'converted');
    for (const how of hows) expect(how).toMatch(/^read/);
  });
});
