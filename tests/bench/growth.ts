import { pino } from 'pino';
import { databaseOn, poolOf } from '@/db/client';
import { startLocalDatabase } from '@/db/local/mariadb.mjs';
import { migrateDatabase } from '@/db/migrate';
import { createApp } from '@/server/app';
import { readConfig } from '@/server/config';
import type { Deps } from '@/server/deps';
import { folderStore } from '@/server/files/file-store';
import type { Connection } from 'mysql2/promise';
import { createConnection } from 'mysql2/promise';
import { buildersOn } from '../support/builders';
import { Caller } from '../support/caller';

/** Counted shipments in the book at first, and ten times as many. */
const small = 10_000;
const large = 100_000;
/** The 95th percentile of a page, a balance and a posting may grow so much when the book grows tenfold. */
const most = 1.5;
const rounds = 60;

type Scene = {
  plant: string;
  plantCompany: string;
  site: string;
  company: string;
  typeCode: string;
  email: string;
};

/** History straight into the tables, as the posting would leave it: one shipment sent and counted, day by day. */
async function fill(
  owner: Connection,
  scene: Scene,
  { from, to }: { from: number; to: number },
): Promise<void> {
  const many = `seq_${from}_to_${to}`;
  const uuid = "CONCAT(LPAD(HEX(seq), 8, '0'), '-0000-7000-8000-000000000000')";
  const day = "DATE_SUB('2026-03-19', INTERVAL seq MOD 700 DAY)";
  const run = (sql: string) => owner.query(sql);
  await run(`INSERT INTO shipments (id, reference, contents, from_site_id, to_site_id, from_company_id, to_company_id, left_on, expected_on, state, origin, note, created_at, counted_at, counted_on)
    SELECT ${uuid}, CONCAT('B-', seq), 'empties', '${scene.plant}', '${scene.site}', '${scene.plantCompany}', '${scene.company}', ${day}, ${day}, 'counted', 'form', '', NOW(), NOW(), ${day} FROM ${many}`);
  await run(`INSERT INTO shipment_lines SELECT ${uuid}, '${scene.typeCode}', 10 FROM ${many}`);
  await run(
    `INSERT INTO accounts (kind, shipment_id, company_id) SELECT 'transit', ${uuid}, '${scene.plantCompany}' FROM ${many}`,
  );
  await run(
    `INSERT INTO ledger_entries (kind, value_date, shipment_id, reason) SELECT 'sent', left_on, id, '' FROM shipments WHERE reference LIKE 'B-%' AND id NOT IN (SELECT shipment_id FROM ledger_entries WHERE shipment_id IS NOT NULL)`,
  );
  await run(`INSERT INTO ledger_lines (entry_id, line_no, type_code, from_account_id, to_account_id, units, value_date)
    SELECT e.id, 1, '${scene.typeCode}', p.id, s.id, 10, e.value_date FROM ledger_entries e JOIN accounts s ON s.site_id = '${scene.site}' JOIN accounts p ON p.site_id = '${scene.plant}'
    LEFT JOIN ledger_lines l ON l.entry_id = e.id WHERE l.entry_id IS NULL`);
  await run(
    `REPLACE INTO balances SELECT to_account_id, type_code, SUM(units) FROM ledger_lines GROUP BY 1, 2`,
  );
  await run(
    `REPLACE INTO daily_nets SELECT to_account_id, type_code, value_date, SUM(units) FROM ledger_lines GROUP BY 1, 2, 3`,
  );
  await run('ANALYZE TABLE shipments, ledger_lines, ledger_entries, accounts, balances, daily_nets');
}

const asked = (scene: Scene) => ({
  'a page of shipments': (caller: Caller) => caller.get('/shipments', { limit: '50' }),
  'balances today': (caller: Caller) => caller.get('/balances'),
  'balances a year ago': (caller: Caller) => caller.get('/balances', { asOf: '2025-03-01' }),
  'a posting': (caller: Caller) =>
    caller.post('/shipments', {
      fromSiteId: scene.plant,
      toSiteId: scene.site,
      leftOn: '2026-03-20',
      expectedOn: '2026-03-21',
      lines: [{ typeCode: scene.typeCode, declared: 1 }],
    }),
});

type Times = Record<string, number>;

/** 95th percentile in milliseconds of each request. */
async function measure(caller: Caller, scene: Scene): Promise<Times> {
  const times: Times = {};
  for (const [name, ask] of Object.entries(asked(scene))) {
    const taken: number[] = [];
    for (let round = 0; round < rounds + 10; round += 1) {
      const start = performance.now();
      const { status, text } = await ask(caller);
      if (status !== 200) throw new Error(`${name} answered ${status}: ${text}`);
      if (round >= 10) taken.push(performance.now() - start);
    }
    taken.sort((a, b) => a - b);
    times[name] = taken[Math.floor(taken.length * 0.95)] ?? NaN;
  }
  return times;
}

async function makeScene(db: Deps['db']): Promise<Scene> {
  const make = buildersOn(db);
  const operator = await make.aCompany({ kind: 'operator' });
  const partner = await make.aCompany();
  const [plant, site] = [await make.aSite(operator), await make.aSite(partner)];
  const type = await make.aType();
  const ane = await make.aPerson(operator, ['coordinator']);
  return {
    plant: plant.id,
    plantCompany: operator.id,
    site: site.id,
    company: partner.id,
    typeCode: type.code,
    email: ane.email,
  };
}

export async function benchGrowth(): Promise<{ before: Times; after: Times }> {
  const database = await startLocalDatabase({ forTests: true, say: () => undefined });
  const pool = poolOf(database.appUrl, 8);
  try {
    await migrateDatabase(database.ownerUrl, database.appUrl);
    const config = readConfig({
      DATABASE_URL: database.appUrl,
      SESSION_SECRET: 'only for the benchmark, thirty-two characters',
    });
    const clock = { now: () => new Date('2026-03-20T09:00:00.000Z') };
    const deps: Deps = {
      config,
      pool,
      db: databaseOn(pool),
      files: folderStore('.local/bench/files'),
      logger: pino({ level: 'silent' }),
      clock,
    };
    const scene = await makeScene(deps.db);
    const owner = await createConnection({ uri: database.ownerUrl });
    await owner.query(
      "INSERT INTO accounts (kind, site_id, company_id) VALUES ('site', ?, ?), ('site', ?, ?)",
      [scene.plant, scene.plantCompany, scene.site, scene.company],
    );
    const app = createApp(deps);
    const caller = await Caller.signedIn(app, scene.email);
    await fill(owner, scene, { from: 1, to: small });
    const before = await measure(caller, scene);
    await fill(owner, scene, { from: small + 1, to: large });
    const after = await measure(caller, scene);
    await owner.end();
    return { before, after };
  } finally {
    await pool.end();
    await database.stop();
  }
}

if (require.main === module) {
  benchGrowth()
    .then(({ before, after }) => {
      for (const [name, time] of Object.entries(after)) {
        const ratio = time / (before[name] ?? NaN);
        console.log(
          `${name}: p95 ${before[name]?.toFixed(1)} ms at ${small}, ${time.toFixed(1)} ms at ${large} shipments, ratio ${ratio.toFixed(2)} (at most ${most})`,
        );
        if (!(ratio <= most)) process.exitCode = 1;
      }
    })
    .catch((error: unknown) => {
      console.error(error);
      process.exit(1);
    });
}
