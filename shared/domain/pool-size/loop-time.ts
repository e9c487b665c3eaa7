import { gammaSurvival } from './gamma-survival';
import { type PoolInput } from './input';
import { CannotSize } from './refusal';

/** Days from dispatch to dispatch again: mean and standard deviation, in working days. */
export interface LoopTime {
  mean: number;
  sd: number;
}

// RULES 7: the sums over k run until P(loop time > k) falls below this.
const NEGLIGIBLE = 1e-12;
const MOST_DAYS = 100_000;
// Beyond this shape the gamma is a point as far as a double can tell.
const FIXED_SHAPE = 1e15;

/** Legs one after the other, each independent: means add, variances add. Refuses a loop of 0 days. */
export function loopTime(legs: PoolInput['legs']): LoopTime {
  const mean = legs.reduce((days, leg) => days + leg.days.mean, 0);
  const variance = legs.reduce((days, leg) => days + leg.days.sd ** 2, 0);
  if (mean === 0) throw new CannotSize('no time in the loop', { at: 'legs', because: 'every leg is 0 days' });
  return { mean, sd: Math.sqrt(variance) };
}

/** Shape of the gamma with that mean and sd; its scale is mean ÷ shape. Infinite where the time is fixed. */
export function gammaShape({ mean, sd }: LoopTime): number {
  const shape = sd === 0 ? Infinity : (mean / sd) ** 2;
  return shape > FIXED_SHAPE ? Infinity : shape;
}

/**
 * p_k = P(loop time > k days) for k = 0, 1, 2 … until it falls below 1e-12 (RULES 7): the share of what left
 * k days ago that is still out. Refuses a loop time whose tail is longer than 100 000 days.
 */
export function stillOutAfter(loop: LoopTime): number[] {
  const shape = gammaShape(loop);
  const survival = (days: number): number =>
    shape === Infinity ? Number(loop.mean > days) : gammaSurvival((days * shape) / loop.mean, shape);
  const shares: number[] = [];
  for (let days = 0; ; days += 1) {
    const share = survival(days);
    if (share < NEGLIGIBLE) return shares;
    if (days >= MOST_DAYS) {
      throw new CannotSize('loop time spreads too widely', {
        at: 'legs',
        because: `containers would still be out after ${MOST_DAYS} days`,
      });
    }
    shares.push(share);
  }
}
