import { v7 as newId } from 'uuid';
import { receiptLines, receipts } from '@/db/schema/work';
import { inTransaction } from '@/db/transaction';
import { instantOf } from '../../deps';
import type { ImportedDocument } from './documents';
import { mark, markedRows } from './import-marks';
import type { Run } from './run-import';

const receiptsAtOnce = 200;

/** Keeps the receipts of a file as waiting for the comparison, some hundred in a transaction with their marks. */
export async function storeReceipts(run: Run, documents: readonly ImportedDocument[]): Promise<void> {
  const done = await markedRows(run.deps.db, run.importId);
  const open = documents.filter(({ side, rowNo }) => side === 'receipt' && !done.has(rowNo));
  for (let at = 0; at < open.length; at += receiptsAtOnce)
    await storeSome(run, open.slice(at, at + receiptsAtOnce));
}

async function storeSome(run: Run, some: readonly ImportedDocument[]): Promise<void> {
  const createdAt = instantOf(run.deps.clock);
  const rows = some.map((document) => ({ document, id: newId() }));
  await inTransaction(run.deps.db, async (tx) => {
    await tx.insert(receipts).values(
      rows.map(({ id, document: { reference, fromSiteId, toSiteId, day, rowNo } }) => ({
        id,
        importId: run.importId,
        rowNo,
        reference,
        fromSiteId,
        toSiteId,
        countedOn: day,
        state: 'waiting' as const,
        createdAt,
      })),
    );
    await tx.insert(receiptLines).values(
      rows.flatMap(({ id, document }) =>
        document.lines.map(({ typeCode, units, damaged, dirty }) => ({
          receiptId: id,
          typeCode,
          counted: units,
          damaged,
          dirty,
        })),
      ),
    );
    await mark(
      tx,
      some.map(({ rowNo, reference }) => ({
        importId: run.importId,
        rowNo,
        side: 'receipt' as const,
        reference,
        outcome: 'posted' as const,
      })),
    );
  });
}
