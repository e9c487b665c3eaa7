import { chownSync, existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { accountsSql, appUser, databaseName, localAccounts, newAccounts, ownerUser } from './accounts.mjs';
import { prepareDataFolder } from './data-folder.mjs';
import { freePort, isPortFree } from './free-port.mjs';
import { mariadbPrograms } from './install-mariadb.mjs';
import { endOfLog, launchMariadb, makeDataDirectory, waitForSignIn } from './mariadb-process.mjs';
import { endProcess, isRunningWith } from './running-process.mjs';
import { isHeldByAnother, readRecord, writeRecord } from './server-record.mjs';
import { databaseUser } from './system-user.mjs';
import { clearAbandonedTestFolders, makeTestFolder, removeTestFolder } from './test-folder.mjs';

/**
 * @typedef {{ ownerUrl: string, appUrl: string, socket: string, host: string, port: number, pid: number,
 *   accounts: import('./accounts.mjs').Accounts, isUp: () => boolean, markFilled: () => void,
 *   stop: () => Promise<void> }} LocalDatabase
 */

/**
 * The project's own MariaDB on 127.0.0.1 and a free port. One that an earlier, killed start left running is
 * used again. For tests it is a throw-away one, whose files are gone after stop().
 * @param {{ folder?: string, forTests?: boolean, say: (line: string) => void }} wanted
 * @returns {Promise<LocalDatabase>}
 */
export async function startLocalDatabase({ folder: wished, forTests = false, say }) {
  const programs = mariadbPrograms(say);
  const user = databaseUser(say);
  if (forTests) await clearAbandonedTestFolders();
  const path = forTests ? makeTestFolder() : (wished ?? '.local/db');
  const folder = prepareDataFolder(path, user, say);
  const accounts = forTests ? newAccounts() : localAccounts(`${path}-accounts.json`);
  const place = { folder, user, programs, accounts, forTests };
  const running = (await useRunning(place, say)) ?? (await startAnew(place));
  const at = `127.0.0.1:${running.port}/${databaseName}`;
  return {
    ownerUrl: `mysql://${ownerUser}:${accounts.ownerPassword}@${at}`,
    appUrl: `mysql://${appUser}:${accounts.appPassword}@${at}`,
    socket: folder.socket,
    host: '127.0.0.1',
    port: running.port,
    pid: running.pid,
    accounts,
    isUp: () => isRunningWith(running.pid, folder.data),
    markFilled: () => rmSync(folder.unfilled, { force: true }),
    stop: forTests ? () => discard(running.pid, path) : () => stopIfHeld(folder),
  };
}

/**
 * @typedef {{ folder: import('./data-folder.mjs').DataFolder, accounts: import('./accounts.mjs').Accounts,
 *   user?: import('./system-user.mjs').SystemUser, programs: import('./mariadb-process.mjs').Programs,
 *   forTests: boolean }} Place
 */

/**
 * @param {Place} place
 * @param {(line: string) => void} say
 */
async function useRunning({ folder, accounts, programs }, say) {
  const record = readRecord(folder.record);
  if (!record || !isRunningWith(record.pid, folder.data)) return endUnrecorded(folder);
  const { pid, port } = record;
  const isRunning = () => isRunningWith(pid, folder.data);
  const password = accounts.ownerPassword;
  const isFilled = !existsSync(folder.unfilled);
  if (!isFilled && isHeldByAnother(record)) {
    throw new Error(`Another start (process ${record.holder}) is just filling this database; wait for it.`);
  }
  if (isFilled && (await waitForSignIn({ programs, port, password, milliseconds: 10_000, isRunning }))) {
    say('the database of an earlier start still runs and is used again');
    if (!isHeldByAnother(record)) writeRecord(folder.record, { pid, port, holder: process.pid });
    return { pid, port };
  }
  await endProcess(pid, 60_000);
  return undefined;
}

/**
 * Ends a server whose start was cut off before it could be recorded.
 * @param {import('./data-folder.mjs').DataFolder} folder
 * @returns {Promise<undefined>}
 */
async function endUnrecorded(folder) {
  if (!existsSync(folder.pid)) return;
  const pid = Number(readFileSync(folder.pid, 'utf8').trim());
  if (pid > 0 && isRunningWith(pid, folder.data)) await endProcess(pid, 60_000);
}

/** @param {Place} place */
async function startAnew(place) {
  const { folder, accounts, user, programs, forTests } = place;
  makeDataDirectory(place);
  const sql = accountsSql(accounts, { manyDatabases: forTests, fromScratch: existsSync(folder.unfilled) });
  writeFileSync(folder.setup, sql, { mode: 0o600 });
  if (user) chownSync(folder.setup, user.uid, user.gid);
  const port = await portFor(folder);
  const pid = await launchMariadb({ ...place, port });
  writeRecord(folder.record, { pid, port, holder: process.pid });
  const isRunning = () => isRunningWith(pid, '');
  const password = accounts.ownerPassword;
  const ready = await waitForSignIn({ programs, port, password, milliseconds: 120_000, isRunning });
  rmSync(folder.setup, { force: true });
  if (!ready) {
    await endProcess(pid, 10_000);
    throw new Error(`MariaDB did not start. The end of ${folder.log}:\n${endOfLog(folder)}`);
  }
  return { pid, port };
}

/** @param {import('./data-folder.mjs').DataFolder} folder */
async function portFor(folder) {
  const before = readRecord(folder.record)?.port;
  return before && (await isPortFree(before, '127.0.0.1')) ? before : freePort();
}

/** @param {import('./data-folder.mjs').DataFolder} folder */
async function stopIfHeld(folder) {
  const record = readRecord(folder.record);
  if (!record || isHeldByAnother(record)) return;
  if (isRunningWith(record.pid, folder.data)) await endProcess(record.pid, 60_000);
}

/**
 * @param {number} pid
 * @param {string} path
 */
async function discard(pid, path) {
  await endProcess(pid, 0);
  removeTestFolder(path);
}
