import { z } from 'zod';
import { id, instant } from './fields';
import { listQuery, pageOf } from './list';
import { operation } from './operation';

/** The columns of the template, in its order. Their heads in words stand in the text catalogue. */
export const importColumns = [
  'side',
  'reference',
  'from',
  'to',
  'date',
  'type',
  'units',
  'damaged',
  'dirty',
] as const;
export type ImportColumn = (typeof importColumns)[number];
/** These every file must have; the others may be left out. */
export const neededColumns = ['side', 'reference', 'from', 'to', 'date', 'type', 'units'] as const;

/** Rows that one file may hold below its head. */
export const mostImportRows = 20_000;

export const rowReasons = [
  'empty',
  'side unknown',
  'reference missing',
  'too long',
  'not plain text',
  'site unknown',
  'same site',
  'type unknown',
  'no terms',
  'not a day',
  'future',
  'month closed',
  'not a number',
  'negative',
  'fraction',
  'nothing declared',
  'too many units',
  'more than counted',
  'only for receipts',
  'same reference, other shipment',
  'type twice',
] as const;
export type RowReason = (typeof rowReasons)[number];

/** What is wrong with one cell; `data` holds what the sentence needs, such as the row that it clashes with. */
export const rowProblem = z.object({
  column: z.enum(importColumns),
  reason: z.enum(rowReasons),
  data: z.record(z.string(), z.union([z.string(), z.number()])),
});
export type RowProblem = z.infer<typeof rowProblem>;

export const importCells = z.record(z.enum(importColumns), z.string());
export type ImportCells = z.infer<typeof importCells>;

export const importStates = ['preview', 'running', 'done', 'failed', 'dropped'] as const;
export type ImportState = (typeof importStates)[number];

const whole = z.number().int();

export const importRow = z.object({
  id,
  fileName: z.string(),
  state: z.enum(importStates),
  rowsGood: whole,
  rowsBad: whole,
  by: z.string().nullable(),
  createdAt: instant,
});
export type ImportRow = z.infer<typeof importRow>;

export const listImports = operation({
  name: 'listImports',
  resource: 'imports',
  method: 'GET',
  path: '/imports',
  summary: 'Files of shipments and receipts that were brought in, newest first',
  query: listQuery.extend({ state: z.enum(importStates).optional() }),
  answer: pageOf(importRow),
});

export const importTemplate = operation({
  name: 'importTemplate',
  resource: 'imports',
  method: 'GET',
  path: '/import-template',
  summary: 'The file to fill in, with two shipments and their receipts as examples',
  query: z.object({ as: z.enum(['csv', 'xlsx']) }),
  answers: 'file',
  answer: z.unknown(),
});

export const uploadImport = operation({
  name: 'uploadImport',
  resource: 'imports',
  method: 'POST',
  path: '/imports',
  summary: 'Read a file (CSV or XLSX, field "file") and keep its rows for a preview; nothing is posted',
  sends: 'files',
  answer: z.object({ id, rowsGood: whole, rowsBad: whole }),
});

/** What the good rows add up to. */
export const importTotals = z.object({
  shipments: whole,
  receipts: whole,
  declared: whole,
  counted: whole,
  firstDay: z.string().nullable(),
  lastDay: z.string().nullable(),
});
export type ImportTotals = z.infer<typeof importTotals>;

/** Numbers of the result by what they open. */
export const importNumbers = z.object({
  shipments: z.object({ posted: whole, known: whole, refused: whole }),
  /** Matches by rule; "not posted" apart. */
  matches: z.array(z.object({ rule: z.string(), groups: whole })),
  notPosted: whole,
  offered: whole,
  accepted: whole,
  refused: whole,
  duplicates: whole,
  unannounced: whole,
  booked: whole,
  /** Shipments of the whole book that nobody has counted, and how many of them are overdue. */
  onTheWay: whole,
  overdue: whole,
});
export type ImportNumbers = z.infer<typeof importNumbers>;

export const importDetail = importRow.extend({
  totals: importTotals,
  progress: z.object({ done: whole, of: whole }).nullable(),
  /** The posting broke off and will not go on by itself. */
  broken: z.boolean(),
  confirmedBy: z.string().nullable(),
  confirmedAt: instant.nullable(),
  endedAt: instant.nullable(),
  numbers: importNumbers.nullable(),
});
export type ImportDetail = z.infer<typeof importDetail>;

const theImport = z.object({ import: id });

export const readImport = operation({
  name: 'readImport',
  resource: 'imports',
  method: 'GET',
  path: '/imports/:import',
  summary: 'One file: how far it is, and what came of it in numbers',
  params: theImport,
  answer: importDetail,
});

export const importFileRow = z.object({
  rowNo: whole,
  cells: importCells,
  problems: z.array(rowProblem),
});
export type ImportFileRow = z.infer<typeof importFileRow>;

export const listImportRows = operation({
  name: 'listImportRows',
  resource: 'imports',
  method: 'GET',
  path: '/imports/:import/rows',
  summary: 'Rows of a file as they were read, the bad ones first',
  params: theImport,
  query: listQuery.extend({ only: z.enum(['bad', 'good']).optional() }),
  answer: pageOf(importFileRow),
});

export const downloadBadRows = operation({
  name: 'downloadBadRows',
  resource: 'imports',
  method: 'GET',
  path: '/imports/:import/bad-rows',
  summary: 'The bad rows as CSV, with what is wrong in a column of its own',
  params: theImport,
  answers: 'file',
  answer: z.unknown(),
});

export const confirmImport = operation({
  name: 'confirmImport',
  resource: 'imports',
  method: 'POST',
  path: '/imports/:import/confirmation',
  summary: 'Post the good rows; leaving bad ones out has to be said by their number',
  params: theImport,
  body: z.object({ leaveOut: whole.min(0) }),
  answer: z.object({ id, state: z.enum(importStates) }),
});

export const dropImport = operation({
  name: 'dropImport',
  resource: 'imports',
  method: 'POST',
  path: '/imports/:import/drop',
  summary: 'Put a file aside without posting anything of it',
  params: theImport,
  answer: z.object({ id, state: z.enum(importStates) }),
});
