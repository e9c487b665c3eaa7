import { and, asc, desc, eq, gt, inArray, isNotNull, isNull, lt, or, type SQL, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { disputes } from '@/db/schema/differences';
import { shipments } from '@/db/schema/shipments';
import { statements } from '@/db/schema/statements';
import type { listDisputes as contract } from '@/shared/contracts/disputes';
import type { AnswerOf, QueryOf } from '@/shared/contracts/operation';
import { Problem } from '@/shared/problems/problems';
import { scopeOf } from '../../http/person';
import { disputeRow, type Seen, selectDisputes } from './dispute-rows';

type Query = QueryOf<typeof contract>;

/** Undecided ones by the longest silence, decided ones the latest first. */
export async function listDisputes(
  db: Reader,
  { query, seen }: { query: Query; seen: Seen },
): Promise<AnswerOf<typeof contract>> {
  const down = query.state === 'decided';
  const selected = await selectDisputes(db)
    .where(and(...conditionsOf(query, seen), afterKey(query.after, { down })))
    .orderBy(
      down ? desc(disputes.lastWordAt) : asc(disputes.lastWordAt),
      down ? desc(disputes.id) : asc(disputes.id),
    )
    .limit(query.limit + 1);
  const page = selected.slice(0, query.limit);
  const last = page.at(-1)?.dispute;
  return {
    rows: page.map((row) => disputeRow(row, seen)),
    next: last && selected.length > query.limit ? `${last.lastWordAt}_${last.id}` : null,
  };
}

function conditionsOf(query: Query, { person }: Seen): (SQL | undefined)[] {
  const scope = scopeOf(person);
  return [
    scope ? eq(disputes.companyId, scope) : undefined,
    stateCondition(query.state),
    query.subject ? eq(disputes.subject, query.subject) : undefined,
    query.partner ? eq(disputes.companyId, query.partner) : undefined,
    searchCondition(query.search),
  ];
}

function stateCondition(state: Query['state']): SQL | undefined {
  if (state === 'undecided')
    return and(inArray(disputes.state, ['open', 'waiting for partner']), isNotNull(disputes.openKey));
  if (state === 'decided') return isNull(disputes.openKey);
  return eq(disputes.state, state);
}

function searchCondition(search: string | undefined): SQL | undefined {
  if (!search) return undefined;
  const pattern = `%${search.replace(/[\\%_]/g, '\\$&')}%`;
  return or(
    sql`${shipments.reference} collate utf8mb4_general_ci like ${pattern}`,
    sql`${statements.number} collate utf8mb4_general_ci like ${pattern}`,
  );
}

function afterKey(after: string | undefined, { down }: { down: boolean }): SQL | undefined {
  if (after === undefined) return undefined;
  const [at = '', id = ''] = after.split('_');
  if (!/^\d{4}-\d{2}-\d{2}T[\d:.]+Z$/.test(at) || !/^[0-9a-f-]{36}$/.test(id))
    throw new Problem('not valid', { fields: [{ path: 'after', message: 'Not a key of this list' }] });
  const beyond = down ? lt : gt;
  return or(beyond(disputes.lastWordAt, at), and(eq(disputes.lastWordAt, at), beyond(disputes.id, id)));
}
