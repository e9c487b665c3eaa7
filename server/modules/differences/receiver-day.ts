import { eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { sites } from '@/db/schema/companies';
import { differences } from '@/db/schema/differences';
import { shipments } from '@/db/schema/shipments';
import { dayInZone } from '@/shared/domain/calendar';
import { Problem } from '@/shared/problems/problems';

/** The business day at the site that received a shipment. */
export async function receiverDay(db: Reader, asked: { shipmentId: string; now: string }): Promise<string> {
  const [site] = await db
    .select({ timeZone: sites.timeZone })
    .from(shipments)
    .innerJoin(sites, eq(sites.id, shipments.toSiteId))
    .where(eq(shipments.id, asked.shipmentId));
  if (!site) throw new Problem('not found');
  return dayInZone(asked.now, site.timeZone);
}

export async function dayOfDifference(db: Reader, asked: { id: string; now: string }): Promise<string> {
  const [difference] = await db
    .select({ shipmentId: differences.shipmentId })
    .from(differences)
    .where(eq(differences.id, asked.id));
  if (!difference) throw new Problem('not found');
  return receiverDay(db, { shipmentId: difference.shipmentId, now: asked.now });
}
