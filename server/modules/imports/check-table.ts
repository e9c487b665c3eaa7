import { setImmediate as letOthers } from 'node:timers/promises';
import type { ImportTotals, RowProblem } from '@/shared/contracts/imports';
import type { BookFacts } from './book-facts';
import { checkRow } from './check-row';
import { Documents, type ImportedDocument } from './documents';
import type { TableRow } from './read-table';
import { rowSchemaFor } from './row-schema';

export type JudgedRow = TableRow & { problems: RowProblem[] };

/** After so many rows other requests get their turn: some 10 ms of work. */
const rowsAtAStretch = 250;

/** Judges every row of a table by itself and against the rows before it. */
export async function checkTable(
  table: AsyncIterable<TableRow> | Iterable<TableRow>,
  facts: BookFacts,
): Promise<{ rows: JudgedRow[]; documents: readonly ImportedDocument[] }> {
  const rules = { facts, schema: rowSchemaFor(facts) };
  const documents = new Documents();
  const rows: JudgedRow[] = [];
  for await (const { rowNo, cells } of table) {
    const { row, problems } = checkRow(cells, rules);
    const clash = row ? documents.add({ ...row, rowNo }) : null;
    rows.push({ rowNo, cells, problems: clash ? [clash] : problems });
    if (rows.length % rowsAtAStretch === 0) await letOthers();
  }
  return { rows, documents: documents.list };
}

export function totalsOf(documents: readonly ImportedDocument[]): ImportTotals {
  const days = documents.map(({ day }) => day).sort();
  const unitsOf = (side: 'shipment' | 'receipt'): number =>
    documents
      .filter((document) => document.side === side)
      .reduce((sum, { lines }) => sum + lines.reduce((units, line) => units + line.units, 0), 0);
  return {
    shipments: documents.filter(({ side }) => side === 'shipment').length,
    receipts: documents.filter(({ side }) => side === 'receipt').length,
    declared: unitsOf('shipment'),
    counted: unitsOf('receipt'),
    firstDay: days[0] ?? null,
    lastDay: days.at(-1) ?? null,
  };
}
