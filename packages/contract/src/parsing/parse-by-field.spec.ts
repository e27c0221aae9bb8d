import { describe, expect, it } from 'vitest';
import * as z from 'zod';
import { object } from './object';
import { parseByField } from './parse-by-field';

const table = object({ rows: z.array(object({ at: z.number(), value: z.number().nullable() })).max(3) });
const schema = object({ name: z.string(), table });
const rest = object({ name: z.exactOptional(z.string()), table: z.exactOptional(table) });

const parse = (input: unknown) => parseByField<z.infer<typeof schema>, z.infer<typeof rest>>(schema, rest, input);

describe('a table in a request', () => {
  it('is taken with its dashes', () => {
    const input = { name: 'a', table: { rows: [{ at: 1, value: null }] } };
    expect(parse(input)).toEqual({ whole: input, rest: input, faults: [] });
  });

  it('tells the fault of each of its cells, and is left out of the rest as a whole', () => {
    const rows = [{ at: 1, value: 2 }, { at: null }, { at: '3', value: 4 }];
    const { whole, rest: kept, faults } = parse({ name: 'a', table: { rows } });
    expect(whole).toBeUndefined();
    expect(kept).toEqual({ name: 'a' });
    expect(faults.map(({ kind, part }) => `${part} ${kind}`)).toEqual([
      'table.rows.1.at null',
      'table.rows.1.value missing',
      'table.rows.2.at wrong-type',
    ]);
  });

  it.each([
    [{ rows: {} }, 'table.rows', 'wrong-type', 'list'],
    [{ rows: [null] }, 'table.rows.0', 'null', undefined],
    [{ rows: [{}, {}, {}, {}].map((_, at) => ({ at, value: 1 })) }, 'table.rows', 'too-long', undefined],
    [{}, 'table.rows', 'missing', undefined],
  ])('is refused as %j', (given, path, kind, expected) => {
    const { rest: kept, faults } = parse({ name: 'a', table: given });
    expect(kept).toEqual({ name: 'a' });
    expect(faults).toEqual([expect.objectContaining({ path, kind, ...(expected && { expected }) })]);
  });
});
