import { join } from 'node:path';
import { buildClient } from './client-build.mjs';
import { runUntilEnded } from './lifetime.mjs';
import { recordStart } from './earlier-start.mjs';
import { prepare, startRecord } from './prepare.mjs';
import { root } from './project.mjs';
import { seconds, step } from './say.mjs';
import { signInLines } from './sign-ins.mjs';
import { startWebServer, waitForHealth } from './web-server.mjs';

runUntilEnded(async () => {
  console.log('Tarekeep\n');
  const { port, reach, env } = await prepare();
  await step('Web client', (note) => buildClient(root, note));
  await step('Web server', () => {
    const server = startWebServer({ env, log: join(root, '.local/server.log') });
    recordStart(startRecord, { launcher: process.pid, server: server.pid, port });
    return waitForHealth({ port, reach, milliseconds: 60_000 });
  });
  console.log(`\n  Ready after ${seconds(performance.now())} at http://${reach}:${port}\n`);
  for (const line of signInLines(join(root, 'seeds/demo/sign-ins.json'))) console.log(`  ${line}`);
  console.log('\n  The server’s log is .local/server.log. Ctrl-C stops all of it.');
});
