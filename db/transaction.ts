import { setTimeout as pause } from 'node:timers/promises';
import type { Database, Transaction } from './client';

/** Record changed since read, lock wait timeout, deadlock: the whole transaction may be tried again. */
const retryable = new Set([1020, 1205, 1213]);
const tries = 8;
/** No repeat begins after so many milliseconds: whoever asked is better told than kept. */
const repeatFor = 8000;

/** The MariaDB error number behind an error of drizzle or the driver, if any. */
export function databaseErrorNumber(error: unknown): number | undefined {
  if (typeof error !== 'object' || error === null) return undefined;
  if ('errno' in error && typeof error.errno === 'number') return error.errno;
  return 'cause' in error ? databaseErrorNumber(error.cause) : undefined;
}

/**
 * Runs the work in one READ COMMITTED transaction and repeats it whole on deadlock or lock timeout.
 * What is read in order to be written is locked with FOR UPDATE; the work must have no effect outside the database.
 */
export async function inTransaction<Result>(
  db: Database,
  work: (tx: Transaction) => Promise<Result>,
): Promise<Result> {
  const until = Date.now() + repeatFor;
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await db.transaction(work, { isolationLevel: 'read committed' });
    } catch (error) {
      const number = databaseErrorNumber(error);
      const again = attempt < tries && Date.now() < until;
      if (!again || number === undefined || !retryable.has(number)) throw error;
      await pause(5 * 2 ** attempt * (0.5 + Math.random()));
    }
  }
}
