import { and, asc, eq, inArray, or } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { people } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { differences, settlements } from '@/db/schema/differences';
import { files } from '@/db/schema/files';
import { countLines, countPhotos, counts, shipments } from '@/db/schema/shipments';
import type { StoredFile } from '@/shared/contracts/files';
import type { ShipmentDetail } from '@/shared/contracts/shipments';
import { Problem } from '@/shared/problems/problems';
import { type Person, scopeOf } from '../../http/person';
import { entriesOfShipment } from '../ledger/entries-of-shipment';
import { selectShipments, shipmentRows, withEnds } from './shipment-rows';

/** One shipment with everything behind it; of another company: as if it did not exist. */
export async function readShipment(
  db: Reader,
  { id, person }: { id: string; person: Person },
): Promise<ShipmentDetail> {
  const scope = scopeOf(person);
  const found = await selectShipments(db).where(
    and(
      eq(shipments.id, id),
      scope ? or(eq(shipments.fromCompanyId, scope), eq(shipments.toCompanyId, scope)) : undefined,
    ),
  );
  const selected = withEnds(found);
  const [row] = await shipmentRows(db, { selected, person });
  const shipment = selected[0]?.shipment;
  if (!row || !shipment) throw new Problem('not found');
  const [sender] = shipment.createdBy
    ? await db.select({ name: people.name }).from(people).where(eq(people.id, shipment.createdBy))
    : [];
  return {
    ...row,
    note: shipment.note,
    origin: shipment.origin,
    sentBy: sender?.name ?? null,
    counts: await countsOf(db, id),
    differences: await differencesOf(db, id),
    entries: await entriesOfShipment(db, id),
    timeZone: row.to.timeZone,
  };
}

async function countsOf(db: Reader, shipmentId: string): Promise<ShipmentDetail['counts']> {
  const rows = await db
    .select({ count: counts, by: people.name })
    .from(counts)
    .leftJoin(people, eq(people.id, counts.countedBy))
    .where(eq(counts.shipmentId, shipmentId))
    .orderBy(asc(counts.sequence));
  if (rows.length === 0) return [];
  const ids = rows.map((row) => row.count.id);
  const lines = await db
    .select({ line: countLines, typeName: containerTypes.name })
    .from(countLines)
    .innerJoin(containerTypes, eq(containerTypes.code, countLines.typeCode))
    .where(inArray(countLines.countId, ids))
    .orderBy(countLines.typeCode);
  const photos = await db
    .select({ countId: countPhotos.countId, file: files })
    .from(countPhotos)
    .innerJoin(files, eq(files.id, countPhotos.fileId))
    .where(inArray(countPhotos.countId, ids))
    .orderBy(files.id);
  return rows.map(({ count, by }) => ({
    id: count.id,
    sequence: count.sequence,
    countedOn: count.countedOn,
    countedAt: count.countedAt,
    by,
    source: count.source,
    note: count.note,
    lines: lines
      .filter(({ line }) => line.countId === count.id)
      .map(({ line: { countId: _, ...line }, typeName }) => ({ ...line, typeName })),
    photos: photos.filter((photo) => photo.countId === count.id).map(({ file }) => storedFileOf(file)),
  }));
}

function storedFileOf({ id, name, bytes, mediaType }: typeof files.$inferSelect): StoredFile {
  return { id, name, bytes, mediaType: mediaType as StoredFile['mediaType'] };
}

async function differencesOf(db: Reader, shipmentId: string): Promise<ShipmentDetail['differences']> {
  const rows = await db
    .select({ difference: differences, typeName: containerTypes.name })
    .from(differences)
    .innerJoin(containerTypes, eq(containerTypes.code, differences.typeCode))
    .where(eq(differences.shipmentId, shipmentId))
    .orderBy(differences.typeCode);
  if (rows.length === 0) return [];
  const settled = await db
    .select({ settlement: settlements, by: people.name })
    .from(settlements)
    .leftJoin(people, eq(people.id, settlements.settledBy))
    .where(
      inArray(
        settlements.differenceId,
        rows.map((row) => row.difference.id),
      ),
    )
    .orderBy(asc(settlements.id));
  return rows.map(({ difference, typeName }) => ({
    id: difference.id,
    typeCode: difference.typeCode,
    typeName,
    declared: difference.declared,
    counted: difference.counted,
    openUnits: difference.openUnits,
    state: difference.state,
    settlements: settled
      .filter(({ settlement }) => settlement.differenceId === difference.id)
      .map(({ settlement: { way, units, reason, settledAt }, by }) => ({
        way,
        units,
        reason,
        by,
        at: settledAt,
      })),
  }));
}
