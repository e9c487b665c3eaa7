import type { Workbook, Worksheet } from 'exceljs';
import { sum } from '@/shared/domain/money';
import { lineComponents } from '@/shared/domain/statement';
import { statements } from '@/shared/text/en/statements';
import { cellText } from '../cell-text';
import { amountFormat, numberCell } from '../number-formats';
import { correctionLines, ownLines } from './money-sheets';
import { type Cell, headRow } from './ruled-sheet';
import type { Sheeted } from './sheeted';

const words = statements.document;
const ink = 'FF1C2628';
type Row = { label: string; value: Cell; kind?: 'sum' | 'text' };

/** The first sheet: whose, when, what is payable; each figure points at the sheet that it comes from. */
export function summarySheet(workbook: Workbook, sheeted: Sheeted): Worksheet {
  const { content } = sheeted;
  const sheet = workbook.addWorksheet(words.sheet.summary, {
    views: [{ showGridLines: false }],
    pageSetup: { orientation: 'portrait', paperSize: 9, fitToPage: true, fitToWidth: 1, fitToHeight: 0 },
    headerFooter: { oddFooter: `&L&8${words.sheet.summary}&R&8${words.page}` },
  });
  sheet.columns = [{ width: 40 }, { width: 34 }];
  const title = sheet.getCell(1, 1);
  title.value = words.title(content.month);
  title.font = { size: 18, bold: true, color: { argb: ink } };
  sheet.getRow(1).height = 28;
  let at = 3;
  for (const row of headRows(sheeted)) write(sheet, (at += 1) - 1, { row, format: '@' });
  at += 1;
  for (const row of moneyRows(sheeted, at))
    write(sheet, (at += 1) - 1, { row, format: amountFormat(content.currency) });
  const notice = sheet.getCell(at + 1, 1);
  notice.value = statements.taxNotice;
  notice.font = { italic: true };
  notice.alignment = { wrapText: true, vertical: 'top' };
  sheet.mergeCells(at + 1, 1, at + 1, 2);
  sheet.getRow(at + 1).height = 30;
  write(sheet, at + 3, {
    row: { label: words.fingerprint, value: sheeted.sha256, kind: 'text' },
    format: '@',
  });
  return sheet;
}

function headRows({ content, issued }: Sheeted): Row[] {
  const text = (label: string, value: string): Row => ({ label, value, kind: 'text' });
  return [
    text(words.number, content.number),
    text(words.partner, content.partner.name),
    text(words.operator, content.operator.name),
    text(words.period, words.periodOf(content.from, content.to)),
    text(words.currency, content.currency),
    text(words.state, issued ? words.issued(issued.on) : words.draft),
    ...(issued ? [text(words.answerBy, statements.silence(issued.answerBy))] : []),
  ];
}

/** By component, then corrections, payable, tax and the total. `first` is the sheet's row of the first of them. */
function moneyRows(sheeted: Sheeted, first: number): Row[] {
  const { content } = sheeted;
  const rows: Row[] = [...componentRows(sheeted), correctionsRow(sheeted)];
  const payableAt = first + rows.length;
  rows.push({
    label: words.payable,
    value: { formula: `SUM(B${first}:B${payableAt - 1})`, result: numberCell(content.payable) },
    kind: 'sum',
  });
  const taxAt = payableAt + 1;
  for (const row of content.taxRows) rows.push(...taxRowsOf(row));
  const taxCells = content.taxRows.map((_row, index) => `B${taxAt + index * 4 + 3}`);
  rows.push({
    label: words.tax,
    value: { formula: taxCells.join('+') || '0', result: numberCell(content.tax) },
    kind: 'sum',
  });
  rows.push({
    label: words.total,
    value: { formula: `B${payableAt}+B${first + rows.length - 1}`, result: numberCell(content.total) },
    kind: 'sum',
  });
  return rows;
}

function componentRows(sheeted: Sheeted): Row[] {
  const lines = ownLines(sheeted);
  const last = headRow + Math.max(lines.length, 1);
  return lineComponents
    .filter((component) => lines.some((line) => line.component === component))
    .map((component) => {
      const label = statements.component[component];
      const amounts = lines.filter((line) => line.component === component).map((line) => line.amount);
      const range = (letter: string) => `${words.sheet.money}!$${letter}$${headRow + 1}:$${letter}$${last}`;
      const formula = `SUMIF(${range('A')},"${label}",${range('F')})`;
      return { label, value: { formula, result: numberCell(sum(amounts)) } };
    });
}

function correctionsRow(sheeted: Sheeted): Row {
  const lines = correctionLines(sheeted);
  const at = headRow + 1 + lines.length;
  const formula = lines.length === 0 ? '0' : `${words.sheet.corrections}!G${at}`;
  return {
    label: words.corrections,
    value: { formula, result: numberCell(sum(lines.map((line) => line.amount))) },
  };
}

function taxRowsOf(row: Sheeted['content']['taxRows'][number]): Row[] {
  return [
    { label: `${words.taxFees}`, value: numberCell(row.fees) },
    { label: words.taxDeposits[row.treatment], value: numberCell(row.deposits) },
    { label: words.taxBase, value: numberCell(row.base) },
    { label: words.taxAt(row.rate), value: numberCell(row.tax) },
  ];
}

function write(sheet: Worksheet, at: number, { row, format }: { row: Row; format: string }): void {
  const label = sheet.getCell(at, 1);
  label.value = cellText(row.label);
  label.numFmt = '@';
  const value = sheet.getCell(at, 2);
  value.value = typeof row.value === 'string' ? cellText(row.value) : row.value;
  value.numFmt = row.kind === 'text' ? '@' : format;
  value.alignment = { horizontal: row.kind === 'text' ? 'left' : 'right', wrapText: row.kind === 'text' };
  if (row.kind !== 'sum') return;
  for (const cell of [label, value]) {
    cell.font = { bold: true, color: { argb: ink } };
    cell.border = { top: { style: 'medium', color: { argb: ink } } };
  }
}
