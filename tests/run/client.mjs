import { buildClient } from '../../server/launch/client-build.mjs';
import { say, step } from '../../server/launch/say.mjs';

/**
 * Builds the client that the journeys use, as npm start does; it counts as one passed or one failed.
 * @param {string} root
 * @returns {Promise<import('../run.mjs').Part>}
 */
export async function buildForTests(root) {
  const began = performance.now();
  let failed = 0;
  try {
    await step('Web client', (note) => buildClient(root, note));
  } catch (error) {
    say(error instanceof Error ? error.message : String(error));
    failed = 1;
  }
  return { name: 'client build', passed: 1 - failed, failed, milliseconds: performance.now() - began };
}
