import { eq } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { differences, settlements, type SettlementWay } from '@/db/schema/differences';
import { counts, shipments } from '@/db/schema/shipments';
import { Problem } from '@/shared/problems/problems';
import { recordEvents } from '../ledger/record-events';
import { postEntry } from '../ledger/post-entry';
import { refuseWhatCannotBe } from '../ledger/reckonable';
import { sitesById } from '../partners/sites';
import { worthOf } from './open-differences';
import { type Scene, settlementOf } from './settlement-ways';

export type Settling = {
  differenceId: string;
  way: SettlementWay;
  /** How many of the open units are settled this way; 1 to all of them. */
  units: number;
  reason: string;
  /** For "lost on the way": who bears it. */
  bearerCompanyId?: string;
  /** For "wrong type": the open difference of the other type on the same shipment. */
  swapWithId?: string;
  personId: string | null;
  disputeId?: string;
  /** The day of the settlement, in the receiver's time zone. */
  today: string;
  now: string;
};

export type DifferenceRow = typeof differences.$inferSelect;

/** Settles (part of) a difference (RULES 6): a journal entry with a reason and a person, and what the assessment must know. */
export async function settleDifference(tx: Transaction, settling: Settling): Promise<{ entryId: number }> {
  const difference = await lockedDifference(tx, settling.differenceId);
  refuseMoreThanOpen(difference, settling.units);
  const scene = await sceneOf(tx, difference, settling);
  const { entry, events, swapped } = await settlementOf(tx, scene);
  const entryId = await postEntry(tx, entry);
  await recordEvents(
    tx,
    events.map((event) => ({ ...event, entryId })),
  );
  await refuseWhatCannotBe(tx, { companyIds: events.map((event) => event.companyId), today: settling.today });
  for (const each of [difference, ...(swapped ? [swapped] : [])]) {
    await reduce(tx, { difference: each, scene, entryId });
  }
  return { entryId };
}

async function lockedDifference(tx: Transaction, id: string): Promise<DifferenceRow> {
  const [difference] = await tx.select().from(differences).where(eq(differences.id, id)).for('update');
  if (!difference) throw new Problem('not found');
  if (difference.state === 'settled')
    throw new Problem('already settled', { data: { at: difference.settledAt } });
  return difference;
}

export function refuseMoreThanOpen(difference: DifferenceRow, units: number): void {
  if (units > Math.abs(difference.openUnits)) {
    throw new Problem('more than open', { data: { open: Math.abs(difference.openUnits), asked: units } });
  }
}

async function sceneOf(tx: Transaction, difference: DifferenceRow, settling: Settling): Promise<Scene> {
  const [shipment] = await tx
    .select()
    .from(shipments)
    .where(eq(shipments.id, difference.shipmentId))
    .for('update');
  const [count] = await tx.select().from(counts).where(eq(counts.id, difference.countId));
  if (!shipment || !count) throw new Problem('not found');
  const sites = await sitesById(tx, [shipment.fromSiteId, shipment.toSiteId]);
  const from = sites.get(shipment.fromSiteId);
  const to = sites.get(shipment.toSiteId);
  if (!from || !to) throw new Problem('not found');
  return { difference, settling, shipment, count, from, to };
}

type Reduction = { difference: DifferenceRow; scene: Scene; entryId: number };

async function reduce(tx: Transaction, { difference, scene, entryId }: Reduction): Promise<void> {
  const { settling } = scene;
  const left = difference.openUnits - Math.sign(difference.openUnits) * settling.units;
  const partner = scene.to.company.kind === 'partner' ? scene.to.company : scene.from.company;
  const worth = {
    companyId: partner.id,
    currency: partner.currency,
    typeCode: difference.typeCode,
    day: difference.openedOn,
  };
  await tx
    .update(differences)
    .set({
      openUnits: left,
      atStake: await worthOf(tx, worth, Math.abs(left)),
      ...(left === 0 ? { state: 'settled' as const, settledAt: settling.now } : {}),
    })
    .where(eq(differences.id, difference.id));
  await tx.insert(settlements).values({
    id: newId(),
    differenceId: difference.id,
    way: settling.way,
    units: settling.units,
    bearerCompanyId: settling.bearerCompanyId ?? null,
    swappedWithId:
      difference.id === settling.differenceId ? (settling.swapWithId ?? null) : settling.differenceId,
    entryId,
    reason: settling.reason,
    settledBy: settling.personId,
    settledAt: settling.now,
  });
}
