import { and, eq, gte, inArray, lte } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { shipments } from '@/db/schema/shipments';
import type { receiptMatches } from '@/db/schema/work';
import { addDays } from '@/shared/domain/calendar';
import type { Reconciliation, ReconciliationInput } from '@/shared/domain/reconciliation';
import { readReference } from '@/shared/domain/reconciliation/references';
import { windowDays } from './plan-matches';

type Plan = { importId: string; input: ReconciliationInput; outcome: Reconciliation };
type Found = { rows: (typeof receiptMatches.$inferInsert)[]; receiptIds: Set<string> };

/**
 * Receipts left over whose reference and lane are those of a shipment that someone counted before: they are told
 * beside that count and post nothing, else the same units would come in twice.
 */
export async function countedBefore(tx: Transaction, { importId, input, outcome }: Plan): Promise<Found> {
  const left = new Set(outcome.unannounced);
  const receipts = input.receipts.filter(({ id, ref }) => left.has(id) && readReference(ref) !== null);
  const found: Found = { rows: [], receiptIds: new Set() };
  if (receipts.length === 0) return found;
  const counted = await countedShipments(tx, receipts);
  for (const { id: receiptId, ref, from, to, date } of receipts) {
    const held = counted
      .get(keyOf({ from, to, reference: ref ?? '' }))
      ?.find(({ leftOn }) => leftOn <= date && date <= addDays(leftOn, windowDays));
    if (!held) continue;
    found.receiptIds.add(receiptId);
    found.rows.push({
      id: newId(),
      importId,
      groupId: newId(),
      receiptId,
      shipmentId: held.id,
      state: 'not posted',
      rule: 'same reference',
      score: 1000,
      why: '',
      problem: { code: 'already counted', data: {} },
    });
  }
  return found;
}

const keyOf = ({ from, to, reference }: { from: string; to: string; reference: string }): string =>
  JSON.stringify([from, to, readReference(reference)?.core]);

async function countedShipments(tx: Transaction, receipts: ReconciliationInput['receipts']) {
  const days = receipts.map(({ date }) => date).sort();
  const rows = await tx
    .select({
      id: shipments.id,
      reference: shipments.reference,
      from: shipments.fromSiteId,
      to: shipments.toSiteId,
      leftOn: shipments.leftOn,
    })
    .from(shipments)
    .where(
      and(
        eq(shipments.state, 'counted'),
        gte(shipments.leftOn, addDays(days[0] ?? '', -windowDays)),
        lte(shipments.leftOn, days.at(-1) ?? ''),
        inArray(shipments.toSiteId, [...new Set(receipts.map(({ to }) => to))]),
      ),
    );
  const byKey = new Map<string, typeof rows>();
  for (const row of rows) {
    const same = byKey.get(keyOf(row));
    if (same) same.push(row);
    else byKey.set(keyOf(row), [row]);
  }
  return byKey;
}
