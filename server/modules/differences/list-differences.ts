import type { Reader } from '@/db/client';
import type { DifferenceRow, listDifferences as contract } from '@/shared/contracts/differences';
import type { AnswerOf, QueryOf } from '@/shared/contracts/operation';
import { daysBetween } from '@/shared/domain/calendar';
import { cursor, cutPage } from '../../http/page';
import { countedRows } from './counted-rows';
import { overdueRows } from './overdue-rows';
import { unannouncedRows } from './unannounced-rows';

type Query = QueryOf<typeof contract>;
export type Asked = { query: Query; after: ReturnType<typeof cursor>; limit: number; today: string };
/** A row before the days since it began are known. */
export type Found = Omit<DifferenceRow, 'days'>;
type Source = (db: Reader, asked: Asked) => Promise<Found[]>;

/** One list out of three: each gives the rows after the key, oldest first; the oldest of all make the page. */
export async function listDifferences(
  db: Reader,
  { query, today }: { query: Query; today: string },
): Promise<AnswerOf<typeof contract>> {
  const asked = { query, after: cursor(query.after, 2), limit: query.limit + 1, today };
  const found = await Promise.all(sourcesOf(query).map((source) => source(db, asked)));
  const down = query.state === 'settled';
  const merged = found.flat().sort((a, b) => (down ? -1 : 1) * byKey(a, b));
  const { rows, next } = cutPage(merged, query.limit, ({ since, id }) => [since, id]);
  return { rows: rows.map((row) => ({ ...row, days: Math.max(0, daysBetween(row.since, today)) })), next };
}

function sourcesOf({ kind, state }: Query): Source[] {
  if (state === 'settled') return kind === undefined || isCounted(kind) ? [countedRows] : [];
  if (kind === undefined) return [countedRows, overdueRows, unannouncedRows];
  if (isCounted(kind)) return [countedRows];
  return [kind === 'overdue' ? overdueRows : unannouncedRows];
}

const isCounted = (kind: DifferenceRow['kind']): boolean => kind === 'fewer' || kind === 'more';

function byKey(a: Found, b: Found): number {
  if (a.since !== b.since) return a.since < b.since ? -1 : 1;
  return a.id < b.id ? -1 : a.id > b.id ? 1 : 0;
}
