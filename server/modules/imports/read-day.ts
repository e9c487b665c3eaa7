import { day, dayOfNumber } from '@/shared/domain/calendar';

/** Excel counts days from 1900 with a leap day that never was: its day 25569 is 1970-01-01. */
const excelEpoch = 25_569;
/** The years 2000 to 2099 as a sheet without a date format shows them. */
const serials = { from: 36_526, to: 73_050 };

/** A day as people and sheets write it: 2026-03-04, 4.3.2026, or Excel's number. Null when it is none. */
export function readDay(text: string): string | null {
  const written = isoOf(text);
  return written !== null && day.safeParse(written).success ? written : null;
}

function isoOf(text: string): string | null {
  const iso = /^(\d{4}-\d{2}-\d{2})(?:[T ]\d{2}:\d{2}.*)?$/.exec(text)?.[1];
  if (iso !== undefined) return iso;
  const [, date = '', month = '', year = ''] = /^(\d{1,2})\.\s?(\d{1,2})\.\s?(\d{4})$/.exec(text) ?? [];
  if (year !== '') return `${year}-${month.padStart(2, '0')}-${date.padStart(2, '0')}`;
  const serial = /^\d{5}$/.test(text) ? Number(text) : 0;
  return serial >= serials.from && serial <= serials.to ? dayOfNumber(serial - excelEpoch) : null;
}
