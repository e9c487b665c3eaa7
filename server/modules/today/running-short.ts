import { and, eq, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies, sites } from '@/db/schema/companies';
import { containerTypes, parts } from '@/db/schema/containers';
import { accounts, balances } from '@/db/schema/ledger';
import type { Today } from '@/shared/contracts/today';
import { may, type Person, scopeOf } from '../../http/person';

const shown = 3;

/** Supplier sites whose containers at hand last the fewest days of packing, by the demand of the parts kept for them. */
export async function runningShort(db: Reader, person: Person): Promise<Today['runningShort']> {
  const scope = scopeOf(person);
  const isAsked = scope === null ? may(person, 'send shipments') : may(person, 'see balances');
  if (!isAsked) return null;
  const rows = await db
    .select({
      siteId: sites.id,
      site: sites.name,
      companyId: companies.id,
      company: companies.name,
      typeCode: parts.typeCode,
      typeName: containerTypes.name,
      there: sql<string>`coalesce(max(${balances.units}), 0)`,
      perDay: sql<string>`sum(${parts.unitsPerDayMean} / ${parts.unitsPerContainer})`,
    })
    .from(parts)
    .innerJoin(sites, eq(sites.id, parts.supplierSiteId))
    .innerJoin(companies, eq(companies.id, sites.companyId))
    .innerJoin(containerTypes, eq(containerTypes.code, parts.typeCode))
    .leftJoin(accounts, eq(accounts.siteId, sites.id))
    .leftJoin(balances, and(eq(balances.accountId, accounts.id), eq(balances.typeCode, parts.typeCode)))
    .where(and(eq(parts.active, true), scope ? eq(companies.id, scope) : eq(companies.kind, 'partner')))
    .groupBy(sites.id, sites.name, companies.id, companies.name, parts.typeCode, containerTypes.name);
  return rows
    .filter((row) => Number(row.perDay) > 0)
    .map(({ perDay, ...row }) => {
      const there = Number(row.there);
      return { ...row, there, days: Math.round((Math.max(0, there) / Number(perDay)) * 10) / 10 };
    })
    .sort((a, b) => a.days - b.days || a.site.localeCompare(b.site, 'en'))
    .slice(0, shown);
}
