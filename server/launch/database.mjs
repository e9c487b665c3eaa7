import { join } from 'node:path';
import { startLocalDatabase } from '../../db/local/mariadb.mjs';
import { atEnd, end, isEnding } from './lifetime.mjs';
import { runProgram } from './run-program.mjs';
import { say, step } from './say.mjs';

/**
 * The database named by DATABASE_URL, or else the project's own.
 * @param {string} root
 * @returns {Promise<{ ownerUrl: string, appUrl: string, markFilled?: () => void }>}
 */
export async function provideDatabase(root) {
  const given = process.env.DATABASE_URL;
  if (given) {
    say(`Database: the one that DATABASE_URL names`);
    return { ownerUrl: process.env.DATABASE_OWNER_URL || given, appUrl: given };
  }
  return step('Database: the project’s own MariaDB', async (note) => {
    const database = await startLocalDatabase({ folder: join(root, '.local/db'), say });
    atEnd(database.stop);
    endWithDatabase(database);
    note(`127.0.0.1:${database.port}`);
    return database;
  });
}

/** @param {import('../../db/local/mariadb.mjs').LocalDatabase} database */
function endWithDatabase({ isUp }) {
  const timer = setInterval(() => {
    if (isEnding() || isUp()) return;
    console.error('\n\nThe database ended unexpectedly; the end of its log is in .local/db/mariadb.log.');
    void end(1);
  }, 1_000);
  timer.unref();
}

/**
 * Brings the tables up to date and puts the demo in, once.
 * @param {string} root
 * @param {NodeJS.ProcessEnv} env what the web server gets, and DATABASE_OWNER_URL
 */
export async function fillDatabase(root, env) {
  const tsx = join(root, 'node_modules/.bin/tsx');
  await step('Migrations: tables and rights', () => runProgram(tsx, ['db/run-migrations.ts'], { env }));
  const onLine = (/** @type {string} */ line) => say(line.trim());
  await step('Demo: people, shipments and months', () => runProgram(tsx, ['seeds/run.ts'], { env, onLine }));
}
