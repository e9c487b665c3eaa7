import { bigint, check, index, mysqlTable, primaryKey, uniqueIndex, varchar } from 'drizzle-orm/mysql-core';
import { sql } from 'drizzle-orm';
import type { SettlementWay } from '@/shared/contracts/differences';
import type { DisputeReason, DisputeState } from '@/shared/contracts/disputes';
import { amount, code, day, id, instant, units } from '../columns';
import { companies, people } from './companies';
import { counts, shipments } from './shipments';
import { files } from './files';

/** One type of one counted shipment whose count differs from what was declared. */
export const differences = mysqlTable(
  'differences',
  {
    id: id('id').primaryKey(),
    shipmentId: id('shipment_id')
      .notNull()
      .references(() => shipments.id),
    countId: id('count_id')
      .notNull()
      .references(() => counts.id),
    typeCode: code('type_code', { length: 20 }).notNull(),
    declared: units('declared').notNull(),
    counted: units('counted').notNull(),
    /** counted − declared − what is settled: 0 when settled; below 0 fewer came, above 0 more. */
    openUnits: units('open_units').notNull(),
    /** The partner of the lane (the non-operator side; the receiver where both are partners). */
    partnerId: id('partner_id')
      .notNull()
      .references(() => companies.id),
    /** Replacement value of the open units by the terms in force when it arose, in the partner's currency. */
    atStake: amount('at_stake').notNull(),
    openedOn: day('opened_on').notNull(),
    state: varchar('state', { length: 8 }).$type<'open' | 'settled'>().notNull(),
    createdAt: instant('created_at').notNull(),
    settledAt: instant('settled_at'),
  },
  (table) => [
    index('differences_state').on(table.state, table.openedOn, table.id),
    index('differences_partner').on(table.partnerId, table.state, table.id),
    index('differences_shipment').on(table.shipmentId),
  ],
);

/** How (part of) a difference was settled, by whom and why. Append-only. */
export const settlements = mysqlTable(
  'settlements',
  {
    id: id('id').primaryKey(),
    differenceId: id('difference_id')
      .notNull()
      .references(() => differences.id),
    way: varchar('way', { length: 24 }).$type<SettlementWay>().notNull(),
    units: units('units').notNull(),
    bearerCompanyId: id('bearer_company_id').references(() => companies.id),
    /** For "wrong type": the difference of the other type that is settled along with this one. */
    swappedWithId: id('swapped_with_id'),
    entryId: bigint('entry_id', { mode: 'number' }).notNull(),
    reason: varchar('reason', { length: 500 }).notNull(),
    settledBy: id('settled_by').references(() => people.id),
    settledAt: instant('settled_at').notNull(),
  },
  (table) => [index('settlements_difference').on(table.differenceId)],
);

export const disputes = mysqlTable(
  'disputes',
  {
    id: id('id').primaryKey(),
    companyId: id('company_id')
      .notNull()
      .references(() => companies.id),
    subject: varchar('subject', { length: 14 }).$type<'count' | 'statement line'>().notNull(),
    /** The shipment whose count is disputed, or on which the partner says the units came back. */
    shipmentId: id('shipment_id').references(() => shipments.id),
    countId: id('count_id').references(() => counts.id),
    typeCode: code('type_code', { length: 20 }),
    statementId: id('statement_id'),
    statementLineId: id('statement_line_id'),
    /** What the book says and what the partner says it should be. */
    stated: units('stated').notNull(),
    claimed: units('claimed').notNull(),
    reason: varchar('reason', { length: 20 }).$type<DisputeReason>().notNull(),
    state: varchar('state', { length: 20 }).$type<DisputeState>().notNull(),
    /** For a line that is not reckoned by units: the money claimed to be too much; else 0. */
    amountClaimed: amount('amount_claimed').notNull().default('0.0000'),
    /** Held out of "due now" while it is not decided; 0 for a count and once decided. */
    amountHeld: amount('amount_held').notNull(),
    acceptedUnits: units('accepted_units'),
    acceptedAmount: amount('accepted_amount'),
    /** What is disputed, while it is not decided: one open dispute for each line, or count and type. */
    openKey: code('open_key', { length: 90 }),
    /** The latest letter about it to each side, sent or put off: at most one an hour. */
    partnerMailAt: instant('partner_mail_at'),
    operatorMailAt: instant('operator_mail_at'),
    openedBy: id('opened_by').references(() => people.id),
    openedAt: instant('opened_at').notNull(),
    lastWordAt: instant('last_word_at').notNull(),
    closedBy: id('closed_by').references(() => people.id),
    closedAt: instant('closed_at'),
  },
  (table) => [
    index('disputes_company').on(table.companyId, table.state, table.lastWordAt, table.id),
    index('disputes_state').on(table.state, table.lastWordAt, table.id),
    index('disputes_statement').on(table.statementId),
    index('disputes_shipment').on(table.shipmentId),
    uniqueIndex('disputes_open_key').on(table.openKey),
    check('disputes_claim_differs', sql`stated <> claimed or amount_claimed > 0`),
  ],
);

/** The thread: what was said, what was decided. Append-only. */
export const disputeMessages = mysqlTable(
  'dispute_messages',
  {
    id: id('id').primaryKey(),
    disputeId: id('dispute_id')
      .notNull()
      .references(() => disputes.id),
    step: varchar('step', { length: 20 })
      .$type<'opened' | 'asked' | 'answered' | 'accepted' | 'accepted in part' | 'declined' | 'withdrawn'>()
      .notNull(),
    text: varchar('text', { length: 4000 }).notNull(),
    companyId: id('company_id')
      .notNull()
      .references(() => companies.id),
    personId: id('person_id').references(() => people.id),
    at: instant('at').notNull(),
  },
  (table) => [index('dispute_messages_dispute').on(table.disputeId, table.id)],
);

export const disputeFiles = mysqlTable(
  'dispute_files',
  {
    messageId: id('message_id')
      .notNull()
      .references(() => disputeMessages.id),
    fileId: id('file_id')
      .notNull()
      .references(() => files.id),
  },
  (table) => [
    primaryKey({ columns: [table.messageId, table.fileId] }),
    index('dispute_files_file').on(table.fileId),
  ],
);
