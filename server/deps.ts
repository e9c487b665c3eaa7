import type { Pool } from 'mysql2/promise';
import type { Logger } from 'pino';
import type { Database } from '@/db/client';
import type { Config } from './config';
import type { FileStore } from './files/file-store';

/** What the program is handed instead of reaching for it: tests hand in others. */
export type Deps = {
  config: Config;
  pool: Pool;
  db: Database;
  files: FileStore;
  logger: Logger;
  clock: Clock;
};

/** The present, handed in so that tests can move it. */
export type Clock = { now: () => Date };

/** The present as the program writes it: ISO 8601, UTC, milliseconds. */
export function instantOf(clock: Clock): string {
  return clock.now().toISOString();
}
