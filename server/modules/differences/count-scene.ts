import { and, asc, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { counts, shipments } from '@/db/schema/shipments';
import { Problem } from '@/shared/problems/problems';
import { sitesById } from '../partners/sites';
import type { CountScene } from './corrected-count';

/** Locks the shipment and reads the count (its first, if none is named) with both ends. */
export async function countScene(
  tx: Transaction,
  named: { shipmentId: string; countId?: string },
): Promise<CountScene> {
  const [shipment] = await tx
    .select()
    .from(shipments)
    .where(eq(shipments.id, named.shipmentId))
    .for('update');
  const [count] = await tx
    .select()
    .from(counts)
    .where(
      and(eq(counts.shipmentId, named.shipmentId), named.countId ? eq(counts.id, named.countId) : undefined),
    )
    .orderBy(asc(counts.sequence))
    .limit(1);
  if (!shipment || !count) throw new Problem('not found');
  const sites = await sitesById(tx, [shipment.fromSiteId, shipment.toSiteId]);
  const from = sites.get(shipment.fromSiteId);
  const to = sites.get(shipment.toSiteId);
  if (!from || !to) throw new Problem('not found');
  return { shipment, count, from, to };
}
