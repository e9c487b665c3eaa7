import { Workbook } from 'exceljs';
import { statements } from '@/shared/text/en/statements';
import { formatMonth } from '@/shared/text/format';
import { containersSheet } from './statement-workbook/containers-sheet';
import { correctionsSheet, moneySheet } from './statement-workbook/money-sheets';
import { differencesSheet, movementsSheet, termsSheet } from './statement-workbook/record-sheets';
import { ruledSheet } from './statement-workbook/ruled-sheet';
import type { Sheeted } from './statement-workbook/sheeted';
import { summarySheet } from './statement-workbook/summary-sheet';

const words = statements.document;
export const workbookMediaType = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

/** The spreadsheet of a statement, from its stored content alone. */
export async function statementWorkbook(sheeted: Sheeted): Promise<Buffer> {
  const { content, issued } = sheeted;
  const workbook = new Workbook();
  workbook.creator = content.operator.name;
  workbook.title = words.title(content.month);
  workbook.calcProperties.fullCalcOnLoad = true;
  summarySheet(workbook, sheeted);
  const state = issued ? words.issued(issued.on) : words.draft;
  const lead = `${content.partner.name}, ${formatMonth(content.month)}, ${content.number}. ${state}.`;
  const sheets = [
    [words.sheet.containers, containersSheet],
    [words.sheet.movements, movementsSheet],
    [words.sheet.money, moneySheet],
    [words.sheet.corrections, correctionsSheet],
    [words.sheet.differences, differencesSheet],
    [words.sheet.terms, termsSheet],
  ] as const;
  for (const [name, tableOf] of sheets) {
    ruledSheet(workbook, { name, title: name, lead, ...tableOf(sheeted) });
  }
  return Buffer.from(await workbook.xlsx.writeBuffer());
}
