import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { TemporaryRecords } from '../../testing/temporary-records';
import { temporaryRecords } from '../../testing/temporary-records';
import { people } from '../people/people-tables';
import type { Sessions } from './sessions';
import { endOtherSessions, isOwnOrigin, openSessions } from './sessions';
import { sessions as table } from './sessions-tables';

const DAY_MS = 24 * 60 * 60_000;

let records: TemporaryRecords;
let sessions: Sessions;
beforeEach(async () => {
  records = temporaryRecords();
  sessions = openSessions(records, { secure: true });
  await records.write(async (db) => {
    for (const id of ['ann', 'bob']) {
      await db.insert(people).values({ id, email: `${id}@example.org`, name: id, passwordHash: '' });
    }
  });
});
afterEach(async () => {
  vi.useRealTimers();
  await records.discard();
});

/** As a browser sends it back. */
const sentBack = (setCookie: string): string => setCookie.split(';')[0]!;

describe('a session', () => {
  it('is a cookie that scripts cannot read, and only its hash is on record', async () => {
    const cookie = await sessions.create('ann', 'a phone');
    expect(cookie).toMatch(/^chargewright_session=[\w-]{43};/);
    for (const attribute of ['HttpOnly', 'Secure', 'SameSite=Lax', 'Path=/']) expect(cookie).toContain(attribute);
    const [row] = await records.read.select().from(table);
    expect(row!.id).toMatch(/^[0-9a-f]{64}$/);
    expect(JSON.stringify(row)).not.toContain(sentBack(cookie).split('=')[1]);
  });

  it('without TLS has no Secure, so that it works in a workshop’s network', async () => {
    const cookie = await openSessions(records, { secure: false }).create('ann', '');
    expect(cookie).not.toContain('Secure');
  });

  it('is read from the cookie, and no other cookie opens one', async () => {
    const cookie = sentBack(await sessions.create('ann', 'a phone'));
    const read = await sessions.read(`theme=dark; ${cookie}`);
    expect(read?.session).toMatchObject({ personId: 'ann', device: 'a phone' });
    expect(read?.cookie).toBeNull();
    const [row] = await records.read.select().from(table);
    for (const other of ['', 'chargewright_session=', `chargewright_session=${row!.id}`, `${cookie}x`]) {
      expect(await sessions.read(other), other).toBeNull();
    }
  });

  it('is prolonged after half its life, and ends after all of it', async () => {
    const cookie = sentBack(await sessions.create('ann', ''));
    vi.useFakeTimers({ now: Date.now() + 31 * DAY_MS, toFake: ['Date'] });
    const read = await sessions.read(cookie);
    expect(sentBack(read!.cookie!)).toBe(cookie);
    vi.setSystemTime(Date.now() + 61 * DAY_MS);
    expect(await sessions.read(cookie)).toBeNull();
  });

  it('is ended by its person only', async () => {
    const cookie = sentBack(await sessions.create('ann', ''));
    const [{ id } = { id: '' }] = await sessions.list('ann');
    expect(await sessions.end('bob', id)).toBe(false);
    expect(await sessions.read(cookie)).not.toBeNull();
    expect(await sessions.end('ann', id)).toBe(true);
    expect(await sessions.read(cookie)).toBeNull();
  });

  it('can be the one that stays when all others end', async () => {
    const [kept, other] = [sentBack(await sessions.create('ann', '')), sentBack(await sessions.create('ann', ''))];
    const bobs = sentBack(await sessions.create('bob', ''));
    const { session } = (await sessions.read(kept))!;
    await records.write((db) => endOtherSessions(db, session));
    expect(await sessions.read(kept)).not.toBeNull();
    expect(await sessions.read(other)).toBeNull();
    await sessions.endAllOf('ann');
    expect(await sessions.read(kept)).toBeNull();
    expect(await sessions.read(bobs)).not.toBeNull();
  });

  it('that expired leaves the record when it is swept', async () => {
    await sessions.create('ann', '');
    vi.useFakeTimers({ now: Date.now() + 61 * DAY_MS, toFake: ['Date'] });
    await sessions.create('bob', '');
    await sessions.sweep();
    expect((await records.read.select().from(table)).map(({ userId }) => userId)).toEqual(['bob']);
  });
});

describe('an origin', () => {
  it('is our own only with the same host and port', () => {
    expect(isOwnOrigin('http://shop.example:4000', 'shop.example:4000')).toBe(true);
    for (const origin of [
      undefined,
      'null',
      'http://shop.example',
      'http://evil.example',
      'http://shop.example.evil',
    ]) {
      expect(isOwnOrigin(origin, 'shop.example:4000'), origin).toBe(false);
    }
  });
});
