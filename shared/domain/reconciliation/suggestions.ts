import type { Candidate } from './contest';
import type { Desk } from './desk';
import type { Suggestion } from './output';
import type { Paper } from './papers';
import { whyOf } from './why';

const MOST_FOR_ONE = 3;

// How much each step of likeness takes from a candidate's weight, and the weight of "none of these".
const BY_LIKENESS = [1, 0.1, 0.02, 0.005] as const;
const BY_NAME = 4;
const NONE_OF_THESE = 0.05;

interface Weighed {
  candidate: Candidate;
  weight: number;
}

/** What is left over and may belong together: for each receipt the best three, each with its rivals named. */
export function suggest(desk: Desk, candidates: readonly Candidate[]): Suggestion[] {
  const open = distinct(
    candidates.filter(({ shipment, receipt }) => desk.isOpen(shipment) && desk.isOpen(receipt)),
  );
  const weighed = open.map((candidate) => ({ candidate, weight: weigh(desk, candidate) }));
  const byShipment = group(weighed, ({ candidate }) => candidate.shipment);
  const byReceipt = group(weighed, ({ candidate }) => candidate.receipt);
  const offers = [...byReceipt.values()].flatMap((all) => {
    const total = all.reduce((sum, { weight }) => sum + weight, NONE_OF_THESE);
    return all
      .sort((a, b) => b.weight - a.weight || a.candidate.shipment.place - b.candidate.shipment.place)
      .slice(0, MOST_FOR_ONE)
      .map((one) => ({ ...one, score: Math.round((one.weight / total) * 1000) / 1000, all }));
  });
  return offers
    .sort((a, b) => b.score - a.score || a.candidate.receipt.place - b.candidate.receipt.place)
    .map(({ candidate, score, all }) => ({
      shipments: [candidate.shipment.id],
      receipts: [candidate.receipt.id],
      rule: candidate.rule,
      score,
      why: whyOf(candidate, {
        shipments: all.filter((o) => o.candidate !== candidate).map((o) => o.candidate.shipment),
        receipts: (byShipment.get(candidate.shipment)?.length ?? 1) - 1,
      }),
    }));
}

const weigh = (desk: Desk, { shipment, receipt, likeness, rule }: Candidate): number =>
  (rule === 'same reference' ? BY_NAME : 1) *
  BY_LIKENESS[likeness] *
  desk.usual.share(shipment.lane, receipt.day - shipment.day);

/** A pair that several rules offer is offered by the first, the strongest. */
function distinct(candidates: Candidate[]): Candidate[] {
  const seen = new Set<string>();
  return candidates.filter(({ shipment, receipt }) => {
    const pair = `${shipment.place} ${receipt.place}`;
    return !seen.has(pair) && seen.add(pair);
  });
}

function group(all: Weighed[], key: (one: Weighed) => Paper): Map<Paper, Weighed[]> {
  const groups = new Map<Paper, Weighed[]>();
  for (const one of all) {
    const there = groups.get(key(one));
    if (there) there.push(one);
    else groups.set(key(one), [one]);
  }
  return groups;
}
