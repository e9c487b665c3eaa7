import { eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { disputes } from '@/db/schema/differences';
import type { Person } from '../../http/person';
import { addMessage } from './add-message';
import { closed } from './answer-dispute';
import { lockedDispute } from './locked-dispute';
import { releaseStatement } from './release-statement';
import { tellOtherSide } from './tell-other-side';

type Word = { disputeId: string; text: string; person: Person; now: string; publicUrl: string };

/** The partner says more; the next word is the operator's. */
export async function replyToDispute(tx: Transaction, reply: Word & { fileIds: readonly string[] }) {
  const { disputeId, text, fileIds, person, now, publicUrl } = reply;
  await lockedDispute(tx, { id: disputeId, person });
  await addMessage(tx, { disputeId, step: 'answered', text, fileIds, person, now });
  await tx.update(disputes).set({ state: 'open', lastWordAt: now }).where(eq(disputes.id, disputeId));
  await tellOtherSide(tx, { disputeId, step: 'answered', person, now, publicUrl });
  return { id: disputeId, state: 'open' as const };
}

/** The partner lets it rest: nothing is posted, nothing is held back any more. */
export async function withdrawDispute(tx: Transaction, word: Word) {
  const { disputeId, text, person, now, publicUrl } = word;
  const dispute = await lockedDispute(tx, { id: disputeId, person });
  await addMessage(tx, { disputeId, step: 'withdrawn', text, fileIds: [], person, now });
  await tx
    .update(disputes)
    .set({ state: 'withdrawn', lastWordAt: now, ...closed({ person, now }) })
    .where(eq(disputes.id, disputeId));
  await releaseStatement(tx, { dispute, person, now });
  await tellOtherSide(tx, { disputeId, step: 'withdrawn', person, now, publicUrl });
  return { id: disputeId, state: 'withdrawn' as const };
}
