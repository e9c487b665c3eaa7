import { z } from 'zod';
import { id, month, proseOrEmpty } from './fields';
import { listQuery, pageOf } from './list';
import { operation } from './operation';

const monthParams = z.object({ month });
const money = z.object({ currency: z.string(), amount: z.string() });

export const monthRow = z.object({
  month: z.string(),
  state: z.enum(['open', 'closed']),
  /** Its last day is over in the operator's time zone. */
  over: z.boolean(),
  closedBy: z.string().nullable(),
  closedAt: z.string().nullable(),
  reason: z.string(),
  statements: z.object({
    drafts: z.int(),
    issued: z.int(),
    confirmed: z.int(),
    disputed: z.int(),
  }),
});
export type MonthRow = z.infer<typeof monthRow>;

export const listMonths = operation({
  name: 'listMonths',
  resource: 'months',
  method: 'GET',
  path: '/months',
  summary: 'Months, newest first, with how far their statements are',
  query: listQuery,
  answer: pageOf(monthRow),
});

/** What still stands open: by partner, with the money that hangs on it. */
export const openItem = z.object({
  kind: z.enum(['differences', 'disputes', 'uncounted', 'terms missing']),
  partner: z.object({ id, name: z.string() }),
  count: z.int(),
  money: money.nullable(),
  /** For missing terms: which type. */
  typeCode: z.string().nullable(),
});
export type OpenItem = z.infer<typeof openItem>;

export const monthJob = z.object({
  kind: z.enum(['drafts', 'issue']),
  state: z.enum(['waiting', 'running', 'done', 'failed']),
  done: z.int(),
  total: z.int(),
  /** Partners that could not be assessed, each with why. */
  refused: z.array(z.object({ partner: z.object({ id, name: z.string() }), why: z.string() })),
  problem: z.string().nullable(),
});
export type MonthJob = z.infer<typeof monthJob>;

export const readMonth = operation({
  name: 'readMonth',
  resource: 'months',
  method: 'GET',
  path: '/months/:month',
  summary: 'A month: what still stands open, how its statements are coming along',
  params: monthParams,
  answer: monthRow.extend({
    openItems: z.array(openItem),
    /** An earlier month that has to be closed first. */
    earlierOpen: z.string().nullable(),
    jobs: z.array(monthJob),
    mayClose: z.boolean(),
    mayIssue: z.boolean(),
    /** Drafts can be made again: none is issued later on. */
    mayDraft: z.boolean(),
  }),
});

export const closing = z.object({ reason: proseOrEmpty(500) });

export const closeMonth = operation({
  name: 'closeMonth',
  resource: 'months',
  method: 'POST',
  path: '/months/:month/close',
  summary: 'Close a month and make its draft statements; asks for a reason while something stands open',
  params: monthParams,
  body: closing,
  answer: z.object({ month: z.string(), jobId: id }),
});

export const draftStatements = operation({
  name: 'draftStatements',
  resource: 'months',
  method: 'POST',
  path: '/months/:month/drafts',
  summary: 'Make the drafts of a closed month again with what is known now; issued statements stay',
  params: monthParams,
  answer: z.object({ jobId: id }),
});

export const issueStatements = operation({
  name: 'issueStatements',
  resource: 'months',
  method: 'POST',
  path: '/months/:month/issue',
  summary: 'Issue all drafts of a month',
  params: monthParams,
  answer: z.object({ jobId: id }),
});

export const downloadMonth = operation({
  name: 'downloadMonth',
  resource: 'months',
  method: 'GET',
  path: '/months/:month/spreadsheets',
  summary: 'All spreadsheets of a month as one ZIP',
  params: monthParams,
  answer: z.unknown(),
  answers: 'file',
});
