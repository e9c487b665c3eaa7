import type { QueryInputOf } from '@/shared/contracts/operation';
import type { listStatementMovements } from '@/shared/contracts/statements';

/** Which movements stand behind a figure. */
export type Behind = Pick<
  NonNullable<QueryInputOf<typeof listStatementMovements>>,
  'line' | 'component' | 'corrects' | 'before' | 'type' | 'kind'
>;

export function movementsHref(statement: string, behind: Behind): string {
  const asked = new URLSearchParams(
    Object.entries(behind).flatMap(([key, value]) => (value === undefined ? [] : [[key, value]])),
  ).toString();
  return `/statements/${statement}/movements${asked === '' ? '' : `?${asked}`}`;
}
