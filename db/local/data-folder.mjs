import { createHash } from 'node:crypto';
import { chmodSync, chownSync, mkdirSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { closedFolderAbove } from './traversable.mjs';

// A Unix socket's address holds 108 bytes, the end mark included.
const longestSocketPath = 100;

/**
 * @typedef {{ root: string, data: string, temporary: string, socket: string, log: string, setup: string,
 *   pid: string, record: string, unfilled: string }} DataFolder
 */

/**
 * The folder for the database's files, made and owned by the user that the database runs as. When that user
 * cannot reach the wished place (a project below /root, say), the files go below /var/lib/tarekeep.
 * @param {string} wished
 * @param {import('./system-user.mjs').SystemUser | undefined} user
 * @param {(line: string) => void} say
 * @returns {DataFolder}
 */
export function prepareDataFolder(wished, user, say) {
  const root = reachable(resolve(wished), user, say);
  const temporary = join(root, 'tmp');
  const inside = join(root, 's.sock');
  for (const folder of [root, temporary]) {
    mkdirSync(folder, { recursive: true });
    if (user) chownSync(folder, user.uid, user.gid);
    chmodSync(folder, 0o700);
  }
  return {
    root,
    temporary,
    data: join(root, 'data'),
    socket: Buffer.byteLength(inside) <= longestSocketPath ? inside : `/tmp/tarekeep-${shortHash(root)}.sock`,
    log: join(root, 'mariadb.log'),
    setup: join(root, 'accounts.sql'),
    pid: join(root, 'pid'),
    record: join(root, 'server.json'),
    unfilled: join(root, 'unfilled'),
  };
}

/**
 * @param {string} wished
 * @param {import('./system-user.mjs').SystemUser | undefined} user
 * @param {(line: string) => void} say
 */
function reachable(wished, user, say) {
  mkdirSync(dirname(wished), { recursive: true });
  const closed = user && closedFolderAbove(wished, user);
  if (!closed) return wished;
  const instead = `/var/lib/tarekeep/${shortHash(wished)}`;
  mkdirSync(dirname(instead), { recursive: true, mode: 0o755 });
  say(`the account ${user.name} may not pass through ${closed}, so the database's files are in ${instead}`);
  return instead;
}

/** @param {string} text */
function shortHash(text) {
  return createHash('sha256').update(text).digest('hex').slice(0, 12);
}
