import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { freePort, isPortFree } from '../../db/local/free-port.mjs';
import { endProcess } from '../../db/local/running-process.mjs';
import { recordStart } from './earlier-start.mjs';
import { atEnd, end, isEnding, runUntilEnded } from './lifetime.mjs';
import { prepare, startRecord } from './prepare.mjs';
import { root } from './project.mjs';
import { step } from './say.mjs';
import { signInLines } from './sign-ins.mjs';
import { waitForHealth } from './web-server.mjs';

runUntilEnded(async () => {
  console.log('Tarekeep, for development\n');
  const { port, reach, env } = await prepare();
  await step('API server, started again at each change', () => {
    const server = run('tsx', ['watch', '--clear-screen=false', 'server/index.ts'], env);
    recordStart(startRecord, { launcher: process.pid, server: server.pid, port });
    return waitForHealth({ port, reach, milliseconds: 60_000 });
  });
  const clientPort = (await isPortFree(8081)) ? 8081 : await freePort();
  const client = {
    API_PORT: String(port),
    BROWSER: 'none',
    EXPO_NO_TELEMETRY: '1',
    EXPO_OFFLINE: '1',
    EXPO_NO_TYPESCRIPT_SETUP: '1',
  };
  run('expo', ['start', '--web', '--port', String(clientPort)], client);
  console.log(`\n  Client with fast refresh: http://localhost:${clientPort}`);
  console.log(`  API:                      http://${reach}:${port}\n`);
  for (const line of signInLines(join(root, 'seeds/demo/sign-ins.json'))) console.log(`  ${line}`);
});

/**
 * @param {string} name
 * @param {string[]} args
 * @param {NodeJS.ProcessEnv} env
 */
function run(name, args, env) {
  const child = spawn(join(root, 'node_modules/.bin', name), args, {
    env: { ...process.env, ...env },
    stdio: ['ignore', 'inherit', 'inherit'],
  });
  atEnd(() => endProcess(child.pid ?? 0, 10_000));
  child.once('exit', (code, signal) => {
    if (isEnding()) return;
    console.error(`\n${name} ended unexpectedly (${signal ?? `exit code ${code}`}).`);
    void end(1);
  });
  return child;
}
