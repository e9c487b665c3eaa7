import exceljs from 'exceljs';
import { and, asc, eq } from 'drizzle-orm';
import { stringify } from 'csv-stringify/sync';
import type { Reader } from '@/db/client';
import { companies, sites, terms } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { importColumns } from '@/shared/contracts/imports';
import { addDays } from '@/shared/domain/calendar';
import { text } from '@/shared/text/catalogue';
import type { FileAnswer } from '../../http/route';

const heads = importColumns.map((column) => text.imports.columns[column]);
const xlsxType = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

type Asked = { as: 'csv' | 'xlsx'; today: string };

/** The file to fill in, with rows of the book's own codes as examples to write over. */
export async function templateFile(db: Reader, { as, today }: Asked): Promise<FileAnswer> {
  const rows = await exampleRows(db, today);
  const name = `${text.imports.template.fileName}.${as}`;
  if (as === 'xlsx') return { name, mediaType: xlsxType, content: await workbookOf(rows) };
  const content = stringify([heads, ...rows], { bom: true, delimiter: ';', escape_formulas: true });
  return { name, mediaType: 'text/csv; charset=utf-8', content: Buffer.from(content) };
}

/** One shipment and its receipt between a plant and a partner, left a week ago. */
async function exampleRows(db: Reader, today: string): Promise<string[][]> {
  const places = await db
    .select({ code: sites.code, kind: companies.kind, companyId: companies.id })
    .from(sites)
    .innerJoin(companies, eq(companies.id, sites.companyId))
    .where(eq(sites.active, true))
    .orderBy(asc(sites.code));
  const plant = places.find(({ kind }) => kind === 'operator')?.code ?? '';
  const partner = places.find(({ kind }) => kind === 'partner');
  const types = await typesWithTerms(db, partner?.companyId ?? '');
  const lane = ['EM-0001', plant, partner?.code ?? ''];
  const line = (side: 'shipment' | 'receipt', day: string) =>
    types.map((code, at) => [
      text.imports.sides[side],
      ...lane,
      day,
      code,
      String(400 - 200 * at),
      ...(side === 'receipt' ? ['0', '0'] : ['', '']),
    ]);
  return [...line('shipment', addDays(today, -7)), ...line('receipt', addDays(today, -6))];
}

async function typesWithTerms(db: Reader, companyId: string): Promise<string[]> {
  const rows = await db
    .selectDistinct({ code: terms.typeCode })
    .from(terms)
    .innerJoin(containerTypes, eq(containerTypes.code, terms.typeCode))
    .where(and(eq(terms.companyId, companyId), eq(containerTypes.active, true)))
    .orderBy(asc(terms.typeCode))
    .limit(2);
  return rows.map(({ code }) => code);
}

async function workbookOf(rows: readonly string[][]): Promise<Buffer> {
  const book = new exceljs.Workbook();
  const sheet = book.addWorksheet(text.imports.template.sheet, { views: [{ state: 'frozen', ySplit: 1 }] });
  sheet.addRow(heads).font = { bold: true };
  for (const row of rows) sheet.addRow(row.map(typedCell));
  sheet.columns.forEach((column, at) => {
    column.width = importColumns[at] === 'reference' ? 20 : 16;
    // Codes and references stay text: a sheet would drop the leading zeros of a number.
    if (importColumns[at] === 'reference') column.numFmt = '@';
    if (importColumns[at] === 'date') column.numFmt = 'yyyy-mm-dd';
  });
  const help = book.addWorksheet(text.imports.template.help);
  for (const line of text.imports.template.helpLines) help.addRow([line]);
  help.getColumn(1).width = 110;
  return Buffer.from(await book.xlsx.writeBuffer());
}

function typedCell(cell: string, at: number): string | number | Date | null {
  const column = importColumns[at];
  if (cell === '') return null;
  if (column === 'date') return new Date(`${cell}T00:00:00.000Z`);
  return column === 'units' || column === 'damaged' || column === 'dirty' ? Number(cell) : cell;
}
