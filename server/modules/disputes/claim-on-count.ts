import { and, asc, eq, or } from 'drizzle-orm';
import type { Reader, Transaction } from '@/db/client';
import { containerTypes } from '@/db/schema/containers';
import { counts, shipments } from '@/db/schema/shipments';
import { Problem } from '@/shared/problems/problems';
import { countedNow } from '../differences/corrected-count';
import type { Claim, Opening } from './open-dispute';

/** A count of a shipment that the company sent or received, and how many of one type it says it should be. */
export async function claimOnCount(tx: Transaction, { form, person }: Opening): Promise<Claim> {
  const { shipmentId = '', typeCode = '', claimed = 0 } = form;
  await tx.select({ id: shipments.id }).from(shipments).where(eq(shipments.id, shipmentId)).for('update');
  const { shipment, count } = await ownCount(tx, {
    companyId: person.companyId,
    shipmentId,
    ...(form.countId ? { countId: form.countId } : {}),
  });
  await refuseUnknownType(tx, typeCode);
  const stated = await countedNow(tx, {
    shipmentId,
    countId: count.id,
    toSiteId: shipment.toSiteId,
    typeCode,
  });
  if (stated === claimed) {
    throw new Problem('not valid', {
      fields: [{ path: 'claimed', message: 'That is what the count says already' }],
    });
  }
  return {
    subject: 'count',
    shipmentId,
    countId: count.id,
    typeCode,
    stated,
    claimed,
    amountHeld: '0',
    openKey: `count ${count.id} ${typeCode}`,
  };
}

type Named = { companyId: string; shipmentId: string; countId?: string };

/** A count of a shipment the company is party to; otherwise as if there were none. */
export async function ownCount(db: Reader, named: Named) {
  const [row] = await db
    .select({ shipment: shipments, count: counts })
    .from(shipments)
    .innerJoin(counts, eq(counts.shipmentId, shipments.id))
    .where(
      and(
        eq(shipments.id, named.shipmentId),
        or(eq(shipments.fromCompanyId, named.companyId), eq(shipments.toCompanyId, named.companyId)),
        named.countId ? eq(counts.id, named.countId) : undefined,
      ),
    )
    .orderBy(asc(counts.sequence))
    .limit(1);
  if (!row) throw new Problem('not found');
  return row;
}

async function refuseUnknownType(tx: Transaction, typeCode: string): Promise<void> {
  const [type] = await tx
    .select({ code: containerTypes.code })
    .from(containerTypes)
    .where(eq(containerTypes.code, typeCode));
  if (!type)
    throw new Problem('not valid', {
      fields: [{ path: 'typeCode', message: `No container type ${typeCode}` }],
    });
}
