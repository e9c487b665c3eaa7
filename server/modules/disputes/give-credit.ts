import { desc, eq } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { credits, months } from '@/db/schema/statements';
import { firstDayOfMonth, monthOf, nextMonth } from '@/shared/domain/calendar';
import { isZero, negate } from '@/shared/domain/money';
import { refuseClosedMonth } from '../ledger/month-gate';
import type { DisputeRow } from './locked-dispute';

type Giving = {
  dispute: DisputeRow;
  /** Above 0, in the partner's favour. */
  amount: string;
  reason: string;
  personId: string;
  today: string;
  now: string;
};

/** Money agreed beside any movement: stands in the statement of the earliest month that is still open. */
export async function giveCredit(tx: Transaction, giving: Giving): Promise<void> {
  if (isZero(giving.amount)) return;
  const month = await earliestOpenMonth(tx, giving.today);
  await refuseClosedMonth(tx, firstDayOfMonth(month));
  await tx.insert(credits).values({
    id: newId(),
    companyId: giving.dispute.companyId,
    typeCode: giving.dispute.typeCode,
    amount: negate(giving.amount),
    reason: giving.reason.slice(0, 500),
    disputeId: giving.dispute.id,
    month,
    createdBy: giving.personId,
    createdAt: giving.now,
  });
}

/** Months close one after the other: the one after the last that is closed, or this month. */
async function earliestOpenMonth(tx: Transaction, today: string): Promise<string> {
  const [last] = await tx
    .select({ month: months.month })
    .from(months)
    .where(eq(months.state, 'closed'))
    .orderBy(desc(months.month))
    .limit(1);
  return last ? nextMonth(last.month) : monthOf(today);
}
