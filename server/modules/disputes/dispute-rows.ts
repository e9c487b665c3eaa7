import { eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { disputes } from '@/db/schema/differences';
import { shipments } from '@/db/schema/shipments';
import { statementLines, statements } from '@/db/schema/statements';
import type { DisputeRow } from '@/shared/contracts/disputes';
import { dayInZone, daysBetween } from '@/shared/domain/calendar';
import { formatMinor } from '@/shared/domain/money';
import { may, type Person, scopeOf } from '../../http/person';
import { shortened } from './own-line';

/** Disputes with what they are about, ready to be narrowed and sorted. */
export function selectDisputes(db: Reader) {
  return db
    .select({
      dispute: disputes,
      company: companies.name,
      currency: companies.currency,
      reference: shipments.reference,
      typeName: containerTypes.name,
      statementNumber: statements.number,
      statementMonth: statements.month,
      component: statementLines.component,
      lineAmount: statementLines.amount,
    })
    .from(disputes)
    .innerJoin(companies, eq(companies.id, disputes.companyId))
    .leftJoin(shipments, eq(shipments.id, disputes.shipmentId))
    .leftJoin(containerTypes, eq(containerTypes.code, disputes.typeCode))
    .leftJoin(statements, eq(statements.id, disputes.statementId))
    .leftJoin(statementLines, eq(statementLines.id, disputes.statementLineId))
    .$dynamic();
}

export type SelectedDispute = Awaited<ReturnType<typeof selectDisputes>>[number];
export type Seen = { person: Person; now: string; zone: string };

export function disputeRow(selected: SelectedDispute, seen: Seen): DisputeRow {
  const { dispute, currency, ...about } = selected;
  const waitingFor = waitingForOf(dispute.state);
  return {
    id: dispute.id,
    subject: dispute.subject,
    company: about.company,
    shipmentId: dispute.shipmentId,
    reference: about.reference,
    statementId: dispute.statementId,
    statementNumber: about.statementNumber,
    statementMonth: about.statementMonth,
    component: about.component,
    typeName: about.typeName,
    stated: dispute.stated,
    claimed: dispute.claimed,
    amountClaimed: money(dispute.amountClaimed, currency),
    amountHeld: money(dispute.amountHeld, currency),
    currency,
    reason: dispute.reason,
    state: dispute.state,
    openedAt: dispute.openedAt,
    lastWordAt: dispute.lastWordAt,
    waitingFor,
    days: daysSince(dispute.lastWordAt, seen),
    yourTurn: waitingFor !== null && isTurnOf(waitingFor, seen.person),
  };
}

export function money(amount: string, currency: string): string {
  return formatMinor(shortened(amount), currency);
}

function waitingForOf(state: DisputeRow['state']): DisputeRow['waitingFor'] {
  if (state === 'open') return 'operator';
  return state === 'waiting for partner' ? 'partner' : null;
}

function isTurnOf(side: 'operator' | 'partner', person: Person): boolean {
  return side === 'operator'
    ? scopeOf(person) === null && may(person, 'answer disputes')
    : scopeOf(person) !== null && may(person, 'open disputes');
}

function daysSince(instant: string, { now, zone }: Seen): number {
  return Math.max(0, daysBetween(dayInZone(instant, zone), dayInZone(now, zone)));
}
