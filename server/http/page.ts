import { Problem } from '@/shared/problems/problems';

/** The key of the last row seen, as it travels in `after`: its parts as base64url JSON. */
export function cursor<Parts extends number>(
  after: string | undefined,
  parts: Parts,
): (string[] & { 0: string; 1: string }) | null {
  if (after === undefined || after === '') return null;
  const read = decoded(after);
  if (!Array.isArray(read) || read.length !== parts || !read.every((part) => typeof part === 'string')) {
    throw notAKey();
  }
  return read as unknown as string[] & { 0: string; 1: string };
}

function notAKey(): Problem {
  return new Problem('not valid', {
    fields: [{ path: 'after', message: 'Not a key that this list gave out' }],
  });
}

function decoded(after: string): unknown {
  try {
    return JSON.parse(Buffer.from(after, 'base64url').toString('utf8')) as unknown;
  } catch {
    return null;
  }
}

/** A part of such a key that is a whole number. */
export function cursorNumber(part: string): number {
  if (!/^\d{1,15}$/.test(part)) throw notAKey();
  return Number(part);
}

/** One row more than wanted was read: whether there is a next page, and the key to ask it with. */
export function cutPage<Row>(
  rows: Row[],
  limit: number,
  keyOf: (row: Row) => string[],
): { rows: Row[]; next: string | null } {
  const page = rows.slice(0, limit);
  const last = page.at(-1);
  const more = rows.length > limit && last !== undefined;
  return { rows: page, next: more ? Buffer.from(JSON.stringify(keyOf(last))).toString('base64url') : null };
}
