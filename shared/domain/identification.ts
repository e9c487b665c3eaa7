import { z } from 'zod';

const digits = /^\d+$/;

/**
 * Check digit of GS1 keys (GTIN, GLN, GRAI, SSCC), for the digits without it. From the right, weights 3, 1,
 * 3, 1 …; what the sum lacks to a multiple of ten. GS1 General Specifications, "Standard check digit
 * calculations". Refuses anything but digits.
 */
export function checkDigit(data: string): number {
  if (!digits.test(data)) throw new RangeError(`Not digits: ${data}`);
  const weighted = [...data].reverse().map((digit, place) => Number(digit) * (place % 2 === 0 ? 3 : 1));
  const sum = weighted.reduce((total, product) => total + product, 0);
  return (10 - (sum % 10)) % 10;
}

/** Is the last digit the check digit of those before it? Anything but two or more digits is not. */
export function endsInCheckDigit(code: string): boolean {
  return code.length > 1 && digits.test(code) && checkDigit(code.slice(0, -1)) === Number(code.at(-1));
}

/** GLN, the number of a company or a place: 13 digits, the last its check digit. */
export const isGln = (text: string): boolean => text.length === 13 && endsInCheckDigit(text);

/** SSCC, the number of one load: 18 digits, the last its check digit. */
export const isSscc = (text: string): boolean => text.length === 18 && endsInCheckDigit(text);

/** The container-type part of a GRAI: 13 digits, the last its check digit. */
export const isGraiAssetType = (text: string): boolean => text.length === 13 && endsInCheckDigit(text);

/** A GLN of 13 digits. Refuses a wrong length, a wrong check digit, blanks and hyphens. */
export const gln = z.string().refine(isGln, { error: 'not a GLN: 13 digits, the last a check digit' });

/** A GRAI asset type of 13 digits. Also taken with the leading 0 of the element string, which is left out. */
export const graiAssetType = z
  .string()
  .overwrite((text) => (text.length === 14 && text.startsWith('0') ? text.slice(1) : text))
  .refine(isGraiAssetType, { error: 'not a GRAI asset type: 13 digits, the last a check digit' });

/** What a scanned GRAI says: the container type, and the one container if it carries a serial. */
export interface Grai {
  assetType: string;
  serial: string | null;
}

export type GraiFault =
  'not a GRAI' | 'leading digit is not 0' | 'wrong check digit' | 'serial too long' | 'serial not readable';

// The 82 characters that GS1 element strings may carry (GS1 General Specifications, CSET 82).
const charset82 = /^[!"%&'()*+,\-./0-9:;<=>?A-Z_a-z]*$/;

/**
 * Reads the element string (8003): a 0, 13 digits that end in their check digit, then a serial of at most 16
 * characters or none (GS1 General Specifications, section 3). Says what is wrong with any other text.
 */
export function readGrai(elementString: string): Grai | { fault: GraiFault } {
  const [, zero, assetType = '', serial = ''] = /^8003(\d)(\d{13})(.*)$/s.exec(elementString) ?? [];
  if (zero === undefined) return { fault: 'not a GRAI' };
  if (zero !== '0') return { fault: 'leading digit is not 0' };
  if (!isGraiAssetType(assetType)) return { fault: 'wrong check digit' };
  if (serial.length > 16) return { fault: 'serial too long' };
  if (!charset82.test(serial)) return { fault: 'serial not readable' };
  return { assetType, serial: serial === '' ? null : serial };
}
