import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { isPortFree } from '../../db/local/free-port.mjs';
import { endProcess, isRunningWith, waitForEnd } from '../../db/local/running-process.mjs';

const launcherMark = 'server/launch/';
const serverMark = 'server/index.ts';

/**
 * @typedef {{ launcher: number, server?: number, port: number }} StartRecord
 */

/**
 * Ends the web server that a killed start left behind, and gives a start that is just stopping the time to.
 * @param {string} file where starts of this folder are recorded
 */
export async function clearEarlierStart(file) {
  const earlier = readRecord(file);
  if (!earlier || earlier.launcher === process.pid) return;
  if (isRunningWith(earlier.launcher, launcherMark) && !(await waitForEnd(earlier.launcher, 3_000))) return;
  if (earlier.server && isRunningWith(earlier.server, serverMark)) await endProcess(earlier.server, 10_000);
}

/**
 * @param {string} file
 * @param {StartRecord} record
 */
export function recordStart(file, record) {
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, JSON.stringify(record));
}

/** @param {string} file */
export function forgetStart(file) {
  if (readRecord(file)?.launcher === process.pid) rmSync(file, { force: true });
}

/**
 * @param {string} file
 * @param {{ port: number, listen: string }} wanted
 */
export async function claimPort(file, { port, listen }) {
  for (let tries = 0; tries < 10; tries += 1) {
    if (await isPortFree(port, listen)) return;
    await sleep(100);
  }
  const earlier = readRecord(file);
  const ours = earlier?.port === port && isRunningWith(earlier.launcher, launcherMark);
  throw new Error(
    `Port ${port} is taken${ours ? `: Tarekeep already runs here (process ${earlier.launcher})` : ''}.\n` +
      `Stop what uses it, or take another: PORT=${port + 1} npm start`,
  );
}

/**
 * @param {string} file
 * @returns {StartRecord | undefined}
 */
function readRecord(file) {
  try {
    return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : undefined;
  } catch {
    return undefined;
  }
}
