import { asc, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { type companies, terms } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import type { AssessmentInput } from '@/shared/domain/assessment';
import { eventsOf } from '../ledger/record-events';

type Asked = { partner: typeof companies.$inferSelect; from: string; to: string };

/** All the events known of a partner, its terms and types, in the form of RULES 3. */
export async function assessmentInput(db: Reader, { partner, from, to }: Asked): Promise<AssessmentInput> {
  const versions = await db
    .select()
    .from(terms)
    .where(eq(terms.companyId, partner.id))
    .orderBy(asc(terms.validFrom));
  const types = await db
    .select({ code: containerTypes.code, inServiceFrom: containerTypes.inServiceFrom })
    .from(containerTypes);
  const events = await eventsOf(db, partner.id);
  return {
    currency: partner.currency,
    from,
    to,
    terms: versions.map((version) => ({
      containerType: version.typeCode,
      validFrom: version.validFrom,
      deposit: plain(version.deposit),
      replacement: plain(version.replacement),
      freeDays: version.freeDays,
      dailyFee: plain(version.dailyFee),
      lostAfterDays: version.lostAfterDays,
      usefulLifeMonths: version.usefulLifeMonths,
      residualFloorPct: plain(version.residualFloorPct),
      damageFee: plain(version.damageFee),
      cleaningFee: plain(version.cleaningFee),
      recoveryDays: version.recoveryDays,
    })),
    containerTypes: types,
    events: events.map((event) => {
      const { id, date, quantity } = event;
      if (event.kind !== 'corrected')
        return { id, date, containerType: event.typeCode, kind: event.kind, quantity };
      return {
        id,
        date,
        containerType: event.typeCode,
        kind: 'corrected' as const,
        quantity,
        corrects: event.correctsId ?? '',
      };
    }),
  };
}

/** "0.030000" → "0.03": rates are shown as they were given. */
export function plain(decimal: string): string {
  return decimal.includes('.') ? decimal.replace(/\.?0+$/, '') : decimal;
}
