import { and, eq, exists, inArray, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { containerTypes } from '@/db/schema/containers';
import { shipmentLines, shipments } from '@/db/schema/shipments';
import { holdsText } from '../../http/search';
import { keyset } from '../../http/sort';
import { overdueBy } from '../shipments/list-shipments';
import { fromCompany, fromSite, toCompany, toSite } from '../shipments/shipment-rows';
import { laneColumns, onLaneOf } from './lane-ends';
import type { Asked, Found } from './list-differences';
import { linesByLoad, rowsOfLoads } from './load-rows';

/** Shipments that nobody has counted although more than the partner's days have passed since they left (RULES 5). */
export async function overdueRows(db: Reader, { query, after, limit, today }: Asked): Promise<Found[]> {
  const page = keyset({ by: shipments.leftOn, then: shipments.id, down: false, after });
  const rows = await db
    .select({ shipment: shipments, ...laneColumns })
    .from(shipments)
    .innerJoin(fromSite, eq(fromSite.id, shipments.fromSiteId))
    .innerJoin(toSite, eq(toSite.id, shipments.toSiteId))
    .innerJoin(fromCompany, eq(fromCompany.id, shipments.fromCompanyId))
    .innerJoin(toCompany, eq(toCompany.id, shipments.toCompanyId))
    .where(
      and(
        overdueBy(today),
        onLaneOf(query.partner),
        query.type ? exists(linesOfType(db, query.type)) : undefined,
        holdsText(query.search, shipments.reference),
        page.after,
      ),
    )
    .orderBy(...page.order)
    .limit(limit);
  const lines = await declaredOf(
    db,
    rows.map((row) => row.shipment.id),
  );
  return rowsOfLoads(
    db,
    rows.map((row) => ({
      id: row.shipment.id,
      kind: 'overdue',
      shipmentId: row.shipment.id,
      importId: null,
      reference: row.shipment.reference,
      since: row.shipment.leftOn,
      lane: row,
      lines: lines.get(row.shipment.id) ?? [],
    })),
  );
}

function linesOfType(db: Reader, typeCode: string) {
  return db
    .select({ one: sql`1` })
    .from(shipmentLines)
    .where(and(eq(shipmentLines.shipmentId, shipments.id), eq(shipmentLines.typeCode, typeCode)));
}

async function declaredOf(db: Reader, ids: readonly string[]): Promise<ReturnType<typeof linesByLoad>> {
  if (ids.length === 0) return new Map();
  const rows = await db
    .select({
      loadId: shipmentLines.shipmentId,
      typeCode: shipmentLines.typeCode,
      typeName: containerTypes.name,
      typeKind: containerTypes.kind,
      units: shipmentLines.declared,
    })
    .from(shipmentLines)
    .innerJoin(containerTypes, eq(containerTypes.code, shipmentLines.typeCode))
    .where(inArray(shipmentLines.shipmentId, [...ids]))
    .orderBy(sql`${shipmentLines.declared} desc`, shipmentLines.typeCode);
  return linesByLoad(rows);
}
