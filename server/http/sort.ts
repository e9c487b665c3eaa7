import { and, asc, type Column, desc, eq, gt, lt, or, type SQL } from 'drizzle-orm';
import { Problem } from '@/shared/problems/problems';

/** By which of its columns a list is sorted, and which way: "name" or "-name". Unset is the first, ascending. */
export function sortOf<Key extends string>(
  sort: string | undefined,
  keys: readonly [Key, ...Key[]],
): { key: Key; down: boolean } {
  if (sort === undefined || sort === '') return { key: keys[0], down: false };
  const down = sort.startsWith('-');
  const key = keys.find((each) => each === (down ? sort.slice(1) : sort));
  if (key === undefined)
    throw new Problem('not valid', { fields: [{ path: 'sort', message: 'No such column' }] });
  return { key, down };
}

type Sorted = { by: Column; then: Column; down: boolean; after: { 0: string; 1: string } | null };

/** The order of a page by key, and what comes after the row last seen; `then` tells equal ones apart. */
export function keyset({ by, then, down, after }: Sorted): { after: SQL | undefined; order: SQL[] } {
  const beyond = down ? lt : gt;
  const way = down ? desc : asc;
  return {
    after: after ? or(beyond(by, after[0]), and(eq(by, after[0]), beyond(then, after[1]))) : undefined,
    order: [way(by), way(then)],
  };
}
