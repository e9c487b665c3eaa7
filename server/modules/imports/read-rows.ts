import { and, asc, desc, eq, gt, lt, or } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { importDocuments, importRows } from '@/db/schema/work';
import type { ImportCells, ImportFileRow, RowProblem } from '@/shared/contracts/imports';
import type { ImportDocument } from '@/shared/contracts/import-results';
import { cursorNumber } from '../../http/page';
import type { KeptProblem } from './import-marks';

type Page<Row> = { rows: Row[]; next: string | null };
type RowsAsked = {
  importId: string;
  after?: string | undefined;
  limit: number;
  only?: 'bad' | 'good' | undefined;
};

/** Rows of a file, the bad ones first; the key is "bad row". */
export async function pageOfRows(db: Reader, asked: RowsAsked): Promise<Page<ImportFileRow>> {
  const { importId, after, limit, only } = asked;
  const [bad = 0, rowNo = 0] = after === undefined ? [] : after.split(' ').map(cursorNumber);
  const rows = await db
    .select()
    .from(importRows)
    .where(
      and(
        eq(importRows.importId, importId),
        only === undefined ? undefined : eq(importRows.bad, only === 'bad' ? 1 : 0),
        after === undefined
          ? undefined
          : or(lt(importRows.bad, bad), and(eq(importRows.bad, bad), gt(importRows.rowNo, rowNo))),
      ),
    )
    .orderBy(desc(importRows.bad), asc(importRows.rowNo))
    .limit(limit + 1);
  const page = rows.slice(0, limit);
  const last = page.at(-1);
  return {
    rows: page.map((row) => ({
      rowNo: row.rowNo,
      cells: row.cells as ImportCells,
      problems: row.problems as RowProblem[],
    })),
    next: rows.length > limit && last ? `${last.bad} ${last.rowNo}` : null,
  };
}

type DocumentsAsked = {
  importId: string;
  after?: string | undefined;
  limit: number;
  outcome?: ImportDocument['outcome'] | undefined;
};

/** What became of the shipments of a file, in the order of the file. */
export async function pageOfShipments(db: Reader, asked: DocumentsAsked): Promise<Page<ImportDocument>> {
  const { importId, after, limit, outcome } = asked;
  const rows = await db
    .select()
    .from(importDocuments)
    .where(
      and(
        eq(importDocuments.importId, importId),
        eq(importDocuments.side, 'shipment'),
        outcome === undefined ? undefined : eq(importDocuments.outcome, outcome),
        after === undefined ? undefined : gt(importDocuments.rowNo, cursorNumber(after)),
      ),
    )
    .orderBy(asc(importDocuments.rowNo))
    .limit(limit + 1);
  const page = rows.slice(0, limit);
  return {
    rows: page.map((row) => ({
      rowNo: row.rowNo,
      reference: row.reference ?? '',
      outcome: row.outcome,
      shipmentId: row.shipmentId,
      problem: row.problem as KeptProblem | null,
    })),
    next: rows.length > limit ? String(page.at(-1)?.rowNo ?? '') : null,
  };
}
