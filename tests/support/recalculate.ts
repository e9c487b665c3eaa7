import type { ReadSheet } from './read-workbook';

/** Computes the formulas that our workbooks use, from the cells as read: + - over cells, SUM, SUMIF, ROUND. */
export function recalculated(book: Map<string, ReadSheet>, at: { sheet: string; cell: string }): number {
  const cell = book.get(at.sheet)?.cells.get(at.cell);
  if (!cell) return 0;
  if (cell.formula === undefined) return typeof cell.value === 'number' ? cell.value : 0;
  return evaluated(cell.formula, { book, sheet: at.sheet });
}

type Scope = { book: Map<string, ReadSheet>; sheet: string };

function evaluated(formula: string, scope: Scope): number {
  const sumIf = /^SUMIF\((.+?),"(.*)",(.+)\)$/.exec(formula);
  if (sumIf) return summedIf({ keys: sumIf[1] ?? '', wanted: sumIf[2] ?? '', values: sumIf[3] ?? '' }, scope);
  const sum = /^SUM\(([^()]+)\)$/.exec(formula);
  if (sum) return cellsOf(sum[1] ?? '', scope).reduce((total, at) => total + recalculated(scope.book, at), 0);
  const round = /^ROUND\(([^(),]+),(\d+)\)$/.exec(formula);
  if (round) return Number(evaluated(round[1] ?? '', scope).toFixed(Number(round[2])));
  const terms = [...formula.matchAll(/([+-]?)((?:'[^']+'|\w+)!)?(\$?[A-Z]+\$?\d+|\d+)/g)];
  if (terms.map((term) => term[0]).join('') !== formula)
    throw new Error(`formula not understood: ${formula}`);
  return terms.reduce((total, [, sign, sheet, of = '']) => {
    const value = /^\d+$/.test(of)
      ? Number(of)
      : recalculated(scope.book, cellAt(`${sheet ?? ''}${of}`, scope));
    return sign === '-' ? total - value : total + value;
  }, 0);
}

function summedIf(
  { keys, wanted, values }: { keys: string; wanted: string; values: string },
  scope: Scope,
): number {
  const amounts = cellsOf(values, scope);
  return cellsOf(keys, scope).reduce((total, { sheet, cell }, index) => {
    const amount = amounts[index];
    const isWanted = scope.book.get(sheet)?.cells.get(cell)?.value === wanted;
    return isWanted && amount ? total + recalculated(scope.book, amount) : total;
  }, 0);
}

function cellAt(reference: string, scope: Scope): { sheet: string; cell: string } {
  const [, sheet, cell = ''] = /^(?:'?([^'!]+)'?!)?(.+)$/.exec(reference) ?? [];
  return { sheet: sheet ?? scope.sheet, cell: cell.replace(/\$/g, '') };
}

function cellsOf(range: string, scope: Scope): { sheet: string; cell: string }[] {
  const [from = '', to = from] = range.split(':');
  const first = cellAt(from, scope);
  const [, letter, top] = /^([A-Z]+)(\d+)$/.exec(first.cell) ?? [];
  const bottom = /(\d+)$/.exec(to)?.[1] ?? top;
  const rows = Array.from({ length: Number(bottom) - Number(top) + 1 }, (_, index) => Number(top) + index);
  return rows.map((row) => ({ sheet: first.sheet, cell: `${letter}${row}` }));
}
