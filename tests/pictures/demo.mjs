import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { randomBytes } from 'node:crypto';
import { freePort } from '../../db/local/free-port.mjs';
import { startLocalDatabase } from '../../db/local/mariadb.mjs';
import { buildClient } from '../../server/launch/client-build.mjs';
import { fillDatabase } from '../../server/launch/database.mjs';
import { atEnd } from '../../server/launch/lifetime.mjs';
import { say, step } from '../../server/launch/say.mjs';
import { startWebServer, waitForHealth } from '../../server/launch/web-server.mjs';

/**
 * The demo on a throw-away database and a free port, or the one that PICTURES_URL names.
 * @param {string} root
 * @returns {Promise<string>} where it is reached
 */
export async function provideDemo(root) {
  const given = process.env.PICTURES_URL;
  if (given) return given.replace(/\/$/, '');
  const database = await step('Throw-away database', () => startLocalDatabase({ forTests: true, say }));
  atEnd(database.stop);
  const files = mkdtempSync(join(tmpdir(), 'tarekeep-pictures-'));
  atEnd(() => rmSync(files, { recursive: true, force: true }));
  const port = await freePort();
  const env = {
    PORT: String(port),
    HOST: '127.0.0.1',
    DATABASE_URL: database.appUrl,
    CLIENT_DIR: join(root, 'dist'),
    FILES_DIR: files,
    SESSION_SECRET: randomBytes(32).toString('hex'),
  };
  await fillDatabase(root, { ...env, DATABASE_OWNER_URL: database.ownerUrl });
  await step('Web client', (note) => buildClient(root, note));
  await step('Web server', () => {
    startWebServer({ env, log: join(root, '.local/pictures.log') });
    return waitForHealth({ port, reach: '127.0.0.1', milliseconds: 60_000 });
  });
  return `http://127.0.0.1:${port}`;
}
