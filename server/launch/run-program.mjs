import { spawn } from 'node:child_process';
import { createInterface } from 'node:readline';
import { endProcess } from '../../db/local/running-process.mjs';
import { atEnd } from './lifetime.mjs';

/**
 * Runs a program to its end, quietly: its output is shown when it fails.
 * @param {string} program
 * @param {string[]} args
 * @param {{ env?: NodeJS.ProcessEnv, onLine?: (line: string) => void }} [how]
 */
export async function runProgram(program, args, how = {}) {
  const done = await tryProgram(program, args, how);
  if (done.code === 0) return;
  const tail = done.output.trim().split('\n').slice(-40).join('\n');
  throw new Error(`${[program, ...args].join(' ')} failed (${done.code ?? done.signal}).\n${tail}`);
}

/**
 * @param {string} program
 * @param {string[]} args
 * @param {{ env?: NodeJS.ProcessEnv, shown?: boolean, onLine?: (line: string) => void, limit?: number }} [how]
 *   shown: its output goes to the screen as it is; onLine: takes each line of it; limit: milliseconds it may take
 * @returns {Promise<{ code: number | null, signal: string | null, output: string }>}
 */
export function tryProgram(program, args, { env, shown = false, onLine, limit } = {}) {
  const child = spawn(program, args, {
    env: { ...process.env, ...env },
    stdio: shown ? ['ignore', 'inherit', 'inherit'] : ['ignore', 'pipe', 'pipe'],
  });
  const forget = atEnd(() => endProcess(child.pid ?? 0, 5_000));
  const timer = limit && setTimeout(() => void endProcess(child.pid ?? 0, 5_000), limit);
  let output = '';
  for (const stream of [child.stdout, child.stderr]) {
    stream?.setEncoding('utf8').on('data', (text) => (output += text));
  }
  if (onLine && child.stdout) createInterface({ input: child.stdout }).on('line', onLine);
  return new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('close', (code, signal) => {
      forget();
      clearTimeout(timer);
      resolve({ code, signal, output });
    });
  });
}
