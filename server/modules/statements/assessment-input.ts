import { asc, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { type companies, terms } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import type { AssessmentEvent, AssessmentInput, AssessmentTerms } from '@/shared/domain/assessment';
import { eventsOf } from '../ledger/record-events';

type Partner = typeof companies.$inferSelect;
type Asked = { partner: Partner; from: string; to: string };
type Events = Awaited<ReturnType<typeof eventsOf>>;

/** All the events known of a partner, its terms and types, in the form of RULES 3. */
export async function assessmentInput(db: Reader, { partner, from, to }: Asked): Promise<AssessmentInput> {
  const { known } = await knownOf(db, partner);
  return { ...known, from, to };
}

/** What is known of a partner now, for any period, and the events with what stands behind each. */
export async function knownOf(
  db: Reader,
  partner: Partner,
): Promise<{ known: Omit<AssessmentInput, 'from' | 'to'>; events: Events }> {
  const versions = await db
    .select()
    .from(terms)
    .where(eq(terms.companyId, partner.id))
    .orderBy(asc(terms.validFrom));
  const types = await db
    .select({ code: containerTypes.code, inServiceFrom: containerTypes.inServiceFrom })
    .from(containerTypes);
  const events = await eventsOf(db, partner.id);
  const known = {
    currency: partner.currency,
    terms: versions.map(assessedTerms),
    containerTypes: types,
    events: events.map(assessedEvent),
  };
  return { known, events };
}

function assessedTerms(version: typeof terms.$inferSelect): AssessmentTerms {
  return {
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
  };
}

function assessedEvent(event: Events[number]): AssessmentEvent {
  const { id, date, quantity, typeCode: containerType } = event;
  if (event.kind !== 'corrected') return { id, date, containerType, kind: event.kind, quantity };
  return { id, date, containerType, kind: 'corrected', quantity, corrects: event.correctsId ?? '' };
}

/** "0.030000" → "0.03": rates are shown as they were given. */
export function plain(decimal: string): string {
  return decimal.includes('.') ? decimal.replace(/\.?0+$/, '') : decimal;
}
