import { and, eq, gt, lt, or, type SQL, sql } from 'drizzle-orm';
import type { MySqlColumn } from 'drizzle-orm/mysql-core';

/** Where a page of the list ended. */
export type Key = { since: string; id: string };

/** "2026-03-02_0195…" → its parts; nothing for what is not a key. */
export function asKey(text: string): Key | undefined {
  const [since = '', id = ''] = text.split('_');
  return /^\d{4}-\d{2}-\d{2}$/.test(since) && /^[0-9a-f-]{36}$/.test(id) ? { since, id } : undefined;
}

type Columns = { since: MySqlColumn; id: MySqlColumn };

export function afterKey(columns: Columns, key: Key | null): SQL | undefined {
  if (!key) return undefined;
  return or(gt(columns.since, key.since), and(eq(columns.since, key.since), gt(columns.id, key.id)));
}

export function beforeKey(columns: Columns, key: Key | null): SQL | undefined {
  if (!key) return undefined;
  return or(lt(columns.since, key.since), and(eq(columns.since, key.since), lt(columns.id, key.id)));
}

/** Part of a reference, capitals or not; what LIKE would take for a sign of its own stands for itself. */
export function holdsText(column: MySqlColumn, search: string | undefined): SQL | undefined {
  if (!search) return undefined;
  return sql`${column} collate utf8mb4_general_ci like ${`%${search.replace(/[\\%_]/g, '\\$&')}%`}`;
}
