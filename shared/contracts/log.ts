import { z } from 'zod';
import { id, instant } from './fields';
import { listQuery, pageOf } from './list';
import { operation } from './operation';

export const logRow = z.object({
  id: z.int(),
  at: instant,
  person: z.string().nullable(),
  company: z.string().nullable(),
  action: z.string(),
  outcome: z.string(),
  subjectKind: z.string().nullable(),
  subjectId: z.string().nullable(),
  requestId: z.string(),
});
export type LogRow = z.infer<typeof logRow>;

export const listLog = operation({
  name: 'listLog',
  resource: 'log',
  method: 'GET',
  path: '/log',
  summary: 'Who did what, newest first',
  query: listQuery.extend({
    person: id.optional(),
    subject: z.string().max(60).optional(),
    outcome: z.string().max(40).optional(),
  }),
  answer: pageOf(logRow),
});

export const letterRow = z.object({
  id,
  kind: z.string(),
  toName: z.string(),
  toAddress: z.string(),
  subject: z.string(),
  text: z.string(),
  state: z.enum(['waiting', 'sent', 'captured', 'failed']),
  problem: z.string().nullable(),
  createdAt: instant,
  sentAt: instant.nullable(),
});
export type LetterRow = z.infer<typeof letterRow>;

export const listLetters = operation({
  name: 'listLetters',
  resource: 'letters',
  method: 'GET',
  path: '/letters',
  summary:
    'Mail of the outbox, newest first: what was sent, waits, failed, or was captured for want of a mail server',
  query: listQuery.extend({ state: z.enum(['waiting', 'sent', 'captured', 'failed']).optional() }),
  answer: pageOf(letterRow),
});

export const readLetter = operation({
  name: 'readLetter',
  resource: 'letters',
  method: 'GET',
  path: '/letters/:letter',
  summary: 'One message of the outbox',
  params: z.object({ letter: id }),
  answer: letterRow,
});

export const verifyLedgerSeals = operation({
  name: 'verifyLedgerSeals',
  resource: 'log',
  method: 'GET',
  path: '/ledger-verification',
  summary:
    'Reckons the chain of seals over the unit ledger anew; names the first entry that was changed behind its back',
  answer: z.object({ sealedEntries: z.int(), firstBroken: z.int().nullable() }),
});
