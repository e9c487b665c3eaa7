import { and, asc, eq, isNull, lt, or } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { jobs } from '@/db/schema/work';
import { inTransaction } from '@/db/transaction';
import type { Deps } from '../deps';
import { instantOf } from '../deps';

export type Job = typeof jobs.$inferSelect;
export type Progress = (done: number, total: number) => Promise<void>;
/** The work of one kind of job. It may run again after a crash, so every step must bear repeating. */
export type JobHandler = (deps: Deps, job: Job, progress: Progress) => Promise<unknown>;

const leaseMs = 60_000;
const mostAttempts = 5;

type Asked = {
  kind: string;
  payload: unknown;
  onceKey: string;
  now: string;
  companyId?: string;
  createdBy?: string;
};

/** Puts a job in the queue, in the transaction that wants it done. The same onceKey twice is one job. */
export async function queueJob(tx: Transaction, asked: Asked): Promise<string> {
  await tx
    .insert(jobs)
    .ignore()
    .values({
      id: newId(),
      kind: asked.kind,
      payload: asked.payload,
      state: 'waiting',
      onceKey: asked.onceKey,
      companyId: asked.companyId ?? null,
      createdBy: asked.createdBy ?? null,
      createdAt: asked.now,
    });
  const [held] = await tx.select({ id: jobs.id }).from(jobs).where(eq(jobs.onceKey, asked.onceKey));
  if (!held) throw new Error('the job was not kept');
  return held.id;
}

/** Takes one waiting job, or one whose worker fell silent, and does it. Returns false when there is none. */
export async function runNextJob(deps: Deps, handlers: Record<string, JobHandler>): Promise<boolean> {
  const job = await claim(deps);
  if (!job) return false;
  const handler = handlers[job.kind];
  const close = (set: Partial<Job>) =>
    deps.db
      .update(jobs)
      .set({ ...set, claimedUntil: null })
      .where(eq(jobs.id, job.id));
  const progress: Progress = async (done, total) => {
    await deps.db
      .update(jobs)
      .set({ done, total, claimedUntil: leaseFrom(deps) })
      .where(eq(jobs.id, job.id));
  };
  const beat = setInterval(() => void progressBeat(deps, job.id), leaseMs / 3);
  try {
    if (!handler) throw new Error(`no handler for ${job.kind}`);
    const result = (await handler(deps, job, progress)) ?? null;
    await close({ state: 'done', result, endedAt: instantOf(deps.clock) });
  } catch (error) {
    deps.logger.error({ err: error, job: job.id, kind: job.kind }, 'job failed');
    const problem = (error instanceof Error ? error.message : String(error)).slice(0, 500);
    const last = job.attempts >= mostAttempts;
    await close(
      last ? { state: 'failed', problem, endedAt: instantOf(deps.clock) } : { state: 'waiting', problem },
    );
  } finally {
    clearInterval(beat);
  }
  return true;
}

async function progressBeat(deps: Deps, id: string): Promise<void> {
  await deps.db
    .update(jobs)
    .set({ claimedUntil: leaseFrom(deps) })
    .where(and(eq(jobs.id, id), eq(jobs.state, 'running')))
    .catch((error: unknown) => deps.logger.warn({ err: error }, 'lease not renewed'));
}

function leaseFrom(deps: Deps): string {
  return new Date(deps.clock.now().getTime() + leaseMs).toISOString();
}

async function claim(deps: Deps): Promise<Job | null> {
  const now = instantOf(deps.clock);
  return inTransaction(deps.db, async (tx) => {
    const [job] = await tx
      .select()
      .from(jobs)
      .where(
        or(
          and(eq(jobs.state, 'waiting'), or(isNull(jobs.claimedUntil), lt(jobs.claimedUntil, now))),
          and(eq(jobs.state, 'running'), lt(jobs.claimedUntil, now)),
        ),
      )
      .orderBy(asc(jobs.createdAt))
      .limit(1)
      .for('update', { skipLocked: true });
    if (!job) return null;
    const attempts = job.attempts + 1;
    await tx
      .update(jobs)
      .set({ state: 'running', attempts, claimedUntil: leaseFrom(deps) })
      .where(eq(jobs.id, job.id));
    return { ...job, attempts };
  });
}
