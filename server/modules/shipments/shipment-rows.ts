import { and, eq, inArray, isNotNull, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/mysql-core';
import type { Reader } from '@/db/client';
import { companies, sites } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { differences } from '@/db/schema/differences';
import { accounts, ledgerEntries, ledgerLines } from '@/db/schema/ledger';
import { countLines, counts, shipmentLines, shipments } from '@/db/schema/shipments';
import type { ShipmentRow } from '@/shared/contracts/shipments';
import { may, type Person } from '../../http/person';

export const fromSite = alias(sites, 'from_site');
export const toSite = alias(sites, 'to_site');
export const fromCompany = alias(companies, 'from_company');
export const toCompany = alias(companies, 'to_company');

type Line = ShipmentRow['lines'][number];

export type SelectedShipment = {
  shipment: typeof shipments.$inferSelect;
  fromSite: typeof sites.$inferSelect;
  toSite: typeof sites.$inferSelect;
  fromCompany: typeof companies.$inferSelect;
  toCompany: typeof companies.$inferSelect;
};

/**
 * Shipments with both ends, ready to be narrowed and sorted. Left joins, although both ends are always there: with
 * inner ones MariaDB begins at the small tables and sorts the whole history for one page (6.6 times as long at ten
 * times the history, in `npm run bench growth`).
 */
export function selectShipments(db: Reader) {
  return db
    .select({ shipment: shipments, fromSite, toSite, fromCompany, toCompany })
    .from(shipments)
    .leftJoin(fromSite, eq(fromSite.id, shipments.fromSiteId))
    .leftJoin(toSite, eq(toSite.id, shipments.toSiteId))
    .leftJoin(fromCompany, eq(fromCompany.id, shipments.fromCompanyId))
    .leftJoin(toCompany, eq(toCompany.id, shipments.toCompanyId))
    .$dynamic();
}

type Selected = Awaited<ReturnType<typeof selectShipments>>[number];

/** The selected rows with both their ends, which no shipment is without. */
export function withEnds(selected: readonly Selected[]): SelectedShipment[] {
  return selected.map(
    ({ shipment, fromSite: from, toSite: to, fromCompany: sender, toCompany: receiver }) => {
      if (!from || !to || !sender || !receiver) throw new Error(`shipment ${shipment.id} has lost an end`);
      return { shipment, fromSite: from, toSite: to, fromCompany: sender, toCompany: receiver };
    },
  );
}

/** Rows as screens show them, with their lines. */
export async function shipmentRows(
  db: Reader,
  { selected, person }: { selected: readonly SelectedShipment[]; person: Person },
): Promise<ShipmentRow[]> {
  const lines = await linesOf(
    db,
    selected.map((row) => row.shipment.id),
  );
  return selected.map((row) => ({
    id: row.shipment.id,
    reference: row.shipment.reference,
    contents: row.shipment.contents,
    from: endOf(row.fromSite, row.fromCompany),
    to: endOf(row.toSite, row.toCompany),
    leftOn: row.shipment.leftOn,
    expectedOn: row.shipment.expectedOn,
    state: row.shipment.state,
    countedOn: row.shipment.countedOn,
    lines: lines.get(row.shipment.id) ?? [],
    direction: directionOf(row, person),
    mayCount: mayCount(row.shipment, person),
  }));
}

/** Only the receiver counts, and only once. */
export function mayCount(shipment: { toCompanyId: string; state: string }, person: Person): boolean {
  return (
    shipment.state === 'on the way' &&
    shipment.toCompanyId === person.companyId &&
    may(person, 'count shipments')
  );
}

function endOf(site: typeof sites.$inferSelect, company: typeof companies.$inferSelect) {
  return {
    siteId: site.id,
    site: site.name,
    companyId: company.id,
    company: company.name,
    timeZone: site.timeZone,
  };
}

function directionOf({ shipment }: SelectedShipment, person: Person): ShipmentRow['direction'] {
  if (shipment.toCompanyId === person.companyId) return 'in';
  return shipment.fromCompanyId === person.companyId ? 'out' : 'between others';
}

async function linesOf(db: Reader, ids: readonly string[]): Promise<Map<string, Line[]>> {
  const lines = new Map<string, Line[]>(ids.map((id) => [id, []]));
  if (ids.length === 0) return lines;
  const [declared, counted, open, putRight] = await Promise.all([
    declaredOf(db, ids),
    countedOf(db, ids),
    openOf(db, ids),
    putRightBy(db, ids),
  ]);
  const keyed = new Map(counted.map((row) => [`${row.shipmentId} ${row.typeCode}`, row]));
  const openBy = new Map(open.map((row) => [`${row.shipmentId} ${row.typeCode}`, row.openUnits]));
  const isCounted = new Set(counted.map((row) => row.shipmentId));
  const put = (head: (typeof declared)[number], units: number): void => {
    const key = `${head.shipmentId} ${head.typeCode}`;
    const found = keyed.get(key);
    keyed.delete(key);
    const first = isCounted.has(head.shipmentId) ? Number(found?.counted ?? 0) : null;
    lines.get(head.shipmentId)?.push({
      typeCode: head.typeCode,
      typeName: head.typeName,
      unitsPerStack: head.unitsPerStack,
      declared: units,
      counted: first,
      countedNow: first === null ? null : first + (putRight.get(key) ?? 0),
      damaged: Number(found?.damaged ?? 0),
      dirty: Number(found?.dirty ?? 0),
      openUnits: openBy.get(key) ?? 0,
    });
  };
  for (const row of declared) put(row, row.declared);
  for (const row of [...keyed.values()]) put({ ...row, declared: 0 }, 0);
  return lines;
}

const typeColumns = { typeName: containerTypes.name, unitsPerStack: containerTypes.unitsPerStack };

function declaredOf(db: Reader, ids: readonly string[]) {
  return db
    .select({
      shipmentId: shipmentLines.shipmentId,
      typeCode: shipmentLines.typeCode,
      declared: shipmentLines.declared,
      ...typeColumns,
    })
    .from(shipmentLines)
    .innerJoin(containerTypes, eq(containerTypes.code, shipmentLines.typeCode))
    .where(inArray(shipmentLines.shipmentId, [...ids]))
    .orderBy(shipmentLines.shipmentId, sql`${shipmentLines.declared} desc`, shipmentLines.typeCode);
}

/** All counts of a shipment together: what turned up later stands in a count of its own. */
function countedOf(db: Reader, ids: readonly string[]) {
  return db
    .select({
      shipmentId: counts.shipmentId,
      typeCode: countLines.typeCode,
      counted: sql<string>`sum(${countLines.counted})`,
      damaged: sql<string>`sum(${countLines.damaged})`,
      dirty: sql<string>`sum(${countLines.dirty})`,
      ...typeColumns,
    })
    .from(counts)
    .innerJoin(countLines, eq(countLines.countId, counts.id))
    .innerJoin(containerTypes, eq(containerTypes.code, countLines.typeCode))
    .where(inArray(counts.shipmentId, [...ids]))
    .groupBy(counts.shipmentId, countLines.typeCode, containerTypes.name, containerTypes.unitsPerStack);
}

function openOf(db: Reader, ids: readonly string[]) {
  return db
    .select({
      shipmentId: differences.shipmentId,
      typeCode: differences.typeCode,
      openUnits: differences.openUnits,
    })
    .from(differences)
    .where(and(inArray(differences.shipmentId, [...ids]), eq(differences.state, 'open')));
}

/** By how many units the counts of each shipment and type were put right since: entries that correct a count's entry. */
async function putRightBy(db: Reader, ids: readonly string[]): Promise<Map<string, number>> {
  const rows = await db
    .select({
      shipmentId: ledgerEntries.shipmentId,
      typeCode: ledgerLines.typeCode,
      units: sql<string>`sum(case when ${ledgerLines.toAccountId} = ${accounts.id} then ${ledgerLines.units} else -${ledgerLines.units} end)`,
    })
    .from(ledgerEntries)
    .innerJoin(shipments, eq(shipments.id, ledgerEntries.shipmentId))
    .innerJoin(accounts, eq(accounts.siteId, shipments.toSiteId))
    .innerJoin(
      ledgerLines,
      and(
        eq(ledgerLines.entryId, ledgerEntries.id),
        sql`${accounts.id} in (${ledgerLines.fromAccountId}, ${ledgerLines.toAccountId})`,
      ),
    )
    .where(
      and(
        inArray(ledgerEntries.shipmentId, [...ids]),
        isNotNull(ledgerEntries.countId),
        isNotNull(ledgerEntries.correctsEntryId),
      ),
    )
    .groupBy(ledgerEntries.shipmentId, ledgerLines.typeCode);
  return new Map(rows.map((row) => [`${row.shipmentId} ${row.typeCode}`, Number(row.units)]));
}
