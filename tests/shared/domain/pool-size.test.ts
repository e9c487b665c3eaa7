import { CannotSize, poolCurve, sizePool } from '@/shared/domain/pool-size';

import { near } from './pool-size/closely';
import { anInput } from './pool-size/inputs';

/** Demand D, lead time L, allowance α and container C as a loop: the kanban number is the planned buffer's. */
const kanbans = (demand: number, [lead, allowance, perContainer]: [number, number, number]) =>
  sizePool(
    anInput({
      flows: [{ part: 'part', unitsPerDay: { mean: demand, sd: 0 }, unitsPerContainer: perContainer }],
      days: { mean: lead, sd: 0 },
      bufferDays: allowance * lead,
    }),
  ).neededForBuffer;

// N = ⌈D L (1 + α) ÷ C⌉ (Monden, Toyota Production System; Hopp and Spearman, Factory Physics), time in the
// source's own unit. Krajewski, Stevenson and Chase from memory and recomputed; the others read.
test.each([
  { source: 'Krajewski, Operations Management', demand: 2000, rest: [0.1, 0.1, 22], needed: 10 },
  { source: 'Stevenson, JIT chapter', demand: 300, rest: [0.12, 0.2, 25], needed: 2 },
  { source: 'Chase and Jacobs', demand: 8, rest: [4, 0.1, 10], needed: 4 },
  { source: 'Russell and Taylor, slides', demand: 150, rest: [0.5, 0.1, 25], needed: 4 },
  { source: 'course exercise', demand: 300, rest: [4, 0.1, 40], needed: 33 },
  { source: 'course exercise', demand: 1200, rest: [0.7, 0.16, 80], needed: 13 },
  { source: 'course exercise', demand: 2000, rest: [0.4, 0.1, 200], needed: 5 },
  { source: 'course exercise', demand: 1000, rest: [2, 0.15, 250], needed: 10 },
  { source: 'course exercise', demand: 200, rest: [12, 0.15, 144], needed: 20 },
] as { source: string; demand: number; rest: [number, number, number]; needed: number }[])(
  'kanban, $source: D $demand, L α C $rest needs $needed',
  ({ demand, rest, needed }) => {
    expect(kanbans(demand, rest)).toBe(needed);
  },
);

describe('safety stock with a fixed lead time is the peak of a fixed loop', () => {
  // Chopra and Meindl, Supply Chain Management, safety-inventory chapter, row of no lead-time spread (from
  // memory, recomputed): d 2500, sd 500, L 7 gives a standard deviation of 1323.
  it('Chopra and Meindl: 7 days of 500 spread to 1323', () => {
    const { peakMean, peakVariance } = sizePool(
      anInput({ perDay: { mean: 2500, sd: 500 }, days: { mean: 7, sd: 0 } }),
    );
    expect(peakMean).toBe(17_500);
    expect(Math.sqrt(peakVariance)).toBeCloseTo(1323, 0);
  });

  // Stevenson, Operations Management 14e, p. 528: mean 50, sd 5, risk 3 % gives a reorder point of 59.40. A
  // whole number covers up to the half above it, so it is the first whole number at or above 59.40 − 0.5.
  it('Stevenson: 50 with sd 5 at 97 % is 59.40, hence 59 whole containers', () => {
    const size = sizePool(
      anInput({ perDay: { mean: 50, sd: 5 }, days: { mean: 1, sd: 0 }, coverProbability: 0.97 }),
    );
    expect(size.neededForCover).toBe(Math.ceil(59.4 - 0.5));
  });

  // The same book's type of example: 50 a week, sd 3, 2 weeks fixed, risk 10 % gives 105.43.
  it('Stevenson-type: two weeks of 50 with sd 3 at 90 % is 105.43, hence 105', () => {
    const size = sizePool(
      anInput({ perDay: { mean: 50, sd: 3 }, days: { mean: 2, sd: 0 }, coverProbability: 0.9 }),
    );
    expect(size.peakVariance).toBeCloseTo(18, 12);
    expect(size.neededForCover).toBe(Math.ceil(105.43 - 0.5));
  });
});

// Little 1961 and Palm 1943: two a day for ten days are 20 on average; Poisson table: 31 cover 99 %.
test('two a day for ten days: 20 in the loop on average, 31 cover one-at-a-time shipping at 99 %', () => {
  const size = sizePool(
    anInput({ perDay: { mean: 2, sd: Math.SQRT2 }, days: { mean: 10, sd: 4 }, coverProbability: 0.99 }),
  );
  expect(size).toMatchObject({ averageInLoop: 20, poissonNeeded: 31 });
});

test('held and in repair are added on top of what is needed', () => {
  const size = sizePool(anInput({ bufferDays: 15, heldPct: 10, repairPct: 10 }));
  expect(size).toMatchObject({ needed: 200, poolSize: 250 });
});

test('trips and losses come from the containers a day, not from the pool', () => {
  const size = sizePool(anInput({ lossPerTripPct: 0.5, workingDaysPerYear: 200 }));
  expect(size).toMatchObject({ tripsPerYear: 2000, replacementsPerYear: near(10) });
  expect(size.tripsPerContainerPerYear * size.poolSize).toEqual(near(2000));
});

describe('the curve', () => {
  const input = anInput({ heldPct: 20 });

  it('names every whole number of the range, with the pool that keeps so many free', () => {
    const points = poolCurve(input, { from: 40, to: 44 });
    expect(points.map(({ containers, poolSize }) => [containers, poolSize])).toEqual([
      [40, 50],
      [41, 52],
      [42, 53],
      [43, 54],
      [44, 55],
    ]);
  });

  it('meets sizePool at the number needed: enough there, not enough one below', () => {
    const size = sizePool(input);
    const [before, at] = poolCurve(input, { from: size.neededForCover - 1, to: size.neededForCover });
    expect(before?.cover).toBeLessThan(input.coverProbability);
    expect(at?.cover).toBeGreaterThanOrEqual(input.coverProbability);
    const [needed] = poolCurve(input, { from: size.needed, to: size.needed });
    expect(needed).toMatchObject({ poolSize: size.poolSize, fallbackShare: size.fallbackShareAtNeeded });
  });

  it('is thinned to the steps asked for, both ends included', () => {
    const points = poolCurve(input, { from: 0, to: 100, steps: 5 });
    expect(points.map(({ containers }) => containers)).toEqual([0, 25, 50, 75, 100]);
    expect(points[0]?.fallbackShare).toBe(1);
  });

  it.each([
    { from: -1, to: 5 },
    { from: 5, to: 4 },
    { from: 0.5, to: 4 },
    { from: 0, to: Infinity },
    { from: 0, to: 4, steps: 1 },
  ])('refuses the range %j', (range) => {
    expect(() => poolCurve(input, range)).toThrow(RangeError);
  });
});

describe('what cannot be sized is refused with its code and place', () => {
  const good = anInput();
  const ofPart = (perDay: { mean: number; sd: number }) => anInput({ perDay });
  const halfAPart = [{ ...good.flows[0], unitsPerContainer: 0.5 }];
  const misread = 'input not understood';
  it.each([
    { about: 'nothing at all', input: null, code: misread, at: '' },
    { about: 'no parts', input: { ...good, flows: [] }, code: misread, at: 'flows' },
    { about: 'no legs', input: { ...good, legs: [] }, code: misread, at: 'legs' },
    {
      about: 'negative demand',
      input: ofPart({ mean: -1, sd: 0 }),
      code: misread,
      at: 'flows.0.unitsPerDay.mean',
    },
    {
      about: 'no number',
      input: ofPart({ mean: NaN, sd: 0 }),
      code: misread,
      at: 'flows.0.unitsPerDay.mean',
    },
    { about: 'no demand', input: ofPart({ mean: 0, sd: 0 }), code: 'nothing goes out', at: 'flows' },
    {
      about: 'no time',
      input: anInput({ days: { mean: 0, sd: 0 } }),
      code: 'no time in the loop',
      at: 'legs',
    },
    {
      about: 'spread on 0 days',
      input: anInput({ days: { mean: 0, sd: 1 } }),
      code: misread,
      at: 'legs.0.days.sd',
    },
    {
      about: 'certain cover',
      input: { ...good, coverProbability: 1 },
      code: misread,
      at: 'coverProbability',
    },
    { about: 'no cover', input: { ...good, coverProbability: 0 }, code: misread, at: 'coverProbability' },
    {
      about: 'all held or in repair',
      input: { ...good, heldPct: 60, repairPct: 40 },
      code: 'no unit left to use',
      at: 'heldPct',
    },
    { about: 'an unknown way to travel', input: { ...good, travel: 'apart' }, code: misread, at: 'travel' },
    {
      about: 'half a part in a container',
      input: { ...good, flows: halfAPart },
      code: misread,
      at: 'flows.0.unitsPerContainer',
    },
    {
      about: 'a tail of centuries',
      input: anInput({ days: { mean: 1, sd: 300 } }),
      code: 'loop time spreads too widely',
      at: 'legs',
    },
    {
      about: 'a pool beyond any plant',
      input: ofPart({ mean: 1e8, sd: 0 }),
      code: 'figures too large',
      at: '',
    },
  ])('$about', ({ input, code, at }) => {
    expect(() => sizePool(input)).toThrow(CannotSize);
    expect(() => sizePool(input)).toThrow(expect.objectContaining({ code, at }));
  });
});
