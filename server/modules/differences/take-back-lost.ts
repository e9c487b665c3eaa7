import { and, asc, eq, sql } from 'drizzle-orm';
import type { Reader, Transaction } from '@/db/client';
import { differences, settlements } from '@/db/schema/differences';
import { ledgerEntries, ledgerLines, partnerEvents } from '@/db/schema/ledger';
import { outsideAccount, transitAccount } from '../ledger/accounts';
import { postEntry } from '../ledger/post-entry';
import { recordEvents } from '../ledger/record-events';
import type { CountScene } from './corrected-count';
import type { PuttingRight } from './put-right-count';

type Taking = { scene: CountScene; putting: PuttingRight; most: number };
type Loss = { entryId: number; valueDate: string; units: number; bearerCompanyId: string | null };

/**
 * Units of this count and type that were settled as lost on the way are put back into transit on the day they were
 * written off, oldest first, and the events of that loss are corrected by as much. Returns how many.
 */
export async function takeBackLost(
  tx: Transaction,
  { scene, putting, most }: Taking,
): Promise<{ units: number; entryIds: number[] }> {
  const entryIds: number[] = [];
  let left = most;
  for (const loss of await lossesOf(tx, { scene, typeCode: putting.typeCode })) {
    const units = Math.min(left, loss.units - (await takenBack(tx, { ...loss, ...putting })));
    if (units <= 0) continue;
    entryIds.push(await reverse(tx, { scene, putting, loss, units }));
    left -= units;
  }
  return { units: most - left, entryIds };
}

function lossesOf(
  tx: Transaction,
  { scene, typeCode }: { scene: CountScene; typeCode: string },
): Promise<Loss[]> {
  return tx
    .select({
      entryId: settlements.entryId,
      valueDate: ledgerEntries.valueDate,
      units: settlements.units,
      bearerCompanyId: settlements.bearerCompanyId,
    })
    .from(settlements)
    .innerJoin(differences, eq(differences.id, settlements.differenceId))
    .innerJoin(ledgerEntries, eq(ledgerEntries.id, settlements.entryId))
    .where(
      and(
        eq(differences.countId, scene.count.id),
        eq(differences.typeCode, typeCode),
        eq(settlements.way, 'lost on the way'),
      ),
    )
    .orderBy(asc(settlements.entryId));
}

/** How much of a shipment's loss entry later entries have already mended. */
export async function takenBack(
  db: Reader,
  { entryId, shipmentId, typeCode }: { entryId: number; shipmentId: string; typeCode: string },
): Promise<number> {
  const [row] = await db
    .select({ units: sql<string>`coalesce(sum(${ledgerLines.units}), 0)` })
    .from(ledgerEntries)
    .innerJoin(ledgerLines, eq(ledgerLines.entryId, ledgerEntries.id))
    .where(
      and(
        eq(ledgerEntries.shipmentId, shipmentId),
        eq(ledgerEntries.correctsEntryId, entryId),
        eq(ledgerLines.typeCode, typeCode),
      ),
    );
  return Number(row?.units ?? 0);
}

type Reversal = { scene: CountScene; putting: PuttingRight; loss: Loss; units: number };

async function reverse(tx: Transaction, { scene, putting, loss, units }: Reversal): Promise<number> {
  const { typeCode, disputeId, reason, personId } = putting;
  const entryId = await postEntry(tx, {
    kind: 'correction',
    valueDate: loss.valueDate,
    moves: [
      {
        typeCode,
        from: await outsideAccount(tx, 'lost'),
        to: await transitAccount(tx, scene.shipment),
        units,
        ...(loss.bearerCompanyId ? { chargedCompanyId: loss.bearerCompanyId } : {}),
      },
    ],
    reason,
    personId,
    shipmentId: scene.shipment.id,
    disputeId,
    correctsEntryId: loss.entryId,
  });
  const written = await tx
    .select()
    .from(partnerEvents)
    .where(and(eq(partnerEvents.entryId, loss.entryId), eq(partnerEvents.typeCode, typeCode)));
  await recordEvents(
    tx,
    written.map((event) => ({
      companyId: event.companyId,
      date: event.date,
      typeCode,
      kind: 'corrected' as const,
      quantity: -units,
      correctsId: event.id,
      entryId,
      shipmentId: scene.shipment.id,
      disputeId,
      cause: `loss on the way of ${scene.shipment.reference} taken back`,
    })),
  );
  return entryId;
}
