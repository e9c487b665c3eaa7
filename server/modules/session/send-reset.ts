import { eq } from 'drizzle-orm';
import { z } from 'zod';
import { people } from '@/db/schema/companies';
import { inTransaction } from '@/db/transaction';
import { instantOf } from '../../deps';
import type { JobHandler } from '../../jobs/job-queue';
import { resetMail } from '../../mail/letters';
import { queueMail } from '../../mail/outbox';
import { makeToken } from './tokens';

export const resetJob = 'reset link';
const payload = z.object({ email: z.string() });

/**
 * Writes the link to choose a new password, if the address is known. Done as a job: the request does the same work
 * for every address, so its time tells nothing.
 */
export const sendReset: JobHandler = async (deps, job) => {
  const { email } = payload.parse(job.payload);
  const [row] = await deps.db.select().from(people).where(eq(people.email, email));
  if (!row?.active) return;
  const now = instantOf(deps.clock);
  await inTransaction(deps.db, async (tx) => {
    const token = await makeToken(tx, { personId: row.id, purpose: 'reset', now });
    const link = `${deps.config.PUBLIC_URL}/choose-password?token=${token}`;
    await queueMail(tx, { to: row, now, ...resetMail({ name: row.name, link }) });
  });
};
