import { execFile } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { promisify } from 'node:util';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { openRecords } from '../db/records';
import { findPersonByEmail, findSignedIn } from '../features/people/people-store';
import { verifyPassword } from '../features/sign-in/passwords';
import { MIGRATIONS_DIR } from '../testing/temporary-records';

const ROOT = path.resolve(import.meta.dirname, '../../../..');
const COMMAND = path.join(ROOT, 'apps/api/src/commands/first-admin.ts');

let dataDir: string;
beforeAll(() => {
  dataDir = mkdtempSync(path.join(tmpdir(), 'first-admin-'));
});
afterAll(() => rmSync(dataDir, { recursive: true }));

const command = (...args: readonly string[]) =>
  promisify(execFile)(process.execPath, ['--import', 'tsx', COMMAND, ...args], {
    cwd: ROOT,
    env: { PATH: process.env['PATH'], DATA_DIR: dataDir },
  });
const ANN = ['--shop', 'Northside Air', '--name', 'Ann', '--email', 'Ann@example.org'];

it('the first admin is made once, with a password that is shown once', async () => {
  const { stdout } = await command(...ANN);
  const password = /password (\S+)/.exec(stdout)?.[1] ?? '';
  const records = openRecords({ dataDir, migrationsDir: MIGRATIONS_DIR });
  const person = await findPersonByEmail(records.read, 'ann@example.org');
  expect(await verifyPassword(person?.passwordHash, password)).toBe(true);
  const signedIn = await findSignedIn(records.read, person!.id);
  expect(signedIn?.shops).toMatchObject([{ name: 'Northside Air', roles: ['admin'] }]);
  await records.close();

  await expect(command(...ANN)).rejects.toMatchObject({ code: 1, stderr: 'Ann@example.org signs in already.\n' });
  const usage = { code: 1, stderr: expect.stringMatching(/^Usage: npm run first-admin/) as string };
  await expect(command('--shop', 'Northside Air')).rejects.toMatchObject(usage);
}, 60_000);
