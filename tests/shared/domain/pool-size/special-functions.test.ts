import { pgamma, pnorm, qnorm } from 'lib-r-math.js';

import { gammaSurvival } from '@/shared/domain/pool-size/gamma-survival';
import { normalAtMost, normalQuantile } from '@/shared/domain/pool-size/standard-normal';

// Standard normal quantiles, as in any standard text.
test.each([
  [0.8, 0.8416],
  [0.85, 1.0364],
  [0.9, 1.2816],
  [0.95, 1.6449],
  [0.97, 1.8808],
  [0.975, 1.96],
  [0.98, 2.0537],
  [0.99, 2.3263],
  [0.995, 2.5758],
  [0.999, 3.0902],
])('normal table: the quantile at %f is %f', (probability, z) => {
  expect(normalQuantile(probability)).toBeCloseTo(z, 4);
  expect(normalQuantile(1 - probability)).toBeCloseTo(-z, 4);
});

// Chopra and Meindl, Supply Chain Management, print z = 1.2815516 at 90 % (from memory, recomputed).
test('the quantile at 0.9 is 1.2815516 to seven decimals', () => {
  expect(normalQuantile(0.9)).toBeCloseTo(1.2815516, 7);
});

test('normal probabilities and quantiles agree with the statistics package', () => {
  for (let z = -8; z <= 8; z += 0.125) {
    expect(Math.abs(normalAtMost(z) - pnorm(z))).toBeLessThan(1e-13);
    if (z < 0) expect(Math.abs(normalAtMost(z) / pnorm(z) - 1)).toBeLessThan(1e-11);
  }
  for (const p of [1e-9, 1e-6, 0.001, 0.02, 0.3, 0.5, 0.77, 0.98, 0.9999, 1 - 1e-9]) {
    expect(Math.abs(normalQuantile(p) - qnorm(p))).toBeLessThan(1e-11);
  }
});

const shapes = [
  1e-6, 0.01, 0.3, 0.5, 1, 2.5, 14.9, 15, 25.086805555, 400, 12_345.6, 3e6, 9.9e6, 1.1e7, 1e9, 1e12,
];

test.each(shapes)('gamma survival agrees with the statistics package at shape %f', (shape) => {
  const sd = Math.sqrt(shape);
  for (let off = -7; off <= 12; off += 0.25) {
    const x = shape + off * sd;
    if (x <= 0) continue;
    expect(Math.abs(gammaSurvival(x, shape) - pgamma(x, shape, undefined, 1, false))).toBeLessThan(1e-10);
  }
});

// Shape n, whole: P(X > x) = P(Poisson(x) < n), a finite sum.
test.each([1, 2, 5, 25, 60])('gamma survival of shape %i is a finite Poisson sum', (shape) => {
  for (let x = 0.1; x < 150; x += 0.7) {
    let term = Math.exp(-x);
    let sum = term;
    for (let k = 1; k < shape; k += 1) sum += term *= x / k;
    expect(Math.abs(gammaSurvival(x, shape) - sum)).toBeLessThan(5e-14);
    if (x > shape + 1) expect(Math.abs(gammaSurvival(x, shape) / sum - 1)).toBeLessThan(1e-12);
  }
});

test('at and below 0 everything is still out, far beyond the mean nothing', () => {
  expect(gammaSurvival(0, 0.001)).toBe(1);
  expect(gammaSurvival(-1, 5)).toBe(1);
  expect(gammaSurvival(5_000, 5)).toBe(0);
  expect(gammaSurvival(Infinity, 5)).toBe(0);
  expect(normalAtMost(Infinity)).toBe(1);
});
