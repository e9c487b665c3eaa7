import { and, asc, desc, eq, gt, lt, or } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { importDocuments, importRows } from '@/db/schema/work';
import type { ImportCells, ImportFileRow, RowProblem } from '@/shared/contracts/imports';
import type { ImportDocument } from '@/shared/contracts/import-results';
import { cursor, cursorNumber, cutPage } from '../../http/page';
import type { KeptProblem } from './import-marks';

type Page<Row> = { rows: Row[]; next: string | null };
type RowsAsked = {
  importId: string;
  after?: string | undefined;
  limit: number;
  only?: 'bad' | 'good' | undefined;
};

/** Rows of a file, the bad ones first; the key is bad and row. */
export async function pageOfRows(db: Reader, asked: RowsAsked): Promise<Page<ImportFileRow>> {
  const { importId, after, limit, only } = asked;
  const seen = cursor(after, 2);
  const rows = await db
    .select()
    .from(importRows)
    .where(
      and(
        eq(importRows.importId, importId),
        only === undefined ? undefined : eq(importRows.bad, only === 'bad' ? 1 : 0),
        seen ? behind({ bad: cursorNumber(seen[0]), rowNo: cursorNumber(seen[1]) }) : undefined,
      ),
    )
    .orderBy(desc(importRows.bad), asc(importRows.rowNo))
    .limit(limit + 1);
  const page = cutPage(rows, limit, (row) => [String(row.bad), String(row.rowNo)]);
  return {
    rows: page.rows.map((row) => ({
      rowNo: row.rowNo,
      cells: row.cells as ImportCells,
      problems: row.problems as RowProblem[],
    })),
    next: page.next,
  };
}

const behind = ({ bad, rowNo }: { bad: number; rowNo: number }) =>
  or(lt(importRows.bad, bad), and(eq(importRows.bad, bad), gt(importRows.rowNo, rowNo)));

type DocumentsAsked = {
  importId: string;
  after?: string | undefined;
  limit: number;
  outcome?: ImportDocument['outcome'] | undefined;
};

/** What became of the shipments of a file, in the order of the file. */
export async function pageOfShipments(db: Reader, asked: DocumentsAsked): Promise<Page<ImportDocument>> {
  const { importId, after, limit, outcome } = asked;
  const seen = cursor(after, 1);
  const rows = await db
    .select()
    .from(importDocuments)
    .where(
      and(
        eq(importDocuments.importId, importId),
        eq(importDocuments.side, 'shipment'),
        outcome === undefined ? undefined : eq(importDocuments.outcome, outcome),
        seen ? gt(importDocuments.rowNo, cursorNumber(seen[0])) : undefined,
      ),
    )
    .orderBy(asc(importDocuments.rowNo))
    .limit(limit + 1);
  const page = cutPage(rows, limit, (row) => [String(row.rowNo)]);
  return {
    rows: page.rows.map((row) => ({
      rowNo: row.rowNo,
      reference: row.reference ?? '',
      outcome: row.outcome,
      shipmentId: row.shipmentId,
      problem: row.problem as KeptProblem | null,
    })),
    next: page.next,
  };
}
