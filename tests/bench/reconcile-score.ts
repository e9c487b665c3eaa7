import type { Reconciliation } from '@/shared/domain/reconciliation';
import type { Month } from './reconcile-month';

/** How the outcome for a made-up month compares with the truth. Counts, not shares. */
export interface Score {
  matched: number;
  right: number;
  truth: number;
  found: number;
  receipts: number;
  doubles: number;
  doublesTold: number;
  doublesWrong: number;
  mostOffers: number;
}

const pairKey = (shipment: string, receipt: string) => `${shipment} ${receipt}`;

const pairsOf = (all: readonly { shipments: string[]; receipts: string[] }[]) =>
  all.flatMap(({ shipments, receipts }) => shipments.flatMap((s) => receipts.map((r) => pairKey(s, r))));

export function scoreOf({ input, truth }: Month, outcome: Reconciliation): Score {
  const real = new Set(truth.pairs.map(([s, r]) => pairKey(s, r)));
  const matched = pairsOf(outcome.matches);
  const found = new Set([...matched, ...pairsOf(outcome.suggestions)]);
  const doubles = new Set(truth.duplicates);
  const offers = new Map<string, number>();
  for (const { receipts } of outcome.suggestions)
    for (const receipt of receipts) offers.set(receipt, (offers.get(receipt) ?? 0) + 1);
  return {
    matched: matched.length,
    right: matched.filter((pair) => real.has(pair)).length,
    truth: real.size,
    found: [...real].filter((pair) => found.has(pair)).length,
    receipts: input.receipts.length,
    doubles: doubles.size,
    doublesTold: outcome.duplicates.filter(({ receipt }) => doubles.has(receipt)).length,
    doublesWrong: outcome.duplicates.filter(({ receipt }) => !doubles.has(receipt)).length,
    mostOffers: Math.max(0, ...offers.values()),
  };
}

export function addScores(scores: readonly Score[]): Score {
  const sum = (of: (score: Score) => number) => scores.reduce((total, score) => total + of(score), 0);
  return {
    matched: sum((s) => s.matched),
    right: sum((s) => s.right),
    truth: sum((s) => s.truth),
    found: sum((s) => s.found),
    receipts: sum((s) => s.receipts),
    doubles: sum((s) => s.doubles),
    doublesTold: sum((s) => s.doublesTold),
    doublesWrong: sum((s) => s.doublesWrong),
    mostOffers: Math.max(0, ...scores.map((s) => s.mostOffers)),
  };
}

/** RULES 5: what the matching must reach. Names what it misses. */
export function shortfalls(score: Score): string[] {
  const checks: [string, boolean][] = [
    [`precision ${score.right / score.matched} below 0.9998`, score.right / score.matched >= 0.9998],
    [`recall ${score.right / score.truth} below 0.985`, score.right / score.truth >= 0.985],
    [`recall with suggestions ${score.found / score.truth} below 0.998`, score.found / score.truth >= 0.998],
    [`${score.mostOffers} suggestions for one receipt`, score.mostOffers <= 3],
    [`${score.doublesTold} of ${score.doubles} double entries told`, score.doublesTold === score.doubles],
    [`${score.doublesWrong} double entries told wrongly`, score.doublesWrong <= score.receipts / 1000],
  ];
  return checks.filter(([, holds]) => !holds).map(([what]) => what);
}
