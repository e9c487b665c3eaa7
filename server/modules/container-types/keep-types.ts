import { eq, inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { containerTypes, packedWith } from '@/db/schema/containers';
import { databaseErrorNumber } from '@/db/transaction';
import type { addContainerType, changeContainerType } from '@/shared/contracts/container-types';
import type { BodyOf } from '@/shared/contracts/operation';
import { isWholeMinor } from '@/shared/domain/money';
import { type BadField, Problem } from '@/shared/problems/problems';
import { hasBeenMoved } from './moved';
import { operatorCurrency } from './read-model';

type Form = BodyOf<typeof addContainerType>;

/** A new type with what it is packed with; its code must be new. */
export async function addType(tx: Transaction, { body, now }: { body: Form; now: string }): Promise<string> {
  await refuseUnlessSound(tx, { ...body, typeCode: body.code });
  const { packedWith: packing, graiAssetType, ...values } = body;
  try {
    await tx
      .insert(containerTypes)
      .values({ ...values, graiAssetType: graiAssetType || null, createdAt: now });
  } catch (error) {
    if (databaseErrorNumber(error) !== 1062) throw error;
    throw new Problem('already exists', {
      data: { what: body.code },
      fields: [{ path: 'code', message: 'This code is taken' }],
    });
  }
  await writePacking(tx, { typeCode: body.code, packing });
  return body.code;
}

/**
 * Changes a type. Its first day in service stands once a partner has had it in hand: losses of earlier statements
 * were reckoned by the age that follows from it (RULES 3.10).
 */
export async function changeType(
  tx: Transaction,
  code: string,
  body: BodyOf<typeof changeContainerType>,
): Promise<void> {
  const [row] = await tx.select().from(containerTypes).where(eq(containerTypes.code, code)).for('update');
  if (!row) throw new Problem('not found');
  if (body.inServiceFrom !== row.inServiceFrom && (await hasBeenMoved(tx, code))) {
    const message =
      'Partners have had this type in hand, and their losses are reckoned by this day. It cannot change any more.';
    throw new Problem('not valid', { fields: [{ path: 'inServiceFrom', message }] });
  }
  await refuseUnlessSound(tx, { ...body, typeCode: code });
  const { packedWith: packing, graiAssetType, ...values } = body;
  await tx
    .update(containerTypes)
    .set({ ...values, graiAssetType: graiAssetType || null })
    .where(eq(containerTypes.code, code));
  await tx.delete(packedWith).where(eq(packedWith.typeCode, code));
  await writePacking(tx, { typeCode: code, packing });
}

type Stated = Pick<Form, 'packedWith' | 'replacement'> & { typeCode: string };

async function refuseUnlessSound(tx: Transaction, stated: Stated): Promise<void> {
  const fields = [...(await replacementFaults(tx, stated)), ...(await packingFaults(tx, stated))];
  if (fields.length > 0) throw new Problem('not valid', { fields });
}

async function replacementFaults(tx: Transaction, { replacement }: Stated): Promise<BadField[]> {
  const currency = await operatorCurrency(tx);
  if (isWholeMinor(replacement, currency)) return [];
  return [{ path: 'replacement', message: `More decimals than ${currency} has` }];
}

async function packingFaults(
  tx: Transaction,
  { packedWith: packing, typeCode }: Stated,
): Promise<BadField[]> {
  if (packing.length === 0) return [];
  const codes = packing.map((line) => line.typeCode);
  const known = await tx
    .select({ code: containerTypes.code })
    .from(containerTypes)
    .where(inArray(containerTypes.code, codes));
  const isKnown = new Set(known.map((row) => row.code));
  return packing.flatMap((line, at): BadField[] => {
    const path = `packedWith.${at}.typeCode`;
    if (line.typeCode === typeCode) return [{ path, message: 'A type is not packed with itself' }];
    if (!isKnown.has(line.typeCode)) return [{ path, message: 'No such container type' }];
    if (codes.indexOf(line.typeCode) < at) return [{ path, message: 'This type stands above already' }];
    return [];
  });
}

async function writePacking(
  tx: Transaction,
  { typeCode, packing }: { typeCode: string; packing: Form['packedWith'] },
): Promise<void> {
  if (packing.length === 0) return;
  await tx
    .insert(packedWith)
    .values(packing.map((line) => ({ typeCode, withTypeCode: line.typeCode, quantity: line.quantity })));
}
