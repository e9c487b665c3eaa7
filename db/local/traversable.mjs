import { statSync } from 'node:fs';
import { dirname, resolve } from 'node:path';

/**
 * Whether a user may pass through a folder, by its mode bits.
 * @param {{ mode: number, uid: number, gid: number }} folder
 * @param {{ uid: number, gid: number }} user
 */
export function mayPass(folder, user) {
  if (folder.uid === user.uid) return (folder.mode & 0o100) !== 0;
  if (folder.gid === user.gid) return (folder.mode & 0o010) !== 0;
  return (folder.mode & 0o001) !== 0;
}

/**
 * The first folder above a path, from the root down, that the user may not pass through.
 * @param {string} path
 * @param {{ uid: number, gid: number }} user
 * @returns {string | undefined}
 */
export function closedFolderAbove(path, user) {
  const above = [];
  for (let folder = dirname(resolve(path)); ; folder = dirname(folder)) {
    above.unshift(folder);
    if (folder === dirname(folder)) break;
  }
  return above.find((folder) => !mayPass(statSync(folder), user));
}
