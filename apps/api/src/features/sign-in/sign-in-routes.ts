import type { Request, Response } from 'express';
import { Router } from 'express';
import { ipKeyGenerator } from 'express-rate-limit';
import { requireSession } from '../../http/access';
import { allowMethods } from '../../http/allow-methods';
import { HttpProblem } from '../../http/http-problem';
import { jsonBody } from '../../http/json-body';
import type { SignInDeps } from './sign-in-service';
import { changePassword, listSessions, readSignedIn, signIn } from './sign-in-service';

const SESSION = '/api/v1/session';
const SESSIONS = '/api/v1/sessions';
const ONE_SESSION = '/api/v1/sessions/:id';
const PASSWORD = '/api/v1/password';

const addressOf = (req: Request): string => ipKeyGenerator(req.ip ?? '');
const answer = (res: Response, body: object): void => {
  res.set('Cache-Control', 'no-store').json(body);
};

/** Signing in and out, the sessions of the person, and her password. */
export function signInRoutes(deps: SignInDeps): Router {
  const { records, sessions } = deps;
  const router = Router();

  router.post(SESSION, ...jsonBody, async (req, res) => {
    const asker = { address: addressOf(req), device: req.headers['user-agent'] ?? '' };
    const { cookie, signedIn } = await signIn(deps, req.body, asker);
    res.append('Set-Cookie', cookie);
    answer(res, signedIn);
  });
  router.get(SESSION, async (req, res) => {
    answer(res, await readSignedIn(records, requireSession(req).personId));
  });
  router.delete(SESSION, async (req, res) => {
    const { id, personId } = requireSession(req);
    await sessions.end(personId, id);
    res.append('Set-Cookie', sessions.blankCookie).status(204).end();
  });
  router.all(SESSION, allowMethods('GET', 'HEAD', 'POST', 'DELETE', 'OPTIONS'));

  router.get(SESSIONS, async (req, res) => {
    answer(res, await listSessions(sessions, requireSession(req)));
  });
  router.delete(SESSIONS, async (req, res) => {
    await sessions.endAllOf(requireSession(req).personId);
    res.append('Set-Cookie', sessions.blankCookie).status(204).end();
  });
  router.all(SESSIONS, allowMethods('GET', 'HEAD', 'DELETE', 'OPTIONS'));

  router.delete(ONE_SESSION, async (req, res) => {
    const ended = await sessions.end(requireSession(req).personId, req.params.id);
    if (!ended) throw new HttpProblem('not-found');
    res.status(204).end();
  });
  router.all(ONE_SESSION, allowMethods('DELETE', 'OPTIONS'));

  router.put(PASSWORD, ...jsonBody, async (req, res) => {
    await changePassword(deps, req.body, { session: requireSession(req), address: addressOf(req) });
    res.status(204).end();
  });
  router.all(PASSWORD, allowMethods('PUT', 'OPTIONS'));
  return router;
}
