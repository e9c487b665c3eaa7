import { z } from 'zod';
import { gln } from '../domain/identification';
import { currencyCode } from '../domain/currencies';
import { code, email, id, line, lineOrEmpty } from './fields';
import { listQuery, pageOf } from './list';
import { operation } from './operation';

const site = z.object({
  id,
  code: z.string(),
  name: z.string(),
  gln: z.string().nullable(),
  timeZone: z.string(),
  active: z.boolean(),
});

const company = z.object({
  id,
  kind: z.enum(['operator', 'partner']),
  code: z.string(),
  name: z.string(),
  email: z.string().nullable(),
  address: z.string().nullable(),
  gln: z.string().nullable(),
  currency: z.string(),
  active: z.boolean(),
});

export const partnerRow = company.extend({ sites: z.int(), people: z.int() });
export type PartnerRow = z.infer<typeof partnerRow>;

export const listPartners = operation({
  name: 'listPartners',
  resource: 'partners',
  method: 'GET',
  path: '/partners',
  summary: 'Companies of the book, by name',
  query: listQuery.extend({ kind: z.enum(['operator', 'partner']).optional() }),
  answer: pageOf(partnerRow),
});

export const readPartner = operation({
  name: 'readPartner',
  resource: 'partners',
  method: 'GET',
  path: '/partners/:partner',
  summary: 'One company with its sites',
  params: z.object({ partner: id }),
  answer: company.extend({ sites: z.array(site) }),
});

/** A time zone of the IANA database that this machine knows. */
export const timeZone = z.string().refine(isTimeZone, 'A time zone like Europe/Copenhagen');

function isTimeZone(name: string): boolean {
  try {
    new Intl.DateTimeFormat('en', { timeZone: name });
    return name.includes('/') || name === 'UTC';
  } catch {
    return false;
  }
}

const optionalGln = z.union([z.literal(''), gln]);

export const partnerForm = z.object({
  code,
  name: line(120),
  email: z.union([z.literal(''), email]),
  address: lineOrEmpty(300),
  gln: optionalGln,
  currency: currencyCode,
});

export const addPartner = operation({
  name: 'addPartner',
  resource: 'partners',
  method: 'POST',
  path: '/partners',
  summary: 'Add a partner with its first site',
  body: partnerForm.extend({ siteCode: code, siteName: line(120), timeZone }),
  answer: z.object({ id }),
});

export const changePartner = operation({
  name: 'changePartner',
  resource: 'partners',
  method: 'PUT',
  path: '/partners/:partner',
  summary: 'Change name, mail, address and GLN of a company, or take it out of use',
  params: z.object({ partner: id }),
  body: partnerForm.omit({ code: true, currency: true }).extend({ active: z.boolean() }),
  answer: z.object({ id }),
});

export const siteForm = z.object({ code, name: line(120), gln: optionalGln, timeZone });

export const addSite = operation({
  name: 'addSite',
  resource: 'partners',
  method: 'POST',
  path: '/partners/:partner/sites',
  summary: 'Add a site to a company',
  params: z.object({ partner: id }),
  body: siteForm,
  answer: z.object({ id }),
});

export const changeSite = operation({
  name: 'changeSite',
  resource: 'partners',
  method: 'PUT',
  path: '/partners/:partner/sites/:site',
  summary: 'Change the name, GLN or use of a site',
  params: z.object({ partner: id, site: id }),
  body: siteForm.omit({ code: true, timeZone: true }).extend({ active: z.boolean() }),
  answer: z.object({ id }),
});
