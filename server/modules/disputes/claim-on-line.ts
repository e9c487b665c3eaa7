import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { shipments } from '@/db/schema/shipments';
import { statements, statementSteps } from '@/db/schema/statements';
import { amountOfUnits, claimableWay, isClaimableAmount } from '@/shared/domain/disputed-line';
import { Problem } from '@/shared/problems/problems';
import { disputes as words } from '@/shared/text/en/disputes';
import { blockOf, disputedLineOf, ownLine, type OwnLine } from './own-line';
import type { Claim, Opening } from './open-dispute';

/** A line of an issued statement that is still open to objection; what is claimed is held out of "due now". */
export async function claimOnLine(tx: Transaction, opening: Opening): Promise<Claim> {
  const { form, person, now } = opening;
  const named = { companyId: person.companyId, lineId: form.lineId ?? '' };
  const found = await ownLine(tx, named);
  await tx
    .select({ id: statements.id })
    .from(statements)
    .where(eq(statements.id, found.statement.id))
    .for('update');
  const own = await ownLine(tx, named);
  const { statement, line } = own;
  const blocked = await blockOf(tx, { statement, now });
  if (blocked) throw refusal(blocked, statement);
  if (form.shipmentId) await refuseForeignShipment(tx, { ...opening, shipmentId: form.shipmentId });
  const claimed = claimOf(own, form);
  await tx
    .update(statements)
    .set({ answer: 'disputed', answeredBy: person.id, answeredAt: now })
    .where(eq(statements.id, statement.id));
  await tx
    .insert(statementSteps)
    .values({ statementId: statement.id, step: 'disputed', personId: person.id, at: now });
  return {
    ...claimed,
    subject: 'statement line',
    statementId: statement.id,
    statementLineId: line.id,
    typeCode: line.typeCode,
    shipmentId: form.shipmentId ?? null,
    openKey: `line ${line.id}`,
  };
}

type Claimed = Pick<Claim, 'stated' | 'claimed' | 'amountClaimed' | 'amountHeld'>;

function claimOf(own: OwnLine, form: Opening['form']): Claimed {
  const line = disputedLineOf(own);
  const way = claimableWay(line);
  if (way === null) {
    const amount = form.tooMuch ?? '';
    if (amount === '' || !isClaimableAmount(line, amount))
      throw bad('tooMuch', 'Say how much of the amount is too much: more than 0, no more than the line');
    return { stated: line.quantity, claimed: line.quantity, amountClaimed: amount, amountHeld: amount };
  }
  const { claimed } = form;
  if (claimed === undefined) throw bad('claimed', 'Say how many it should be');
  const inFavour = way === 'fewer' ? claimed < line.quantity : claimed > line.quantity;
  if (!inFavour) throw bad('claimed', way === 'fewer' ? `Below ${line.quantity}` : `Above ${line.quantity}`);
  const amountHeld = amountOfUnits(line, Math.abs(claimed - line.quantity));
  return { stated: line.quantity, claimed, amountClaimed: '0', amountHeld };
}

function bad(path: string, message: string): Problem {
  return new Problem('not valid', { fields: [{ path, message }] });
}

function refusal(blocked: 'confirmed' | 'objection over', statement: OwnLine['statement']): Problem {
  const { objectionUntil, answer, answeredAt: at } = statement;
  if (blocked === 'confirmed')
    return new Problem('already answered', { data: { by: words.yourCompany, state: answer, at } });
  return new Problem('objection over', { data: { until: objectionUntil } });
}

/** Lost units can only have come back on a counted shipment that the company itself sent. */
async function refuseForeignShipment(
  tx: Transaction,
  { person, shipmentId }: Opening & { shipmentId: string },
): Promise<void> {
  const [shipment] = await tx
    .select({ id: shipments.id })
    .from(shipments)
    .where(
      and(
        eq(shipments.id, shipmentId),
        eq(shipments.fromCompanyId, person.companyId),
        eq(shipments.state, 'counted'),
      ),
    );
  if (!shipment) throw bad('shipmentId', 'Choose a counted shipment that your company sent');
}
