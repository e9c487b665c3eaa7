import { spawn, spawnSync } from 'node:child_process';
import { existsSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';
import { ownerUser } from './accounts.mjs';

/**
 * @typedef {import('./data-folder.mjs').DataFolder} DataFolder
 * @typedef {import('./system-user.mjs').SystemUser} SystemUser
 * @typedef {{ server: string, maker: string, client: string }} Programs
 */

/**
 * Makes the empty data directory unless it is there. It gets its name when it is whole. The mark beside it
 * says that the first tables and rows are still to come: MariaDB commits each CREATE TABLE on its own, so a
 * first start that was cut off has to begin again.
 * @param {{ folder: DataFolder, user?: SystemUser, programs: Programs }} place
 */
export function makeDataDirectory({ folder, user, programs }) {
  if (existsSync(folder.data)) return;
  const unfinished = `${folder.data}.new`;
  rmSync(unfinished, { recursive: true, force: true });
  const made = spawnSync(
    programs.maker,
    [
      '--no-defaults',
      `--datadir=${unfinished}`,
      '--auth-root-authentication-method=normal',
      '--skip-test-db',
      '--skip-name-resolve',
    ],
    { cwd: folder.root, encoding: 'utf8', env: environment(folder), uid: user?.uid, gid: user?.gid },
  );
  if (made.status !== 0) {
    const output = made.error?.message ?? `${made.stdout}${made.stderr}`;
    throw new Error(`MariaDB could not make its data directory:\n${lastLines(output)}`);
  }
  writeFileSync(folder.unfilled, '');
  renameSync(unfinished, folder.data);
}

/**
 * Starts MariaDB in a process group of its own: Ctrl-C must reach the web server before the database.
 * @param {{ folder: DataFolder, user?: SystemUser, programs: Programs, port: number, forTests?: boolean }} place
 * @returns {Promise<number>} its process id
 */
export function launchMariadb({ folder, user, programs, port, forTests }) {
  const child = spawn(programs.server, serverOptions(folder, { port, forTests }), {
    cwd: folder.root,
    detached: true,
    env: environment(folder),
    stdio: 'ignore',
    uid: user?.uid,
    gid: user?.gid,
  });
  return new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('spawn', () => {
      child.unref();
      resolve(child.pid ?? 0);
    });
  });
}

/**
 * Waits until the server lets its owner in, which also shows that it is the server of this folder.
 * @param {{ programs: Programs, port: number, password: string, milliseconds: number,
 *   isRunning: () => boolean }} wanted
 * @returns {Promise<boolean>}
 */
export async function waitForSignIn({ programs, port, password, milliseconds, isRunning }) {
  const until = Date.now() + milliseconds;
  while (Date.now() < until && isRunning()) {
    if (canSignIn(programs.client, port, password)) return true;
    await sleep(50);
  }
  return false;
}

/** @param {DataFolder} folder */
export function endOfLog(folder) {
  return existsSync(folder.log) ? lastLines(readFileSync(folder.log, 'utf8')) : '(no log)';
}

/**
 * @param {DataFolder} folder
 * @param {{ port: number, forTests?: boolean }} how
 */
function serverOptions(folder, { port, forTests }) {
  return [
    '--no-defaults',
    `--datadir=${folder.data}`,
    `--socket=${folder.socket}`,
    `--pid-file=${folder.pid}`,
    `--tmpdir=${folder.temporary}`,
    `--log-error=${folder.log}`,
    `--init-file=${folder.setup}`,
    '--bind-address=127.0.0.1',
    `--port=${port}`,
    '--skip-name-resolve',
    '--skip-log-bin',
    '--character-set-server=utf8mb4',
    '--default-time-zone=+00:00',
    '--innodb-snapshot-isolation=ON',
    '--innodb-flush-log-at-trx-commit=1',
    '--max-connections=200',
    // A statement's workbook or a page of an upload may be one value.
    '--max-allowed-packet=64M',
    forTests ? '--innodb-log-file-size=16M' : '--innodb-buffer-pool-size=256M',
  ];
}

/**
 * @param {string} client
 * @param {number} port
 * @param {string} password
 */
function canSignIn(client, port, password) {
  const options = ['--no-defaults', '--protocol=tcp', '--host=127.0.0.1', `--port=${port}`];
  const answer = spawnSync(
    client,
    [...options, `--user=${ownerUser}`, '--connect-timeout=2', '-e', 'SELECT 1'],
    {
      env: { ...process.env, MYSQL_PWD: password },
      stdio: 'ignore',
    },
  );
  return answer.status === 0;
}

/** @param {DataFolder} folder */
function environment(folder) {
  return { ...process.env, HOME: folder.root, TMPDIR: folder.temporary };
}

/** @param {string} text */
function lastLines(text) {
  return text.trim().split('\n').slice(-12).join('\n');
}
