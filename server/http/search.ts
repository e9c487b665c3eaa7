import { type Column, like, or, type SQL, sql } from 'drizzle-orm';

/** Text for LIKE: what the person typed stands for itself, anywhere in the value. */
export function likeText(typed: string): string {
  return `%${typed.replace(/[\\%_]/g, '\\$&')}%`;
}

/** One of the columns holds what was typed, capitals or not, whatever the column's own way to compare. */
export function holdsText(search: string | undefined, ...columns: Column[]): SQL | undefined {
  if (!search) return undefined;
  const pattern = likeText(search);
  return or(...columns.map((column) => like(sql`${column} collate utf8mb4_general_ci`, pattern)));
}
