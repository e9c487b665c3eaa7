import { dayNumber } from '../domain/calendar';
import { minorUnits } from '../domain/currencies';

/** Groups of three are parted by a narrow space that does not break a line. */
const narrowSpace = '\u202f';
const minusSign = '\u2212';

const group = (digits: string) => digits.replace(/\B(?=(\d{3})+$)/g, narrowSpace);

/** A whole number: 1284 → "1 284", -8 → "−8". */
export function formatUnits(units: number): string {
  const sign = units < 0 ? minusSign : '';
  return sign + group(Math.abs(units).toFixed(0));
}

/** A decimal string as it stands, grouped: "20640.00" → "20 640.00", "-0.20" → "−0.20". Digits are never dropped. */
export function formatDecimal(decimal: string): string {
  const unsigned = decimal.replace(/^-/, '');
  const [whole = '0', fraction] = unsigned.split('.');
  const isZero = !/[1-9]/.test(unsigned);
  const sign = decimal.startsWith('-') && !isZero ? minusSign : '';
  return sign + group(whole) + (fraction === undefined ? '' : `.${fraction}`);
}

/** An amount without its currency, with the decimals that ISO 4217 gives the currency; further digits that are not 0 stay. */
export function formatAmount(amount: string, currency: string): string {
  const decimals = minorUnits(currency);
  const [whole = '0', fraction = ''] = amount.split('.');
  const kept = fraction.slice(decimals).replace(/0+$/, '');
  const shown = fraction.slice(0, decimals).padEnd(decimals, '0') + kept;
  return formatDecimal(shown === '' ? whole : `${whole}.${shown}`);
}

/** "412.60", "EUR" → "EUR 412.60", on one line. */
export function formatMoney(amount: string, currency: string): string {
  return `${currency}\u00a0${formatAmount(amount, currency)}`;
}

/** A rate or share as written with one decimal at most: 0.984 → "98.4 %". */
export function formatShare(share: number): string {
  return `${(share * 100).toFixed(1).replace(/\.0$/, '')}${narrowSpace}%`;
}

/** A measured number (days, trips): at most `decimals` decimals, none that are 0. */
export function formatNumber(value: number, decimals = 1): string {
  const fixed = value.toFixed(decimals);
  return formatDecimal(decimals === 0 ? fixed : fixed.replace(/\.?0+$/, ''));
}

const monthNames = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
] as const;
const weekdayNames = ['Sunday', 'Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday'] as const;

/** 0 = Sunday; day 0 of the calendar was a Thursday. */
const weekdayOf = (day: string) => (((dayNumber(day) + 4) % 7) + 7) % 7;

/**
 * A business day ('YYYY-MM-DD') in words. "short" "27 Nov", "long" "27 November 2026", "weekday" "Friday 27 November",
 * "date" "27 November".
 */
export function formatDay(day: string, style: 'short' | 'date' | 'weekday' | 'long' = 'long'): string {
  const [year = 0, month = 1, date = 1] = day.split('-').map(Number);
  const name = monthNames[month - 1] ?? '';
  if (style === 'short') return `${date} ${name.slice(0, 3)}`;
  if (style === 'date') return `${date} ${name}`;
  if (style === 'weekday') return `${weekdayNames[weekdayOf(day)]} ${date} ${name}`;
  return `${date} ${name} ${year}`;
}

/** '2026-11' → "November 2026" */
export function formatMonth(month: string): string {
  const [year = '', number = '1'] = month.split('-');
  return `${monthNames[Number(number) - 1] ?? ''} ${year}`;
}

/** A UTC instant on the clock of a time zone: "27 November 2026, 14:10". */
export function formatInstant(instant: string, zone: string): string {
  const { day, time } = inZone(instant, zone);
  return `${formatDay(day)}, ${time}`;
}

function inZone(instant: string, zone: string): { day: string; time: string } {
  const parts = new Intl.DateTimeFormat('en-GB', {
    timeZone: zone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  }).formatToParts(new Date(instant));
  const part = (type: string) => parts.find((each) => each.type === type)?.value ?? '';
  return {
    day: `${part('year')}-${part('month')}-${part('day')}`,
    time: `${part('hour')}:${part('minute')}`,
  };
}

/** Size of a file: 215040 → "210 kB", 10485760 → "10.5 MB" (powers of ten). */
export function formatBytes(bytes: number): string {
  if (bytes < 1000) return `${bytes} B`;
  if (bytes < 1_000_000) return `${Math.round(bytes / 1000)} kB`;
  return `${formatNumber(bytes / 1_000_000)} MB`;
}
