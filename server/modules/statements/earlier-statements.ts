import { and, asc, eq, lt } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { statements } from '@/db/schema/statements';
import type { EarlierStatement } from '@/shared/domain/statement';
import { statementContent, type StatementContent } from '@/shared/domain/statement/content';

/** What a partner's statements of earlier months said, drafts included: a draft counts on those before it. */
export async function earlierStatements(
  db: Reader,
  { companyId, month }: { companyId: string; month: string },
): Promise<EarlierStatement[]> {
  const rows = await db
    .select({ content: statements.content })
    .from(statements)
    .where(and(eq(statements.companyId, companyId), lt(statements.month, month)))
    .orderBy(asc(statements.month));
  return rows.map((row) => asEarlier(statementContent.parse(row.content)));
}

function asEarlier({ month, partner, lines, forfeits, movements }: StatementContent): EarlierStatement {
  return {
    month,
    taxBasis: { rate: partner.taxRate, treatment: partner.taxTreatment },
    lines,
    forfeits,
    eventIds: movements.map((movement) => movement.id),
  };
}
