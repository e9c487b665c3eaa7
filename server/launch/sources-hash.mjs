import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';

/**
 * One hash over files and whole folders: it changes when a file in them is added, removed, renamed or
 * changed. What does not exist counts as absent.
 * @param {string} root
 * @param {readonly string[]} entries paths below root
 */
export function hashOfSources(root, entries) {
  const hash = createHash('sha256');
  for (const path of entries.flatMap((entry) => filesAt(root, entry)).sort()) {
    const content = readFileSync(join(root, path));
    hash.update(`${path}\0${content.length}\0`).update(content);
  }
  return hash.digest('hex');
}

/**
 * @param {string} root
 * @param {string} path
 * @returns {string[]}
 */
function filesAt(root, path) {
  const full = join(root, path);
  if (!existsSync(full)) return [];
  if (!statSync(full).isDirectory()) return [path];
  return readdirSync(full).flatMap((name) => filesAt(root, `${path}/${name}`));
}
