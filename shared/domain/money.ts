import { Decimal } from 'decimal.js';
import { z } from 'zod';

import { minorUnits } from './currencies';

// decimal.js keeps 20 significant digits unless told otherwise; a pool's yearly sums must stay exact.
const Exact = Decimal.clone({ precision: 80, rounding: Decimal.ROUND_HALF_UP });

const plain = /^-?(?:0|[1-9]\d{0,29})(?:\.\d{1,30})?$/;
const minusZero = /^-(0(?:\.0+)?)$/;

/** Text that is not a plain decimal number, or a factor that is not whole. */
export class NotDecimal extends Error {
  constructor(readonly value: unknown) {
    super(`Not a plain decimal number: ${String(value)}`);
    this.name = 'NotDecimal';
  }
}

/** A plain decimal such as "12", "-0.35"; no exponent, blank, sign +, leading zero. "-0" becomes "0". */
export const decimalString = z
  .string()
  .regex(plain, { error: 'not a plain decimal number', abort: true })
  .overwrite((text) => text.replace(minusZero, '$1'));

/** A decimal of 0 or more: rates, fees, percentages. */
export const nonNegativeDecimal = decimalString.refine((text) => !text.startsWith('-'));

/** An amount in whole minor units of the currency (ISO 4217): at most 2 decimals for EUR, 0 for JPY. */
export const amountOf = (currency: string) =>
  decimalString.refine((text) => isWholeMinor(text, currency), {
    error: `not in whole minor units of ${currency}`,
  });

/** Checked constructor: the text itself when it is a plain decimal, "-0" as "0"; refuses all else. */
export function decimal(text: string): string {
  if (typeof text !== 'string' || !plain.test(text)) throw new NotDecimal(text);
  return text.replace(minusZero, '$1');
}

const of = (text: string) => new Exact(decimal(text));
const text = (value: Decimal) => (value.isZero() ? '0' : value.toFixed());

export const add = (a: string, b: string): string => text(of(a).plus(of(b)));

export const subtract = (a: string, b: string): string => text(of(a).minus(of(b)));

export const negate = (a: string): string => text(of(a).negated());

export const isZero = (a: string): boolean => of(a).isZero();

/** -1, 0 or 1, by value: "1.50" equals "1.5". */
export const compare = (a: string, b: string): number => of(a).comparedTo(of(b));

export const sum = (amounts: readonly string[]): string =>
  text(amounts.reduce((total, amount) => total.plus(of(amount)), new Exact(0)));

/** Amount × a decimal or a whole number, exact. Refuses a number that is not a safe integer. */
export function multiply(amount: string, factor: string | number | bigint): string {
  return text(of(amount).times(factorOf(factor)));
}

/** amount × times ÷ over, rounded once to the minor unit. Refuses over = 0. */
export function proportion(
  amount: string,
  by: { times: string | number; over: number; currency: string },
): string {
  if (by.over === 0) throw new NotDecimal('division by 0');
  const exact = of(amount).times(factorOf(by.times)).dividedBy(factorOf(by.over));
  return roundedTo(exact, by.currency);
}

function factorOf(factor: string | number | bigint): Decimal {
  if (typeof factor === 'string') return of(factor);
  if (typeof factor === 'number' && !Number.isSafeInteger(factor)) throw new NotDecimal(factor);
  return new Exact(factor.toString());
}

const roundedTo = (value: Decimal, currency: string): string => {
  const rounded = value.toDecimalPlaces(minorUnits(currency), Decimal.ROUND_HALF_UP);
  return (rounded.isZero() ? new Exact(0) : rounded).toFixed(minorUnits(currency));
};

/** Half up, away from zero at the half, to the currency's minor unit by ISO 4217 (RULES 3.13). */
export const roundToMinor = (value: string, currency: string): string => roundedTo(of(value), currency);

/** The amount with all of the currency's decimals, "4.5" EUR as "4.50". Refuses what would need rounding. */
export function formatMinor(value: string, currency: string): string {
  if (!isWholeMinor(value, currency)) throw new NotDecimal(value);
  return roundedTo(of(value), currency);
}

export const isWholeMinor = (value: string, currency: string): boolean =>
  of(value).decimalPlaces() <= minorUnits(currency);

/** Minor units as a bigint, for sums over many movements: "4.50" EUR is 450. */
export const toMinor = (value: string, currency: string): bigint =>
  BigInt(formatMinor(value, currency).replace('.', ''));

/** The decimal string of so many minor units: 450 in EUR is "4.50". */
export const fromMinor = (minor: bigint, currency: string): string =>
  roundedTo(new Exact(minor.toString()).dividedBy(new Exact(10).pow(minorUnits(currency))), currency);
