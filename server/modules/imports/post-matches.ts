import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { receiptMatches, receipts } from '@/db/schema/work';
import { inTransaction } from '@/db/transaction';
import { instantOf } from '../../deps';
import { keptProblem, type KeptProblem } from './import-marks';
import { postGroup } from './post-group';
import type { Run } from './run-import';

const stepsTold = 20;

/** Posts the counts of all planned matches, each group in its own transaction. */
export async function postMatches(run: Run): Promise<void> {
  const planned = await run.deps.db
    .selectDistinct({ groupId: receiptMatches.groupId })
    .from(receiptMatches)
    .where(and(eq(receiptMatches.importId, run.importId), eq(receiptMatches.state, 'planned')))
    .orderBy(asc(receiptMatches.groupId));
  await run.left(planned.length);
  let steps = 0;
  for (const { groupId } of planned) {
    await postOne(run, groupId);
    steps += 1;
    if (steps % stepsTold === 0) await run.step(stepsTold);
  }
  await run.step(steps % stepsTold);
}

async function postOne(run: Run, groupId: string): Promise<void> {
  const { deps, personId } = run;
  try {
    await inTransaction(deps.db, async (tx) => {
      await postGroup(tx, { groupId, personId, now: instantOf(deps.clock) });
      await tx.update(receiptMatches).set({ state: 'matched' }).where(eq(receiptMatches.groupId, groupId));
    });
  } catch (error) {
    const problem = keptProblem(error);
    await inTransaction(deps.db, (tx) => setAside(tx, { groupId, problem }));
  }
}

/** A match that could not be posted: a receipt that is taken falls away, what someone counted meanwhile is told as such, the rest is left over. */
async function setAside(
  tx: Transaction,
  { groupId, problem }: { groupId: string; problem: KeptProblem },
): Promise<void> {
  const pairs = await tx
    .select()
    .from(receiptMatches)
    .where(eq(receiptMatches.groupId, groupId))
    .for('update');
  const isTaken = problem.code === 'state changed';
  await tx
    .update(receiptMatches)
    .set(isTaken ? { state: 'fell away' } : { state: 'not posted', problem })
    .where(eq(receiptMatches.groupId, groupId));
  const left =
    problem.code === 'already counted' && new Set(pairs.map(({ shipmentId }) => shipmentId)).size === 1
      ? { state: 'duplicate' as const, rule: 'counted before' }
      : { state: 'unannounced' as const };
  const ids = pairs.map(({ receiptId }) => receiptId);
  await tx
    .update(receipts)
    .set(left)
    .where(and(inArray(receipts.id, ids), eq(receipts.state, 'waiting')));
}
