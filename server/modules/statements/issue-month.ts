import { and, asc, eq } from 'drizzle-orm';
import { statements } from '@/db/schema/statements';
import { inTransaction } from '@/db/transaction';
import { Problem } from '@/shared/problems/problems';
import { instantOf } from '../../deps';
import type { JobHandler } from '../../jobs/job-queue';
import { monthPayload } from './draft-month';
import { issueStatement } from './issue-statement';

/** Issues the drafts of a month, each in a transaction of its own; what went out before is passed over. */
export const issueMonth: JobHandler = async (deps, job, progress): Promise<{ issued: number }> => {
  const { month } = monthPayload.parse(job.payload);
  const drafts = await deps.db
    .select({ id: statements.id })
    .from(statements)
    .where(and(eq(statements.month, month), eq(statements.state, 'draft')))
    .orderBy(asc(statements.number));
  let issued = 0;
  for (const [index, { id }] of drafts.entries()) {
    await progress(index, drafts.length);
    const issuing = { statementId: id, personId: job.createdBy, now: instantOf(deps.clock), deps };
    issued += await inTransaction(deps.db, (tx) => issueStatement(tx, issuing))
      .then(() => 1)
      .catch((error: unknown) => {
        if (error instanceof Problem && error.code === 'already issued') return 0;
        throw error;
      });
  }
  await progress(drafts.length, drafts.length);
  return { issued };
};
