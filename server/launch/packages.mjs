import { createHash } from 'node:crypto';
import { existsSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { runProgram } from './run-program.mjs';
import { say } from './say.mjs';

/**
 * Installs the packages of the lock, unless exactly these are installed.
 * @param {string} root the project's folder
 * @param {(words: string) => void} note
 */
export async function installPackagesOfLock(root, note) {
  const lock = join(root, 'package-lock.json');
  const stamp = join(root, 'node_modules/.tarekeep-lock-hash');
  const hash = createHash('sha256').update(readFileSync(lock)).digest('hex');
  if (areInstalled({ root, lock, stamp, hash })) {
    note('as in the lock');
    if (existsSync(stamp)) return;
  } else {
    say('installing the packages of the lock; on two cores this takes two to three minutes');
    const npm = process.env.npm_execpath;
    const args = ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
    if (npm) await runProgram(process.execPath, [npm, ...args]);
    else await runProgram('npm', args);
  }
  writeFileSync(stamp, hash);
}

/** @param {{ root: string, lock: string, stamp: string, hash: string }} files */
function areInstalled({ root, lock, stamp, hash }) {
  // npm writes this file last, so it is there only after a whole install.
  const installed = join(root, 'node_modules/.package-lock.json');
  if (!existsSync(installed)) return false;
  if (existsSync(stamp)) return readFileSync(stamp, 'utf8') === hash;
  return statSync(installed).mtimeMs >= statSync(lock).mtimeMs;
}
