import { sum } from '@/shared/domain/money';
import { ageBands } from '@/shared/domain/assessment/output';
import { statements } from '@/shared/text/en/statements';
import { amountFormat, numberCell, unitsFormat } from '../number-formats';
import { type Cell, headRow, type SheetColumn } from './ruled-sheet';
import type { Sheeted } from './sheeted';

const words = statements.document;
type Line = Sheeted['content']['assessment']['lines'][number];

/** Units and deposits by type. Closing figures are formulas over the row, as RULES 3 has the two identities. */
export function containersSheet({ content }: Sheeted): { columns: SheetColumn[]; rows: Cell[][] } {
  const { lines } = content.assessment;
  const money = amountFormat(content.currency);
  const units = (head: string, of: (line: Line) => number): SheetColumn => ({
    head,
    width: 11,
    format: unitsFormat,
    sum: lines.reduce((total, line) => total + of(line), 0),
  });
  const amount = (head: string, of: (line: Line) => string): SheetColumn => ({
    head,
    width: 14,
    format: money,
    sum: numberCell(sum(lines.map(of))),
  });
  const columns = [
    { head: words.type, width: 16 },
    { head: words.name, width: 26 },
    units(words.opening, (line) => line.units.opening),
    units(words.issuedUnits, (line) => line.units.issued),
    units(words.returned, (line) => line.units.returned),
    units(words.lost, (line) => line.units.lost),
    units(words.found, (line) => line.units.found),
    units(words.closing, (line) => line.units.closing),
    units(words.overReturned, (line) => line.units.overReturned),
    ...ageBands.map((band) => units(words.heldFor[band], (line) => line.ages[band] ?? 0)),
    amount(words.depositOpening, (line) => line.deposit.opening),
    amount(words.depositAsked, (line) => line.deposit.charged),
    amount(words.depositReleased, (line) => line.deposit.released),
    amount(words.depositKept, (line) => line.deposit.forfeited),
    amount(words.depositAgain, (line) => line.deposit.reinstated),
    amount(words.depositClosing, (line) => line.deposit.closing),
  ];
  return { columns, rows: lines.map((line, index) => rowOf(line, { at: headRow + 1 + index, content })) };
}

function rowOf(line: Line, { at, content }: { at: number; content: Sheeted['content'] }): Cell[] {
  const { units, deposit } = line;
  const closing = (formula: string, result: number): Cell => ({ formula, result });
  return [
    line.containerType,
    content.types.find((type) => type.code === line.containerType)?.name ?? '',
    units.opening,
    units.issued,
    units.returned,
    units.lost,
    units.found,
    closing(`C${at}+D${at}-E${at}-F${at}+G${at}`, units.closing),
    units.overReturned,
    ...ageBands.map((band) => line.ages[band] ?? 0),
    numberCell(deposit.opening),
    numberCell(deposit.charged),
    numberCell(deposit.released),
    numberCell(deposit.forfeited),
    numberCell(deposit.reinstated),
    closing(`O${at}+P${at}-Q${at}-R${at}+S${at}`, numberCell(deposit.closing)),
  ];
}
