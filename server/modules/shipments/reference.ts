import type { Transaction } from '@/db/client';
import { referenceNumbers } from '@/db/schema/ledger';

/** Our own shipping references: EM for empties, DN for fulls, with a number nobody else gets. */
export async function nextReference(
  tx: Transaction,
  { contents, now }: { contents: 'empties' | 'fulls'; now: string },
): Promise<string> {
  const [taken] = await tx.insert(referenceNumbers).values({ takenAt: now });
  return `${contents === 'empties' ? 'EM' : 'DN'}-${100_000 + taken.insertId}`;
}
