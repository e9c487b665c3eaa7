import fc from 'fast-check';
import { z } from 'zod';

type Schema = {
  type?: string;
  format?: string;
  pattern?: string;
  enum?: unknown[];
  const?: unknown;
  anyOf?: Schema[];
  oneOf?: Schema[];
  properties?: Record<string, Schema>;
  required?: string[];
  items?: Schema;
  minimum?: number;
  maximum?: number;
  additionalProperties?: boolean | Schema;
  propertyNames?: Schema;
};

export const schemaOf = (schema: z.ZodType, io: 'input' | 'output' = 'input'): Schema =>
  z.toJSONSchema(schema, { io, unrepresentable: 'any' }) as Schema;

/** Text that has broken some program or other: SQL, markup, formulas, line ends, odd Unicode, too much. */
export const hostileText = [
  `'; DROP TABLE ledger_lines; --`,
  `1' OR '1'='1`,
  '" OR SLEEP(5)#',
  '<script>alert(1)</script>',
  '{{7*7}}${7*7}',
  '=1+1',
  '../../etc/passwd',
  'a\r\nBcc: x@evil.example',
  'nul\u0000byte',
  '\ud800',
  '𝔘𝔫𝔦𝔠𝔬𝔡𝔢 👩‍👩‍👧 ‮abc',
  '%',
  '\\',
  '%E0%A4%A',
  'x'.repeat(5000),
  '',
];
export const hostileNumbers = [0, -1, 1, 0.1, 2 ** 31, 2 ** 53, -(2 ** 63), 1e308, 999_999_999];
const hostileDays = [
  '2026-03-20',
  '2026-02-30',
  '0000-00-00',
  '9999-12-31',
  '1000-01-01',
  '2026-03-20T00:00',
];
const junk = fc.constantFrom<unknown>(
  null,
  true,
  [],
  {},
  [[[[]]]],
  { __proto__: { role: 'administrator' } },
  { constructor: { prototype: { a: 1 } } },
  '',
  'NaN',
  -0,
  1e308,
);

/** Values that mostly fit the schema and are of ill will where it leaves room; `ids` stand for real things. */
export function illWilled(schema: Schema, ids: readonly string[]): fc.Arbitrary<unknown> {
  const fitting = fittingTo(schema, ids);
  return fc.oneof({ arbitrary: fitting, weight: 30 }, { arbitrary: junk, weight: 1 });
}

function fittingTo(schema: Schema, ids: readonly string[]): fc.Arbitrary<unknown> {
  const choices = schema.anyOf ?? schema.oneOf;
  if (choices) return fc.oneof(...choices.map((choice) => illWilled(choice, ids)));
  if (schema.const !== undefined) return fc.constant(schema.const);
  if (schema.enum) return fc.constantFrom(...schema.enum);
  if (schema.type === 'object') return objectOf(schema, ids);
  if (schema.type === 'array') return fc.array(illWilled(schema.items ?? {}, ids), { maxLength: 3 });
  if (schema.type === 'boolean') return fc.boolean();
  if (schema.type === 'integer' || schema.type === 'number') return numberWithin(schema);
  if (schema.type === 'null') return fc.constant(null);
  return textFor(schema, ids);
}

function objectOf({ properties = {}, required = [] }: Schema, ids: readonly string[]): fc.Arbitrary<unknown> {
  const fields = Object.entries(properties).map(([name, part]) => [name, illWilled(part, ids)] as const);
  const extra = { role: fc.constant('administrator'), companyId: fc.constantFrom('x', ...ids) };
  return fc.record({ ...Object.fromEntries(fields), ...extra }, { requiredKeys: required as never[] });
}

function numberWithin({ minimum, maximum }: Schema): fc.Arbitrary<number> {
  const edges = [minimum, maximum].filter((edge) => edge !== undefined);
  return fc.oneof(fc.integer({ min: 1, max: 20 }), fc.constantFrom(...hostileNumbers, ...edges));
}

function textFor({ format, pattern }: Schema, ids: readonly string[]): fc.Arbitrary<unknown> {
  const hostile = fc.constantFrom(...hostileText);
  if (format === 'uuid')
    return fc.oneof({ arbitrary: fc.constantFrom(...ids), weight: 9 }, fc.uuid(), hostile);
  if (format === 'date' || pattern?.includes('d{4}'))
    return fc.constantFrom(...hostileDays, '2026-02', '2026-03');
  if (format === 'email') return fc.constantFrom('new@kind.example', ...hostileText);
  return fc.oneof(
    hostile,
    fc.constantFrom('1', '2.50', '0.000001', 'TOTE-64', 'UTC', 'EUR', 'NaN', '1e3', '-0'),
  );
}

/** Keys of a page as lists give them out, and what someone would send instead. */
export const hostileKeys = [
  ['x'],
  ['NaN', '1'],
  ["'", '"'],
  ['é', '👩'],
  ['1', '2', '3'],
  ['9'.repeat(15)],
].map((parts) => Buffer.from(JSON.stringify(parts)).toString('base64url'));
export const plainKeys = [
  'x',
  'NaN NaN',
  '1 x',
  '2026-03-20_x',
  '2026-02-30 é',
  '-1',
  '9'.repeat(40),
  'e30',
  'bnVsbA',
];

/** Every node of a schema with its path. */
export function nodesOf(
  schema: Schema,
  path: readonly string[] = [],
): { path: readonly string[]; node: Schema }[] {
  const parts = [
    ...Object.entries(schema.properties ?? {}),
    ...(schema.items ? [['0', schema.items] as const] : []),
  ].flatMap(([name, part]) => nodesOf(part, [...path, name]));
  const choices = [...(schema.anyOf ?? []), ...(schema.oneOf ?? [])].flatMap((choice) =>
    nodesOf(choice, path),
  );
  return [{ path, node: schema }, ...parts, ...choices];
}
