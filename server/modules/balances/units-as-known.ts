import { type SQL, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { noUnits, type Parts } from './units-by-company';

type Asked = { companyId: string; type: string; asOf: string | undefined; knownAt: string };
type Net = { siteId: string | null; site: string | null; isFrom: number; isCounted: number; units: string };
export type SiteUnits = { siteId: string; site: string; units: number };

/**
 * A balance as it was known at an instant (RULES 1): the sum of the lines that were recorded by then. This reads the
 * history, unlike the balances that are kept; it is for the few times when someone must know what was known.
 */
export async function unitsAsKnown(db: Reader, asked: Asked): Promise<{ parts: Parts; sites: SiteUnits[] }> {
  const parts = { ...noUnits };
  const sites: SiteUnits[] = [];
  for (const net of await netsByAccount(db, asked)) {
    const units = Number(net.units);
    if (net.siteId !== null && net.site !== null) {
      parts.atSites += units;
      sites.push({ siteId: net.siteId, site: net.site, units });
    } else if (net.isCounted) {
      parts[net.isFrom ? 'sentDiffers' : 'toItDiffers'] += units;
      parts.inQuestion += Math.abs(units);
    } else {
      parts[net.isFrom ? 'sent' : 'toIt'] += units;
    }
  }
  parts.held = parts.atSites + parts.sent + parts.sentDiffers;
  return { parts, sites };
}

async function netsByAccount(db: Reader, { companyId, type, asOf, knownAt }: Asked): Promise<Net[]> {
  const known = knownAt.replace('T', ' ').replace('Z', '');
  const half = (side: SQL, units: SQL): SQL => sql`
    select a.id, a.site_id, st.name as site, s.from_company_id = ${companyId} as is_from,
           e.kind = 'counted' as is_counted, ${units} as units
    from accounts a
    left join sites st on st.id = a.site_id
    left join shipments s on s.id = a.shipment_id
    join ledger_lines l on ${side} = a.id join ledger_entries e on e.id = l.entry_id
    where (a.kind = 'site' and a.company_id = ${companyId} or s.from_company_id = ${companyId} or s.to_company_id = ${companyId})
      and l.type_code = ${type} and e.recorded_at <= ${known}
      ${asOf === undefined ? sql`` : sql`and l.value_date <= ${asOf}`}`;
  const [rows] = await db.execute(sql`
    select site_id as siteId, site, max(is_from) as isFrom, max(is_counted) as isCounted, sum(units) as units
    from (${half(sql`l.to_account_id`, sql`l.units`)} union all ${half(sql`l.from_account_id`, sql`-l.units`)}) n
    group by id, site_id, site order by site, site_id`);
  return rows as unknown as Net[];
}
