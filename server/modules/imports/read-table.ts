import { type ImportCells, importColumns, mostImportRows } from '@/shared/contracts/imports';
import { kindOf } from './file-kind';
import { type ColumnPlaces, readHeader } from './header';
import { type RawRow, readCsv } from './read-csv';
import { readXlsx } from './read-xlsx';
import { unreadable } from './unreadable';

export type TableRow = { rowNo: number; cells: ImportCells };

const mostCell = 300;

/** The filled rows of a file by our columns; refuses what is not as named, cannot be read, or is too long. */
export async function* readTable(file: { name: string; bytes: Buffer }): AsyncGenerator<TableRow> {
  const source = kindOf(file) === 'xlsx' ? readXlsx(file.bytes) : readCsv(file.bytes);
  let places: ColumnPlaces | undefined;
  let rows = 0;
  for await (const raw of source) {
    if (isBlank(raw)) continue;
    if (places === undefined) {
      places = readHeader(raw.cells);
      continue;
    }
    rows += 1;
    if (rows > mostImportRows) throw unreadable('too many rows', { most: mostImportRows });
    yield { rowNo: raw.rowNo, cells: cellsOf(raw, places) };
  }
  if (rows === 0) throw unreadable(places === undefined ? 'columns missing' : 'no rows', { columns: '' });
}

const isBlank = ({ cells }: RawRow): boolean => cells.every((cell) => cell === '');

function cellsOf({ cells }: RawRow, places: ColumnPlaces): ImportCells {
  const found = importColumns.map((column) => {
    const place = places[column];
    return [column, (place === undefined ? '' : (cells[place] ?? '')).trim().slice(0, mostCell)] as const;
  });
  return Object.fromEntries(found) as ImportCells;
}
