import { eq } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { containerTypes, parts } from '@/db/schema/containers';
import { databaseErrorNumber } from '@/db/transaction';
import type { addPart, changePart } from '@/shared/contracts/parts';
import type { BodyOf } from '@/shared/contracts/operation';
import { type BadField, Problem } from '@/shared/problems/problems';
import { sitesById } from '../partners/sites';

type Form = BodyOf<typeof addPart>;

/** A new packing specification: a part number stands once between the same two sites. */
export async function addPartRow(
  tx: Transaction,
  { body, now }: { body: Form; now: string },
): Promise<string> {
  await refuseUnlessKnown(tx, body);
  const id = newId();
  await unlessTaken(() => tx.insert(parts).values({ ...body, id, createdAt: now }));
  return id;
}

export async function changePartRow(
  tx: Transaction,
  id: string,
  body: BodyOf<typeof changePart>,
): Promise<void> {
  const [row] = await tx.select().from(parts).where(eq(parts.id, id)).for('update');
  if (!row) throw new Problem('not found');
  await refuseUnlessKnown(tx, body);
  await unlessTaken(() => tx.update(parts).set(body).where(eq(parts.id, id)));
}

async function refuseUnlessKnown(tx: Transaction, body: Form): Promise<void> {
  const fields: BadField[] = [];
  const [type] = await tx
    .select({ active: containerTypes.active })
    .from(containerTypes)
    .where(eq(containerTypes.code, body.typeCode));
  if (!type) fields.push({ path: 'typeCode', message: 'No such container type' });
  const sites = await sitesById(tx, [body.supplierSiteId, body.plantSiteId]);
  if (sites.get(body.supplierSiteId)?.company.kind !== 'partner') {
    fields.push({ path: 'supplierSiteId', message: 'No such site of a partner' });
  }
  if (sites.get(body.plantSiteId)?.company.kind !== 'operator') {
    fields.push({ path: 'plantSiteId', message: 'No such plant' });
  }
  if (fields.length > 0) throw new Problem('not valid', { fields });
}

async function unlessTaken(write: () => Promise<unknown>): Promise<void> {
  try {
    await write();
  } catch (error) {
    if (databaseErrorNumber(error) !== 1062) throw error;
    const message = 'This part number stands already between these two sites';
    throw new Problem('already exists', {
      data: { what: 'This part number' },
      fields: [{ path: 'number', message }],
    });
  }
}
