/** `npm run first-admin -- --shop NAME --name NAME --email ADDRESS`: makes a shop and its first admin, and prints her password once. */
import { parseArgs } from 'node:util';
import * as z from 'zod';
import { ConfigError, readConfig } from '../config';
import { DataError } from '../db/open-database';
import { openRecords } from '../db/records';
import { EmailTakenError, makeFirstAdmin } from '../features/people/first-admin';

const USAGE = 'npm run first-admin -- --shop "Name of the shop" --name "Name of the person" --email address';

const options = { shop: { type: 'string' }, name: { type: 'string' }, email: { type: 'string' } } as const;
const wanted = z.object({ shop: z.string().trim().min(1), name: z.string().trim().min(1), email: z.email() });

async function main(): Promise<void> {
  const parsed = wanted.safeParse(parseArgs({ options, strict: false }).values);
  if (!parsed.success) throw new ConfigError(`Usage: ${USAGE}`);
  const records = openRecords(readConfig(process.env));
  try {
    const password = await makeFirstAdmin(records, parsed.data);
    console.log(`${parsed.data.name} signs in as ${parsed.data.email} with the password ${password}`);
    console.log('It is shown this once. Change it after the first sign-in.');
  } finally {
    await records.close();
  }
}

main().catch((error: unknown) => {
  const known = [ConfigError, DataError].some((kind) => error instanceof kind);
  const taken = error instanceof EmailTakenError && `${error.message} signs in already.`;
  console.error(taken || (known ? (error as Error).message : error));
  process.exitCode = 1;
});
