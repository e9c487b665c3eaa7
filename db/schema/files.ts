import { bigint, index, mysqlTable, varchar } from 'drizzle-orm/mysql-core';
import { code, id, instant } from '../columns';
import { companies, people } from './companies';

/** A stored file. Its bytes lie under their SHA-256 in the file store; who may read it follows from what it hangs on. */
export const files = mysqlTable(
  'files',
  {
    id: id('id').primaryKey(),
    companyId: id('company_id')
      .notNull()
      .references(() => companies.id),
    name: varchar('name', { length: 200 }).notNull(),
    mediaType: varchar('media_type', { length: 100 }).notNull(),
    bytes: bigint('bytes', { mode: 'number' }).notNull(),
    sha256: code('sha256', { length: 64 }).notNull(),
    uploadedBy: id('uploaded_by').references(() => people.id),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [index('files_company').on(table.companyId, table.id), index('files_content').on(table.sha256)],
);
