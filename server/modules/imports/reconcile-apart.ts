import { once } from 'node:events';
import path from 'node:path';
import { Worker } from 'node:worker_threads';
import type { Reconciliation, ReconciliationInput } from '@/shared/domain/reconciliation';

type Message = { outcome?: Reconciliation; failure?: string };

/** The comparison of RULES 5 in a thread of its own. */
export async function reconcileApart(input: ReconciliationInput): Promise<Reconciliation> {
  const worker = new Worker(path.join(__dirname, 'reconcile-worker.mjs'), {
    workerData: input,
    execArgv: [],
  });
  try {
    const [message] = (await once(worker, 'message')) as [Message];
    if (!message.outcome) throw new Error(`the comparison failed: ${message.failure ?? 'without a word'}`);
    return message.outcome;
  } finally {
    await worker.terminate();
  }
}
