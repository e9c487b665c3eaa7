import { v7 as newId } from 'uuid';
import { companies, terms } from '@/db/schema/companies';
import { partnerEvents } from '@/db/schema/ledger';
import type { jobs } from '@/db/schema/work';
import { appUser, ownerUser } from '@/db/local/accounts.mjs';
import { startLocalDatabase } from '@/db/local/mariadb.mjs';
import { draftMonth } from '@/server/modules/statements/draft-month';
import { aProduct, type Product } from '../support/app';

/** Partners, each with so many events in the month: 500 with 400 are 200 000. */
const sizes = [50, 500] as const;
const eventsEach = 400;
/** Time for each partner may differ by so much between the sizes. */
const mostRatio = 1.3;

async function fill(product: Product, partners: number): Promise<void> {
  const { db } = product.deps;
  await product.aCompany({ kind: 'operator' });
  const types = [await product.aType(), await product.aType({ kind: 'lid' })];
  for (let at = 0; at < partners; at += 1) {
    const companyId = newId();
    await db.insert(companies).values({
      id: companyId,
      kind: 'partner',
      code: `P-${at}`,
      name: `Partner ${at}`,
      currency: 'EUR',
      createdAt: '2026-01-01T08:00:00.000Z',
    });
    await db.insert(terms).values(types.map(({ code }) => termsOf(companyId, code)));
    await db.insert(partnerEvents).values(
      Array.from({ length: eventsEach }, (_, index) => ({
        companyId,
        date: `2026-02-${String(1 + (index % 28)).padStart(2, '0')}`,
        typeCode: types[index % 2]?.code ?? '',
        kind: index % 4 < 2 ? ('issued' as const) : ('returned' as const),
        quantity: 20 + (index % 7),
      })),
    );
  }
}

const termsOf = (companyId: string, typeCode: string) => ({
  id: newId(),
  companyId,
  typeCode,
  validFrom: '2026-01-01',
  deposit: '4.50',
  replacement: '18.00',
  freeDays: 5,
  dailyFee: '0.03',
  lostAfterDays: null,
  usefulLifeMonths: 60,
  residualFloorPct: '20',
  damageFee: '3.20',
  cleaningFee: '0.40',
  recoveryDays: 60,
  createdAt: '2026-01-01T08:00:00.000Z',
});

/** Milliseconds for each partner; every round after the first rewrites all drafts. */
async function round(product: Product, partners: number): Promise<number> {
  const job = { payload: { month: '2026-02' } } as typeof jobs.$inferSelect;
  const from = performance.now();
  const result = await draftMonth(product.deps, job, async () => undefined);
  const took = (performance.now() - from) / partners;
  const { drafted } = result as { drafted: number };
  if (drafted !== partners) throw new Error(`${drafted} of ${partners} drafted`);
  return took;
}

/** The sizes take turns, so that what else the machine does meets both; the quickest round of each tells its cost. */
async function main(): Promise<void> {
  const products = await Promise.all(sizes.map((size) => aProduct(`bench-month-end-${size}`)));
  try {
    const times: number[][] = sizes.map(() => []);
    for (const [at, product] of products.entries()) await fill(product, sizes[at] ?? 0);
    for (let turn = 0; turn < 4; turn += 1) {
      for (const [at, product] of products.entries()) times[at]?.push(await round(product, sizes[at] ?? 1));
    }
    const quickest = times.map((each) => Math.min(...each.slice(1)));
    sizes.forEach((size, at) =>
      console.log(
        `${size} partners, ${size * eventsEach} events: ${times[at]?.map((ms) => ms.toFixed(1)).join(', ')} ms for each`,
      ),
    );
    const ratio = (quickest[1] ?? 0) / (quickest[0] ?? 1);
    console.log(
      `time for each partner, ${sizes[1]} to ${sizes[0]}: ${ratio.toFixed(2)} (at most ${mostRatio})`,
    );
    console.log(`memory: ${(process.memoryUsage().rss / 1e6).toFixed(0)} MB resident`);
    if (ratio > mostRatio) throw new Error('the time for each partner grows with their number');
  } finally {
    for (const product of products) await product.close();
  }
}

/** On a database server of its own, unless one is named. */
async function onServer(work: () => Promise<void>): Promise<void> {
  if (process.env.TEST_DATABASE_SERVER) return work();
  const { host, port, accounts, stop } = await startLocalDatabase({ forTests: true, say: () => undefined });
  const { ownerPassword, appPassword } = accounts;
  const server = { host, port, ownerUser, ownerPassword, appUser, appPassword };
  process.env.TEST_DATABASE_SERVER = JSON.stringify(server);
  try {
    await work();
  } finally {
    await stop();
  }
}

onServer(main).catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
