import { and, desc, eq, lte } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { terms } from '@/db/schema/companies';

export type Terms = typeof terms.$inferSelect;

/** The version of a partner's terms for a type that is in force on a day, if any. */
export async function termsInForce(
  db: Reader,
  asked: { companyId: string; typeCode: string; day: string },
): Promise<Terms | undefined> {
  const [held] = await db
    .select()
    .from(terms)
    .where(
      and(
        eq(terms.companyId, asked.companyId),
        eq(terms.typeCode, asked.typeCode),
        lte(terms.validFrom, asked.day),
      ),
    )
    .orderBy(desc(terms.validFrom))
    .limit(1);
  return held;
}
