import { drizzle, type MySql2Database } from 'drizzle-orm/mysql2';
import { createPool, type Pool } from 'mysql2/promise';
import * as access from './schema/access';
import * as companies from './schema/companies';
import * as containers from './schema/containers';
import * as differences from './schema/differences';
import * as files from './schema/files';
import * as ledger from './schema/ledger';
import * as shipments from './schema/shipments';
import * as statements from './schema/statements';
import * as work from './schema/work';

export const schema = {
  ...access,
  ...companies,
  ...containers,
  ...differences,
  ...files,
  ...ledger,
  ...shipments,
  ...statements,
  ...work,
};

export type Database = MySql2Database<typeof schema>;
/** Inside a transaction; everything that writes takes this. */
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0];
/** Reads take either. */
export type Reader = Database | Transaction;

/** Options every connection has: UTC, dates as text, large numbers as text rather than rounded. */
export function poolOf(url: string, connections = 16): Pool {
  const pool = createPool({
    uri: url,
    connectionLimit: connections,
    maxIdle: connections,
    queueLimit: 500,
    connectTimeout: 10_000,
    timezone: 'Z',
    dateStrings: true,
    supportBigNumbers: true,
    bigNumberStrings: false,
    charset: 'utf8mb4',
    enableKeepAlive: true,
  });
  // Whoever waits for a row or a table longer than this is told so, instead of holding a connection.
  pool.pool.on('connection', (connection) => {
    // A connection that breaks here fails the query it was opened for.
    connection.query('SET SESSION innodb_lock_wait_timeout = 5, lock_wait_timeout = 10', () => undefined);
  });
  return pool;
}

export function databaseOn(pool: Pool): Database {
  return drizzle(pool, { schema, mode: 'planetscale' });
}
