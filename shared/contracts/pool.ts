import { z } from 'zod';
import { positiveUnits, wholeUnits } from '../domain/quantity';
import { code, id, instant, proseOrEmpty } from './fields';
import { listQuery, pageOf } from './list';
import { operation } from './operation';
import { poolPlan, poolResult, reckonedPool, seenTimes } from './pool-sizing';

const typeName = z.object({ code: z.string(), name: z.string(), kind: z.string() });
const siteName = z.object({ id, name: z.string(), company: z.string() });
const typeParams = z.object({ type: code });

/** How the pool of today stands to the approved size, or to the needed one while none is approved. */
export const poolStandings = ['short', 'as approved', 'above', 'not planned'] as const;

const poolRow = z.object({
  type: typeName,
  inPool: z.int(),
  /** Pool size by the plan; null while it cannot be reckoned. */
  poolSize: z.int().nullable(),
  loopDays: z.number().nullable(),
  containersPerDay: z.number().nullable(),
  parts: z.int(),
  approved: z.object({ size: z.int(), at: instant }).nullable(),
  standing: z.enum(poolStandings),
  sitesUnder: z.int(),
  sitesOver: z.int(),
});
export type PoolRow = z.infer<typeof poolRow>;

export const listPool = operation({
  name: 'listPool',
  resource: 'pool',
  method: 'GET',
  path: '/pool',
  summary: 'Container types with the pool of today, what is needed and what is approved',
  query: listQuery,
  answer: pageOf(poolRow),
});

export const downloadPool = operation({
  name: 'downloadPool',
  resource: 'pool',
  method: 'GET',
  path: '/pool.xlsx',
  summary: 'The same list as a spreadsheet',
  query: listQuery.omit({ after: true, limit: true }),
  answers: 'file',
  answer: z.unknown(),
});

const approval = z.object({
  id,
  size: z.int(),
  note: z.string(),
  by: z.string(),
  at: instant,
  result: poolResult,
  levels: z.array(z.object({ site: siteName, minimum: z.int(), maximum: z.int() })),
});
export type PoolApproval = z.infer<typeof approval>;

export const readPool = operation({
  name: 'readPool',
  resource: 'pool',
  method: 'GET',
  path: '/pool/:type',
  summary: 'One type: its loop, what is needed and why, what is approved, who is under or over',
  params: typeParams,
  answer: z.object({
    type: typeName.extend({ replacement: z.string(), currency: z.string(), unitsPerStack: z.int() }),
    parts: z.int(),
    inPool: z.int(),
    plan: poolPlan.nullable(),
    planChanged: z.object({ by: z.string().nullable(), at: instant }).nullable(),
    reckoned: reckonedPool.nullable(),
    /** Why it cannot be reckoned. */
    whyNot: z.enum(['no loop', 'no parts', 'refused']).nullable(),
    seen: seenTimes,
    approved: approval.nullable(),
    /** Sites that hold the type or whose parts travel in it, with what stands there. */
    sites: z.array(
      siteName.extend({
        companyId: id,
        units: z.int(),
        minimum: z.int().nullable(),
        maximum: z.int().nullable(),
      }),
    ),
  }),
});

/** Changes nothing: unkeyed, so that it can be asked with every keystroke's pause. */
export const previewPool = operation({
  name: 'previewPool',
  resource: 'pool',
  method: 'POST',
  path: '/pool/:type/preview',
  summary: 'Reckon the pool with other assumptions; stores nothing',
  params: typeParams,
  body: poolPlan,
  keyed: false,
  answer: reckonedPool,
});

export const savePlan = operation({
  name: 'savePlan',
  resource: 'pool',
  method: 'PUT',
  path: '/pool/:type/plan',
  summary: 'Store the loop of a type and what is assumed of it',
  params: typeParams,
  body: poolPlan,
  answer: z.object({ type: z.string() }),
});

const level = z
  .object({ siteId: id, minimum: wholeUnits, maximum: wholeUnits })
  .refine(({ minimum, maximum }) => minimum <= maximum, {
    path: ['maximum'],
    error: 'Not below the minimum',
  });

export const approvalForm = z.object({
  size: positiveUnits,
  /** The pool size that the person saw; another one now means that plan or parts have changed since. */
  reckoned: positiveUnits,
  levels: z.array(level).max(200),
  note: proseOrEmpty(300),
});
export type ApprovalForm = z.infer<typeof approvalForm>;

export const approvePool = operation({
  name: 'approvePool',
  resource: 'pool',
  method: 'POST',
  path: '/pool/:type/approvals',
  summary: 'Approve a size, with the minimum and maximum of each site; earlier approvals stay',
  params: typeParams,
  body: approvalForm,
  answer: z.object({ id }),
});

export const listApprovals = operation({
  name: 'listApprovals',
  resource: 'pool',
  method: 'GET',
  path: '/pool/:type/approvals',
  summary: 'Approved sizes of a type, newest first',
  params: typeParams,
  query: listQuery,
  answer: pageOf(approval),
});
