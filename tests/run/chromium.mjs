import { installPackages, mayInstallPackages } from '../../db/local/debian-packages.mjs';
import { findProgram } from '../../db/local/program.mjs';

/**
 * The browser of the journeys, installed first when it is missing and this process may do so.
 * @param {(line: string) => void} say
 * @returns {string}
 */
export function chromiumProgram(say) {
  if (!lookUp() && mayInstallPackages()) installPackages(['chromium'], say);
  const found = lookUp();
  if (found) return found;
  throw new Error(
    'Chromium was not found, and this run may not install it. Install it (as root on Debian: apt-get install ' +
      'chromium) or set CHROMIUM_PATH to one that is there.',
  );
}

function lookUp() {
  return process.env.CHROMIUM_PATH || findProgram('chromium', 'chromium-browser', 'google-chrome');
}
