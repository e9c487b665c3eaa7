import { and, asc, eq, or } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies, sites } from '@/db/schema/companies';
import { shipmentLines, shipments } from '@/db/schema/shipments';
import { receiptLines, receipts } from '@/db/schema/work';
import type { ReconciliationInput } from '@/shared/domain/reconciliation';

type Shipments = ReconciliationInput['shipments'];
type Receipts = ReconciliationInput['receipts'];
type Line = { type: string; quantity: number };

/** Shipments of the whole book that nobody has counted, as the comparison takes them. */
export async function openShipments(db: Reader): Promise<Shipments> {
  const heads = await db
    .select({
      id: shipments.id,
      ref: shipments.reference,
      from: shipments.fromSiteId,
      to: shipments.toSiteId,
      date: shipments.leftOn,
    })
    .from(shipments)
    .where(eq(shipments.state, 'on the way'));
  const lines = await db
    .select({
      id: shipmentLines.shipmentId,
      type: shipmentLines.typeCode,
      quantity: shipmentLines.declared,
    })
    .from(shipmentLines)
    .innerJoin(shipments, eq(shipments.id, shipmentLines.shipmentId))
    .where(eq(shipments.state, 'on the way'));
  return withLines(heads, lines).filter((shipment) => shipment.lines.length > 0);
}

/** The import's own receipts, and those that no earlier comparison found a shipment for. */
export async function openReceipts(db: Reader, importId: string): Promise<Receipts> {
  const open = or(
    eq(receipts.state, 'unannounced'),
    and(eq(receipts.state, 'waiting'), eq(receipts.importId, importId)),
  );
  const heads = await db
    .select({
      id: receipts.id,
      ref: receipts.reference,
      from: receipts.fromSiteId,
      to: receipts.toSiteId,
      date: receipts.countedOn,
    })
    .from(receipts)
    .where(open);
  const lines = await db
    .select({ id: receiptLines.receiptId, type: receiptLines.typeCode, quantity: receiptLines.counted })
    .from(receiptLines)
    .innerJoin(receipts, eq(receipts.id, receiptLines.receiptId))
    .where(open);
  return withLines(heads, lines);
}

function withLines<Head extends { id: string }>(
  heads: readonly Head[],
  lines: readonly (Line & { id: string })[],
): (Head & { lines: Line[] })[] {
  const byId = new Map<string, Line[]>(heads.map(({ id }) => [id, []]));
  for (const { id, type, quantity } of lines) if (quantity > 0) byId.get(id)?.push({ type, quantity });
  return heads.map((head) => ({ ...head, lines: byId.get(head.id) ?? [] }));
}

/** The zone of the operator's first site: what concerns the whole book goes by its day. */
export async function operatorZone(db: Reader): Promise<string> {
  const [site] = await db
    .select({ timeZone: sites.timeZone })
    .from(sites)
    .innerJoin(companies, eq(companies.id, sites.companyId))
    .where(and(eq(companies.kind, 'operator'), eq(sites.active, true)))
    .orderBy(asc(sites.id))
    .limit(1);
  return site?.timeZone ?? 'UTC';
}
