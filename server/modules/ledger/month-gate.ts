import { sql } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { months } from '@/db/schema/statements';
import { monthOf } from '@/shared/domain/calendar';
import { Problem } from '@/shared/problems/problems';

/**
 * Refuses a value date in a closed month (RULES 4). The month's row is read under a shared lock: closing waits for
 * postings that are under way, and a posting that comes after the close sees it.
 */
export async function refuseClosedMonth(tx: Transaction, valueDate: string): Promise<void> {
  const month = monthOf(valueDate);
  const state = await stateOf(tx, month);
  if (state === undefined) {
    await tx.insert(months).ignore().values({ month, state: 'open' });
    return refuseClosedMonth(tx, valueDate);
  }
  if (state === 'closed') throw new Problem('month closed', { data: { month } });
}

async function stateOf(tx: Transaction, month: string): Promise<string | undefined> {
  // MariaDB has no FOR SHARE.
  const [rows] = await tx.execute(
    sql`select state from ${months} where ${months.month} = ${month} lock in share mode`,
  );
  return (rows as unknown as { state: string }[])[0]?.state;
}
