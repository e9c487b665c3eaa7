import fc from 'fast-check';
import { addDays } from '@/shared/domain/calendar';
import { isWeekday, weekdaysBetween } from '@/shared/domain/working-days';

describe('working days', () => {
  it('are Monday to Friday', () => {
    // 20 March 2026 is a Friday.
    const week = [0, 1, 2, 3, 4, 5, 6].map((days) => isWeekday(addDays('2026-03-20', days)));
    expect(week).toEqual([true, false, false, true, true, true, true]);
  });

  it('from Friday to Monday are one, over a weekend none, to itself none, in a week five', () => {
    expect(weekdaysBetween('2026-03-20', '2026-03-23')).toBe(1);
    expect(weekdaysBetween('2026-03-20', '2026-03-22')).toBe(0);
    expect(weekdaysBetween('2026-03-20', '2026-03-20')).toBe(0);
    expect(weekdaysBetween('2026-03-21', '2026-03-28')).toBe(5);
  });

  it('are those counted one by one, also before 1970', () => {
    const start = fc.integer({ min: -400, max: 21_000 }).map((days) => addDays('1970-01-01', days));
    fc.assert(
      fc.property(start, fc.integer({ min: 0, max: 60 }), (from, days) => {
        const each = Array.from({ length: days }, (_, day) => isWeekday(addDays(from, day + 1)));
        expect(weekdaysBetween(from, addDays(from, days))).toBe(each.filter(Boolean).length);
      }),
      { seed: 20_261_201 },
    );
  });

  it('refuse an end before the start', () => {
    expect(() => weekdaysBetween('2026-03-21', '2026-03-20')).toThrow(RangeError);
  });
});
