import { and, asc, eq, lte } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { disputes } from '@/db/schema/differences';
import { credits, statementLines } from '@/db/schema/statements';
import type { Credit } from '@/shared/domain/statement';
import { plain } from './assessment-input';

/** Credits of a partner up to a month; which of them earlier statements gave is for the reckoning to see. */
export async function creditsOf(
  db: Reader,
  { companyId, month }: { companyId: string; month: string },
): Promise<Credit[]> {
  const rows = await db
    .select({ credit: credits, of: statementLines.component })
    .from(credits)
    .leftJoin(disputes, eq(disputes.id, credits.disputeId))
    .leftJoin(statementLines, eq(statementLines.id, disputes.statementLineId))
    .where(and(eq(credits.companyId, companyId), lte(credits.month, month)))
    .orderBy(asc(credits.id));
  return rows.map(({ credit, of }) => ({
    id: credit.id,
    typeCode: credit.typeCode,
    amount: plain(credit.amount),
    reason: credit.reason,
    of,
  }));
}
