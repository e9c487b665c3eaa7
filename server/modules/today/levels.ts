import { and, eq, inArray, max, sql } from 'drizzle-orm';
import { z } from 'zod';
import type { Reader } from '@/db/client';
import { sites } from '@/db/schema/companies';
import { containerTypes, poolApprovals } from '@/db/schema/containers';
import { accounts, balances } from '@/db/schema/ledger';
import type { Today } from '@/shared/contracts/today';
import { may, type Person } from '../../http/person';

const siteLevels = z.array(
  z.object({ siteId: z.string(), minimum: z.number().int(), maximum: z.number().int() }),
);
type Approval = { size: number; levels: z.infer<typeof siteLevels> };

/** The last approved size of each type, with the levels of its sites. */
export async function latestApprovals(db: Reader): Promise<Map<string, Approval>> {
  const latest = db
    .select({ id: max(poolApprovals.id).as('id') })
    .from(poolApprovals)
    .groupBy(poolApprovals.typeCode);
  const rows = await db
    .select({ typeCode: poolApprovals.typeCode, size: poolApprovals.size, levels: poolApprovals.levels })
    .from(poolApprovals)
    .where(inArray(poolApprovals.id, latest));
  return new Map(
    rows.map(({ typeCode, size, levels }) => [
      typeCode,
      { size, levels: siteLevels.catch([]).parse(levels) },
    ]),
  );
}

/** Types whose pool is under or over its approved size, and sites under or over theirs. */
export async function offLevel(db: Reader, person: Person): Promise<Today['levels']> {
  if (person.companyKind !== 'operator' || !may(person, 'plan pool')) return null;
  const approvals = await latestApprovals(db);
  if (approvals.size === 0) return [];
  const names = new Map(
    (await db.select({ code: containerTypes.code, name: containerTypes.name }).from(containerTypes)).map(
      (type) => [type.code, type.name],
    ),
  );
  const inPool = new Map((await unitsInPool(db)).map((row) => [row.typeCode, Number(row.units)]));
  const atSites = await unitsAtSites(db);
  return [...approvals].flatMap(([typeCode, { size, levels }]) => {
    const typeName = names.get(typeCode) ?? typeCode;
    const whole = { typeCode, typeName, site: null, minimum: size, maximum: size };
    const rows = [
      { ...whole, there: inPool.get(typeCode) ?? 0 },
      ...levels.flatMap(({ siteId, minimum, maximum }) => {
        const found = atSites.get(siteId);
        if (!found) return [];
        return [
          { typeCode, typeName, site: found.site, minimum, maximum, there: found.units.get(typeCode) ?? 0 },
        ];
      }),
    ];
    return rows.filter((row) => row.there < row.minimum || row.there > row.maximum);
  });
}

function unitsInPool(db: Reader) {
  return db
    .select({ typeCode: balances.typeCode, units: sql<string>`sum(${balances.units})` })
    .from(balances)
    .innerJoin(accounts, eq(accounts.id, balances.accountId))
    .where(inArray(accounts.kind, ['site', 'transit']))
    .groupBy(balances.typeCode);
}

async function unitsAtSites(db: Reader): Promise<Map<string, { site: string; units: Map<string, number> }>> {
  const rows = await db
    .select({ siteId: sites.id, site: sites.name, typeCode: balances.typeCode, units: balances.units })
    .from(sites)
    .leftJoin(accounts, and(eq(accounts.siteId, sites.id), eq(accounts.kind, 'site')))
    .leftJoin(balances, eq(balances.accountId, accounts.id));
  const found = new Map<string, { site: string; units: Map<string, number> }>();
  for (const row of rows) {
    const at = found.get(row.siteId) ?? { site: row.site, units: new Map<string, number>() };
    if (row.typeCode !== null && row.units !== null) at.units.set(row.typeCode, row.units);
    found.set(row.siteId, at);
  }
  return found;
}
