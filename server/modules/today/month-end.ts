import { and, asc, count, eq, inArray, lt, sql } from 'drizzle-orm';
import { undecided } from '@/shared/contracts/disputes';
import type { Reader } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { disputes } from '@/db/schema/differences';
import { months, statements } from '@/db/schema/statements';
import type { Today } from '@/shared/contracts/today';
import { monthOf } from '@/shared/domain/calendar';
import { add, formatMinor, subtract } from '@/shared/domain/money';
import { may, type Person, scopeOf } from '../../http/person';
import { moneyInDispute } from './disputes-waiting';

/** Months that have ended and are open, statements not yet issued, and the money in dispute. */
export async function monthEnd(
  db: Reader,
  { person, day }: { person: Person; day: string },
): Promise<Today['months']> {
  if (!may(person, 'close months')) return null;
  const ended = await db
    .select({ month: months.month })
    .from(months)
    .where(and(eq(months.state, 'open'), lt(months.month, monthOf(day))))
    .orderBy(asc(months.month))
    .limit(12);
  const drafts = await db
    .select({ month: statements.month, statements: count() })
    .from(statements)
    .where(eq(statements.state, 'draft'))
    .groupBy(statements.month)
    .orderBy(asc(statements.month));
  return { toClose: ended.map((row) => row.month), drafts, disputed: await moneyInDispute(db) };
}

/** Statements that are out and not answered: finance waits for them, a partner answers them. */
export async function awaitedAnswers(db: Reader, person: Person): Promise<Today['awaited']> {
  const scope = scopeOf(person);
  if (!may(person, scope === null ? 'close months' : 'see statements')) return null;
  const where = and(
    eq(statements.state, 'issued'),
    eq(statements.answer, 'awaited'),
    scope ? eq(statements.companyId, scope) : undefined,
  );
  const rows = await db
    .select({ statement: statements, company: companies.name })
    .from(statements)
    .innerJoin(companies, eq(companies.id, statements.companyId))
    .where(where)
    .orderBy(asc(statements.objectionUntil), asc(statements.id))
    .limit(6);
  const [all] = await db.select({ total: count() }).from(statements).where(where);
  const held = await heldOn(
    db,
    rows.map((row) => row.statement.id),
  );
  return {
    total: all?.total ?? 0,
    rows: rows.map(({ statement, company }) => ({
      id: statement.id,
      company,
      month: statement.month,
      due: {
        currency: statement.currency,
        amount: formatMinor(
          subtract(add(statement.payable, statement.tax), held.get(statement.id) ?? '0'),
          statement.currency,
        ),
      },
      objectionUntil: statement.objectionUntil,
    })),
  };
}

/** What undecided disputes hold out of "due now" (RULES 4). */
async function heldOn(db: Reader, ids: readonly string[]): Promise<Map<string | null, string>> {
  if (ids.length === 0) return new Map();
  const rows = await db
    .select({ statementId: disputes.statementId, held: sql<string>`sum(${disputes.amountHeld})` })
    .from(disputes)
    .where(and(inArray(disputes.statementId, [...ids]), inArray(disputes.state, [...undecided])))
    .groupBy(disputes.statementId);
  return new Map(rows.map((row) => [row.statementId, row.held]));
}
