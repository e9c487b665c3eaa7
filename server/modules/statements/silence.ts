import { and, eq, inArray, isNull, lt, lte } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { statements } from '@/db/schema/statements';
import { inTransaction } from '@/db/transaction';
import { addDays } from '@/shared/domain/calendar';
import type { Deps } from '../../deps';
import { instantOf } from '../../deps';
import { operatorDay } from '../partners/operator-day';
import { hasUndecidedDispute } from './held';
import { reminderMail } from './letters';
import { addStep, lockedStatement } from './locked-statement';
import { writeToPartner } from './write-to-partner';

const remindBeforeDays = 3;

/** By the clock (RULES 4): a reminder before the days to object are over, and silence after them counts as confirmed. */
export async function watchSilence(deps: Deps): Promise<void> {
  const now = instantOf(deps.clock);
  const today = await operatorDay(deps.db, now);
  for (const id of await silentSince(deps.db, today)) {
    await inTransaction(deps.db, async (tx) => {
      const row = await lockedStatement(tx, { id, scope: null });
      const waits = row.answer === 'awaited' || row.answer === 'disputed';
      if (!waits || (await hasUndecidedDispute(tx, id))) return;
      await tx
        .update(statements)
        .set({ answer: 'confirmed by silence', answeredAt: now, answeredBy: null })
        .where(eq(statements.id, id));
      await addStep(tx, { statementId: id, step: 'confirmed by silence', personId: null, at: now });
    });
  }
  for (const id of await toRemind(deps.db, today)) await remind(deps, id, now);
}

async function silentSince(db: Database, today: string): Promise<string[]> {
  const rows = await db
    .select({ id: statements.id })
    .from(statements)
    .where(
      and(
        eq(statements.state, 'issued'),
        inArray(statements.answer, ['awaited', 'disputed']),
        lt(statements.objectionUntil, today),
      ),
    );
  return rows.map((row) => row.id);
}

async function toRemind(db: Database, today: string): Promise<string[]> {
  const rows = await db
    .select({ id: statements.id })
    .from(statements)
    .where(
      and(
        eq(statements.state, 'issued'),
        eq(statements.answer, 'awaited'),
        isNull(statements.remindedAt),
        lte(statements.objectionUntil, addDays(today, remindBeforeDays)),
      ),
    );
  return rows.map((row) => row.id);
}

async function remind(deps: Deps, id: string, now: string): Promise<void> {
  await inTransaction(deps.db, async (tx) => {
    const row = await lockedStatement(tx, { id, scope: null });
    if (row.remindedAt || row.answer !== 'awaited' || !row.objectionUntil) return;
    const link = `${deps.config.PUBLIC_URL}/statements/${id}`;
    const letter = reminderMail({ month: row.month, answerBy: row.objectionUntil, link });
    await writeToPartner(tx, { companyId: row.companyId, letter, now });
    await tx.update(statements).set({ remindedAt: now }).where(eq(statements.id, id));
    await addStep(tx, { statementId: id, step: 'reminded', personId: null, at: now });
  });
}
