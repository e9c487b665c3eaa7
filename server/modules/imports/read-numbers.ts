import { and, count, countDistinct, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { importDocuments, receiptMatches, receipts, type imports } from '@/db/schema/work';
import type { ImportNumbers } from '@/shared/contracts/imports';

type Held = Pick<typeof imports.$inferSelect, 'id' | 'result'>;

/** What came of an import, as it stands now. One import's rows only, by index. */
export async function numbersOf(db: Reader, held: Held): Promise<ImportNumbers> {
  const documents = await db
    .select({ outcome: importDocuments.outcome, n: count() })
    .from(importDocuments)
    .where(and(eq(importDocuments.importId, held.id), eq(importDocuments.side, 'shipment')))
    .groupBy(importDocuments.outcome);
  const groups = await db
    .select({
      state: receiptMatches.state,
      rule: receiptMatches.rule,
      n: countDistinct(receiptMatches.groupId),
    })
    .from(receiptMatches)
    .where(eq(receiptMatches.importId, held.id))
    .groupBy(receiptMatches.state, receiptMatches.rule);
  const left = await db
    .select({ state: receipts.state, n: count() })
    .from(receipts)
    .where(eq(receipts.importId, held.id))
    .groupBy(receipts.state);
  const documentsThat = (outcome: string): number => documents.find((row) => row.outcome === outcome)?.n ?? 0;
  const receiptsThat = (state: string): number => left.find((row) => row.state === state)?.n ?? 0;
  const groupsThat = (state: string): number =>
    groups
      .filter((row) => row.state === state && row.rule !== 'unannounced')
      .reduce((sum, { n }) => sum + n, 0);
  const result = (held.result ?? { waiting: 0, overdue: 0 }) as { waiting: number; overdue: number };
  return {
    shipments: {
      posted: documentsThat('posted'),
      known: documentsThat('known'),
      refused: documentsThat('refused'),
    },
    matches: groups
      .filter(({ state }) => state === 'matched')
      .map(({ rule, n }) => ({ rule, groups: n }))
      .sort((a, b) => b.groups - a.groups),
    notPosted: groupsThat('not posted'),
    offered: groupsThat('offered'),
    accepted: groupsThat('accepted'),
    refused: groupsThat('refused'),
    duplicates: receiptsThat('duplicate'),
    unannounced: receiptsThat('unannounced'),
    booked: receiptsThat('booked'),
    waiting: result.waiting,
    overdue: result.overdue,
  };
}
