import { compare, isZero, multiply, roundToMinor, sum } from '../money';
import { type Book } from './book';
import { type AssessmentLine } from './output';
import { CannotAssess } from './refusal';
import { type TermsVersion } from './terms-history';

type Charges = AssessmentLine['charges'];

/**
 * RULES 3.8: unit-days added up for each rate, rounded once per rate. Rates that differ only in how they are
 * written are one rate, shown as the earliest terms wrote it.
 */
export function dwellCharge(book: Book): Charges['dwell'] {
  const { currency } = book.history;
  const lines = byRate(book)
    .filter(({ rate, unitDays }) => unitDays > 0 && !isZero(rate))
    .map(({ rate, unitDays }) => ({
      unitDays: exact(unitDays, book),
      rate,
      amount: roundToMinor(multiply(rate, unitDays), currency),
    }));
  return {
    lines,
    unitDays: lines.reduce((total, line) => total + line.unitDays, 0),
    amount: roundToMinor(sum(lines.map((line) => line.amount)), currency),
  };
}

function byRate(book: Book): { rate: string; unitDays: number }[] {
  const rates: { rate: string; unitDays: number }[] = [];
  for (const version of book.history.versions) {
    const rate = version.given.dailyFee;
    const unitDays = book.unitDays.get(version) ?? 0;
    if (unitDays > 0) rates.push({ rate, unitDays });
  }
  rates.sort((a, b) => compare(a.rate, b.rate));
  return rates.reduce<{ rate: string; unitDays: number }[]>((merged, next) => {
    const last = merged.at(-1);
    if (last && compare(last.rate, next.rate) === 0) last.unitDays += next.unitDays;
    else merged.push(next);
    return merged;
  }, []);
}

function exact(unitDays: number, book: Book): number {
  if (Number.isSafeInteger(unitDays)) return unitDays;
  const because = `unit-days of ${book.containerType} pass what can be counted exactly`;
  throw new CannotAssess('figures too large', { eventId: null, because });
}

export const damageCharge = (book: Book): Charges['damage'] =>
  perUnit(book.damaged, { currency: book.history.currency, fee: (terms) => terms.given.damageFee });

export const cleaningCharge = (book: Book): Charges['cleaning'] =>
  perUnit(book.cleaned, { currency: book.history.currency, fee: (terms) => terms.given.cleaningFee });

/** RULES 3.12: rounded once per period, over all versions of the terms. */
function perUnit(
  units: ReadonlyMap<TermsVersion, number>,
  by: { currency: string; fee: (terms: TermsVersion) => string },
): { units: number; amount: string } {
  const entries = [...units];
  const amounts = entries.map(([terms, count]) => multiply(by.fee(terms), count));
  return {
    units: entries.reduce((total, [, count]) => total + count, 0),
    amount: roundToMinor(sum(amounts), by.currency),
  };
}
