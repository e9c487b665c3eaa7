import { currencyCode, currencyCodes, minorUnits } from '@/shared/domain/currencies';

// ISO 4217, list one of 2025-02-04.
const published: Record<number, string> = {
  0: 'JPY KRW CLP ISK VND PYG UGX XAF XOF',
  2: 'EUR USD GBP CHF SEK PLN CZK HUF CNY MXN INR TRY',
  3: 'BHD KWD JOD OMR TND IQD LYD',
  4: 'CLF UYW',
};
const cases = Object.entries(published).flatMap(([units, codes]) =>
  codes.split(' ').map((code) => ({ code, units: Number(units) })),
);

test.each(cases)('$code has $units decimals by ISO 4217', ({ code, units }) => {
  expect(minorUnits(code)).toBe(units);
});

// Those for which Intl.NumberFormat on Node 20 answers otherwise than ISO 4217.
test.each(['HUF', 'AFN', 'COP', 'IDR', 'PKR', 'LBP'])('%s keeps the 2 decimals of ISO 4217', (code) => {
  expect(minorUnits(code)).toBe(2);
});

test('the table lists every code once, as three capitals, in order', () => {
  expect(new Set(currencyCodes).size).toBe(currencyCodes.length);
  expect(currencyCodes.filter((code) => !/^[A-Z]{3}$/.test(code))).toEqual([]);
  expect([...currencyCodes].sort()).toEqual(currencyCodes);
});

test.each(['', 'eur', 'EURO', 'XXX', ' EUR', 'constructor'])('"%s" is refused as a currency', (code) => {
  expect(() => minorUnits(code)).toThrow(RangeError);
  expect(currencyCode.safeParse(code).success).toBe(false);
});

test('a code of the table passes the schema unchanged', () => {
  expect(currencyCode.parse('TND')).toBe('TND');
});
