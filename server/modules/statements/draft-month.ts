import { and, asc, eq, inArray, lte, or } from 'drizzle-orm';
import { z } from 'zod';
import type { Database } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { partnerEvents } from '@/db/schema/ledger';
import { credits } from '@/db/schema/statements';
import { databaseErrorNumber, inTransaction } from '@/db/transaction';
import { CannotAssess } from '@/shared/domain/assessment';
import { lastDayOfMonth } from '@/shared/domain/calendar';
import { instantOf } from '../../deps';
import type { JobHandler } from '../../jobs/job-queue';
import { draftStatement } from './draft-statement';

export const monthPayload = z.object({ month: z.string() });
export const draftResult = z.object({
  drafted: z.number(),
  refused: z.array(z.object({ companyId: z.string(), name: z.string(), why: z.string() })),
});
export type DraftResult = z.infer<typeof draftResult>;

/** Drafts a closed month, one partner after another, each in a transaction of its own; may be run again at any time. */
export const draftMonth: JobHandler = async (deps, job, progress): Promise<DraftResult> => {
  const { month } = monthPayload.parse(job.payload);
  const partners = await partnersWith(deps.db, month);
  const result: DraftResult = { drafted: 0, refused: [] };
  for (const [index, partner] of partners.entries()) {
    await progress(index, partners.length);
    const drafting = { partner, month, now: instantOf(deps.clock) };
    const why = await draftOrWhyNot(() => inTransaction(deps.db, (tx) => draftStatement(tx, drafting)));
    if (why === null) result.drafted += 1;
    else result.refused.push({ companyId: partner.id, name: partner.name, why });
  }
  await progress(partners.length, partners.length);
  return result;
};

/** One partner that cannot be assessed holds up no other. */
async function draftOrWhyNot(draft: () => Promise<unknown>): Promise<string | null> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      await draft();
      return null;
    } catch (error) {
      if (error instanceof CannotAssess) return error.message;
      // Another worker wrote this draft in the same moment: the second try finds and rewrites it.
      if (databaseErrorNumber(error) !== 1062 || attempt > 1) throw error;
    }
  }
}

/** Partners with a movement by the month's end, or with money agreed beside one. */
async function partnersWith(db: Database, month: string) {
  const moved = db
    .selectDistinct({ id: partnerEvents.companyId })
    .from(partnerEvents)
    .where(lte(partnerEvents.date, lastDayOfMonth(month)));
  const credited = db
    .selectDistinct({ id: credits.companyId })
    .from(credits)
    .where(lte(credits.month, month));
  return db
    .select()
    .from(companies)
    .where(
      and(eq(companies.kind, 'partner'), or(inArray(companies.id, moved), inArray(companies.id, credited))),
    )
    .orderBy(asc(companies.code));
}
