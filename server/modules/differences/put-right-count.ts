import { and, eq, gt, lt } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { differences } from '@/db/schema/differences';
import { Problem } from '@/shared/problems/problems';
import { siteAccount, transitAccount } from '../ledger/accounts';
import { type Move, postEntry } from '../ledger/post-entry';
import { refuseWhatCannotBe } from '../ledger/reckonable';
import { recordEvents } from '../ledger/record-events';
import { countScene } from './count-scene';
import { correctedEvents, countedNow, type CountScene, entryOfCount, sidesOf } from './corrected-count';
import { settleDifference } from './settle-difference';
import { takeBackLost } from './take-back-lost';

export type PuttingRight = {
  shipmentId: string;
  /** Left out: the shipment's first count. */
  countId?: string;
  typeCode: string;
  /** Units that the count was short of (above 0) or had too many (below 0). */
  by: number;
  reason: string;
  disputeId: string;
  personId: string | null;
  now: string;
  /** The day it is decided, in the receiver's time zone. */
  today: string;
};

export type PutRight = { entryIds: number[]; counted: number };

/**
 * Puts a count right after a dispute (RULES 6), also in a closed month: first out of what is still open of the
 * difference, then out of what had been written off as lost on the way, the rest between sender and receiver, since
 * the book had given it to the one of them. Never below zero.
 */
export async function putRightCount(tx: Transaction, putting: PuttingRight): Promise<PutRight> {
  if (putting.by === 0) throw new Error('a count is put right by something');
  const scene = await countScene(tx, putting);
  const { typeCode, by } = putting;
  const counted = await countedNow(tx, {
    shipmentId: scene.shipment.id,
    countId: scene.count.id,
    toSiteId: scene.to.id,
    typeCode,
  });
  if (counted + by < 0) {
    throw new Problem('cannot be reckoned', { data: { why: 'a count cannot be put right below zero' } });
  }
  const settled = await useOpenDifference(tx, { scene, putting });
  const rest = Math.abs(by) - settled.units;
  if (rest === 0) return { entryIds: settled.entryIds, counted: counted + by };
  const lost = by > 0 ? await takeBackLost(tx, { scene, putting, most: rest }) : { units: 0, entryIds: [] };
  const corrected = await correctCount(tx, { scene, putting, rest, lost: lost.units, right: counted + by });
  await refuseWhatCannotBe(tx, {
    companyIds: sidesOf(scene).map((side) => side.companyId),
    today: putting.today,
  });
  return { entryIds: [...settled.entryIds, ...lost.entryIds, corrected], counted: counted + by };
}

type Part = { scene: CountScene; putting: PuttingRight };

/** An open difference that says the same is settled as the receiver's miscount, as far as it goes. */
async function useOpenDifference(
  tx: Transaction,
  { scene, putting }: Part,
): Promise<{ units: number; entryIds: number[] }> {
  const { typeCode, by, reason, disputeId, personId, now, today } = putting;
  const [open] = await tx
    .select()
    .from(differences)
    .where(
      and(
        eq(differences.countId, scene.count.id),
        eq(differences.typeCode, typeCode),
        eq(differences.state, 'open'),
        by > 0 ? lt(differences.openUnits, 0) : gt(differences.openUnits, 0),
      ),
    );
  if (!open) return { units: 0, entryIds: [] };
  const units = Math.min(Math.abs(by), Math.abs(open.openUnits));
  const { entryId } = await settleDifference(tx, {
    differenceId: open.id,
    way: 'receiver miscounted',
    units,
    reason,
    disputeId,
    personId,
    now,
    today,
  });
  return { units, entryIds: [entryId] };
}

type Correcting = Part & { rest: number; lost: number; right: number };

async function correctCount(tx: Transaction, correcting: Correcting): Promise<number> {
  const { scene, putting, rest, right } = correcting;
  const { shipment, count } = scene;
  const { typeCode, reason, disputeId, personId } = putting;
  const entryId = await postEntry(tx, {
    kind: 'correction',
    valueDate: count.countedOn,
    moves: await movesOf(tx, correcting),
    reason,
    personId,
    shipmentId: shipment.id,
    countId: count.id,
    disputeId,
    correctsEntryId: await entryOfCount(tx, { countId: count.id, shipmentId: shipment.id }),
  });
  const by = Math.sign(putting.by) * rest;
  const events = await correctedEvents(tx, { ...scene, typeCode, by, right, disputeId });
  await recordEvents(
    tx,
    events.map((event) => ({ ...event, entryId })),
  );
  return entryId;
}

/** What was lost comes out of the transit it was put back into; the rest goes between the two sites. */
async function movesOf(tx: Transaction, { scene, putting, rest, lost }: Correcting): Promise<Move[]> {
  const { typeCode, by } = putting;
  const sender = await siteAccount(tx, scene.from);
  const receiver = await siteAccount(tx, scene.to);
  const given = rest - lost;
  return [
    ...(lost > 0
      ? [{ typeCode, from: await transitAccount(tx, scene.shipment), to: receiver, units: lost }]
      : []),
    ...(given > 0
      ? [{ typeCode, from: by > 0 ? sender : receiver, to: by > 0 ? receiver : sender, units: given }]
      : []),
  ];
}
