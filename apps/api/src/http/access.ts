/**
 * Who may ask what: one table of every route of the API, in front of all of them. A route that is not in it is not reached, so that none can be
 * forgotten; a test walks the routes and compares.
 */
import type { RequestHandler } from 'express';
import { HttpProblem } from './http-problem';
import type { Session, Sessions } from '../features/sign-in/sessions';
import { isOwnOrigin, SESSION_COOKIE } from '../features/sign-in/sessions';

/** `open`: anybody. `signed-in`: anybody with a session. */
type Access = 'open' | 'signed-in';

export const ACCESS = {
  'POST /api/v1/evaluations': 'open',
  'POST /api/v1/airflow': 'open',
  'POST /api/v1/capacity': 'open',
  'POST /api/v1/weigh-in': 'open',
  'GET /api/v1/refrigerants': 'open',
  'GET /api/v1/refrigerants/:id/saturation': 'open',
  'GET /api/v1/psychrometrics': 'open',
  'GET /api/v1/sources': 'open',
  'GET /api/v1/openapi.json': 'open',
  'POST /api/v1/session': 'open',
  'GET /api/v1/session': 'signed-in',
  'DELETE /api/v1/session': 'signed-in',
  'GET /api/v1/sessions': 'signed-in',
  'DELETE /api/v1/sessions': 'signed-in',
  'DELETE /api/v1/sessions/:id': 'signed-in',
  'PUT /api/v1/password': 'signed-in',
} as const satisfies Readonly<Record<`${string} /api/${string}`, Access>>;

interface Rule {
  readonly method: string;
  readonly path: RegExp;
  readonly access: Access;
}

const RULES: readonly Rule[] = Object.entries(ACCESS).map(([route, access]) => {
  const [method = '', path = ''] = route.split(' ');
  return { method, path: new RegExp(`^${path.replaceAll('.', '\\.').replace(/:\w+/g, '[^/]+')}/?$`, 'i'), access };
});

const SAFE_METHODS: ReadonlySet<string> = new Set(['GET', 'HEAD', 'OPTIONS']);

const sessionOf = new WeakMap<object, Session>();

/** The session of a request that `guard` let through to a route for people who are signed in. */
export function requireSession(request: object): Session {
  const session = sessionOf.get(request);
  if (session === undefined) throw new HttpProblem('signed-out');
  return session;
}

export interface GuardDeps {
  readonly sessions: Sessions;
  /** Address by which browsers reach the server; without it, the one they ask for. */
  readonly publicUrl: string | undefined;
}

/** Before every route: whose session it is, whether an unsafe request comes from our own page, and whether the table lets it through. */
export function guard({ sessions, publicUrl }: GuardDeps): RequestHandler {
  const ownHost = publicUrl === undefined ? undefined : new URL(publicUrl).host;
  return async (req, res, next) => {
    const path = req.baseUrl + req.path;
    const rules = RULES.filter((rule) => rule.path.test(path));
    if (rules.length === 0) throw new HttpProblem('not-found');
    const method = req.method === 'HEAD' ? 'GET' : req.method;
    const rule = rules.find((each) => each.method === method);
    const cookies = req.headers.cookie ?? '';
    const carriesSession = cookies.includes(`${SESSION_COOKIE}=`);
    if (
      carriesSession &&
      !SAFE_METHODS.has(req.method) &&
      !isOwnOrigin(req.headers.origin, ownHost ?? req.headers.host)
    ) {
      throw new HttpProblem('wrong-origin');
    }
    // a method that the path does not take is answered by its route, with those it does
    if (rule !== undefined && rule.access !== 'open') {
      const read = carriesSession ? await sessions.read(cookies) : null;
      if (read === null) {
        throw new HttpProblem('signed-out', carriesSession ? { headers: { 'Set-Cookie': sessions.blankCookie } } : {});
      }
      if (read.cookie !== null) res.append('Set-Cookie', read.cookie);
      sessionOf.set(req, read.session);
    }
    next();
  };
}
