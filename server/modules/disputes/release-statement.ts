import { and, eq, isNotNull } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { disputes } from '@/db/schema/differences';
import { statements, statementSteps } from '@/db/schema/statements';
import type { Person } from '../../http/person';
import type { DisputeRow } from './locked-dispute';

/** A statement of which nothing is in dispute any more waits for the partner's answer again. */
export async function releaseStatement(
  tx: Transaction,
  { dispute, person, now }: { dispute: DisputeRow; person: Person; now: string },
): Promise<void> {
  const { statementId } = dispute;
  if (!statementId) return;
  await tx.select({ id: statements.id }).from(statements).where(eq(statements.id, statementId)).for('update');
  await tx
    .insert(statementSteps)
    .values({ statementId, step: 'dispute decided', personId: person.id, at: now });
  const [left] = await tx
    .select({ id: disputes.id })
    .from(disputes)
    .where(and(eq(disputes.statementId, statementId), isNotNull(disputes.openKey)))
    .limit(1);
  if (left) return;
  await tx
    .update(statements)
    .set({ answer: 'awaited', answeredBy: null, answeredAt: null })
    .where(and(eq(statements.id, statementId), eq(statements.answer, 'disputed')));
}
