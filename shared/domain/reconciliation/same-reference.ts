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
  const doubts: Doubt[] = [];
  for (const claim of claims) {
    const delivery = readDelivery(declaredOf(claim), claim.receipts);
    if (isPlain(claim, delivery)) accept(desk, claim, delivery);
    else doubts.push({ claim, delivery });
  }
  return doubts;
}

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
  const [shipment, receipt] = [claim.shipments[0], delivery.parts[0]];
  if (shipment && receipt) desk.usual.learn(shipment.lane, receipt.day - shipment.day);
}
