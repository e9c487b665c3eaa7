import { and, eq, gt, inArray, lt, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { differences, disputes, settlements } from '@/db/schema/differences';
import { shipments } from '@/db/schema/shipments';
import { formatMinor } from '@/shared/domain/money';
import { holdsText } from '../../http/search';
import { keyset } from '../../http/sort';
import { fromCompany, fromSite, toCompany, toSite } from '../shipments/shipment-rows';
import { endsOf, laneColumns, onLaneOf } from './lane-ends';
import type { Asked, Found } from './list-differences';

/** Differences between declaration and count, open or settled. */
export async function countedRows(db: Reader, asked: Asked): Promise<Found[]> {
  const { query, after, limit } = asked;
  const down = query.state === 'settled';
  const page = keyset({ by: differences.openedOn, then: differences.id, down, after });
  const rows = await selectDifferences(db)
    .where(
      and(
        eq(differences.state, query.state),
        kindCondition(query.kind),
        onLaneOf(query.partner),
        query.type ? eq(differences.typeCode, query.type) : undefined,
        holdsText(query.search, shipments.reference),
        page.after,
      ),
    )
    .orderBy(...page.order)
    .limit(limit);
  return foundOf(db, rows);
}

function kindCondition(kind: Asked['query']['kind']) {
  if (kind === 'fewer') return lt(differences.counted, differences.declared);
  return kind === 'more' ? gt(differences.counted, differences.declared) : undefined;
}

/** Differences with shipment, both ends, type and currency, ready to be narrowed. */
export function selectDifferences(db: Reader) {
  return db
    .select({
      difference: differences,
      reference: shipments.reference,
      typeName: containerTypes.name,
      typeKind: containerTypes.kind,
      currency: companies.currency,
      ...laneColumns,
    })
    .from(differences)
    .innerJoin(shipments, eq(shipments.id, differences.shipmentId))
    .innerJoin(fromSite, eq(fromSite.id, shipments.fromSiteId))
    .innerJoin(toSite, eq(toSite.id, shipments.toSiteId))
    .innerJoin(fromCompany, eq(fromCompany.id, shipments.fromCompanyId))
    .innerJoin(toCompany, eq(toCompany.id, shipments.toCompanyId))
    .innerJoin(companies, eq(companies.id, differences.partnerId))
    .innerJoin(containerTypes, eq(containerTypes.code, differences.typeCode))
    .$dynamic();
}

export type SelectedDifference = Awaited<ReturnType<typeof selectDifferences>>[number];

export async function foundOf(db: Reader, rows: readonly SelectedDifference[]): Promise<Found[]> {
  const ways = await waysOf(db, rows);
  const disputed = await disputesOf(db, rows);
  return rows.map((row) => {
    const { difference, typeName, currency } = row;
    const gap = difference.counted - difference.declared;
    const units = Math.abs(difference.state === 'open' ? difference.openUnits : gap);
    return {
      id: difference.id,
      kind: gap < 0 ? 'fewer' : 'more',
      shipmentId: difference.shipmentId,
      importId: null,
      reference: row.reference,
      ...endsOf(row),
      lines: [{ typeCode: difference.typeCode, typeName, typeKind: row.typeKind, units }],
      units,
      since: difference.openedOn,
      atStake: formatMinor(difference.atStake.replace(/\.?0+$/, ''), currency),
      currency,
      state: difference.state,
      ways: [...(ways.get(difference.id) ?? [])],
      disputeId: disputed.get(`${difference.countId} ${difference.typeCode}`) ?? null,
    };
  });
}

async function waysOf(
  db: Reader,
  rows: readonly SelectedDifference[],
): Promise<Map<string, Set<Found['ways'][number]>>> {
  const ways = new Map(rows.map((row) => [row.difference.id, new Set<Found['ways'][number]>()]));
  if (rows.length === 0) return ways;
  const held = await db
    .select({ differenceId: settlements.differenceId, way: settlements.way })
    .from(settlements)
    .where(inArray(settlements.differenceId, [...ways.keys()]));
  for (const { differenceId, way } of held) ways.get(differenceId)?.add(way);
  return ways;
}

async function disputesOf(db: Reader, rows: readonly SelectedDifference[]): Promise<Map<string, string>> {
  if (rows.length === 0) return new Map();
  const held = await db
    .select({ id: disputes.id, countId: disputes.countId, typeCode: disputes.typeCode })
    .from(disputes)
    .where(
      and(
        inArray(
          disputes.shipmentId,
          rows.map((row) => row.difference.shipmentId),
        ),
        sql`${disputes.openKey} is not null`,
      ),
    );
  return new Map(held.map((row) => [`${row.countId} ${row.typeCode}`, row.id]));
}
