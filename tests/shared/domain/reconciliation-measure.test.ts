import { measureMonth } from '@/tests/bench/reconcile';
import { makeMonth } from '@/tests/bench/reconcile-month';
import { addScores, shortfalls } from '@/tests/bench/reconcile-score';

const SMALL_MONTHS = [11, 12].map((seed) => ({ seed, shipments: 1500, lanes: 20 }));

test('two small made-up months reach the precision, recall and double entries of RULES 5', () => {
  const score = addScores(SMALL_MONTHS.map((settings) => measureMonth(settings).score));
  expect(shortfalls(score)).toEqual([]);
  expect(score.truth).toBeGreaterThan(2500);
  expect(score.doubles).toBeGreaterThan(3);
});

test('the made-up month is spoilt about as RULES 5 says', () => {
  const { input, truth } = makeMonth({ seed: 3, shipments: 20_000, lanes: 80 });
  const unnamed = input.receipts.filter(({ ref }) => ref === null).length / input.receipts.length;
  expect(unnamed).toBeGreaterThan(0.025);
  expect(unnamed).toBeLessThan(0.037);
  const doubles = truth.duplicates.length / input.receipts.length;
  expect(doubles).toBeGreaterThan(0.0025);
  expect(doubles).toBeLessThan(0.0055);
  const shared = new Set(truth.pairs.map(([, receipt]) => receipt));
  expect(truth.pairs.length - shared.size).toBeGreaterThan(0.001 * 20_000);
});

test('a worse outcome falls short, so the measure can fail', () => {
  const perfect = {
    matched: 10_000,
    right: 10_000,
    truth: 10_000,
    found: 10_000,
    receipts: 10_040,
    doubles: 40,
    doublesTold: 40,
    doublesWrong: 0,
    mostOffers: 3,
  };
  expect(shortfalls(perfect)).toEqual([]);
  expect(shortfalls({ ...perfect, right: 9_997 })).toHaveLength(1);
  expect(shortfalls({ ...perfect, matched: 9_840, right: 9_840 })).toHaveLength(1);
  expect(shortfalls({ ...perfect, found: 9_970 })).toHaveLength(1);
  expect(shortfalls({ ...perfect, doublesTold: 39 })).toHaveLength(1);
  expect(shortfalls({ ...perfect, doublesWrong: 11 })).toHaveLength(1);
  expect(shortfalls({ ...perfect, mostOffers: 4 })).toHaveLength(1);
});
