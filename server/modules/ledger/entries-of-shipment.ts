import { asc, eq, inArray } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { people } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { ledgerEntries, ledgerLines } from '@/db/schema/ledger';
import type { ShipmentDetail } from '@/shared/contracts/shipments';
import { accountNames, placeOf } from './account-names';

/** The journal behind a shipment, oldest first. */
export async function entriesOfShipment(db: Reader, shipmentId: string): Promise<ShipmentDetail['entries']> {
  const entries = await db
    .select({ entry: ledgerEntries, by: people.name })
    .from(ledgerEntries)
    .leftJoin(people, eq(people.id, ledgerEntries.personId))
    .where(eq(ledgerEntries.shipmentId, shipmentId))
    .orderBy(asc(ledgerEntries.id));
  if (entries.length === 0) return [];
  const lines = await db
    .select({ line: ledgerLines, typeName: containerTypes.name })
    .from(ledgerLines)
    .innerJoin(containerTypes, eq(containerTypes.code, ledgerLines.typeCode))
    .where(
      inArray(
        ledgerLines.entryId,
        entries.map(({ entry }) => entry.id),
      ),
    )
    .orderBy(asc(ledgerLines.entryId), asc(ledgerLines.lineNo));
  const names = await accountNames(
    db,
    lines.flatMap(({ line }) => [line.fromAccountId, line.toAccountId]),
  );
  return entries.map(({ entry, by }) => ({
    id: entry.id,
    kind: entry.kind,
    valueDate: entry.valueDate,
    recordedAt: entry.recordedAt,
    by,
    reason: entry.reason,
    lines: lines
      .filter(({ line }) => line.entryId === entry.id)
      .map(({ line, typeName }) => ({
        typeName,
        units: line.units,
        from: placeOf(names.get(line.fromAccountId)),
        to: placeOf(names.get(line.toAccountId)),
      })),
  }));
}
