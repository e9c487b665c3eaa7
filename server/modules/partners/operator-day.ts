import { asc, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies, sites } from '@/db/schema/companies';
import { dayInZone } from '@/shared/domain/calendar';

/** Zone of the operator's first site: what is neither here nor there is dated by it. */
export async function operatorZone(db: Reader): Promise<string> {
  const [site] = await db
    .select({ timeZone: sites.timeZone })
    .from(sites)
    .innerJoin(companies, eq(companies.id, sites.companyId))
    .where(eq(companies.kind, 'operator'))
    .orderBy(asc(sites.id))
    .limit(1);
  return site?.timeZone ?? 'UTC';
}

/** The operator's business day at an instant. */
export async function operatorDay(db: Reader, now: string): Promise<string> {
  return dayInZone(now, await operatorZone(db));
}
