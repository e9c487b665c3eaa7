import { and, eq, inArray, isNotNull, isNull, type SQL } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { disputes } from '@/db/schema/differences';
import { shipments } from '@/db/schema/shipments';
import { statements } from '@/db/schema/statements';
import { type listDisputes as contract, undecided } from '@/shared/contracts/disputes';
import type { AnswerOf, QueryOf } from '@/shared/contracts/operation';
import { cursor, cutPage } from '../../http/page';
import { scopeOf } from '../../http/person';
import { holdsText } from '../../http/search';
import { keyset } from '../../http/sort';
import { disputeRow, type Seen, selectDisputes } from './dispute-rows';

type Query = QueryOf<typeof contract>;

/** Undecided ones by the longest silence, decided ones the latest first. */
export async function listDisputes(
  db: Reader,
  { query, seen }: { query: Query; seen: Seen },
): Promise<AnswerOf<typeof contract>> {
  const { lastWordAt, id } = disputes;
  const down = query.state === 'decided';
  const page = keyset({ by: lastWordAt, then: id, down, after: cursor(query.after, 2) });
  const selected = await selectDisputes(db)
    .where(and(...conditionsOf(query, seen), page.after))
    .orderBy(...page.order)
    .limit(query.limit + 1);
  const { rows, next } = cutPage(selected, query.limit, ({ dispute }) => [dispute.lastWordAt, dispute.id]);
  return { rows: rows.map((row) => disputeRow(row, seen)), next };
}

function conditionsOf(query: Query, { person }: Seen): (SQL | undefined)[] {
  const scope = scopeOf(person);
  return [
    scope ? eq(disputes.companyId, scope) : undefined,
    stateCondition(query.state),
    query.subject ? eq(disputes.subject, query.subject) : undefined,
    query.partner ? eq(disputes.companyId, query.partner) : undefined,
    holdsText(query.search, shipments.reference, statements.number),
  ];
}

function stateCondition(state: Query['state']): SQL | undefined {
  if (state === 'undecided') return and(inArray(disputes.state, [...undecided]), isNotNull(disputes.openKey));
  if (state === 'decided') return isNull(disputes.openKey);
  return eq(disputes.state, state);
}
