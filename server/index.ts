import { createServer } from 'node:http';
import { databaseOn, poolOf } from '@/db/client';
import { createApp } from './app';
import { type Config, readConfig } from './config';
import type { Deps } from './deps';
import { folderStore } from './files/file-store';
import { loggerOf } from './http/logger';
import { jobHandlers, scheduled } from './jobs/all-work';
import { startWorker } from './jobs/worker';
import { mailerOf } from './mail/send-waiting';

function configured(): Config {
  try {
    return readConfig(process.env);
  } catch (error) {
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  }
}

const config = configured();
const logger = loggerOf(config.LOG_LEVEL);
const pool = poolOf(config.DATABASE_URL, config.DATABASE_CONNECTIONS);
const deps: Deps = {
  config,
  pool,
  db: databaseOn(pool),
  files: folderStore(config.FILES_DIR),
  logger,
  clock: { now: () => new Date() },
};

const server = createServer(
  { maxHeaderSize: 16_384, headersTimeout: 15_000, requestTimeout: 120_000 },
  createApp(deps),
);
const worker = config.RUN_JOBS
  ? startWorker(deps, { mailer: mailerOf(config.SMTP_URL), handlers: jobHandlers, scheduled })
  : null;

server.listen(config.PORT, config.HOST, () => logger.info({ port: config.PORT }, 'listening'));
server.on('error', (error) => {
  logger.fatal({ err: error }, 'cannot listen');
  process.exit(1);
});

let stopping = false;
async function stop(signal: string): Promise<void> {
  if (stopping) return;
  stopping = true;
  logger.info({ signal }, 'stopping: no new requests, what runs is finished');
  setTimeout(() => process.exit(1), 15_000).unref();
  server.close();
  server.closeIdleConnections();
  await worker?.stop();
  await pool.end();
  process.exit(0);
}
process.on('SIGTERM', () => void stop('SIGTERM'));
process.on('SIGINT', () => void stop('SIGINT'));
