import { eq } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { differences, settlements } from '@/db/schema/differences';
import type { SettlementWay } from '@/shared/contracts/differences';
import { postEntry } from '../ledger/post-entry';
import { refuseWhatCannotBe } from '../ledger/reckonable';
import { recordEvents } from '../ledger/record-events';
import { countScene } from './count-scene';
import { type DifferenceRow, lockedDifference, refuseMoreThanOpen } from './locked-difference';
import { type Scene, settlementOf } from './settlement-ways';
import { worthOf } from './worth';

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

export type Settled = { entryId: number; openUnits: number };

/** Settles (part of) a difference (RULES 6): a journal entry with a reason and a person, and what the assessment must know. */
export async function settleDifference(tx: Transaction, settling: Settling): Promise<Settled> {
  const difference = await lockedDifference(tx, settling.differenceId);
  refuseMoreThanOpen(difference, settling.units);
  const scene = { ...(await countScene(tx, difference)), difference, settling };
  const { entry, events, swapped } = await settlementOf(tx, scene);
  const entryId = await postEntry(tx, entry);
  await recordEvents(
    tx,
    events.map((event) => ({ ...event, entryId })),
  );
  await refuseWhatCannotBe(tx, { companyIds: events.map((event) => event.companyId), today: settling.today });
  const openUnits = await reduce(tx, { difference, scene, entryId });
  if (swapped) await reduce(tx, { difference: swapped, scene, entryId });
  return { entryId, openUnits };
}

type Reduction = { difference: DifferenceRow; scene: Scene; entryId: number };

/** Takes the settled units off the difference and writes the settlement down; returns what is still open. */
async function reduce(tx: Transaction, { difference, scene, entryId }: Reduction): Promise<number> {
  const { settling, from, to } = scene;
  const left = difference.openUnits - Math.sign(difference.openUnits) * settling.units;
  const { currency } = from.companyId === difference.partnerId ? from.company : to.company;
  const { partnerId: companyId, typeCode, openedOn: day } = difference;
  await tx
    .update(differences)
    .set({
      openUnits: left,
      atStake: await worthOf(tx, { companyId, currency, typeCode, day }, Math.abs(left)),
      ...(left === 0 ? { state: 'settled' as const, settledAt: settling.now } : {}),
    })
    .where(eq(differences.id, difference.id));
  const isNamed = difference.id === settling.differenceId;
  await tx.insert(settlements).values({
    id: newId(),
    differenceId: difference.id,
    way: settling.way,
    units: settling.units,
    bearerCompanyId: settling.bearerCompanyId ?? null,
    swappedWithId: isNamed ? (settling.swapWithId ?? null) : settling.differenceId,
    entryId,
    reason: settling.reason,
    settledBy: settling.personId,
    settledAt: settling.now,
  });
  return left;
}
