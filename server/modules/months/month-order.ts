import { and, asc, eq, gt, lt, min } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { months } from '@/db/schema/statements';
import { nextMonth } from '@/shared/domain/calendar';

/** Months close in their order: the first one before this that is not closed, counted from the first with a movement. */
export async function earlierOpenMonth(db: Reader, month: string): Promise<string | null> {
  const [row] = await db.select({ first: min(months.month) }).from(months);
  const first = row?.first;
  if (!first || first >= month) return null;
  const closed = await db
    .select({ month: months.month })
    .from(months)
    .where(and(lt(months.month, month), eq(months.state, 'closed')))
    .orderBy(asc(months.month));
  const done = new Set(closed.map((each) => each.month));
  for (let each = first; each < month; each = nextMonth(each)) if (!done.has(each)) return each;
  return null;
}

/** A later month is closed: what its statements say counts on this month's drafts as they are. */
export async function laterClosed(db: Reader, month: string): Promise<boolean> {
  const [row] = await db
    .select({ month: months.month })
    .from(months)
    .where(and(gt(months.month, month), eq(months.state, 'closed')))
    .limit(1);
  return row !== undefined;
}
