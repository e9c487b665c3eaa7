import { eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { companies, terms } from '@/db/schema/companies';
import { partnerEvents } from '@/db/schema/ledger';
import type { PartnerTerms } from '@/shared/contracts/terms';
import { assess } from '@/shared/domain/assessment';
import { isWholeMinor, isZero } from '@/shared/domain/money';
import { type BadField, Problem } from '@/shared/problems/problems';
import { operatorDay } from '../partners/operator-day';
import { assessmentInput, plain } from '../statements/assessment-input';
import { lockedPartner, type Partner } from './set-terms';

type Setting = { partnerId: string; settings: PartnerTerms; now: string };

/**
 * What holds for a partner as a whole. The currency stands once anything moved; the tax treatment stands while
 * deposits are held, since what was asked under one would be adjusted under the other.
 */
export async function setPartnerTerms(tx: Transaction, { partnerId, settings, now }: Setting): Promise<void> {
  const partner = await lockedPartner(tx, partnerId);
  const fields = [
    ...(settings.currency === partner.currency ? [] : await currencyFields(tx, partner, settings.currency)),
    ...(settings.taxTreatment === partner.taxTreatment ? [] : await treatmentFields(tx, partner, now)),
  ];
  if (fields.length > 0) throw new Problem('not valid', { fields });
  await tx.update(companies).set(settings).where(eq(companies.id, partner.id));
}

async function currencyFields(tx: Transaction, partner: Partner, currency: string): Promise<BadField[]> {
  if (await hasEvents(tx, partner.id)) {
    return [
      { path: 'currency', message: `Containers have moved already: the currency stays ${partner.currency}` },
    ];
  }
  const versions = await tx.select().from(terms).where(eq(terms.companyId, partner.id));
  const finer = versions.some(({ deposit, replacement }) =>
    [deposit, replacement].some((amount) => !isWholeMinor(plain(amount), currency)),
  );
  if (!finer) return [];
  return [{ path: 'currency', message: `Deposits or replacement values are finer than ${currency} allows` }];
}

async function treatmentFields(tx: Transaction, partner: Partner, now: string): Promise<BadField[]> {
  const today = await operatorDay(tx, now);
  const input = await assessmentInput(tx, { partner, from: today, to: today });
  const held = assess(input).lines.some((line) => !isZero(line.deposit.closing));
  if (!held) return [];
  return [{ path: 'taxTreatment', message: 'Deposits are held: the treatment can change once none is' }];
}

export async function hasEvents(db: Pick<Transaction, 'select'>, companyId: string): Promise<boolean> {
  const [event] = await db
    .select({ id: partnerEvents.id })
    .from(partnerEvents)
    .where(eq(partnerEvents.companyId, companyId))
    .limit(1);
  return event !== undefined;
}
