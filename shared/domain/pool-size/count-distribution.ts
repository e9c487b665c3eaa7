import { type Peak } from './peak';
import { CannotSize } from './refusal';

/** A distribution over whole containers. */
export interface CountDistribution {
  /** P(count ≤ containers); containers whole and 0 or more. */
  atMost(containers: number): number;
  /** The smallest count with P(count ≤ it) ≥ probability. */
  smallestCovering(probability: number): number;
}

// Weights relative to the most likely count; what is smaller adds nothing that a double could hold.
const NEGLIGIBLE = 1e-22;
const MOST_TERMS = 2_000_000;

/** Poisson with that mean: P(k) ÷ P(k−1) = mean ÷ k. */
export function poisson(mean: number): CountDistribution {
  return fromRatios(Math.floor(mean), (count) => mean / count);
}

/**
 * Negative binomial with that mean and variance, the variance larger than the mean. With r = mean² ÷
 * (variance − mean) and q = 1 − mean ÷ variance: P(k) ÷ P(k−1) = (k − 1 + r) q ÷ k.
 */
export function negativeBinomial({ mean, variance }: Peak): CountDistribution {
  const r = mean ** 2 / (variance - mean);
  const q = (variance - mean) / variance;
  // The mode (r − 1) q ÷ (1 − q), with 1 − q = mean ÷ variance; below r = 1 it is 0.
  const mode = Math.max(0, Math.floor(mean - variance / mean + 1));
  return fromRatios(mode, (count) => ((count - 1 + r) * q) / count);
}

/**
 * Sums of the probabilities out from the most likely count, each from its neighbour by their ratio, divided
 * by their total: right to rounding, with no special function in it. (pnbinom of lib-r-math.js 2.0.3 was
 * found off by up to 6e-4 against such sums; its ppois serves the tests as an outside check.)
 */
function fromRatios(mode: number, ratio: (count: number) => number): CountDistribution {
  const below: number[] = [];
  let weight = 1;
  for (let count = mode; count > 0 && weight > NEGLIGIBLE; count -= 1) {
    weight /= ratio(count);
    below.push(weight);
    checkTerms(below.length);
  }
  const weights = below.reverse();
  const first = mode - weights.length;
  weight = 1;
  for (let count = mode + 1; weight > NEGLIGIBLE; count += 1) {
    weights.push(weight);
    weight *= ratio(count);
    checkTerms(weights.length);
  }
  return fromCumulative(first, cumulated(weights));
}

function fromCumulative(first: number, cumulative: readonly number[]): CountDistribution {
  return {
    atMost: (containers) => {
      if (containers < first) return 0;
      return cumulative[Math.floor(containers) - first] ?? 1;
    },
    smallestCovering: (probability) => {
      let tooFew = -1;
      let enough = cumulative.length - 1;
      while (enough - tooFew > 1) {
        const middle = (enough + tooFew) >> 1;
        if ((cumulative[middle] ?? 1) >= probability) enough = middle;
        else tooFew = middle;
      }
      return first + enough;
    },
  };
}

function cumulated(weights: readonly number[]): number[] {
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  let sum = 0;
  return weights.map((weight) => Math.min(1, (sum += weight) / total));
}

function checkTerms(terms: number): void {
  if (terms <= MOST_TERMS) return;
  throw new CannotSize('figures too large', {
    at: '',
    because: `the count in the loop spreads over ${MOST_TERMS}`,
  });
}
