import type { Claim } from './claims';
import type { Candidate } from './contest';
import { likenessOf, unitsApart } from './contents';
import type { Delivery } from './deliveries';
import type { Desk } from './desk';
import { inWindow, type Paper } from './papers';
import { accept, declaredOf, type Doubt } from './same-reference';

/** The open shipments that a receipt could mean otherwise: a mistyped reference, another site. */
type Elsewhere = (receipt: Paper) => Candidate[];

/**
 * A mistyped reference can hit another real one. Where the contents of a claim are strange, or it has more
 * receipts than it can use, the open shipments with a near reference are looked at before it is settled.
 * Returns what remains in doubt, as candidates.
 */
export function settleDoubts(desk: Desk, doubts: readonly Doubt[], near: Elsewhere): Candidate[] {
  const isMissing = missingShipments(desk, doubts);
  const left: Candidate[] = [];
  for (const { claim, delivery } of doubts) {
    const best = clearBest(rank(desk, claim, delivery.parts));
    const choice = best && { claim, best, delivery };
    const others = (receipt: Paper) =>
      near(receipt).filter(({ shipment }) => !claim.shipments.includes(shipment));
    const repeated = choice && doublesAreSound(choice, others, isMissing);
    if (choice && repeated && isSound(choice, others))
      accept(desk, claim, { ...delivery, parts: [choice.best.receipt] });
    else left.push(...leaveOpen(desk, { claim, delivery }, repeated !== false));
  }
  return left;
}

interface Choice extends Doubt {
  best: Candidate;
}

const rank = (desk: Desk, claim: Claim, receipts: Paper[]): Candidate[] =>
  claim.shipments.slice(0, 1).flatMap((shipment) =>
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

/** No other receipt of the claim would serve it as well, while the best one serves a near shipment. */
function isSound({ claim, best, delivery }: Choice, near: Elsewhere): boolean {
  const elsewhere = near(best.receipt);
  if (best.likeness === 3) return elsewhere.every(({ likeness }) => likeness > 1);
  const declared = declaredOf(claim);
  return delivery.parts.every((other) =>
    near(other).every(({ shipment }) => {
      const fits = elsewhere.some((candidate) => candidate.shipment === shipment);
      if (other === best.receipt || !fits || likenessOf(declared, other.contents) === 3) return true;
      const asRead =
        unitsApart(declared, best.receipt.contents) + unitsApart(shipment.contents, other.contents);
      const crossed =
        unitsApart(declared, other.contents) + unitsApart(shipment.contents, best.receipt.contents);
      return asRead < crossed;
    }),
  );
}

/**
 * What looks entered twice may be two loads, one under a mistyped reference: so it is when a shipment with a
 * near reference and the same contents has come to nothing by any other reading.
 */
function doublesAreSound(
  { delivery }: Choice,
  near: Elsewhere,
  isMissing: (shipment: Paper) => boolean,
): boolean {
  return delivery.doubles.every(({ receipt, of }) =>
    [receipt, of].every((one) =>
      near(one).every(({ shipment, likeness, usual }) => likeness > 0 || !usual || !isMissing(shipment)),
    ),
  );
}

/** Neither claimed, nor possibly still on its way, nor counted without a reference. */
function missingShipments(desk: Desk, doubts: readonly Doubt[]): (shipment: Paper) => boolean {
  const claimed = new Set(doubts.flatMap(({ claim }) => claim.shipments));
  const unnamed = new Map<string, Paper[]>();
  const placeOf = ({ lane, contents }: Paper) => `${lane}\u0000${contents.signature}`;
  for (const receipt of desk.openReceipts()) {
    if (receipt.reference) continue;
    unnamed.set(placeOf(receipt), [...(unnamed.get(placeOf(receipt)) ?? []), receipt]);
  }
  return (shipment) =>
    !claimed.has(shipment) &&
    !desk.mayStillCome(shipment) &&
    !(unnamed.get(placeOf(shipment)) ?? []).some((receipt) => inWindow(desk.windowDays, shipment, receipt));
}

function leaveOpen(desk: Desk, { claim, delivery }: Doubt, tellDoubles: boolean): Candidate[] {
  const twins = delivery.doubles.filter(({ of }) => likenessOf(declaredOf(claim), of.contents) < 2);
  if (tellDoubles) for (const { receipt, of } of twins) desk.double(receipt, of);
  const receipts = tellDoubles ? delivery.parts : [...delivery.parts, ...twins.map(({ receipt }) => receipt)];
  const ranked = rank(desk, claim, receipts);
  return claim.shipments.flatMap((shipment) => ranked.map((candidate) => ({ ...candidate, shipment })));
}
