import type { Claim } from './claims';
import type { Candidate } from './contest';
import { likenessOf, unitsApart } from './contents';
import type { Desk } from './desk';
import type { Paper } from './papers';
import { accept, declaredOf, type Doubt } from './same-reference';

/** The open shipments that a receipt could mean otherwise: a mistyped reference, another site. */
type Elsewhere = (receipt: Paper) => Candidate[];

/**
 * A mistyped reference can hit another real one. Where the contents of a claim are strange, or it has more
 * receipts than it can use, the open shipments with a near reference are looked at before it is settled.
 * Returns what remains in doubt, as candidates.
 */
export function settleDoubts(desk: Desk, doubts: readonly Doubt[], alternatives: Elsewhere): Candidate[] {
  const left: Candidate[] = [];
  for (const { claim, delivery } of doubts.filter((doubt) => isOpen(desk, doubt))) {
    const best = clearBest(rank(desk, claim, delivery.parts));
    const elsewhere = (receipt: Paper) =>
      alternatives(receipt).filter(({ shipment }) => !claim.shipments.includes(shipment));
    if (best && isSound(desk, { claim, best, delivery }, elsewhere))
      accept(desk, claim, { ...delivery, parts: [best.receipt] });
    else left.push(...leaveOpen(desk, { claim, delivery }));
  }
  return left;
}

const isOpen = (desk: Desk, { claim, delivery }: Doubt): boolean =>
  [...claim.shipments, ...delivery.parts].every((paper) => desk.isOpen(paper));

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

function isSound(desk: Desk, choice: Choice, elsewhere: Elsewhere): boolean {
  if (choice.best.likeness === 3) return elsewhere(choice.best.receipt).every(({ likeness }) => likeness > 1);
  const late = !choice.best.usual && isOutdone(choice.best, elsewhere);
  if (late) return false;
  const repeated = choice.delivery.doubles.length > 0;
  return isFirstChoice(choice, elsewhere) && (!repeated || isRepeatedAlone(desk, choice, elsewhere));
}

/** Too long on the way for its lane, while a shipment with a near reference holds the same and is in time. */
const isOutdone = (best: Candidate, elsewhere: Elsewhere): boolean =>
  elsewhere(best.receipt).some(({ likeness, usual }) => usual && likeness <= best.likeness);

/** No other receipt of the claim would serve it as well, while the best one serves another shipment. */
function isFirstChoice({ claim, best, delivery }: Choice, elsewhere: Elsewhere): boolean {
  const ofBest = elsewhere(best.receipt);
  const declared = declaredOf(claim);
  return delivery.parts.every((other) =>
    elsewhere(other).every(({ shipment }) => {
      const fits = ofBest.some((candidate) => candidate.shipment === shipment);
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
 * What looks entered twice may be two loads, one under a mistyped reference. The double entry is told either
 * way; whose receipt it is has a rival when a shipment with a near reference and the same contents is overdue by the lane's habit.
 */
function isRepeatedAlone(desk: Desk, { best, delivery }: Choice, elsewhere: Elsewhere): boolean {
  const isRival = ({ shipment, likeness, usual }: Candidate) =>
    likeness === 0 && usual && !desk.mayStillCome(shipment);
  const receipts = [best.receipt, ...delivery.doubles.map(({ receipt }) => receipt)];
  return receipts.every((receipt) => !elsewhere(receipt).some(isRival));
}

/** What a person has to decide; double entries are told all the same. */
function leaveOpen(desk: Desk, { claim, delivery }: Doubt): Candidate[] {
  const declared = declaredOf(claim);
  for (const { receipt, of } of delivery.doubles)
    if (desk.isOpen(receipt) && likenessOf(declared, of.contents) < 2) desk.double(receipt, of);
  const ranked = rank(desk, claim, delivery.parts);
  return claim.shipments.flatMap((shipment) => ranked.map((candidate) => ({ ...candidate, shipment })));
}
