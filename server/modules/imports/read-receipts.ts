import { and, asc, eq, gt, inArray } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { shipments } from '@/db/schema/shipments';
import { receiptMatches, receipts } from '@/db/schema/work';
import type { ImportReceipt } from '@/shared/contracts/import-results';
import { cursor, cutPage } from '../../http/page';
import { receiptPapers } from './read-papers';

type Asked = {
  importId: string;
  after?: string | undefined;
  limit: number;
  state: ImportReceipt['state'];
};

/** Receipts of a file that matched nothing, in one state, in the order they were kept. */
export async function pageOfReceipts(
  db: Reader,
  { importId, after, limit, state }: Asked,
): Promise<{ rows: ImportReceipt[]; next: string | null }> {
  const seen = cursor(after, 1);
  const found = await db
    .select()
    .from(receipts)
    .where(
      and(
        eq(receipts.importId, importId),
        eq(receipts.state, state),
        seen ? gt(receipts.id, seen[0]) : undefined,
      ),
    )
    .orderBy(asc(receipts.id))
    .limit(limit + 1);
  const { rows: page, next } = cutPage(found, limit, ({ id }) => [id]);
  const papers = await receiptPapers(
    db,
    page.map(({ id }) => id),
  );
  const firsts = await firstOnes(
    db,
    page.flatMap(({ duplicateOf }) => duplicateOf ?? []),
  );
  const ships = await shipmentsOf(
    db,
    page.map(({ id, duplicateOf }) => duplicateOf ?? id),
  );
  return {
    rows: page.flatMap((row) => {
      const paper = papers.get(row.id);
      if (!paper) return [];
      const first = row.duplicateOf === null ? null : (firsts.get(row.duplicateOf) ?? null);
      return [
        { ...paper, state, rowNo: row.rowNo, first, shipment: ships.get(row.duplicateOf ?? row.id) ?? null },
      ];
    }),
    next,
  };
}

async function firstOnes(db: Reader, ids: readonly string[]) {
  if (ids.length === 0) return new Map<string, ImportReceipt['first']>();
  const rows = await db
    .select()
    .from(receipts)
    .where(inArray(receipts.id, [...ids]));
  return new Map(
    rows.map(({ id, reference, countedOn, rowNo }) => [id, { reference, day: countedOn, rowNo }]),
  );
}

/** The shipment that a receipt was counted for or booked as, or that someone had counted before. */
async function shipmentsOf(db: Reader, receiptIds: readonly string[]) {
  if (receiptIds.length === 0) return new Map<string, ImportReceipt['shipment']>();
  const rows = await db
    .select({ receiptId: receiptMatches.receiptId, id: shipments.id, reference: shipments.reference })
    .from(receiptMatches)
    .innerJoin(shipments, eq(shipments.id, receiptMatches.shipmentId))
    .where(
      and(
        inArray(receiptMatches.receiptId, [...receiptIds]),
        inArray(receiptMatches.state, ['matched', 'accepted', 'not posted']),
      ),
    );
  return new Map(rows.map(({ receiptId, ...shipment }) => [receiptId, shipment]));
}
