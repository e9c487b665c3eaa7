import { and, eq, exists, lt, or, type SQL, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { differences } from '@/db/schema/differences';
import { shipments } from '@/db/schema/shipments';
import type { AnswerOf, QueryOf } from '@/shared/contracts/operation';
import { type listShipments as contract, shipmentSorts } from '@/shared/contracts/shipments';
import { cursor, cutPage } from '../../http/page';
import { type Person, scopeOf } from '../../http/person';
import { holdsText } from '../../http/search';
import { keyset, sortOf } from '../../http/sort';
import { fromCompany, selectShipments, shipmentRows, toCompany, withEnds } from './shipment-rows';

type Query = QueryOf<typeof contract>;
type Asked = { query: Query; person: Person; today: string };

/** One page of shipments, newest first unless asked otherwise. */
export async function listShipments(db: Reader, asked: Asked): Promise<AnswerOf<typeof contract>> {
  const { query, person } = asked;
  const { key, down } = sortOf(query.sort ?? '-leftOn', shipmentSorts);
  const page = keyset({ by: shipments[key], then: shipments.id, down, after: cursor(query.after, 2) });
  const selected = await selectShipments(db)
    .where(and(...conditionsOf(db, asked), page.after))
    .orderBy(...page.order)
    .limit(query.limit + 1);
  const { rows, next } = cutPage(selected, query.limit, ({ shipment }) => [shipment[key], shipment.id]);
  return { rows: await shipmentRows(db, { selected: withEnds(rows), person }), next };
}

function conditionsOf(db: Reader, { query, person, today }: Asked): (SQL | undefined)[] {
  const scope = scopeOf(person);
  const own = person.companyId;
  return [
    scope ? or(eq(shipments.fromCompanyId, scope), eq(shipments.toCompanyId, scope)) : undefined,
    query.direction === 'in' ? eq(shipments.toCompanyId, own) : undefined,
    query.direction === 'out' ? eq(shipments.fromCompanyId, own) : undefined,
    query.contents ? eq(shipments.contents, query.contents) : undefined,
    query.partner
      ? or(eq(shipments.fromCompanyId, query.partner), eq(shipments.toCompanyId, query.partner))
      : undefined,
    holdsText(query.search, shipments.reference),
    stateCondition(db, query.state, today),
  ];
}

function stateCondition(db: Reader, state: Query['state'], today: string): SQL | undefined {
  if (state === undefined) return undefined;
  if (state === 'overdue') return overdueBy(today);
  if (state !== 'differs') return eq(shipments.state, state);
  return exists(
    db
      .select({ one: sql`1` })
      .from(differences)
      .where(and(eq(differences.shipmentId, shipments.id), eq(differences.state, 'open'))),
  );
}

/** Not counted although more than the partner's days have passed since it left (RULES 5). Needs the two companies joined. */
export function overdueBy(today: string): SQL | undefined {
  return and(
    eq(shipments.state, 'on the way'),
    lt(
      sql`date_add(${shipments.leftOn}, interval if(${toCompany.kind} = 'partner', ${toCompany.overdueAfterDays}, ${fromCompany.overdueAfterDays}) day)`,
      today,
    ),
  );
}
