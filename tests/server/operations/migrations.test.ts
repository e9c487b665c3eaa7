import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { drizzle } from 'drizzle-orm/mysql2';
import { migrate } from 'drizzle-orm/mysql2/migrator';
import { migrateDatabase } from '@/db/migrate';
import { asOwner, databaseServer, dropDatabase } from '../../support/database';

const name = `tarekeep_test_migrations_${process.pid}_${Date.now().toString(36)}`;
let folder: string;
beforeAll(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'tarekeep-migrations-'));
});
afterAll(async () => {
  rmSync(folder, { recursive: true, force: true });
  await dropDatabase({ name, appUrl: '', ownerUrl: '' });
});

/** The migrations up to the first release of the ledger and its guards. */
function firstMigrations(): string {
  cpSync('db/migrations', folder, { recursive: true });
  const place = path.join(folder, 'meta/_journal.json');
  const journal = JSON.parse(readFileSync(place, 'utf8')) as { entries: unknown[] };
  writeFileSync(place, JSON.stringify({ ...journal, entries: journal.entries.slice(0, 3) }));
  return folder;
}

const fill = [
  `INSERT INTO companies (id, kind, code, name, currency, created_at) VALUES
    ('0190aaaa-0000-7000-8000-000000000001', 'operator', 'FEN', 'Fennmark', 'EUR', '2026-01-01')`,
  `INSERT INTO sites (id, company_id, code, name, time_zone, active, created_at) VALUES
    ('0190aaaa-0000-7000-8000-000000000002', '0190aaaa-0000-7000-8000-000000000001', 'TARNBY', 'Tarnby', 'Europe/Copenhagen', 1, '2026-01-01')`,
  `INSERT INTO container_types (code, name, kind, length_mm, width_mm, height_mm, tare_kg, payload_kg, stack_limit,
    units_per_stack, in_service_from, replacement, useful_life_months, created_at) VALUES
    ('TOTE-64', 'Tote', 'tote', 600, 400, 280, 2.1, 25, 8, 8, '2024-06-01', 18, 60, '2026-01-01')`,
  `INSERT INTO accounts (kind, site_id, company_id) VALUES
    ('site', '0190aaaa-0000-7000-8000-000000000002', '0190aaaa-0000-7000-8000-000000000001')`,
  `INSERT INTO ledger_entries (kind, value_date) VALUES ('bought', '2026-03-02')`,
  `INSERT INTO ledger_lines (entry_id, line_no, type_code, from_account_id, to_account_id, units, value_date)
    SELECT LAST_INSERT_ID(), 1, 'TOTE-64', a.id, s.id, 400, '2026-03-02' FROM accounts a, accounts s
    WHERE a.kind = 'bought' AND s.kind = 'site' LIMIT 1`,
];

describe('the migrations', () => {
  it('bring a filled database of an earlier version forward and leave its book as it was', async () => {
    const server = databaseServer();
    const url = (user: string, password: string) =>
      `mysql://${user}:${encodeURIComponent(password)}@${server.host}:${server.port}/${name}`;
    await asOwner(null, (owner) => owner.query(`CREATE DATABASE ${name} CHARACTER SET utf8mb4`));
    await asOwner(name, async (owner) => {
      await migrate(drizzle(owner), { migrationsFolder: firstMigrations() });
      for (const statement of fill) await owner.query(statement);
    });
    const book = () =>
      asOwner(name, async (owner) => [
        (await owner.query('SELECT id, kind, value_date, recorded_at FROM ledger_entries'))[0],
        (await owner.query('SELECT * FROM ledger_lines'))[0],
        (await owner.query('SELECT id, kind, site_id FROM accounts'))[0],
      ]);
    const before = await book();
    expect(before[1]).toHaveLength(1);
    const forward = () =>
      migrateDatabase(url(server.ownerUser, server.ownerPassword), url(server.appUser, server.appPassword));
    // Two servers that start at once, and one more later.
    await Promise.all([forward(), forward()]);
    await forward();
    expect(await book()).toEqual(before);
    const applied = (await asOwner(name, (owner) => owner.query('SELECT 1 FROM __drizzle_migrations')))[0];
    const all = JSON.parse(readFileSync('db/migrations/meta/_journal.json', 'utf8')) as {
      entries: unknown[];
    };
    expect(applied).toHaveLength(all.entries.length);
  });
});
