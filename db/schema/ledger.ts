import {
  bigint,
  check,
  index,
  int,
  mysqlTable,
  primaryKey,
  uniqueIndex,
  varchar,
} from 'drizzle-orm/mysql-core';
import { sql } from 'drizzle-orm';
import { code, day, id, instant, units } from '../columns';
import { companies, people, sites } from './companies';
import { containerTypes } from './containers';
import { shipments } from './shipments';

export const accountKinds = ['site', 'transit', 'bought', 'scrapped', 'lost', 'found', 'opening'] as const;
export const entryKinds = [
  'opening',
  'bought',
  'scrapped',
  'sent',
  'counted',
  'turned up later',
  'sender miscounted',
  'receiver miscounted',
  'within tolerance',
  'lost on the way',
  'wrong type',
  'lost',
  'found',
  'correction',
] as const;
export type EntryKind = (typeof entryKinds)[number];

/** Where units can be (RULES 1). One row per site, per shipment's transit, and per outside account. */
export const accounts = mysqlTable(
  'accounts',
  {
    id: bigint('id', { mode: 'number' }).autoincrement().primaryKey(),
    kind: varchar('kind', { length: 10 }).$type<(typeof accountKinds)[number]>().notNull(),
    siteId: id('site_id').references(() => sites.id),
    shipmentId: id('shipment_id').references(() => shipments.id),
    /** Who answers for what stands here (RULES 2): the site's company, the sender for transit, null outside. */
    companyId: id('company_id').references(() => companies.id),
  },
  (table) => [
    uniqueIndex('accounts_site').on(table.siteId),
    uniqueIndex('accounts_shipment').on(table.shipmentId),
    index('accounts_company').on(table.companyId, table.kind),
  ],
);

/** Append-only by right and by guard. */
export const ledgerEntries = mysqlTable(
  'ledger_entries',
  {
    id: bigint('id', { mode: 'number' }).autoincrement().primaryKey(),
    kind: varchar('kind', { length: 24 }).$type<EntryKind>().notNull(),
    /** The day it happened, in the site's time zone. */
    valueDate: day('value_date').notNull(),
    /** Set by the database. */
    recordedAt: instant('recorded_at')
      .notNull()
      .default(sql`(utc_timestamp(3))`),
    shipmentId: id('shipment_id').references(() => shipments.id),
    countId: id('count_id'),
    differenceId: id('difference_id'),
    disputeId: id('dispute_id'),
    /** The entry that this one mends. */
    correctsEntryId: bigint('corrects_entry_id', { mode: 'number' }),
    reason: varchar('reason', { length: 500 }).notNull().default(''),
    personId: id('person_id').references(() => people.id),
  },
  (table) => [
    index('ledger_entries_shipment').on(table.shipmentId, table.id),
    index('ledger_entries_day').on(table.valueDate, table.id),
    index('ledger_entries_corrects').on(table.correctsEntryId),
  ],
);

/** `units` of a type move from one account to another: an entry balances by this shape. Append-only. */
export const ledgerLines = mysqlTable(
  'ledger_lines',
  {
    entryId: bigint('entry_id', { mode: 'number' })
      .notNull()
      .references(() => ledgerEntries.id),
    lineNo: int('line_no').notNull(),
    typeCode: code('type_code', { length: 20 })
      .notNull()
      .references(() => containerTypes.code),
    fromAccountId: bigint('from_account_id', { mode: 'number' })
      .notNull()
      .references(() => accounts.id),
    toAccountId: bigint('to_account_id', { mode: 'number' })
      .notNull()
      .references(() => accounts.id),
    units: units('units').notNull(),
    /** As in the entry: lets an account's movements be read by day from one index. */
    valueDate: day('value_date').notNull(),
    /** For a loss: the company that bears it. */
    chargedCompanyId: id('charged_company_id').references(() => companies.id),
  },
  (table) => [
    primaryKey({ columns: [table.entryId, table.lineNo] }),
    index('ledger_lines_from').on(table.fromAccountId, table.typeCode, table.valueDate, table.entryId),
    index('ledger_lines_to').on(table.toAccountId, table.typeCode, table.valueDate, table.entryId),
    check('ledger_lines_positive', sql`units > 0 and units <= 1000000000`),
    check('ledger_lines_moves', sql`from_account_id <> to_account_id`),
  ],
);

/** What stands in an account now; kept in the posting transaction. */
export const balances = mysqlTable(
  'balances',
  {
    accountId: bigint('account_id', { mode: 'number' })
      .notNull()
      .references(() => accounts.id),
    typeCode: code('type_code', { length: 20 }).notNull(),
    units: units('units').notNull(),
  },
  (table) => [primaryKey({ columns: [table.accountId, table.typeCode] })],
);

/** Net units per account, type and value date; a balance on any date is one short sum. */
export const dailyNets = mysqlTable(
  'daily_nets',
  {
    accountId: bigint('account_id', { mode: 'number' })
      .notNull()
      .references(() => accounts.id),
    typeCode: code('type_code', { length: 20 }).notNull(),
    day: day('day').notNull(),
    net: units('net').notNull(),
  },
  (table) => [primaryKey({ columns: [table.accountId, table.typeCode, table.day] })],
);

export const eventKinds = ['issued', 'returned', 'lost', 'found', 'damaged', 'cleaned', 'corrected'] as const;

/** What the assessment of a partner reads (RULES 2 and 3), each with the entry or count behind it. Append-only. */
export const partnerEvents = mysqlTable(
  'partner_events',
  {
    id: bigint('id', { mode: 'number' }).autoincrement().primaryKey(),
    companyId: id('company_id')
      .notNull()
      .references(() => companies.id),
    date: day('date').notNull(),
    typeCode: code('type_code', { length: 20 })
      .notNull()
      .references(() => containerTypes.code),
    kind: varchar('kind', { length: 10 }).$type<(typeof eventKinds)[number]>().notNull(),
    /** Signed for "corrected", positive for the rest. */
    quantity: units('quantity').notNull(),
    correctsId: bigint('corrects_id', { mode: 'number' }),
    entryId: bigint('entry_id', { mode: 'number' }).references(() => ledgerEntries.id),
    countId: id('count_id'),
    shipmentId: id('shipment_id').references(() => shipments.id),
    disputeId: id('dispute_id'),
    /** In words, for a correction line: "count of EM-103655 put right to 392". */
    cause: varchar('cause', { length: 200 }).notNull().default(''),
    recordedAt: instant('recorded_at')
      .notNull()
      .default(sql`(utc_timestamp(3))`),
  },
  (table) => [
    index('partner_events_company').on(table.companyId, table.date, table.id),
    index('partner_events_shipment').on(table.shipmentId),
    index('partner_events_corrects').on(table.correctsId),
    check('partner_events_quantity', sql`quantity <> 0 and (kind = 'corrected' or quantity > 0)`),
    check('partner_events_corrects', sql`(kind = 'corrected') = (corrects_id is not null)`),
  ],
);

/** Chained hashes over the entries up to a number, written by a job: a changed row breaks the chain. Append-only. */
export const ledgerSeals = mysqlTable('ledger_seals', {
  throughEntryId: bigint('through_entry_id', { mode: 'number' }).primaryKey(),
  hash: code('hash', { length: 64 }).notNull(),
  sealedAt: instant('sealed_at').notNull(),
});

/** Numbers for references that we make; a row per number, so that nobody waits for anybody. */
export const referenceNumbers = mysqlTable('reference_numbers', {
  number: bigint('number', { mode: 'number' }).autoincrement().primaryKey(),
  takenAt: instant('taken_at').notNull(),
});
