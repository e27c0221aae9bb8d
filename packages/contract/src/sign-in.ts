/** Signing in and out, and the sessions of a person. */
import * as z from 'zod';
import { object } from './parsing/object';

export const ROLES = ['technician', 'lead', 'trainer', 'apprentice', 'verifier', 'admin'] as const;
export type Role = (typeof ROLES)[number];

export const LEAST_PASSWORD_LENGTH = 10;
/** Longer ones cost the server time and nobody types them. */
export const MOST_PASSWORD_LENGTH = 200;
const MOST_EMAIL_LENGTH = 254;

export const signInRequest = object({
  email: z.string().max(MOST_EMAIL_LENGTH),
  password: z.string().max(MOST_PASSWORD_LENGTH),
}).meta({ id: 'SignInRequest' });

export const passwordChange = object({
  current: z.string().max(MOST_PASSWORD_LENGTH),
  next: z
    .string()
    .max(MOST_PASSWORD_LENGTH)
    .meta({ description: `At least ${LEAST_PASSWORD_LENGTH} characters.` }),
}).meta({ id: 'PasswordChange' });

export const signedIn = object({
  person: object({ id: z.string(), name: z.string(), email: z.string() }),
  shops: z.array(object({ id: z.string(), name: z.string(), roles: z.array(z.enum(ROLES)) })),
}).meta({ id: 'SignedIn', description: 'Who is signed in, and the shops she is a member of.' });
export type SignedIn = z.infer<typeof signedIn>;

export const sessionList = object({
  sessions: z.array(
    object({
      id: z.string(),
      startedAt: z.string().meta({ description: 'ISO 8601 in UTC.' }),
      device: z.string().meta({ description: 'What the browser called itself.' }),
      current: z.boolean(),
    }),
  ),
}).meta({ id: 'SessionList' });
export type SessionList = z.infer<typeof sessionList>;
