import { and, eq, inArray, sum } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { disputes } from '@/db/schema/differences';
import { undecided } from '@/shared/contracts/disputes';
import { plain } from './assessment-input';

/** What undecided disputes hold out of "due now", by statement; statements without any are left out. */
export async function heldOf(db: Reader, statementIds: readonly string[]): Promise<Map<string, string>> {
  if (statementIds.length === 0) return new Map();
  const rows = await db
    .select({ statementId: disputes.statementId, held: sum(disputes.amountHeld) })
    .from(disputes)
    .where(and(inArray(disputes.statementId, [...statementIds]), inArray(disputes.state, [...undecided])))
    .groupBy(disputes.statementId);
  return new Map(rows.map((row) => [row.statementId ?? '', plain(row.held ?? '0')]));
}

export async function hasUndecidedDispute(db: Reader, statementId: string): Promise<boolean> {
  const [dispute] = await db
    .select({ id: disputes.id })
    .from(disputes)
    .where(and(eq(disputes.statementId, statementId), inArray(disputes.state, [...undecided])))
    .limit(1);
  return dispute !== undefined;
}
