import { sql } from 'drizzle-orm';
import {
  boolean,
  foreignKey,
  index,
  int,
  mysqlTable,
  primaryKey,
  uniqueIndex,
  varchar,
} from 'drizzle-orm/mysql-core';
import { code, day, id, instant, units } from '../columns';
import { companies, people, sites } from './companies';
import { containerTypes } from './containers';
import { files } from './files';

export const shipments = mysqlTable(
  'shipments',
  {
    id: id('id').primaryKey(),
    reference: code('reference', { length: 40 }).notNull(),
    contents: varchar('contents', { length: 10 }).$type<'empties' | 'fulls'>().notNull(),
    fromSiteId: id('from_site_id')
      .notNull()
      .references(() => sites.id),
    toSiteId: id('to_site_id')
      .notNull()
      .references(() => sites.id),
    fromCompanyId: id('from_company_id')
      .notNull()
      .references(() => companies.id),
    toCompanyId: id('to_company_id')
      .notNull()
      .references(() => companies.id),
    /** The day it left, in the sender's time zone: its value date. */
    leftOn: day('left_on').notNull(),
    expectedOn: day('expected_on').notNull(),
    state: varchar('state', { length: 12 }).$type<'on the way' | 'counted'>().notNull(),
    /** How it came into the book; "unannounced" was counted without having been declared. */
    origin: varchar('origin', { length: 12 }).$type<'form' | 'import' | 'unannounced'>().notNull(),
    note: varchar('note', { length: 300 }).notNull().default(''),
    importId: id('import_id'),
    createdBy: id('created_by').references(() => people.id),
    createdAt: instant('created_at').notNull(),
    countedAt: instant('counted_at'),
    countedOn: day('counted_on'),
    countedBy: id('counted_by').references(() => people.id),
    /** Longer on the way than most: with it, what was on the way on a past day is found without reading the history. */
    isSlow: boolean('is_slow').generatedAlwaysAs(sql`(datediff(counted_on, left_on) > 14)`, {
      mode: 'virtual',
    }),
  },
  (table) => [
    uniqueIndex('shipments_reference').on(table.fromCompanyId, table.reference),
    index('shipments_to').on(table.toCompanyId, table.state, table.expectedOn, table.id),
    index('shipments_from').on(table.fromCompanyId, table.state, table.expectedOn, table.id),
    index('shipments_left').on(table.leftOn, table.id),
    index('shipments_counted').on(table.countedOn, table.leftOn),
    index('shipments_slow').on(table.isSlow, table.countedOn, table.leftOn),
    index('shipments_state').on(table.state, table.expectedOn, table.id),
  ],
);

export const shipmentLines = mysqlTable(
  'shipment_lines',
  {
    shipmentId: id('shipment_id')
      .notNull()
      .references(() => shipments.id),
    typeCode: code('type_code', { length: 20 })
      .notNull()
      .references(() => containerTypes.code),
    declared: units('declared').notNull(),
  },
  (table) => [primaryKey({ columns: [table.shipmentId, table.typeCode] })],
);

/** What a receiver says arrived. The first count of a shipment has sequence 1; what turned up later has 2, 3 … */
export const counts = mysqlTable(
  'counts',
  {
    id: id('id').primaryKey(),
    shipmentId: id('shipment_id')
      .notNull()
      .references(() => shipments.id),
    sequence: int('sequence').notNull(),
    countedOn: day('counted_on').notNull(),
    source: varchar('source', { length: 10 }).$type<'person' | 'import' | 'automatic'>().notNull(),
    note: varchar('note', { length: 300 }).notNull().default(''),
    countedBy: id('counted_by').references(() => people.id),
    countedAt: instant('counted_at').notNull(),
  },
  (table) => [uniqueIndex('counts_sequence').on(table.shipmentId, table.sequence)],
);

export const countLines = mysqlTable(
  'count_lines',
  {
    countId: id('count_id').notNull(),
    typeCode: code('type_code', { length: 20 })
      .notNull()
      .references(() => containerTypes.code),
    counted: units('counted').notNull(),
    /** Of the counted. */
    damaged: units('damaged').notNull(),
    /** Of the counted: to be cleaned at the sender's cost. */
    dirty: units('dirty').notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.countId, table.typeCode] }),
    foreignKey({ name: 'count_lines_count', columns: [table.countId], foreignColumns: [counts.id] }),
  ],
);

export const countPhotos = mysqlTable(
  'count_photos',
  {
    countId: id('count_id')
      .notNull()
      .references(() => counts.id),
    fileId: id('file_id')
      .notNull()
      .references(() => files.id),
  },
  (table) => [primaryKey({ columns: [table.countId, table.fileId] })],
);
