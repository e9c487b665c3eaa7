import { parentPort, workerData } from 'node:worker_threads';
import { tsImport } from 'tsx/esm/api';

/* Compares shipments with receipts apart from the server's own thread: some ten thousand take about a second, for
   which nobody else would be served. Sends { outcome } or { failure }. */

try {
  const { reconcile } = await tsImport('../../../shared/domain/reconciliation.ts', import.meta.url);
  parentPort.postMessage({ outcome: reconcile(workerData) });
} catch (error) {
  parentPort.postMessage({ failure: error instanceof Error ? error.message : String(error) });
}
