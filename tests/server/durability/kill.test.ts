import { randomUUID } from 'node:crypto';
import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { databaseOn, poolOf } from '@/db/client';
import { type LocalDatabase, startLocalDatabase } from '@/db/local/mariadb.mjs';
import { migrateDatabase } from '@/db/migrate';
import { buildersOn } from '../../support/builders';
import { Caller } from '../../support/caller';
import { aServerProcess, type ServerProcess } from '../../support/server-process';

/** On a disk and with a commit that waits for it: in memory a kill would prove nothing. */
let folder: string;
let database: LocalDatabase;
let scene: { from: string; to: string; typeCode: string; email: string };

beforeAll(async () => {
  mkdirSync('.local', { recursive: true });
  folder = mkdtempSync(path.join(process.cwd(), '.local/durability-'));
  database = await startLocalDatabase({ folder: path.join(folder, 'db'), say: () => undefined });
  await migrateDatabase(database.ownerUrl, database.appUrl);
  database.markFilled();
  const pool = poolOf(database.appUrl, 2);
  const make = buildersOn(databaseOn(pool));
  const operator = await make.aCompany({ kind: 'operator' });
  const partner = await make.aCompany();
  const type = await make.aType();
  const ane = await make.aPerson(operator, ['coordinator']);
  scene = {
    from: (await make.aSite(operator)).id,
    to: (await make.aSite(partner)).id,
    typeCode: type.code,
    email: ane.email,
  };
  await pool.end();
}, 180_000);

afterAll(async () => {
  await database?.stop();
  rmSync(folder, { recursive: true, force: true });
});

const server = (port?: number): Promise<ServerProcess> =>
  aServerProcess(
    { DATABASE_URL: database.appUrl, FILES_DIR: path.join(folder, 'files'), RUN_JOBS: 'no' },
    port,
  );

/** Posts one after the other on several lines at once until told to stop; returns the references that were acknowledged. */
async function postUntil(caller: Caller, stop: { now: boolean }): Promise<string[]> {
  const acknowledged: string[] = [];
  const today = new Date().toISOString().slice(0, 10);
  const oneLine = async (): Promise<void> => {
    while (!stop.now) {
      const reference = `K-${randomUUID().slice(0, 13)}`;
      const body = {
        reference,
        fromSiteId: scene.from,
        toSiteId: scene.to,
        leftOn: today,
        expectedOn: today,
        lines: [{ typeCode: scene.typeCode, declared: 7 }],
        note: '',
      };
      const answer = await caller.post('/shipments', body).then(
        (response) => response.status,
        () => 0,
      );
      if (answer === 200) acknowledged.push(reference);
      else if (answer !== 503) await pause(50);
    }
  };
  await Promise.all(Array.from({ length: 4 }, oneLine));
  return acknowledged;
}

type Kept = { references: string[]; unbalanced: number; halves: number };

/** What the book holds: references, types whose balances do not fit their lines, shipments without their entry. */
async function kept(): Promise<Kept> {
  const pool = poolOf(database.ownerUrl, 1);
  const rowsOf = async (sql: string) => (await pool.query(sql))[0] as Record<string, unknown>[];
  const references = (await rowsOf('SELECT reference FROM shipments')).map((row) => String(row.reference));
  const unbalanced = await rowsOf(`
    SELECT b.account_id FROM balances b
    LEFT JOIN (SELECT account, type_code, SUM(u) AS units FROM (
      SELECT to_account_id AS account, type_code, units AS u FROM ledger_lines
      UNION ALL SELECT from_account_id, type_code, -units FROM ledger_lines) moves GROUP BY account, type_code) s
    ON s.account = b.account_id AND s.type_code = b.type_code
    WHERE b.units <> COALESCE(s.units, 0)`);
  const halves = await rowsOf(`
    SELECT s.id FROM shipments s LEFT JOIN ledger_entries e ON e.shipment_id = s.id
    LEFT JOIN requests r ON r.operation = 'sendShipment' AND r.status = 0 WHERE e.id IS NULL OR r.\`key\` IS NOT NULL`);
  await pool.end();
  return { references, unbalanced: unbalanced.length, halves: halves.length };
}

describe('killed with -9 in the middle of posting', () => {
  it('the server comes up again with every acknowledged posting and no half one', async () => {
    const first = await server();
    const caller = await Caller.signedIn(first.url, scene.email);
    const stop = { now: false };
    const posting = postUntil(caller, stop);
    await pause(2500);
    await first.kill('SIGKILL');
    stop.now = true;
    const acknowledged = await posting;
    const second = await server(first.port);
    await second.kill('SIGTERM');
    const book = await kept();
    expect(acknowledged.length).toBeGreaterThan(10);
    expect(acknowledged.filter((reference) => !book.references.includes(reference))).toEqual([]);
    expect([book.unbalanced, book.halves]).toEqual([0, 0]);
  }, 120_000);

  it('the database comes up again likewise, while the server answers 503 and recovers by itself', async () => {
    const running = await server();
    const caller = await Caller.signedIn(running.url, scene.email);
    const stop = { now: false };
    const posting = postUntil(caller, stop);
    await pause(2000);
    process.kill(database.pid, 'SIGKILL');
    await pause(500);
    const meanwhile = await fetch(`${running.url}/api/health`);
    expect([meanwhile.status, ((await meanwhile.json()) as { code: string }).code]).toEqual([
      503,
      'database away',
    ]);
    database = await startLocalDatabase({ folder: path.join(folder, 'db'), say: () => undefined });
    await pause(1500);
    stop.now = true;
    const acknowledged = await posting;
    expect((await fetch(`${running.url}/api/health`)).status).toBe(200);
    await running.kill('SIGTERM');
    const book = await kept();
    expect(acknowledged.length).toBeGreaterThan(10);
    expect(acknowledged.filter((reference) => !book.references.includes(reference))).toEqual([]);
    expect([book.unbalanced, book.halves]).toEqual([0, 0]);
  }, 120_000);
});
