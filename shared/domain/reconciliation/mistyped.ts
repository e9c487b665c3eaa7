import { type Candidate, settle } from './contest';
import type { Desk } from './desk';
import { NearShipments } from './near-reference';
import { OtherSites } from './other-site';
import type { Paper } from './papers';
import { type Doubt, mayBeWrongType, settleDoubts } from './same-reference';
import { couldBeTwins } from './twins';

/**
 * Receipts whose reference is on no shipment of their lane, or on one that is not theirs. Returns the
 * candidates that stay open, the strongest rule first.
 */
export function settleMistyped(desk: Desk, doubts: readonly Doubt[], near: NearShipments): Candidate[] {
  const inDoubt = settleDoubts(desk, doubts, near.candidates);
  const undecided = new Set(
    inDoubt.filter((c) => c.likeness < 3 || mayBeWrongType(c)).map(({ receipt }) => receipt),
  );
  const elsewhere = new OtherSites(desk);
  const { first, again } = firstEntries(desk.openReceipts());
  const found = first.flatMap((receipt) => [...elsewhere.candidates(receipt), ...near.candidates(receipt)]);
  const settled = settle(
    desk,
    [...inDoubt, ...found],
    ({ receipt, rule }) => rule !== 'same reference' && !undecided.has(receipt),
  );
  for (const { receipt } of settled) for (const twin of again.get(receipt) ?? []) desk.double(twin, receipt);
  const open = doubts.filter(({ claim }) =>
    [...claim.shipments, ...claim.receipts].every((p) => desk.isOpen(p)),
  );
  const stillInDoubt = settleDoubts(desk, open, near.candidates);
  return [...stillInDoubt, ...found];
}

/** Of receipts with one reference, lane and contents, a day apart at most, only the first seeks a shipment. */
function firstEntries(receipts: Paper[]): { first: Paper[]; again: Map<Paper, Paper[]> } {
  const seen = new Map<string, Paper[]>();
  const again = new Map<Paper, Paper[]>();
  const first = receipts.filter((receipt) => {
    if (!receipt.reference) return false;
    const key = JSON.stringify([receipt.lane, receipt.reference.core, receipt.contents.signature]);
    const earlier = (seen.get(key) ?? []).find((one) => couldBeTwins(one, receipt));
    if (earlier) again.set(earlier, [...(again.get(earlier) ?? []), receipt]);
    else seen.set(key, [...(seen.get(key) ?? []), receipt]);
    return !earlier;
  });
  return { first, again };
}
