import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';

/**
 * The key that signs sessions, made once, so that people stay signed in over a restart.
 * @param {string} file
 * @returns {string}
 */
export function sessionSecret(file) {
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8')).sessionSecret;
  const secret = randomBytes(32).toString('hex');
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, `${JSON.stringify({ sessionSecret: secret }, null, 2)}\n`, { mode: 0o600 });
  return secret;
}
