import { linkSync, mkdirSync, readFileSync, rmdirSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';
import { say } from './say.mjs';

const POLL_MS = 200;
const GUARD_ABANDONED_MS = 10_000;

/** When a process started, in clock ticks since boot (proc(5), stat, field 22), or null if there is none. */
function startTicks(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The second field is the command in parentheses and may itself hold spaces: count from the last parenthesis.
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ')[19];
  } catch (error) {
    if (error.code === 'ENOENT' || error.code === 'ESRCH') return null;
    throw error;
  }
}

const identityOf = (pid) => `${pid} ${startTicks(pid)}`;

function ownerOf(file) {
  try {
    return readFileSync(file, 'utf8');
  } catch (error) {
    if (error.code === 'ENOENT') return null;
    throw error;
  }
}

/** Start time is part of the identity, because a number of a dead process may be in use again. */
const isAlive = (owner) => {
  const pid = Number(owner.split(' ')[0]);
  return Number.isInteger(pid) && pid > 0 && identityOf(pid) === owner;
};

/** Written aside and then linked, so that the lock never exists without its owner's name in it. */
function tryCreate(file) {
  const draft = `${file}.${process.pid}`;
  writeFileSync(draft, identityOf(process.pid));
  try {
    linkSync(draft, file);
    return true;
  } catch (error) {
    if (error.code === 'EEXIST') return false;
    throw error;
  } finally {
    rmSync(draft);
  }
}

/**
 * Removes the lock of a dead process. Only who holds the guard folder may do so, and looks again first: otherwise two
 * waiters could both see the dead owner, and the slower one would remove the lock the faster one has just made.
 */
function removeIfDead(file) {
  const guard = `${file}.guard`;
  try {
    mkdirSync(guard);
  } catch (error) {
    if (error.code !== 'EEXIST') throw error;
    const made = statSync(guard, { throwIfNoEntry: false })?.mtimeMs ?? Infinity;
    if (Date.now() - made > GUARD_ABANDONED_MS) rmdirSync(guard);
    return;
  }
  try {
    const owner = ownerOf(file);
    if (owner !== null && !isAlive(owner)) rmSync(file, { force: true });
  } finally {
    rmdirSync(guard);
  }
}

/** Does `work` while no other process does it; waits for a living owner, takes over from a dead one. */
export async function withLock(file, work) {
  let announced = false;
  while (!tryCreate(file)) {
    const owner = ownerOf(file);
    if (owner === null) continue;
    if (!isAlive(owner)) removeIfDead(file);
    else if (!announced) {
      say(`Another start (process ${owner.split(' ')[0]}) is installing or building: waiting for it …`);
      announced = true;
    }
    await sleep(POLL_MS);
  }
  const release = () => rmSync(file, { force: true });
  process.once('exit', release);
  try {
    return await work();
  } finally {
    process.off('exit', release);
    release();
  }
}
