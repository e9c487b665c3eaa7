import fc from 'fast-check';

import {
  checkDigit,
  endsInCheckDigit,
  gln,
  graiAssetType,
  isGln,
  isGraiAssetType,
  isSscc,
  readGrai,
} from '@/shared/domain/identification';

test.each([
  { source: 'GS1, worked example of the check digit', data: '629104150021', digit: 3 },
  { source: 'GS1 General Specifications, SSCC figure (from memory)', data: '37610425002123456', digit: 9 },
  { source: 'GS1 India', data: '890400021003', digit: 7 },
  { source: 'Swedish SFTI example, GRAI', data: '0730001520015', digit: 4 },
  { source: 'GS1 Tag Data Standard, SSCC', data: '10614141234567890', digit: 8 },
  { source: 'GS1 Tag Data Standard, SSCC', data: '10614141123456789', digit: 7 },
  { source: 'GS1 examples, SSCC', data: '09520123456789123', digit: 5 },
  { source: 'GS1 Tag Data Standard, annex E.3, GLN', data: '061414112345', digit: 2 },
  { source: 'GS1 Tag Data Standard, annex E.3, GTIN-14', data: '8061414112345', digit: 8 },
  { source: 'GS1 Tag Data Standard, annex E.3, GRAI', data: '952114112345', digit: 4 },
])('$source: $data takes the check digit $digit', ({ data, digit }) => {
  expect(checkDigit(data)).toBe(digit);
  expect(endsInCheckDigit(`${data}${digit}`)).toBe(true);
});

// GS1 syntax dictionary, unit tests of lint_csum.c.
test.each(['02345673', '416000336108', '1234567890128', '12345678901231', '123456789012345675'])(
  'GS1 unit tests: %s ends in its check digit',
  (code) => expect(endsInCheckDigit(code)).toBe(true),
);
test.each([
  '12345673',
  '416000336109',
  '1234567890129',
  '12345678901232',
  '123456789012345670',
  '',
  '1234567890 28',
  ' 1234567890128',
])('GS1 unit tests: "%s" does not end in its check digit', (code) => {
  expect(endsInCheckDigit(code)).toBe(false);
});

const someDigits = (length: number) => fc.stringMatching(new RegExp(`^\\d{${length}}$`));
const seeded = { seed: 20260312, numRuns: 300 };

test('a leading zero never changes the check digit, and any one digit mistyped is caught', () => {
  fc.assert(
    fc.property(
      someDigits(12),
      fc.integer({ min: 0, max: 11 }),
      fc.integer({ min: 1, max: 9 }),
      (data, place, by) => {
        expect(checkDigit(`0${data}`)).toBe(checkDigit(data));
        const mistyped = [...data]
          .map((digit, at) => (at === place ? (Number(digit) + by) % 10 : digit))
          .join('');
        expect(endsInCheckDigit(`${mistyped}${checkDigit(data)}`)).toBe(false);
      },
    ),
    seeded,
  );
});

test('a GLN and an asset type have 13 digits, an SSCC 18: no other length passes', () => {
  fc.assert(
    fc.property(fc.integer({ min: 1, max: 20 }).chain(someDigits), (data) => {
      const code = `${data}${checkDigit(data)}`;
      expect(isGln(code)).toBe(code.length === 13);
      expect(isGraiAssetType(code)).toBe(code.length === 13);
      expect(isSscc(code)).toBe(code.length === 18);
    }),
    seeded,
  );
});

test('letters, a sign or nothing have no check digit', () => {
  expect(() => checkDigit('12A4')).toThrow(RangeError);
  expect(() => checkDigit('-124')).toThrow(RangeError);
  expect(() => checkDigit('')).toThrow(RangeError);
});

// The second digit string is seen in published samples with a wrong last digit; the right one is 4.
test('the GLN schema takes a right check digit and refuses a wrong one', () => {
  expect(gln.parse('5412345000174')).toBe('5412345000174');
  expect(gln.safeParse('5412345000176').success).toBe(false);
});

test('the asset type schema takes 13 digits, or 14 with the leading 0, and keeps 13', () => {
  expect(graiAssetType.parse('7300015200154')).toBe('7300015200154');
  expect(graiAssetType.parse('07300015200154')).toBe('7300015200154');
  expect(graiAssetType.safeParse('17300015200154').success).toBe(false);
  expect(graiAssetType.safeParse('7300015200155').success).toBe(false);
});

// GS1 syntax engine, tests of AI (8003) in ai.c; the last two from an EPCIS document sample and its mend.
test.each([
  { about: 'serial ABC', text: '800302112345678900ABC', read: { assetType: '2112345678900', serial: 'ABC' } },
  { about: 'no serial', text: '800302112345678900', read: { assetType: '2112345678900', serial: null } },
  { about: 'a bad check digit', text: '800302112345678901ABC', read: { fault: 'wrong check digit' } },
  { about: 'no leading zero', text: '800312112345678900ABC', read: { fault: 'leading digit is not 0' } },
  {
    about: 'a serial of 16',
    text: '8003021123456789001234567890ABCDEF',
    read: { assetType: '2112345678900', serial: '1234567890ABCDEF' },
  },
  {
    about: 'a serial of 17',
    text: '8003021123456789001234567890ABCDEFG',
    read: { fault: 'serial too long' },
  },
  { about: 'the zero missing', text: '80034012345555554987', read: { fault: 'leading digit is not 0' } },
  {
    about: 'the zero there',
    text: '800304012345555554987',
    read: { assetType: '4012345555554', serial: '987' },
  },
  { about: 'a blank in the serial', text: '800302112345678900A C', read: { fault: 'serial not readable' } },
  { about: 'another element string', text: '00106141412345678908', read: { fault: 'not a GRAI' } },
])('GRAI element string with $about', ({ text, read }) => {
  expect(readGrai(text)).toEqual(read);
});
