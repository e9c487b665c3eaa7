import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';

/** `npm run bench`: each benchmark by itself, one after another; a figure for speed is a ratio within the same run. */
const benches = [
  'assess',
  'reconcile',
  'pool-size',
  'growth',
  'import',
  'month-end',
  'address-known',
  'first-load',
];
const wanted = process.argv.length > 2 ? process.argv.slice(2) : benches;
const failed = [];
for (const name of wanted) {
  const file = `tests/bench/${name}.ts`;
  if (!existsSync(file)) {
    console.error(`There is no benchmark ${name}. There are: ${benches.join(', ')}`);
    process.exit(1);
  }
  console.log(`\n${name}`);
  const run = spawnSync(process.execPath, ['--import', 'tsx', file], { stdio: 'inherit' });
  if (run.status !== 0) failed.push(name);
}
if (failed.length > 0) {
  console.error(`\nNot within their bounds: ${failed.join(', ')}`);
  process.exit(1);
}
