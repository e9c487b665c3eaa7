import type { Paper } from './papers';

export interface Twins {
  /** The earlier entry, which is kept. */
  kept: Paper;
  again: Paper[];
}

const DAYS_APART = 1;

export const couldBeTwins = (earlier: Paper, later: Paper): boolean =>
  earlier.contents.signature === later.contents.signature && Math.abs(later.day - earlier.day) <= DAYS_APART;

/** Receipts in order, gathered with those that repeat them: same contents, a day apart at most. */
export function gatherTwins(receipts: readonly Paper[]): Twins[] {
  const gathered: Twins[] = [];
  for (const receipt of receipts) {
    const twin = gathered.find(({ kept }) => couldBeTwins(kept, receipt));
    if (twin) twin.again.push(receipt);
    else gathered.push({ kept: receipt, again: [] });
  }
  return gathered;
}
