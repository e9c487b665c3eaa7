import { index, int, mysqlTable, primaryKey, uniqueIndex, varchar } from 'drizzle-orm/mysql-core';
import { code, day, id, instant, json, units } from '../columns';
import { companies, people, sites } from './companies';
import { shipments } from './shipments';

/** Messages to send, written in the transaction that causes them. Delivered at least once, under one Message-ID. */
export const outbox = mysqlTable(
  'outbox',
  {
    id: id('id').primaryKey(),
    kind: varchar('kind', { length: 40 }).notNull(),
    toName: varchar('to_name', { length: 120 }).notNull(),
    toAddress: varchar('to_address', { length: 200 }).notNull(),
    subject: varchar('subject', { length: 200 }).notNull(),
    text: varchar('text', { length: 8000 }).notNull(),
    messageId: varchar('message_id', { length: 120 }).notNull(),
    state: varchar('state', { length: 10 }).$type<'waiting' | 'sent' | 'captured' | 'failed'>().notNull(),
    attempts: int('attempts').notNull().default(0),
    notBefore: instant('not_before').notNull(),
    claimedUntil: instant('claimed_until'),
    problem: varchar('problem', { length: 300 }),
    sentAt: instant('sent_at'),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [
    index('outbox_waiting').on(table.state, table.notBefore),
    uniqueIndex('outbox_message').on(table.messageId),
  ],
);

/** Long work, taken by one worker at a time under a lease. */
export const jobs = mysqlTable(
  'jobs',
  {
    id: id('id').primaryKey(),
    kind: varchar('kind', { length: 40 }).notNull(),
    payload: json('payload').notNull(),
    state: varchar('state', { length: 10 }).$type<'waiting' | 'running' | 'done' | 'failed'>().notNull(),
    done: int('done').notNull().default(0),
    total: int('total').notNull().default(0),
    result: json('result'),
    problem: varchar('problem', { length: 500 }),
    attempts: int('attempts').notNull().default(0),
    claimedUntil: instant('claimed_until'),
    /** Two jobs with the same key are one. */
    onceKey: code('once_key', { length: 120 }).notNull(),
    companyId: id('company_id').references(() => companies.id),
    createdBy: id('created_by').references(() => people.id),
    createdAt: instant('created_at').notNull(),
    endedAt: instant('ended_at'),
  },
  (table) => [
    uniqueIndex('jobs_once').on(table.onceKey),
    index('jobs_waiting').on(table.state, table.claimedUntil),
  ],
);

/** A scheduled run happens once over all servers: one row per name and slot. */
export const scheduleSlots = mysqlTable(
  'schedule_slots',
  {
    name: varchar('name', { length: 40 }).notNull(),
    slot: varchar('slot', { length: 30 }).notNull(),
    takenAt: instant('taken_at').notNull(),
  },
  (table) => [primaryKey({ columns: [table.name, table.slot] })],
);

/** An uploaded month of shipments and receipts. */
export const imports = mysqlTable(
  'imports',
  {
    id: id('id').primaryKey(),
    fileName: varchar('file_name', { length: 200 }).notNull(),
    state: varchar('state', { length: 10 })
      .$type<'preview' | 'running' | 'done' | 'failed' | 'dropped'>()
      .notNull(),
    rowsGood: int('rows_good').notNull(),
    rowsBad: int('rows_bad').notNull(),
    jobId: id('job_id'),
    /** How far the posting has come; what is behind it is never done again. */
    phase: varchar('phase', { length: 12 }).$type<'read' | 'planned' | 'posted'>().notNull().default('read'),
    /** What the preview shows in sums. */
    totals: json('totals'),
    /** How the shipments of the book stood when the receipts were compared with them. */
    result: json('result'),
    confirmedBy: id('confirmed_by').references(() => people.id),
    confirmedAt: instant('confirmed_at'),
    endedAt: instant('ended_at'),
    createdBy: id('created_by').references(() => people.id),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [index('imports_created').on(table.createdAt, table.id)],
);

export const importRows = mysqlTable(
  'import_rows',
  {
    importId: id('import_id')
      .notNull()
      .references(() => imports.id),
    rowNo: int('row_no').notNull(),
    /** The row as read, by column, and what is wrong with it: [{ column, message }]. */
    cells: json('cells').notNull(),
    problems: json('problems').notNull(),
    bad: int('bad').notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.importId, table.rowNo] }),
    index('import_rows_bad').on(table.importId, table.bad, table.rowNo),
  ],
);

/** What became of each shipment and receipt of a file; the row is the mark that it has been dealt with. */
export const importDocuments = mysqlTable(
  'import_documents',
  {
    importId: id('import_id')
      .notNull()
      .references(() => imports.id),
    /** The first row of the document. */
    rowNo: int('row_no').notNull(),
    side: varchar('side', { length: 8 }).$type<'shipment' | 'receipt'>().notNull(),
    reference: varchar('reference', { length: 120 }),
    outcome: varchar('outcome', { length: 10 }).$type<'posted' | 'known' | 'refused'>().notNull(),
    shipmentId: id('shipment_id').references(() => shipments.id),
    /** Why it was refused: { code, data } of a problem. */
    problem: json('problem'),
  },
  (table) => [
    primaryKey({ columns: [table.importId, table.rowNo] }),
    index('import_documents_outcome').on(table.importId, table.side, table.outcome, table.rowNo),
  ],
);

/** A receipt from a file: matched at once, offered for a match, or left as unannounced. */
export const receipts = mysqlTable(
  'receipts',
  {
    id: id('id').primaryKey(),
    importId: id('import_id')
      .notNull()
      .references(() => imports.id),
    reference: varchar('reference', { length: 120 }),
    fromSiteId: id('from_site_id')
      .notNull()
      .references(() => sites.id),
    toSiteId: id('to_site_id')
      .notNull()
      .references(() => sites.id),
    countedOn: day('counted_on').notNull(),
    state: varchar('state', { length: 12 })
      .$type<'waiting' | 'matched' | 'duplicate' | 'unannounced' | 'booked'>()
      .notNull(),
    /** The first row of it in the file. */
    rowNo: int('row_no').notNull(),
    rule: varchar('rule', { length: 24 }),
    duplicateOf: id('duplicate_of'),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [
    index('receipts_state').on(table.state, table.countedOn, table.id),
    uniqueIndex('receipts_row').on(table.importId, table.rowNo),
    index('receipts_import').on(table.importId, table.state, table.id),
  ],
);

export const receiptLines = mysqlTable(
  'receipt_lines',
  {
    receiptId: id('receipt_id')
      .notNull()
      .references(() => receipts.id),
    typeCode: code('type_code', { length: 20 }).notNull(),
    counted: units('counted').notNull(),
    damaged: units('damaged').notNull().default(0),
    dirty: units('dirty').notNull().default(0),
  },
  (table) => [primaryKey({ columns: [table.receiptId, table.typeCode] })],
);

/** Which shipments a receipt was matched to, or is offered for. Rows with one group belong together. */
export const receiptMatches = mysqlTable(
  'receipt_matches',
  {
    id: id('id').primaryKey(),
    /** The import whose comparison found it; not always the one that brought the receipt. */
    importId: id('import_id')
      .notNull()
      .references(() => imports.id),
    groupId: id('group_id').notNull(),
    receiptId: id('receipt_id')
      .notNull()
      .references(() => receipts.id),
    shipmentId: id('shipment_id')
      .notNull()
      .references(() => shipments.id),
    state: varchar('state', { length: 10 })
      .$type<'planned' | 'matched' | 'not posted' | 'offered' | 'accepted' | 'refused' | 'fell away'>()
      .notNull(),
    rule: varchar('rule', { length: 24 }).notNull(),
    /** Thousandths, 0 to 1000. */
    score: int('score').notNull(),
    why: varchar('why', { length: 400 }).notNull(),
    /** Why a match was not posted: { code, data } of a problem. */
    problem: json('problem'),
    decidedBy: id('decided_by').references(() => people.id),
    decidedAt: instant('decided_at'),
  },
  (table) => [
    index('receipt_matches_receipt').on(table.receiptId),
    index('receipt_matches_shipment').on(table.shipmentId),
    index('receipt_matches_group').on(table.groupId),
    index('receipt_matches_import').on(table.importId, table.state, table.rule, table.groupId),
  ],
);
