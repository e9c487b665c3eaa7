import { bigint, index, int, mysqlTable, uniqueIndex, varchar } from 'drizzle-orm/mysql-core';
import type { LineComponent } from '@/shared/domain/statement/components';
import { amount, code, day, id, instant, json, month, rate, units } from '../columns';
import { companies, people } from './companies';
import { disputes } from './differences';
import { files } from './files';

export const months = mysqlTable('months', {
  month: month('month').primaryKey(),
  state: varchar('state', { length: 8 }).$type<'open' | 'closed'>().notNull(),
  closedBy: id('closed_by').references(() => people.id),
  closedAt: instant('closed_at'),
  /** Why it was closed although things stood open. */
  reason: varchar('reason', { length: 500 }).notNull().default(''),
});

export const statements = mysqlTable(
  'statements',
  {
    id: id('id').primaryKey(),
    companyId: id('company_id')
      .notNull()
      .references(() => companies.id),
    month: month('month').notNull(),
    number: code('number', { length: 40 }).notNull(),
    currency: code('currency', { length: 3 }).notNull(),
    state: varchar('state', { length: 8 }).$type<'draft' | 'issued'>().notNull(),
    payable: amount('payable').notNull(),
    tax: amount('tax').notNull(),
    /** Everything the statement shows, as canonical JSON; frozen when issued. */
    content: json('content').notNull(),
    sha256: code('sha256', { length: 64 }).notNull(),
    workbookFileId: id('workbook_file_id').references(() => files.id),
    issuedBy: id('issued_by').references(() => people.id),
    issuedAt: instant('issued_at'),
    objectionUntil: day('objection_until'),
    answer: varchar('answer', { length: 22 })
      .$type<'awaited' | 'confirmed' | 'confirmed by silence' | 'disputed'>()
      .notNull(),
    answeredBy: id('answered_by').references(() => people.id),
    answeredAt: instant('answered_at'),
    remindedAt: instant('reminded_at'),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [
    uniqueIndex('statements_month').on(table.companyId, table.month),
    uniqueIndex('statements_number').on(table.number),
    index('statements_by_month').on(table.month, table.companyId),
  ],
);

/** A line of money. `accountMonth` differs from the statement's month for a correction. Never changed once issued. */
export const statementLines = mysqlTable(
  'statement_lines',
  {
    id: id('id').primaryKey(),
    statementId: id('statement_id')
      .notNull()
      .references(() => statements.id),
    lineNo: int('line_no').notNull(),
    component: varchar('component', { length: 20 }).$type<LineComponent>().notNull(),
    accountMonth: month('account_month').notNull(),
    typeCode: code('type_code', { length: 20 }),
    quantity: units('quantity').notNull(),
    rate: rate('rate'),
    /** Figures that the words "reckoned from" are made of. */
    reckonedFrom: json('reckoned_from').notNull(),
    amount: amount('amount').notNull(),
  },
  (table) => [uniqueIndex('statement_lines_no').on(table.statementId, table.lineNo)],
);

/** Money agreed in a dispute beside any movement; shows in the next statement. Append-only. */
export const credits = mysqlTable(
  'credits',
  {
    id: id('id').primaryKey(),
    companyId: id('company_id')
      .notNull()
      .references(() => companies.id),
    typeCode: code('type_code', { length: 20 }),
    amount: amount('amount').notNull(),
    reason: varchar('reason', { length: 500 }).notNull(),
    disputeId: id('dispute_id').references(() => disputes.id),
    /** The month in whose statement it stands. */
    month: month('month').notNull(),
    createdBy: id('created_by').references(() => people.id),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [index('credits_company').on(table.companyId, table.month)],
);

/** Each step of a statement: drafted, issued, mailed, opened, confirmed, disputed, reminded. Append-only. */
export const statementSteps = mysqlTable(
  'statement_steps',
  {
    id: bigint('id', { mode: 'number' }).autoincrement().primaryKey(),
    statementId: id('statement_id')
      .notNull()
      .references(() => statements.id),
    step: varchar('step', { length: 24 }).notNull(),
    personId: id('person_id').references(() => people.id),
    at: instant('at').notNull(),
  },
  (table) => [index('statement_steps_statement').on(table.statementId, table.id)],
);
