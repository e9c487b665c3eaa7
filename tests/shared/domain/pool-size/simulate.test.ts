import { CannotSize, type PoolInput, sizePool } from '@/shared/domain/pool-size';
import { simulatePeak } from '@/shared/domain/pool-size/simulate';

import { anInput } from './inputs';
import { seededUniform } from './seeded-uniform';

const cases: { about: string; input: PoolInput; seed: number }[] = [
  {
    about: 'demand wider than Poisson, one by one',
    input: anInput({ perDay: { mean: 12, sd: 6 }, days: { mean: 8.5, sd: 1.7 } }),
    seed: 11,
  },
  {
    about: 'demand wider than Poisson, together',
    input: anInput({ perDay: { mean: 12, sd: 6 }, days: { mean: 8.5, sd: 1.7 }, travel: 'together' }),
    seed: 12,
  },
  {
    about: 'the same number every day, one by one',
    input: anInput({ perDay: { mean: 12, sd: 0 }, days: { mean: 10, sd: 2.2 } }),
    seed: 13,
  },
  {
    about: 'the same number every day, together',
    input: anInput({ perDay: { mean: 12, sd: 0 }, days: { mean: 10, sd: 2.2 }, travel: 'together' }),
    seed: 14,
  },
  {
    about: 'Poisson demand and a loop time wider than exponential',
    input: anInput({ perDay: { mean: 4, sd: 2 }, days: { mean: 3, sd: 4 } }),
    seed: 15,
  },
  {
    about: 'demand narrower than Poisson, not whole, fixed loop',
    input: anInput({ perDay: { mean: 20.4, sd: 2.5 }, days: { mean: 6.5, sd: 0 }, travel: 'together' }),
    seed: 16,
  },
  {
    about: 'two parts, six legs',
    input: anInput({
      flows: [
        { part: 'heat exchanger', unitsPerDay: { mean: 240, sd: 90 }, unitsPerContainer: 24 },
        { part: 'fan shroud', unitsPerDay: { mean: 60, sd: 20 }, unitsPerContainer: 12 },
      ],
      legs: [1.5, 1, 2, 0.5, 2.5, 1].map((mean, leg) => ({
        name: `leg ${leg}`,
        days: { mean, sd: mean / 2 },
      })),
      travel: 'together',
    }),
    seed: 17,
  },
];

const BATCHES = 60;
const DAYS_PER_BATCH = 1_000;

describe('60 000 simulated days agree with the formulas within 4 standard errors', () => {
  it.each(cases)('$about', ({ input, seed }) => {
    const run = { batches: BATCHES, daysPerBatch: DAYS_PER_BATCH, uniform: seededUniform(seed) };
    const seen = simulatePeak(input, run);
    const computed = sizePool(input);
    expect(seen.meanError).toBeGreaterThan(0);
    expect(seen.meanError / computed.peakMean).toBeLessThan(0.01);
    expect(seen.varianceError / computed.peakVariance).toBeLessThan(0.05);
    expect(Math.abs(seen.mean - computed.peakMean) / seen.meanError).toBeLessThan(4);
    expect(Math.abs(seen.variance - computed.peakVariance) / seen.varianceError).toBeLessThan(4);
  });
});

test('one by one and together are told apart by the simulation', () => {
  const run = { batches: 20, daysPerBatch: 500 };
  const input = anInput({ perDay: { mean: 12, sd: 6 }, days: { mean: 8.5, sd: 1.7 } });
  const apart = simulatePeak(input, { ...run, uniform: seededUniform(1) });
  const together = simulatePeak({ ...input, travel: 'together' }, { ...run, uniform: seededUniform(1) });
  expect(together.variance - apart.variance).toBeGreaterThan(
    4 * (together.varianceError + apart.varianceError),
  );
});

test('the same seed gives the same days, another seed gives others', () => {
  const mean = (seed: number) =>
    simulatePeak(anInput(), { batches: 2, daysPerBatch: 50, uniform: seededUniform(seed) }).mean;
  expect(mean(7)).toBe(mean(7));
  expect(mean(7)).not.toBe(mean(8));
});

test('half a container every day is refused: no whole number has that mean and no spread', () => {
  const input = anInput({ perDay: { mean: 40.5, sd: 0 } });
  const run = { batches: 2, daysPerBatch: 10, uniform: seededUniform(1) };
  expect(() => simulatePeak(input, run)).toThrow(CannotSize);
});
