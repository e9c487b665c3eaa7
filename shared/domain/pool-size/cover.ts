import { type CountDistribution, negativeBinomial, poisson } from './count-distribution';
import { type Peak } from './peak';
import { roundUp } from './round-up';
import { normalAtMost, normalQuantile } from './standard-normal';

export type Distribution = 'poisson' | 'negative binomial' | 'normal';

// RULES 7: variance and mean count as equal within this; above a mean of 1, within this share of it.
const EQUAL_WITHIN = 1e-9;

/** RULES 7: wider than Poisson, Poisson (Palm's theorem), or narrower. */
export function distributionOf({ mean, variance }: Peak): Distribution {
  if (Math.abs(variance - mean) <= EQUAL_WITHIN * Math.max(1, mean)) return 'poisson';
  return variance > mean ? 'negative binomial' : 'normal';
}

/** The count in the loop at its peak, as RULES 7 take it for this mean and variance. */
export function countAtPeak(peak: Peak): CountDistribution {
  switch (distributionOf(peak)) {
    case 'poisson':
      return poisson(peak.mean);
    case 'negative binomial':
      return negativeBinomial(peak);
    case 'normal':
      return normal(peak);
  }
}

// Continuity correction: a whole number stands for the half on either side of it.
function normal({ mean, variance }: Peak): CountDistribution {
  const sd = Math.sqrt(variance);
  return {
    atMost: (containers) =>
      sd === 0 ? Number(containers + 0.5 >= mean) : normalAtMost((containers + 0.5 - mean) / sd),
    smallestCovering: (probability) => roundUp(mean + normalQuantile(probability) * sd - 0.5),
  };
}
