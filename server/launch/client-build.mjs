import { existsSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { runProgram } from './run-program.mjs';
import { hashOfSources } from './sources-hash.mjs';

const sources = [
  ...['app', 'components', 'shared', 'assets'],
  ...['package-lock.json', 'package.json', 'app.json', 'metro.config.js', 'babel.config.js', 'tsconfig.json'],
];

/**
 * Builds the web client into dist when its sources changed since the last build. It is made beside and then
 * moved, so that a failed build leaves the one before in place.
 * @param {string} root
 * @param {(words: string) => void} note
 */
export async function buildClient(root, note) {
  const target = join(root, 'dist');
  const stamp = '.tarekeep-sources';
  const hash = hashOfSources(root, sources);
  if (existsSync(join(target, stamp)) && readFileSync(join(target, stamp), 'utf8') === hash) {
    note('sources unchanged');
    return;
  }
  const unfinished = join(root, '.local/client-build');
  rmSync(unfinished, { recursive: true, force: true });
  const args = ['export', '--platform', 'web', '--output-dir', '.local/client-build'];
  const env = {
    CI: '1',
    EXPO_NO_TELEMETRY: '1',
    EXPO_OFFLINE: '1',
    EXPO_NO_TYPESCRIPT_SETUP: '1',
    NODE_ENV: 'production',
  };
  await runProgram(join(root, 'node_modules/.bin/expo'), args, { env });
  writeFileSync(join(unfinished, stamp), hash);
  rmSync(target, { recursive: true, force: true });
  renameSync(unfinished, target);
}
