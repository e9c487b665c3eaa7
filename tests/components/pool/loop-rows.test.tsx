import { longestOverrun, loopRows } from '@/components/pool/loop-rows';
import type { PoolLeg, SeenTimes, Stretch } from '@/shared/contracts/pool-sizing';

const leg = (name: string, stretch: Stretch, mean: string): PoolLeg => ({
  name,
  stretch,
  days: { mean, sd: '0.5' },
});
const legs = [
  leg('filled', 'at the partner', '1.5'),
  leg('full stock', 'at the plant', '2'),
  leg('empties', 'at the plant', '2.5'),
  leg('washed', 'elsewhere', '1'),
];
const seenOf = (days: Partial<Record<Stretch, number>>): SeenTimes => ({
  from: '2026-02-01',
  to: '2026-03-31',
  workingDays: 42,
  stretches: (['at the partner', 'to the plant', 'at the plant', 'back'] as const).map((stretch) => ({
    stretch,
    days: days[stretch] ?? null,
    sd: null,
    shipments: null,
    units: 0,
    unitsOut: 0,
  })),
});
const rowsOf = (seen: SeenTimes) => loopRows({ legs, perDay: 10, seen }, (stretch) => `${stretch}, together`);

describe('the lines of a loop', () => {
  it('show what was seen beside a leg that has its stretch to itself', () => {
    const [filled] = rowsOf(seenOf({ 'at the partner': 1.6 }));
    expect(filled).toMatchObject({ name: 'filled', days: 1.5, seen: 1.6, units: 15, longer: false });
  });

  it('show what was seen of several legs on a line of its own, after the last of them', () => {
    const rows = rowsOf(seenOf({ 'at the plant': 6.6 }));
    expect(rows.map((row) => row.name)).toEqual([
      'filled',
      'full stock',
      'empties',
      'at the plant, together',
      'washed',
    ]);
    expect(rows[3]).toMatchObject({ days: 4.5, seen: 6.6, units: 45, longer: true });
    expect([rows[1]?.seen, rows[2]?.seen, rows[4]?.seen]).toEqual([null, null, null]);
  });

  it('have no line of their own for what the book did not see', () => {
    expect(rowsOf(seenOf({})).map((row) => row.seen)).toEqual([null, null, null, null]);
  });

  it('name the stretch that takes most longer than planned, with what it ties up', () => {
    const loop = { legs, perDay: 10 };
    const seen = seenOf({ 'at the partner': 2.5, 'at the plant': 6.6, back: 9 });
    expect(longestOverrun({ ...loop, seen })).toEqual({
      stretch: 'at the plant',
      days: expect.closeTo(2.1, 9),
      units: 21,
    });
    expect(longestOverrun({ ...loop, seen: seenOf({ 'at the partner': 1.9 }) })).toBeUndefined();
  });
});
