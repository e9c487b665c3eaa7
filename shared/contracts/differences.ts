import { z } from 'zod';
import { day } from '../domain/calendar';
import { positiveUnits } from '../domain/quantity';
import { typeKinds } from './container-types';
import { code, id, instant, needed, prose } from './fields';
import { storedFile } from './files';
import { listQuery, pageOf } from './list';
import { operation } from './operation';

export const differenceKinds = ['fewer', 'more', 'overdue', 'unannounced'] as const;

/** The ways a person can choose; "within tolerance" is a rule's. */
export const chosenWays = [
  'sender miscounted',
  'receiver miscounted',
  'lost on the way',
  'turned up later',
  'wrong type',
] as const;
export type ChosenWay = (typeof chosenWays)[number];
export const allWays = [...chosenWays, 'within tolerance'] as const;
export type SettlementWay = (typeof allWays)[number];

const end = z.object({ companyId: id, company: z.string(), site: z.string() });
const units = z.number().int();

export const differenceRow = z.object({
  /** Of the difference, of the shipment that is overdue, or of the receipt that was not announced. */
  id,
  kind: z.enum(differenceKinds),
  shipmentId: id.nullable(),
  importId: id.nullable(),
  reference: z.string().nullable(),
  from: end,
  to: end,
  /** What of it is open (or was settled), by type; always above 0, the kind says which way. */
  lines: z.array(
    z.object({ typeCode: z.string(), typeName: z.string(), typeKind: z.enum(typeKinds), units }),
  ),
  units,
  /** The day it began: of the count, or the day it left. */
  since: day,
  days: z.number().int(),
  /** Replacement value of what is open. */
  atStake: z.string(),
  currency: z.string(),
  state: z.enum(['open', 'settled']),
  ways: z.array(z.enum(allWays)),
  /** An undecided dispute over the same count and type. */
  disputeId: id.nullable(),
});
export type DifferenceRow = z.infer<typeof differenceRow>;

export const listDifferences = operation({
  name: 'listDifferences',
  resource: 'differences',
  method: 'GET',
  path: '/differences',
  summary:
    'What was declared and not counted, counted and not declared, overdue or unannounced; oldest first',
  query: listQuery.extend({
    kind: z.enum(differenceKinds).optional(),
    partner: id.optional(),
    type: code.optional(),
    state: z.enum(['open', 'settled']).default('open'),
  }),
  answer: pageOf(differenceRow),
});

const settlement = z.object({
  id,
  way: z.enum(allWays),
  units,
  bearer: z.string().nullable(),
  swappedWith: z.string().nullable(),
  reason: z.string(),
  by: z.string().nullable(),
  at: instant,
  entryId: z.number().int(),
});

export const differenceDetail = differenceRow.extend({
  declared: units,
  counted: units,
  /** Below 0 fewer came, above 0 more; 0 when settled. */
  openUnits: units,
  count: z.object({
    countedOn: day,
    countedAt: instant,
    by: z.string().nullable(),
    source: z.enum(['person', 'import', 'automatic']),
    note: z.string(),
    photos: z.array(storedFile),
  }),
  /** What the matching of a file found, where the count came from one. */
  matching: z.array(z.object({ rule: z.string(), why: z.string(), receipt: z.string().nullable() })),
  settlements: z.array(settlement),
  /** Open differences of the same shipment the other way round: what it may have been taken for. */
  swaps: z.array(z.object({ id, typeName: z.string(), openUnits: units })),
  bearers: z.array(
    z.object({
      companyId: id,
      company: z.string(),
      kind: z.enum(['operator', 'partner']),
      side: z.enum(['sender', 'receiver']),
    }),
  ),
  /** The ways that fit; empty for who may not settle. */
  choices: z.array(z.enum(chosenWays)),
  timeZone: z.string(),
});
export type DifferenceDetail = z.infer<typeof differenceDetail>;

const theDifference = z.object({ difference: id });

export const readDifference = operation({
  name: 'readDifference',
  resource: 'differences',
  method: 'GET',
  path: '/differences/:difference',
  summary: 'One difference: both sides, the count and its photos, how it was settled and can be',
  params: theDifference,
  answer: differenceDetail,
});

export const settlingForm = z
  .object({
    way: z.enum(chosenWays),
    units: positiveUnits,
    reason: prose(500),
    bearerCompanyId: id.optional(),
    swapWithId: id.optional(),
  })
  .refine((form) => form.way !== 'lost on the way' || form.bearerCompanyId !== undefined, {
    ...needed('bearerCompanyId'),
    message: 'Say who bears the loss',
  })
  .refine((form) => form.way !== 'wrong type' || form.swapWithId !== undefined, {
    ...needed('swapWithId'),
    message: 'Say which type it was taken for',
  });

export const settleDifference = operation({
  name: 'settleDifference',
  resource: 'differences',
  method: 'POST',
  path: '/differences/:difference/settlements',
  summary: 'Settle a difference, or part of it, one of five ways, with a reason',
  params: theDifference,
  body: settlingForm,
  answer: z.object({ id, way: z.enum(chosenWays), units, openUnits: units, entryId: z.number().int() }),
});

/** The choices of the list's filters. */
export const listDifferenceChoices = operation({
  name: 'listDifferenceChoices',
  resource: 'differences',
  method: 'GET',
  path: '/difference-choices',
  summary: 'Partners and container types that the list of differences can be narrowed to',
  answer: z.object({
    partners: z.array(z.object({ id, name: z.string() })),
    types: z.array(z.object({ code: z.string(), name: z.string() })),
  }),
});
