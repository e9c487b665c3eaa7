import { count, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { differences } from '@/db/schema/differences';
import { shipments } from '@/db/schema/shipments';
import { receipts } from '@/db/schema/work';
import { overdueBy } from '../shipments/list-shipments';
import { fromCompany, toCompany } from '../shipments/shipment-rows';

/** How many rows the list of differences has while nothing is narrowed: counted ones, overdue ones, unannounced ones. */
export async function countListed(db: Reader, today: string): Promise<number> {
  const counted = db.select({ n: count() }).from(differences).where(eq(differences.state, 'open'));
  const unannounced = db.select({ n: count() }).from(receipts).where(eq(receipts.state, 'unannounced'));
  const overdue = db
    .select({ n: count() })
    .from(shipments)
    .innerJoin(fromCompany, eq(fromCompany.id, shipments.fromCompanyId))
    .innerJoin(toCompany, eq(toCompany.id, shipments.toCompanyId))
    .where(overdueBy(today));
  const parts = await Promise.all([counted, overdue, unannounced]);
  return parts.reduce((sum, [row]) => sum + (row?.n ?? 0), 0);
}
