/** Passwords are kept as argon2id (RFC 9106; 19 MiB, two passes: the least that OWASP's password storage sheet of 2023 names). */
import { hash, verify } from '@node-rs/argon2';

const OPTIONS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** Accents typed on another keyboard may be composed another way. */
const normalized = (password: string): string => password.normalize('NFKC');

export const hashPassword = (password: string): Promise<string> => hash(normalized(password), OPTIONS);

/** A hash that no password has: verified for an unknown address, so that it takes as long as a known one. */
const nobodys = hash('', OPTIONS);

/** Whether the password is the one of the hash; `undefined`, where there is no such person, takes as long and is never right. */
export async function verifyPassword(passwordHash: string | undefined, password: string): Promise<boolean> {
  const isRight = await verify(passwordHash ?? (await nobodys), normalized(password));
  return passwordHash !== undefined && isRight;
}
