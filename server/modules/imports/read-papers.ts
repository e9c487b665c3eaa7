import { inArray } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { shipmentLines, shipments } from '@/db/schema/shipments';
import { receiptLines, receipts } from '@/db/schema/work';
import type { MatchPaper } from '@/shared/contracts/import-results';
import { sitesById } from '../partners/sites';

/** Shipments with their declared lines, by id, as one side of a match. */
export async function shipmentPapers(db: Reader, ids: readonly string[]): Promise<Map<string, MatchPaper>> {
  if (ids.length === 0) return new Map();
  const wanted = [...new Set(ids)];
  const heads = await db.select().from(shipments).where(inArray(shipments.id, wanted));
  const lines = await db.select().from(shipmentLines).where(inArray(shipmentLines.shipmentId, wanted));
  return papersOf(
    db,
    heads.map((head) => ({
      ...head,
      day: head.leftOn,
      lines: lines
        .filter(({ shipmentId }) => shipmentId === head.id)
        .map(({ typeCode, declared }) => ({ typeCode, units: declared })),
    })),
  );
}

/** Receipts with their counted lines, by id, as the other side. */
export async function receiptPapers(db: Reader, ids: readonly string[]): Promise<Map<string, MatchPaper>> {
  if (ids.length === 0) return new Map();
  const wanted = [...new Set(ids)];
  const heads = await db.select().from(receipts).where(inArray(receipts.id, wanted));
  const lines = await db.select().from(receiptLines).where(inArray(receiptLines.receiptId, wanted));
  return papersOf(
    db,
    heads.map((head) => ({
      ...head,
      day: head.countedOn,
      lines: lines
        .filter(({ receiptId }) => receiptId === head.id)
        .map(({ typeCode, counted }) => ({ typeCode, units: counted })),
    })),
  );
}

type Head = {
  id: string;
  reference: string | null;
  fromSiteId: string;
  toSiteId: string;
  day: string;
  lines: MatchPaper['lines'];
};

async function papersOf(db: Reader, heads: readonly Head[]): Promise<Map<string, MatchPaper>> {
  const sites = await sitesById(
    db,
    heads.flatMap(({ fromSiteId, toSiteId }) => [fromSiteId, toSiteId]),
  );
  const nameOf = (id: string): string => sites.get(id)?.name ?? '';
  return new Map(
    heads.map(({ id, reference, fromSiteId, toSiteId, day, lines }) => [
      id,
      { id, reference, from: nameOf(fromSiteId), to: nameOf(toSiteId), day, lines },
    ]),
  );
}
