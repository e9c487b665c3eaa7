import { and, asc, count, eq } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { companies, people, sites } from '@/db/schema/companies';
import type { listPartners } from '@/shared/contracts/partners';
import type { QueryOf } from '@/shared/contracts/operation';
import { Problem } from '@/shared/problems/problems';
import { holdsText } from '../../http/search';
import { keyset } from '../../http/sort';
import { cursor, cutPage } from '../../http/page';

/** Companies by name, a page by key. */
export async function partnersPage(db: Database, query: QueryOf<typeof listPartners>) {
  const page = keyset({ by: companies.name, then: companies.id, down: false, after: cursor(query.after, 2) });
  const rows = await db
    .select()
    .from(companies)
    .where(
      and(
        query.kind ? eq(companies.kind, query.kind) : undefined,
        holdsText(query.search, companies.name, companies.code),
        page.after,
      ),
    )
    .orderBy(...page.order)
    .limit(query.limit + 1);
  const numberOf = async (table: typeof sites | typeof people) =>
    new Map(
      (await db.select({ id: table.companyId, n: count() }).from(table).groupBy(table.companyId)).map(
        ({ id, n }) => [id, n],
      ),
    );
  const [siteNumbers, peopleNumbers] = [await numberOf(sites), await numberOf(people)];
  const full = rows.map((row) => ({
    ...row,
    sites: siteNumbers.get(row.id) ?? 0,
    people: peopleNumbers.get(row.id) ?? 0,
  }));
  return cutPage(full, query.limit, (row) => [row.name, row.id]);
}

export async function partnerWithSites(db: Database, id: string) {
  const [company] = await db.select().from(companies).where(eq(companies.id, id));
  if (!company) throw new Problem('not found');
  return {
    ...company,
    sites: await db.select().from(sites).where(eq(sites.companyId, id)).orderBy(asc(sites.code)),
  };
}
