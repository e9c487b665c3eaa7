import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { isRunningWith } from './running-process.mjs';

/**
 * What is known of the MariaDB of a folder: its process, its port, and the process that will stop it.
 * @typedef {{ pid: number, port: number, holder: number }} ServerRecord
 */

/**
 * @param {string} file
 * @returns {ServerRecord | undefined}
 */
export function readRecord(file) {
  if (!existsSync(file)) return undefined;
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return undefined;
  }
}

/**
 * @param {string} file
 * @param {ServerRecord} record
 */
export function writeRecord(file, record) {
  writeFileSync(`${file}.new`, JSON.stringify(record), { mode: 0o600 });
  renameSync(`${file}.new`, file);
}

/**
 * Whether another process than this one still uses the server and will stop it.
 * @param {ServerRecord} record
 */
export function isHeldByAnother(record) {
  return record.holder !== process.pid && isRunningWith(record.holder, 'node');
}
