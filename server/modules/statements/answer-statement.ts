import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { people } from '@/db/schema/companies';
import { statements, statementSteps } from '@/db/schema/statements';
import { Problem } from '@/shared/problems/problems';
import { hasUndecidedDispute } from './held';
import { addStep, lockedStatement, type StatementRecord } from './locked-statement';

type Answering = { statementId: string; person: { id: string; companyId: string }; now: string };

/** Notes that the partner has opened its statement; only the first time is a step. */
export async function noteOpened(tx: Transaction, { statementId, person, now }: Answering): Promise<void> {
  await lockedStatement(tx, { id: statementId, scope: person.companyId });
  const [before] = await tx
    .select({ id: statementSteps.id })
    .from(statementSteps)
    .where(and(eq(statementSteps.statementId, statementId), eq(statementSteps.step, 'opened')))
    .limit(1);
  if (!before) await addStep(tx, { statementId, step: 'opened', personId: person.id, at: now });
}

/** The partner confirms. Not while one of its disputes is undecided: that says that a line is not agreed. */
export async function confirmStatement(tx: Transaction, answering: Answering): Promise<void> {
  const { statementId, person, now } = answering;
  const row = await lockedStatement(tx, { id: statementId, scope: person.companyId });
  await refuseAnswered(tx, row);
  if (await hasUndecidedDispute(tx, statementId)) throw new Problem('dispute open');
  await tx
    .update(statements)
    .set({ answer: 'confirmed', answeredBy: person.id, answeredAt: now })
    .where(eq(statements.id, statementId));
  await addStep(tx, { statementId, step: 'confirmed', personId: person.id, at: now });
}

async function refuseAnswered(tx: Transaction, row: StatementRecord): Promise<void> {
  if (row.answer !== 'confirmed' && row.answer !== 'confirmed by silence') return;
  const [by] = row.answeredBy
    ? await tx.select({ name: people.name }).from(people).where(eq(people.id, row.answeredBy))
    : [];
  throw new Problem('already answered', {
    data: { by: by?.name ?? null, at: row.answeredAt, silence: row.answer === 'confirmed by silence' },
  });
}
