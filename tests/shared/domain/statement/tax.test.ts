import fc from 'fast-check';

import { compare, fromMinor, multiply, roundToMinor, sum } from '@/shared/domain/money';
import { taxRows, type TaxTreatment } from '@/shared/domain/statement/tax';

const SEED = 20260405;
const taxOf = (
  basis: { rate: string; treatment: TaxTreatment },
  of: { fees?: string; asked?: string; released?: string; forfeited?: string },
) =>
  sum(
    taxRows(
      [
        {
          basis,
          charges: [
            { component: 'daily fee', amount: of.fees ?? '0' },
            { component: 'deposits asked', amount: of.asked ?? '0' },
            { component: 'deposits released', amount: of.released ?? '0' },
          ],
          forfeited: [of.forfeited ?? '0'],
        },
      ],
      'EUR',
    ).map((row) => row.tax),
  );

/**
 * Own check values, computed from the text of Council Directive 2006/112/EC art. 92 (a) and (b): goods 1000 and
 * deposits 200 at 20 %; of the deposits 150 are refunded and 50 are not.
 */
describe('tax on returnable packing by Directive 2006/112/EC art. 92', () => {
  const excluded = { rate: '20', treatment: 'excluded' } as const;
  const included = { rate: '20', treatment: 'included' } as const;

  it('at supply is 200 with deposits left out and 240 with deposits in', () => {
    expect(compare(taxOf(excluded, { fees: '1000', asked: '200' }), '200')).toBe(0);
    expect(compare(taxOf(included, { fees: '1000', asked: '200' }), '240')).toBe(0);
  });

  it('is adjusted by +10 for what is not returned, or by −30 for what is', () => {
    const after = { released: '-150', forfeited: '50' };
    expect(compare(taxOf(excluded, after), '10')).toBe(0);
    expect(compare(taxOf(included, after), '-30')).toBe(0);
  });

  it('ends at 210 under both', () => {
    const all = { fees: '1000', asked: '200', released: '-150', forfeited: '50' };
    expect(compare(taxOf(excluded, all), '210')).toBe(0);
    expect(compare(taxOf(included, all), '210')).toBe(0);
  });
});

describe(`laws of the tax, seed ${SEED}`, () => {
  const cents = fc.integer({ min: 0, max: 5_000_000 }).map((minor) => fromMinor(BigInt(minor), 'EUR'));

  it('both treatments end at the same tax once every deposit is released or kept', () => {
    fc.assert(
      fc.property(fc.tuple(cents, cents, cents), fc.constantFrom('0', '5.5', '20', '25'), (amounts, rate) => {
        const [fees, back, kept] = amounts;
        const all = { fees, asked: sum([back, kept]), released: multiply(back, -1), forfeited: kept };
        const [a, b] = [
          taxOf({ rate, treatment: 'excluded' }, all),
          taxOf({ rate, treatment: 'included' }, all),
        ];
        expect(compare(a, b)).toBe(0);
        const exact = multiply(multiply(sum([fees, kept]), rate), '0.01');
        expect(compare(a, roundToMinor(exact, 'EUR'))).toBe(0);
      }),
      { seed: SEED },
    );
  });

  it('keeps rates apart, each rounded once', () => {
    const charges = [{ component: 'damage' as const, amount: '0.10' }];
    const rows = taxRows(
      [
        { basis: { rate: '25', treatment: 'excluded' }, charges, forfeited: [] },
        { basis: { rate: '25', treatment: 'excluded' }, charges, forfeited: [] },
        { basis: { rate: '5', treatment: 'excluded' }, charges, forfeited: [] },
      ],
      'EUR',
    );
    expect(rows.map(({ rate, base, tax }) => [rate, base, tax])).toEqual([
      ['25', '0.20', '0.05'],
      ['5', '0.10', '0.01'],
    ]);
  });

  it('leaves what a loss costs beyond the deposit untaxed, and taxes a credit as what it is for', () => {
    const [row] = taxRows(
      [
        {
          basis: { rate: '25', treatment: 'excluded' },
          charges: [
            { component: 'lost', amount: '86.40' },
            { component: 'damage', amount: '51.20' },
            { component: 'credit', creditFor: 'damage', amount: '-3.20' },
            { component: 'credit', creditFor: 'lost', amount: '-7.20' },
          ],
          forfeited: ['54.00'],
        },
      ],
      'EUR',
    );
    expect(row).toMatchObject({ fees: '48.00', deposits: '54.00', base: '102.00', tax: '25.50' });
  });
});
