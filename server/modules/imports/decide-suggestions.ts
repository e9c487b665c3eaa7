import { and, eq, inArray, ne, or } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { receiptMatches } from '@/db/schema/work';
import { Problem } from '@/shared/problems/problems';
import { keptProblem, type KeptProblem } from './import-marks';
import { type MatchRow, postGroup } from './post-group';

type Deciding = {
  decision: 'accept' | 'refuse';
  /** Groups of receipt_matches. */
  suggestions: readonly string[];
  personId: string;
  now: string;
};
export type Skipped = { id: string; problem: KeptProblem };

/**
 * Accepts suggestions, which counts their shipments and lets the other offers of either side fall away, or refuses
 * them. One that cannot be posted any more is told and leaves the others as they are.
 */
export async function decideSuggestions(
  tx: Transaction,
  { decision, suggestions, personId, now }: Deciding,
): Promise<{ decided: number; skipped: Skipped[] }> {
  const skipped: Skipped[] = [];
  const groups = [...new Set(suggestions)];
  for (const groupId of groups) {
    try {
      // A savepoint: what this one wrote goes back when it cannot be posted.
      await tx.transaction((inner) => decideOne(inner, { decision, groupId, personId, now }));
    } catch (error) {
      skipped.push({ id: groupId, problem: keptProblem(error) });
    }
  }
  if (skipped.some(({ problem }) => problem.code === 'not found')) throw new Problem('not found');
  return { decided: groups.length - skipped.length, skipped };
}

type One = Omit<Deciding, 'suggestions'> & { groupId: string };

async function decideOne(tx: Transaction, { decision, groupId, personId, now }: One): Promise<void> {
  await refuseDecided(tx, groupId);
  if (decision === 'accept') {
    const pairs = await postGroup(tx, { groupId, personId, now });
    await letRivalsFall(tx, { pairs, groupId });
  }
  await tx
    .update(receiptMatches)
    .set({ state: decision === 'accept' ? 'accepted' : 'refused', decidedBy: personId, decidedAt: now })
    .where(eq(receiptMatches.groupId, groupId));
}

async function refuseDecided(tx: Transaction, groupId: string): Promise<void> {
  const pairs = await tx
    .select()
    .from(receiptMatches)
    .where(eq(receiptMatches.groupId, groupId))
    .for('update');
  const [first] = pairs;
  if (!first) throw new Problem('not found');
  if (first.state !== 'offered') throw new Problem('state changed');
}

async function letRivalsFall(
  tx: Transaction,
  { pairs, groupId }: { pairs: readonly MatchRow[]; groupId: string },
): Promise<void> {
  await tx
    .update(receiptMatches)
    .set({ state: 'fell away' })
    .where(
      and(
        eq(receiptMatches.state, 'offered'),
        ne(receiptMatches.groupId, groupId),
        or(
          inArray(
            receiptMatches.receiptId,
            pairs.map(({ receiptId }) => receiptId),
          ),
          inArray(
            receiptMatches.shipmentId,
            pairs.map(({ shipmentId }) => shipmentId),
          ),
        ),
      ),
    );
}
