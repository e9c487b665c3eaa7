import { spawnSync } from 'node:child_process';
import { databaseOn, poolOf } from '@/db/client';
import { findProgram } from '@/db/local/program.mjs';
import { migrateDatabase } from '@/db/migrate';
import { databaseErrorNumber } from '@/db/transaction';
import { checkBook } from '@/server/modules/balances/check-book';
import { sealLedger, verifyLedger } from '@/server/modules/ledger/seal';
import { aProduct, type Product } from '../../support/app';
import { asOwner, databaseServer, dropDatabase, type TestDatabase } from '../../support/database';
import { aLane, counted, sentEmpties } from '../../support/lane';

const dump = findProgram('mariadb-dump', 'mysqldump');
const client = findProgram('mariadb', 'mysql');
/** The packages that the start installs have no program that writes a backup; "mariadb-client" has. */
const where = dump && client ? describe : describe.skip;

let product: Product;
let restored: TestDatabase;
beforeAll(async () => {
  product = await aProduct('backup');
  const name = `${product.database.name}_restored`;
  const at = (url: string) => url.replace(product.database.name, name);
  restored = { name, appUrl: at(product.database.appUrl), ownerUrl: at(product.database.ownerUrl) };
});
afterAll(async () => {
  await dropDatabase(restored);
  await product.close();
});

function run(program: string, options: string[], input?: Buffer): Buffer {
  const { host, port, ownerUser, ownerPassword } = databaseServer();
  const address = [
    '--no-defaults',
    '--protocol=tcp',
    `--host=${host}`,
    `--port=${port}`,
    `--user=${ownerUser}`,
  ];
  const done = spawnSync(program, [...address, ...options], {
    env: { ...process.env, MYSQL_PWD: ownerPassword },
    maxBuffer: 256 * 1024 * 1024,
    ...(input ? { input } : {}),
  });
  if (done.status !== 0) throw new Error(`${program}: ${done.stderr.toString()}`);
  return done.stdout;
}

where('a backup', () => {
  it('restores into an empty database whole: the book adds up, the seals fit, the walls stand', async () => {
    const lane = await aLane(product);
    const code = lane.type.code;
    for (const units of [100, 40, 7]) {
      const id = await sentEmpties(lane, { [code]: units });
      await lane.clerk.post(`/shipments/${id}/counts`, counted({ [code]: units - 1 }));
    }
    product.setClock(new Date(Date.now() + 600_000).toISOString());
    await sealLedger(product.deps);
    const sealed = await verifyLedger(product.deps.db);
    expect(sealed).toEqual({ sealedEntries: 6, firstBroken: null });

    const written = run(dump ?? '', ['--single-transaction', '--triggers', product.database.name]);
    await asOwner(null, (owner) => owner.query(`CREATE DATABASE ${restored.name} CHARACTER SET utf8mb4`));
    run(client ?? '', [restored.name], written);
    await migrateDatabase(restored.ownerUrl, restored.appUrl);

    const pool = poolOf(restored.appUrl, 2);
    const db = databaseOn(pool);
    expect(await checkBook(db)).toEqual({ balances: [], dailyNets: [] });
    expect(await verifyLedger(db)).toEqual(sealed);
    const refused = (statement: string) => pool.query(statement).then(() => 0, databaseErrorNumber);
    expect(await refused('UPDATE ledger_lines SET units = units')).toBe(1142);
    const triggers = async (name: string) =>
      asOwner(name, async (owner) =>
        ((await owner.query('SHOW TRIGGERS'))[0] as { Trigger: string }[]).map((row) => row.Trigger),
      );
    expect(await triggers(restored.name)).toEqual(await triggers(product.database.name));
    await asOwner(restored.name, (owner) =>
      owner.query('UPDATE ledger_lines SET units = units + 1 WHERE entry_id = 3'),
    );
    expect((await verifyLedger(db)).firstBroken).toBe(3);
    await pool.end();
  }, 60_000);
});
