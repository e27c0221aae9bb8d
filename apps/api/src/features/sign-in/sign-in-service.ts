import type { SessionList, SignedIn } from '@chargewright/contract/sign-in';
import { LEAST_PASSWORD_LENGTH, passwordChange, signInRequest } from '@chargewright/contract/sign-in';
import { passwordTooShort } from '@chargewright/wording';
import type { Records } from '../../db/records';
import { HttpProblem } from '../../http/http-problem';
import { readBody } from '../../http/read-body';
import {
  findPasswordHash,
  findPersonByEmail,
  findSignedIn,
  normalizedEmail,
  setPasswordHash,
} from '../people/people-store';
import { hashPassword, verifyPassword } from './passwords';
import type { Session, Sessions } from './sessions';
import { endOtherSessions } from './sessions';
import type { SignInWaits } from './sign-in-waits';

export interface SignInDeps {
  readonly records: Records;
  readonly sessions: Sessions;
  readonly waits: SignInWaits;
}

/** What tells one browser from another. */
export interface Asker {
  readonly address: string;
  readonly device: string;
}

export interface Started {
  readonly cookie: string;
  readonly signedIn: SignedIn;
}

/** Starts a session. Throws `wait` after too many failures, and `sign-in-refused` alike for an unknown address and a wrong password. */
export async function signIn({ records, sessions, waits }: SignInDeps, body: unknown, asker: Asker): Promise<Started> {
  const { email, password } = readBody(signInRequest, body);
  const key = `${normalizedEmail(email)} ${asker.address}`;
  const person = await findPersonByEmail(records.read, email);
  await checkPassword(waits, key, () => verifyPassword(person?.passwordHash, password));
  if (person === undefined) throw new HttpProblem('sign-in-refused');
  return {
    cookie: await sessions.create(person.id, asker.device),
    signedIn: await readSignedIn(records, person.id),
  };
}

async function checkPassword(waits: SignInWaits, key: string, isRight: () => Promise<boolean>): Promise<void> {
  const seconds = waits.secondsToWait(key);
  if (seconds > 0) throw new HttpProblem('wait', { headers: { 'Retry-After': String(seconds) } });
  // counted before it is known, so that many at once do not all pass
  waits.failed(key);
  if (!(await isRight())) throw new HttpProblem('sign-in-refused');
  waits.succeeded(key);
}

export async function readSignedIn(records: Records, personId: string): Promise<SignedIn> {
  const signedIn = await findSignedIn(records.read, personId);
  if (signedIn === undefined) throw new HttpProblem('signed-out');
  return signedIn;
}

export async function listSessions(sessions: Sessions, current: Session): Promise<SessionList> {
  const list = await sessions.list(current.personId);
  return {
    sessions: list.map(({ id, startedAt, device }) => ({ id, startedAt, device, current: id === current.id })),
  };
}

/** Changes the password; the person's other sessions end. Wrong current passwords are waited for as at signing in. */
export async function changePassword(
  { records, waits }: SignInDeps,
  body: unknown,
  { session, address }: { readonly session: Session; readonly address: string },
): Promise<void> {
  const { current, next } = readBody(passwordChange, body);
  if (next.length < LEAST_PASSWORD_LENGTH) {
    throw new HttpProblem('invalid-input', {
      errors: [{ path: 'next', message: passwordTooShort(LEAST_PASSWORD_LENGTH) }],
    });
  }
  await checkPassword(waits, `${session.personId} ${address}`, async () =>
    verifyPassword(await findPasswordHash(records.read, session.personId), current),
  );
  const passwordHash = await hashPassword(next);
  // together, so that no session outlives a password that was changed because of it
  await records.write(async (db) => {
    await setPasswordHash(db, session.personId, passwordHash);
    await endOtherSessions(db, session);
  });
}
