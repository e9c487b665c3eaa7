import { eq } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { people } from '@/db/schema/companies';
import { countLines, countPhotos, counts, shipmentLines, shipments } from '@/db/schema/shipments';
import { type BadField, Problem } from '@/shared/problems/problems';
import { openDifferences } from '../differences/open-differences';
import { siteAccount, transitAccount } from '../ledger/accounts';
import { postEntry } from '../ledger/post-entry';
import { recordEvents } from '../ledger/record-events';
import { type SiteWithCompany, sitesById } from '../partners/sites';
import { refuseUnknownTypes } from './send-shipment';

export type CountedLine = { typeCode: string; counted: number; damaged: number; dirty: number };
export type Counting = {
  shipmentId: string;
  /** The day of the count, in the receiver's time zone. */
  countedOn: string;
  lines: readonly CountedLine[];
  photoIds?: readonly string[];
  note?: string;
  source: 'person' | 'import' | 'automatic';
  personId: string | null;
  now: string;
};

type Shipment = typeof shipments.$inferSelect;
export type Counted = { id: string; shipment: Shipment; from: SiteWithCompany; to: SiteWithCompany };

/**
 * The receiver counts: units go from transit to the receiver's site, the assessment gets its events, and what
 * differs from the declaration opens differences. Whoever comes second is told who counted and when.
 */
export async function countShipment(tx: Transaction, counting: Counting): Promise<Counted> {
  const shipment = await lockedShipment(tx, counting.shipmentId);
  const declared = await tx.select().from(shipmentLines).where(eq(shipmentLines.shipmentId, shipment.id));
  refuseImpossible(counting, { shipment, declared });
  await refuseUnknownTypes(
    tx,
    counting.lines.map((line) => line.typeCode),
  );
  const sites = await sitesById(tx, [shipment.fromSiteId, shipment.toSiteId]);
  const from = sites.get(shipment.fromSiteId);
  const to = sites.get(shipment.toSiteId);
  if (!from || !to) throw new Problem('not found');
  const id = await insertCount(tx, counting);
  const counted = { id, shipment, from, to };
  await postCount(tx, { counting, counted });
  await tx
    .update(shipments)
    .set({
      state: 'counted',
      countedAt: counting.now,
      countedOn: counting.countedOn,
      countedBy: counting.personId,
    })
    .where(eq(shipments.id, shipment.id));
  await openDifferences(tx, { counted, counting, declared });
  return counted;
}

/** Locks the shipment's row; refuses when it has been counted. */
async function lockedShipment(tx: Transaction, id: string): Promise<Shipment> {
  const [shipment] = await tx.select().from(shipments).where(eq(shipments.id, id)).for('update');
  if (!shipment) throw new Problem('not found');
  if (shipment.state === 'on the way') return shipment;
  const [person] = shipment.countedBy
    ? await tx.select({ name: people.name }).from(people).where(eq(people.id, shipment.countedBy))
    : [];
  throw new Problem('already counted', { data: { by: person?.name ?? null, at: shipment.countedAt } });
}

type Declared = { typeCode: string; declared: number };

function refuseImpossible(
  counting: Counting,
  { shipment, declared }: { shipment: Shipment; declared: Declared[] },
): void {
  const fields: BadField[] = [];
  if (counting.countedOn < shipment.leftOn)
    fields.push({ path: 'countedOn', message: 'Before the day it left' });
  const types = counting.lines.map((line) => line.typeCode);
  counting.lines.forEach((line, index) => {
    if (types.indexOf(line.typeCode) !== index)
      fields.push({ path: `lines.${index}.typeCode`, message: 'The same type twice' });
    if (line.damaged > line.counted)
      fields.push({ path: `lines.${index}.damaged`, message: 'More damaged than counted' });
    if (line.dirty > line.counted)
      fields.push({ path: `lines.${index}.dirty`, message: 'More to clean than counted' });
  });
  for (const line of declared) {
    if (!types.includes(line.typeCode))
      fields.push({ path: 'lines', message: `${line.typeCode} is not counted yet` });
  }
  if (fields.length > 0) throw new Problem('not valid', { fields });
}

async function insertCount(tx: Transaction, counting: Counting): Promise<string> {
  const id = newId();
  await tx.insert(counts).values({
    id,
    shipmentId: counting.shipmentId,
    sequence: 1,
    countedOn: counting.countedOn,
    source: counting.source,
    note: counting.note ?? '',
    countedBy: counting.personId,
    countedAt: counting.now,
  });
  if (counting.lines.length > 0)
    await tx.insert(countLines).values(counting.lines.map((line) => ({ countId: id, ...line })));
  const photos = counting.photoIds ?? [];
  if (photos.length > 0)
    await tx.insert(countPhotos).values(photos.map((fileId) => ({ countId: id, fileId })));
  return id;
}

type Posting = { counting: Counting; counted: Counted };

async function postCount(tx: Transaction, { counting, counted }: Posting): Promise<void> {
  const arrived = counting.lines.filter((line) => line.counted > 0);
  if (arrived.length === 0) return;
  const { shipment, to } = counted;
  const transit = await transitAccount(tx, shipment);
  const site = await siteAccount(tx, to);
  const entryId = await postEntry(tx, {
    kind: 'counted',
    valueDate: counting.countedOn,
    moves: arrived.map((line) => ({ typeCode: line.typeCode, from: transit, to: site, units: line.counted })),
    personId: counting.personId,
    shipmentId: shipment.id,
    countId: counted.id,
  });
  await recordEvents(
    tx,
    arrived.flatMap((line) => eventsOfLine(line, { counting, counted, entryId })),
  );
}

/** RULES 2: issued to a partner that receives, returned by a partner that sent; one of each between two partners. */
function eventsOfLine(line: CountedLine, { counting, counted, entryId }: Posting & { entryId: number }) {
  const { from, to, shipment } = counted;
  const event = (
    companyId: string,
    kind: 'issued' | 'returned' | 'damaged' | 'cleaned',
    quantity: number,
  ) => ({
    companyId,
    date: counting.countedOn,
    typeCode: line.typeCode,
    kind,
    quantity,
    entryId,
    countId: counted.id,
    shipmentId: shipment.id,
  });
  const issued = to.company.kind === 'partner' ? [event(to.companyId, 'issued', line.counted)] : [];
  if (from.company.kind !== 'partner') return issued;
  return [
    ...issued,
    event(from.companyId, 'returned', line.counted),
    event(from.companyId, 'damaged', line.damaged),
    event(from.companyId, 'cleaned', line.dirty),
  ];
}
