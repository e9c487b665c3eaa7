import fc from 'fast-check';
import { ppois } from 'lib-r-math.js';

import { negativeBinomial, poisson } from '@/shared/domain/pool-size/count-distribution';
import { countAtPeak, distributionOf } from '@/shared/domain/pool-size/cover';

const seeded = { seed: 20260312, numRuns: 200 };

// Cumulative Poisson table, as in any standard text.
test.each([
  [1, 1, 0.7358],
  [2, 2, 0.6767],
  [3, 2, 0.8571],
  [5, 5, 0.616],
  [7, 5, 0.8666],
  [10, 10, 0.583],
  [15, 10, 0.9513],
  [20, 20, 0.5591],
  [25, 20, 0.8878],
])('Poisson table: P(X ≤ %i) at mean %i is %f', (count, mean, probability) => {
  expect(poisson(mean).atMost(count)).toBeCloseTo(probability, 4);
});

// The same tables read backwards: smallest x with F(x) ≥ .90, .95, .99, .999.
test.each([
  [1, [2, 3, 4, 5]],
  [2, [4, 5, 6, 8]],
  [5, [8, 9, 11, 13]],
  [10, [14, 15, 18, 21]],
  [20, [26, 28, 31, 35]],
  [50, [59, 62, 67, 73]],
  [100, [113, 117, 124, 132]],
])('Poisson table: mean %i is covered at .90 .95 .99 .999 by %j', (mean, counts) => {
  const { smallestCovering } = poisson(mean);
  expect([0.9, 0.95, 0.99, 0.999].map(smallestCovering)).toEqual(counts);
});

// Standard normal quantiles, as in any standard text. Mean and sd are chosen so that one container is 1e-4 sd.
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
])('normal table: cover %f lies %f standard deviations above the mean', (probability, z) => {
  const mean = 500_000_000;
  const inLoop = countAtPeak({ mean, variance: 1e8 });
  const needed = inLoop.smallestCovering(probability);
  expect(Math.abs((needed + 0.5 - mean) / 1e4 - z)).toBeLessThan(1.6e-4);
  expect(inLoop.atMost(needed)).toBeGreaterThanOrEqual(probability);
  expect(inLoop.atMost(needed - 1)).toBeLessThan(probability);
});

test('Poisson agrees with the statistics package at every count from 4 sd below the mean to 5 above', () => {
  for (const mean of [0.001, 0.3, 1, 5, 50, 585, 20_000]) {
    const { atMost } = poisson(mean);
    const sd = Math.sqrt(mean);
    for (let z = -4; z <= 5; z += 0.25) {
      const count = Math.max(0, Math.floor(mean + z * sd));
      expect(Math.abs(atMost(count) - ppois(count, mean))).toBeLessThan(1e-13);
    }
  }
});

test.each([0.2, 3, 400])(
  'negative binomial of r = 1 is the geometric: P(X ≤ k) = 1 − q^(k+1), mean %f',
  (mean) => {
    const { atMost } = negativeBinomial({ mean, variance: mean + mean ** 2 });
    const q = mean / (1 + mean);
    for (let count = 0; count < 5 * mean + 3; count += 1) {
      expect(Math.abs(atMost(count) - (1 - q ** (count + 1)))).toBeLessThan(1e-12);
    }
  },
);

const wide = fc
  .tuple(fc.double({ min: 0.05, max: 400, noNaN: true }), fc.double({ min: 1.05, max: 30, noNaN: true }))
  .map(([mean, ratio]) => ({ mean, variance: mean * ratio }));

test('negative binomial has the mean and the variance it was asked for', () => {
  fc.assert(
    fc.property(wide, (peak) => {
      const { atMost, smallestCovering } = negativeBinomial(peak);
      const last = smallestCovering(1 - 1e-13) + 1;
      let mean = 0;
      let square = 0;
      for (let count = 0; count <= last; count += 1) {
        const beyond = 1 - atMost(count);
        mean += beyond;
        square += (2 * count + 1) * beyond;
      }
      expect(mean / peak.mean).toBeCloseTo(1, 6);
      expect((square - mean ** 2) / peak.variance).toBeCloseTo(1, 5);
    }),
    seeded,
  );
});

test('a variance a hair above the mean gives nearly the Poisson cover', () => {
  fc.assert(
    fc.property(
      fc.double({ min: 0.1, max: 2_000, noNaN: true }),
      fc.double({ min: -4, max: 5 }),
      (mean, z) => {
        const count = Math.max(0, Math.floor(mean + z * Math.sqrt(mean)));
        const wider = negativeBinomial({ mean, variance: mean * (1 + 1e-6) });
        expect(Math.abs(wider.atMost(count) - poisson(mean).atMost(count))).toBeLessThan(1e-6);
      },
    ),
    seeded,
  );
});

test.each([
  [{ mean: 400, variance: 400.00000000000006 }, 'poisson'],
  [{ mean: 400, variance: 400.001 }, 'negative binomial'],
  [{ mean: 400, variance: 399.999 }, 'normal'],
])('%j is taken as %s', (peak, distribution) => {
  expect(distributionOf(peak)).toBe(distribution);
});
