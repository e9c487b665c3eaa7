import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { type Database, databaseOn, poolOf } from '@/db/client';
import { type Builders, buildersOn } from '../../support/builders';
import { aDatabase, dropDatabase, type TestDatabase } from '../../support/database';
import { aServerProcess, type ServerProcess } from '../../support/server-process';

/** A database of its own and the real server on the built client, as a process. */
export type Stage = Builders & {
  url: string;
  db: Database;
  database: TestDatabase;
  /** Ends the server as an operating system would. */
  stopServer: () => Promise<void>;
  /** The server again, on the port it had. */
  startServer: () => Promise<void>;
  close: () => Promise<void>;
};

export async function aStage(label: string): Promise<Stage> {
  const database = await aDatabase(`b_${label}`);
  const folder = await mkdtemp(path.join(tmpdir(), 'tarekeep-stage-'));
  const pool = poolOf(database.appUrl, 4);
  const db = databaseOn(pool);
  const environment = {
    DATABASE_URL: database.appUrl,
    CLIENT_DIR: process.env.TEST_CLIENT_DIR ?? 'dist',
    FILES_DIR: folder,
    RUN_JOBS: 'yes',
  };
  let server: ServerProcess | undefined = await aServerProcess(environment);
  const { url, port } = server;
  const stopServer = async (): Promise<void> => {
    await server?.kill('SIGKILL');
    server = undefined;
  };
  return {
    ...buildersOn(db),
    url,
    db,
    database,
    stopServer,
    startServer: async () => {
      server ??= await aServerProcess(environment, port);
    },
    close: async () => {
      await stopServer();
      await pool.end();
      await dropDatabase(database);
      await rm(folder, { recursive: true, force: true });
    },
  };
}
