import { eq, inArray } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { sites } from '@/db/schema/companies';
import { containerTypes, poolApprovals } from '@/db/schema/containers';
import type { ApprovalForm } from '@/shared/contracts/pool';
import { type BadField, Problem } from '@/shared/problems/problems';
import { flowsByType, plansByType } from './plan-rows';
import { inputOf, sizeOf } from './reckon';

type Approving = { typeCode: string; form: ApprovalForm; personId: string; now: string };

/**
 * Approves a size with the levels of each site, and keeps what it was reckoned from. Refused if plan or parts have
 * changed since the person saw the figure: approved is what was seen.
 */
export async function approvePoolSize(
  tx: Transaction,
  { typeCode, form, personId, now }: Approving,
): Promise<string> {
  const [type] = await tx
    .select()
    .from(containerTypes)
    .where(eq(containerTypes.code, typeCode))
    .for('update');
  if (!type) throw new Problem('not found');
  const plan = (await plansByType(tx, typeCode)).get(typeCode)?.plan;
  const flows = (await flowsByType(tx, typeCode)).get(typeCode) ?? [];
  if (!plan || flows.length === 0) {
    const why =
      'State the loop and the parts of this type first: a size is approved with what it was reckoned from.';
    throw new Problem('cannot be reckoned', { data: { why } });
  }
  const result = sizeOf(plan, flows);
  if (result.poolSize !== form.reckoned) throw new Problem('state changed');
  await refuseUnknownSites(tx, form);
  const id = newId();
  await tx.insert(poolApprovals).values({
    id,
    typeCode,
    size: form.size,
    input: inputOf(plan, flows),
    result,
    levels: form.levels,
    note: form.note,
    approvedBy: personId,
    approvedAt: now,
  });
  return id;
}

async function refuseUnknownSites(tx: Transaction, { levels }: ApprovalForm): Promise<void> {
  if (levels.length === 0) return;
  const ids = levels.map((level) => level.siteId);
  const known = new Set(
    (await tx.select({ id: sites.id }).from(sites).where(inArray(sites.id, ids))).map((row) => row.id),
  );
  const fields = ids.flatMap((siteId, at): BadField[] => {
    const path = `levels.${at}.siteId`;
    if (!known.has(siteId)) return [{ path, message: 'No such site' }];
    return ids.indexOf(siteId) < at ? [{ path, message: 'This site stands above already' }] : [];
  });
  if (fields.length > 0) throw new Problem('not valid', { fields });
}
