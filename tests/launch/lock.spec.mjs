import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { expect, it } from 'vitest';
import { withLock } from '../../apps/launch/lock.mjs';
import { temporaryFolder } from './temporary-folder.mjs';

const lockFile = () => path.join(temporaryFolder(), 'prepare.lock');
const deadPid = () => spawnSync('true').pid;

it('leaves nothing behind, also after a failure', async () => {
  const file = lockFile();
  const failing = withLock(file, () => {
    expect(existsSync(file)).toBe(true);
    throw new Error('did not work');
  });
  await expect(failing).rejects.toThrow('did not work');
  expect(readdirSync(path.dirname(file))).toEqual([]);
});

it('lets the second wait for the first', async () => {
  const file = lockFile();
  const events = [];
  const work = (name) => async () => {
    events.push(`${name} begins`);
    await sleep(50);
    events.push(`${name} ends`);
  };
  await Promise.all([withLock(file, work('first')), withLock(file, work('second'))]);
  expect(events).toEqual(['first begins', 'first ends', 'second begins', 'second ends']);
});

it.each([
  ['of a dead process', () => `${deadPid()} 1`],
  ['of a dead process whose number is in use again', () => `${process.pid} 1`],
  ['cut off while being written', () => ''],
])('takes over a lock %s, one at a time', async (_, owner) => {
  const file = lockFile();
  writeFileSync(file, owner());
  let inside = 0;
  let most = 0;
  const work = async () => {
    most = Math.max(most, ++inside);
    await sleep(20);
    inside--;
  };
  await Promise.all(Array.from({ length: 4 }, () => withLock(file, work)));
  expect(most).toBe(1);
  expect(readdirSync(path.dirname(file))).toEqual([]);
});
