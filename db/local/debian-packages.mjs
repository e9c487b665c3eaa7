import { spawnSync } from 'node:child_process';
import { findProgram } from './program.mjs';

/** Whether this process may install Debian packages. */
export function mayInstallPackages() {
  return process.platform === 'linux' && process.getuid?.() === 0 && findProgram('apt-get') !== undefined;
}

/**
 * Installs packages from Debian's archive, without what they merely recommend.
 * @param {string[]} names
 * @param {(line: string) => void} say
 */
export function installPackages(names, say) {
  say(`installing Debian packages: ${names.join(' ')}`);
  aptGet(['update', '-qq']);
  aptGet(['install', '-y', '-qq', '--no-install-recommends', ...names]);
}

/** @param {string[]} args */
function aptGet(args) {
  const done = spawnSync('apt-get', args, {
    encoding: 'utf8',
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    maxBuffer: 64 * 1024 * 1024,
  });
  if (done.status === 0) return;
  const output = `${done.stdout ?? ''}${done.stderr ?? ''}`.trim().split('\n').slice(-15).join('\n');
  throw new Error(`apt-get ${args.join(' ')} failed:\n${done.error?.message ?? output}`);
}
