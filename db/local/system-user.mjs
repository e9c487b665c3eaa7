import { spawnSync } from 'node:child_process';
import { findProgram } from './program.mjs';

const accountName = 'tarekeep';

/**
 * @typedef {{ name: string, uid: number, gid: number }} SystemUser
 */

/**
 * The unprivileged account that MariaDB runs as; it refuses to run as root. Nothing is returned when this
 * process is not root: MariaDB then runs as the person who started it.
 * @param {(line: string) => void} say
 * @returns {SystemUser | undefined}
 */
export function databaseUser(say) {
  if (process.getuid?.() !== 0) return undefined;
  const there = lookUp(accountName);
  if (there) return there;
  const useradd = findProgram('useradd');
  if (useradd) {
    say(`making the system account ${accountName}, which the database runs as`);
    spawnSync(useradd, [
      '--system',
      '--user-group',
      '--no-create-home',
      '--shell',
      '/usr/sbin/nologin',
      accountName,
    ]);
  }
  const user = lookUp(accountName) ?? lookUp('nobody');
  if (!user) throw new Error(`No unprivileged account to run MariaDB as: make one named ${accountName}.`);
  return user;
}

/**
 * @param {string} name
 * @returns {SystemUser | undefined}
 */
function lookUp(name) {
  const uid = idOf('-u', name);
  const gid = idOf('-g', name);
  return uid && gid ? { name, uid, gid } : undefined;
}

/**
 * @param {string} flag
 * @param {string} name
 */
function idOf(flag, name) {
  const answer = spawnSync('id', [flag, name], { encoding: 'utf8' });
  return answer.status === 0 ? Number(answer.stdout.trim()) : undefined;
}
