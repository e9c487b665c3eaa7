import { and, eq, inArray, or } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { containerTypes } from '@/db/schema/containers';
import type { listPool, PoolRow } from '@/shared/contracts/pool';
import type { QueryOf } from '@/shared/contracts/operation';
import type { PoolPlan } from '@/shared/contracts/pool-sizing';
import type { PoolInput, PoolSize } from '@/shared/domain/pool-size';
import { Problem } from '@/shared/problems/problems';
import { cursor, cutPage } from '../../http/page';
import { holdsText } from '../../http/search';
import { keyset, sortOf } from '../../http/sort';
import { unitsInPool } from './in-pool';
import { latestApprovals } from './latest-approvals';
import { sitesOutOfLevel } from './levels';
import { flowsByType, plansByType } from './plan-rows';
import { sizeOf } from './reckon';

/** Types by name, a page by key: those in use, and those out of use of which the pool still holds units. */
export async function poolPage(db: Reader, query: QueryOf<typeof listPool>) {
  const inPool = await unitsInPool(db);
  const held = [...inPool].filter(([, units]) => units !== 0).map(([code]) => code);
  const { name, code, kind } = containerTypes;
  const { down } = sortOf(query.sort, ['type']);
  const page = keyset({ by: name, then: code, down, after: cursor(query.after, 2) });
  const types = await db
    .select({ code, name, kind })
    .from(containerTypes)
    .where(
      and(
        held.length > 0
          ? or(eq(containerTypes.active, true), inArray(code, held))
          : eq(containerTypes.active, true),
        holdsText(query.search, name, code),
        page.after,
      ),
    )
    .orderBy(...page.order)
    .limit(query.limit + 1);
  const facts = await factsOf(db, inPool);
  return cutPage(
    types.map((type) => rowOf(type, facts)),
    query.limit,
    (row) => [row.type.name, row.type.code],
  );
}

type Facts = Awaited<ReturnType<typeof factsOf>>;

async function factsOf(db: Reader, inPool: Map<string, number>) {
  return {
    inPool,
    plans: await plansByType(db),
    flows: await flowsByType(db),
    approvals: new Map((await latestApprovals(db)).map((each) => [each.typeCode, each])),
    outOfLevel: await sitesOutOfLevel(db),
  };
}

function rowOf(type: PoolRow['type'], facts: Facts): PoolRow {
  const inPool = facts.inPool.get(type.code) ?? 0;
  const flows = facts.flows.get(type.code) ?? [];
  const size = sizeOrNull(facts.plans.get(type.code)?.plan, flows);
  const approval = facts.approvals.get(type.code);
  const sites = facts.outOfLevel.filter((each) => each.type.code === type.code);
  return {
    type,
    inPool,
    poolSize: size?.poolSize ?? null,
    loopDays: size?.loopDays ?? null,
    containersPerDay: size?.containersPerDay ?? null,
    parts: flows.length,
    approved: approval ? { size: approval.size, at: approval.approvedAt } : null,
    standing: standingOf(inPool, approval?.size ?? size?.poolSize),
    sitesUnder: sites.filter((each) => each.standing === 'under').length,
    sitesOver: sites.filter((each) => each.standing === 'over').length,
  };
}

/** A pool within 1 % of its size counts as having it: a few are always just bought or just lost. */
function standingOf(inPool: number, size: number | undefined): PoolRow['standing'] {
  if (size === undefined) return 'not planned';
  if (Math.abs(inPool - size) <= size / 100) return 'as approved';
  return inPool < size ? 'short' : 'above';
}

function sizeOrNull(plan: PoolPlan | undefined, flows: PoolInput['flows']): PoolSize | null {
  if (plan === undefined || flows.length === 0) return null;
  try {
    return sizeOf(plan, flows);
  } catch (error) {
    if (error instanceof Problem) return null;
    throw error;
  }
}
