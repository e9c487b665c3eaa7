import { yearlyFallbackCost } from '@/shared/domain/fallback-cost';

const of = (costPerLoad: string, currency = 'EUR') =>
  yearlyFallbackCost({ share: 0.0125, tripsPerYear: 34_467, costPerLoad, currency });

describe('what running short costs in a year', () => {
  it('is share × trips × cost of one load, rounded once', () => {
    // 0.0125 × 34 467 = 430.8375 loads at 3.40
    expect(of('3.40')).toBe('1464.85');
    expect(of('3', 'JPY')).toBe('1293');
  });

  it('is not said while no cost, or none in the currency, is entered', () => {
    for (const typed of ['', 'about 3', '-1', '3.405']) expect(of(typed)).toBeNull();
    expect(of('3.5', 'JPY')).toBeNull();
  });
});
