import { and, desc, eq, inArray } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { sites } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { disputes } from '@/db/schema/differences';
import { countLines, shipmentLines, shipments } from '@/db/schema/shipments';
import type { CountSubject, LineSubject } from '@/shared/contracts/disputes';
import { claimableWay } from '@/shared/domain/disputed-line';
import type { Person } from '../../http/person';
import { countedNow } from '../differences/corrected-count';
import { ownCount } from './claim-on-count';
import { money } from './dispute-rows';
import { blockOf, disputedLineOf, ownLine } from './own-line';

type Asked = { person: Person; now: string };

/** The first count of an own shipment, type by type, as it stands by the book. */
export async function readCountSubject(
  db: Reader,
  { shipmentId, person }: Asked & { shipmentId: string },
): Promise<CountSubject> {
  const { shipment, count } = await ownCount(db, { companyId: person.companyId, shipmentId });
  const names = await siteNames(db, [shipment.fromSiteId, shipment.toSiteId]);
  const declared = await db.select().from(shipmentLines).where(eq(shipmentLines.shipmentId, shipmentId));
  const counted = await db.select().from(countLines).where(eq(countLines.countId, count.id));
  const codes = [...new Set([...declared, ...counted].map((line) => line.typeCode))].sort();
  const types = await typesOf(db, codes);
  const lines = await Promise.all(
    codes.map(async (typeCode) => ({
      typeCode,
      typeName: types.get(typeCode)?.name ?? typeCode,
      declared: declared.find((line) => line.typeCode === typeCode)?.declared ?? 0,
      counted: await countedNow(db, { shipmentId, countId: count.id, toSiteId: shipment.toSiteId, typeCode }),
      openDisputeId: await openDisputeOf(db, `count ${count.id} ${typeCode}`, person),
    })),
  );
  return {
    shipmentId,
    countId: count.id,
    reference: shipment.reference,
    from: names.get(shipment.fromSiteId) ?? '',
    to: names.get(shipment.toSiteId) ?? '',
    countedOn: count.countedOn,
    lines,
  };
}

/** A line of an own issued statement, with what stands in the way of disputing it. */
export async function readLineSubject(
  db: Reader,
  { lineId, person, now }: Asked & { lineId: string },
): Promise<LineSubject> {
  const own = await ownLine(db, { companyId: person.companyId, lineId });
  const { statement, line } = own;
  const openDisputeId = await openDisputeOf(db, `line ${line.id}`, person);
  const type = (await typesOf(db, line.typeCode ? [line.typeCode] : [])).get(line.typeCode ?? '');
  return {
    lineId,
    statementId: statement.id,
    statementNumber: statement.number,
    statementMonth: statement.month,
    accountMonth: line.accountMonth,
    component: line.component,
    typeCode: line.typeCode,
    typeName: type?.name ?? line.typeCode,
    typeKind: type?.kind ?? null,
    quantity: line.quantity,
    amount: money(line.amount, statement.currency),
    currency: statement.currency,
    way: claimableWay(disputedLineOf(own)),
    objectionUntil: statement.objectionUntil,
    blocked: openDisputeId ? 'in dispute' : await blockOf(db, { statement, now }),
    openDisputeId,
    shipments: line.component === 'lost' ? await countedShipments(db, person.companyId) : [],
  };
}

async function openDisputeOf(db: Reader, openKey: string, person: Person): Promise<string | null> {
  const [open] = await db
    .select({ id: disputes.id })
    .from(disputes)
    .where(and(eq(disputes.openKey, openKey), eq(disputes.companyId, person.companyId)));
  return open?.id ?? null;
}

function countedShipments(db: Reader, companyId: string): Promise<LineSubject['shipments']> {
  return db
    .select({ id: shipments.id, reference: shipments.reference, leftOn: shipments.leftOn })
    .from(shipments)
    .where(and(eq(shipments.fromCompanyId, companyId), eq(shipments.state, 'counted')))
    .orderBy(desc(shipments.leftOn), desc(shipments.id))
    .limit(60);
}

type TypeWords = { code: string; name: string; kind: NonNullable<LineSubject['typeKind']> };

async function typesOf(db: Reader, codes: readonly string[]): Promise<Map<string, TypeWords>> {
  if (codes.length === 0) return new Map();
  const types = await db
    .select({ code: containerTypes.code, name: containerTypes.name, kind: containerTypes.kind })
    .from(containerTypes)
    .where(inArray(containerTypes.code, [...codes]));
  return new Map(types.map((type) => [type.code, type]));
}

async function siteNames(db: Reader, ids: readonly string[]): Promise<Map<string, string>> {
  const rows = await db
    .select({ id: sites.id, name: sites.name })
    .from(sites)
    .where(inArray(sites.id, [...ids]));
  return new Map(rows.map((site) => [site.id, site.name]));
}
