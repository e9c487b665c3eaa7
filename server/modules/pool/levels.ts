import { sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import type { poolApprovals } from '@/db/schema/containers';
import { latestApprovals } from './latest-approvals';

export type SiteLevel = { siteId: string; minimum: number; maximum: number };

/** A site that stands outside the levels approved for a type. */
export type OutOfLevel = {
  type: { code: string; name: string };
  site: { id: string; name: string; company: string; companyId: string };
  units: number;
  minimum: number;
  maximum: number;
  standing: 'under' | 'over';
  /** Units missing to the minimum, or beyond the maximum. */
  by: number;
};

/**
 * Who is under or over by the balances of now: sites and types below the minimum or above the maximum of the newest
 * approval. Furthest from its level first. With `companyId`, that company's sites only.
 */
export async function sitesOutOfLevel(
  db: Reader,
  asked: { companyId?: string | undefined; typeCode?: string | undefined } = {},
): Promise<OutOfLevel[]> {
  const approvals = await latestApprovals(db, asked.typeCode);
  const levels = approvals.flatMap((approval) => levelsOf(approval).map((level) => ({ approval, level })));
  if (levels.length === 0) return [];
  const stock = await stockAt(db, [...new Set(levels.map(({ level }) => level.siteId))]);
  return levels
    .flatMap(({ approval, level }): OutOfLevel[] => {
      const site = stock.sites.get(level.siteId);
      if (!site || (asked.companyId !== undefined && site.companyId !== asked.companyId)) return [];
      const units = stock.units.get(`${level.siteId} ${approval.typeCode}`) ?? 0;
      const by = Math.max(level.minimum - units, units - level.maximum);
      if (by <= 0) return [];
      return [
        {
          type: { code: approval.typeCode, name: approval.typeName },
          site,
          units,
          minimum: level.minimum,
          maximum: level.maximum,
          standing: units < level.minimum ? 'under' : 'over',
          by,
        },
      ];
    })
    .sort((a, b) => b.by - a.by || a.site.name.localeCompare(b.site.name));
}

/** The levels of an approval as they were stored. */
export function levelsOf(approval: Pick<typeof poolApprovals.$inferSelect, 'levels'>): SiteLevel[] {
  return approval.levels as SiteLevel[];
}

type Site = OutOfLevel['site'];

async function stockAt(db: Reader, siteIds: string[]) {
  const [rows] = await db.execute(
    sql`select s.id as id, s.name as name, c.name as company, c.id as companyId, b.type_code as typeCode, b.units as units
        from sites s join companies c on c.id = s.company_id
        left join accounts a on a.site_id = s.id left join balances b on b.account_id = a.id
        where s.id in ${siteIds}`,
  );
  const sites = new Map<string, Site>();
  const units = new Map<string, number>();
  for (const row of rows as unknown as (Site & { typeCode: string | null; units: string })[]) {
    sites.set(row.id, { id: row.id, name: row.name, company: row.company, companyId: row.companyId });
    if (row.typeCode !== null) units.set(`${row.id} ${row.typeCode}`, Number(row.units));
  }
  return { sites, units };
}
