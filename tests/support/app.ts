import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { Express } from 'express';
import { pino } from 'pino';
import { databaseOn, poolOf } from '@/db/client';
import { createApp } from '@/server/app';
import { readConfig } from '@/server/config';
import type { Deps } from '@/server/deps';
import { folderStore } from '@/server/files/file-store';
import { jobHandlers } from '@/server/jobs/all-work';
import { runNextJob } from '@/server/jobs/job-queue';
import { type Builders, buildersOn } from './builders';
import { Caller } from './caller';
import { aDatabase, dropDatabase, type TestDatabase } from './database';

export type Product = Builders & {
  app: Express;
  deps: Deps;
  database: TestDatabase;
  /** Moves the product's clock to an instant. */
  setClock: (instant: string) => void;
  as: (person: { email: string }) => Promise<Caller>;
  stranger: () => Promise<Caller>;
  /** Does every job that waits. */
  runJobs: () => Promise<void>;
  close: () => Promise<void>;
};

/** The product on a database of its own, with a clock that tests move. */
export async function aProduct(label: string, environment: Record<string, string> = {}): Promise<Product> {
  const database = await aDatabase(label);
  const folder = await mkdtemp(path.join(tmpdir(), 'tarekeep-files-'));
  const config = readConfig({
    DATABASE_URL: database.appUrl,
    SESSION_SECRET: 'only for tests, at least thirty-two characters',
    FILES_DIR: folder,
    LOG_LEVEL: 'silent',
    ...environment,
  });
  const pool = poolOf(config.DATABASE_URL, 8);
  let present = new Date('2026-03-20T09:00:00.000Z');
  const deps: Deps = {
    config,
    pool,
    db: databaseOn(pool),
    files: folderStore(folder),
    logger: pino({ level: process.env.TEST_LOG ?? 'silent' }),
    clock: { now: () => present },
  };
  const app = createApp(deps);
  return {
    ...buildersOn(deps.db),
    app,
    deps,
    database,
    setClock: (instant) => {
      present = new Date(instant);
    },
    as: ({ email }) => Caller.signedIn(app, email),
    stranger: () => Caller.stranger(app),
    runJobs: async () => {
      while (await runNextJob(deps, jobHandlers));
    },
    close: async () => {
      await pool.end();
      await dropDatabase(database);
      await rm(folder, { recursive: true, force: true });
    },
  };
}
