import { asc, eq } from 'drizzle-orm';
import type { Reader, Transaction } from '@/db/client';
import { partnerEvents } from '@/db/schema/ledger';

export type PartnerEvent = Omit<typeof partnerEvents.$inferInsert, 'id' | 'recordedAt'>;

/** Writes what a partner's assessment will read (RULES 2). Quantities of 0 are left out. */
export async function recordEvents(tx: Transaction, events: readonly PartnerEvent[]): Promise<void> {
  const real = events.filter((event) => event.quantity !== 0);
  if (real.length > 0) await tx.insert(partnerEvents).values(real);
}

/** All events of a partner in the order recorded, in the form that assess() takes, with what stands behind each. */
export async function eventsOf(db: Reader, companyId: string) {
  const rows = await db
    .select()
    .from(partnerEvents)
    .where(eq(partnerEvents.companyId, companyId))
    .orderBy(asc(partnerEvents.id));
  return rows.map((row) => ({
    ...row,
    id: String(row.id),
    correctsId: row.correctsId === null ? null : String(row.correctsId),
  }));
}
