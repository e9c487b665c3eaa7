import { and, asc, count, eq, inArray, sql } from 'drizzle-orm';
import { undecided } from '@/shared/contracts/disputes';
import type { Reader } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { disputes } from '@/db/schema/differences';
import { shipments } from '@/db/schema/shipments';
import type { MoneyOf, Today } from '@/shared/contracts/today';
import { formatMinor } from '@/shared/domain/money';
import { may, type Person, scopeOf } from '../../http/person';

/** Disputes that wait for this side's word, the longest waiting first. */
export async function disputesToAnswer(db: Reader, person: Person): Promise<Today['disputes']> {
  const scope = scopeOf(person);
  const isAsked = scope === null ? may(person, 'answer disputes') : may(person, 'open disputes');
  if (!isAsked) return null;
  const where =
    scope === null
      ? eq(disputes.state, 'open')
      : and(eq(disputes.companyId, scope), eq(disputes.state, 'waiting for partner'));
  const rows = await db
    .select({
      dispute: disputes,
      company: companies.name,
      currency: companies.currency,
      reference: shipments.reference,
      typeName: containerTypes.name,
    })
    .from(disputes)
    .innerJoin(companies, eq(companies.id, disputes.companyId))
    .leftJoin(shipments, eq(shipments.id, disputes.shipmentId))
    .leftJoin(containerTypes, eq(containerTypes.code, disputes.typeCode))
    .where(where)
    .orderBy(asc(disputes.lastWordAt), asc(disputes.id))
    .limit(6);
  const [all] = await db.select({ total: count() }).from(disputes).where(where);
  return {
    total: all?.total ?? 0,
    rows: rows.map(({ dispute, company, currency, reference, typeName }) => ({
      id: dispute.id,
      company,
      reference,
      typeName,
      stated: dispute.stated,
      claimed: dispute.claimed,
      lastWordAt: dispute.lastWordAt,
      held: { currency, amount: formatMinor(dispute.amountHeld, currency) },
    })),
  };
}

/** Undecided disputes and the money they hold, by currency. */
export async function moneyInDispute(db: Reader): Promise<{ disputes: number; held: MoneyOf[] }> {
  const rows = await db
    .select({
      currency: companies.currency,
      disputes: count(),
      held: sql<string>`sum(${disputes.amountHeld})`,
    })
    .from(disputes)
    .innerJoin(companies, eq(companies.id, disputes.companyId))
    .where(inArray(disputes.state, [...undecided]))
    .groupBy(companies.currency)
    .orderBy(companies.currency);
  return {
    disputes: rows.reduce((sum, row) => sum + row.disputes, 0),
    held: rows.map(({ currency, held }) => ({ currency, amount: formatMinor(held, currency) })),
  };
}
