import fc from 'fast-check';

import * as calendar from '@/shared/domain/calendar';

const SEED = 20260303;

// The platform's own calendar serves as the second opinion.
const byPlatform = (number: number) => new Date(number * 86_400_000).toISOString().slice(0, 10);
const dayNumbers = fc.integer({ min: -50_000, max: 200_000 });

describe('a day is a day of the calendar', () => {
  it.each(['2026-03-01', '2024-02-29', '2000-02-29', '1999-12-31', '0001-01-01', '9999-12-31'])(
    '%s is',
    (text) => {
      expect(calendar.day.parse(text)).toBe(text);
    },
  );

  it.each([
    '2026-02-29',
    '1900-02-29',
    '2026-04-31',
    '2026-13-01',
    '2026-00-10',
    '2026-01-00',
    '2026-1-1',
    '26-01-01',
    '2026-01-01T00:00:00Z',
    ' 2026-01-01',
    '2026-01-01\n',
    '0000-01-01',
    '',
  ])('"%s" is not', (text) => {
    expect(calendar.day.safeParse(text).success).toBe(false);
    expect(() => calendar.addDays(text, 1)).toThrow(calendar.NotCalendar);
  });

  it.each([20260301, null, new Date(0)])('%s is not, for it is no text', (value) => {
    expect(calendar.day.safeParse(value).success).toBe(false);
  });
});

describe('reckoning with days', () => {
  it.each([
    ['2026-02-28', 1, '2026-03-01'],
    ['2024-02-28', 1, '2024-02-29'],
    ['2026-12-31', 1, '2027-01-01'],
    ['2026-03-01', -1, '2026-02-28'],
    // Over both changes of clocks of 2026 a day stays a day.
    ['2026-03-28', 2, '2026-03-30'],
    ['2026-10-24', 2, '2026-10-26'],
  ])('%s and %d days is %s', (from, days, expected) => {
    expect(calendar.addDays(from, days)).toBe(expected);
    expect(calendar.daysBetween(from, expected)).toBe(days);
  });

  it('compares', () => {
    expect(calendar.compareDays('2026-03-01', '2026-03-02')).toBe(-1);
    expect(calendar.compareDays('2026-03-01', '2026-03-01')).toBe(0);
    expect(calendar.compareDays('2026-10-01', '2026-09-30')).toBe(1);
  });

  it('refuses to leave the years 1 to 9999, and half days', () => {
    expect(() => calendar.addDays('9999-12-31', 1)).toThrow(calendar.NotCalendar);
    expect(() => calendar.addDays('0001-01-01', -1)).toThrow(calendar.NotCalendar);
    expect(() => calendar.addDays('2026-01-01', 0.5)).toThrow(calendar.NotCalendar);
  });

  it(`agrees with the platform's calendar both ways, seed ${SEED}`, () => {
    fc.assert(
      fc.property(dayNumbers, (number) => {
        expect(calendar.dayOfNumber(number)).toBe(byPlatform(number));
        expect(calendar.dayNumber(byPlatform(number))).toBe(number);
      }),
      { seed: SEED, numRuns: 2000 },
    );
  });
});

describe('months', () => {
  it.each([
    ['2024-06-01', '2026-03-31', 21],
    ['2024-06-15', '2026-06-14', 23],
    ['2024-06-15', '2026-06-15', 24],
    ['2026-01-31', '2026-02-28', 0],
    ['2026-01-31', '2026-03-31', 2],
    ['2024-02-29', '2025-02-28', 11],
    ['2024-02-29', '2025-03-01', 12],
    ['2026-03-01', '2026-03-01', 0],
    ['2026-03-01', '2025-01-01', 0],
  ])('from %s to %s are %d whole ones', (from, to, months) => {
    expect(calendar.wholeMonthsBetween(from, to)).toBe(months);
  });

  it.each([
    ['2026-03', '2026-03-31'],
    ['2026-04', '2026-04-30'],
    ['2026-02', '2026-02-28'],
    ['2024-02', '2024-02-29'],
    ['1900-02', '1900-02-28'],
    ['2000-02', '2000-02-29'],
  ])('%s ends on %s', (month, last) => {
    expect(calendar.lastDayOfMonth(month)).toBe(last);
    expect(calendar.firstDayOfMonth(month)).toBe(`${month}-01`);
    expect(calendar.monthOf(last)).toBe(month);
  });

  it('follow each other over the turn of the year', () => {
    expect(calendar.nextMonth('2026-12')).toBe('2027-01');
    expect(calendar.previousMonth('2027-01')).toBe('2026-12');
    expect(calendar.nextMonth('2026-01')).toBe('2026-02');
  });

  it.each(['2026-13', '2026-3', '2026', '2026-03-01'])('"%s" is no month', (text) => {
    expect(calendar.month.safeParse(text).success).toBe(false);
    expect(() => calendar.nextMonth(text)).toThrow(calendar.NotCalendar);
  });
});

describe('the day at a site (Europe/Copenhagen changes clocks on 2026-03-29 and 2026-10-25)', () => {
  it.each([
    // Winter time, UTC+1.
    ['2026-03-28T22:59:59Z', '2026-03-28'],
    ['2026-03-28T23:00:00Z', '2026-03-29'],
    // Summer time from 01:00 UTC on the 29th, UTC+2: that day has 23 hours.
    ['2026-03-29T21:59:59Z', '2026-03-29'],
    ['2026-03-29T22:00:00Z', '2026-03-30'],
    // Summer time until 01:00 UTC on the 25th: that day has 25 hours.
    ['2026-10-24T21:59:59Z', '2026-10-24'],
    ['2026-10-24T22:00:00Z', '2026-10-25'],
    ['2026-10-25T22:59:59Z', '2026-10-25'],
    ['2026-10-25T23:00:00Z', '2026-10-26'],
  ])('%s is %s', (instant, expected) => {
    expect(calendar.dayInZone(instant, 'Europe/Copenhagen')).toBe(expected);
    expect(calendar.dayInZone(new Date(instant), 'Europe/Copenhagen')).toBe(expected);
  });

  it('differs from zone to zone at one instant', () => {
    expect(calendar.dayInZone('2026-01-01T00:30:00Z', 'America/Monterrey')).toBe('2025-12-31');
    expect(calendar.dayInZone('2026-01-01T23:30:00+00:00', 'Asia/Tokyo')).toBe('2026-01-02');
  });

  it('refuses text without an offset, what is no instant, and an unknown zone', () => {
    expect(() => calendar.dayInZone('2026-01-01T00:30:00', 'UTC')).toThrow(calendar.NotCalendar);
    expect(() => calendar.dayInZone('2026-01-01', 'UTC')).toThrow(calendar.NotCalendar);
    expect(() => calendar.dayInZone(new Date(NaN), 'UTC')).toThrow(calendar.NotCalendar);
    expect(() => calendar.dayInZone('2026-01-01T00:30:00Z', 'Nowhere/Land')).toThrow(RangeError);
  });
});
