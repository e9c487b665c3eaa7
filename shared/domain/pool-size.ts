import { type CountDistribution, poisson } from './pool-size/count-distribution';
import { countAtPeak, type Distribution, distributionOf } from './pool-size/cover';
import { erlangB, fallbackShare } from './pool-size/erlang-b';
import { parsePoolInput, type PoolInput } from './pool-size/input';
import { loopTime, type LoopTime, stillOutAfter } from './pool-size/loop-time';
import { type Dispatch, dispatchPerDay, type Peak, peakInLoop } from './pool-size/peak';
import { CannotSize } from './pool-size/refusal';
import { roundUp } from './pool-size/round-up';

export { type Distribution } from './pool-size/cover';
export { poolInput, type PoolInput, type TravelMode, travelModes } from './pool-size/input';
export { CannotSize, type SizingRefusal } from './pool-size/refusal';

/** RULES 7, Output. Containers, working days and shares; nothing in percent. */
export interface PoolSize {
  containersPerDay: number;
  sdPerDay: number;
  loopDays: number;
  loopSd: number;
  averageInLoop: number;
  legs: { name: string; containers: number }[];
  peakMean: number;
  peakVariance: number;
  distribution: Distribution;
  neededForCover: number;
  neededForBuffer: number;
  needed: number;
  poolSize: number;
  poissonNeeded: number;
  fallbackShareAtNeeded: number;
  tripsPerYear: number;
  tripsPerContainerPerYear: number;
  replacementsPerYear: number;
}

/** One point of the curve: so many containers free for the loop, hence so large a pool. */
export interface PoolCurvePoint {
  containers: number;
  poolSize: number;
  cover: number;
  fallbackShare: number;
}

/** How many containers the loop needs, and why (RULES 7). Refuses what cannot be with CannotSize. */
export function sizePool(raw: unknown): PoolSize {
  const input = parsePoolInput(raw);
  const { dispatch, loop, peak, average, inLoop } = loopOf(input);
  const forCover = inLoop.smallestCovering(input.coverProbability);
  const forBuffer = roundUp(dispatch.mean * (loop.mean + input.bufferDays));
  const needed = checkedCount(Math.max(forCover, forBuffer, 1));
  const poolSize = poolOf(needed, input);
  const tripsPerYear = dispatch.mean * input.workingDaysPerYear;
  return {
    containersPerDay: dispatch.mean,
    sdPerDay: Math.sqrt(dispatch.variance),
    loopDays: loop.mean,
    loopSd: loop.sd,
    averageInLoop: average,
    legs: input.legs.map(({ name, days }) => ({ name, containers: dispatch.mean * days.mean })),
    peakMean: peak.mean,
    peakVariance: peak.variance,
    distribution: distributionOf(peak),
    neededForCover: forCover,
    neededForBuffer: forBuffer,
    needed,
    poolSize,
    poissonNeeded: poisson(average).smallestCovering(input.coverProbability),
    fallbackShareAtNeeded: fallbackShare(average, needed),
    tripsPerYear,
    tripsPerContainerPerYear: tripsPerYear / poolSize,
    replacementsPerYear: tripsPerYear * (input.lossPerTripPct / 100),
  };
}

/**
 * What each number of containers gives, from `from` to `to`, both included: the probability that they cover
 * the peak, and the fall-back share (RULES 7). With `steps`, about that many points evenly spread, else
 * every whole number. Refuses an input that sizePool refuses, and a range that is not whole and ascending.
 */
export function poolCurve(
  raw: unknown,
  range: { from: number; to: number; steps?: number },
): PoolCurvePoint[] {
  const input = parsePoolInput(raw);
  const wanted = pointsOf(range);
  const { average, inLoop } = loopOf(input);
  const points: PoolCurvePoint[] = [];
  let containers = 0;
  for (const share of erlangB(average, range.to)) {
    if (wanted.has(containers)) {
      const poolSize = poolOf(containers, input);
      points.push({ containers, poolSize, cover: inLoop.atMost(containers), fallbackShare: share });
    }
    containers += 1;
  }
  return points;
}

/** The largest pool that is sized: far above any plant, and still summed in a moment. */
const MOST_CONTAINERS = 10_000_000;

interface Loop {
  dispatch: Dispatch;
  loop: LoopTime;
  peak: Peak;
  inLoop: CountDistribution;
  /** Containers in the loop on average: Little's law. */
  average: number;
}

function loopOf(input: PoolInput): Loop {
  const dispatch = dispatchPerDay(input.flows);
  const loop = loopTime(input.legs);
  const average = dispatch.mean * loop.mean;
  checkedCount(dispatch.mean * (loop.mean + input.bufferDays));
  const peak = peakInLoop(dispatch, stillOutAfter(loop), input.travel);
  return { dispatch, loop, average, peak, inLoop: countAtPeak(peak) };
}

/** The pool from which so many stay free for the loop, beside those held for quality and in repair. */
function poolOf(needed: number, { heldPct, repairPct }: PoolInput): number {
  return roundUp(needed / (1 - heldPct / 100 - repairPct / 100));
}

function checkedCount(containers: number): number {
  if (containers <= MOST_CONTAINERS) return containers;
  throw new CannotSize('figures too large', { at: '', because: `more than ${MOST_CONTAINERS} containers` });
}

function pointsOf({ from, to, steps }: { from: number; to: number; steps?: number }): Set<number> {
  const whole = Number.isInteger(from) && Number.isInteger(to) && from >= 0 && from <= to;
  if (!whole || to > MOST_CONTAINERS || (steps !== undefined && !(Number.isInteger(steps) && steps >= 2))) {
    throw new RangeError(`Not a range of whole containers: ${from} to ${to} in ${steps ?? 'all'} steps`);
  }
  const count = Math.min(steps ?? Infinity, to - from + 1);
  const gap = count > 1 ? (to - from) / (count - 1) : 0;
  return new Set(Array.from({ length: count }, (_, point) => Math.round(from + gap * point)));
}
