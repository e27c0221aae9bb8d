import { problem } from '@chargewright/contract/problem';
import { sessionList, signedIn } from '@chargewright/contract/sign-in';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { TestServer } from '../../testing/test-server';
import { startTestServer } from '../../testing/test-server';
import { memberships, people, shops } from '../people/people-tables';
import { hashPassword } from './passwords';

const PASSWORD = 'three wet bulbs';

let server: TestServer;
beforeEach(async () => {
  server = await startTestServer();
  const passwordHash = await hashPassword(PASSWORD);
  await server.records.write(async (db) => {
    await db.insert(shops).values([
      { id: 's1', name: 'Northside Air' },
      { id: 's2', name: 'Eastend Heat' },
    ]);
    await db.insert(people).values({ id: 'ann', email: 'ann@example.org', name: 'Ann', passwordHash });
    await db.insert(memberships).values([
      { shopId: 's1', personId: 'ann', roles: ['technician', 'lead'] },
      { shopId: 's2', personId: 'ann', roles: ['verifier'], endedAt: '2026-01-01T00:00:00.000Z' },
    ]);
  });
});
afterEach(() => server.close());

/** A browser: sends back the cookie it was given, and says which page asks. */
function browser({ origin = server.url, agent = 'a phone' } = {}) {
  let cookie = '';
  return {
    async ask(method: string, path: string, body?: unknown): Promise<Response> {
      const response = await server.ask(path, {
        method,
        headers: {
          ...(cookie !== '' && { Cookie: cookie }),
          ...(body !== undefined && { 'Content-Type': 'application/json' }),
          ...(method !== 'GET' && { Origin: origin }),
          'User-Agent': agent,
        },
        ...(body !== undefined && { body: JSON.stringify(body) }),
      });
      const [set] = response.headers.getSetCookie();
      if (set !== undefined) cookie = /Max-Age=0/.test(set) ? '' : set.split(';')[0]!;
      return response;
    },
    signIn(email = 'ann@example.org', password = PASSWORD) {
      return this.ask('POST', '/api/v1/session', { email, password });
    },
    hasCookie: () => cookie !== '',
    cookie: () => cookie,
  };
}

const codeOf = async (response: Response) => problem.parse(await response.json()).code;

describe('signing in', () => {
  it('gives a session, the person and the shops she is a member of now', async () => {
    const phone = browser();
    const response = await phone.signIn(' Ann@Example.org ');
    expect(response.status).toBe(200);
    expect(response.headers.get('cache-control')).toBe('no-store');
    const body: unknown = await response.json();
    expect(signedIn.parse(body)).toEqual({
      person: { id: 'ann', name: 'Ann', email: 'ann@example.org' },
      shops: [{ id: 's1', name: 'Northside Air', roles: ['technician', 'lead'] }],
    });
    expect(await (await phone.ask('GET', '/api/v1/session')).json()).toEqual(body);
  });

  it('is refused alike for an unknown address and a wrong password', async () => {
    const [unknown, wrong] = [await browser().signIn('bob@example.org'), await browser().signIn(undefined, 'guess')];
    expect([unknown.status, wrong.status]).toEqual([401, 401]);
    const [first, second] = [problem.parse(await unknown.json()), problem.parse(await wrong.json())];
    expect({ ...first, id: '' }).toEqual({ ...second, id: '' });
    expect(first.code).toBe('sign-in-refused');
    expect(unknown.headers.getSetCookie()).toEqual([]);
  });

  it('waits after many failures, a right password too, and for this address only', async () => {
    const phone = browser();
    for (let i = 0; i < 5; i++) expect((await phone.signIn(undefined, 'guess')).status).toBe(401);
    const waiting = await phone.signIn();
    expect(waiting.status).toBe(429);
    expect(Number(waiting.headers.get('retry-after'))).toBeGreaterThanOrEqual(1);
    expect(await codeOf(waiting)).toBe('wait');
    expect((await phone.signIn('bob@example.org')).status).toBe(401);
  });

  it('names every fault of what was sent', async () => {
    const response = await server.postJson('/api/v1/session', { email: 7 });
    expect(response.status).toBe(422);
    const { errors = [] } = problem.parse(await response.json());
    expect(errors.map(({ path }) => path)).toEqual(['email', 'password']);
  });

  it('writes neither address nor password into the log', async () => {
    await browser().signIn(undefined, 'a guess to be kept quiet');
    const log = JSON.stringify(server.log);
    expect(log).toContain('/api/v1/session');
    for (const secret of ['ann@example.org', 'a guess to be kept quiet']) expect(log).not.toContain(secret);
  });
});

describe('a session', () => {
  it('ends when the person signs out, in the browser and on record', async () => {
    const phone = browser();
    await phone.signIn();
    const stolen = phone.cookie();
    expect((await phone.ask('DELETE', '/api/v1/session')).status).toBe(204);
    expect(phone.hasCookie()).toBe(false);
    expect((await server.ask('/api/v1/session', { headers: { Cookie: stolen } })).status).toBe(401);
  });

  it('that ended is taken out of the browser, too', async () => {
    const phone = browser();
    await phone.signIn();
    const laptop = browser();
    await laptop.signIn();
    await laptop.ask('DELETE', '/api/v1/sessions');
    expect(laptop.hasCookie()).toBe(false);
    expect(await codeOf(await phone.ask('GET', '/api/v1/session'))).toBe('signed-out');
    expect(phone.hasCookie()).toBe(false);
  });

  it('is listed with the others, and another can be ended from here', async () => {
    const [phone, laptop] = [browser({ agent: 'a phone' }), browser({ agent: 'a laptop' })];
    await phone.signIn();
    await laptop.signIn();
    const { sessions } = sessionList.parse(await (await laptop.ask('GET', '/api/v1/sessions')).json());
    expect(sessions.map(({ device, current }) => [device, current]).sort()).toEqual([
      ['a laptop', true],
      ['a phone', false],
    ]);
    const { id } = sessions.find(({ current }) => !current)!;
    expect((await laptop.ask('DELETE', `/api/v1/sessions/${id}`)).status).toBe(204);
    expect((await laptop.ask('DELETE', `/api/v1/sessions/${id}`)).status).toBe(404);
    expect((await phone.ask('GET', '/api/v1/session')).status).toBe(401);
  });

  it('is no use to a page of another server', async () => {
    const phone = browser({ origin: 'http://elsewhere.example' });
    await phone.signIn();
    const response = await phone.ask('DELETE', '/api/v1/sessions');
    expect(response.status).toBe(403);
    expect(await codeOf(response)).toBe('wrong-origin');
    expect((await phone.ask('GET', '/api/v1/session')).status).toBe(200);
  });

  it('without a page’s origin changes nothing either', async () => {
    const phone = browser();
    await phone.signIn();
    const response = await server.ask('/api/v1/session', { method: 'DELETE', headers: { Cookie: phone.cookie() } });
    expect(response.status).toBe(403);
  });
});

describe('a password', () => {
  it('is changed by who knows it; the other sessions end, this one stays', async () => {
    const [phone, laptop] = [browser(), browser()];
    await phone.signIn();
    await laptop.signIn();
    const next = 'four dry bulbs';
    expect((await laptop.ask('PUT', '/api/v1/password', { current: PASSWORD, next })).status).toBe(204);
    expect((await laptop.ask('GET', '/api/v1/session')).status).toBe(200);
    expect((await phone.ask('GET', '/api/v1/session')).status).toBe(401);
    expect((await browser().signIn()).status).toBe(401);
    expect((await browser().signIn(undefined, next)).status).toBe(200);
  });

  it('stays when the present one is wrong or the next too short', async () => {
    const phone = browser();
    await phone.signIn();
    const wrong = await phone.ask('PUT', '/api/v1/password', { current: 'guess', next: 'four dry bulbs' });
    expect([wrong.status, await codeOf(wrong)]).toEqual([401, 'sign-in-refused']);
    const short = await phone.ask('PUT', '/api/v1/password', { current: PASSWORD, next: 'short' });
    expect(short.status).toBe(422);
    expect(problem.parse(await short.json()).errors).toEqual([
      { path: 'next', message: 'A password has at least 10 characters.' },
    ]);
    expect((await browser().signIn()).status).toBe(200);
  });

  it('cannot be guessed quicker by who holds a session', async () => {
    const phone = browser();
    await phone.signIn();
    const guess = () => phone.ask('PUT', '/api/v1/password', { current: 'guess', next: 'four dry bulbs' });
    for (let i = 0; i < 5; i++) await guess();
    expect((await guess()).status).toBe(429);
  });
});
