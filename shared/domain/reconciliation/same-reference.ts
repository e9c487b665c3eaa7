import type { Claim } from './claims';
import type { Candidate } from './contest';
import { likenessOf, onlyTypesDiffer, sumOf, unitsApart } from './contents';
import { type Delivery, readDelivery } from './deliveries';
import type { Desk } from './desk';
import type { RuleName } from './output';
import type { Paper } from './papers';

/** A claim that its contents alone do not settle. */
export interface Doubt {
  claim: Claim;
  delivery: Delivery;
}

/** The open shipments that a receipt's reference could have meant, had it been mistyped. */
export type NearOnes = (receipt: Paper) => Candidate[];

const declaredOf = ({ shipments }: Claim) => sumOf(shipments.map(({ contents }) => contents));

const ruleOf = ({ shipments }: Claim, { split }: Delivery): RuleName =>
  shipments.length > 1 ? 'combined delivery' : split ? 'split delivery' : 'same reference';

/** Settles the claims that are plain, and returns those that are not. */
export function settlePlainClaims(desk: Desk, claims: readonly Claim[]): Doubt[] {
  const doubts: Doubt[] = [];
  for (const claim of claims) {
    const delivery = readDelivery(declaredOf(claim), claim.receipts);
    const [only, ...more] = delivery.parts;
    const unlike = only && likenessOf(declaredOf(claim), only.contents) === 3;
    if (!delivery.split && (more.length > 0 || (unlike && claim.shipments.length === 1)))
      doubts.push({ claim, delivery });
    else accept(desk, claim, delivery);
  }
  return doubts;
}

function accept(desk: Desk, claim: Claim, delivery: Delivery): void {
  desk.pair({ shipments: claim.shipments, receipts: delivery.parts, rule: ruleOf(claim, delivery) });
  for (const { receipt, of } of delivery.doubles) if (delivery.parts.includes(of)) desk.double(receipt, of);
  const [shipment, receipt] = [claim.shipments[0], delivery.parts[0]];
  if (shipment && receipt) desk.usual.learn(shipment.lane, receipt.day - shipment.day);
}

/**
 * A mistyped reference can hit another real one. Where the contents of a claim are strange, or it has more
 * receipts than it can use, the open shipments with a near reference are looked at before it is settled.
 * Returns what remains in doubt, as candidates.
 */
export function settleDoubts(desk: Desk, doubts: readonly Doubt[], near: NearOnes): Candidate[] {
  const left: Candidate[] = [];
  for (const { claim, delivery } of doubts) {
    const ranked = rank(desk, claim, delivery.parts);
    const best = clearBest(ranked.filter(({ shipment }) => shipment === claim.shipments[0]));
    if (
      best &&
      isSound(desk, { claim, best, others: delivery.parts.filter((r) => r !== best.receipt) }, near)
    )
      accept(desk, claim, { ...delivery, parts: [best.receipt] });
    else {
      left.push(...ranked);
      tellDoubles(desk, claim, delivery);
    }
  }
  return left;
}

const rank = (desk: Desk, claim: Claim, receipts: Paper[]): Candidate[] =>
  claim.shipments.flatMap((shipment) =>
    receipts.map((receipt) => ({
      shipment,
      receipt,
      rule: 'same reference',
      likeness: likenessOf(declaredOf(claim), receipt.contents),
      usual: desk.usual.isUsual(shipment.lane, receipt.day - shipment.day),
    })),
  );

function clearBest(ranked: Candidate[]): Candidate | null {
  const [first, second] = [...ranked].sort(
    (a, b) =>
      a.likeness - b.likeness || Number(b.usual) - Number(a.usual) || a.receipt.place - b.receipt.place,
  );
  if (!first || !second) return first ?? null;
  const asGood = second.likeness === first.likeness && second.usual === first.usual;
  return asGood || second.usual > first.usual ? null : first;
}

interface Choice {
  claim: Claim;
  best: Candidate;
  others: Paper[];
}

function isSound(desk: Desk, { claim, best, others }: Choice, near: NearOnes): boolean {
  const own = (candidate: Candidate) => claim.shipments.includes(candidate.shipment);
  const elsewhere = near(best.receipt).filter((candidate) => !own(candidate));
  if (best.likeness === 3) return elsewhere.length === 0;
  const declared = declaredOf(claim);
  return others.every((other) =>
    near(other).every(({ shipment }) => {
      const fits = elsewhere.some((candidate) => candidate.shipment === shipment);
      if (!fits || likenessOf(declared, other.contents) === 3) return true;
      const asRead =
        unitsApart(declared, best.receipt.contents) + unitsApart(shipment.contents, other.contents);
      const crossed =
        unitsApart(declared, other.contents) + unitsApart(shipment.contents, best.receipt.contents);
      return asRead < crossed;
    }),
  );
}

function tellDoubles(desk: Desk, claim: Claim, { doubles }: Delivery): void {
  for (const { receipt, of } of doubles)
    if (likenessOf(declaredOf(claim), of.contents) < 2) desk.double(receipt, of);
}

/** Contents that equal another type's are a wrong type as likely as a wrong reference: a person decides. */
export const mayBeWrongType = ({ shipment, receipt }: Candidate): boolean =>
  onlyTypesDiffer(shipment.contents, receipt.contents);
