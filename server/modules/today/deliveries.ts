import { and, asc, count, eq, type SQL } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { shipments } from '@/db/schema/shipments';
import type { Today } from '@/shared/contracts/today';
import { may, type Person } from '../../http/person';
import { overdueBy } from '../shipments/list-shipments';
import { fromCompany, selectShipments, shipmentRows, toCompany, withEnds } from '../shipments/shipment-rows';

const shown = 6;

/** What is on its way to the own sites, soonest first. */
export async function toCount(db: Reader, person: Person): Promise<Today['toCount']> {
  if (!may(person, 'count shipments')) return null;
  return worklist(db, {
    person,
    where: and(eq(shipments.state, 'on the way'), eq(shipments.toCompanyId, person.companyId)),
  });
}

/** What should have been counted long ago, on either side. */
export async function overdue(
  db: Reader,
  { person, day }: { person: Person; day: string },
): Promise<Today['overdue']> {
  if (!may(person, 'settle differences')) return null;
  return worklist(db, { person, where: overdueBy(day) });
}

async function worklist(
  db: Reader,
  { person, where }: { person: Person; where: SQL | undefined },
): Promise<NonNullable<Today['toCount']>> {
  const selected = await selectShipments(db)
    .where(where)
    .orderBy(asc(shipments.expectedOn), asc(shipments.id))
    .limit(shown);
  const [all] = await db
    .select({ total: count() })
    .from(shipments)
    .innerJoin(fromCompany, eq(fromCompany.id, shipments.fromCompanyId))
    .innerJoin(toCompany, eq(toCompany.id, shipments.toCompanyId))
    .where(where);
  return { total: all?.total ?? 0, rows: await shipmentRows(db, { selected: withEnds(selected), person }) };
}
