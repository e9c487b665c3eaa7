import { bigint, index, int, mysqlTable, primaryKey, smallint, varchar } from 'drizzle-orm/mysql-core';
import { code, id, instant, json } from '../columns';

/** Layout that express-mysql-session writes. */
export const sessions = mysqlTable('sessions', {
  sessionId: code('session_id', { length: 128 }).primaryKey(),
  expires: int('expires', { unsigned: true }).notNull(),
  data: json('data'),
});

/** Layout that rate-limiter-flexible writes. */
export const rateLimits = mysqlTable('rate_limits', {
  key: code('key', { length: 255 }).primaryKey(),
  points: int('points').notNull().default(0),
  expire: bigint('expire', { mode: 'number', unsigned: true }),
});

/** One row per keyed request; written in the same transaction as its effect. */
export const requests = mysqlTable(
  'requests',
  {
    personId: id('person_id').notNull(),
    key: code('key', { length: 80 }).notNull(),
    operation: varchar('operation', { length: 60 }).notNull(),
    contentHash: code('content_hash', { length: 64 }).notNull(),
    status: smallint('status').notNull(),
    answer: json('answer'),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.personId, table.key] }),
    index('requests_created').on(table.createdAt),
  ],
);

/** Who did what. Append-only by right. */
export const log = mysqlTable(
  'log',
  {
    id: bigint('id', { mode: 'number' }).autoincrement().primaryKey(),
    at: instant('at').notNull(),
    personId: id('person_id'),
    companyId: id('company_id'),
    action: varchar('action', { length: 60 }).notNull(),
    outcome: varchar('outcome', { length: 40 }).notNull(),
    subjectKind: varchar('subject_kind', { length: 30 }),
    subjectId: varchar('subject_id', { length: 60 }),
    detail: json('detail'),
    requestId: varchar('request_id', { length: 60 }).notNull(),
    address: varchar('address', { length: 60 }),
  },
  (table) => [
    index('log_person').on(table.personId, table.id),
    index('log_subject').on(table.subjectId, table.id),
  ],
);
