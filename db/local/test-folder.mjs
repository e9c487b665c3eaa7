import { chmodSync, existsSync, mkdtempSync, readdirSync, rmSync, statfsSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { endProcess, isRunningWith } from './running-process.mjs';
import { isHeldByAnother, readRecord } from './server-record.mjs';

const prefix = 'tarekeep-test-';
const memory = '/dev/shm';
// A fresh server takes about 110 MB; the databases of the test workers come on top.
const roomNeeded = 1024 ** 3;

/** A folder of its own for one test run, in memory where there is room. */
export function makeTestFolder() {
  const folder = mkdtempSync(join(hasRoom(memory) ? memory : tmpdir(), prefix));
  // The database's own user has to pass through it.
  chmodSync(folder, 0o711);
  return join(folder, 'db');
}

/** Ends the servers, and removes the folders, of test runs that were killed. */
export async function clearAbandonedTestFolders() {
  for (const place of [memory, tmpdir()].filter((folder) => existsSync(folder))) {
    for (const name of readdirSync(place).filter((entry) => entry.startsWith(prefix))) {
      await clearIfAbandoned(join(place, name));
    }
  }
}

/** @param {string} folder */
async function clearIfAbandoned(folder) {
  try {
    const record = readRecord(join(folder, 'db', 'server.json'));
    if (!record || isHeldByAnother(record)) return;
    if (isRunningWith(record.pid, folder)) await endProcess(record.pid, 5_000);
    rmSync(folder, { recursive: true, force: true });
  } catch {
    // Another user's folder, or one that is just being removed.
  }
}

/** @param {string} folder */
function hasRoom(folder) {
  if (!existsSync(folder)) return false;
  const { bavail, bsize } = statfsSync(folder);
  return bavail * bsize >= roomNeeded;
}

/** @param {string} folder the folder that makeTestFolder gave */
export function removeTestFolder(folder) {
  rmSync(join(folder, '..'), { recursive: true, force: true });
}
