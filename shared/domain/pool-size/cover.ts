import { pnbinom, pnorm, ppois, qnorm } from 'lib-r-math.js';

import { type Peak } from './peak';
import { CannotSize } from './refusal';
import { roundUp } from './round-up';

export type Distribution = 'poisson' | 'negative binomial' | 'normal';

// RULES 7: variance and mean count as equal within this, relative to the mean above 1.
const EQUAL_WITHIN = 1e-9;
/** The largest pool that is sized, in containers: ten times the largest a plant could stack. */
export const MOST_CONTAINERS = 10_000_000;

/** RULES 7: wider than Poisson, Poisson (Palm's theorem), or narrower. */
export function distributionOf({ mean, variance }: Peak): Distribution {
  if (Math.abs(variance - mean) <= EQUAL_WITHIN * Math.max(1, mean)) return 'poisson';
  return variance > mean ? 'negative binomial' : 'normal';
}

/** P(in loop ≤ containers) for the distribution with the peak's mean and variance. */
export function coverOf(peak: Peak): (containers: number) => number {
  const { mean, variance } = peak;
  switch (distributionOf(peak)) {
    case 'poisson':
      return (containers) => ppois(containers, mean);
    case 'negative binomial': {
      const size = mean ** 2 / (variance - mean);
      return (containers) => pnbinom(containers, size, mean / variance);
    }
    case 'normal': {
      const sd = Math.sqrt(variance);
      // Continuity correction: a whole number stands for the half on either side of it.
      return (containers) =>
        sd === 0 ? Number(containers + 0.5 >= mean) : pnorm(containers + 0.5, mean, sd);
    }
  }
}

/** The smallest whole number of containers that covers with at least this probability (RULES 7). */
export function neededForCover(peak: Peak, probability: number): number {
  if (distributionOf(peak) === 'normal') {
    return roundUp(peak.mean + qnorm(probability) * Math.sqrt(peak.variance) - 0.5);
  }
  return smallestCovering(coverOf(peak), probability);
}

function smallestCovering(cover: (containers: number) => number, probability: number): number {
  let enough = 1;
  while (cover(enough) < probability) {
    if (enough > MOST_CONTAINERS) {
      throw new CannotSize('figures too large', {
        at: '',
        because: `more than ${MOST_CONTAINERS} containers needed`,
      });
    }
    enough *= 2;
  }
  let tooFew = -1;
  while (enough - tooFew > 1) {
    const middle = Math.floor((enough + tooFew) / 2);
    if (cover(middle) >= probability) enough = middle;
    else tooFew = middle;
  }
  return enough;
}
