import {
  boolean,
  decimal,
  index,
  int,
  mysqlTable,
  primaryKey,
  uniqueIndex,
  varchar,
} from 'drizzle-orm/mysql-core';
import type { TypeKind } from '@/shared/contracts/container-types';
import { amount, code, day, id, instant, json, rate } from '../columns';
import { people, sites } from './companies';

export const containerTypes = mysqlTable('container_types', {
  code: code('code', { length: 20 }).primaryKey(),
  name: varchar('name', { length: 80 }).notNull(),
  kind: varchar('kind', { length: 10 }).$type<TypeKind>().notNull(),
  lengthMm: int('length_mm').notNull(),
  widthMm: int('width_mm').notNull(),
  heightMm: int('height_mm').notNull(),
  tareKg: decimal('tare_kg', { precision: 8, scale: 3 }).notNull(),
  payloadKg: decimal('payload_kg', { precision: 8, scale: 1 }).notNull(),
  /** How many may stand on each other, by the maker's plate. */
  stackLimit: int('stack_limit').notNull(),
  /** Units in one handled stack or layer: "50 stacks of 8". */
  unitsPerStack: int('units_per_stack').notNull().default(1),
  graiAssetType: varchar('grai_asset_type', { length: 14 }),
  inServiceFrom: day('in_service_from').notNull(),
  replacement: amount('replacement').notNull(),
  usefulLifeMonths: int('useful_life_months').notNull(),
  note: varchar('note', { length: 300 }).notNull().default(''),
  active: boolean('active').notNull().default(true),
  createdAt: instant('created_at').notNull(),
});

/** A unit load: one pallet + eight totes + one lid. */
export const packedWith = mysqlTable(
  'packed_with',
  {
    typeCode: code('type_code', { length: 20 })
      .notNull()
      .references(() => containerTypes.code),
    withTypeCode: code('with_type_code', { length: 20 })
      .notNull()
      .references(() => containerTypes.code),
    quantity: int('quantity').notNull(),
  },
  (table) => [primaryKey({ columns: [table.typeCode, table.withTypeCode] })],
);

/** Packing specification: which part travels in which type, between whom, and how many a day. */
export const parts = mysqlTable(
  'parts',
  {
    id: id('id').primaryKey(),
    number: code('number', { length: 40 }).notNull(),
    name: varchar('name', { length: 120 }).notNull(),
    typeCode: code('type_code', { length: 20 })
      .notNull()
      .references(() => containerTypes.code),
    supplierSiteId: id('supplier_site_id')
      .notNull()
      .references(() => sites.id),
    plantSiteId: id('plant_site_id')
      .notNull()
      .references(() => sites.id),
    unitsPerContainer: int('units_per_container').notNull(),
    unitsPerDayMean: rate('units_per_day_mean').notNull(),
    unitsPerDaySd: rate('units_per_day_sd').notNull(),
    active: boolean('active').notNull().default(true),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [
    uniqueIndex('parts_spec').on(table.number, table.supplierSiteId, table.plantSiteId),
    index('parts_type').on(table.typeCode),
  ],
);

/** The loop of a type: one plan per type, its legs and assumptions as sizePool takes them (without flows). */
export const poolPlans = mysqlTable('pool_plans', {
  typeCode: code('type_code', { length: 20 })
    .primaryKey()
    .references(() => containerTypes.code),
  travel: varchar('travel', { length: 12 }).$type<'independent' | 'together'>().notNull(),
  /** [{ name, days: { mean, sd } }] */
  legs: json('legs').notNull(),
  bufferDays: rate('buffer_days').notNull(),
  coverProbability: rate('cover_probability').notNull(),
  heldPct: rate('held_pct').notNull(),
  repairPct: rate('repair_pct').notNull(),
  lossPerTripPct: rate('loss_per_trip_pct').notNull(),
  workingDaysPerYear: int('working_days_per_year').notNull(),
  changedBy: id('changed_by').references(() => people.id),
  changedAt: instant('changed_at').notNull(),
});

/** An approved size with what it was reckoned from; earlier ones stay. */
export const poolApprovals = mysqlTable(
  'pool_approvals',
  {
    id: id('id').primaryKey(),
    typeCode: code('type_code', { length: 20 })
      .notNull()
      .references(() => containerTypes.code),
    size: int('size').notNull(),
    input: json('input').notNull(),
    result: json('result').notNull(),
    /** [{ siteId, minimum, maximum }] */
    levels: json('levels').notNull(),
    note: varchar('note', { length: 300 }).notNull().default(''),
    approvedBy: id('approved_by')
      .notNull()
      .references(() => people.id),
    approvedAt: instant('approved_at').notNull(),
  },
  (table) => [index('pool_approvals_type').on(table.typeCode, table.id)],
);
