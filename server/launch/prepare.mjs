import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { fillDatabase, provideDatabase } from './database.mjs';
import { claimPort, clearEarlierStart, forgetStart, recordStart } from './earlier-start.mjs';
import { atEnd } from './lifetime.mjs';
import { installPackagesOfLock } from './packages.mjs';
import { root } from './project.mjs';
import { step } from './say.mjs';
import { sessionSecret } from './secrets.mjs';
import { checkNode, hostSetting, portSetting, readSettingsFile } from './settings.mjs';

export const startRecord = join(root, '.local/start.json');

/**
 * What start and dev have in common: all that the web server needs before it can run.
 * @returns {Promise<{ port: number, reach: string, env: NodeJS.ProcessEnv }>}
 */
export async function prepare() {
  process.chdir(root);
  readSettingsFile(root);
  checkNode();
  const port = portSetting();
  const { listen, reach } = hostSetting();
  await clearEarlierStart(startRecord);
  await claimPort(startRecord, { port, listen });
  recordStart(startRecord, { launcher: process.pid, port });
  atEnd(() => forgetStart(startRecord));
  await step('Packages', (note) => installPackagesOfLock(root, note));
  const { ownerUrl, appUrl, markFilled } = await provideDatabase(root);
  const env = serverEnvironment({ port, listen, appUrl });
  mkdirSync(env.FILES_DIR, { recursive: true, mode: 0o700 });
  await fillDatabase(root, { ...env, DATABASE_OWNER_URL: ownerUrl });
  markFilled?.();
  return { port, reach, env };
}

/** @param {{ port: number, listen: string, appUrl: string }} given */
function serverEnvironment({ port, listen, appUrl }) {
  return {
    PORT: String(port),
    HOST: listen,
    DATABASE_URL: appUrl,
    CLIENT_DIR: process.env.CLIENT_DIR || join(root, 'dist'),
    FILES_DIR: process.env.FILES_DIR || join(root, '.local/files'),
    SESSION_SECRET: process.env.SESSION_SECRET || sessionSecret(join(root, '.local/secrets.json')),
  };
}
