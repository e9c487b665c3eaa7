import { eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { partnerEvents } from '@/db/schema/ledger';

/** Whether a partner has had this type in hand: then statements are reckoned by its first day in service. */
export async function hasBeenMoved(db: Reader, typeCode: string): Promise<boolean> {
  const rows = await db
    .select({ id: partnerEvents.id })
    .from(partnerEvents)
    .where(eq(partnerEvents.typeCode, typeCode))
    .limit(1);
  return rows.length > 0;
}
