import { z } from 'zod';
import { day } from '../domain/calendar';
import { positiveUnits, wholeUnits } from '../domain/quantity';
import { place } from './balances';
import { mostFilesOnOne, storedFile } from './files';
import { code, id, instant, line, proseOrEmpty } from './fields';
import { listQuery, pageOf } from './list';
import { operation } from './operation';

export const contents = z.enum(['empties', 'fulls']);
export const shipmentStates = ['on the way', 'counted'] as const;

/** One end of a shipment. */
export const shipmentEnd = z.object({
  siteId: id,
  site: z.string(),
  companyId: id,
  company: z.string(),
  timeZone: z.string(),
});

/** Declared and counted units of one type; `counted` is null until the receiver has counted. */
export const shipmentLine = z.object({
  typeCode: z.string(),
  typeName: z.string(),
  unitsPerStack: z.number().int(),
  declared: z.number().int(),
  counted: z.number().int().nullable(),
  /** The count as it stands by the book, where it was put right since; else as `counted`. */
  countedNow: z.number().int().nullable(),
  damaged: z.number().int(),
  dirty: z.number().int(),
  /** What is neither where it was declared nor settled; below 0 fewer came, above 0 more. */
  openUnits: z.number().int(),
});

export const shipmentRow = z.object({
  id,
  reference: z.string(),
  contents,
  from: shipmentEnd,
  to: shipmentEnd,
  leftOn: day,
  expectedOn: day,
  state: z.enum(shipmentStates),
  countedOn: day.nullable(),
  lines: z.array(shipmentLine),
  /** Whether the company that asks receives it, sends it, or only watches. */
  direction: z.enum(['in', 'out', 'between others']),
  mayCount: z.boolean(),
});
export type ShipmentRow = z.infer<typeof shipmentRow>;

export const shipmentSorts = ['leftOn', 'expectedOn'] as const;

const shipmentsQuery = listQuery.extend({
  direction: z.enum(['in', 'out']).optional(),
  state: z.enum([...shipmentStates, 'overdue', 'differs']).optional(),
  contents: contents.optional(),
  partner: id.optional(),
});

export const listShipments = operation({
  name: 'listShipments',
  resource: 'shipments',
  method: 'GET',
  path: '/shipments',
  summary: 'Shipments that the own company sends or receives; the operator sees all',
  query: shipmentsQuery,
  answer: pageOf(shipmentRow),
});

export const downloadShipments = operation({
  name: 'downloadShipments',
  resource: 'shipments',
  method: 'GET',
  path: '/shipments.xlsx',
  summary: 'The same list as a spreadsheet, a line for each container type',
  query: shipmentsQuery.omit({ after: true, limit: true }),
  answers: 'file',
  answer: z.unknown(),
});

const countRow = z.object({
  id,
  sequence: z.number().int(),
  countedOn: day,
  countedAt: instant,
  by: z.string().nullable(),
  source: z.enum(['person', 'import', 'automatic']),
  note: z.string(),
  lines: z.array(
    z.object({
      typeCode: z.string(),
      typeName: z.string(),
      counted: z.number().int(),
      damaged: z.number().int(),
      dirty: z.number().int(),
    }),
  ),
  photos: z.array(storedFile),
});

const settlementRow = z.object({
  way: z.string(),
  units: z.number().int(),
  reason: z.string(),
  by: z.string().nullable(),
  at: instant,
});
const differenceRow = z.object({
  id,
  typeCode: z.string(),
  typeName: z.string(),
  declared: z.number().int(),
  counted: z.number().int(),
  openUnits: z.number().int(),
  state: z.enum(['open', 'settled']),
  settlements: z.array(settlementRow),
});
const entryRow = z.object({
  id: z.number().int(),
  kind: z.string(),
  valueDate: day,
  recordedAt: instant,
  by: z.string().nullable(),
  reason: z.string(),
  lines: z.array(z.object({ typeName: z.string(), units: z.number().int(), from: place, to: place })),
});

export const shipmentDetail = shipmentRow.extend({
  note: z.string(),
  origin: z.enum(['form', 'import', 'unannounced']),
  sentBy: z.string().nullable(),
  counts: z.array(countRow),
  differences: z.array(differenceRow),
  entries: z.array(entryRow),
  /** The zone that times on this page are shown in: the receiver's site. */
  timeZone: z.string(),
});
export type ShipmentDetail = z.infer<typeof shipmentDetail>;

export const readShipment = operation({
  name: 'readShipment',
  resource: 'shipments',
  method: 'GET',
  path: '/shipments/:shipment',
  summary: 'One shipment: its lines, counts, differences and the entries behind it',
  params: z.object({ shipment: id }),
  answer: shipmentDetail,
});

const siteChoice = z.object({
  id,
  name: z.string(),
  companyId: id,
  company: z.string(),
  timeZone: z.string(),
});
const typeChoice = z.object({ code: z.string(), name: z.string(), unitsPerStack: z.number().int() });

export const listShipmentChoices = operation({
  name: 'listShipmentChoices',
  resource: 'shipments',
  method: 'GET',
  path: '/shipment-choices',
  summary: 'Sites a shipment can leave from and go to, container types, and what stands at the own sites',
  answer: z.object({
    contents,
    today: day,
    from: z.array(siteChoice),
    to: z.array(siteChoice),
    types: z.array(typeChoice),
    atSites: z.array(z.object({ siteId: id, typeCode: z.string(), units: z.number().int() })),
  }),
});

/** At most so many types on one shipment. */
export const mostLines = 40;

export const sendingForm = z.object({
  reference: line(40).optional(),
  fromSiteId: id,
  toSiteId: id,
  leftOn: day,
  expectedOn: day,
  lines: z
    .array(z.object({ typeCode: code, declared: positiveUnits }))
    .min(1, 'At least one line')
    .max(mostLines),
  note: proseOrEmpty(300).default(''),
});

export const sendShipment = operation({
  name: 'sendShipment',
  resource: 'shipments',
  method: 'POST',
  path: '/shipments',
  summary: 'Send empties to a partner, or announce fulls to a plant: who sends decides which',
  body: sendingForm,
  answer: z.object({ id, reference: z.string(), contents, toCompany: z.string() }),
});

export const countForm = z.object({
  lines: z
    .array(
      z.object({
        typeCode: code,
        counted: wholeUnits,
        damaged: wholeUnits.default(0),
        dirty: wholeUnits.default(0),
      }),
    )
    .min(1, 'At least one line')
    .max(mostLines),
  photoIds: z.array(id).max(mostFilesOnOne).default([]),
  note: proseOrEmpty(300).default(''),
});

export const countShipment = operation({
  name: 'countShipment',
  resource: 'shipments',
  method: 'POST',
  path: '/shipments/:shipment/counts',
  summary: 'Say what arrived, line by line; what differs from the declaration opens a difference',
  params: z.object({ shipment: id }),
  body: countForm,
  answer: z.object({
    id,
    shipmentId: id,
    reference: z.string(),
    countedAt: instant,
    differences: z.array(z.object({ typeCode: z.string(), typeName: z.string(), by: z.number().int() })),
  }),
});
