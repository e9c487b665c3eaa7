import { and, asc, eq, lte } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { differences } from '@/db/schema/differences';
import { shipments } from '@/db/schema/shipments';
import { formatMinor } from '@/shared/domain/money';
import type { ContentDifference } from '@/shared/domain/statement/content';
import { plain } from './assessment-input';

/** A partner's differences that are open now and arose by a day, oldest first. */
export async function openDifferencesOf(
  db: Reader,
  { partner, through }: { partner: { id: string; currency: string }; through: string },
): Promise<ContentDifference[]> {
  const rows = await db
    .select({ difference: differences, reference: shipments.reference })
    .from(differences)
    .innerJoin(shipments, eq(shipments.id, differences.shipmentId))
    .where(
      and(
        eq(differences.partnerId, partner.id),
        eq(differences.state, 'open'),
        lte(differences.openedOn, through),
      ),
    )
    .orderBy(asc(differences.openedOn), asc(differences.id));
  return rows.map(({ difference, reference }) => ({
    id: difference.id,
    shipmentId: difference.shipmentId,
    reference,
    typeCode: difference.typeCode,
    declared: difference.declared,
    counted: difference.counted,
    openUnits: difference.openUnits,
    atStake: formatMinor(plain(difference.atStake), partner.currency),
    openedOn: difference.openedOn,
  }));
}
