import { spawn } from 'node:child_process';
import { endProcess } from '../../db/local/running-process.mjs';
import { atEnd } from './lifetime.mjs';

/**
 * Runs a program to its end, quietly: its output is shown when it fails.
 * @param {string} program
 * @param {string[]} args
 * @param {{ env?: NodeJS.ProcessEnv, shown?: boolean }} [how] shown: its output goes to the screen at once
 * @returns {Promise<string>} what it printed
 */
export async function runProgram(program, args, { env, shown = false } = {}) {
  const done = await tryProgram(program, args, { env, shown });
  if (done.code === 0) return done.output;
  const tail = done.output.trim().split('\n').slice(-40).join('\n');
  throw new Error(`${[program, ...args].join(' ')} failed (${done.code ?? done.signal}).\n${tail}`);
}

/**
 * @param {string} program
 * @param {string[]} args
 * @param {{ env?: NodeJS.ProcessEnv, shown?: boolean, limit?: number }} [how] limit: milliseconds it may take
 * @returns {Promise<{ code: number | null, signal: string | null, output: string }>}
 */
export function tryProgram(program, args, { env, shown = false, limit } = {}) {
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
  return new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('close', (code, signal) => {
      forget();
      clearTimeout(timer);
      resolve({ code, signal, output });
    });
  });
}
