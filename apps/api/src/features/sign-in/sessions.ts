/**
 * Sessions of people who signed in. The only file that knows the session library (it is no longer developed); what it lacks is here: the record keeps a
 * hash of the cookie's token, not the token, and its writes take their turn with all others.
 */
import { createHash, randomBytes } from 'node:crypto';
import { DrizzleSQLiteAdapter } from '@lucia-auth/adapter-drizzle';
import { and, eq, ne } from 'drizzle-orm';
import type { Adapter } from 'lucia';
import { Lucia, TimeSpan, verifyRequestOrigin } from 'lucia';
import type { Db, Records } from '../../db/records';
import { people } from '../people/people-tables';
import { sessions } from './sessions-tables';

interface SessionAttributes {
  readonly startedAt: string;
  readonly device: string;
}

declare module 'lucia' {
  interface Register {
    Lucia: Lucia<SessionAttributes>;
    DatabaseSessionAttributes: SessionAttributes;
  }
}

export interface Session extends SessionAttributes {
  readonly id: string;
  readonly personId: string;
}

export interface ReadSession {
  readonly session: Session;
  /** To be sent when the session was prolonged: half of its life had passed. */
  readonly cookie: string | null;
}

export interface Sessions {
  /** A cookie that ends the session in the browser. */
  readonly blankCookie: string;
  /** Starts a session; the answer is the cookie to send. */
  create(personId: string, device: string): Promise<string>;
  /** The session of a request's Cookie header, or null where there is none that holds. */
  read(cookieHeader: string): Promise<ReadSession | null>;
  list(personId: string): Promise<readonly Session[]>;
  /** Ends one of the person's sessions; false where she has none of that id. */
  end(personId: string, sessionId: string): Promise<boolean>;
  endAllOf(personId: string): Promise<void>;
  /** Removes what has expired. */
  sweep(): Promise<void>;
}

export const SESSION_COOKIE = 'chargewright_session';
const LIFE_DAYS = 60;
const TOKEN_BYTES = 32;
const DEVICE_LENGTH = 200;

const hashOf = (token: string): string => createHash('sha256').update(token).digest('hex');

export function openSessions(records: Records, { secure }: { readonly secure: boolean }): Sessions {
  const lucia = new Lucia(adapterOf(records), {
    sessionExpiresIn: new TimeSpan(LIFE_DAYS, 'd'),
    sessionCookie: { name: SESSION_COOKIE, attributes: { secure, sameSite: 'lax', path: '/' } },
    getSessionAttributes: ({ startedAt, device }) => ({ startedAt, device }),
  });
  const cookieOf = (token: string): string => lucia.createSessionCookie(token).serialize();

  return {
    blankCookie: lucia.createBlankSessionCookie().serialize(),

    async create(personId, device) {
      const token = randomBytes(TOKEN_BYTES).toString('base64url');
      const attributes = { startedAt: new Date().toISOString(), device: device.slice(0, DEVICE_LENGTH) };
      await lucia.createSession(personId, attributes, { sessionId: hashOf(token) });
      return cookieOf(token);
    },

    async read(cookieHeader) {
      const token = lucia.readSessionCookie(cookieHeader);
      if (token === null || token === '') return null;
      const { session } = await lucia.validateSession(hashOf(token));
      if (session === null) return null;
      const { id, userId, startedAt, device, fresh } = session;
      return { session: { id, personId: userId, startedAt, device }, cookie: fresh ? cookieOf(token) : null };
    },

    async list(personId) {
      const open = await lucia.getUserSessions(personId);
      return open.map(({ id, startedAt, device }) => ({ id, personId, startedAt, device }));
    },

    async end(personId, sessionId) {
      return records.write(async (db) => {
        const ended = await db
          .delete(sessions)
          .where(and(eq(sessions.id, sessionId), eq(sessions.userId, personId)))
          .returning({ id: sessions.id });
        return ended.length > 0;
      });
    },

    endAllOf: (personId) => records.write((db) => on(db).deleteUserSessions(personId)),

    sweep: () => lucia.deleteExpiredSessions(),
  };
}

const on = (db: Db): Adapter => new DrizzleSQLiteAdapter(db, sessions, people);

/** Ends the person's other sessions, within a write. */
export async function endOtherSessions(db: Db, { id, personId }: Session): Promise<void> {
  await db.delete(sessions).where(and(eq(sessions.userId, personId), ne(sessions.id, id)));
}

function adapterOf(records: Records): Adapter {
  const reading = on(records.read);
  const writing = (work: (adapter: Adapter) => Promise<void>) => records.write((db) => work(on(db)));
  return {
    getSessionAndUser: (sessionId) => reading.getSessionAndUser(sessionId),
    getUserSessions: (userId) => reading.getUserSessions(userId),
    setSession: (session) => writing((adapter) => adapter.setSession(session)),
    updateSessionExpiration: (sessionId, at) => writing((adapter) => adapter.updateSessionExpiration(sessionId, at)),
    deleteSession: (sessionId) => writing((adapter) => adapter.deleteSession(sessionId)),
    deleteUserSessions: (userId) => writing((adapter) => adapter.deleteUserSessions(userId)),
    deleteExpiredSessions: () => writing((adapter) => adapter.deleteExpiredSessions()),
  };
}

/** Whether a request comes from a page of this server: its Origin header has the same host and port. */
export const isOwnOrigin = (origin: string | undefined, host: string | undefined): boolean =>
  origin !== undefined && host !== undefined && verifyRequestOrigin(origin, [host]);
