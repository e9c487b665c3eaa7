import { minorUnits } from '@/shared/domain/currencies';

/** Number formats of spreadsheet cells (ECMA-376 part 1, 18.8.31). */
export const unitsFormat = '#,##0';
export const dayFormat = 'yyyy-mm-dd';
/** As many decimals as a rate needs, up to six. */
export const rateFormat = '0.00####';
/** A measured figure (kilograms, days): up to six decimals, none that are 0. */
export const measureFormat = '#,##0.######';
export const percentFormat = '0.######';

/** An amount with the decimals that ISO 4217 gives the currency. */
export function amountFormat(currency: string): string {
  const decimals = minorUnits(currency);
  return decimals === 0 ? '#,##0' : `#,##0.${'0'.repeat(decimals)}`;
}

/** A business day as a spreadsheet date: midnight, without a time zone. */
export function dayCell(day: string): Date {
  const [year = 1970, month = 1, date = 1] = day.split('-').map(Number);
  return new Date(Date.UTC(year, month - 1, date));
}

/** A decimal string as the number of a cell; refuses what is not finite, which would damage the file. */
export function numberCell(decimal: string | number): number {
  const value = Number(decimal);
  if (!Number.isFinite(value)) throw new RangeError(`Not a number for a cell: ${decimal}`);
  return value;
}
