/** Decimals of the second reading: whole numbers of a millionth of a millionth, and its own minor units (ISO 4217). */
const DECIMALS: Record<string, number> = { EUR: 2, JPY: 0, TND: 3 };
const SCALE = 12;

export function scaled(text: string): bigint {
  const [whole = '0', fraction = ''] = text.split('.');
  return BigInt(whole + fraction.padEnd(SCALE, '0'));
}

/** numerator ÷ denominator (both 0 or more), half up, whole. */
export const halfUp = (numerator: bigint, denominator: bigint) =>
  (BigInt(2) * numerator + denominator) / (BigInt(2) * denominator);

/** The minor unit of the currency, scaled. */
export const unitOf = (currency: string) => BigInt(10) ** BigInt(SCALE - (DECIMALS[currency] ?? NaN));

export function written(minor: bigint, currency: string): string {
  const places = DECIMALS[currency] ?? NaN;
  const digits = String(minor < BigInt(0) ? -minor : minor).padStart(places + 1, '0');
  const body = places === 0 ? digits : `${digits.slice(0, -places)}.${digits.slice(-places)}`;
  return minor < BigInt(0) ? `-${body}` : body;
}
