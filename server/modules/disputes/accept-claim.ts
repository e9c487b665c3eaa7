import { eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { statementLines, statements } from '@/db/schema/statements';
import { amountOfUnits } from '@/shared/domain/disputed-line';
import { Problem } from '@/shared/problems/problems';
import type { Person } from '../../http/person';
import { countedNow } from '../differences/corrected-count';
import { countScene } from '../differences/count-scene';
import { putRightCount } from '../differences/put-right-count';
import { receiverDay } from '../differences/receiver-day';
import { operatorDay } from '../partners/operator-day';
import { acceptLost } from './accept-lost';
import { giveCredit } from './give-credit';
import type { DisputeRow } from './locked-dispute';
import { disputedLineOf, type OwnLine } from './own-line';

/** What is accepted: so many of the disputed units, or so much money where only money is disputed. */
export type Acceptance = {
  dispute: DisputeRow;
  units: number;
  amount: string | null;
  reason: string;
  person: Person;
  now: string;
};

/** Posts what an accepted claim asks for. Returns the money it comes to, null for a count. */
export async function acceptClaim(tx: Transaction, acceptance: Acceptance): Promise<string | null> {
  if (acceptance.dispute.subject === 'count') {
    await acceptCount(tx, acceptance);
    return null;
  }
  const own = await lineOf(tx, acceptance.dispute);
  const line = disputedLineOf(own);
  const amount = acceptance.amount ?? amountOfUnits(line, acceptance.units);
  if (line.component === 'lost' && acceptance.amount === null) {
    await acceptLost(tx, { acceptance, own });
  } else {
    const { dispute, reason, person, now } = acceptance;
    const today = await operatorDay(tx, now);
    await giveCredit(tx, { dispute, amount, reason, personId: person.id, today, now });
  }
  return amount;
}

/** The count comes to what was agreed, whatever has been put right since the dispute was opened. */
async function acceptCount(
  tx: Transaction,
  { dispute, units, reason, person, now }: Acceptance,
): Promise<void> {
  const { shipmentId, countId, typeCode } = dispute;
  if (!shipmentId || !countId || !typeCode) throw new Problem('not found');
  const scene = await countScene(tx, { shipmentId, countId });
  const counted = await countedNow(tx, { shipmentId, countId, toSiteId: scene.to.id, typeCode });
  const agreed = dispute.stated + Math.sign(dispute.claimed - dispute.stated) * units;
  if (agreed === counted) return;
  await putRightCount(tx, {
    shipmentId,
    countId,
    typeCode,
    by: agreed - counted,
    reason,
    disputeId: dispute.id,
    personId: person.id,
    now,
    today: await receiverDay(tx, { shipmentId, now }),
  });
}

async function lineOf(tx: Transaction, dispute: DisputeRow): Promise<OwnLine> {
  const [row] = await tx
    .select({ statement: statements, line: statementLines })
    .from(statementLines)
    .innerJoin(statements, eq(statements.id, statementLines.statementId))
    .innerJoin(companies, eq(companies.id, statements.companyId))
    .where(eq(statementLines.id, dispute.statementLineId ?? ''));
  if (!row) throw new Problem('not found');
  return row;
}
