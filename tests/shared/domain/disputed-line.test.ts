import fc from 'fast-check';
import {
  amountOfUnits,
  claimableWay,
  type DisputedLine,
  isClaimableAmount,
} from '@/shared/domain/disputed-line';
import { compare } from '@/shared/domain/money';

const lost: DisputedLine = { component: 'lost', quantity: 12, amount: '86.40', currency: 'EUR' };

describe('the money of some of a line’s units', () => {
  it('is their share of the amount: 5 of 12 lost units of EUR 86.40 are EUR 36.00', () => {
    expect(amountOfUnits(lost, 5)).toBe('36.00');
  });

  it('is above 0 for a line in the partner’s favour', () => {
    const released = { ...lost, component: 'deposits released' as const, quantity: 200, amount: '-900' };
    expect(amountOfUnits(released, 10)).toBe('45.00');
  });

  it.each([
    ['EUR', '10.00', '3.33'],
    ['JPY', '100', '33'],
    ['TND', '10.000', '3.333'],
  ])('is rounded once to the minor unit of %s', (currency, amount, third) => {
    expect(amountOfUnits({ ...lost, currency, amount, quantity: 3 }, 1)).toBe(third);
  });

  it('never comes to more than the line for no more than its units', () => {
    const cases = fc.record({
      cents: fc.integer({ min: 0, max: 10_000_000 }),
      quantity: fc.integer({ min: 1, max: 100_000 }),
      share: fc.double({ min: 0, max: 1, noNaN: true }),
    });
    fc.assert(
      fc.property(cases, ({ cents, quantity, share }) => {
        const amount = `${Math.floor(cents / 100)}.${String(cents % 100).padStart(2, '0')}`;
        const part = amountOfUnits({ ...lost, amount, quantity }, Math.floor(share * quantity));
        return compare(part, amount) <= 0 && compare(part, '0') >= 0;
      }),
      { seed: 20_261_201, numRuns: 500 },
    );
  });
});

describe('what can be claimed', () => {
  it.each([
    ['lost', 12, 'fewer'],
    ['damage', 7, 'fewer'],
    ['deposits released', 200, 'more'],
    ['daily fee', 2400, null],
    ['credit', 0, null],
    ['lost', -3, null],
  ] as const)('of %s with %d goes the way %s', (component, quantity, way) => {
    expect(claimableWay({ ...lost, component, quantity })).toBe(way);
  });

  it.each([
    ['0.01', true],
    ['86.40', true],
    ['86.41', false],
    ['0', false],
    ['-1', false],
    ['1.005', false],
  ])('in money: %s of EUR 86.40 is %s', (amount, fits) => {
    expect(isClaimableAmount(lost, amount)).toBe(fits);
  });
});
