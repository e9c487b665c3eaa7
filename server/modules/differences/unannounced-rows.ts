import { and, eq, exists, inArray, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { containerTypes } from '@/db/schema/containers';
import { receiptLines, receipts } from '@/db/schema/work';
import { holdsText } from '../../http/search';
import { keyset } from '../../http/sort';
import { fromCompany, fromSite, toCompany, toSite } from '../shipments/shipment-rows';
import { laneColumns, onLaneOf } from './lane-ends';
import type { Asked, Found } from './list-differences';
import { linesByLoad, rowsOfLoads } from './load-rows';

/** Receipts from files that belong to no shipment of the book. */
export async function unannouncedRows(db: Reader, { query, after, limit }: Asked): Promise<Found[]> {
  const page = keyset({ by: receipts.countedOn, then: receipts.id, down: false, after });
  const rows = await db
    .select({ receipt: receipts, ...laneColumns })
    .from(receipts)
    .innerJoin(fromSite, eq(fromSite.id, receipts.fromSiteId))
    .innerJoin(toSite, eq(toSite.id, receipts.toSiteId))
    .innerJoin(fromCompany, eq(fromCompany.id, fromSite.companyId))
    .innerJoin(toCompany, eq(toCompany.id, toSite.companyId))
    .where(
      and(
        eq(receipts.state, 'unannounced'),
        onLaneOf(query.partner),
        query.type ? exists(linesOfType(db, query.type)) : undefined,
        holdsText(query.search, receipts.reference),
        page.after,
      ),
    )
    .orderBy(...page.order)
    .limit(limit);
  const lines = await countedOf(
    db,
    rows.map((row) => row.receipt.id),
  );
  return rowsOfLoads(
    db,
    rows.map((row) => ({
      id: row.receipt.id,
      kind: 'unannounced',
      shipmentId: null,
      importId: row.receipt.importId,
      reference: row.receipt.reference,
      since: row.receipt.countedOn,
      lane: row,
      lines: lines.get(row.receipt.id) ?? [],
    })),
  );
}

function linesOfType(db: Reader, typeCode: string) {
  return db
    .select({ one: sql`1` })
    .from(receiptLines)
    .where(and(eq(receiptLines.receiptId, receipts.id), eq(receiptLines.typeCode, typeCode)));
}

async function countedOf(db: Reader, ids: readonly string[]): Promise<ReturnType<typeof linesByLoad>> {
  if (ids.length === 0) return new Map();
  const rows = await db
    .select({
      loadId: receiptLines.receiptId,
      typeCode: receiptLines.typeCode,
      typeName: containerTypes.name,
      typeKind: containerTypes.kind,
      units: receiptLines.counted,
    })
    .from(receiptLines)
    .innerJoin(containerTypes, eq(containerTypes.code, receiptLines.typeCode))
    .where(inArray(receiptLines.receiptId, [...ids]))
    .orderBy(sql`${receiptLines.counted} desc`, receiptLines.typeCode);
  return linesByLoad(rows);
}
