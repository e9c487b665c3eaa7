import fc from 'fast-check';

import { stacks, unitsPerLayer } from '@/shared/domain/unit-load';

// Exhaustive searches of axis-parallel layouts, recomputed; pallets of EN 13698-1 and ISO 6780, modules of ISO 3394.
test.each([
  { length: 600, width: 400, onEuro: 4, onLarge: 5 },
  { length: 400, width: 300, onEuro: 8, onLarge: 10 },
  { length: 300, width: 200, onEuro: 16, onLarge: 20 },
  { length: 800, width: 600, onEuro: 2, onLarge: 2 },
  { length: 600, width: 500, onEuro: 2, onLarge: 4 },
])(
  '$length × $width mm: $onEuro on 1200 × 800, $onLarge on 1200 × 1000',
  ({ onEuro, onLarge, length, width }) => {
    expect(unitsPerLayer({ length, width }, { length: 1200, width: 800 })).toBe(onEuro);
    expect(unitsPerLayer({ length, width }, { length: 1200, width: 1000 })).toBe(onLarge);
  },
);

// The 48 × 45 inch pallet of the US trade (from memory; plain division), in tenths of an inch.
test.each([
  [240, 150, 6],
  [120, 150, 12],
  [240, 225, 4],
])('%i × %i tenths of an inch: %i on 48 × 45 in', (length, width, most) => {
  expect(unitsPerLayer({ length, width }, { length: 480, width: 450 })).toBe(most);
});

test('a pinwheel is found: 4 of 3 × 2 around a hole of 1 × 1 on 5 × 5', () => {
  expect(unitsPerLayer({ length: 3, width: 2 }, { length: 5, width: 5 })).toBe(4);
});

test('a container larger than the pallet does not stand on it', () => {
  expect(unitsPerLayer({ length: 1300, width: 700 }, { length: 1200, width: 800 })).toBe(0);
});

/** Second reading for small boards: lay a piece on the first free cell, or leave that cell empty. */
function byTrying([length, width]: [number, number], [boardLength, boardWidth]: [number, number]): number {
  const taken = Array.from({ length: boardLength * boardWidth }, () => false);
  const cells = (at: number, long: number, wide: number): number[] | null => {
    const [x, y] = [at % boardLength, Math.floor(at / boardLength)];
    if (x + long > boardLength || y + wide > boardWidth) return null;
    const all = Array.from(
      { length: long * wide },
      (_, i) => at + (i % long) + Math.floor(i / long) * boardLength,
    );
    return all.some((cell) => taken[cell]) ? null : all;
  };
  const from = (at: number): number => {
    const free = taken.indexOf(false, at);
    if (free === -1) return 0;
    let best = from(free + 1);
    for (const [long, wide] of [
      [length, width],
      [width, length],
    ] as const) {
      const laid = cells(free, long, wide);
      if (!laid) continue;
      laid.forEach((cell) => (taken[cell] = true));
      best = Math.max(best, 1 + from(free + 1));
      laid.forEach((cell) => (taken[cell] = false));
    }
    return best;
  };
  return from(0);
}

test('on small boards the search finds what trying everything finds', () => {
  const pieces = fc.tuple(fc.integer({ min: 2, max: 4 }), fc.integer({ min: 2, max: 4 }));
  const boards = fc.tuple(fc.integer({ min: 2, max: 7 }), fc.integer({ min: 2, max: 7 }));
  fc.assert(
    fc.property(pieces, boards, (piece, board) => {
      fc.pre(piece[0] * piece[1] >= 6);
      const [length, width] = piece;
      expect(unitsPerLayer({ length, width }, { length: board[0], width: board[1] })).toBe(
        byTrying(piece, board),
      );
    }),
    { seed: 20260312, numRuns: 150 },
  );
});

test('turning container or pallet changes nothing, and the layer is never larger than the pallet', () => {
  const mm = fc.integer({ min: 15, max: 80 }).map((centimetres) => centimetres * 10);
  const pallet = { length: 1200, width: 1000 };
  fc.assert(
    fc.property(mm, mm, (length, width) => {
      const most = unitsPerLayer({ length, width }, pallet);
      expect(unitsPerLayer({ length: width, width: length }, pallet)).toBe(most);
      expect(unitsPerLayer({ length, width }, { length: 1000, width: 1200 })).toBe(most);
      expect(most * length * width).toBeLessThanOrEqual(1_200_000);
    }),
    { seed: 20260312, numRuns: 40 },
  );
});

test.each([
  [{ length: 0, width: 400 }],
  [{ length: 600.5, width: 400 }],
  [{ length: NaN, width: 400 }],
  [{ length: 40, width: 30 }],
])('the container %j is refused', (container) => {
  expect(() => unitsPerLayer(container, { length: 1200, width: 1000 })).toThrow(RangeError);
});

test('a count reads as whole stacks and a rest', () => {
  expect(stacks(392, 8)).toEqual({ stacks: 49, rest: 0 });
  expect(stacks(100, 8)).toEqual({ stacks: 12, rest: 4 });
  expect(stacks(0, 8)).toEqual({ stacks: 0, rest: 0 });
});

test.each([
  [-1, 8],
  [1.5, 8],
  [8, 0],
  [8, 2.5],
])('%f in stacks of %f is refused', (units, height) => {
  expect(() => stacks(units, height)).toThrow(RangeError);
});
