import { spawn } from 'node:child_process';
import { existsSync, openSync, readFileSync, renameSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';
import { endProcess } from '../../db/local/running-process.mjs';
import { atEnd, end, isEnding } from './lifetime.mjs';

/**
 * Starts the web server. It runs in a process group of its own, so that Ctrl-C reaches it once and in order;
 * should this process be killed, the closed channel tells it to stop.
 * @param {{ env: NodeJS.ProcessEnv, log: string }} how log: the file that takes its structured log
 * @returns {import('node:child_process').ChildProcess}
 */
export function startWebServer({ env, log }) {
  if (existsSync(log)) renameSync(log, `${log}.1`);
  const output = openSync(log, 'a', 0o600);
  const { DATABASE_OWNER_URL: _notForTheServer, ...own } = process.env;
  const modules = ['--import', './server/launch/exit-with-parent.mjs', '--import', 'tsx'];
  const child = spawn(process.execPath, [...modules, 'server/index.ts'], {
    detached: true,
    env: { ...own, NODE_ENV: own.NODE_ENV || 'production', ...env },
    stdio: ['ignore', output, output, 'ipc'],
  });
  atEnd(() => endProcess(child.pid ?? 0, 15_000));
  child.once('exit', (code, signal) => {
    if (isEnding()) return;
    console.error(
      `\n\nThe web server ended unexpectedly (${signal ?? `exit code ${code}`}). Its last lines:`,
    );
    console.error(lastLines(log));
    void end(1);
  });
  return child;
}

/**
 * Waits until the server says that it and its database are well.
 * @param {{ port: number, reach: string, milliseconds: number }} where
 */
export async function waitForHealth({ port, reach, milliseconds }) {
  const address = `http://${reach}:${port}/api/health`;
  const until = Date.now() + milliseconds;
  let answer = 'no answer';
  while (Date.now() < until) {
    try {
      const response = await fetch(address, { signal: AbortSignal.timeout(2_000) });
      if (response.ok) return;
      answer = `status ${response.status}`;
    } catch {
      answer = 'no answer';
    }
    await sleep(100);
  }
  throw new Error(`The web server is not well after ${milliseconds / 1000} s: ${answer} from ${address}`);
}

/** @param {string} log */
function lastLines(log) {
  return readFileSync(log, 'utf8').trim().split('\n').slice(-20).join('\n');
}
