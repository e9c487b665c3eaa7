import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';
import { reconcile } from '@/shared/domain/reconciliation';
import { makeMonth, type MonthSettings } from './reconcile-month';
import { addScores, type Score, scoreOf, shortfalls } from './reconcile-score';

setFlagsFromString('--expose-gc');
/** Clears away what making the month left behind, so that its cost does not fall on the matching. */
const clearAway = runInNewContext('gc') as () => void;

/** One month: its score and the time, in milliseconds, that the matching took. */
export function measureMonth(settings: MonthSettings): { score: Score; ms: number } {
  const month = makeMonth(settings);
  clearAway();
  const start = performance.now();
  const outcome = reconcile(month.input);
  const ms = performance.now() - start;
  return { ms, score: scoreOf(month, outcome) };
}

const SEEDS = [1, 2, 3];
// A larger month is a larger circle of partners, not more trucks on each lane.
const SMALL = { shipments: 6_000, lanes: [20, 40, 80] };
const LARGE = { shipments: 48_000, lanes: [320] };
const MOST_TIMES_AS_LONG = 12;
const TRIES = 5;

export interface Measured {
  shipments: number;
  months: number;
  score: Score;
  ms: number;
}

function measureSize({ shipments, lanes }: typeof SMALL, seeds: readonly number[]): Measured {
  const months = lanes.flatMap((count) =>
    seeds.map((seed) => ({ seed: seed * 1000 + count, shipments, lanes: count })),
  );
  const measured = months.map(measureMonth);
  const last = months.at(-1);
  const timed = last ? Array.from({ length: TRIES }, () => measureMonth(last).ms) : [];
  return {
    shipments,
    months: months.length,
    score: addScores(measured.map(({ score }) => score)),
    ms: Math.min(...timed),
  };
}

interface Figures {
  small: Measured;
  large: Measured;
  ratio: number;
}

/** RULES 5, the measure: throws when a figure is not reached. Time is the best of five. */
export function measureReconciliation(seeds: readonly number[] = SEEDS): Figures {
  const small = measureSize(SMALL, seeds);
  const large = measureSize(LARGE, seeds);
  const missed = [small, large].flatMap(({ shipments, score }) =>
    shortfalls(score).map((what) => `${shipments} shipments: ${what}`),
  );
  const ratio = large.ms / small.ms;
  if (!(ratio <= MOST_TIMES_AS_LONG))
    missed.push(`${LARGE.shipments} shipments take ${ratio.toFixed(1)} times as long`);
  if (missed.length > 0) throw new Error(missed.join('\n'));
  return { small, large, ratio };
}

const percent = (part: number, whole: number) => `${((100 * part) / whole).toFixed(3)} %`;

function report({ shipments, months, score, ms }: Measured): string {
  return [
    `${shipments} shipments, ${months} months:`,
    `precision ${percent(score.right, score.matched)} (${score.matched - score.right} of ${score.matched} wrong)`,
    `recall ${percent(score.right, score.truth)}`,
    `with suggestions ${percent(score.found, score.truth)}`,
    `double entries told ${score.doublesTold} of ${score.doubles}, wrongly ${score.doublesWrong} in ${score.receipts} receipts`,
    `${ms.toFixed(0)} ms a month`,
  ].join('\n  ');
}

function print(): void {
  const { small, large, ratio } = measureReconciliation();
  for (const measured of [small, large]) console.log(report(measured));
  console.log(`${LARGE.shipments} take ${ratio.toFixed(1)} times as long as ${SMALL.shipments}`);
}

if (require.main === module) print();
