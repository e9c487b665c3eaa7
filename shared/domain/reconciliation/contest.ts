import type { Likeness } from './contents';
import type { Desk } from './desk';
import type { RuleName } from './output';
import type { Paper } from './papers';

/** A receipt that may be of a shipment, and how well it fits. */
export interface Candidate {
  shipment: Paper;
  receipt: Paper;
  rule: RuleName;
  likeness: Likeness;
  /** The days on the way are what the lane is used to. */
  usual: boolean;
}

/** Better in one respect and worse in none: only then is the other no rival. */
const beats = (a: Candidate, b: Candidate): boolean =>
  a.likeness <= b.likeness && a.usual >= b.usual && (a.likeness < b.likeness || a.usual > b.usual);

function push(map: Map<Paper, Candidate[]>, key: Paper, candidate: Candidate): void {
  const there = map.get(key);
  if (there) there.push(candidate);
  else map.set(key, [candidate]);
}

/**
 * Pairs what has no rival as good as itself, neither among the shipments nor among the receipts.
 * `mayMatch` says which candidates a machine may settle; the others are rivals all the same.
 */
export function settle(
  desk: Desk,
  candidates: readonly Candidate[],
  mayMatch: (candidate: Candidate) => boolean,
): Candidate[] {
  const byReceipt = new Map<Paper, Candidate[]>();
  const byShipment = new Map<Paper, Candidate[]>();
  for (const candidate of candidates) {
    push(byReceipt, candidate.receipt, candidate);
    push(byShipment, candidate.shipment, candidate);
  }
  const isOpen = ({ receipt, shipment }: Candidate) => desk.isOpen(receipt) && desk.isOpen(shipment);
  const standsAlone = (candidate: Candidate, rivals: Candidate[] = []) =>
    rivals.every((rival) => rival === candidate || !isOpen(rival) || beats(candidate, rival));
  const isClear = (candidate: Candidate) =>
    isOpen(candidate) &&
    mayMatch(candidate) &&
    standsAlone(candidate, byReceipt.get(candidate.receipt)) &&
    standsAlone(candidate, byShipment.get(candidate.shipment));

  const settled: Candidate[] = [];
  let open = [...candidates];
  for (let clear = open.filter(isClear); clear.length > 0; clear = open.filter(isClear)) {
    for (const { shipment, receipt, rule } of clear)
      desk.pair({ shipments: [shipment], receipts: [receipt], rule });
    settled.push(...clear);
    open = open.filter(isOpen);
  }
  return settled;
}
