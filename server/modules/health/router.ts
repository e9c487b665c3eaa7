import { sql } from 'drizzle-orm';
import { readHealth } from '@/shared/contracts/health';
import { open, type Route } from '../../http/route';

export const healthRoutes: Route[] = [
  open(readHealth, async ({ db }) => {
    await db.execute(sql`select 1`);
    return { state: 'well' as const, database: 'reached' as const };
  }),
];
