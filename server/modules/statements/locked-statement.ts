import { eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { statements, statementSteps } from '@/db/schema/statements';
import { Problem } from '@/shared/problems/problems';

export type StatementRecord = typeof statements.$inferSelect;

/** The statement's row under a lock; as if it did not exist for another company, and for a partner while a draft. */
export async function lockedStatement(
  tx: Transaction,
  { id, scope }: { id: string; scope: string | null },
): Promise<StatementRecord> {
  const [row] = await tx.select().from(statements).where(eq(statements.id, id)).for('update');
  if (!row || (scope !== null && (row.companyId !== scope || row.state === 'draft'))) {
    throw new Problem('not found');
  }
  return row;
}

export type Step =
  'drafted' | 'issued' | 'mailed' | 'opened' | 'confirmed' | 'confirmed by silence' | 'disputed' | 'reminded';

export async function addStep(
  tx: Transaction,
  step: { statementId: string; step: Step; personId: string | null; at: string },
): Promise<void> {
  await tx.insert(statementSteps).values(step);
}
