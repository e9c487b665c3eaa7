import { PassThrough, type Readable } from 'node:stream';
import ExcelJS from 'exceljs';
import { cellText } from './cell-text';
import { dayCell, dayFormat, measureFormat, numberCell, unitsFormat } from './number-formats';

/** A column of a list on a sheet: text, whole units, a measured number or a day. */
export type SheetColumn<Row> = { head: string; width?: number } & (
  | { text: (row: Row) => string }
  | { units: (row: Row) => number | null }
  | { number: (row: Row) => number | string | null }
  | { day: (row: Row) => string | null }
);

type List<Row> = {
  /** Of the sheet: at most 31 characters, none of \ / ? * [ ] : */
  name: string;
  columns: readonly SheetColumn<Row>[];
  /** Read page by page while the file is written, so that a long list needs no more memory than a short one. */
  pages: AsyncIterable<readonly Row[]>;
};

/** A list as a spreadsheet: days are dates, units are numbers, text is never a formula. */
export function listWorkbook<Row>(list: List<Row>): Readable {
  const stream = new PassThrough();
  void write(list, stream).catch((error: unknown) => {
    stream.destroy(error instanceof Error ? error : new Error(String(error)));
  });
  return stream;
}

async function write<Row>({ name, columns, pages }: List<Row>, stream: PassThrough): Promise<void> {
  // The first page comes before the first byte: a list that is refused is no file.
  const reading = pages[Symbol.asyncIterator]();
  let page = await reading.next();
  const workbook = new ExcelJS.stream.xlsx.WorkbookWriter({
    stream,
    useSharedStrings: false,
    useStyles: true,
  });
  const sheet = workbook.addWorksheet(name, { views: [{ state: 'frozen', ySplit: 1 }] });
  sheet.columns = columns.map((column) => ({
    header: cellText(column.head),
    width: column.width ?? 14,
    style: { numFmt: formatOf(column) },
  }));
  sheet.getRow(1).font = { bold: true };
  sheet.getRow(1).commit();
  for (; !page.done; page = await reading.next())
    for (const row of page.value) sheet.addRow(columns.map((column) => valueOf(column, row))).commit();
  sheet.commit();
  await workbook.commit();
}

function formatOf<Row>(column: SheetColumn<Row>): string {
  if ('day' in column) return dayFormat;
  if ('number' in column) return measureFormat;
  return 'units' in column ? unitsFormat : '@';
}

function valueOf<Row>(column: SheetColumn<Row>, row: Row): string | number | Date | null {
  if ('text' in column) return cellText(column.text(row));
  if ('units' in column) return column.units(row);
  if ('number' in column) {
    const value = column.number(row);
    return value === null ? null : numberCell(value);
  }
  const day = column.day(row);
  return day === null ? null : dayCell(day);
}
