import { existsSync } from 'node:fs';
import { join } from 'node:path';

/**
 * Takes over the settings of the file .env, where there is one; what is set already stays.
 * @param {string} root
 */
export function readSettingsFile(root) {
  const file = join(root, '.env');
  if (existsSync(file)) process.loadEnvFile(file);
}

/** The lowest Node that the packages of the lock accept. */
export function checkNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
  if (major > 20 || (major === 20 && minor >= 20)) return;
  throw new Error(`Tarekeep needs Node 20.20 or newer; this is ${process.versions.node}.`);
}

/** The port that the product is served on. */
export function portSetting() {
  const port = Number(process.env.PORT || 4100);
  if (Number.isInteger(port) && port > 0 && port < 65536) return port;
  throw new Error(`PORT is "${process.env.PORT}"; it has to be a whole number from 1 to 65535.`);
}

/** The address to listen on, and the one to reach it by from this machine. */
export function hostSetting() {
  const listen = process.env.HOST || '127.0.0.1';
  const everywhere = listen === '0.0.0.0' || listen === '::';
  return { listen, reach: everywhere || listen === '127.0.0.1' ? 'localhost' : listen };
}
