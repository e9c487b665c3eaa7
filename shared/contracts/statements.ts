import { z } from 'zod';
import { movementKinds } from '../domain/assessment/input';
import { contentDifference, contentMovement, statementContent } from '../domain/statement/content';
import { lineComponents } from '../domain/statement/components';
import { id, month } from './fields';
import { listQuery, pageOf } from './list';
import { operation } from './operation';

const statementParams = z.object({ statement: id });

export const statementStates = ['draft', 'issued'] as const;
export const statementAnswers = ['awaited', 'confirmed', 'confirmed by silence', 'disputed'] as const;

/** Payable and tax are frozen; what is held follows the disputes; due now is the rest. */
const sums = {
  currency: z.string(),
  payable: z.string(),
  tax: z.string(),
  total: z.string(),
  held: z.string(),
  dueNow: z.string(),
};

export const statementRow = z.object({
  id,
  number: z.string(),
  month: z.string(),
  partner: z.object({ id, name: z.string() }),
  state: z.enum(statementStates),
  answer: z.enum(statementAnswers),
  objectionUntil: z.string().nullable(),
  issuedAt: z.string().nullable(),
  ...sums,
});
export type StatementRow = z.infer<typeof statementRow>;

export const listStatements = operation({
  name: 'listStatements',
  resource: 'statements',
  method: 'GET',
  path: '/statements',
  summary: 'Statements, newest month first; a partner sees its own that were issued',
  query: listQuery.extend({
    month: month.optional(),
    partner: id.optional(),
    state: z.enum(statementStates).optional(),
    answer: z.enum(statementAnswers).optional(),
  }),
  answer: pageOf(statementRow),
});

export const statementDispute = z.object({
  id,
  lineId: z.string().nullable(),
  state: z.string(),
  undecided: z.boolean(),
  stated: z.int(),
  claimed: z.int(),
  held: z.string(),
  reason: z.string(),
  by: z.string().nullable(),
  at: z.string(),
  /** What was said when it was opened. */
  words: z.string(),
});

export const statementStep = z.object({ step: z.string(), by: z.string().nullable(), at: z.string() });

export const readStatement = operation({
  name: 'readStatement',
  resource: 'statements',
  method: 'GET',
  path: '/statements/:statement',
  summary: 'A statement with all it says, what is held, and its history',
  params: statementParams,
  answer: statementRow.extend({
    content: statementContent.omit({ movements: true, openDifferences: true }),
    sha256: z.string(),
    /** Differences of the partner still open today that arose by the end of the month. */
    stillOpen: z.array(contentDifference),
    disputes: z.array(statementDispute),
    history: z.array(statementStep),
    timeZone: z.string(),
    mayIssue: z.boolean(),
    mayConfirm: z.boolean(),
    mayDispute: z.boolean(),
    /** The reader is of the partner and nobody there has opened it yet. */
    firstOpening: z.boolean(),
  }),
});

export const listStatementMovements = operation({
  name: 'listStatementMovements',
  resource: 'statements',
  method: 'GET',
  path: '/statements/:statement/movements',
  summary: 'The movements behind a figure of a statement',
  params: statementParams,
  query: listQuery.extend({
    /** A line of money, or all lines of a component, which for a correction names the closed month too. */
    line: z.string().max(40).optional(),
    component: z.enum(lineComponents).optional(),
    corrects: month.optional(),
    /** What came before the month and makes its opening figures. */
    before: z.enum(['yes']).optional(),
    type: z.string().max(20).optional(),
    kind: z.enum([...movementKinds, 'corrected']).optional(),
  }),
  answer: pageOf(contentMovement),
});

export const openStatement = operation({
  name: 'openStatement',
  resource: 'statements',
  method: 'POST',
  path: '/statements/:statement/openings',
  summary: 'Note that the partner has opened the statement; the first time counts',
  params: statementParams,
  answer: z.object({ id }),
});

export const confirmStatement = operation({
  name: 'confirmStatement',
  resource: 'statements',
  method: 'POST',
  path: '/statements/:statement/confirmations',
  summary: 'Confirm a statement; not while a dispute of it is undecided',
  params: statementParams,
  answer: z.object({ id }),
});

export const issueStatement = operation({
  name: 'issueStatement',
  resource: 'statements',
  method: 'POST',
  path: '/statements/:statement/issue',
  summary: 'Issue a draft: it is frozen, its spreadsheet kept, and the partner told by e-mail',
  params: statementParams,
  answer: z.object({ id }),
});

export const downloadStatement = operation({
  name: 'downloadStatement',
  resource: 'statements',
  method: 'GET',
  path: '/statements/:statement/spreadsheet',
  summary: 'The spreadsheet of a statement; once issued, the file that was kept',
  params: statementParams,
  answer: z.unknown(),
  answers: 'file',
});
