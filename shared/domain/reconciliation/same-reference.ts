import type { Claim } from './claims';
import { likenessOf, oneTypeWrong, sumOf } from './contents';
import { type Delivery, readDelivery } from './deliveries';
import type { Desk } from './desk';
import type { RuleName } from './output';

/** A claim that its contents alone do not settle. */
export interface Doubt {
  claim: Claim;
  delivery: Delivery;
}

export const declaredOf = ({ shipments }: Claim) => sumOf(shipments.map(({ contents }) => contents));

const ruleOf = ({ shipments }: Claim, { split }: Delivery): RuleName =>
  shipments.length > 1 ? 'combined delivery' : split ? 'split delivery' : 'same reference';

/** Settles the claims that are plain, and returns those that are not. */
export function settlePlainClaims(desk: Desk, claims: readonly Claim[]): Doubt[] {
  const read = claims.map((claim) => ({ claim, delivery: readDelivery(declaredOf(claim), claim.receipts) }));
  const plain = read.filter(({ claim, delivery }) => isPlain(claim, delivery));
  for (const { claim, delivery } of plain)
    for (const { lane, days } of onTheWay(claim, delivery)) desk.usual.learn(lane, days);
  const settled = new Set(
    plain.filter((one) =>
      onTheWay(one.claim, one.delivery).every(({ lane, days }) => desk.usual.isUsual(lane, days)),
    ),
  );
  for (const { claim, delivery } of settled) accept(desk, claim, delivery);
  return read.filter((one) => !settled.has(one));
}

/** The days from the shipment to its first receipt; a split may take longer than the lane is used to. */
const onTheWay = ({ shipments }: Claim, { parts, split }: Delivery): { lane: string; days: number }[] => {
  const [shipment, receipt] = [shipments[0], parts[0]];
  return shipment && receipt && !split ? [{ lane: shipment.lane, days: receipt.day - shipment.day }] : [];
};

function isPlain(claim: Claim, { parts, split, doubles }: Delivery): boolean {
  const [only, ...more] = parts;
  if (split || !only) return true;
  if (more.length > 0 || doubles.length > 0) return false;
  const declared = declaredOf(claim);
  const alike = likenessOf(declared, only.contents) < 3 || oneTypeWrong(declared, only.contents);
  return alike || claim.shipments.length > 1;
}

export function accept(desk: Desk, claim: Claim, delivery: Delivery): void {
  desk.pair({ shipments: claim.shipments, receipts: delivery.parts, rule: ruleOf(claim, delivery) });
  for (const { receipt, of } of delivery.doubles)
    if (desk.isOpen(receipt) && delivery.parts.includes(of)) desk.double(receipt, of);
}
