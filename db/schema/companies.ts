import { boolean, index, int, mysqlTable, primaryKey, uniqueIndex, varchar } from 'drizzle-orm/mysql-core';
import type { CompanyKind, Role } from '@/shared/access/abilities';
import { amount, code, day, id, instant, rate } from '../columns';

export const companies = mysqlTable(
  'companies',
  {
    id: id('id').primaryKey(),
    kind: varchar('kind', { length: 10 }).$type<CompanyKind>().notNull(),
    code: code('code', { length: 20 }).notNull(),
    name: varchar('name', { length: 120 }).notNull(),
    gln: varchar('gln', { length: 13 }),
    email: varchar('email', { length: 200 }),
    address: varchar('address', { length: 300 }),
    currency: code('currency', { length: 3 }).notNull(),
    language: varchar('language', { length: 5 }).notNull().default('en'),
    /** Percent, e.g. "25.000000". */
    taxRate: rate('tax_rate').notNull().default('0.000000'),
    /** Directive 2006/112/EC art. 92: (a) deposits left out of the taxable amount, or (b) included. */
    taxTreatment: varchar('tax_treatment', { length: 10 })
      .$type<'excluded' | 'included'>()
      .notNull()
      .default('excluded'),
    objectionDays: int('objection_days').notNull().default(14),
    autoCountDays: int('auto_count_days').notNull().default(10),
    overdueAfterDays: int('overdue_after_days').notNull().default(7),
    toleranceUnits: int('tolerance_units').notNull().default(0),
    tolerancePct: rate('tolerance_pct').notNull().default('0.000000'),
    active: boolean('active').notNull().default(true),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [uniqueIndex('companies_code').on(table.code), index('companies_name').on(table.name, table.id)],
);

export const sites = mysqlTable(
  'sites',
  {
    id: id('id').primaryKey(),
    companyId: id('company_id')
      .notNull()
      .references(() => companies.id),
    code: code('code', { length: 20 }).notNull(),
    name: varchar('name', { length: 120 }).notNull(),
    gln: varchar('gln', { length: 13 }),
    timeZone: varchar('time_zone', { length: 60 }).notNull(),
    active: boolean('active').notNull().default(true),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [uniqueIndex('sites_code').on(table.code), index('sites_company').on(table.companyId)],
);

export const people = mysqlTable(
  'people',
  {
    id: id('id').primaryKey(),
    companyId: id('company_id')
      .notNull()
      .references(() => companies.id),
    email: varchar('email', { length: 200 }).notNull(),
    name: varchar('name', { length: 120 }).notNull(),
    /** Null until the invitation is taken. */
    passwordHash: varchar('password_hash', { length: 200 }),
    language: varchar('language', { length: 5 }).notNull().default('en'),
    active: boolean('active').notNull().default(true),
    /** Sessions begun earlier are void: moved forward on a new password, a change of roles, or when disabled. */
    sessionsFrom: instant('sessions_from').notNull(),
    lastSignedInAt: instant('last_signed_in_at'),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [
    uniqueIndex('people_email').on(table.email),
    index('people_company').on(table.companyId, table.name, table.id),
  ],
);

export const personRoles = mysqlTable(
  'person_roles',
  {
    personId: id('person_id')
      .notNull()
      .references(() => people.id),
    role: varchar('role', { length: 20 }).$type<Role>().notNull(),
  },
  (table) => [primaryKey({ columns: [table.personId, table.role] })],
);

/** Invitations and reset links. Only a hash of the token is kept. */
export const personTokens = mysqlTable(
  'person_tokens',
  {
    id: id('id').primaryKey(),
    personId: id('person_id')
      .notNull()
      .references(() => people.id),
    purpose: varchar('purpose', { length: 12 }).$type<'invitation' | 'reset'>().notNull(),
    tokenHash: code('token_hash', { length: 64 }).notNull(),
    expiresAt: instant('expires_at').notNull(),
    usedAt: instant('used_at'),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [
    uniqueIndex('person_tokens_hash').on(table.tokenHash),
    index('person_tokens_person').on(table.personId),
  ],
);

/** What a partner pays for a type from a day on (RULES 3). Rows are never changed; a later version supersedes. */
export const terms = mysqlTable(
  'terms',
  {
    id: id('id').primaryKey(),
    companyId: id('company_id')
      .notNull()
      .references(() => companies.id),
    typeCode: code('type_code', { length: 20 }).notNull(),
    validFrom: day('valid_from').notNull(),
    deposit: amount('deposit').notNull(),
    replacement: amount('replacement').notNull(),
    freeDays: int('free_days').notNull(),
    dailyFee: rate('daily_fee').notNull(),
    lostAfterDays: int('lost_after_days'),
    usefulLifeMonths: int('useful_life_months').notNull(),
    residualFloorPct: rate('residual_floor_pct').notNull(),
    damageFee: rate('damage_fee').notNull(),
    cleaningFee: rate('cleaning_fee').notNull(),
    recoveryDays: int('recovery_days').notNull(),
    createdBy: id('created_by').references(() => people.id),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [uniqueIndex('terms_version').on(table.companyId, table.typeCode, table.validFrom)],
);
