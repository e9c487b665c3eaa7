import { asc, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies, sites, terms } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { months } from '@/db/schema/statements';
import { dayInZone } from '@/shared/domain/calendar';
import type { SiteWithCompany } from '../partners/sites';

/** What rows are checked against, read once for a file. */
export type BookFacts = {
  siteByCode: (code: string) => SiteWithCompany | undefined;
  isType: (code: string) => boolean;
  isClosed: (month: string) => boolean;
  /** Whether the partner has terms for the type in force on the day. */
  hasTerms: (asked: { companyId: string; typeCode: string; day: string }) => boolean;
  todayAt: (timeZone: string) => string;
};

export async function readBookFacts(db: Reader, now: string): Promise<BookFacts> {
  const siteRows = await db
    .select({ site: sites, company: companies })
    .from(sites)
    .innerJoin(companies, eq(companies.id, sites.companyId))
    .where(eq(sites.active, true));
  const byCode = new Map(siteRows.map(({ site, company }) => [site.code, { ...site, company }]));
  const typeRows = await db
    .select({ code: containerTypes.code })
    .from(containerTypes)
    .where(eq(containerTypes.active, true));
  const types = new Set(typeRows.map(({ code }) => code));
  const closedRows = await db.select({ month: months.month }).from(months).where(eq(months.state, 'closed'));
  const closed = new Set(closedRows.map(({ month }) => month));
  const firstTerms = await readFirstTerms(db);
  const todays = new Map<string, string>();
  return {
    siteByCode: (code) => byCode.get(code),
    isType: (code) => types.has(code),
    isClosed: (month) => closed.has(month),
    hasTerms: ({ companyId, typeCode, day }) => {
      const from = firstTerms.get(`${companyId} ${typeCode}`);
      return from !== undefined && from <= day;
    },
    todayAt: (timeZone) => {
      const held = todays.get(timeZone) ?? dayInZone(now, timeZone);
      todays.set(timeZone, held);
      return held;
    },
  };
}

/** The first day of terms for each partner and type: versions follow each other without a gap. */
async function readFirstTerms(db: Reader): Promise<Map<string, string>> {
  const rows = await db
    .select({ companyId: terms.companyId, typeCode: terms.typeCode, validFrom: terms.validFrom })
    .from(terms)
    .orderBy(asc(terms.validFrom));
  const first = new Map<string, string>();
  for (const { companyId, typeCode, validFrom } of rows) {
    const key = `${companyId} ${typeCode}`;
    if (!first.has(key)) first.set(key, validFrom);
  }
  return first;
}
