import { poolCurve, type PoolInput, sizePool, travelModes } from '@/shared/domain/pool-size';

/** Work may grow about in line with the containers in the loop: at most 12 times for ten times as many. */
const MOST = 12;
const CALLS = 300;
const RUNS = 9;

export interface PoolSizeFigures {
  /** Milliseconds for one sizePool, about 600 containers in the loop. */
  sizeMs: number;
  /** The same loop with ten times the demand, about 6 000 containers. */
  tenfoldMs: number;
  ratio: number;
  /** Milliseconds for one curve of 120 points from 0 to twice what is needed. */
  curveMs: number;
}

/** Two parts and six legs, as the engineer states them; `times` the demand. */
function loop(times: number, travel: PoolInput['travel']): PoolInput {
  const legs: [name: string, mean: number, sd: number][] = [
    ['filled at the supplier', 1.5, 0.5],
    ['on the way to the plant', 1, 0.3],
    ['full stock at the plant', 2, 1],
    ['at the line', 0.5, 0.1],
    ['empties at the plant', 2.5, 1.2],
    ['on the way back', 1, 0.3],
  ];
  const flows: [part: string, mean: number, sd: number, unitsPerContainer: number][] = [
    ['heat exchanger', 960, 190, 24],
    ['fan shroud', 300, 60, 12],
  ];
  return {
    flows: flows.map(([part, mean, sd, unitsPerContainer]) => ({
      part,
      unitsPerDay: { mean: mean * times, sd: sd * times },
      unitsPerContainer,
    })),
    legs: legs.map(([name, mean, sd]) => ({ name, days: { mean, sd } })),
    travel,
    bufferDays: 1,
    coverProbability: 0.98,
    heldPct: 1.5,
    repairPct: 2,
    lossPerTripPct: 0.2,
    workingDaysPerYear: 235,
  };
}

/** Median over the runs of the milliseconds for one call. */
function medianMs(call: () => unknown): number {
  const times = Array.from({ length: RUNS }, () => {
    const start = performance.now();
    for (let again = 0; again < CALLS; again += 1) call();
    return (performance.now() - start) / CALLS;
  });
  return times.sort((a, b) => a - b)[Math.floor(RUNS / 2)] ?? NaN;
}

/** Times of sizing and of the curve, both ways to travel alike; throws when the growth is over the limit. */
export async function benchPoolSize(): Promise<{ name: string; figures: PoolSizeFigures }> {
  const [small, large] = [1, 10].map((times) => travelModes.map((travel) => loop(times, travel)));
  const sizeAll = (inputs: PoolInput[] = []) => inputs.forEach((input) => sizePool(input));
  const perInput = (inputs?: PoolInput[]) => medianMs(() => sizeAll(inputs)) / travelModes.length;
  // The first runs are the compiler's, not ours.
  perInput(small);
  const sizeMs = perInput(small);
  const tenfoldMs = perInput(large);
  const ratio = tenfoldMs / sizeMs;
  if (!(ratio <= MOST))
    throw new Error(`sizePool: ten times the containers take ${ratio.toFixed(1)} times as long`);
  const input = loop(1, 'together');
  const to = 2 * sizePool(input).needed;
  const curveMs = medianMs(() => poolCurve(input, { from: 0, to, steps: 120 }));
  return { name: 'pool-size', figures: { sizeMs, tenfoldMs, ratio, curveMs } };
}

async function print(): Promise<void> {
  const { sizeMs, tenfoldMs, ratio, curveMs } = (await benchPoolSize()).figures;
  const [size, tenfold, curve] = [sizeMs, tenfoldMs, curveMs].map((ms) => ms.toFixed(2));
  console.log(`sizePool ${size} ms, tenfold ${tenfold} ms, ratio ${ratio.toFixed(2)}; curve ${curve} ms`);
}

if (require.main === module) void print();
