import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { disputes } from '@/db/schema/differences';
import { databaseErrorNumber } from '@/db/transaction';
import type { OpeningForm } from '@/shared/contracts/disputes';
import { Problem } from '@/shared/problems/problems';
import { disputes as words } from '@/shared/text/en/disputes';
import type { Person } from '../../http/person';
import { addMessage } from './add-message';
import { claimOnCount } from './claim-on-count';
import { claimOnLine } from './claim-on-line';
import { tellOtherSide } from './tell-other-side';

export type Opening = { form: OpeningForm; person: Person; now: string; publicUrl: string };
/** What is disputed, checked: the columns of the dispute that say so. */
export type Claim = Omit<
  typeof disputes.$inferInsert,
  'id' | 'companyId' | 'state' | 'reason' | 'openedBy' | 'openedAt' | 'lastWordAt'
>;

/** Opens a dispute over a count or a statement line of the person's own company; one for each while undecided. */
export async function openDispute(tx: Transaction, opening: Opening) {
  const { form, person, now } = opening;
  const claim = form.subject === 'count' ? await claimOnCount(tx, opening) : await claimOnLine(tx, opening);
  const id = newId();
  const dispute = {
    ...claim,
    id,
    companyId: person.companyId,
    state: 'open' as const,
    reason: form.reason,
    openedBy: person.id,
    openedAt: now,
    lastWordAt: now,
  };
  try {
    await tx.insert(disputes).values(dispute);
  } catch (error) {
    if (databaseErrorNumber(error) === 1062)
      throw new Problem('already exists', { data: { what: words.what } });
    throw error;
  }
  await addMessage(tx, {
    disputeId: id,
    step: 'opened',
    text: form.text,
    fileIds: form.fileIds,
    person,
    now,
  });
  await tellOtherSide(tx, { disputeId: id, step: 'opened', person, now, publicUrl: opening.publicUrl });
  return { id, state: dispute.state, amountHeld: claim.amountHeld };
}
