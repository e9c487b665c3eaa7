import { minorUnits } from '@/shared/domain/currencies';
import { sum } from '@/shared/domain/money';
import type { ContentLine } from '@/shared/domain/statement/content';
import { statements } from '@/shared/text/en/statements';
import { lineTitle, reckonedFrom } from '@/shared/text/statement-words';
import { formatMonth } from '@/shared/text/format';
import { amountFormat, numberCell, rateFormat, unitsFormat } from '../number-formats';
import { type Cell, headRow, type SheetColumn } from './ruled-sheet';
import type { Sheeted } from './sheeted';

const words = statements.document;
type Table = { columns: SheetColumn[]; rows: Cell[][] };

const sumOf = (lines: readonly ContentLine[]) => numberCell(sum(lines.map((line) => line.amount)));
export const ownLines = ({ content }: Sheeted) => content.lines.filter((line) => line.correction === null);
export const correctionLines = ({ content }: Sheeted) =>
  content.lines.filter((line) => line.correction !== null);

/** The month's own lines and credits. */
export function moneySheet(sheeted: Sheeted): Table {
  const { content } = sheeted;
  const lines = ownLines(sheeted);
  const columns = [
    { head: words.line, width: 24 },
    { head: words.type, width: 16 },
    { head: words.reckonedFrom, width: 56 },
    { head: words.quantity, width: 12, format: unitsFormat },
    { head: words.rate, width: 12, format: rateFormat },
    { head: words.amount, width: 16, format: amountFormat(content.currency), sum: sumOf(lines) },
  ];
  const rows = lines.map((line): Cell[] => [
    lineTitle(line),
    line.typeCode ?? '',
    reckonedFrom(line, content),
    line.component === 'credit' ? null : line.quantity,
    rateOf(line),
    numberCell(line.amount),
  ]);
  return { columns, rows };
}

/** One figure for every unit of the line, where there is one. */
function rateOf(line: ContentLine): number | null {
  if (line.rate !== null) return numberCell(line.rate);
  const [only, ...more] = line.parts;
  return only && more.length === 0 && only.quantity === line.quantity ? numberCell(only.each) : null;
}

/** What earlier months are corrected by: what they come to now less what was billed so far. */
export function correctionsSheet(sheeted: Sheeted): Table {
  const { content } = sheeted;
  const lines = correctionLines(sheeted);
  const money = amountFormat(content.currency);
  const decimals = minorUnits(content.currency);
  const columns = [
    { head: words.month, width: 18 },
    { head: words.line, width: 24 },
    { head: words.type, width: 16 },
    { head: words.cause, width: 52 },
    { head: words.billed, width: 16, format: money },
    { head: words.now, width: 16, format: money },
    { head: words.difference, width: 16, format: money, sum: sumOf(lines) },
  ];
  const rows = lines.map((line, index): Cell[] => {
    const at = headRow + 1 + index;
    return [
      formatMonth(line.accountMonth),
      statements.component[line.component],
      line.typeCode ?? '',
      reckonedFrom(line, content),
      numberCell(line.correction?.billed ?? '0'),
      numberCell(line.correction?.now ?? '0'),
      { formula: `ROUND(F${at}-E${at},${decimals})`, result: numberCell(line.amount) },
    ];
  });
  return { columns, rows };
}
