import { eq, inArray } from 'drizzle-orm';
import type { z } from 'zod';
import type { Transaction } from '@/db/client';
import { containerTypes } from '@/db/schema/containers';
import { shipmentLines, shipments } from '@/db/schema/shipments';
import type { AnswerOf } from '@/shared/contracts/operation';
import type { countForm, countShipment as contract } from '@/shared/contracts/shipments';
import { dayInZone } from '@/shared/domain/calendar';
import { Problem } from '@/shared/problems/problems';
import type { Person } from '../../http/person';
import { checkOwnFiles } from '../files/own-files';
import { sitesById } from '../partners/sites';
import { countShipment } from './count-shipment';

type CountedByForm = { shipmentId: string; form: z.output<typeof countForm>; person: Person; now: string };

/** What a person of the receiving company counted; a shipment that is not theirs is as if it did not exist. */
export async function countByForm(
  tx: Transaction,
  { shipmentId, form, person, now }: CountedByForm,
): Promise<AnswerOf<typeof contract>> {
  const [shipment] = await tx
    .select({ toCompanyId: shipments.toCompanyId, toSiteId: shipments.toSiteId })
    .from(shipments)
    .where(eq(shipments.id, shipmentId));
  if (shipment?.toCompanyId !== person.companyId) throw new Problem('not found');
  const site = (await sitesById(tx, [shipment.toSiteId])).get(shipment.toSiteId);
  await checkOwnFiles(tx, person, { ids: form.photoIds, path: 'photoIds' });
  const counted = await countShipment(tx, {
    ...form,
    shipmentId,
    countedOn: dayInZone(now, site?.timeZone ?? 'UTC'),
    source: 'person',
    personId: person.id,
    now,
  });
  return {
    id: counted.id,
    shipmentId,
    reference: counted.shipment.reference,
    countedAt: now,
    differences: await differencesOf(tx, { shipmentId, lines: form.lines }),
  };
}

type Lines = z.output<typeof countForm>['lines'];

async function differencesOf(
  tx: Transaction,
  { shipmentId, lines }: { shipmentId: string; lines: Lines },
): Promise<AnswerOf<typeof contract>['differences']> {
  const declared = await tx.select().from(shipmentLines).where(eq(shipmentLines.shipmentId, shipmentId));
  const types = await tx
    .select({ code: containerTypes.code, name: containerTypes.name })
    .from(containerTypes)
    .where(
      inArray(
        containerTypes.code,
        lines.map((line) => line.typeCode),
      ),
    );
  return lines.flatMap(({ typeCode, counted }) => {
    const said = declared.find((line) => line.typeCode === typeCode)?.declared ?? 0;
    const typeName = types.find((type) => type.code === typeCode)?.name ?? typeCode;
    return counted === said ? [] : [{ typeCode, typeName, by: counted - said }];
  });
}
