import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { companies, people, terms } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { partnerEvents } from '@/db/schema/ledger';
import type { AnswerOf, QueryOf } from '@/shared/contracts/operation';
import type { listTerms, readPartnerTerms } from '@/shared/contracts/terms';
import { formatMinor } from '@/shared/domain/money';
import { Problem } from '@/shared/problems/problems';
import { cursor, cutPage } from '../../http/page';
import { may, type Person, scopeOf } from '../../http/person';
import { holdsText } from '../../http/search';
import { keyset } from '../../http/sort';
import { operatorDay } from '../partners/operator-day';
import { plain } from '../statements/assessment-input';
import { hasEvents } from './set-partner-terms';
import { lastClosedMonth } from './set-terms';

type Partner = typeof companies.$inferSelect;
type Version = typeof terms.$inferSelect;

export function settingsOf(partner: Partner) {
  const { currency, taxTreatment, objectionDays, autoCountDays, toleranceUnits } = partner;
  return {
    currency,
    taxRate: plain(partner.taxRate),
    taxTreatment,
    objectionDays,
    autoCountDays,
    toleranceUnits,
    tolerancePct: plain(partner.tolerancePct),
  };
}

/** Partners by name with what holds for each. A partner sees its own alone. */
export async function termsPage(
  db: Database,
  { query, person, now }: { query: QueryOf<typeof listTerms>; person: Person; now: string },
) {
  const scope = scopeOf(person);
  const order = keyset({
    by: companies.name,
    then: companies.id,
    down: false,
    after: cursor(query.after, 2),
  });
  const rows = await db
    .select()
    .from(companies)
    .where(
      and(
        eq(companies.kind, 'partner'),
        scope ? eq(companies.id, scope) : undefined,
        holdsText(query.search, companies.name, companies.code),
        order.after,
      ),
    )
    .orderBy(...order.order)
    .limit(query.limit + 1);
  const page = cutPage(rows, query.limit, (row) => [row.name, row.id]);
  const ids = page.rows.map((row) => row.id);
  const versions = ids.length === 0 ? [] : await db.select().from(terms).where(inArray(terms.companyId, ids));
  const handled = await handledTypes(db, ids);
  const today = await operatorDay(db, now);
  const overview = (partner: Partner) => {
    const own = versions.filter((version) => version.companyId === partner.id);
    const inForce = new Set(own.filter((each) => each.validFrom <= today).map((each) => each.typeCode));
    const ahead = own.map((each) => each.validFrom).filter((from) => from > today);
    return {
      partner: { id: partner.id, code: partner.code, name: partner.name },
      settings: settingsOf(partner),
      typesInForce: inForce.size,
      typesWithout: (handled.get(partner.id) ?? []).filter((code) => !inForce.has(code)),
      nextChange: ahead.sort()[0] ?? null,
    };
  };
  return { ...page, rows: page.rows.map(overview) };
}

/** Types that each partner has had in hand. */
async function handledTypes(db: Database, companyIds: readonly string[]): Promise<Map<string, string[]>> {
  const types = new Map<string, string[]>();
  if (companyIds.length === 0) return types;
  const rows = await db
    .selectDistinct({ companyId: partnerEvents.companyId, typeCode: partnerEvents.typeCode })
    .from(partnerEvents)
    .where(inArray(partnerEvents.companyId, [...companyIds]))
    .orderBy(asc(partnerEvents.typeCode));
  for (const { companyId, typeCode } of rows)
    types.set(companyId, [...(types.get(companyId) ?? []), typeCode]);
  return types;
}

/** All versions of a partner's terms, by type. */
export async function partnerTermsPage(
  db: Database,
  { partnerId, person, now }: { partnerId: string; person: Person; now: string },
): Promise<AnswerOf<typeof readPartnerTerms>> {
  const scope = scopeOf(person);
  const [partner] = await db
    .select()
    .from(companies)
    .where(and(eq(companies.id, partnerId), eq(companies.kind, 'partner')));
  if (!partner || (scope !== null && scope !== partner.id)) throw new Problem('not found');
  const versions = await db
    .select({ version: terms, by: people.name })
    .from(terms)
    .leftJoin(people, eq(people.id, terms.createdBy))
    .where(eq(terms.companyId, partner.id))
    .orderBy(asc(terms.typeCode), asc(terms.validFrom));
  const types = await db.select().from(containerTypes).orderBy(asc(containerTypes.code));
  const handled = (await handledTypes(db, [partner.id])).get(partner.id) ?? [];
  const today = await operatorDay(db, now);
  const maySet = may(person, 'set terms');
  const own = (code: string) => versions.filter(({ version }) => version.typeCode === code);
  return {
    partner: { id: partner.id, code: partner.code, name: partner.name },
    settings: settingsOf(partner),
    types: types
      .filter((type) => own(type.code).length > 0)
      .map(({ code, name, kind }) => ({
        type: { code, name, kind },
        versions: shownVersions(own(code), { partner, today, names: scope === null }),
      })),
    otherTypes: types
      .filter((type) => own(type.code).length === 0 && (maySet ? type.active : handled.includes(type.code)))
      .map(({ code, name, replacement, usefulLifeMonths }) => ({
        code,
        name,
        replacement: plain(replacement),
        usefulLifeMonths,
        needed: handled.includes(code),
      })),
    closedThrough: await lastClosedMonth(db),
    currencyFixed: await hasEvents(db, partner.id),
    maySet,
  };
}

type Showing = { partner: Partner; today: string; names: boolean };

/** Newest first; the one in force is the last that has started. */
function shownVersions(
  rows: readonly { version: Version; by: string | null }[],
  { partner, today, names }: Showing,
) {
  const inForce = rows.filter(({ version }) => version.validFrom <= today).at(-1)?.version.id;
  const money = (amount: string) => formatMinor(plain(amount), partner.currency);
  return rows
    .map(({ version, by }) => ({
      id: version.id,
      typeCode: version.typeCode,
      validFrom: version.validFrom,
      deposit: money(version.deposit),
      replacement: money(version.replacement),
      freeDays: version.freeDays,
      dailyFee: plain(version.dailyFee),
      lostAfterDays: version.lostAfterDays,
      usefulLifeMonths: version.usefulLifeMonths,
      residualFloorPct: plain(version.residualFloorPct),
      damageFee: plain(version.damageFee),
      cleaningFee: plain(version.cleaningFee),
      recoveryDays: version.recoveryDays,
      standing:
        version.id === inForce
          ? ('in force' as const)
          : version.validFrom > today
            ? ('ahead' as const)
            : ('earlier' as const),
      setBy: names ? by : null,
      setAt: version.createdAt,
    }))
    .reverse();
}
