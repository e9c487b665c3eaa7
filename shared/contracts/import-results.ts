import { z } from 'zod';
import { day } from '../domain/calendar';
import { problemStatus, type ProblemCode } from '../problems/problems';
import { id } from './fields';
import { listQuery, pageOf } from './list';
import { operation } from './operation';

const whole = z.number().int();
const theImport = z.object({ import: id });
const problemCode = z.enum(Object.keys(problemStatus) as [ProblemCode, ...ProblemCode[]]);
/** Why something was not posted, for the catalogue of problems. */
export const notPostedWhy = z.object({ code: problemCode, data: z.record(z.string(), z.unknown()) });

export const documentOutcomes = ['posted', 'known', 'refused'] as const;

export const importDocument = z.object({
  rowNo: whole,
  reference: z.string(),
  outcome: z.enum(documentOutcomes),
  shipmentId: id.nullable(),
  problem: notPostedWhy.nullable(),
});
export type ImportDocument = z.infer<typeof importDocument>;

export const listImportShipments = operation({
  name: 'listImportShipments',
  resource: 'imports',
  method: 'GET',
  path: '/imports/:import/shipments',
  summary: 'What became of each shipment of a file',
  params: theImport,
  query: listQuery.extend({ outcome: z.enum(documentOutcomes).optional() }),
  answer: pageOf(importDocument),
});

const unitsOfType = z.object({ typeCode: z.string(), units: whole });

/** A shipment or receipt as it stands on one side of a match. */
export const matchPaper = z.object({
  id,
  reference: z.string().nullable(),
  from: z.string(),
  to: z.string(),
  day,
  lines: z.array(unitsOfType),
});
export type MatchPaper = z.infer<typeof matchPaper>;

export const matchStates = ['matched', 'not posted', 'offered', 'accepted', 'refused', 'fell away'] as const;
export type MatchState = (typeof matchStates)[number];

export const importMatch = z.object({
  id,
  state: z.enum(matchStates),
  rule: z.string(),
  /** 0 to 1. */
  score: z.number(),
  why: z.string(),
  shipments: z.array(matchPaper),
  receipts: z.array(matchPaper),
  differences: z.array(z.object({ typeCode: z.string(), declared: whole, counted: whole })),
  problem: notPostedWhy.nullable(),
  decidedBy: z.string().nullable(),
});
export type ImportMatch = z.infer<typeof importMatch>;

export const listImportMatches = operation({
  name: 'listImportMatches',
  resource: 'imports',
  method: 'GET',
  path: '/imports/:import/matches',
  summary: 'Shipments and receipts that were put together or are offered, side by side',
  params: theImport,
  query: listQuery.extend({
    state: z.enum(matchStates).default('matched'),
    rule: z.string().max(24).optional(),
  }),
  answer: pageOf(importMatch),
});

export const receiptStates = ['duplicate', 'unannounced', 'booked'] as const;

export const importReceipt = matchPaper.extend({
  state: z.enum(receiptStates),
  rowNo: whole,
  /** Of a double entry: the receipt that was kept. */
  first: z.object({ reference: z.string().nullable(), day, rowNo: whole }).nullable(),
  /** The shipment that the first was counted for, that someone had counted before, or that it was booked as. */
  shipment: z.object({ id, reference: z.string() }).nullable(),
});
export type ImportReceipt = z.infer<typeof importReceipt>;

export const listImportReceipts = operation({
  name: 'listImportReceipts',
  resource: 'imports',
  method: 'GET',
  path: '/imports/:import/receipts',
  summary:
    'Receipts of a file that no shipment was counted by: double entries, unannounced, booked as unannounced',
  params: theImport,
  query: listQuery.extend({ state: z.enum(receiptStates) }),
  answer: pageOf(importReceipt),
});

const skipped = z.array(z.object({ id, problem: notPostedWhy }));

export const decideSuggestions = operation({
  name: 'decideSuggestions',
  resource: 'imports',
  method: 'POST',
  path: '/import-suggestions',
  summary: 'Accept suggestions, which counts their shipments, or refuse them',
  body: z.object({
    decision: z.enum(['accept', 'refuse']),
    suggestions: z.array(id).min(1).max(100),
  }),
  answer: z.object({ decided: whole, skipped }),
});

export const bookUnannounced = operation({
  name: 'bookUnannounced',
  resource: 'imports',
  method: 'POST',
  path: '/import-receipts/booking',
  summary: 'Book receipts that nobody declared: what was counted and not declared becomes differences',
  body: z.object({ receipts: z.array(id).min(1).max(100) }),
  answer: z.object({ booked: whole, skipped }),
});
