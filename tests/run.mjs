import { join } from 'node:path';
import { end, isEnding, runUntilEnded } from '../server/launch/lifetime.mjs';
import { installPackagesOfLock } from '../server/launch/packages.mjs';
import { root } from '../server/launch/project.mjs';
import { say, seconds, step } from '../server/launch/say.mjs';
import { checkNode } from '../server/launch/settings.mjs';
import { runChecks } from './run/checks.mjs';
import { chromiumProgram } from './run/chromium.mjs';
import { buildForTests } from './run/client.mjs';
import { provideTestDatabase } from './run/database.mjs';
import { runProject } from './run/jest-project.mjs';

/** @typedef {{ name: string, passed: number, failed: number, milliseconds: number, remark?: string }} Part */

const checks = ['format', 'lint', 'types'];
const projects = ['domain', 'architecture', 'components', 'server', 'browser'];
const asked = process.argv.slice(2);
const isAsked = (/** @type {string} */ name) => asked.length === 0 || asked.includes(name);
/** @type {Part[]} */
const parts = [];

runUntilEnded(async () => {
  process.chdir(root);
  try {
    await runAll();
  } catch (error) {
    if (isEnding()) return;
    say(error instanceof Error ? error.message : String(error));
    parts.push({ name: 'getting ready', passed: 0, failed: 1, milliseconds: 0, remark: 'see above' });
  }
  await end(sumUp() > 0 ? 1 : 0);
}, 130);

async function runAll() {
  const unknown = asked.filter((name) => ![...checks, ...projects].includes(name));
  if (unknown.length > 0) {
    throw new Error(
      `There is no part ${unknown.join(', ')}; there are ${[...checks, ...projects].join(', ')}.`,
    );
  }
  checkNode();
  await step('Packages', (note) => installPackagesOfLock(root, note));
  parts.push(...(await runChecks(checks.filter(isAsked))));
  /** @type {NodeJS.ProcessEnv} */
  const env = {};
  if (isAsked('server') || isAsked('browser')) Object.assign(env, await provideTestDatabase());
  for (const name of ['domain', 'architecture', 'components', 'server'].filter(isAsked)) {
    parts.push(await runProject(name, { env, options: ['--maxWorkers=2'] }));
  }
  if (isAsked('browser')) await runBrowser(env);
}

/** @param {NodeJS.ProcessEnv} env */
async function runBrowser(env) {
  const chromium = await step('Chromium', () => chromiumProgram(say));
  const built = await buildForTests(root);
  parts.push(built);
  if (built.failed > 0) return;
  const browserEnv = { ...env, CHROMIUM_PATH: chromium, TEST_CLIENT_DIR: join(root, 'dist') };
  parts.push(await runProject('browser', { env: browserEnv, options: ['--runInBand'] }));
}

/** Prints the parts and, last, the line of the sum. */
function sumUp() {
  console.log('\n  part             passed  failed     time');
  for (const { name, passed, failed, milliseconds, remark } of parts) {
    const figures = `${String(passed).padStart(6)}  ${String(failed).padStart(6)}  ${seconds(milliseconds).padStart(7)}`;
    console.log(`  ${name.padEnd(15)}  ${figures}${remark ? `  ${remark}` : ''}`);
  }
  const passed = parts.reduce((sum, part) => sum + part.passed, 0);
  const failed = parts.reduce((sum, part) => sum + part.failed, 0);
  console.log(`  all after ${seconds(performance.now())}\n\n${passed} passed, ${failed} failed`);
  return failed;
}
