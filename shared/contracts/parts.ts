import { z } from 'zod';
import { code, id, line } from './fields';
import { listQuery, pageOf } from './list';
import { measure } from './measures';
import { operation } from './operation';

/** Parts a working day; up to a thousand million, six decimals. */
const partsPerDay = measure({ decimals: 6, most: '1000000000', like: '1760' });

/** A packing specification: which part travels in which type, between whom, and how many a working day. */
export const partForm = z.object({
  number: line(40),
  name: line(120),
  typeCode: code,
  supplierSiteId: id,
  plantSiteId: id,
  unitsPerContainer: z.int().min(1).max(1_000_000),
  unitsPerDayMean: partsPerDay,
  unitsPerDaySd: partsPerDay,
});
export const partChange = partForm.extend({ active: z.boolean() });

const siteName = z.object({ id, name: z.string(), company: z.string() });
const partRow = z.object({
  id,
  number: z.string(),
  name: z.string(),
  type: z.object({ code: z.string(), name: z.string() }),
  supplierSite: siteName,
  plantSite: siteName,
  unitsPerContainer: z.int(),
  unitsPerDayMean: z.string(),
  unitsPerDaySd: z.string(),
  /** Mean ÷ units per container. */
  containersPerDay: z.number(),
  active: z.boolean(),
});
export type PartRow = z.infer<typeof partRow>;

const partParams = z.object({ part: id });

const partsQuery = listQuery.extend({
  type: code.optional(),
  use: z.enum(['in use', 'out of use']).optional(),
});

export const listParts = operation({
  name: 'listParts',
  resource: 'parts',
  method: 'GET',
  path: '/parts',
  summary: 'Packing specifications by part number',
  query: partsQuery,
  answer: pageOf(partRow),
});

export const downloadParts = operation({
  name: 'downloadParts',
  resource: 'parts',
  method: 'GET',
  path: '/parts.xlsx',
  summary: 'The same list as a spreadsheet',
  query: partsQuery.omit({ after: true, limit: true }),
  answers: 'file',
  answer: z.unknown(),
});

export const readPart = operation({
  name: 'readPart',
  resource: 'parts',
  method: 'GET',
  path: '/parts/:part',
  summary: 'One packing specification',
  params: partParams,
  answer: partRow,
});

export const listPartChoices = operation({
  name: 'listPartChoices',
  resource: 'parts',
  method: 'GET',
  path: '/part-choices',
  summary: 'Types, supplier sites and plant sites that a part can be given',
  answer: z.object({
    types: z.array(z.object({ code: z.string(), name: z.string() })),
    supplierSites: z.array(siteName),
    plantSites: z.array(siteName),
  }),
});

export const addPart = operation({
  name: 'addPart',
  resource: 'parts',
  method: 'POST',
  path: '/parts',
  summary: 'Add a packing specification',
  body: partForm,
  answer: z.object({ id }),
});

export const changePart = operation({
  name: 'changePart',
  resource: 'parts',
  method: 'PUT',
  path: '/parts/:part',
  summary: 'Change a packing specification, or take it out of use',
  params: partParams,
  body: partChange,
  answer: z.object({ id }),
});
