import { asc, eq, inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { shipmentLines, shipments } from '@/db/schema/shipments';
import { receiptLines, receiptMatches, receipts } from '@/db/schema/work';
import { Problem } from '@/shared/problems/problems';
import { text } from '@/shared/text/catalogue';
import { sitesById } from '../partners/sites';
import { countShipment } from '../shipments/count-shipment';
import { allotUnits, sumOfLines } from './allot-units';

type Posting = { groupId: string; personId: string | null; now: string };
export type MatchRow = typeof receiptMatches.$inferSelect;

/**
 * Counts the shipments of one group by its receipts: one count for each shipment, with the units of all the receipts,
 * on the day of the last of them. Returns the rows of the group.
 */
export async function postGroup(tx: Transaction, { groupId, personId, now }: Posting): Promise<MatchRow[]> {
  const pairs = await tx
    .select()
    .from(receiptMatches)
    .where(eq(receiptMatches.groupId, groupId))
    .for('update');
  const scene = await readScene(tx, pairs);
  const countedOn =
    scene.receipts
      .map((receipt) => receipt.countedOn)
      .sort()
      .at(-1) ?? '';
  const shares = allotUnits(scene.shipments, sumOfLines(scene.counted));
  for (const shipment of scene.shipments) {
    await countShipment(tx, {
      shipmentId: shipment.id,
      countedOn,
      lines: shares.get(shipment.id) ?? [],
      note: await noteOf(tx, { shipment, scene }),
      source: 'import',
      personId,
      now,
    });
  }
  await tx
    .update(receipts)
    .set({ state: 'matched', rule: pairs[0]?.rule ?? null })
    .where(
      inArray(
        receipts.id,
        scene.receipts.map(({ id }) => id),
      ),
    );
  return pairs;
}

type Scene = Awaited<ReturnType<typeof readScene>>;

async function readScene(tx: Transaction, pairs: readonly MatchRow[]) {
  const receiptIds = [...new Set(pairs.map(({ receiptId }) => receiptId))];
  const shipmentIds = [...new Set(pairs.map(({ shipmentId }) => shipmentId))];
  const papers = await tx.select().from(receipts).where(inArray(receipts.id, receiptIds)).for('update');
  if (papers.length === 0 || papers.some(({ state }) => state !== 'waiting' && state !== 'unannounced'))
    throw new Problem('state changed');
  const counted = await tx.select().from(receiptLines).where(inArray(receiptLines.receiptId, receiptIds));
  const heads = await tx
    .select()
    .from(shipments)
    .where(inArray(shipments.id, shipmentIds))
    .orderBy(asc(shipments.reference), asc(shipments.id));
  const declared = await tx
    .select()
    .from(shipmentLines)
    .where(inArray(shipmentLines.shipmentId, shipmentIds));
  return {
    receipts: papers,
    counted: counted.map(({ receiptId: _of, ...line }) => line),
    shipments: heads.map((head) => ({
      ...head,
      lines: declared.filter((line) => line.shipmentId === head.id),
    })),
  };
}

/** What is out of the ordinary about the count: another place in the file, or several shipments at once. */
async function noteOf(
  tx: Transaction,
  { shipment, scene }: { shipment: Scene['shipments'][number]; scene: Scene },
): Promise<string> {
  const others = scene.shipments.filter(({ id }) => id !== shipment.id).map(({ reference }) => reference);
  const elsewhere = scene.receipts.find(({ toSiteId }) => toSiteId !== shipment.toSiteId);
  const site = elsewhere ? (await sitesById(tx, [elsewhere.toSiteId])).get(elsewhere.toSiteId) : undefined;
  return [
    site ? text.imports.countNotes.otherSite(site.name) : '',
    others.length > 0 ? text.imports.countNotes.several(others.join(', ')) : '',
  ]
    .filter((note) => note !== '')
    .join(' ')
    .slice(0, 300);
}
