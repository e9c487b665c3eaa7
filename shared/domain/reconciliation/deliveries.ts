import { type Contents, sumOf, unitsApart } from './contents';
import { inOrder, type Paper } from './papers';
import { couldBeTwins, gatherTwins } from './twins';

/** How the receipts under one claim are best understood. */
export interface Delivery {
  /** The parts that make up the delivery: one, or several of a split. Several single ones are rivals. */
  parts: Paper[];
  split: boolean;
  doubles: { receipt: Paper; of: Paper }[];
}

// More receipts than this under one reference are taken all together or singly, not in every combination.
const MOST_COMBINED = 8;

/** RULES 5: two halves of 200 against 400 declared are a split delivery, two times 400 are a double entry. */
export function readDelivery(declared: Contents, receipts: readonly Paper[]): Delivery {
  const twins = gatherTwins(receipts);
  const singles = twins.map(({ kept }) => kept);
  const single = Math.min(...singles.map(({ contents }) => unitsApart(declared, contents)));
  const split = bestSplit(declared, receipts);
  if (split && split.apart < single) {
    const others = receipts.filter((receipt) => !split.parts.includes(receipt));
    return { parts: split.parts, split: true, doubles: others.flatMap((r) => doubleOf(r, split.parts)) };
  }
  const doubles = twins.flatMap(({ kept, again }) => again.map((receipt) => ({ receipt, of: kept })));
  return { parts: singles, split: false, doubles };
}

const doubleOf = (receipt: Paper, parts: Paper[]) => {
  const of = parts.find((part) => couldBeTwins(part, receipt));
  return of ? [{ receipt, of }] : [];
};

function bestSplit(declared: Contents, receipts: readonly Paper[]): { parts: Paper[]; apart: number } | null {
  let best: { parts: Paper[]; apart: number } | null = null;
  for (const parts of combinations(receipts)) {
    const apart = unitsApart(declared, sumOf(parts.map(({ contents }) => contents)));
    if (!best || apart < best.apart || (apart === best.apart && parts.length < best.parts.length))
      best = { parts, apart };
  }
  return best;
}

function combinations(receipts: readonly Paper[]): Paper[][] {
  if (receipts.length < 2) return [];
  if (receipts.length > MOST_COMBINED) return [inOrder(receipts)];
  const all: Paper[][] = [];
  for (let mask = 1; mask < 1 << receipts.length; mask += 1) {
    const parts = receipts.filter((_, at) => mask & (1 << at));
    if (parts.length > 1) all.push(parts);
  }
  return all;
}
