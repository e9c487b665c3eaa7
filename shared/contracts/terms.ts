import { z } from 'zod';
import { day } from '../domain/calendar';
import { currencyCode } from '../domain/currencies';
import { compare, decimalString } from '../domain/money';
import { code, id } from './fields';
import { listQuery, pageOf } from './list';
import { operation } from './operation';

/** An amount or fee below 10^12 with at most so many decimals; whole minor units are checked by the currency. */
const upTo = (decimals: number, message: string) =>
  decimalString.refine((value) => new RegExp(`^\\d{1,12}(\\.\\d{1,${decimals}})?$`).test(value), {
    error: message,
  });
const amount = upTo(4, 'An amount like 4.50, without more decimals than the currency has');
const fee = upTo(6, 'A fee like 0.03, with at most six decimals');
const percent = fee.refine((value) => compare(value, '100') <= 0, { error: 'A percentage from 0 to 100' });
const days = (most: number) => z.int().min(0).max(most);

/** All that RULES 3 needs to know of one type; a new version starts on a day and changes nothing before it. */
export const termsVersion = z.object({
  typeCode: code,
  validFrom: day,
  deposit: amount,
  replacement: amount,
  freeDays: days(3650),
  dailyFee: fee,
  lostAfterDays: days(3650).nullable(),
  usefulLifeMonths: z.int().min(1).max(1200),
  residualFloorPct: percent,
  damageFee: fee,
  cleaningFee: fee,
  recoveryDays: days(3650),
});
export type TermsVersion = z.infer<typeof termsVersion>;

/** What holds for the partner as a whole. */
export const partnerTerms = z.object({
  currency: currencyCode,
  taxRate: percent,
  taxTreatment: z.enum(['excluded', 'included']),
  objectionDays: z.int().min(1).max(365),
  autoCountDays: z.int().min(1).max(365),
  toleranceUnits: days(1_000_000),
  tolerancePct: percent,
});
export type PartnerTerms = z.infer<typeof partnerTerms>;

const partnerName = z.object({ id, code: z.string(), name: z.string() });
const partnerParams = z.object({ partner: id });

export const listTerms = operation({
  name: 'listTerms',
  resource: 'terms',
  method: 'GET',
  path: '/terms',
  summary: 'Partners with what holds for each, and how many types have terms today',
  query: listQuery,
  answer: pageOf(
    z.object({
      partner: partnerName,
      settings: partnerTerms,
      /** Types with terms in force today. */
      typesInForce: z.int(),
      /** Types that the partner has had in hand and that have no terms today. */
      typesWithout: z.array(z.string()),
      /** The next day on which a version starts, if any is ahead. */
      nextChange: z.string().nullable(),
    }),
  ),
});

const typeTerms = z.object({
  type: z.object({ code: z.string(), name: z.string(), kind: z.string() }),
  /** Newest first. */
  versions: z.array(
    termsVersion.extend({
      id,
      standing: z.enum(['earlier', 'in force', 'ahead']),
      setBy: z.string().nullable(),
      setAt: z.string(),
    }),
  ),
});

export const readPartnerTerms = operation({
  name: 'readPartnerTerms',
  resource: 'terms',
  method: 'GET',
  path: '/terms/:partner',
  summary: 'All terms of a partner: what holds for it as a whole, and every version by type',
  params: partnerParams,
  answer: z.object({
    partner: partnerName,
    settings: partnerTerms,
    types: z.array(typeTerms),
    /** Types without terms, with what the container type suggests. */
    otherTypes: z.array(
      z.object({
        code: z.string(),
        name: z.string(),
        replacement: z.string(),
        usefulLifeMonths: z.int(),
        /** The partner has had it in hand: its month cannot be assessed without terms. */
        needed: z.boolean(),
      }),
    ),
    /** The last closed month; new versions start after it. */
    closedThrough: z.string().nullable(),
    /** Movements exist, so the currency stands. */
    currencyFixed: z.boolean(),
    maySet: z.boolean(),
  }),
});

export const setTerms = operation({
  name: 'setTerms',
  resource: 'terms',
  method: 'POST',
  path: '/terms/:partner/versions',
  summary: 'Set the terms of a type from a day on; earlier versions stay as they are',
  params: partnerParams,
  body: termsVersion,
  answer: z.object({ id }),
});

export const setPartnerTerms = operation({
  name: 'setPartnerTerms',
  resource: 'terms',
  method: 'PUT',
  path: '/terms/:partner',
  summary: 'Set what holds for a partner as a whole: currency, tax, days, tolerance',
  params: partnerParams,
  body: partnerTerms,
  answer: z.object({ id }),
});
