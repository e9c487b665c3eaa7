import { z } from 'zod';
import { day } from '../domain/calendar';
import { positiveUnits } from '../domain/quantity';
import { code, id, instant, prose } from './fields';
import { listQuery, pageOf } from './list';
import { operation } from './operation';

export const placeKinds = ['site', 'transit', 'bought', 'scrapped', 'lost', 'found', 'opening'] as const;

/** Where units stand: a site by its name, a shipment by its reference, or outside the loop. */
export const place = z.object({ kind: z.enum(placeKinds), name: z.string().nullable() });
export type Place = z.infer<typeof place>;

/**
 * Where a company's units of a type are. `sent` and `toIt` are on the way and not counted; `sentDiffers` and `toItDiffers`
 * are what lies between declaration and count and is not settled (below 0: more came than was declared).
 */
export const balanceParts = ['atSites', 'sent', 'sentDiffers', 'toIt', 'toItDiffers'] as const;
export type BalancePart = (typeof balanceParts)[number];

const units = z.number().int();
export const balanceRow = z.object({
  companyId: id,
  company: z.string(),
  kind: z.enum(['operator', 'partner']),
  typeCode: z.string(),
  typeName: z.string(),
  atSites: units,
  sent: units,
  sentDiffers: units,
  toIt: units,
  toItDiffers: units,
  /** Units without regard to sign: 8 fewer of one and 3 more of another are 11 in question. */
  inQuestion: units,
  /** What the company answers for (RULES 2): at its sites, and what it sent until that is counted and settled. */
  held: units,
});
export type BalanceRow = z.infer<typeof balanceRow>;

const balancesQuery = listQuery.extend({
  asOf: day.optional(),
  company: id.optional(),
  type: code.optional(),
});

export const listBalances = operation({
  name: 'listBalances',
  resource: 'balances',
  method: 'GET',
  path: '/balances',
  summary: 'Units by company and container type, now or at the end of a day',
  query: balancesQuery,
  answer: pageOf(balanceRow).extend({ asOf: day.nullable(), today: day }),
});

export const downloadBalances = operation({
  name: 'downloadBalances',
  resource: 'balances',
  method: 'GET',
  path: '/balances.xlsx',
  summary: 'The same list as a spreadsheet',
  query: balancesQuery.omit({ after: true, limit: true }),
  answers: 'file',
  answer: z.unknown(),
});

export const readBalance = operation({
  name: 'readBalance',
  resource: 'balances',
  method: 'GET',
  path: '/balances/:company/:type',
  summary: 'Units of one type that one company answers for, site by site',
  params: z.object({ company: id, type: code }),
  query: z.object({
    asOf: day.optional(),
    /** As it was known at this instant: entries recorded later are left out. */
    knownAt: instant.optional(),
  }),
  answer: balanceRow.extend({
    asOf: day.nullable(),
    today: day,
    sites: z.array(z.object({ siteId: id, site: z.string(), units })),
  }),
});

export const movementRow = z.object({
  /** Entry and line: "1204-2". */
  id: z.string(),
  entryId: z.number().int(),
  kind: z.string(),
  valueDate: day,
  recordedAt: instant,
  /** Into the place that is asked about (above 0) or out of it. */
  units,
  from: place,
  to: place,
  shipment: z.object({ id, reference: z.string() }).nullable(),
  by: z.string().nullable(),
  reason: z.string(),
  correctsEntryId: z.number().int().nullable(),
  /** An adjustment that was not taken back yet and may be. */
  mayReverse: z.boolean(),
});
export type MovementRow = z.infer<typeof movementRow>;

export const listMovements = operation({
  name: 'listMovements',
  resource: 'balances',
  method: 'GET',
  path: '/balances/:company/:type/movements',
  summary: 'The ledger lines that add up to one part of a balance, newest first',
  params: z.object({ company: id, type: code }),
  query: listQuery.extend({
    part: z.enum(balanceParts).default('atSites'),
    site: id.optional(),
    asOf: day.optional(),
  }),
  answer: pageOf(movementRow),
});

export const adjustmentKinds = ['bought', 'scrapped', 'found', 'lost', 'opening'] as const;
export type AdjustmentKind = (typeof adjustmentKinds)[number];

export const adjustmentForm = z.object({
  kind: z.enum(adjustmentKinds),
  siteId: id,
  typeCode: code,
  units: positiveUnits,
  /** The day it happened, in the site's time zone. */
  on: day,
  reason: prose(500),
});

export const adjustStock = operation({
  name: 'adjustStock',
  resource: 'balances',
  method: 'POST',
  path: '/adjustments',
  summary: 'Book units bought, scrapped, found, lost or there from the start, at a site',
  body: adjustmentForm,
  answer: z.object({ entryId: z.number().int(), units }),
});

export const reversalForm = z.object({ reason: prose(500) });

export const reverseEntry = operation({
  name: 'reverseEntry',
  resource: 'balances',
  method: 'POST',
  path: '/entries/:entry/reversals',
  summary: 'Take back an adjustment by an entry that names it, on the same day',
  params: z.object({ entry: z.coerce.number().int().positive().max(Number.MAX_SAFE_INTEGER) }),
  body: reversalForm,
  answer: z.object({ entryId: z.number().int(), correctsEntryId: z.number().int() }),
});

export const listAdjustmentChoices = operation({
  name: 'listAdjustmentChoices',
  resource: 'balances',
  method: 'GET',
  path: '/adjustment-choices',
  summary: 'Sites and container types that an adjustment can name',
  answer: z.object({
    today: day,
    sites: z.array(z.object({ id, name: z.string(), company: z.string(), own: z.boolean() })),
    types: z.array(z.object({ code: z.string(), name: z.string() })),
  }),
});
