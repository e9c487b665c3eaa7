import { and, eq, exists, inArray, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { containerTypes } from '@/db/schema/containers';
import { shipmentLines, shipments } from '@/db/schema/shipments';
import { holdsText } from '../../http/search';
import { keyset } from '../../http/sort';
import {
  endsOf,
  fromCompany,
  fromSite,
  laneColumns,
  onLaneOf,
  partnerOf,
  toCompany,
  toSite,
} from './lane-ends';
import type { Asked, Found } from './list-differences';
import { worthOfLines } from './worth-of-lines';

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
        eq(shipments.state, 'on the way'),
        sql`datediff(${today}, ${shipments.leftOn}) > if(${toCompany.kind} = 'partner', ${toCompany.overdueAfterDays}, ${fromCompany.overdueAfterDays})`,
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
  const loads = rows.map((row) => ({
    ...partnerOf(row),
    day: row.shipment.leftOn,
    lines: lines.get(row.shipment.id) ?? [],
  }));
  const worth = await worthOfLines(db, loads);
  return rows.map((row, index) => ({
    id: row.shipment.id,
    kind: 'overdue' as const,
    shipmentId: row.shipment.id,
    importId: null,
    reference: row.shipment.reference,
    ...endsOf(row),
    lines: [...(loads[index]?.lines ?? [])],
    units: (loads[index]?.lines ?? []).reduce((total, line) => total + line.units, 0),
    since: row.shipment.leftOn,
    atStake: worth[index] ?? '0',
    currency: loads[index]?.currency ?? '',
    state: 'open' as const,
    ways: [],
    disputeId: null,
  }));
}

function linesOfType(db: Reader, typeCode: string) {
  return db
    .select({ one: sql`1` })
    .from(shipmentLines)
    .where(and(eq(shipmentLines.shipmentId, shipments.id), eq(shipmentLines.typeCode, typeCode)));
}

async function declaredOf(db: Reader, ids: readonly string[]): Promise<Map<string, Found['lines']>> {
  const lines = new Map<string, Found['lines']>(ids.map((id) => [id, []]));
  if (ids.length === 0) return lines;
  const rows = await db
    .select({
      shipmentId: shipmentLines.shipmentId,
      typeCode: shipmentLines.typeCode,
      typeName: containerTypes.name,
      typeKind: containerTypes.kind,
      units: shipmentLines.declared,
    })
    .from(shipmentLines)
    .innerJoin(containerTypes, eq(containerTypes.code, shipmentLines.typeCode))
    .where(inArray(shipmentLines.shipmentId, [...ids]))
    .orderBy(sql`${shipmentLines.declared} desc`, shipmentLines.typeCode);
  for (const { shipmentId, ...line } of rows) lines.get(shipmentId)?.push(line);
  return lines;
}
