import { readFileSync } from 'node:fs';

/**
 * npm starts a script through a shell and does not hand a request to stop down to it. So a program that npm
 * started looks twice a second whether the shell and npm are still its parents.
 * @param {() => void} gone
 */
export function watchNpm(gone) {
  if (!process.env.npm_lifecycle_event) return;
  const parent = process.ppid;
  const shellOfNpm = isShell(parent) ? parent : undefined;
  const npm = shellOfNpm && parentOf(shellOfNpm);
  const timer = setInterval(() => {
    if (process.ppid === parent && (!shellOfNpm || parentOf(shellOfNpm) === npm)) return;
    clearInterval(timer);
    gone();
  }, 500);
  timer.unref();
}

/** @param {number} pid */
function isShell(pid) {
  const name = statOf(pid)?.match(/\((.*)\)/s)?.[1];
  return name !== undefined && /^(da|ba|z|k|a)?sh$/.test(name);
}

/** @param {number} pid */
function parentOf(pid) {
  const parent = statOf(pid)
    ?.replace(/^.*\) /s, '')
    .split(' ')[1];
  return parent === undefined ? undefined : Number(parent);
}

/** @param {number} pid */
function statOf(pid) {
  try {
    return readFileSync(`/proc/${pid}/stat`, 'utf8');
  } catch {
    return undefined;
  }
}
