import { and, asc, eq, gt } from 'drizzle-orm';
import { Readable } from 'node:stream';
import { stringify } from 'csv-stringify';
import type { Database } from '@/db/client';
import { importRows } from '@/db/schema/work';
import { type ImportCells, importColumns, type RowProblem } from '@/shared/contracts/imports';
import { text } from '@/shared/text/catalogue';
import type { FileAnswer } from '../../http/route';

const rowsPerRead = 1000;

/** The bad rows under the heads of the template, with their number and what is wrong in columns of their own. */
export function badRowsFile(db: Database, held: { id: string; fileName: string }): FileAnswer {
  const { columns, rowColumn, reasonColumn } = text.imports;
  const heads = [...importColumns.map((column) => columns[column]), rowColumn, reasonColumn];
  const written = Readable.from(linesOf(db, held.id)).pipe(
    stringify({ bom: true, delimiter: ';', escape_formulas: true, header: true, columns: heads }),
  );
  return {
    name: text.imports.badRowsFile(held.fileName),
    mediaType: 'text/csv; charset=utf-8',
    content: written,
  };
}

async function* linesOf(db: Database, importId: string): AsyncGenerator<string[]> {
  let after = 0;
  for (;;) {
    const rows = await db
      .select()
      .from(importRows)
      .where(and(eq(importRows.importId, importId), eq(importRows.bad, 1), gt(importRows.rowNo, after)))
      .orderBy(asc(importRows.rowNo))
      .limit(rowsPerRead);
    for (const { rowNo, cells, problems } of rows) {
      const held = cells as ImportCells;
      yield [
        ...importColumns.map((column) => held[column]),
        String(rowNo),
        inWords(problems as RowProblem[]),
      ];
    }
    const last = rows.at(-1);
    if (!last || rows.length < rowsPerRead) return;
    after = last.rowNo;
  }
}

const inWords = (problems: readonly RowProblem[]): string =>
  problems
    .map(({ column, reason, data }) => text.imports.problem(column, text.imports.reasons[reason](data)))
    .join(' ');
