import { and, count, countDistinct, eq } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { shipments } from '@/db/schema/shipments';
import { importDocuments, receiptMatches, receipts } from '@/db/schema/work';
import type { ImportNumbers } from '@/shared/contracts/imports';
import { overdueBy } from '../shipments/list-shipments';
import { fromCompany, toCompany } from '../shipments/shipment-rows';

type Asked = { importId: string; today: string };

/** What came of an import, as it stands now. One import's rows only, by index. */
export async function numbersOf(db: Reader, { importId, today }: Asked): Promise<ImportNumbers> {
  const documents = await db
    .select({ outcome: importDocuments.outcome, n: count() })
    .from(importDocuments)
    .where(and(eq(importDocuments.importId, importId), eq(importDocuments.side, 'shipment')))
    .groupBy(importDocuments.outcome);
  const groups = await db
    .select({
      state: receiptMatches.state,
      rule: receiptMatches.rule,
      n: countDistinct(receiptMatches.groupId),
    })
    .from(receiptMatches)
    .where(eq(receiptMatches.importId, importId))
    .groupBy(receiptMatches.state, receiptMatches.rule);
  const left = await db
    .select({ state: receipts.state, n: count() })
    .from(receipts)
    .where(eq(receipts.importId, importId))
    .groupBy(receipts.state);
  const documentsThat = (outcome: string): number => documents.find((row) => row.outcome === outcome)?.n ?? 0;
  const receiptsThat = (state: string): number => left.find((row) => row.state === state)?.n ?? 0;
  const groupsThat = (state: string): number =>
    groups
      .filter((row) => row.state === state && row.rule !== 'unannounced')
      .reduce((sum, { n }) => sum + n, 0);
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
    ...(await openInBook(db, today)),
  };
}

/** Shipments of the whole book that nobody has counted, as the list of shipments has them. */
async function openInBook(db: Reader, today: string): Promise<{ onTheWay: number; overdue: number }> {
  const [open] = await db.select({ n: count() }).from(shipments).where(eq(shipments.state, 'on the way'));
  const [late] = await db
    .select({ n: count() })
    .from(shipments)
    .innerJoin(fromCompany, eq(fromCompany.id, shipments.fromCompanyId))
    .innerJoin(toCompany, eq(toCompany.id, shipments.toCompanyId))
    .where(overdueBy(today));
  return { onTheWay: open?.n ?? 0, overdue: late?.n ?? 0 };
}
