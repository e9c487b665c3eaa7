import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { dirname } from 'node:path';
import { tryProgram } from '../../server/launch/run-program.mjs';

// A project that hangs must not hang the run.
const limit = 10 * 60_000;

/**
 * Runs one project of the Jest configuration. A file that cannot even be loaded counts as one failed, and so
 * does a project in which no test ran.
 * @param {string} name
 * @param {{ env: NodeJS.ProcessEnv, options: string[] }} how
 * @returns {Promise<import('../run.mjs').Part>}
 */
export async function runProject(name, { env, options }) {
  console.log(`\n  Tests: ${name}`);
  const began = performance.now();
  const results = `.local/test-results/${name}.json`;
  mkdirSync(dirname(results), { recursive: true });
  rmSync(results, { force: true });
  const args = ['--selectProjects', name, '--json', `--outputFile=${results}`, ...options];
  const { code } = await tryProgram('node_modules/.bin/jest', args, { env, shown: true, limit });
  return { name, ...count(results, code), milliseconds: performance.now() - began };
}

/**
 * @param {string} results
 * @param {number | null} code
 */
function count(results, code) {
  if (!existsSync(results))
    return { passed: 0, failed: 1, remark: 'no test ran, or it ended before its results' };
  const found = JSON.parse(readFileSync(results, 'utf8'));
  const passed = found.numPassedTests;
  const failed = found.numFailedTests + found.numRuntimeErrorTestSuites;
  if (passed + failed === 0) return { passed, failed: 1, remark: 'no test ran' };
  if (code !== 0 && failed === 0) return { passed, failed: 1, remark: 'ended with an error' };
  const skipped = found.numPendingTests + found.numTodoTests;
  return { passed, failed, ...(skipped > 0 ? { remark: `${skipped} skipped` } : {}) };
}
