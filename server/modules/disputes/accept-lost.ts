import { eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { assess } from '@/shared/domain/assessment';
import { firstDayOfMonth, lastDayOfMonth } from '@/shared/domain/calendar';
import { amountOfUnits } from '@/shared/domain/disputed-line';
import { Problem } from '@/shared/problems/problems';
import { putRightCount } from '../differences/put-right-count';
import { receiverDay } from '../differences/receiver-day';
import { refuseWhatCannotBe } from '../ledger/reckonable';
import { operatorDay } from '../partners/operator-day';
import { assessmentInput } from '../statements/assessment-input';
import type { Acceptance } from './accept-claim';
import { correctLosses } from './correct-losses';
import { giveCredit } from './give-credit';
import { disputedLineOf, type OwnLine } from './own-line';

type Accepting = { acceptance: Acceptance; own: OwnLine };

/**
 * Units billed as lost that were not. What the book wrote off is taken back; where the partner named the shipment on
 * which they came, its count is put right by as much. The month, assessed again, then charges fewer: that shows as its
 * correction. For what it still charges (losses by age have nothing to take back) the partner gets a credit.
 */
export async function acceptLost(tx: Transaction, { acceptance, own }: Accepting): Promise<void> {
  const { dispute, units, reason, person, now } = acceptance;
  const { companyId } = dispute;
  const typeCode = dispute.typeCode ?? '';
  const month = own.line.accountMonth;
  const asked = { companyId, typeCode, month };
  const before = await lostUnits(tx, asked);
  await correctLosses(tx, { ...asked, units, reason, disputeId: dispute.id, personId: person.id });
  if (dispute.shipmentId) {
    await putRightCount(tx, {
      shipmentId: dispute.shipmentId,
      typeCode,
      by: units,
      reason,
      disputeId: dispute.id,
      personId: person.id,
      now,
      today: await receiverDay(tx, { shipmentId: dispute.shipmentId, now }),
    });
  }
  const today = await operatorDay(tx, now);
  await refuseWhatCannotBe(tx, { companyIds: [companyId], today });
  const fewer = Math.max(0, before - (await lostUnits(tx, asked)));
  const stillCharged = units - Math.min(units, fewer);
  const amount = amountOfUnits(disputedLineOf(own), stillCharged);
  await giveCredit(tx, { dispute, amount, reason, personId: person.id, today, now });
}

type Asked = { companyId: string; typeCode: string; month: string };

/** Units that the month charges as lost, by all that is known now. */
async function lostUnits(tx: Transaction, { companyId, typeCode, month }: Asked): Promise<number> {
  const [partner] = await tx.select().from(companies).where(eq(companies.id, companyId));
  if (!partner) throw new Problem('not found');
  const period = { from: firstDayOfMonth(month), to: lastDayOfMonth(month) };
  const { lines } = assess(await assessmentInput(tx, { partner, ...period }));
  return lines.find((line) => line.containerType === typeCode)?.units.lost ?? 0;
}
