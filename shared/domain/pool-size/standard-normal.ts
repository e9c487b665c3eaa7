import { gammaSurvival } from './gamma-survival';

/** P(Z ≤ z) for the standard normal: z² ÷ 2 is gamma distributed with shape ½. */
export function normalAtMost(z: number): number {
  const tail = gammaSurvival((z * z) / 2, 0.5) / 2;
  return z < 0 ? tail : 1 - tail;
}

/** The z with P(Z ≤ z) = probability, 0 < probability < 1, by halving within ±40. */
export function normalQuantile(probability: number): number {
  // The smaller tail keeps its digits where 1 less a small number would lose them.
  const tail = Math.min(probability, 1 - probability);
  let near = 0;
  let far = 40;
  for (let halving = 0; halving < 60; halving += 1) {
    const middle = (near + far) / 2;
    if (gammaSurvival((middle * middle) / 2, 0.5) / 2 > tail) near = middle;
    else far = middle;
  }
  return probability < 0.5 ? -near : near;
}
