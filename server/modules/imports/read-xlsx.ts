import { on } from 'node:events';
import path from 'node:path';
import { Worker } from 'node:worker_threads';
import { mostImportRows } from '@/shared/contracts/imports';
import type { RawRow } from './read-csv';
import { unreadable } from './unreadable';
import { guardWorkbook } from './zip-guard';

type Message = { rows?: RawRow[]; end?: boolean; broken?: boolean };

const mostMilliseconds = 60_000;
const mostColumns = 40;

/** Rows of the first sheet of a workbook with their number in it, read by a thread of its own within time and memory. */
export async function* readXlsx(bytes: Buffer): AsyncGenerator<RawRow> {
  await guardWorkbook(bytes);
  const worker = new Worker(path.join(__dirname, 'xlsx-worker.mjs'), {
    workerData: { bytes, mostColumns, mostRows: 2 * mostImportRows },
    resourceLimits: { maxOldGenerationSizeMb: 384 },
    execArgv: [],
    stderr: true,
  });
  const stop = new AbortController();
  const timer = setTimeout(() => stop.abort(), mostMilliseconds);
  worker.once('error', () => stop.abort());
  worker.once('exit', () => stop.abort());
  try {
    yield* rowsFrom(worker, stop.signal);
  } finally {
    clearTimeout(timer);
    await worker.terminate();
  }
}

async function* rowsFrom(worker: Worker, signal: AbortSignal): AsyncGenerator<RawRow> {
  try {
    for await (const [message] of on(worker, 'message', { signal }) as AsyncIterable<[Message]>) {
      if (message.broken) break;
      if (message.end) return;
      yield* message.rows ?? [];
    }
  } catch (error) {
    if (!(error instanceof Error) || error.name !== 'AbortError') throw error;
  }
  throw unreadable('broken');
}
