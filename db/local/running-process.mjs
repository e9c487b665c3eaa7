import { readFileSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';

/**
 * Whether the process still runs. One that has ended but that nobody has reaped does not.
 * @param {number} pid
 */
export function isRunning(pid) {
  try {
    process.kill(pid, 0);
  } catch (error) {
    return error instanceof Error && 'code' in error && error.code === 'EPERM';
  }
  const state = readProc(pid, 'stat')?.replace(/^.*\) /s, '')[0];
  return state !== 'Z' && state !== 'X';
}

/**
 * Whether the process runs and its command line holds this text. Process ids are used again, so an id kept
 * in a file proves nothing by itself. Where the system has no /proc, the id has to do.
 * @param {number} pid
 * @param {string} text
 */
export function isRunningWith(pid, text) {
  if (!isRunning(pid)) return false;
  if (process.platform !== 'linux') return true;
  return readProc(pid, 'cmdline')?.replaceAll('\0', ' ').includes(text) ?? false;
}

/**
 * @param {number} pid
 * @param {number} milliseconds the longest to wait
 * @returns {Promise<boolean>} whether it has ended
 */
export async function waitForEnd(pid, milliseconds) {
  const until = Date.now() + milliseconds;
  while (isRunning(pid)) {
    if (Date.now() > until) return false;
    await sleep(50);
  }
  return true;
}

/**
 * Asks the process to end, and makes it end when it has not after the given time.
 * @param {number} pid
 * @param {number} milliseconds
 */
export async function endProcess(pid, milliseconds) {
  signal(pid, 'SIGTERM');
  if (await waitForEnd(pid, milliseconds)) return;
  signal(pid, 'SIGKILL');
  await waitForEnd(pid, 5_000);
}

/**
 * @param {number} pid
 * @param {NodeJS.Signals} name
 */
function signal(pid, name) {
  try {
    process.kill(pid, name);
  } catch {
    // Ended between the look and the signal.
  }
}

/**
 * @param {number} pid
 * @param {string} file
 */
function readProc(pid, file) {
  try {
    return readFileSync(`/proc/${pid}/${file}`, 'utf8');
  } catch {
    return undefined;
  }
}
