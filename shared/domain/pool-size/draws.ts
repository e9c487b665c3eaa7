import { type CountDistribution, negativeBinomial, poisson } from './count-distribution';
import { distributionOf } from './cover';
import { gammaShape, type LoopTime } from './loop-time';
import { type Dispatch } from './peak';
import { CannotSize } from './refusal';

/** A stream of numbers, evenly spread over 0 ≤ u < 1. The caller makes it from a seed. */
export type Uniform = () => number;

/**
 * Draws of a day's dispatch: whole containers with exactly the mean and variance given. Refuses where no
 * whole number of containers can have them, such as 40.5 a day, every day.
 */
export function dispatchDraws(dispatch: Dispatch, uniform: Uniform): () => number {
  switch (distributionOf(dispatch)) {
    case 'poisson':
      return inverse(poisson(dispatch.mean), uniform);
    case 'negative binomial':
      return inverse(negativeBinomial(dispatch), uniform);
    case 'normal':
      return nearMean(dispatch, uniform);
  }
}

const inverse =
  (counts: CountDistribution, uniform: Uniform): (() => number) =>
  () =>
    counts.smallestCovering(uniform());

/**
 * Narrower than Poisson: the whole number below the mean or the one above, so that the mean is met; then
 * as far up as down, with the chance that makes up the variance.
 */
function nearMean({ mean, variance }: Dispatch, uniform: Uniform): () => number {
  const below = Math.floor(mean);
  const above = mean - below;
  const missing = variance - above * (1 - above);
  const step = Math.ceil(Math.sqrt(Math.max(0, missing)));
  if (missing < -1e-9 || step > below) {
    throw new CannotSize('no whole containers a day', {
      at: 'flows',
      because: `no whole number has mean ${mean} and variance ${variance}`,
    });
  }
  const chance = step === 0 ? 0 : missing / step ** 2;
  return () => {
    const count = below + Number(uniform() < above);
    const side = uniform();
    if (side >= chance) return count;
    return side < chance / 2 ? count - step : count + step;
  };
}

/** Draws of a loop time in days: gamma with that mean and sd, or the mean itself where the sd is 0. */
export function loopTimeDraws(loop: LoopTime, uniform: Uniform): () => number {
  const shape = gammaShape(loop);
  if (shape === Infinity) return () => loop.mean;
  const scale = loop.mean / shape;
  if (shape >= 1) return () => scale * gamma(shape, uniform);
  // Below a shape of 1: Gamma(shape) = Gamma(shape + 1) × U^(1 ÷ shape).
  return () => scale * gamma(shape + 1, uniform) * (1 - uniform()) ** (1 / shape);
}

/** Marsaglia and Tsang, "A simple method for generating gamma variables", ACM TOMS 26(3), 2000. Shape ≥ 1. */
function gamma(shape: number, uniform: Uniform): number {
  const d = shape - 1 / 3;
  const c = 1 / Math.sqrt(9 * d);
  for (;;) {
    const x = standardNormal(uniform);
    const v = (1 + c * x) ** 3;
    if (v <= 0) continue;
    if (Math.log(1 - uniform()) < (x * x) / 2 + d * (1 - v + Math.log(v))) return d * v;
  }
}

/** Box and Muller, Annals of Mathematical Statistics 29, 1958. */
function standardNormal(uniform: Uniform): number {
  return Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform());
}
