import { and, asc, eq, gt } from 'drizzle-orm';
import { importRows } from '@/db/schema/work';
import type { ImportCells } from '@/shared/contracts/imports';
import type { Deps } from '../../deps';
import { instantOf } from '../../deps';
import { readBookFacts } from './book-facts';
import { checkTable } from './check-table';
import type { ImportedDocument } from './documents';
import type { TableRow } from './read-table';

const rowsPerRead = 1000;

/**
 * The documents of the good rows, put together as they were for the preview. Months and terms are left to the posting,
 * which reports what it refuses.
 */
export async function readDocuments(deps: Deps, importId: string): Promise<readonly ImportedDocument[]> {
  const facts = await readBookFacts(deps.db, instantOf(deps.clock));
  const lenient = { ...facts, isClosed: () => false, hasTerms: () => true };
  const { documents } = await checkTable(goodRows(deps, importId), lenient);
  return documents;
}

async function* goodRows(deps: Deps, importId: string): AsyncGenerator<TableRow> {
  let after = 0;
  for (;;) {
    const rows = await deps.db
      .select({ rowNo: importRows.rowNo, cells: importRows.cells })
      .from(importRows)
      .where(and(eq(importRows.importId, importId), eq(importRows.bad, 0), gt(importRows.rowNo, after)))
      .orderBy(asc(importRows.rowNo))
      .limit(rowsPerRead);
    for (const { rowNo, cells } of rows) yield { rowNo, cells: cells as ImportCells };
    const last = rows.at(-1);
    if (!last || rows.length < rowsPerRead) return;
    after = last.rowNo;
  }
}
