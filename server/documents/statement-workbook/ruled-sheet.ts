import type { CellValue, Column, Workbook, Worksheet } from 'exceljs';
import { statements } from '@/shared/text/en/statements';
import { cellText } from '../cell-text';

const words = statements.document;
export type Cell = string | number | Date | null | { formula: string; result: number };
export type SheetColumn = {
  head: string;
  width: number;
  format?: string;
  /** Summed below the last row; the exact sum, as the result that is stored with the formula. */
  sum?: number;
};
type Ruled = {
  name: string;
  title: string;
  lead: string;
  columns: readonly SheetColumn[];
  rows: readonly (readonly Cell[])[];
};

/** Rows above the first data row: title, lead, a blank, the head. */
export const headRow = 4;
const ink = 'FF1C2628';
const soft = 'FF56615F';
const rule = 'FFDDD6C6';

export function letterOfColumn(index: number): string {
  return String.fromCharCode(65 + index);
}

/** A sheet like the ruled ones on the page: title, frozen head, thin rules, the sum under a heavy one. */
export function ruledSheet(workbook: Workbook, { name, title, lead, columns, rows }: Ruled): Worksheet {
  const sheet = workbook.addWorksheet(name, {
    views: [{ state: 'frozen', ySplit: headRow, showGridLines: false }],
    pageSetup: {
      orientation: columns.length > 7 ? 'landscape' : 'portrait',
      paperSize: 9,
      fitToPage: true,
      fitToWidth: 1,
      fitToHeight: 0,
      printTitlesRow: `${headRow}:${headRow}`,
      margins: { left: 0.5, right: 0.5, top: 0.6, bottom: 0.7, header: 0.3, footer: 0.3 },
    },
    headerFooter: { oddFooter: `&L&8${name}&R&8${words.page}` },
  });
  sheet.columns = columns.map(({ width, format }): Partial<Column> => ({
    width,
    ...(format ? { style: { numFmt: format } } : {}),
  }));
  writeTitle(sheet, title, lead);
  writeHead(sheet, columns);
  rows.forEach((row, index) => writeRow(sheet, { at: headRow + 1 + index, row, columns }));
  if (rows.length === 0) plainText(sheet, headRow + 1, words.none);
  else if (columns.some((column) => column.sum !== undefined)) writeSums(sheet, columns, rows.length);
  return sheet;
}

function writeTitle(sheet: Worksheet, title: string, lead: string): void {
  const head = sheet.getCell(1, 1);
  head.value = cellText(title);
  head.font = { size: 16, bold: true, color: { argb: ink } };
  head.numFmt = '@';
  sheet.getRow(1).height = 24;
  const below = sheet.getCell(2, 1);
  below.value = cellText(lead);
  below.font = { size: 10, color: { argb: soft } };
  below.numFmt = '@';
}

function plainText(sheet: Worksheet, row: number, text: string): void {
  const cell = sheet.getCell(row, 1);
  cell.value = cellText(text);
  cell.numFmt = '@';
  cell.font = { italic: true, color: { argb: soft } };
}

function writeHead(sheet: Worksheet, columns: readonly SheetColumn[]): void {
  columns.forEach((column, index) => {
    const cell = sheet.getCell(headRow, index + 1);
    cell.value = cellText(column.head);
    cell.numFmt = '@';
    cell.font = { bold: true, size: 10, color: { argb: soft } };
    cell.alignment = { wrapText: true, vertical: 'bottom', horizontal: column.format ? 'right' : 'left' };
    cell.border = { bottom: { style: 'medium', color: { argb: ink } } };
  });
  sheet.getRow(headRow).height = 30;
}

type Writing = { at: number; row: readonly Cell[]; columns: readonly SheetColumn[] };

function writeRow(sheet: Worksheet, { at, row, columns }: Writing): void {
  row.forEach((value, index) => {
    const cell = sheet.getCell(at, index + 1);
    cell.value = valueOf(value);
    const format = columns[index]?.format;
    cell.numFmt = typeof value === 'string' || !format ? '@' : format;
    cell.alignment = {
      vertical: 'top',
      horizontal: format ? 'right' : 'left',
      ...(typeof value === 'string' ? { wrapText: true } : {}),
    };
    cell.border = { bottom: { style: 'thin', color: { argb: rule } } };
  });
}

function valueOf(value: Cell): CellValue {
  return typeof value === 'string' ? cellText(value) : value;
}

/** One formula for each summed column, with its result stored: right in programs that do not recalculate. */
function writeSums(sheet: Worksheet, columns: readonly SheetColumn[], count: number): void {
  const at = headRow + 1 + count;
  columns.forEach((column, index) => {
    const cell = sheet.getCell(at, index + 1);
    cell.border = { top: { style: 'medium', color: { argb: ink } } };
    cell.font = { bold: true, color: { argb: ink } };
    if (index === 0) {
      cell.value = words.sum;
      cell.numFmt = '@';
    }
    if (column.sum === undefined) return;
    const letter = letterOfColumn(index);
    cell.value = { formula: `SUM(${letter}${headRow + 1}:${letter}${at - 1})`, result: column.sum };
    if (column.format) cell.numFmt = column.format;
  });
}
