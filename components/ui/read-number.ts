/** Blanks of every kind that people and spreadsheets put between groups of digits. */
const blanks = /[\s\u00a0\u2007\u2009\u202f']/g;

/**
 * A whole number as people write or paste it: "392", " 1 284 ", "1,284", "+8". Null for an empty text.
 * What is not understood comes back as the text itself, so that nothing is dropped without a word.
 */
export function readWhole(typed: string): number | string | null {
  const bare = typed
    .replace(blanks, '')
    .replace(/^\+/, '')
    .replace(/^\u2212/, '-');
  if (bare === '') return null;
  const plain = /^-?\d{1,3}(,\d{3})+$/.test(bare) ? bare.replaceAll(',', '') : bare;
  if (!/^-?\d{1,15}$/.test(plain)) return typed;
  return Number(plain) + 0;
}

/**
 * An amount as people write it, as a decimal string: "4,50" and "1 284.5" become "4.50" and "1284.5"; "1,284.50" and
 * "1.284,50" are read by their last sign. What is not understood comes back as it was typed.
 */
export function readDecimal(typed: string): string {
  const bare = typed.replace(blanks, '').replace(/^\u2212/, '-');
  const lastSign = Math.max(bare.lastIndexOf(','), bare.lastIndexOf('.'));
  if (lastSign < 0) return /^-?\d+$/.test(bare) ? withoutLeadingZeros(bare) : typed.trim();
  const whole = bare.slice(0, lastSign);
  const fraction = bare.slice(lastSign + 1);
  const grouped = /^-?\d{1,3}([.,]\d{3})+$/.test(whole) && !whole.includes(bare.charAt(lastSign));
  const plainWhole = grouped ? whole.replace(/[.,]/g, '') : whole;
  if (!/^-?\d*$/.test(plainWhole) || !/^\d+$/.test(fraction)) return typed.trim();
  return `${withoutLeadingZeros(plainWhole === '' || plainWhole === '-' ? `${plainWhole}0` : plainWhole)}.${fraction}`;
}

const withoutLeadingZeros = (whole: string) => whole.replace(/^(-?)0+(?=\d)/, '$1');
