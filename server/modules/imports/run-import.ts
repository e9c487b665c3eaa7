import { eq } from 'drizzle-orm';
import { z } from 'zod';
import { imports } from '@/db/schema/work';
import type { Deps } from '../../deps';
import { instantOf } from '../../deps';
import type { Job, Progress } from '../../jobs/job-queue';
import type { Import } from './confirm-import';
import { readDocuments } from './kept-documents';
import { planMatches } from './plan-matches';
import { postMatches } from './post-matches';
import { postShipments } from './post-shipments';
import { storeReceipts } from './store-receipts';

export type Run = {
  deps: Deps;
  importId: string;
  /** Who confirmed; stands on every posting. */
  personId: string | null;
  /** Tells that so many more steps are done. */
  step: (steps: number) => Promise<void>;
  /** Tells that only so many steps are left. */
  left: (steps: number) => Promise<void>;
};

const payload = z.object({ importId: z.uuid() });

/**
 * Posts a file: its shipments, its receipts, the comparison, the counts. Each document has its own transaction with a
 * mark, and the comparison is kept before it is acted on, so that a run that broke off goes on where it stood.
 */
export async function runImport(deps: Deps, job: Job, progress: Progress): Promise<void> {
  const { importId } = payload.parse(job.payload);
  const held = await readHeld(deps, importId);
  if (held.phase === 'posted') return;
  try {
    await postAll(deps, { held, progress });
  } catch (error) {
    if (job.attempts >= lastAttempt) await close(deps, { importId, state: 'failed' });
    throw error;
  }
  await close(deps, { importId, state: 'done' });
}

/** As the job queue has it. */
const lastAttempt = 5;

async function postAll(deps: Deps, { held, progress }: { held: Import; progress: Progress }): Promise<void> {
  const documents = await readDocuments(deps, held.id);
  // A shipment, and a receipt's match, are a step each; the comparison counts as one.
  const total = documents.length + 1;
  let done = 0;
  const run: Run = {
    deps,
    importId: held.id,
    personId: held.confirmedBy,
    step: async (steps) => {
      if (steps === 0) return;
      done = Math.min(total, done + steps);
      await progress(done, total);
    },
    left: (steps) => run.step(total - steps - done),
  };
  if (held.phase === 'read') {
    await postShipments(run, documents);
    await storeReceipts(run, documents);
    await planMatches(run);
  }
  await postMatches(run);
  await run.left(0);
}

async function readHeld(deps: Deps, importId: string): Promise<Import> {
  const [held] = await deps.db.select().from(imports).where(eq(imports.id, importId));
  if (!held) throw new Error('the import is gone');
  return held;
}

async function close(
  deps: Deps,
  { importId, state }: { importId: string; state: 'done' | 'failed' },
): Promise<void> {
  await deps.db
    .update(imports)
    .set({ state, endedAt: instantOf(deps.clock), ...(state === 'done' ? { phase: 'posted' as const } : {}) })
    .where(eq(imports.id, importId));
}
