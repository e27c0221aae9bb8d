import type { SignedIn } from '@chargewright/contract/sign-in';
import { and, eq, isNull } from 'drizzle-orm';
import type { Db } from '../../db/records';
import { memberships, people, shops } from './people-tables';

/** Spaces around and capitals make no other address. */
export const normalizedEmail = (email: string): string => email.trim().toLowerCase();

export async function findPersonByEmail(db: Db, email: string) {
  const [person] = await db
    .select({ id: people.id, passwordHash: people.passwordHash })
    .from(people)
    .where(eq(people.email, normalizedEmail(email)));
  return person;
}

export async function findPasswordHash(db: Db, personId: string): Promise<string | undefined> {
  const [person] = await db.select({ hash: people.passwordHash }).from(people).where(eq(people.id, personId));
  return person?.hash;
}

export async function setPasswordHash(db: Db, personId: string, passwordHash: string): Promise<void> {
  await db.update(people).set({ passwordHash }).where(eq(people.id, personId));
}

/** The person, and the shops she is a member of now, by name. */
export async function findSignedIn(db: Db, personId: string): Promise<SignedIn | undefined> {
  const [person] = await db
    .select({ id: people.id, name: people.name, email: people.email })
    .from(people)
    .where(eq(people.id, personId));
  if (person === undefined) return undefined;
  const member = await db
    .select({ id: shops.id, name: shops.name, roles: memberships.roles })
    .from(memberships)
    .innerJoin(shops, eq(shops.id, memberships.shopId))
    .where(and(eq(memberships.personId, personId), isNull(memberships.endedAt)))
    .orderBy(shops.name, shops.id);
  return { person, shops: member.map(({ roles, ...shop }) => ({ ...shop, roles: [...roles] })) };
}
