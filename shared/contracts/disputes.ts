import { z } from 'zod';
import { day } from '../domain/calendar';
import { decimalString } from '../domain/money';
import { positiveUnits, wholeUnits } from '../domain/quantity';
import { lineComponents } from '../domain/statement/components';
import { typeKinds } from './container-types';
import { code, id, instant, month, needed, prose, proseOrEmpty } from './fields';
import { mostFilesOnOne, storedFile } from './files';
import { listQuery, pageOf } from './list';
import { operation } from './operation';

export const disputeStates = [
  'open',
  'waiting for partner',
  'accepted',
  'accepted in part',
  'declined',
  'withdrawn',
] as const;
export type DisputeState = (typeof disputeStates)[number];
/** Open in the book, whoever has the next word. */
export const undecided: readonly DisputeState[] = ['open', 'waiting for partner'];
export const disputeReasons = [
  'counted wrongly',
  'sent them back',
  'never arrived',
  'arrived damaged',
  'wrong rate',
  'other',
] as const;
export type DisputeReason = (typeof disputeReasons)[number];
export const subjects = ['count', 'statement line'] as const;

const units = z.number().int();

export const disputeRow = z.object({
  id,
  subject: z.enum(subjects),
  company: z.string(),
  /** The shipment whose count is disputed, or on which the partner says the units came back. */
  shipmentId: id.nullable(),
  reference: z.string().nullable(),
  statementId: id.nullable(),
  statementNumber: z.string().nullable(),
  statementMonth: month.nullable(),
  component: z.enum(lineComponents).nullable(),
  typeName: z.string().nullable(),
  /** What the book says and what the partner says; equal where only the money is disputed. */
  stated: units,
  claimed: units,
  amountClaimed: z.string(),
  amountHeld: z.string(),
  currency: z.string(),
  reason: z.enum(disputeReasons),
  state: z.enum(disputeStates),
  openedAt: instant,
  lastWordAt: instant,
  /** Who owes the next word, and for how many days. */
  waitingFor: z.enum(['operator', 'partner']).nullable(),
  days: z.number().int(),
  yourTurn: z.boolean(),
});
export type DisputeRow = z.infer<typeof disputeRow>;

export const disputeFilters = ['undecided', 'open', 'waiting for partner', 'decided'] as const;

export const listDisputes = operation({
  name: 'listDisputes',
  resource: 'disputes',
  method: 'GET',
  path: '/disputes',
  summary: 'Disputes of the own company; the operator sees all. Undecided: the longest silence first',
  query: listQuery.extend({
    state: z.enum(disputeFilters).default('undecided'),
    subject: z.enum(subjects).optional(),
    partner: id.optional(),
  }),
  answer: pageOf(disputeRow),
});

export const disputeSteps = [
  'opened',
  'asked',
  'answered',
  'accepted',
  'accepted in part',
  'declined',
  'withdrawn',
] as const;

const message = z.object({
  id,
  step: z.enum(disputeSteps),
  text: z.string(),
  side: z.enum(['operator', 'partner']),
  company: z.string(),
  by: z.string().nullable(),
  at: instant,
  files: z.array(storedFile),
});
export type DisputeMessage = z.infer<typeof message>;

export const disputeDetail = disputeRow.extend({
  typeCode: z.string().nullable(),
  countId: id.nullable(),
  lineAmount: z.string().nullable(),
  acceptedUnits: units.nullable(),
  acceptedAmount: z.string().nullable(),
  messages: z.array(message),
  may: z.object({ answer: z.boolean(), reply: z.boolean(), withdraw: z.boolean() }),
});
export type DisputeDetail = z.infer<typeof disputeDetail>;

const theDispute = z.object({ dispute: id });
const fileIds = z.array(id).max(mostFilesOnOne).default([]);

export const readDispute = operation({
  name: 'readDispute',
  resource: 'disputes',
  method: 'GET',
  path: '/disputes/:dispute',
  summary: 'One dispute with its thread, the same for both companies',
  params: theDispute,
  answer: disputeDetail,
});

export const openingForm = z
  .object({
    subject: z.enum(subjects),
    /** Of a count: the shipment. Of a statement line: the shipment on which they came back, if any. */
    shipmentId: id.optional(),
    /** Left out: the shipment's first count. */
    countId: id.optional(),
    typeCode: code.optional(),
    lineId: id.optional(),
    /** How many the partner says it should be. */
    claimed: wholeUnits.optional(),
    /** Where units say nothing: how much of the amount is too much. */
    tooMuch: decimalString.optional(),
    reason: z.enum(disputeReasons),
    text: prose(4000),
    fileIds,
  })
  .refine((form) => form.subject !== 'count' || form.shipmentId !== undefined, needed('shipmentId'))
  .refine((form) => form.subject !== 'count' || form.typeCode !== undefined, needed('typeCode'))
  .refine((form) => form.subject !== 'count' || form.claimed !== undefined, needed('claimed'))
  .refine((form) => form.subject === 'count' || form.lineId !== undefined, needed('lineId'));
export type OpeningForm = z.output<typeof openingForm>;

const disputed = z.object({ id, state: z.enum(disputeStates) });

export const openDispute = operation({
  name: 'openDispute',
  resource: 'disputes',
  method: 'POST',
  path: '/disputes',
  summary: 'Dispute a count of an own shipment, or a line of an own statement',
  body: openingForm,
  answer: disputed.extend({ amountHeld: z.string() }),
});

export const answerSteps = ['accept', 'accept in part', 'ask', 'decline'] as const;

export const answerForm = z
  .object({
    step: z.enum(answerSteps),
    /** In part: so many of the units, or so much of the amount. */
    units: positiveUnits.optional(),
    amount: decimalString.optional(),
    text: proseOrEmpty(4000).default(''),
    fileIds,
    /** The last message that was read; another one in between is not answered unseen. */
    seenMessageId: id,
  })
  .refine((form) => form.step === 'accept' || form.text !== '', {
    ...needed('text'),
    message: 'Say why',
  });
export type AnswerForm = z.output<typeof answerForm>;

export const answerDispute = operation({
  name: 'answerDispute',
  resource: 'disputes',
  method: 'POST',
  path: '/disputes/:dispute/answers',
  summary: 'Accept in whole or part, which posts the correction; ask for more; decline with a reason',
  params: theDispute,
  body: answerForm,
  answer: disputed.extend({ acceptedUnits: units.nullable(), acceptedAmount: z.string().nullable() }),
});

export const replyToDispute = operation({
  name: 'replyToDispute',
  resource: 'disputes',
  method: 'POST',
  path: '/disputes/:dispute/replies',
  summary: 'Say more in an own dispute; the operator has the next word',
  params: theDispute,
  body: z.object({ text: prose(4000), fileIds }),
  answer: disputed,
});

export const withdrawDispute = operation({
  name: 'withdrawDispute',
  resource: 'disputes',
  method: 'POST',
  path: '/disputes/:dispute/withdrawal',
  summary: 'Withdraw an own dispute; what the book says stands',
  params: theDispute,
  body: z.object({ text: proseOrEmpty(4000).default('') }),
  answer: disputed,
});

export const downloadDisputeFile = operation({
  name: 'downloadDisputeFile',
  resource: 'disputes',
  method: 'GET',
  path: '/disputes/:dispute/files/:file',
  summary: 'A paper of the thread, for the two companies of the dispute',
  params: z.object({ dispute: id, file: id }),
  answers: 'file',
  answer: z.unknown(),
});

const countSubject = z.object({
  shipmentId: id,
  countId: id,
  reference: z.string(),
  from: z.string(),
  to: z.string(),
  countedOn: day,
  lines: z.array(
    z.object({
      typeCode: z.string(),
      typeName: z.string(),
      declared: units,
      counted: units,
      openDisputeId: id.nullable(),
    }),
  ),
});
export type CountSubject = z.infer<typeof countSubject>;

export const readCountSubject = operation({
  name: 'readCountSubject',
  resource: 'disputes',
  method: 'GET',
  path: '/dispute-subjects/shipments/:shipment',
  summary: 'What of a counted shipment can be disputed',
  params: z.object({ shipment: id }),
  answer: countSubject,
});

export const lineBlocks = ['objection over', 'confirmed', 'in dispute'] as const;
const lineSubject = z.object({
  lineId: id,
  statementId: id,
  statementNumber: z.string(),
  statementMonth: month,
  accountMonth: month,
  component: z.enum(lineComponents),
  typeCode: z.string().nullable(),
  typeName: z.string().nullable(),
  typeKind: z.enum(typeKinds).nullable(),
  quantity: units,
  amount: z.string(),
  currency: z.string(),
  /** Which way the units can be said to differ; null where only the money can be disputed. */
  way: z.enum(['fewer', 'more']).nullable(),
  objectionUntil: day.nullable(),
  blocked: z.enum(lineBlocks).nullable(),
  openDisputeId: id.nullable(),
  /** Own counted shipments that could have brought lost units back, newest first. */
  shipments: z.array(z.object({ id, reference: z.string(), leftOn: day })),
});
export type LineSubject = z.infer<typeof lineSubject>;

export const readLineSubject = operation({
  name: 'readLineSubject',
  resource: 'disputes',
  method: 'GET',
  path: '/dispute-subjects/lines/:line',
  summary: 'What of a statement line can be disputed, and until when',
  params: z.object({ line: id }),
  answer: lineSubject,
});
