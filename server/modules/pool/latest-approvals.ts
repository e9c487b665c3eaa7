import { and, desc, eq, lt, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { people } from '@/db/schema/companies';
import { containerTypes, poolApprovals } from '@/db/schema/containers';

/** The newest approval of each type; ids are time-ordered, so the largest is the newest. */
export async function latestApprovals(db: Reader, typeCode?: string) {
  const newest = db
    .select({ id: sql<string>`max(${poolApprovals.id})`.as('newest_id') })
    .from(poolApprovals)
    .where(typeCode === undefined ? undefined : eq(poolApprovals.typeCode, typeCode))
    .groupBy(poolApprovals.typeCode)
    .as('newest');
  const rows = await db
    .select({ approval: poolApprovals, typeName: containerTypes.name, by: people.name })
    .from(poolApprovals)
    .innerJoin(newest, eq(newest.id, poolApprovals.id))
    .innerJoin(containerTypes, eq(containerTypes.code, poolApprovals.typeCode))
    .innerJoin(people, eq(people.id, poolApprovals.approvedBy));
  return rows.map(({ approval, typeName, by }) => ({ ...approval, typeName, by }));
}

/** Approvals of a type, newest first, those before an id. */
export async function approvalsOf(
  db: Reader,
  asked: { typeCode: string; before: string | undefined; limit: number },
) {
  const rows = await db
    .select({ approval: poolApprovals, by: people.name })
    .from(poolApprovals)
    .innerJoin(people, eq(people.id, poolApprovals.approvedBy))
    .where(
      and(
        eq(poolApprovals.typeCode, asked.typeCode),
        asked.before === undefined ? undefined : lt(poolApprovals.id, asked.before),
      ),
    )
    .orderBy(desc(poolApprovals.id))
    .limit(asked.limit);
  return rows.map(({ approval, by }) => ({ ...approval, by }));
}
