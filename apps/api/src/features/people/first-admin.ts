import { randomBytes } from 'node:crypto';
import { uuidv7 } from 'uuidv7';
import type { Records } from '../../db/records';
import { hashPassword } from '../sign-in/passwords';
import { findPersonByEmail, normalizedEmail } from './people-store';
import { memberships, people, shops } from './people-tables';

export interface FirstAdmin {
  readonly shop: string;
  readonly name: string;
  readonly email: string;
}

export class EmailTakenError extends Error {
  override readonly name = 'EmailTakenError';
}

const PASSWORD_BYTES = 12;

/** A new shop with one member, its admin; the answer is a password for the first sign-in. Throws `EmailTakenError` where the address signs in already. */
export async function makeFirstAdmin(records: Records, { shop, name, email }: FirstAdmin): Promise<string> {
  const password = randomBytes(PASSWORD_BYTES).toString('base64url');
  const passwordHash = await hashPassword(password);
  const [shopId, personId] = [uuidv7(), uuidv7()];
  await records.write(async (db) => {
    if ((await findPersonByEmail(db, email)) !== undefined) throw new EmailTakenError(email);
    await db.insert(shops).values({ id: shopId, name: shop });
    await db.insert(people).values({ id: personId, email: normalizedEmail(email), name, passwordHash });
    await db.insert(memberships).values({ shopId, personId, roles: ['admin'] });
  });
  return password;
}
