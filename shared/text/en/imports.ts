import type { ImportColumn, RowReason } from '../../contracts/imports';
import { formatDay, formatMonth, formatUnits } from '../format';
import { plural } from '../plural';

type Data = Record<string, string | number>;
const said = (data: Data, key = 'value') => String(data[key] ?? '');

const columns: Record<ImportColumn, string> = {
  side: 'Side',
  reference: 'Reference',
  from: 'From site',
  to: 'To site',
  date: 'Date',
  type: 'Container type',
  units: 'Units',
  damaged: 'Damaged',
  dirty: 'To clean',
};

/** One sentence for each reason why a row cannot be posted; the column's head stands before it. */
const reasons: Record<RowReason, (data: Data) => string> = {
  empty: () => 'is empty.',
  'side unknown': (data) => `“${said(data)}” is neither shipment nor receipt.`,
  'reference missing': () => 'is missing. A shipment needs one; only a receipt may go without.',
  'too long': (data) => `has more than ${formatUnits(Number(data.most))} characters.`,
  'not plain text': () => 'holds signs that cannot be printed.',
  'site unknown': (data) => `“${said(data)}” is no site of the book.`,
  'same site': (data) => `“${said(data)}” is where it left from as well.`,
  'type unknown': (data) => `“${said(data)}” is no container type of the book.`,
  'no terms': (data) => `${said(data, 'company')} has no terms for “${said(data)}” on that day.`,
  'not a day': (data) => `“${said(data)}” is no day. Write it as 2026-03-04 or 4.3.2026.`,
  future: (data) => `${formatDay(said(data))} is still to come.`,
  'month closed': (data) => `${formatMonth(said(data))} is closed.`,
  'not a number': (data) => `“${said(data)}” is no whole number. Write 1000, without signs between.`,
  negative: (data) => `${said(data)} is below 0.`,
  fraction: (data) => `${said(data)} is not whole.`,
  'nothing declared': () => 'is 0: a shipment declares at least 1.',
  'too many units': (data) => `${said(data)} is more than one row can hold.`,
  'more than counted': (data) => `${said(data)} is more than the ${said(data, 'counted')} that were counted.`,
  'only for receipts': () => 'belongs to receipts. Leave it empty here.',
  'same reference, other shipment': (data) =>
    `“${said(data)}” stands in row ${said(data, 'row')} with another site or day.`,
  'type twice': (data) => `“${said(data)}” stands in row ${said(data, 'row')} of this shipment already.`,
};

const rows = (count: number) => `${formatUnits(count)} ${plural(count, { one: 'row', other: 'rows' })}`;

export const imports = {
  columns,
  reasons,
  /** "Row 12, Units: 12.5 is not whole." */
  problem: (column: ImportColumn, reason: string) => `${columns[column]}: ${reason}`,
  rowName: (rowNo: number) => `Row ${formatUnits(rowNo)}`,
  rows,
  sides: { shipment: 'shipment', receipt: 'receipt' },
  reasonColumn: 'What is wrong',
  rowColumn: 'Row',
  template: {
    sheet: 'Movements',
    help: 'How to fill it in',
    helpLines: [
      'One row for each container type of a shipment or a receipt.',
      'Side: shipment for what left, receipt for what was counted.',
      'Reference: the number on the delivery note. A receipt may go without, or name several.',
      'From site, To site, Container type: the codes of the book.',
      'Date: the day it left or was counted, as 2026-03-04 or 4.3.2026.',
      'Units: whole numbers. Damaged and To clean are part of the counted units, for receipts only.',
      'Rows without a reference that follow each other with the same sites and day are one receipt, until a type comes again.',
    ],
    fileName: 'tarekeep-movements',
  },
  badRowsFile: (fileName: string) => `bad rows of ${fileName.replace(/\.[^.]+$/, '')}.csv`,
  countNotes: {
    otherSite: (site: string) => `In the file it stands as counted at ${site}.`,
    several: (references: string) => `Counted together with ${references}.`,
  },
  bookedNote: (reference: string) => `On the receipt: ${reference}`,
  receiptOf: (day: string) => `the receipt of ${formatDay(day, 'date')}`,
} as const;
