import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';

// Debian keeps servers in sbin folders, which are not on the PATH of ordinary users.
const besidesPath = ['/usr/sbin', '/usr/local/sbin', '/sbin', '/usr/local/bin', '/opt/homebrew/bin'];

/**
 * Where the first of the named programs stands on this machine.
 * @param {...string} names
 * @returns {string | undefined}
 */
export function findProgram(...names) {
  const folders = [...(process.env.PATH ?? '').split(delimiter).filter(Boolean), ...besidesPath];
  for (const name of names) {
    for (const folder of folders) {
      const path = join(folder, name);
      if (isExecutable(path)) return path;
    }
  }
  return undefined;
}

/** @param {string} path */
function isExecutable(path) {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}
