import { eq } from 'drizzle-orm';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { people, shops } from '../features/people/people-tables';
import { memberships } from '../features/people/people-tables';
import type { TemporaryRecords } from '../testing/temporary-records';
import { temporaryRecords } from '../testing/temporary-records';

let records: TemporaryRecords;
beforeEach(() => {
  records = temporaryRecords();
});
afterEach(() => records.discard());

const names = async () => (await records.read.select().from(shops).orderBy(shops.name)).map(({ name }) => name);
const addShop = (name: string) =>
  records.write(async (db) => {
    await db.insert(shops).values({ id: name, name });
    return name;
  });

describe('writing', () => {
  it('stores all of it, and gives what the work gives', async () => {
    expect(await addShop('a')).toBe('a');
    expect(await names()).toEqual(['a']);
  });

  it('stores nothing of a work that fails, and goes on with the next', async () => {
    const failing = records.write(async (db) => {
      await db.insert(shops).values({ id: 'lost', name: 'lost' });
      throw new Error('half way');
    });
    const next = addShop('next');
    await expect(failing).rejects.toThrow('half way');
    await next;
    expect(await names()).toEqual(['next']);
  });

  it('lets one work end before the next begins, though both wait in between', async () => {
    const order: string[] = [];
    const slow = (name: string) =>
      records.write(async () => {
        order.push(`${name} begins`);
        await new Promise((resolve) => setTimeout(resolve, 10));
        order.push(`${name} ends`);
      });
    await Promise.all([slow('a'), slow('b')]);
    expect(order).toEqual(['a begins', 'a ends', 'b begins', 'b ends']);
  });

  it('shows nothing of it to readers before its end', async () => {
    await records.write(async (db) => {
      await db.insert(shops).values({ id: 'a', name: 'a' });
      expect(await names()).toEqual([]);
    });
    expect(await names()).toEqual(['a']);
  });

  it('keeps references: nobody is a member of a shop that is not there', async () => {
    await records.write(async (db) => {
      await db.insert(people).values({ id: 'p', email: 'p@example.org', name: 'P', passwordHash: '' });
    });
    const membership = { shopId: 'gone', personId: 'p', roles: ['lead'] as const };
    await expect(records.write(async (db) => db.insert(memberships).values(membership))).rejects.toThrow();
  });
});

describe('reading', () => {
  it('cannot write', () => {
    expect(() => records.read.delete(shops).where(eq(shops.id, 'a')).run()).toThrow('readonly');
  });

  it('tells whether the file can be read', async () => {
    expect(records.isReadable()).toBe(true);
    await records.close();
    expect(records.isReadable()).toBe(false);
    records = temporaryRecords();
  });
});
