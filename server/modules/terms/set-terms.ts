import { and, desc, eq, lte, sql } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { companies, terms } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { months } from '@/db/schema/statements';
import { databaseErrorNumber } from '@/db/transaction';
import type { TermsVersion } from '@/shared/contracts/terms';
import { lastDayOfMonth, monthOf } from '@/shared/domain/calendar';
import { isWholeMinor } from '@/shared/domain/money';
import { type BadField, Problem } from '@/shared/problems/problems';

type Setting = { partnerId: string; version: TermsVersion; personId: string | null; now: string };
export type Partner = typeof companies.$inferSelect;

/**
 * A version of a type's terms from a day on. Versions are never changed, and none starts where it would change what
 * is assessed already: in a closed month, save before all others of its type, where nothing could be assessed yet.
 */
export async function setTerms(tx: Transaction, setting: Setting): Promise<{ id: string }> {
  const { version, personId, now } = setting;
  const partner = await lockedPartner(tx, setting.partnerId);
  const fields = [
    ...(await unknownType(tx, version.typeCode)),
    ...notWholeMinor(version, partner.currency),
    ...(await inClosedMonth(tx, partner, version)),
  ];
  if (fields.length > 0) throw new Problem('not valid', { fields });
  const id = newId();
  try {
    await tx
      .insert(terms)
      .values({ id, companyId: partner.id, ...version, createdBy: personId, createdAt: now });
  } catch (error) {
    if (databaseErrorNumber(error) !== 1062) throw error;
    throw new Problem('not valid', {
      fields: [{ path: 'validFrom', message: 'Terms of this type start on this day already' }],
    });
  }
  return { id };
}

export async function lockedPartner(tx: Transaction, id: string): Promise<Partner> {
  const [partner] = await tx
    .select()
    .from(companies)
    .where(and(eq(companies.id, id), eq(companies.kind, 'partner')))
    .for('update');
  if (!partner) throw new Problem('not found');
  return partner;
}

async function unknownType(tx: Transaction, typeCode: string): Promise<BadField[]> {
  const [type] = await tx
    .select({ code: containerTypes.code })
    .from(containerTypes)
    .where(eq(containerTypes.code, typeCode));
  return type ? [] : [{ path: 'typeCode', message: `No container type ${typeCode}` }];
}

/** RULES 3.13: deposits and replacement values are whole minor units; fees may be finer. */
function notWholeMinor(version: TermsVersion, currency: string): BadField[] {
  return (['deposit', 'replacement'] as const)
    .filter((path) => !isWholeMinor(version[path], currency))
    .map((path) => ({ path, message: `Finer than the smallest unit of ${currency}` }));
}

async function inClosedMonth(tx: Transaction, partner: Partner, version: TermsVersion): Promise<BadField[]> {
  await waitForClose(tx, monthOf(version.validFrom));
  const closedThrough = await lastClosedMonth(tx);
  if (closedThrough === null || monthOf(version.validFrom) > closedThrough) return [];
  const [before] = await tx
    .select({ id: terms.id })
    .from(terms)
    .where(
      and(
        eq(terms.companyId, partner.id),
        eq(terms.typeCode, version.typeCode),
        lte(terms.validFrom, version.validFrom),
      ),
    )
    .limit(1);
  if (!before) return [];
  const message = `In a closed month; the first day that is free is the one after ${lastDayOfMonth(closedThrough)}`;
  return [{ path: 'validFrom', message }];
}

/** A close under way comes first: its drafts must not be made from terms that were set meanwhile. */
async function waitForClose(tx: Transaction, month: string): Promise<void> {
  await tx.execute(sql`select state from ${months} where ${months.month} = ${month} lock in share mode`);
}

/** The latest closed month, if any. */
export async function lastClosedMonth(tx: Pick<Transaction, 'select'>): Promise<string | null> {
  const [row] = await tx
    .select({ month: months.month })
    .from(months)
    .where(eq(months.state, 'closed'))
    .orderBy(desc(months.month))
    .limit(1);
  return row?.month ?? null;
}
