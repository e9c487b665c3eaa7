import { eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { imports } from '@/db/schema/work';
import { type BadField, Problem } from '@/shared/problems/problems';
import type { Person } from '../../http/person';
import { queueJob } from '../../jobs/job-queue';

export type Import = typeof imports.$inferSelect;
export const importJob = 'post import';

type Confirming = { importId: string; leaveOut: number; person: Person; now: string };

/** Has the good rows posted by a job. Twice is once; bad rows are left out only when their number was said. */
export async function confirmImport(
  tx: Transaction,
  { importId, leaveOut, person, now }: Confirming,
): Promise<Pick<Import, 'id' | 'state'>> {
  const held = await lockedImport(tx, importId);
  if (held.state === 'running' || held.state === 'done') return held;
  if (held.state === 'dropped') throw new Problem('state changed');
  refuseUnsaid(held, leaveOut);
  const again = held.state === 'failed' ? ` ${now}` : '';
  const jobId = await queueJob(tx, {
    kind: importJob,
    payload: { importId },
    onceKey: `import ${importId}${again}`,
    now,
    companyId: person.companyId,
    createdBy: person.id,
  });
  await tx
    .update(imports)
    .set({ state: 'running', jobId, confirmedBy: person.id, confirmedAt: now })
    .where(eq(imports.id, importId));
  return { id: importId, state: 'running' };
}

function refuseUnsaid(held: Import, leaveOut: number): void {
  const fields: BadField[] = [];
  if (leaveOut !== held.rowsBad)
    fields.push({ path: 'leaveOut', message: `${held.rowsBad} rows cannot be posted` });
  if (held.rowsGood === 0) fields.push({ path: '', message: 'No row of the file can be posted' });
  if (fields.length > 0) throw new Problem('not valid', { fields });
}

/** Puts a file aside that was not posted. */
export async function dropImport(tx: Transaction, importId: string): Promise<Pick<Import, 'id' | 'state'>> {
  const held = await lockedImport(tx, importId);
  if (held.state !== 'preview' && held.state !== 'dropped') throw new Problem('state changed');
  await tx.update(imports).set({ state: 'dropped' }).where(eq(imports.id, importId));
  return { id: importId, state: 'dropped' };
}

async function lockedImport(tx: Transaction, importId: string): Promise<Import> {
  const [held] = await tx.select().from(imports).where(eq(imports.id, importId)).for('update');
  if (!held) throw new Problem('not found');
  return held;
}
