import { count, eq } from 'drizzle-orm';
import { databaseOn, poolOf } from '@/db/client';
import { log } from '@/db/schema/access';
import { companies } from '@/db/schema/companies';
import { dayInZone } from '@/shared/domain/calendar';
import { seedDemo } from './demo/seed-demo';
import { emptyDatabase } from './empty-database';

const begun = 'demo begun';
const ended = 'demo ended';

/** Seeds the demo into an empty database, once. A seeding that was broken off is begun again from nothing. */
async function run(): Promise<void> {
  const url = process.env.DATABASE_URL;
  if (!url) throw new Error('DATABASE_URL is not set');
  if (process.env.DEMO === 'no') return console.log('no demo wanted');
  const pool = poolOf(url, 4);
  const db = databaseOn(pool);
  try {
    const [people] = await db.select({ n: count() }).from(companies);
    const marks = await db.select({ action: log.action }).from(log).where(eq(log.subjectKind, 'demo'));
    const has = (action: string): boolean => marks.some((mark) => mark.action === action);
    if (has(ended) || ((people?.n ?? 0) > 0 && !has(begun)))
      return console.log('the book has entries already: nothing to seed');
    if (has(begun)) await emptyDatabase(process.env.DATABASE_OWNER_URL ?? url, url);
    const mark = (action: string) =>
      db.insert(log).values({
        at: new Date().toISOString(),
        action,
        outcome: 'done',
        subjectKind: 'demo',
        requestId: 'seed',
      });
    await mark(begun);
    await seedDemo(db, {
      today: dayInZone(new Date(), 'Europe/Copenhagen'),
      say: (line) => console.log(`  ${line}`),
    });
    await mark(ended);
  } finally {
    await pool.end();
  }
}

run().catch((error: unknown) => {
  console.error('The demo could not be seeded:', error);
  process.exit(1);
});
