import { and, asc, count, eq, inArray, isNull, lte, min, sum } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies, terms } from '@/db/schema/companies';
import { differences, disputes } from '@/db/schema/differences';
import { partnerEvents } from '@/db/schema/ledger';
import { undecided } from '@/shared/contracts/disputes';
import type { OpenItem } from '@/shared/contracts/months';
import { lastDayOfMonth } from '@/shared/domain/calendar';
import { isZero, roundToMinor } from '@/shared/domain/money';
import { plain } from '../statements/assessment-input';
import { uncountedByPartner } from './uncounted';

const partner = { id: companies.id, name: companies.name, currency: companies.currency };

/** What still stands open at the end of a month, by partner, with the money that hangs on it. */
export async function openItemsOf(db: Reader, month: string): Promise<OpenItem[]> {
  const through = lastDayOfMonth(month);
  return [
    ...(await missingTerms(db, through)),
    ...(await openDifferences(db, through)),
    ...(await openDisputes(db)),
    ...(await uncountedByPartner(db, through)),
  ];
}

type Row = { partner: { id: string; name: string; currency: string }; count: number; amount: string | null };

function itemOf(kind: OpenItem['kind'], row: Row): OpenItem {
  const { id, name, currency } = row.partner;
  return {
    kind,
    partner: { id, name },
    count: row.count,
    money:
      row.amount === null || isZero(plain(row.amount))
        ? null
        : { currency, amount: roundToMinor(plain(row.amount), currency) },
    typeCode: null,
  };
}

async function openDifferences(db: Reader, through: string): Promise<OpenItem[]> {
  const rows = await db
    .select({ partner, count: count(), amount: sum(differences.atStake) })
    .from(differences)
    .innerJoin(companies, eq(companies.id, differences.partnerId))
    .where(and(eq(differences.state, 'open'), lte(differences.openedOn, through)))
    .groupBy(companies.id)
    .orderBy(asc(companies.name));
  return rows.map((row) => itemOf('differences', row));
}

async function openDisputes(db: Reader): Promise<OpenItem[]> {
  const rows = await db
    .select({ partner, count: count(), amount: sum(disputes.amountHeld) })
    .from(disputes)
    .innerJoin(companies, eq(companies.id, disputes.companyId))
    .where(inArray(disputes.state, [...undecided]))
    .groupBy(companies.id)
    .orderBy(asc(companies.name));
  return rows.map((row) => itemOf('disputes', row));
}

/** Types that a partner got, damaged or soiled before any terms were in force: its month cannot be assessed. */
async function missingTerms(db: Reader, through: string): Promise<OpenItem[]> {
  const firstTerms = db
    .select({
      companyId: terms.companyId,
      typeCode: terms.typeCode,
      from: min(terms.validFrom).as('from_day'),
    })
    .from(terms)
    .groupBy(terms.companyId, terms.typeCode)
    .as('first_terms');
  const rows = await db
    .select({ partner, typeCode: partnerEvents.typeCode, count: count() })
    .from(partnerEvents)
    .innerJoin(companies, eq(companies.id, partnerEvents.companyId))
    .leftJoin(
      firstTerms,
      and(
        eq(firstTerms.companyId, partnerEvents.companyId),
        eq(firstTerms.typeCode, partnerEvents.typeCode),
        lte(firstTerms.from, partnerEvents.date),
      ),
    )
    .where(
      and(
        lte(partnerEvents.date, through),
        inArray(partnerEvents.kind, ['issued', 'damaged', 'cleaned']),
        isNull(firstTerms.companyId),
      ),
    )
    .groupBy(companies.id, partnerEvents.typeCode)
    .orderBy(asc(companies.name), asc(partnerEvents.typeCode));
  return rows.map((row) => ({
    ...itemOf('terms missing', { ...row, amount: null }),
    typeCode: row.typeCode,
  }));
}
