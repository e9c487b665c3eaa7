let lineIsOpen = false;

/**
 * Prints a line below the step that runs.
 * @param {string} line
 */
export function say(line) {
  if (lineIsOpen) process.stdout.write('\n');
  lineIsOpen = false;
  process.stdout.write(`${line.replace(/^(?=.)/gm, '    ')}\n`);
}

/**
 * Does one step: prints what it is, then how long it took. The work may hand in a word on what it found.
 * @template T
 * @param {string} title
 * @param {(note: (words: string) => void) => T | Promise<T>} work
 * @returns {Promise<T>}
 */
export async function step(title, work) {
  process.stdout.write(`  ${title} …`);
  lineIsOpen = true;
  const began = performance.now();
  let found = '';
  try {
    const result = await work((words) => (found = `${words}, `));
    const took = `${found}${seconds(performance.now() - began)}\n`;
    process.stdout.write(`${lineIsOpen ? ' ' : '    '}${took}`);
    return result;
  } finally {
    lineIsOpen = false;
  }
}

/** @param {number} milliseconds */
export function seconds(milliseconds) {
  return `${(milliseconds / 1000).toFixed(1)} s`;
}
