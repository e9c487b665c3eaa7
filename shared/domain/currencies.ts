import { z } from 'zod';

// Minor units by ISO 4217, list of 2025-02-04, currencies of countries and the two index units with 4 decimals.
// Intl must not be asked: it gives 0 decimals for HUF and others where the standard says 2, and 0 for IQD
// where it says 3.
const byMinorUnits: Record<number, string> = {
  0: 'BIF CLP DJF GNF ISK JPY KMF KRW PYG RWF UGX VND VUV XAF XOF XPF',
  2: `AED AFN ALL AMD AOA ARS AUD AWG AZN BAM BBD BDT BGN BMD BND BOB BRL BSD BTN BWP BYN BZD CAD CDF CHF CNY
    COP CRC CUP CVE CZK DKK DOP DZD EGP ERN ETB EUR FJD FKP GBP GEL GHS GIP GMD GTQ GYD HKD HNL HTG HUF IDR
    ILS INR IRR JMD KES KGS KHR KPW KYD KZT LAK LBP LKR LRD LSL MAD MDL MGA MKD MMK MNT MOP MRU MUR MVR MWK
    MXN MYR MZN NAD NGN NIO NOK NPR NZD PAB PEN PGK PHP PKR PLN QAR RON RSD RUB SAR SBD SCR SDG SEK SGD SHP
    SLE SOS SRD SSP STN SYP SZL THB TJS TMT TOP TRY TTD TWD TZS UAH USD UYU UZS VES WST XCD YER ZAR ZMW`,
  3: 'BHD IQD JOD KWD LYD OMR TND',
  4: 'CLF UYW',
};

const table = new Map(
  Object.entries(byMinorUnits).flatMap(([units, codes]) =>
    codes.split(/\s+/).map((code) => [code, Number(units)] as const),
  ),
);

/** The codes of the table, A to Z. */
export const currencyCodes: readonly string[] = [...table.keys()].sort();

/** A currency code of the table: three capitals. Refuses any other text. */
export const currencyCode = z
  .string()
  .refine((code) => table.has(code), { error: 'not a currency code of ISO 4217' });

/** Decimals of the currency by ISO 4217. Refuses a code that is not in the table. */
export function minorUnits(currency: string): number {
  const units = table.get(currency);
  if (units === undefined) throw new RangeError(`Not a currency of the table: ${currency}`);
  return units;
}
