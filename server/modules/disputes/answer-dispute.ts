import { eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { disputes } from '@/db/schema/differences';
import { companies } from '@/db/schema/companies';
import type { AnswerForm, DisputeMessage } from '@/shared/contracts/disputes';
import { compare, isWholeMinor, isZero } from '@/shared/domain/money';
import { Problem } from '@/shared/problems/problems';
import { disputes as words } from '@/shared/text/en/disputes';
import type { Person } from '../../http/person';
import { acceptClaim } from './accept-claim';
import { addMessage } from './add-message';
import { type DisputeRow, lockedDispute, refuseUnseen } from './locked-dispute';
import { releaseStatement } from './release-statement';
import { tellOtherSide } from './tell-other-side';

export type Answering = {
  disputeId: string;
  form: AnswerForm;
  person: Person;
  now: string;
  publicUrl: string;
};
type Decision = {
  step: DisputeMessage['step'];
  state: DisputeRow['state'];
  acceptedUnits: number | null;
  acceptedAmount: string | null;
};

/** The operator's word. Acceptance posts its correction in this transaction; of two answers at once one stands. */
export async function answerDispute(tx: Transaction, answering: Answering) {
  const { disputeId, form, person, now, publicUrl } = answering;
  const dispute = await lockedDispute(tx, { id: disputeId, person });
  await refuseUnseen(tx, { dispute, seenMessageId: form.seenMessageId });
  const decision = await decide(tx, { dispute, answering });
  const { step, ...set } = decision;
  const { text, fileIds } = form;
  await addMessage(tx, { disputeId, step, text, fileIds, person, now });
  const isDecided = form.step !== 'ask';
  await tx
    .update(disputes)
    .set({ ...set, lastWordAt: now, ...(isDecided ? closed({ person, now }) : {}) })
    .where(eq(disputes.id, disputeId));
  if (isDecided) await releaseStatement(tx, { dispute, person, now });
  await tellOtherSide(tx, { disputeId, step, person, now, publicUrl });
  return { id: disputeId, ...set };
}

/** What is decided holds no money back, and the same thing can be disputed anew. */
export function closed({ person, now }: { person: Person; now: string }) {
  return { amountHeld: '0', openKey: null, closedBy: person.id, closedAt: now };
}

type Deciding = { dispute: DisputeRow; answering: Answering };

async function decide(tx: Transaction, { dispute, answering }: Deciding): Promise<Decision> {
  const { form, person, now } = answering;
  const nothing = { acceptedUnits: null, acceptedAmount: null };
  if (form.step === 'ask') return { step: 'asked', state: 'waiting for partner', ...nothing };
  if (form.step === 'decline') return { step: 'declined', state: 'declined', ...nothing };
  const { units, amount } = await acceptedPart(tx, { dispute, form });
  const reason = (form.text || words.acceptedReason).slice(0, 500);
  const acceptedAmount = await acceptClaim(tx, { dispute, units, amount, reason, person, now });
  const state = form.step === 'accept' ? ('accepted' as const) : ('accepted in part' as const);
  return { step: state, state, acceptedUnits: amount === null ? units : null, acceptedAmount };
}

type Part = { units: number; amount: string | null };

/** All that is claimed, or the part that the form names: more than nothing and less than all. */
async function acceptedPart(
  tx: Transaction,
  { dispute, form }: { dispute: DisputeRow; form: AnswerForm },
): Promise<Part> {
  const claimed = Math.abs(dispute.claimed - dispute.stated);
  const inMoney = !isZero(dispute.amountClaimed);
  if (form.step === 'accept') return { units: claimed, amount: inMoney ? dispute.amountClaimed : null };
  if (!inMoney) {
    const { units } = form;
    if (units === undefined || units >= claimed)
      throw bad('units', `More than 0 and fewer than the ${claimed} claimed`);
    return { units, amount: null };
  }
  const { amount } = form;
  const [company] = await tx
    .select({ currency: companies.currency })
    .from(companies)
    .where(eq(companies.id, dispute.companyId));
  const fits =
    amount !== undefined &&
    compare(amount, '0') > 0 &&
    compare(amount, dispute.amountClaimed) < 0 &&
    isWholeMinor(amount, company?.currency ?? 'EUR');
  if (!fits) throw bad('amount', 'More than 0 and less than what is claimed');
  return { units: 0, amount };
}

function bad(path: string, message: string): Problem {
  return new Problem('not valid', { fields: [{ path, message }] });
}
