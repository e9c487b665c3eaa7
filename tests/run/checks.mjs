import { tryProgram } from '../../server/launch/run-program.mjs';
import { say, seconds } from '../../server/launch/say.mjs';

/** @type {Record<string, string>} check → script of package.json */
const scripts = { format: 'format:check', lint: 'lint', types: 'types' };

/**
 * Runs the checks side by side; each counts as one passed or one failed.
 * @param {string[]} names
 * @returns {Promise<import('../run.mjs').Part[]>}
 */
export function runChecks(names) {
  return Promise.all(names.map(runCheck));
}

/** @param {string} name */
async function runCheck(name) {
  const began = performance.now();
  const npm = process.env.npm_execpath;
  const args = ['run', '--silent', scripts[name] ?? name];
  const { code, output } = npm
    ? await tryProgram(process.execPath, [npm, ...args])
    : await tryProgram('npm', args);
  const milliseconds = performance.now() - began;
  const good = code === 0;
  console.log(`  ${name}: ${good ? 'in order' : 'FAILED'}, ${seconds(milliseconds)}`);
  if (!good) say(output.trim());
  return { name, passed: good ? 1 : 0, failed: good ? 0 : 1, milliseconds };
}
