import fc from 'fast-check';

import { poolCurve, type PoolInput, sizePool, travelModes } from '@/shared/domain/pool-size';

import { near } from './pool-size/closely';

const seeded = { seed: 20260312, numRuns: 150 };

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const flow = fc.record({
  part: fc.constantFrom('bracket', 'casting', 'fan shroud'),
  unitsPerDay: fc.record({ mean: real(1, 2_000), sd: real(0, 600) }),
  unitsPerContainer: fc.integer({ min: 1, max: 60 }),
});
const leg = fc.record({
  name: fc.constantFrom('out', 'at the plant', 'home'),
  days: fc.record({ mean: real(0.05, 12), sd: real(0, 4) }),
});
const anyInput: fc.Arbitrary<PoolInput> = fc.record({
  flows: fc.array(flow, { minLength: 1, maxLength: 4 }),
  legs: fc.array(leg, { minLength: 1, maxLength: 6 }),
  travel: fc.constantFrom(...travelModes),
  bufferDays: real(0, 5),
  coverProbability: real(0.5, 0.9999),
  heldPct: real(0, 20),
  repairPct: real(0, 20),
  lossPerTripPct: real(0, 3),
  workingDaysPerYear: fc.integer({ min: 200, max: 300 }),
});
const total = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0);

test('the average in the loop is containers a day × days in the loop, and the legs share it out (Little)', () => {
  fc.assert(
    fc.property(anyInput, (input) => {
      const size = sizePool(input);
      const days = total(input.legs.map(({ days: { mean } }) => mean));
      const perDay = total(
        input.flows.map(({ unitsPerDay, unitsPerContainer }) => unitsPerDay.mean / unitsPerContainer),
      );
      expect(size.averageInLoop).toEqual(near(perDay * days));
      expect(total(size.legs.map(({ containers }) => containers))).toEqual(near(size.averageInLoop));
    }),
    seeded,
  );
});

test('the peak lies between the average in the loop and one dispatch more', () => {
  fc.assert(
    fc.property(anyInput, (input) => {
      const { peakMean, averageInLoop, containersPerDay } = sizePool(input);
      expect(peakMean).toBeGreaterThanOrEqual(averageInLoop * (1 - 1e-9));
      expect(peakMean).toBeLessThanOrEqual((averageInLoop + containersPerDay) * (1 + 1e-9));
    }),
    seeded,
  );
});

test('a higher cover never needs fewer containers, and what is needed is the fewest that cover', () => {
  fc.assert(
    fc.property(anyInput, real(0.5, 0.9999), (input, other) => {
      const [low, high] = [input.coverProbability, other].sort((a, b) => a - b);
      const needed = (coverProbability = 0) => sizePool({ ...input, coverProbability }).neededForCover;
      expect(needed(high)).toBeGreaterThanOrEqual(needed(low));
      const at = needed(high);
      const cover = poolCurve(input, { from: Math.max(0, at - 1), to: at }).map((point) => point.cover);
      expect(cover.at(-1)).toBeGreaterThanOrEqual((high ?? 1) - 1e-9);
      if (at > 0) expect(cover[0]).toBeLessThan((high ?? 1) + 1e-9);
    }),
    seeded,
  );
});

test('along the curve cover never falls, the fall-back share falls, both stay shares', () => {
  fc.assert(
    fc.property(anyInput, (input) => {
      const points = poolCurve(input, { from: 0, to: sizePool(input).needed + 20 });
      points.slice(1).forEach((point, index) => {
        const before = points[index];
        expect(point.cover).toBeGreaterThanOrEqual(before?.cover ?? 0);
        expect(point.cover).toBeLessThanOrEqual(1);
        expect(point.fallbackShare).toBeGreaterThanOrEqual(0);
        if (before && before.fallbackShare > 0)
          expect(point.fallbackShare).toBeLessThan(before.fallbackShare);
      });
    }),
    { ...seeded, numRuns: 30 },
  );
});

test('the order of parts and of legs changes nothing', () => {
  fc.assert(
    fc.property(anyInput, (input) => {
      const { legs: _there, ...forth } = sizePool(input);
      const turned = { ...input, flows: [...input.flows].reverse(), legs: [...input.legs].reverse() };
      const { legs: _back, ...back } = sizePool(turned);
      expect(back.needed).toBe(forth.needed);
      expect(back.peakVariance).toEqual(near(forth.peakVariance));
    }),
    seeded,
  );
});

test('from one container a day on, coming back as a truckload never narrows the peak', () => {
  fc.assert(
    fc.property(anyInput, (input) => {
      const together = sizePool({ ...input, travel: 'together' });
      const independent = sizePool({ ...input, travel: 'independent' });
      fc.pre(together.containersPerDay >= 1);
      expect(together.peakMean).toBe(independent.peakMean);
      expect(together.peakVariance).toBeGreaterThanOrEqual(independent.peakVariance * (1 - 1e-9));
    }),
    seeded,
  );
});

test('the pool leaves what is needed free, and no pool one smaller does', () => {
  fc.assert(
    fc.property(anyInput, (input) => {
      const { poolSize, needed, neededForBuffer, neededForCover } = sizePool(input);
      const free = 1 - (input.heldPct + input.repairPct) / 100;
      expect(needed).toBe(Math.max(neededForBuffer, neededForCover, 1));
      expect(poolSize * free).toBeGreaterThanOrEqual(needed - 1e-6);
      expect((poolSize - 1) * free).toBeLessThan(needed);
    }),
    seeded,
  );
});
