// ISO 4217 minor units, list of 2025-02-04. Intl must not be asked: it gives 0 decimals for HUF and others
// where the standard says 2, and 0 for IQD where it says 3.
const byMinorUnits: Record<number, string> = {
  0: 'JPY KRW CLP ISK VND PYG UGX XAF XOF',
  2: 'EUR USD GBP CHF SEK PLN CZK HUF CNY MXN INR TRY DKK NOK',
  3: 'BHD KWD JOD OMR TND IQD LYD',
  4: 'CLF UYW',
};

const table = new Map(
  Object.entries(byMinorUnits).flatMap(([units, codes]) =>
    codes.split(' ').map((code) => [code, Number(units)]),
  ),
);

/** Decimals of the currency by ISO 4217. Refuses a code that is not in the table. */
export function minorUnits(currency: string): number {
  const units = table.get(currency);
  if (units === undefined) throw new RangeError(`Not a currency of the table: ${currency}`);
  return units;
}
