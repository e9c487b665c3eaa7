/** A reference as written, read into what the rules compare (RULES 5). */
export interface Reference {
  /** Upper case, letters and digits only. */
  compact: string;
  /** The leading letters; empty when there are none, or nothing else. */
  prefix: string;
  /** What follows the prefix, leading zeros kept. */
  padded: string;
  /** What two references of the same shipment share: prefix and leading zeros set aside. */
  core: string;
}

const NOISE = /[^\p{L}\p{N}]+/gu;
const LEADING_LETTERS = /^\p{L}+/u;
const SEPARATORS = /[+,;&|\n]|\band\b/iu;
const FIRM_SEPARATORS = /[/+,;&|\n]|\band\b/iu;
const LOOSE_SEPARATORS = /[/\s]+|[+,;&|]|\band\b/iu;

const LOOK_ALIKE: Record<string, string> = { O: '0', I: '1', S: '5', B: '8' };

/** Null when nothing but signs and blanks is written. */
export function readReference(text: string | null): Reference | null {
  const compact = (text ?? '').normalize('NFKC').toUpperCase().replace(NOISE, '');
  if (compact === '') return null;
  const prefix = LEADING_LETTERS.exec(compact)?.[0] ?? '';
  const padded = compact.slice(prefix.length);
  if (padded === '') return { compact, prefix: '', padded: compact, core: compact };
  return { compact, prefix, padded, core: padded.replace(/^0+(?=.)/, '') };
}

/** Whether the signs between the parts say that several references are meant. */
export const namesSeveral = (text: string): boolean => SEPARATORS.test(text);

/**
 * The references that a text may name when it names several, in each way to read it: blanks part them, or
 * stand inside them. Fewer than two mean that it names one.
 */
export function readSeveral(text: string): Reference[][] {
  const readings = [FIRM_SEPARATORS, LOOSE_SEPARATORS].map((by) =>
    withPrefixes(text.split(by).filter((word) => word.replace(NOISE, '') !== ''))
      .map(readReference)
      .filter((reference) => reference !== null),
  );
  return readings.filter((parts, at) => parts.length > 1 && parts.length !== readings[at - 1]?.length);
}

/** A word of letters alone is the prefix of the next. */
function withPrefixes(words: string[]): string[] {
  const joined: string[] = [];
  for (const word of words) {
    const before = joined.at(-1);
    if (before !== undefined && /^[^\p{N}]+$/u.test(before)) joined[joined.length - 1] = before + word;
    else joined.push(word);
  }
  return joined;
}

/** Two prefixes can belong to one pad when they are the same or one was left out. */
export const prefixesAgree = (a: Reference, b: Reference): boolean =>
  a.prefix === b.prefix || a.prefix === '' || b.prefix === '';

/** Look-alikes made one: 0/O, 1/I, 5/S, 8/B. */
export const withoutLookAlikes = (text: string): string => text.replace(/[OISB]/g, (c) => LOOK_ALIKE[c] ?? c);
