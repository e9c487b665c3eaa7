import { and, asc, eq, inArray, sql } from 'drizzle-orm';
import type { Reader, Transaction } from '@/db/client';
import { accounts, ledgerEntries, ledgerLines, partnerEvents } from '@/db/schema/ledger';
import type { counts, shipments } from '@/db/schema/shipments';
import { Problem } from '@/shared/problems/problems';
import type { PartnerEvent } from '../ledger/record-events';
import type { SiteWithCompany } from '../partners/sites';

/** A count with its shipment and both ends. */
export type CountScene = {
  shipment: typeof shipments.$inferSelect;
  count: typeof counts.$inferSelect;
  from: SiteWithCompany;
  to: SiteWithCompany;
};

type CountedType = { shipmentId: string; countId: string; toSiteId: string; typeCode: string };

/** What a count comes to by the book: the units it brought to the receiver's site, corrections included. */
export async function countedNow(db: Reader, asked: CountedType): Promise<number> {
  const [row] = await db
    .select({
      units: sql<string>`coalesce(sum(case when ${ledgerLines.toAccountId} = ${accounts.id} then ${ledgerLines.units} else -${ledgerLines.units} end), 0)`,
    })
    .from(ledgerEntries)
    .innerJoin(ledgerLines, eq(ledgerLines.entryId, ledgerEntries.id))
    .innerJoin(
      accounts,
      and(
        eq(accounts.siteId, asked.toSiteId),
        sql`${accounts.id} in (${ledgerLines.fromAccountId}, ${ledgerLines.toAccountId})`,
      ),
    )
    .where(
      and(
        eq(ledgerEntries.shipmentId, asked.shipmentId),
        eq(ledgerEntries.countId, asked.countId),
        eq(ledgerLines.typeCode, asked.typeCode),
      ),
    );
  return Number(row?.units ?? 0);
}

/** The entry of the count, or of the shipment's departure where nothing at all was counted. */
export async function entryOfCount(
  tx: Transaction,
  by: { countId: string; shipmentId: string },
): Promise<number> {
  const first = async (countId?: string): Promise<number | undefined> => {
    const [entry] = await tx
      .select({ id: ledgerEntries.id })
      .from(ledgerEntries)
      .where(
        and(
          eq(ledgerEntries.shipmentId, by.shipmentId),
          countId ? eq(ledgerEntries.countId, countId) : undefined,
        ),
      )
      .orderBy(asc(ledgerEntries.id))
      .limit(1);
    return entry?.id;
  };
  const entryId = (await first(by.countId)) ?? (await first());
  if (entryId === undefined) throw new Problem('not found');
  return entryId;
}

type Correcting = CountScene & { typeCode: string; by: number; right: number; disputeId?: string };

/** Corrects the issued and returned events of a count; where there was none (counted 0), writes it on the count's day. */
export async function correctedEvents(tx: Transaction, scene: Correcting): Promise<PartnerEvent[]> {
  const { count, shipment, typeCode, by, right, disputeId } = scene;
  if (right < 0) throw belowZero();
  const held = await tx
    .select()
    .from(partnerEvents)
    .where(
      and(
        eq(partnerEvents.shipmentId, shipment.id),
        eq(partnerEvents.countId, count.id),
        eq(partnerEvents.typeCode, typeCode),
        inArray(partnerEvents.kind, ['issued', 'returned']),
      ),
    )
    .orderBy(asc(partnerEvents.id));
  const cause = `count of ${shipment.reference} put right to ${right}`;
  return sidesOf(scene).map(({ companyId, kind }) => {
    const event = {
      companyId,
      date: count.countedOn,
      typeCode,
      shipmentId: shipment.id,
      countId: count.id,
      cause,
      ...(disputeId ? { disputeId } : {}),
    };
    const named = held.find((row) => row.companyId === companyId && row.kind === kind);
    if (named) return { ...event, kind: 'corrected' as const, quantity: by, correctsId: named.id };
    if (by < 0) throw belowZero();
    return { ...event, kind, quantity: by };
  });
}

function belowZero(): Problem {
  return new Problem('cannot be reckoned', { data: { why: 'a count cannot be put right below zero' } });
}

/** Which partners a count concerns, and how (RULES 2). */
export function sidesOf({
  from,
  to,
}: Pick<CountScene, 'from' | 'to'>): { companyId: string; kind: 'issued' | 'returned' }[] {
  return [
    ...(to.company.kind === 'partner' ? [{ companyId: to.companyId, kind: 'issued' as const }] : []),
    ...(from.company.kind === 'partner' ? [{ companyId: from.companyId, kind: 'returned' as const }] : []),
  ];
}
