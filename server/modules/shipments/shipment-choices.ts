import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies, sites } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { accounts, balances } from '@/db/schema/ledger';
import { dayInZone } from '@/shared/domain/calendar';
import type { AnswerOf } from '@/shared/contracts/operation';
import type { listShipmentChoices } from '@/shared/contracts/shipments';
import type { Person } from '../../http/person';
import { contentsSentBy } from './contents-sent-by';

/** From the own sites to those of the other kind of company: a partner sees the operator's sites only. */
export async function shipmentChoices(
  db: Reader,
  { person, now }: { person: Person; now: string },
): Promise<AnswerOf<typeof listShipmentChoices>> {
  const from = await sitesWhere(db, eq(sites.companyId, person.companyId));
  const otherKind = person.companyKind === 'operator' ? 'partner' : 'operator';
  const to = await sitesWhere(db, eq(companies.kind, otherKind));
  const types = await db
    .select({
      code: containerTypes.code,
      name: containerTypes.name,
      unitsPerStack: containerTypes.unitsPerStack,
    })
    .from(containerTypes)
    .where(eq(containerTypes.active, true))
    .orderBy(asc(containerTypes.name), asc(containerTypes.code));
  return {
    contents: contentsSentBy(person.companyKind),
    today: dayInZone(now, from[0]?.timeZone ?? 'UTC'),
    from,
    to,
    types,
    atSites: await standingAt(
      db,
      from.map((site) => site.id),
    ),
  };
}

function sitesWhere(db: Reader, where: ReturnType<typeof eq>) {
  return db
    .select({
      id: sites.id,
      name: sites.name,
      companyId: companies.id,
      company: companies.name,
      timeZone: sites.timeZone,
    })
    .from(sites)
    .innerJoin(companies, eq(companies.id, sites.companyId))
    .where(and(where, eq(sites.active, true), eq(companies.active, true)))
    .orderBy(asc(companies.name), asc(sites.name), asc(sites.id));
}

async function standingAt(db: Reader, siteIds: readonly string[]) {
  if (siteIds.length === 0) return [];
  const rows = await db
    .select({ siteId: accounts.siteId, typeCode: balances.typeCode, units: balances.units })
    .from(balances)
    .innerJoin(accounts, eq(accounts.id, balances.accountId))
    .where(inArray(accounts.siteId, [...siteIds]));
  return rows.flatMap(({ siteId, ...row }) => (siteId === null ? [] : [{ siteId, ...row }]));
}
