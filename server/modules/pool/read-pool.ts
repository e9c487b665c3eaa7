import { eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { containerTypes } from '@/db/schema/containers';
import type { listApprovals, PoolApproval, readPool } from '@/shared/contracts/pool';
import type { AnswerOf, QueryOf } from '@/shared/contracts/operation';
import { poolResult, type PoolPlan, type ReckonedPool } from '@/shared/contracts/pool-sizing';
import { plainDecimal } from '@/shared/domain/plain-decimal';
import type { PoolInput } from '@/shared/domain/pool-size';
import { Problem } from '@/shared/problems/problems';
import { cursor, cutPage } from '../../http/page';
import { operatorCurrency } from '../container-types/read-model';
import { operatorDay } from '../partners/operator-day';
import { sitesById } from '../partners/sites';
import { stockBySite, unitsInPool } from './in-pool';
import { approvalsOf, latestApprovals } from './latest-approvals';
import { levelsOf } from './levels';
import { flowsByType, plansByType } from './plan-rows';
import { reckonPool } from './reckon';
import { seenTimesOf } from './seen-times';

/** Everything of one type's pool. */
export async function poolOfType(
  db: Reader,
  { typeCode, now }: { typeCode: string; now: string },
): Promise<AnswerOf<typeof readPool>> {
  const [type] = await db.select().from(containerTypes).where(eq(containerTypes.code, typeCode));
  if (!type) throw new Problem('not found');
  const { code, name, kind, unitsPerStack } = type;
  const atHand = (await plansByType(db, typeCode)).get(typeCode);
  const flows = (await flowsByType(db, typeCode)).get(typeCode) ?? [];
  const inPool = (await unitsInPool(db)).get(typeCode) ?? 0;
  const [latest] = await namedApprovals(db, await latestApprovals(db, typeCode));
  const level = new Map(latest?.levels.map((each) => [each.site.id, each]));
  return {
    type: {
      code,
      name,
      kind,
      unitsPerStack,
      replacement: plainDecimal(type.replacement),
      currency: await operatorCurrency(db),
    },
    parts: flows.length,
    inPool,
    plan: atHand?.plan ?? null,
    planChanged: atHand?.changed ?? null,
    ...reckonedOrWhyNot(atHand?.plan, { flows, inPool }),
    seen: await seenTimesOf(db, typeCode, await operatorDay(db, now)),
    approved: latest ?? null,
    sites: (await stockBySite(db, typeCode)).map((site) => ({
      ...site,
      minimum: level.get(site.id)?.minimum ?? null,
      maximum: level.get(site.id)?.maximum ?? null,
    })),
  };
}

type WhyNot = 'no loop' | 'no parts' | 'refused';

function reckonedOrWhyNot(
  plan: PoolPlan | undefined,
  of: { flows: PoolInput['flows']; inPool: number },
): { reckoned: ReckonedPool | null; whyNot: WhyNot | null } {
  if (of.flows.length === 0) return { reckoned: null, whyNot: 'no parts' };
  if (plan === undefined) return { reckoned: null, whyNot: 'no loop' };
  try {
    return { reckoned: reckonPool(plan, of), whyNot: null };
  } catch (error) {
    if (!(error instanceof Problem)) throw error;
    return { reckoned: null, whyNot: 'refused' };
  }
}

/** The pool with other assumptions; the parts and the units are those of the book. */
export async function previewOf(db: Reader, typeCode: string, plan: PoolPlan): Promise<ReckonedPool> {
  const [type] = await db
    .select({ code: containerTypes.code })
    .from(containerTypes)
    .where(eq(containerTypes.code, typeCode));
  if (!type) throw new Problem('not found');
  const flows = (await flowsByType(db, typeCode)).get(typeCode) ?? [];
  if (flows.length === 0) {
    throw new Problem('cannot be reckoned', {
      data: { why: 'No part travels in this type yet. Add the parts first.' },
    });
  }
  return reckonPool(plan, { flows, inPool: (await unitsInPool(db)).get(typeCode) ?? 0 });
}

/** Approved sizes of a type, newest first, a page by key. */
export async function approvalsPage(
  db: Reader,
  { typeCode, query }: { typeCode: string; query: QueryOf<typeof listApprovals> },
) {
  const after = cursor(query.after, 2);
  const rows = await approvalsOf(db, { typeCode, before: after?.[0], limit: query.limit + 1 });
  return cutPage(await namedApprovals(db, rows), query.limit, (row) => [row.id, row.at]);
}

type ApprovalRow = Awaited<ReturnType<typeof approvalsOf>>[number];

/** Approvals with their sites by name. */
async function namedApprovals(db: Reader, rows: readonly ApprovalRow[]): Promise<PoolApproval[]> {
  const sites = await sitesById(
    db,
    rows.flatMap((row) => levelsOf(row).map((level) => level.siteId)),
  );
  return rows.map((row) => ({
    id: row.id,
    size: row.size,
    note: row.note,
    by: row.by,
    at: row.approvedAt,
    result: poolResult.parse(row.result),
    levels: levelsOf(row).flatMap(({ siteId, minimum, maximum }) => {
      const site = sites.get(siteId);
      return site
        ? [{ site: { id: site.id, name: site.name, company: site.company.name }, minimum, maximum }]
        : [];
    }),
  }));
}
