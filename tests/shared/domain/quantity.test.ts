import { MOST_UNITS, positiveUnits, signedUnits, wholeUnits } from '@/shared/domain/quantity';

const never = [1.5, NaN, Infinity, -Infinity, 1e308, -0, '5', null, undefined, MOST_UNITS + 1, true, 5n];
const named = never.map(
  (value) => [Object.is(value, -0) ? '-0' : `${typeof value} ${String(value)}`, value] as const,
);

describe('a quantity is a whole number of containers', () => {
  it.each([0, 1, 400, MOST_UNITS])('%s may be counted', (value) => {
    expect(wholeUnits.parse(value)).toBe(value);
  });

  it.each([...named, ['below zero', -1] as const])('%s may not', (_, value) => {
    expect(wholeUnits.safeParse(value).success).toBe(false);
  });

  it('a moved quantity is at least 1', () => {
    expect(positiveUnits.parse(1)).toBe(1);
    for (const value of [0, -1, ...never]) expect(positiveUnits.safeParse(value).success).toBe(false);
  });

  it('a change may be below zero but not zero', () => {
    expect(signedUnits.parse(-8)).toBe(-8);
    expect(signedUnits.parse(8)).toBe(8);
    for (const value of [0, -MOST_UNITS - 1, ...never])
      expect(signedUnits.safeParse(value).success).toBe(false);
  });
});
