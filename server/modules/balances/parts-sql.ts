import { type SQL, sql } from 'drizzle-orm';
import type { BalancePart } from '@/shared/contracts/balances';

// Alias by alias: a = accounts, s = shipments, n = units per account and type.

/** Where the units per account and type are read: as they stand now, or as the nets of each day up to one add up. */
export function netsOf(asOf: string | undefined): { table: SQL; units: SQL; until: SQL } {
  return asOf === undefined
    ? { table: sql`balances`, units: sql`n.units`, until: sql`true` }
    : { table: sql`daily_nets`, units: sql`n.net`, until: sql`n.day <= ${asOf}` };
}

/**
 * Shipments that had left and were not counted at the end of the day. Of the past they are looked for among those that
 * left in the two weeks before, those that are known to have been slower (is_slow), and those still on the way: each
 * found by an index of its own, so that the length of the history does not count.
 */
export function onTheWay(asOf: string | undefined): SQL {
  if (asOf === undefined) return sql`s.state = 'on the way'`;
  const quick = sql`date_sub(${asOf}, interval 14 day)`;
  return sql`s.id in (select c.id from (
      select id from shipments where state = 'on the way' and left_on <= ${asOf}
      union all select id from shipments where left_on > ${quick} and left_on <= ${asOf} and counted_on > ${asOf}
      union all select id from shipments where is_slow = 1 and counted_on > ${asOf} and left_on <= ${quick}
    ) c)`;
}

/**
 * Shipments that were counted and of which something may lie between declaration and count. Those settled up to two days
 * earlier are looked at too: a settlement's instant and its business day can lie a day apart, and what adds up to 0 drops out.
 */
export function differing(asOf: string | undefined): SQL {
  return asOf === undefined
    ? sql`s.id in (select shipment_id from differences where state = 'open')`
    : sql`s.counted_on <= ${asOf} and s.id in (
        select shipment_id from differences where opened_on <= ${asOf}
        and (state = 'open' or settled_at >= date_sub(${asOf}, interval 2 day)))`;
}

type Asked = { companyId: string; asOf?: string | undefined; siteId?: string | undefined };

/** Which accounts one part of a company's balance is made of. */
export function accountsOfPart(part: BalancePart, { companyId, asOf, siteId }: Asked): SQL {
  const site = siteId === undefined ? sql`` : sql` and a.site_id = ${siteId}`;
  const parts: Record<BalancePart, SQL> = {
    atSites: sql`a.kind = 'site' and a.company_id = ${companyId}${site}`,
    sent: sql`s.from_company_id = ${companyId} and ${onTheWay(asOf)}`,
    sentDiffers: sql`s.from_company_id = ${companyId} and ${differing(asOf)}`,
    toIt: sql`s.to_company_id = ${companyId} and ${onTheWay(asOf)}`,
    toItDiffers: sql`s.to_company_id = ${companyId} and ${differing(asOf)}`,
  };
  return parts[part];
}
