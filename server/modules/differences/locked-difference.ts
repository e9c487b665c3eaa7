import { eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { people } from '@/db/schema/companies';
import { differences, settlements } from '@/db/schema/differences';
import { shipments } from '@/db/schema/shipments';
import { Problem } from '@/shared/problems/problems';

export type DifferenceRow = typeof differences.$inferSelect;

/** Locks the shipment, then the difference: whoever settles anything of a shipment comes one after the other. */
export async function lockedDifference(tx: Transaction, id: string): Promise<DifferenceRow> {
  const [found] = await tx
    .select({ shipmentId: differences.shipmentId })
    .from(differences)
    .where(eq(differences.id, id));
  if (!found) throw new Problem('not found');
  await tx
    .select({ id: shipments.id })
    .from(shipments)
    .where(eq(shipments.id, found.shipmentId))
    .for('update');
  const [difference] = await tx.select().from(differences).where(eq(differences.id, id)).for('update');
  if (!difference) throw new Problem('not found');
  if (difference.state === 'settled') throw await alreadySettled(tx, difference);
  return difference;
}

async function alreadySettled(tx: Transaction, difference: DifferenceRow): Promise<Problem> {
  const [last] = await tx
    .select({ by: people.name })
    .from(settlements)
    .leftJoin(people, eq(people.id, settlements.settledBy))
    .where(eq(settlements.differenceId, difference.id))
    .limit(1);
  return new Problem('already settled', { data: { by: last?.by ?? null, at: difference.settledAt } });
}

export function refuseMoreThanOpen(difference: DifferenceRow, units: number): void {
  if (units > Math.abs(difference.openUnits)) {
    throw new Problem('more than open', { data: { open: Math.abs(difference.openUnits), asked: units } });
  }
}
