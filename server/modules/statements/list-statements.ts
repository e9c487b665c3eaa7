import { and, eq, getTableColumns } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { statements } from '@/db/schema/statements';
import type { QueryOf } from '@/shared/contracts/operation';
import type { listStatements } from '@/shared/contracts/statements';
import { cursor, cutPage } from '../../http/page';
import { type Person, scopeOf } from '../../http/person';
import { holdsText } from '../../http/search';
import { keyset } from '../../http/sort';
import { heldOf } from './held';
import { statementRowOf } from './statement-rows';

const { content: _content, ...columns } = getTableColumns(statements);

/** Newest month first, within a month by the partner's name. A partner sees its own that were issued. */
export async function statementsPage(
  db: Database,
  { query, person }: { query: QueryOf<typeof listStatements>; person: Person },
) {
  const scope = scopeOf(person);
  const { month, number } = statements;
  const order = keyset({ by: month, then: number, down: true, after: cursor(query.after, 2) });
  const rows = await db
    .select({ row: columns, partner: { id: companies.id, name: companies.name } })
    .from(statements)
    .innerJoin(companies, eq(companies.id, statements.companyId))
    .where(
      and(
        scope ? and(eq(statements.companyId, scope), eq(statements.state, 'issued')) : undefined,
        query.month ? eq(statements.month, query.month) : undefined,
        query.partner ? eq(statements.companyId, query.partner) : undefined,
        query.state ? eq(statements.state, query.state) : undefined,
        query.answer ? eq(statements.answer, query.answer) : undefined,
        holdsText(query.search, companies.name, statements.number),
        order.after,
      ),
    )
    .orderBy(...order.order)
    .limit(query.limit + 1);
  const page = cutPage(rows, query.limit, ({ row }) => [row.month, row.number]);
  const held = await heldOf(
    db,
    page.rows.map(({ row }) => row.id),
  );
  return {
    ...page,
    rows: page.rows.map(({ row, partner }) =>
      statementRowOf(row, { partner, held: held.get(row.id) ?? '0' }),
    ),
  };
}
