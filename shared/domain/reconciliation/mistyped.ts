import { type Candidate, settle } from './contest';
import type { Desk } from './desk';
import { settleDoubts } from './doubts';
import type { NearShipments } from './near-reference';
import { OtherSites } from './other-site';
import type { Paper } from './papers';
import { settleMistypedRests } from './rest-of-split';
import type { Doubt } from './same-reference';
import { couldBeTwins } from './twins';

/**
 * Receipts whose reference is on no shipment of their lane, or on one that is not theirs. Returns the
 * candidates that stay open, the strongest rule first.
 */
export function settleMistyped(desk: Desk, doubts: readonly Doubt[], near: NearShipments): Candidate[] {
  const elsewhere = new OtherSites(desk);
  const alternatives = (receipt: Paper) => [...elsewhere.candidates(receipt), ...near.candidates(receipt)];
  const inDoubt = settleDoubts(desk, doubts, alternatives);
  const undecided = new Set(inDoubt.filter((c) => c.likeness < 3).map(({ receipt }) => receipt));
  settleMistypedRests(desk);
  const { first, again } = firstEntries(desk.openReceipts(), undecided);
  const found = first.flatMap(alternatives);
  const settled = settle(
    desk,
    [...inDoubt, ...found],
    (candidate) => mayMatch(candidate) && !undecided.has(candidate.receipt),
  );
  // As in doubts: the double entry is told, also where its shipment is left to a person.
  const covering = found.filter(({ likeness }) => likeness < 2);
  for (const receipt of new Set([...settled, ...covering].map((candidate) => candidate.receipt)))
    for (const twin of again.get(receipt) ?? []) desk.double(twin, receipt);
  const stillInDoubt = settleDoubts(desk, doubts, alternatives);
  return [...stillInDoubt, ...found];
}

const mayMatch = ({ rule, likeness, usual }: Candidate): boolean =>
  rule === 'other site' ? likeness === 0 : rule === 'near reference' && likeness < 3 && usual;

/** Of receipts with one reference, lane and contents, a day apart at most, only the first seeks a shipment. */
function firstEntries(
  receipts: Paper[],
  undecided: Set<Paper>,
): { first: Paper[]; again: Map<Paper, Paper[]> } {
  const seen = new Map<string, Paper[]>();
  const again = new Map<Paper, Paper[]>();
  const first = receipts.filter((receipt) => {
    if (!receipt.reference || undecided.has(receipt)) return undecided.has(receipt);
    const key = JSON.stringify([receipt.lane, receipt.reference.core, receipt.contents.signature]);
    const earlier = (seen.get(key) ?? []).find((one) => couldBeTwins(one, receipt));
    if (earlier) again.set(earlier, [...(again.get(earlier) ?? []), receipt]);
    else seen.set(key, [...(seen.get(key) ?? []), receipt]);
    return !earlier;
  });
  return { first, again };
}
