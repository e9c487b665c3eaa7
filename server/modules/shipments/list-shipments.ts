import { and, asc, desc, eq, exists, gt, lt, or, type SQL, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { differences } from '@/db/schema/differences';
import { shipments } from '@/db/schema/shipments';
import type { AnswerOf, QueryOf } from '@/shared/contracts/operation';
import type { listShipments as contract } from '@/shared/contracts/shipments';
import { Problem } from '@/shared/problems/problems';
import { type Person, scopeOf } from '../../http/person';
import { fromCompany, selectShipments, shipmentRows, toCompany, withEnds } from './shipment-rows';

type Query = QueryOf<typeof contract>;
type Asked = { query: Query; person: Person; today: string };

/** One page of shipments, newest first unless asked otherwise. */
export async function listShipments(db: Reader, asked: Asked): Promise<AnswerOf<typeof contract>> {
  const { query, person } = asked;
  const order = orderOf(query.sort);
  const selected = await selectShipments(db)
    .where(and(...conditionsOf(db, asked), query.after ? afterKey(query.after, order) : undefined))
    .orderBy(
      order.down ? desc(order.column) : asc(order.column),
      order.down ? desc(shipments.id) : asc(shipments.id),
    )
    .limit(query.limit + 1);
  const page = withEnds(selected.slice(0, query.limit));
  const last = page.at(-1)?.shipment;
  return {
    rows: await shipmentRows(db, { selected: page, person }),
    next: last && selected.length > query.limit ? `${last[order.key]}_${last.id}` : null,
  };
}

type Order = ReturnType<typeof orderOf>;

/** "leftOn", or "-leftOn" for the newest first. */
function orderOf(sort: string | undefined) {
  const key = sort?.replace(/^-/, '') === 'expectedOn' ? ('expectedOn' as const) : ('leftOn' as const);
  const known = sort === undefined || ['leftOn', 'expectedOn'].includes(sort.replace(/^-/, ''));
  if (!known) throw new Problem('not valid', { fields: [{ path: 'sort', message: 'No such column' }] });
  return { key, column: shipments[key], down: sort === undefined || sort.startsWith('-') };
}

function afterKey(after: string, { column, down }: Order): SQL | undefined {
  const [day, id] = after.split('_');
  if (!day || !id || !/^\d{4}-\d{2}-\d{2}$/.test(day))
    throw new Problem('not valid', { fields: [{ path: 'after', message: 'Not a key of this list' }] });
  return down
    ? or(lt(column, day), and(eq(column, day), lt(shipments.id, id)))
    : or(gt(column, day), and(eq(column, day), gt(shipments.id, id)));
}

function conditionsOf(db: Reader, { query, person, today }: Asked): (SQL | undefined)[] {
  const scope = scopeOf(person);
  const own = person.companyId;
  const search = query.search?.replace(/[\\%_]/g, '\\$&');
  return [
    scope ? or(eq(shipments.fromCompanyId, scope), eq(shipments.toCompanyId, scope)) : undefined,
    query.direction === 'in' ? eq(shipments.toCompanyId, own) : undefined,
    query.direction === 'out' ? eq(shipments.fromCompanyId, own) : undefined,
    query.contents ? eq(shipments.contents, query.contents) : undefined,
    query.partner
      ? or(eq(shipments.fromCompanyId, query.partner), eq(shipments.toCompanyId, query.partner))
      : undefined,
    search ? sql`${shipments.reference} collate utf8mb4_general_ci like ${`%${search}%`}` : undefined,
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
