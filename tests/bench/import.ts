import { monitorEventLoopDelay } from 'node:perf_hooks';
import { appUser, ownerUser } from '@/db/local/accounts.mjs';
import { startLocalDatabase } from '@/db/local/mariadb.mjs';
import { aProduct, type Product } from '../support/app';
import { csvOf, monthRows, xlsxOf } from '../support/month-file';

/** RULES and the issue state no times for imports beyond "10 000 rows work"; these are our own limits. */
const mostSeconds = { upload: 20, posting: 240 };
const mostStallSeconds = 1;

const types = ['TOTE-64', 'TOTE-43', 'LID-128', 'PALLET-128', 'BOX-1210', 'RACK-CP'];
const partners = ['KESTREL', 'BRAMBLE', 'SUNDHOLM', 'PALLWICK', 'ORRIN', 'MAREN', 'VALE', 'BRIGHTWASH'];

async function aScene(): Promise<{ product: Product; coordinator: Awaited<ReturnType<Product['as']>> }> {
  const product = await aProduct('bench-import');
  const operator = await product.aCompany({ kind: 'operator' });
  for (const code of ['TARNBY', 'OSTREL']) await product.aSite(operator, { code });
  for (const code of types) await product.aType({ code });
  for (const code of partners) {
    const partner = await product.aCompany();
    await product.aSite(partner, { code });
    for (const type of types) await product.someTerms(partner, type);
  }
  return { product, coordinator: await product.as(await product.aPerson(operator, ['coordinator'])) };
}

type Measured = { seconds: number; longestStall: number };

/** Time of the work, and the longest that nothing else could run in this process. */
async function measured(work: () => Promise<unknown>): Promise<Measured> {
  const delay = monitorEventLoopDelay({ resolution: 10 });
  delay.enable();
  const from = performance.now();
  await work();
  delay.disable();
  return { seconds: (performance.now() - from) / 1000, longestStall: delay.max / 1e9 };
}

async function main(rows: number): Promise<void> {
  const { product, coordinator } = await aScene();
  try {
    const month = monthRows({ rows, firstDay: '2026-02-15', days: 30 });
    const files = { 'march.csv': csvOf(month), 'march.xlsx': await xlsxOf(month) };
    let id = '';
    const failures: string[] = [];
    const check = (name: string, { seconds, longestStall }: Measured, most: number): void => {
      console.log(`${name}: ${seconds.toFixed(1)} s, longest stall ${(longestStall * 1000).toFixed(0)} ms`);
      if (seconds > most) failures.push(`${name} took ${seconds.toFixed(1)} s`);
      if (longestStall > mostStallSeconds) failures.push(`${name} stalled the server`);
    };
    for (const [name, file] of Object.entries(files)) {
      const taken = await measured(async () => {
        const { status, body, text } = await coordinator.form('/imports').attach('file', file, name);
        if (status !== 200 || body.rowsBad !== 0) throw new Error(`upload answered ${status} ${text}`);
        id = body.id;
      });
      check(
        `reading ${rows} rows of ${name} (${(file.length / 1000).toFixed(0)} kB)`,
        taken,
        mostSeconds.upload,
      );
    }
    await coordinator.post(`/imports/${id}/confirmation`, { leaveOut: 0 });
    check(`posting ${rows} rows`, await measured(() => product.runJobs()), mostSeconds.posting);
    const { body } = await coordinator.get(`/imports/${id}`);
    console.log(JSON.stringify(body.numbers));
    const { user, system } = process.cpuUsage();
    console.log(`processor time of this process: ${((user + system) / 1e6).toFixed(1)} s`);
    console.log(`memory: ${(process.memoryUsage().rss / 1e6).toFixed(0)} MB resident`);
    if (body.state !== 'done') failures.push(`the import is ${body.state}`);
    if (failures.length > 0) throw new Error(failures.join('; '));
  } finally {
    await product.close();
  }
}

/** On a database server of its own, unless one is named. */
async function onServer(work: () => Promise<void>): Promise<void> {
  if (process.env.TEST_DATABASE_SERVER) return work();
  const { host, port, accounts, stop } = await startLocalDatabase({ forTests: true, say: () => undefined });
  const { ownerPassword, appPassword } = accounts;
  process.env.TEST_DATABASE_SERVER = JSON.stringify({
    host,
    port,
    ownerUser,
    ownerPassword,
    appUser,
    appPassword,
  });
  try {
    await work();
  } finally {
    await stop();
  }
}

onServer(() => main(Number(process.argv[2] ?? 10_000))).catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
