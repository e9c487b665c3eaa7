import { eq, max } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { differences } from '@/db/schema/differences';
import type { SettlementWay } from '@/shared/contracts/differences';
import { countLines, counts } from '@/db/schema/shipments';
import { Problem } from '@/shared/problems/problems';
import { outsideAccount, siteAccount, transitAccount } from '../ledger/accounts';
import type { Entry, Move } from '../ledger/post-entry';
import type { PartnerEvent } from '../ledger/record-events';
import { correctedEvents, countedNow, type CountScene, entryOfCount, sidesOf } from './corrected-count';
import { type DifferenceRow, refuseMoreThanOpen } from './locked-difference';
import type { Settling } from './settle-difference';

export type Scene = CountScene & { difference: DifferenceRow; settling: Settling };
type Settlement = { entry: Entry; events: PartnerEvent[]; swapped?: DifferenceRow };
type Way = (tx: Transaction, scene: Scene) => Promise<Settlement>;

/** The entry and the events of each way of settling (RULES 1 and 6). Fewer came: units still lie in transit; more came: transit is short of them. */
const ways: Record<SettlementWay, Way> = {
  'sender miscounted': async (tx, scene) => ({ entry: await backToSender(tx, scene), events: [] }),
  'within tolerance': async (tx, scene) => ({ entry: await backToSender(tx, scene), events: [] }),
  'receiver miscounted': receiverMiscounted,
  'lost on the way': lostOnTheWay,
  'turned up later': turnedUpLater,
  'wrong type': wrongType,
};

export function settlementOf(tx: Transaction, scene: Scene): Promise<Settlement> {
  return ways[scene.settling.way](tx, scene);
}

function entryOf({ settling, difference, shipment }: Scene, moves: readonly Move[]): Entry {
  return {
    kind: settling.way,
    valueDate: settling.today,
    moves,
    reason: settling.reason,
    personId: settling.personId,
    shipmentId: shipment.id,
    differenceId: difference.id,
    ...(settling.disputeId ? { disputeId: settling.disputeId } : {}),
  };
}

function requireFewer({ difference }: Scene): void {
  if (difference.openUnits > 0) {
    throw new Problem('not valid', {
      fields: [{ path: 'way', message: 'More came than was declared: nothing is missing' }],
    });
  }
}

async function backToSender(tx: Transaction, scene: Scene): Promise<Entry> {
  const { difference, settling, shipment, from } = scene;
  const transit = await transitAccount(tx, shipment);
  const site = await siteAccount(tx, from);
  const [a, b] = difference.openUnits < 0 ? [transit, site] : [site, transit];
  return entryOf(scene, [{ typeCode: difference.typeCode, from: a, to: b, units: settling.units }]);
}

/** The count is put right on its own day, also when that month is closed: it is a correction. */
async function receiverMiscounted(tx: Transaction, scene: Scene): Promise<Settlement> {
  const { difference, settling, shipment, count, to } = scene;
  const transit = await transitAccount(tx, shipment);
  const site = await siteAccount(tx, to);
  const fewer = difference.openUnits < 0;
  const [a, b] = fewer ? [transit, site] : [site, transit];
  const by = fewer ? settling.units : -settling.units;
  const { typeCode } = difference;
  const counted = await countedNow(tx, {
    shipmentId: shipment.id,
    countId: count.id,
    toSiteId: to.id,
    typeCode,
  });
  const correctsEntryId = await entryOfCount(tx, { countId: count.id, shipmentId: shipment.id });
  const events = await correctedEvents(tx, {
    ...scene,
    typeCode,
    by,
    right: counted + by,
    ...(settling.disputeId ? { disputeId: settling.disputeId } : {}),
  });
  return {
    entry: {
      ...entryOf(scene, [{ typeCode, from: a, to: b, units: settling.units }]),
      valueDate: count.countedOn,
      countId: count.id,
      correctsEntryId,
    },
    events,
  };
}

/** Lost, charged to the party that bears it. The receiver must hold it to lose it; a sender who does not bear it is relieved. */
async function lostOnTheWay(tx: Transaction, scene: Scene): Promise<Settlement> {
  requireFewer(scene);
  const { difference, settling, shipment, from, to } = scene;
  const bearer = [from.company, to.company].find((company) => company.id === settling.bearerCompanyId);
  if (!bearer)
    throw new Problem('not valid', {
      fields: [{ path: 'bearerCompanyId', message: 'Say who bears the loss: sender or receiver' }],
    });
  const event = (companyId: string, kind: 'issued' | 'returned' | 'lost'): PartnerEvent => ({
    companyId,
    kind,
    date: settling.today,
    typeCode: difference.typeCode,
    quantity: settling.units,
    shipmentId: shipment.id,
    cause: `lost on the way of ${shipment.reference}`,
  });
  const receiverBears = bearer.id === to.companyId && bearer.kind === 'partner';
  const events = [
    ...(receiverBears ? [event(to.companyId, 'issued'), event(to.companyId, 'lost')] : []),
    ...(from.company.kind === 'partner'
      ? [event(from.companyId, bearer.id === from.companyId ? 'lost' : 'returned')]
      : []),
  ];
  const move = { typeCode: difference.typeCode, units: settling.units, chargedCompanyId: bearer.id };
  const entry = entryOf(scene, [
    { ...move, from: await transitAccount(tx, shipment), to: await outsideAccount(tx, 'lost') },
  ]);
  return { entry, events };
}

/** More of it turns up: a second count, dated the day it did. */
async function turnedUpLater(tx: Transaction, scene: Scene): Promise<Settlement> {
  requireFewer(scene);
  const { difference, settling, shipment, from, to } = scene;
  const countId = newId();
  const [last] = await tx
    .select({ sequence: max(counts.sequence) })
    .from(counts)
    .where(eq(counts.shipmentId, shipment.id));
  await tx.insert(counts).values({
    id: countId,
    shipmentId: shipment.id,
    sequence: (last?.sequence ?? 1) + 1,
    countedOn: settling.today,
    source: 'person',
    note: settling.reason.slice(0, 300),
    countedBy: settling.personId,
    countedAt: settling.now,
  });
  await tx
    .insert(countLines)
    .values({ countId, typeCode: difference.typeCode, counted: settling.units, damaged: 0, dirty: 0 });
  const move = { typeCode: difference.typeCode, units: settling.units };
  const entry = entryOf(scene, [
    { ...move, from: await transitAccount(tx, shipment), to: await siteAccount(tx, to) },
  ]);
  const events = sidesOf({ from, to }).map(({ companyId, kind }) => ({
    companyId,
    kind,
    date: settling.today,
    typeCode: difference.typeCode,
    quantity: settling.units,
    shipmentId: shipment.id,
    countId,
  }));
  return { entry: { ...entry, countId }, events };
}

/** Two types were taken for each other: what is missing of one came as the other. The sender's book is put right. */
async function wrongType(tx: Transaction, scene: Scene): Promise<Settlement> {
  const { difference, settling, shipment, from } = scene;
  const other = await swappedDifference(tx, scene);
  const transit = await transitAccount(tx, shipment);
  const site = await siteAccount(tx, from);
  const [missing, surplus] = difference.openUnits < 0 ? [difference, other] : [other, difference];
  const entry = entryOf(scene, [
    { typeCode: missing.typeCode, from: transit, to: site, units: settling.units },
    { typeCode: surplus.typeCode, from: site, to: transit, units: settling.units },
  ]);
  return { entry, events: [], swapped: other };
}

async function swappedDifference(tx: Transaction, { difference, settling }: Scene): Promise<DifferenceRow> {
  const [other] = settling.swapWithId
    ? await tx.select().from(differences).where(eq(differences.id, settling.swapWithId)).for('update')
    : [];
  const fits =
    other?.shipmentId === difference.shipmentId &&
    other.state === 'open' &&
    Math.sign(other.openUnits) === -Math.sign(difference.openUnits);
  if (!other || !fits) {
    throw new Problem('not valid', {
      fields: [
        {
          path: 'swapWithId',
          message: 'Choose the other type of this shipment: missing here, too many there',
        },
      ],
    });
  }
  refuseMoreThanOpen(other, settling.units);
  return other;
}
