import { and, asc, eq, inArray, ne } from 'drizzle-orm';
import { alias } from 'drizzle-orm/mysql-core';
import type { Reader } from '@/db/client';
import { companies, people, sites } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { differences, settlements } from '@/db/schema/differences';
import { files } from '@/db/schema/files';
import { countPhotos, counts, shipments } from '@/db/schema/shipments';
import { receiptMatches, receipts } from '@/db/schema/work';
import type { ChosenWay, DifferenceDetail } from '@/shared/contracts/differences';
import type { StoredFile } from '@/shared/contracts/files';
import { daysBetween } from '@/shared/domain/calendar';
import { Problem } from '@/shared/problems/problems';
import { may, type Person } from '../../http/person';
import { foundOf, selectDifferences, type SelectedDifference } from './counted-rows';

type Asked = { id: string; person: Person; today: string };

export async function readDifference(db: Reader, { id, person, today }: Asked): Promise<DifferenceDetail> {
  const [selected] = await selectDifferences(db).where(eq(differences.id, id)).limit(1);
  const [row] = selected ? await foundOf(db, [selected]) : [];
  if (!selected || !row) throw new Problem('not found');
  const { difference } = selected;
  const [count, matching, settled, swaps] = await Promise.all([
    countOf(db, difference.countId),
    matchingOf(db, difference.shipmentId),
    settlementsOf(db, id),
    swapsOf(db, difference),
  ]);
  return {
    ...row,
    days: Math.max(0, daysBetween(row.since, today)),
    declared: difference.declared,
    counted: difference.counted,
    openUnits: difference.openUnits,
    count,
    matching,
    settlements: settled,
    swaps,
    bearers: bearersOf(selected),
    choices: may(person, 'settle differences')
      ? choicesOf({ openUnits: difference.openUnits, hasSwap: swaps.length > 0 })
      : [],
    timeZone: await zoneOf(db, difference.shipmentId),
  };
}

/** Nothing can be lost or turn up where more came than was declared. */
function choicesOf({ openUnits, hasSwap }: { openUnits: number; hasSwap: boolean }): ChosenWay[] {
  if (openUnits === 0) return [];
  return [
    'sender miscounted',
    'receiver miscounted',
    ...(openUnits < 0 ? (['lost on the way', 'turned up later'] as const) : []),
    ...(hasSwap ? (['wrong type'] as const) : []),
  ];
}

function bearersOf(row: SelectedDifference): DifferenceDetail['bearers'] {
  const sender = {
    companyId: row.fromCompanyId,
    company: row.fromCompany,
    kind: row.fromKind,
    side: 'sender' as const,
  };
  const receiver = {
    companyId: row.toCompanyId,
    company: row.toCompany,
    kind: row.toKind,
    side: 'receiver' as const,
  };
  return sender.companyId === receiver.companyId ? [sender] : [sender, receiver];
}

async function countOf(db: Reader, countId: string): Promise<DifferenceDetail['count']> {
  const [row] = await db
    .select({ count: counts, by: people.name })
    .from(counts)
    .leftJoin(people, eq(people.id, counts.countedBy))
    .where(eq(counts.id, countId));
  if (!row) throw new Problem('not found');
  const photos = await db
    .select({ id: files.id, name: files.name, bytes: files.bytes, mediaType: files.mediaType })
    .from(countPhotos)
    .innerJoin(files, eq(files.id, countPhotos.fileId))
    .where(eq(countPhotos.countId, countId))
    .orderBy(asc(files.id));
  const { countedOn, countedAt, source, note } = row.count;
  return { countedOn, countedAt, source, note, by: row.by, photos: photos as StoredFile[] };
}

function matchingOf(db: Reader, shipmentId: string): Promise<DifferenceDetail['matching']> {
  return db
    .select({ rule: receiptMatches.rule, why: receiptMatches.why, receipt: receipts.reference })
    .from(receiptMatches)
    .innerJoin(receipts, eq(receipts.id, receiptMatches.receiptId))
    .where(
      and(eq(receiptMatches.shipmentId, shipmentId), inArray(receiptMatches.state, ['matched', 'accepted'])),
    )
    .orderBy(asc(receiptMatches.id));
}

const swapped = alias(differences, 'swapped');
const swappedType = alias(containerTypes, 'swapped_type');

function settlementsOf(db: Reader, differenceId: string): Promise<DifferenceDetail['settlements']> {
  return db
    .select({
      id: settlements.id,
      way: settlements.way,
      units: settlements.units,
      bearer: companies.name,
      swappedWith: swappedType.name,
      reason: settlements.reason,
      by: people.name,
      at: settlements.settledAt,
      entryId: settlements.entryId,
    })
    .from(settlements)
    .leftJoin(companies, eq(companies.id, settlements.bearerCompanyId))
    .leftJoin(people, eq(people.id, settlements.settledBy))
    .leftJoin(swapped, eq(swapped.id, settlements.swappedWithId))
    .leftJoin(swappedType, eq(swappedType.code, swapped.typeCode))
    .where(eq(settlements.differenceId, differenceId))
    .orderBy(asc(settlements.id));
}

async function swapsOf(
  db: Reader,
  difference: SelectedDifference['difference'],
): Promise<DifferenceDetail['swaps']> {
  const others = await db
    .select({ id: differences.id, typeName: containerTypes.name, openUnits: differences.openUnits })
    .from(differences)
    .innerJoin(containerTypes, eq(containerTypes.code, differences.typeCode))
    .where(
      and(
        eq(differences.shipmentId, difference.shipmentId),
        eq(differences.state, 'open'),
        ne(differences.id, difference.id),
      ),
    );
  return others.filter((other) => Math.sign(other.openUnits) === -Math.sign(difference.openUnits));
}

async function zoneOf(db: Reader, shipmentId: string): Promise<string> {
  const [site] = await db
    .select({ timeZone: sites.timeZone })
    .from(shipments)
    .innerJoin(sites, eq(sites.id, shipments.toSiteId))
    .where(eq(shipments.id, shipmentId));
  return site?.timeZone ?? 'UTC';
}
