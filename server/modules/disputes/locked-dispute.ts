import { desc, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { people } from '@/db/schema/companies';
import { disputeMessages, disputes } from '@/db/schema/differences';
import { undecided } from '@/shared/contracts/disputes';
import { Problem } from '@/shared/problems/problems';
import { type Person, scopeOf } from '../../http/person';

export type DisputeRow = typeof disputes.$inferSelect;

/** The dispute under lock, if it is this person's to see and not decided yet. */
export async function lockedDispute(
  tx: Transaction,
  { id, person }: { id: string; person: Person },
): Promise<DisputeRow> {
  const [dispute] = await tx.select().from(disputes).where(eq(disputes.id, id)).for('update');
  const scope = scopeOf(person);
  if (!dispute || (scope !== null && dispute.companyId !== scope)) throw new Problem('not found');
  if (!undecided.includes(dispute.state)) throw await alreadyAnswered(tx, dispute);
  return dispute;
}

async function alreadyAnswered(tx: Transaction, dispute: DisputeRow): Promise<Problem> {
  const [person] = dispute.closedBy
    ? await tx.select({ name: people.name }).from(people).where(eq(people.id, dispute.closedBy))
    : [];
  const { state, closedAt: at } = dispute;
  return new Problem('already answered', { data: { by: person?.name ?? null, at, state } });
}

/** Refuses an answer to a thread that has gone on since it was read. */
export async function refuseUnseen(
  tx: Transaction,
  { dispute, seenMessageId }: { dispute: DisputeRow; seenMessageId: string },
): Promise<void> {
  const [last] = await tx
    .select({
      id: disputeMessages.id,
      companyId: disputeMessages.companyId,
      at: disputeMessages.at,
      by: people.name,
    })
    .from(disputeMessages)
    .leftJoin(people, eq(people.id, disputeMessages.personId))
    .where(eq(disputeMessages.disputeId, dispute.id))
    .orderBy(desc(disputeMessages.id))
    .limit(1);
  if (last?.id === seenMessageId) return;
  const code = last?.companyId === dispute.companyId ? 'state changed' : 'already answered';
  throw new Problem(code, { data: { by: last?.by ?? null, at: last?.at ?? null } });
}
