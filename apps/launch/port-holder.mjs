import { readdirSync, readFileSync, readlinkSync } from 'node:fs';

const LISTEN = '0A';

/** Inodes of the sockets that listen on a port, from the kernel's tables (proc(5), net/tcp). */
function listeningInodes(port) {
  const inodes = new Set();
  for (const table of ['/proc/net/tcp', '/proc/net/tcp6']) {
    let text = '';
    try {
      text = readFileSync(table, 'utf8');
    } catch {
      // No such table (no IPv6, or not Linux): nothing can be found there.
    }
    for (const line of text.split('\n').slice(1)) {
      const [, local, , state, , , , , , inode] = line.trim().split(/\s+/);
      if (state === LISTEN && parseInt(local.split(':')[1], 16) === port) inodes.add(inode);
    }
  }
  return inodes;
}

function socketsOf(pid) {
  try {
    const folder = `/proc/${pid}/fd`;
    return readdirSync(folder).map((fd) => /^socket:\[(\d+)\]$/.exec(readlinkSync(`${folder}/${fd}`))?.[1]);
  } catch {
    // Ended meanwhile, or belongs to someone else: it cannot be looked into.
    return [];
  }
}

/** The process that listens on a TCP port, as `{ pid, command }`, or null if it cannot be found. */
export function portHolder(port) {
  const inodes = listeningInodes(port);
  if (inodes.size === 0) return null;
  for (const pid of readdirSync('/proc').filter((name) => /^\d+$/.test(name))) {
    if (!socketsOf(pid).some((inode) => inodes.has(inode))) continue;
    const command = readFileSync(`/proc/${pid}/cmdline`, 'utf8').replaceAll('\0', ' ').trim();
    return { pid: Number(pid), command };
  }
  return null;
}
