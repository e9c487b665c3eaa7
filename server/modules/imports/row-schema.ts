import { z } from 'zod';
import type { RowProblem, RowReason } from '@/shared/contracts/imports';
import { MOST_UNITS } from '@/shared/domain/quantity';
import type { SiteWithCompany } from '../partners/sites';
import type { BookFacts } from './book-facts';
import { readDay } from './read-day';

type Context = z.RefinementCtx;
type Data = RowProblem['data'];

function complain(context: Context, reason: RowReason, data: Data = {}): never {
  context.addIssue({ code: 'custom', message: reason, params: { data } });
  return z.NEVER;
}

const cell = (read: (text: string, context: Context) => unknown) =>
  z.string().transform((text, context) => (text === '' ? complain(context, 'empty') : read(text, context)));

const side = z.string().transform((text, context): 'shipment' | 'receipt' => {
  if (text === '') return complain(context, 'empty');
  const word = text.toLowerCase().replace(/s$/, '');
  return word === 'shipment' || word === 'receipt'
    ? word
    : complain(context, 'side unknown', { value: text });
});

const day = z.string().transform((text, context) => {
  if (text === '') return complain(context, 'empty');
  return readDay(text) ?? complain(context, 'not a day', { value: text });
});

const units = z.string().transform((text, context) => unitsOf(text, context) ?? complain(context, 'empty'));
const unitsOrNone = z.string().transform((text, context) => unitsOf(text, context) ?? 0);

/** Whole units as written without signs between the digits: "1,000" is 1000 to one reader and 1 to another. */
function unitsOf(text: string, context: Context): number | null {
  if (text === '') return null;
  if (/^-\d+([.,]\d+)?$/.test(text)) return complain(context, 'negative', { value: text });
  if (/^\d+[.,]\d{1,2}$/.test(text) || /^\d+[.,]\d{4,}$/.test(text))
    return complain(context, 'fraction', { value: text });
  if (!/^\d+$/.test(text)) return complain(context, 'not a number', { value: text });
  const value = Number(text);
  return value > MOST_UNITS ? complain(context, 'too many units', { value: text }) : value;
}

const reference = z.string().transform((text, context) => {
  if (/[\u0000-\u001f\u007f-\u009f\u2028\u2029]/.test(text)) return complain(context, 'not plain text');
  return text === '' ? null : text;
});

/** The schema of one row, against the sites, types and months of the book. */
export function rowSchemaFor(facts: BookFacts) {
  const site = cell(
    (text, context) =>
      facts.siteByCode(text.toUpperCase()) ?? complain(context, 'site unknown', { value: text }),
  ) as unknown as z.ZodType<SiteWithCompany, string>;
  const type = cell((text, context) => {
    const code = text.toUpperCase();
    return facts.isType(code) ? code : complain(context, 'type unknown', { value: text });
  }) as unknown as z.ZodType<string, string>;
  return z.object({
    side,
    reference,
    from: site,
    to: site,
    date: day,
    type,
    units,
    damaged: unitsOrNone,
    dirty: unitsOrNone,
  });
}

export type RowSchema = ReturnType<typeof rowSchemaFor>;
export type ParsedRow = z.output<RowSchema>;
