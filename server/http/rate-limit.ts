import type { Pool } from 'mysql2/promise';
import { RateLimiterMemory, RateLimiterMySQL, RateLimiterRes } from 'rate-limiter-flexible';
import { Problem } from '@/shared/problems/problems';

export type Limits = {
  /** Wrong passwords per account. */
  account: RateLimiterMySQL;
  /** Wrong passwords per address. */
  address: RateLimiterMySQL;
  /** Links asked for, per address of mail, and tries to change a password, per person. */
  links: RateLimiterMySQL;
  /** Links asked for or used, per address of network: a whole company may come from one. */
  linksFrom: RateLimiterMySQL;
};

/** Counters in MariaDB, shared by all servers; in memory only while the database is away. */
export function rateLimits(pool: Pool): Limits {
  const limiter = (keyPrefix: string, rule: { points: number; duration: number; blockDuration?: number }) =>
    new RateLimiterMySQL({
      storeClient: (pool as unknown as { pool: unknown }).pool,
      // "pool": each count takes one connection. Any other word would begin transactions on whichever is free.
      storeType: 'pool',
      dbName: databaseOf(pool),
      tableName: 'rate_limits',
      tableCreated: true,
      clearExpiredByTimeout: false,
      keyPrefix,
      insuranceLimiter: new RateLimiterMemory(rule),
      ...rule,
    });
  return {
    account: limiter('account', { points: 10, duration: 900, blockDuration: 120 }),
    address: limiter('address', { points: 40, duration: 900, blockDuration: 300 }),
    links: limiter('link', { points: 5, duration: 3600 }),
    linksFrom: limiter('links from', { points: 40, duration: 3600 }),
  };
}

function databaseOf(pool: Pool): string {
  const inner = (pool as unknown as { pool: { config: { connectionConfig: { database: string } } } }).pool;
  return inner.config.connectionConfig.database;
}

/** Uses one try of the key; refuses when there is none left. */
export async function useTry(limiter: RateLimiterMySQL, key: string): Promise<void> {
  try {
    await limiter.consume(key);
  } catch (error) {
    if (error instanceof RateLimiterRes) throw tooMany(error);
    throw error;
  }
}

function tooMany(held: RateLimiterRes): Problem {
  return new Problem('too many tries', { data: { seconds: Math.ceil(held.msBeforeNext / 1000) } });
}
