import { createReadStream } from 'node:fs';
import { mkdir, rename, rm, stat, writeFile } from 'node:fs/promises';
import path from 'node:path';
import type { Readable } from 'node:stream';
import { v7 as newId } from 'uuid';

/** Bytes under the SHA-256 of themselves. */
export type FileStore = {
  put: (sha256: string, bytes: Buffer) => Promise<void>;
  open: (sha256: string) => Readable;
  has: (sha256: string) => Promise<boolean>;
};

/** A folder, which several servers may share. A file appears under its name only when whole. */
export function folderStore(folder: string): FileStore {
  const placeOf = (sha256: string): string => {
    if (!/^[0-9a-f]{64}$/.test(sha256)) throw new Error('not a SHA-256');
    return path.join(folder, sha256.slice(0, 2), sha256);
  };
  return {
    async put(sha256, bytes) {
      const place = placeOf(sha256);
      await mkdir(path.dirname(place), { recursive: true, mode: 0o700 });
      const draft = `${place}.${newId()}.part`;
      try {
        await writeFile(draft, bytes, { mode: 0o600, flush: true });
        await rename(draft, place);
      } finally {
        await rm(draft, { force: true });
      }
    },
    open: (sha256) => createReadStream(placeOf(sha256)),
    has: (sha256) =>
      stat(placeOf(sha256)).then(
        () => true,
        () => false,
      ),
  };
}
