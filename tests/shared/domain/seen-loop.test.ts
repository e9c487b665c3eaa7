import { plannedDays, withSeenDays } from '@/shared/domain/seen-loop';

const leg = (stretch: string, [mean, sd]: [string, string]) => ({ stretch, days: { mean, sd } });
const legs = [
  leg('to the plant', ['1', '0.3']),
  leg('at the plant', ['2', '1']),
  leg('at the plant', ['3', '1.2']),
  leg('elsewhere', ['1', '0.2']),
];

describe('taking the seen days into the legs', () => {
  it('puts mean and spread of a way into its one leg', () => {
    const [way] = withSeenDays(legs, [{ stretch: 'to the plant', days: 1.125, sd: 0.44 }]);
    expect(way?.days).toEqual({ mean: '1.13', sd: '0.44' });
  });

  it('spreads a stretch over its legs as planned and leaves their spread', () => {
    const taken = withSeenDays(legs, [{ stretch: 'at the plant', days: 7.5, sd: null }]);
    expect(taken.map((each) => each.days)).toEqual([
      { mean: '1', sd: '0.3' },
      { mean: '3', sd: '1' },
      { mean: '4.5', sd: '1.2' },
      { mean: '1', sd: '0.2' },
    ]);
    expect(plannedDays(taken, 'at the plant')).toBe(7.5);
  });

  it('spreads it evenly where every leg is planned at 0, and lets a leg of 0 days not vary', () => {
    const none = [leg('back', ['0', '0']), leg('back', ['0', '0'])];
    const taken = withSeenDays(none, [{ stretch: 'back', days: 3, sd: 1 }]);
    expect(taken.map((each) => each.days.mean)).toEqual(['1.5', '1.5']);
    const still = withSeenDays([leg('back', ['2', '0.5'])], [{ stretch: 'back', days: 0, sd: 0.2 }]);
    expect(still[0]?.days).toEqual({ mean: '0', sd: '0' });
  });

  it('leaves what the book did not see', () => {
    expect(withSeenDays(legs, [{ stretch: 'to the plant', days: null, sd: null }])).toEqual(legs);
  });
});
