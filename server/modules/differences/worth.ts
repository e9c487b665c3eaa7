import { eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { containerTypes } from '@/db/schema/containers';
import { multiply, roundToMinor } from '@/shared/domain/money';
import { termsInForce } from '../terms/terms-in-force';

type Worth = { companyId: string; currency: string; typeCode: string; day: string };

/** Replacement value of so many units by the partner's terms, or by the container type where there are none. */
export async function worthOf(db: Reader, worth: Worth, units: number): Promise<string> {
  const terms = await termsInForce(db, worth);
  const [type] = await db
    .select({ replacement: containerTypes.replacement })
    .from(containerTypes)
    .where(eq(containerTypes.code, worth.typeCode));
  const each = terms?.replacement ?? type?.replacement ?? '0';
  return roundToMinor(multiply(each, String(units)), worth.currency);
}
