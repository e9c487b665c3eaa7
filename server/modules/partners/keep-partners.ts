import { and, eq } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { z } from 'zod';
import type { Transaction } from '@/db/client';
import { companies, sites } from '@/db/schema/companies';
import { databaseErrorNumber } from '@/db/transaction';
import type { addPartner, addSite, changePartner, changeSite } from '@/shared/contracts/partners';
import type { BodyOf, Shaped } from '@/shared/contracts/operation';
import { Problem } from '@/shared/problems/problems';

type New<O extends Shaped> = { body: BodyOf<O>; now: string };

/** A partner and its first site; both codes must be new. */
export async function addPartnerWithSite(
  tx: Transaction,
  { body, now }: New<typeof addPartner>,
): Promise<string> {
  const companyId = newId();
  const { code, name, currency, email, address, gln } = body;
  await unlessTaken('code', () =>
    tx.insert(companies).values({
      id: companyId,
      kind: 'partner',
      code,
      name,
      currency,
      email: email || null,
      address: address || null,
      gln: gln || null,
      createdAt: now,
    }),
  );
  await insertSite(tx, {
    companyId,
    now,
    field: 'siteCode',
    site: { code: body.siteCode, name: body.siteName, gln: '', timeZone: body.timeZone },
  });
  return companyId;
}

export async function changeCompany(
  tx: Transaction,
  id: string,
  body: BodyOf<typeof changePartner>,
): Promise<void> {
  const [company] = await tx.select().from(companies).where(eq(companies.id, id)).for('update');
  if (!company) throw new Problem('not found');
  if (company.kind === 'operator' && !body.active) {
    throw new Problem('not valid', { fields: [{ path: 'active', message: 'The operator stays in use' }] });
  }
  const { name, email, address, gln, active } = body;
  await tx
    .update(companies)
    .set({ name, email: email || null, address: address || null, gln: gln || null, active })
    .where(eq(companies.id, id));
}

export async function addSiteTo(
  tx: Transaction,
  companyId: string,
  { body, now }: New<typeof addSite>,
): Promise<string> {
  const [company] = await tx.select({ id: companies.id }).from(companies).where(eq(companies.id, companyId));
  if (!company) throw new Problem('not found');
  return insertSite(tx, { companyId, now, field: 'code', site: body });
}

type SiteAt = { companyId: string; siteId: string };

export async function changeSiteOf(
  tx: Transaction,
  at: SiteAt,
  body: BodyOf<typeof changeSite>,
): Promise<void> {
  const where = and(eq(sites.id, at.siteId), eq(sites.companyId, at.companyId));
  const [site] = await tx.select().from(sites).where(where).for('update');
  if (!site) throw new Problem('not found');
  await tx
    .update(sites)
    .set({ name: body.name, gln: body.gln || null, active: body.active })
    .where(where);
}

type NewSite = {
  companyId: string;
  now: string;
  field: string;
  site: z.output<typeof addSite.body & object>;
};

async function insertSite(tx: Transaction, { companyId, now, field, site }: NewSite): Promise<string> {
  const id = newId();
  const { code, name, gln, timeZone } = site;
  await unlessTaken(field, () =>
    tx.insert(sites).values({ id, companyId, code, name, gln: gln || null, timeZone, createdAt: now }),
  );
  return id;
}

async function unlessTaken(field: string, insert: () => Promise<unknown>): Promise<void> {
  try {
    await insert();
  } catch (error) {
    if (databaseErrorNumber(error) !== 1062) throw error;
    throw new Problem('already exists', { fields: [{ path: field, message: 'This code is taken' }] });
  }
}
