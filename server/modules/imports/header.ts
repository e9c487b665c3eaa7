import { type ImportColumn, importColumns, neededColumns } from '@/shared/contracts/imports';
import { text } from '@/shared/text/catalogue';
import { unreadable } from './unreadable';

/** Where each column of ours stands in the file. */
export type ColumnPlaces = Partial<Record<ImportColumn, number>>;

const plainly = (head: string): string => head.toLowerCase().replace(/[\s_.:*-]+/g, '');

const columnByHead = new Map(
  importColumns.flatMap((column) => [
    [plainly(text.imports.columns[column]), column] as const,
    [plainly(column), column] as const,
  ]),
);

/** Reads the heads, in whatever order and writing; columns that we do not know are passed over. */
export function readHeader(cells: readonly string[]): ColumnPlaces {
  const places: ColumnPlaces = {};
  cells.forEach((head, at) => {
    const column = columnByHead.get(plainly(head));
    if (column === undefined) return;
    if (places[column] !== undefined) throw unreadable('column twice', { columns: headOf(column) });
    places[column] = at;
  });
  const missing = neededColumns.filter((column) => places[column] === undefined);
  if (missing.length > 0) throw unreadable('columns missing', { columns: missing.map(headOf).join(', ') });
  return places;
}

const headOf = (column: ImportColumn): string => text.imports.columns[column];
