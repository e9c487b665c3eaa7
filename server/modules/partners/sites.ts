import { eq, inArray } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies, sites } from '@/db/schema/companies';

export type SiteWithCompany = typeof sites.$inferSelect & { company: typeof companies.$inferSelect };

/** Sites with their companies, by id. */
export async function sitesById(db: Reader, ids: readonly string[]): Promise<Map<string, SiteWithCompany>> {
  if (ids.length === 0) return new Map();
  const rows = await db
    .select({ site: sites, company: companies })
    .from(sites)
    .innerJoin(companies, eq(companies.id, sites.companyId))
    .where(inArray(sites.id, [...new Set(ids)]));
  return new Map(rows.map(({ site, company }) => [site.id, { ...site, company }]));
}
