import { and, asc, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies, sites } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import type { listAdjustmentChoices } from '@/shared/contracts/balances';
import type { AnswerOf } from '@/shared/contracts/operation';
import { operatorDay } from '../partners/operator-day';

/** The operator's own sites first, then those of the partners. */
export async function adjustmentChoices(
  db: Reader,
  now: string,
): Promise<AnswerOf<typeof listAdjustmentChoices>> {
  const found = await db
    .select({ id: sites.id, name: sites.name, company: companies.name, kind: companies.kind })
    .from(sites)
    .innerJoin(companies, eq(companies.id, sites.companyId))
    .where(and(eq(sites.active, true), eq(companies.active, true)))
    .orderBy(asc(companies.kind), asc(companies.name), asc(sites.name), asc(sites.id));
  const types = await db
    .select({ code: containerTypes.code, name: containerTypes.name })
    .from(containerTypes)
    .where(eq(containerTypes.active, true))
    .orderBy(asc(containerTypes.name), asc(containerTypes.code));
  return {
    today: await operatorDay(db, now),
    sites: found.map(({ kind, ...site }) => ({ ...site, own: kind === 'operator' })),
    types,
  };
}
