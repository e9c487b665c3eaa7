import { watchNpm } from './npm-parent.mjs';

/** @type {Set<() => unknown>} */
const closers = new Set();
/** @type {Promise<never> | undefined} */
let ending;

/**
 * Remembers what has to be undone at the end; the last is undone first.
 * @param {() => unknown} close
 * @returns {() => void} forgets it again
 */
export function atEnd(close) {
  closers.add(close);
  return () => closers.delete(close);
}

/** Whether the program is on its way out, so that failures of what it ends are no news. */
export function isEnding() {
  return ending !== undefined;
}

/**
 * Undoes everything and leaves. A second call joins the first.
 * @param {number} code
 * @returns {Promise<never>}
 */
export function end(code) {
  ending ??= (async () => {
    for (const close of [...closers].reverse()) {
      try {
        await close();
      } catch (error) {
        console.error(error instanceof Error ? error.message : error);
      }
    }
    process.exit(code);
  })();
  return ending;
}

/**
 * Runs a program of this folder: ends it in order on Ctrl-C, on a request to stop, and when the npm that
 * started it is gone; a failure is printed as a sentence.
 * @param {() => Promise<void>} main
 * @param {number} [stopped] the exit code when it is asked to stop
 */
export function runUntilEnded(main, stopped = 0) {
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => {
      if (!isEnding()) console.log('\nStopping …');
      void end(stopped);
    });
  }
  watchNpm(() => void end(stopped));
  main().catch((error) => {
    if (isEnding()) return;
    console.error(`\n\n${error instanceof Error ? error.message : error}`);
    void end(1);
  });
}
