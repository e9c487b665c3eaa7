import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { scheduled } from '@/server/jobs/all-work';
import { asOwner, aDatabase, dropDatabase, type TestDatabase } from '../../support/database';
import { aServerProcess, type ServerProcess } from '../../support/server-process';

let database: TestDatabase;
let folder: string;
let servers: ServerProcess[] = [];
beforeAll(async () => {
  database = await aDatabase('two-servers');
  folder = mkdtempSync(path.join(tmpdir(), 'tarekeep-two-'));
  const environment = { DATABASE_URL: database.appUrl, FILES_DIR: folder, RUN_JOBS: 'yes' };
  servers = await Promise.all([aServerProcess(environment), aServerProcess(environment)]);
}, 60_000);
afterAll(async () => {
  await Promise.all(servers.map((server) => server.kill('SIGTERM')));
  await dropDatabase(database);
  rmSync(folder, { recursive: true, force: true });
});

const rows = (sql: string) =>
  asOwner(database.name, async (owner) => (await owner.query(sql))[0] as Record<string, string>[]);

describe('two servers on one database', () => {
  it('do each piece of scheduled work once a slot', async () => {
    for (let tries = 0; tries < 60; tries += 1) {
      if ((await rows("SELECT 1 FROM log WHERE action = 'checkBook'")).length > 0) break;
      await pause(250);
    }
    await pause(2500);
    const slots = await rows('SELECT name, slot, COUNT(*) AS n FROM schedule_slots GROUP BY name, slot');
    expect(new Set(slots.map(({ name }) => name))).toEqual(new Set(scheduled.map(({ name }) => name)));
    // A turn of the hour in between would give each name of that hour a second slot.
    const days = new Set(slots.map(({ slot }) => slot?.slice(0, 10))).size;
    expect(await rows("SELECT COUNT(*) AS n FROM log WHERE action = 'checkBook'")).toEqual([{ n: days }]);
  }, 60_000);
});
