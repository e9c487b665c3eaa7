import { inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { assess, CannotAssess } from '@/shared/domain/assessment';
import { firstDayOfMonth, lastDayOfMonth, monthOf } from '@/shared/domain/calendar';
import { Problem } from '@/shared/problems/problems';
import { assessmentInput } from '../statements/assessment-input';

/** Assesses the partners once with what was just written; what the rules refuse (RULES 3.14) is not kept. */
export async function refuseWhatCannotBe(
  tx: Transaction,
  { companyIds, today }: { companyIds: readonly string[]; today: string },
): Promise<void> {
  const ids = [...new Set(companyIds)];
  if (ids.length === 0) return;
  const partners = await tx.select().from(companies).where(inArray(companies.id, ids));
  const month = monthOf(today);
  for (const partner of partners) {
    const period = { from: firstDayOfMonth(month), to: lastDayOfMonth(month) };
    try {
      assess(await assessmentInput(tx, { partner, ...period }));
    } catch (error) {
      if (!(error instanceof CannotAssess)) throw error;
      throw new Problem('cannot be reckoned', { data: { why: error.message } });
    }
  }
}
