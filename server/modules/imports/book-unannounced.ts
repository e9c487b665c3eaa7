import { and, eq } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { shipments } from '@/db/schema/shipments';
import { receiptLines, receiptMatches, receipts } from '@/db/schema/work';
import { Problem } from '@/shared/problems/problems';
import { text } from '@/shared/text/catalogue';
import { sitesById } from '../partners/sites';
import { countShipment } from '../shipments/count-shipment';
import { sendShipment } from '../shipments/send-shipment';
import type { Skipped } from './decide-suggestions';
import { keptProblem } from './import-marks';

type Booking = { receipts: readonly string[]; personId: string; now: string };
type Receipt = typeof receipts.$inferSelect;
const mostReference = 40;

/**
 * Books receipts that nobody declared: a shipment that declares nothing is counted at what came, so that each type
 * stands open as "counted and not declared".
 */
export async function bookUnannounced(
  tx: Transaction,
  { receipts: ids, personId, now }: Booking,
): Promise<{ booked: number; skipped: Skipped[] }> {
  const skipped: Skipped[] = [];
  const asked = [...new Set(ids)];
  for (const id of asked) {
    try {
      await tx.transaction((inner) => bookOne(inner, { id, personId, now }));
    } catch (error) {
      skipped.push({ id, problem: keptProblem(error) });
    }
  }
  if (skipped.some(({ problem }) => problem.code === 'not found')) throw new Problem('not found');
  return { booked: asked.length - skipped.length, skipped };
}

type One = { id: string; personId: string; now: string };

async function bookOne(tx: Transaction, { id, personId, now }: One): Promise<void> {
  const [receipt] = await tx.select().from(receipts).where(eq(receipts.id, id)).for('update');
  if (!receipt) throw new Problem('not found');
  if (receipt.state !== 'unannounced') throw new Problem('state changed');
  const shipmentId = await sendNothing(tx, { receipt, personId, now });
  const lines = await tx.select().from(receiptLines).where(eq(receiptLines.receiptId, id));
  await countShipment(tx, {
    shipmentId,
    countedOn: receipt.countedOn,
    lines: lines.map(({ receiptId: _of, ...line }) => line),
    source: 'import',
    personId,
    now,
  });
  await tx.update(receipts).set({ state: 'booked' }).where(eq(receipts.id, id));
  await tx
    .update(receiptMatches)
    .set({ state: 'fell away' })
    .where(and(eq(receiptMatches.receiptId, id), eq(receiptMatches.state, 'offered')));
  await tx.insert(receiptMatches).values({
    id: newId(),
    importId: receipt.importId,
    groupId: newId(),
    receiptId: id,
    shipmentId,
    state: 'accepted',
    rule: 'unannounced',
    score: 1000,
    why: '',
    decidedBy: personId,
    decidedAt: now,
  });
}

type Nothing = { receipt: Receipt; personId: string; now: string };

async function sendNothing(tx: Transaction, { receipt, personId, now }: Nothing): Promise<string> {
  const from = (await sitesById(tx, [receipt.fromSiteId])).get(receipt.fromSiteId);
  if (!from) throw new Problem('not found');
  const reference = await freeReference(tx, { companyId: from.companyId, wanted: receipt.reference });
  const { id } = await sendShipment(tx, {
    ...(reference === null ? {} : { reference }),
    contents: from.company.kind === 'operator' ? 'empties' : 'fulls',
    fromSiteId: receipt.fromSiteId,
    toSiteId: receipt.toSiteId,
    leftOn: receipt.countedOn,
    expectedOn: receipt.countedOn,
    lines: [],
    note: receipt.reference ? text.imports.bookedNote(receipt.reference) : '',
    origin: 'unannounced',
    importId: receipt.importId,
    personId,
    now,
  });
  return id;
}

/** The receipt's own reference when the sender has no shipment under it; null has one made. */
async function freeReference(
  tx: Transaction,
  { companyId, wanted }: { companyId: string; wanted: string | null },
): Promise<string | null> {
  if (wanted === null || wanted.length > mostReference) return null;
  const [held] = await tx
    .select({ id: shipments.id })
    .from(shipments)
    .where(and(eq(shipments.fromCompanyId, companyId), eq(shipments.reference, wanted)));
  return held ? null : wanted;
}
