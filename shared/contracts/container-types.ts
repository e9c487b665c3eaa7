import { z } from 'zod';
import { day } from '../domain/calendar';
import { graiAssetType } from '../domain/identification';
import { code, line, lineOrEmpty } from './fields';
import { listQuery, pageOf } from './list';
import { measure } from './measures';
import { operation } from './operation';

export const typeKinds = ['tote', 'lid', 'pallet', 'box', 'rack'] as const;
export type TypeKind = (typeof typeKinds)[number];

const millimetres = z.int().min(1).max(20_000);
/** What an engineer states of a type; figures as they stand on the maker's plate and in the drawing. */
export const containerTypeForm = z.object({
  code,
  name: line(80),
  kind: z.enum(typeKinds),
  lengthMm: millimetres,
  widthMm: millimetres,
  heightMm: millimetres,
  tareKg: measure({ decimals: 3, most: '20000', like: '2.1' }),
  payloadKg: measure({ decimals: 1, most: '100000', like: '25' }),
  stackLimit: z.int().min(1).max(200),
  unitsPerStack: z.int().min(1).max(1000),
  graiAssetType: z.union([z.literal(''), graiAssetType], {
    error: 'Not a GRAI asset type: 13 digits, the last a check digit',
  }),
  inServiceFrom: day,
  replacement: measure({ decimals: 4, most: '100000000', like: '18.00' }),
  usefulLifeMonths: z.int().min(1).max(1200),
  note: lineOrEmpty(300),
  packedWith: z.array(z.object({ typeCode: code, quantity: z.int().min(1).max(10_000) })).max(12),
});

export const containerTypeChange = containerTypeForm.omit({ code: true }).extend({ active: z.boolean() });

const typeRow = z.object({
  code: z.string(),
  name: z.string(),
  kind: z.enum(typeKinds),
  lengthMm: z.int(),
  widthMm: z.int(),
  heightMm: z.int(),
  tareKg: z.string(),
  payloadKg: z.string(),
  stackLimit: z.int(),
  unitsPerStack: z.int(),
  active: z.boolean(),
});
export type ContainerTypeRow = z.infer<typeof typeRow>;

const packedType = z.object({ code: z.string(), name: z.string(), quantity: z.int() });

const containerType = typeRow.extend({
  graiAssetType: z.string().nullable(),
  inServiceFrom: z.string(),
  /** Movements are assessed by this day, so it stands. */
  inServiceFixed: z.boolean(),
  replacement: z.string(),
  currency: z.string(),
  usefulLifeMonths: z.int(),
  note: z.string(),
  /** One of this type is packed with so many of those. */
  packedWith: z.array(packedType),
  partOf: z.array(packedType),
  /** Kilograms, reckoned from the figures entered. */
  loads: z.object({ grossKg: z.string(), stackKg: z.string(), onLowestKg: z.string() }),
  /** How many stand side by side on one layer of each pallet type; by outer measures alone. */
  onPallets: z.array(z.object({ code: z.string(), name: z.string(), perLayer: z.int() })),
});
export type ContainerType = z.infer<typeof containerType>;

const typeParams = z.object({ type: code });

const typesQuery = listQuery.extend({
  kind: z.enum(typeKinds).optional(),
  use: z.enum(['in use', 'out of use']).optional(),
});

export const listContainerTypes = operation({
  name: 'listContainerTypes',
  resource: 'container-types',
  method: 'GET',
  path: '/container-types',
  summary: 'Container types by name',
  query: typesQuery,
  answer: pageOf(typeRow),
});

export const downloadContainerTypes = operation({
  name: 'downloadContainerTypes',
  resource: 'container-types',
  method: 'GET',
  path: '/container-types.xlsx',
  summary: 'The same list as a spreadsheet',
  query: typesQuery.omit({ after: true, limit: true }),
  answers: 'file',
  answer: z.unknown(),
});

export const readContainerType = operation({
  name: 'readContainerType',
  resource: 'container-types',
  method: 'GET',
  path: '/container-types/:type',
  summary: 'One container type with what is reckoned from its figures',
  params: typeParams,
  answer: containerType,
});

export const addContainerType = operation({
  name: 'addContainerType',
  resource: 'container-types',
  method: 'POST',
  path: '/container-types',
  summary: 'Add a container type',
  body: containerTypeForm,
  answer: z.object({ id: code }),
});

export const changeContainerType = operation({
  name: 'changeContainerType',
  resource: 'container-types',
  method: 'PUT',
  path: '/container-types/:type',
  summary: 'Change a container type, or take it out of use',
  params: typeParams,
  body: containerTypeChange,
  answer: z.object({ id: code }),
});
