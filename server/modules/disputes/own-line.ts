import { and, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { statementLines, statements } from '@/db/schema/statements';
import { dayInZone } from '@/shared/domain/calendar';
import type { DisputedLine } from '@/shared/domain/disputed-line';
import { Problem } from '@/shared/problems/problems';
import { operatorZone } from '../partners/operator-day';

export type OwnLine = {
  statement: typeof statements.$inferSelect;
  line: typeof statementLines.$inferSelect;
};

/** A line of an issued statement of the company; otherwise as if there were none. */
export async function ownLine(db: Reader, named: { companyId: string; lineId: string }): Promise<OwnLine> {
  const [row] = await db
    .select({ statement: statements, line: statementLines })
    .from(statementLines)
    .innerJoin(statements, eq(statements.id, statementLines.statementId))
    .innerJoin(companies, eq(companies.id, statements.companyId))
    .where(
      and(
        eq(statementLines.id, named.lineId),
        eq(statements.companyId, named.companyId),
        eq(statements.state, 'issued'),
      ),
    );
  if (!row) throw new Problem('not found');
  return row;
}

export function disputedLineOf({ statement, line }: OwnLine): DisputedLine {
  const { component, quantity } = line;
  return { component, quantity, amount: shortened(line.amount), currency: statement.currency };
}

/** "86.4000" → "86.4": the column's further decimals are not the currency's. */
export function shortened(amount: string): string {
  return amount.includes('.') ? amount.replace(/\.?0+$/, '') : amount;
}

/** Why a line cannot be disputed any more; null where it can. Objection ends with the day that the statement names. */
export async function blockOf(
  db: Reader,
  { statement, now }: { statement: OwnLine['statement']; now: string },
): Promise<'confirmed' | 'objection over' | null> {
  const { answer, objectionUntil } = statement;
  if (answer === 'confirmed' || answer === 'confirmed by silence') return 'confirmed';
  const today = dayInZone(now, await operatorZone(db));
  return objectionUntil !== null && today > objectionUntil ? 'objection over' : null;
}
