import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { people } from '@/db/schema/companies';
import { months, statements } from '@/db/schema/statements';
import { lastDayOfMonth } from '@/shared/domain/calendar';
import { Problem } from '@/shared/problems/problems';
import { queueJob } from '../../jobs/job-queue';
import { operatorDay } from '../partners/operator-day';
import { earlierOpenMonth, laterClosed } from './month-order';
import { openItemsOf } from './open-items';

export const monthJobs = { drafts: 'draft statements', issue: 'issue statements' } as const;
/** The start of the once-key of a month's jobs. */
export const jobKeyOf = (kind: keyof typeof monthJobs, month: string): string => `${kind} ${month}`;

type Closing = { month: string; reason: string; personId: string | null; now: string };

/**
 * Closes a month (RULES 4) and queues its drafts. The row is locked: postings under way come first, later ones are
 * refused. Refused before its last day is over, out of order, twice, and without a reason while something is open.
 */
export async function closeMonth(tx: Transaction, closing: Closing): Promise<{ jobId: string }> {
  const { month, reason, personId, now } = closing;
  const row = await lockedMonth(tx, month);
  if (row.state === 'closed') throw new Problem('already closed', { data: await closedBy(tx, row) });
  if ((await operatorDay(tx, now)) <= lastDayOfMonth(month)) {
    throw new Problem('month not over', { data: { month } });
  }
  const earlier = await earlierOpenMonth(tx, month);
  if (earlier) throw new Problem('earlier month open', { data: { month: earlier } });
  if (reason === '' && (await openItemsOf(tx, month)).length > 0) {
    throw new Problem('not valid', {
      fields: [
        { path: 'reason', message: 'Something still stands open: say why the month is closed anyway' },
      ],
    });
  }
  await tx
    .update(months)
    .set({ state: 'closed', closedBy: personId, closedAt: now, reason })
    .where(eq(months.month, month));
  return { jobId: await queueDrafts(tx, { month, now, personId, onceKey: jobKeyOf('drafts', month) }) };
}

async function lockedMonth(tx: Transaction, month: string) {
  await tx.insert(months).ignore().values({ month, state: 'open' });
  const [row] = await tx.select().from(months).where(eq(months.month, month)).for('update');
  if (!row) throw new Error('the month was not kept');
  return row;
}

async function closedBy(tx: Transaction, row: typeof months.$inferSelect): Promise<Record<string, unknown>> {
  const [by] = row.closedBy
    ? await tx.select({ name: people.name }).from(people).where(eq(people.id, row.closedBy))
    : [];
  return { by: by?.name ?? null, at: row.closedAt };
}

type Queueing = { month: string; now: string; personId: string | null; onceKey: string };

function queueDrafts(tx: Transaction, { month, now, personId, onceKey }: Queueing): Promise<string> {
  return queueJob(tx, {
    kind: monthJobs.drafts,
    payload: { month },
    onceKey,
    now,
    ...(personId ? { createdBy: personId } : {}),
  });
}

type Again = { month: string; key: string; personId: string; now: string };

/** Makes the drafts of a closed month again with what is known now. */
export async function draftAgain(tx: Transaction, again: Again): Promise<{ jobId: string }> {
  const { month, key, personId, now } = again;
  const row = await lockedMonth(tx, month);
  if (row.state !== 'closed') throw new Problem('month not closed', { data: { month } });
  if (await laterClosed(tx, month)) throw new Problem('state changed');
  const onceKey = `${jobKeyOf('drafts', month)} ${key}`;
  return { jobId: await queueDrafts(tx, { month, now, personId, onceKey }) };
}

/** Queues the issue of all drafts of a month; refused when none is left. */
export async function issueAll(
  tx: Transaction,
  { month, key, personId, now }: Again,
): Promise<{ jobId: string }> {
  const row = await lockedMonth(tx, month);
  if (row.state !== 'closed') throw new Problem('month not closed', { data: { month } });
  const [draft] = await tx
    .select({ id: statements.id })
    .from(statements)
    .where(and(eq(statements.month, month), eq(statements.state, 'draft')))
    .limit(1);
  if (!draft) throw new Problem('already issued');
  const jobId = await queueJob(tx, {
    kind: monthJobs.issue,
    payload: { month },
    onceKey: `${jobKeyOf('issue', month)} ${key}`,
    now,
    createdBy: personId,
  });
  return { jobId };
}
