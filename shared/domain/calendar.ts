import { z } from 'zod';

// A business day is the text 'YYYY-MM-DD' and nothing else. Arithmetic runs on whole day numbers
// (0 is 1970-01-01), so that neither a time zone nor a change of clocks can move a day.

const shape = /^(\d{4})-(\d{2})-(\d{2})$/;
const monthShape = /^(\d{4})-(\d{2})$/;

/** Text that is not a day or month of the calendar. */
export class NotCalendar extends Error {
  constructor(readonly value: unknown) {
    super(`Not in the calendar: ${String(value)}`);
    this.name = 'NotCalendar';
  }
}

const isLeap = (year: number) => (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0;

const daysIn = (year: number, month: number) =>
  month === 2
    ? isLeap(year)
      ? 29
      : 28
    : month === 4 || month === 6 || month === 9 || month === 11
      ? 30
      : 31;

interface DayParts {
  year: number;
  month: number;
  date: number;
}

function partsOrNull(text: string): DayParts | null {
  if (!shape.test(text)) return null;
  const year = Number(text.slice(0, 4));
  const month = Number(text.slice(5, 7));
  const date = Number(text.slice(8, 10));
  if (year < 1 || month < 1 || month > 12 || date < 1 || date > daysIn(year, month)) return null;
  return { year, month, date };
}

function partsOf(text: string): DayParts {
  const parts = partsOrNull(text);
  if (!parts) throw new NotCalendar(text);
  return parts;
}

/** A real day of the Gregorian calendar, 'YYYY-MM-DD'. */
export const day = z
  .string()
  .refine((text) => partsOrNull(text) !== null, { error: 'Give a day of the calendar.' });

/** A month, 'YYYY-MM'. */
export const month = z.string().refine((text) => isMonth(text), { error: 'Give a month of the calendar.' });

const isMonth = (text: string) => monthShape.test(text) && partsOrNull(`${text}-01`) !== null;

/** Days since 1970-01-01, negative before. Refuses what is not a calendar day. */
export function dayNumber(text: string): number {
  const parts = partsOf(text);
  return daysBeforeYear(parts.year) + daysBeforeMonth(parts) + parts.date - 1 - EPOCH;
}

const daysBeforeYear = (year: number) => {
  const past = year - 1;
  return past * 365 + Math.floor(past / 4) - Math.floor(past / 100) + Math.floor(past / 400);
};

const CUMULATIVE = [0, 31, 59, 90, 120, 151, 181, 212, 243, 273, 304, 334] as const;

const daysBeforeMonth = ({ year, month }: DayParts) =>
  (CUMULATIVE[month - 1] ?? 0) + (month > 2 && isLeap(year) ? 1 : 0);

const EPOCH = daysBeforeYear(1970);
const LAST = daysBeforeYear(10_000) - 1 - EPOCH;

/** The day with that number. Refuses fractions and what lies outside the years 1 to 9999. */
export function dayOfNumber(number: number): string {
  if (!Number.isInteger(number) || number < -EPOCH || number > LAST) throw new NotCalendar(number);
  let year = Math.floor((number + EPOCH) / 365.2425) + 1;
  while (daysBeforeYear(year) - EPOCH > number) year -= 1;
  while (daysBeforeYear(year + 1) - EPOCH <= number) year += 1;
  let left = number + EPOCH - daysBeforeYear(year);
  let month = 1;
  while (left >= daysIn(year, month)) {
    left -= daysIn(year, month);
    month += 1;
  }
  return write({ year, month, date: left + 1 });
}

const padded = (value: number, width: number) => String(value).padStart(width, '0');

const write = ({ year, month, date }: DayParts) =>
  `${padded(year, 4)}-${padded(month, 2)}-${padded(date, 2)}`;

export const addDays = (from: string, days: number): string => dayOfNumber(dayNumber(from) + days);

/** Calendar days from one day to another; negative when the second comes first. */
export const daysBetween = (from: string, to: string): number => dayNumber(to) - dayNumber(from);

/** -1, 0 or 1. */
export const compareDays = (a: string, b: string): number => Math.sign(dayNumber(a) - dayNumber(b));

/**
 * Whole calendar months from one day to a later one: a month is full when its day of the month is reached
 * (31 January to 28 February is none). Never below 0.
 */
export function wholeMonthsBetween(from: string, to: string): number {
  const start = partsOf(from);
  const end = partsOf(to);
  const months = (end.year - start.year) * 12 + end.month - start.month - (end.date < start.date ? 1 : 0);
  return Math.max(0, months);
}

/** 'YYYY-MM' of a day. */
export const monthOf = (text: string): string => {
  partsOf(text);
  return text.slice(0, 7);
};

export const firstDayOfMonth = (text: string): string => write(partsOfMonth(text));

export const lastDayOfMonth = (text: string): string => {
  const { year, month } = partsOfMonth(text);
  return write({ year, month, date: daysIn(year, month) });
};

export const nextMonth = (text: string): string => monthOf(addDays(lastDayOfMonth(text), 1));

export const previousMonth = (text: string): string => monthOf(addDays(firstDayOfMonth(text), -1));

function partsOfMonth(text: string): DayParts {
  if (!isMonth(text)) throw new NotCalendar(text);
  return partsOf(`${text}-01`);
}

const formats = new Map<string, Intl.DateTimeFormat>();

function formatOf(timeZone: string): Intl.DateTimeFormat {
  const known = formats.get(timeZone);
  if (known) return known;
  const options = { timeZone, calendar: 'gregory', numberingSystem: 'latn' } as const;
  const made = new Intl.DateTimeFormat('en', {
    ...options,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  });
  formats.set(timeZone, made);
  return made;
}

/**
 * The business day at a site at that instant (RULES 1: in the site's time zone, IANA name).
 * An instant given as text must be ISO 8601 with its offset or Z; refuses unknown zones.
 */
export function dayInZone(instant: Date | string, timeZone: string): string {
  if (typeof instant === 'string' && !/T.*(?:Z|[+-]\d{2}:\d{2})$/.test(instant))
    throw new NotCalendar(instant);
  const moment = new Date(instant);
  if (Number.isNaN(moment.getTime())) throw new NotCalendar(instant);
  const parts = new Map(
    formatOf(timeZone)
      .formatToParts(moment)
      .map(({ type, value }) => [type, value]),
  );
  return write({
    year: Number(parts.get('year')),
    month: Number(parts.get('month')),
    date: Number(parts.get('day')),
  });
}
