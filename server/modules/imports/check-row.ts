import type { z } from 'zod';
import {
  type ImportCells,
  type ImportColumn,
  importColumns,
  type RowProblem,
  type RowReason,
} from '@/shared/contracts/imports';
import { monthOf } from '@/shared/domain/calendar';
import type { SiteWithCompany } from '../partners/sites';
import type { BookFacts } from './book-facts';
import type { ParsedRow, RowSchema } from './row-schema';

export type GoodRow = {
  side: 'shipment' | 'receipt';
  reference: string | null;
  from: SiteWithCompany;
  to: SiteWithCompany;
  day: string;
  typeCode: string;
  units: number;
  damaged: number;
  dirty: number;
};

export type CheckedRow = { row: GoodRow; problems: RowProblem[] } | { row: null; problems: RowProblem[] };
type Rules = { schema: RowSchema; facts: BookFacts };
/** The cells that could be read; the others have their problem already. */
type Row = Partial<ParsedRow>;

/** Reads one row by the schema and tells all that is wrong with it at once. */
export function checkRow(cells: ImportCells, { schema, facts }: Rules): CheckedRow {
  const { row, problems } = readCells(cells, schema);
  problems.push(...clashesOf(row, facts));
  if (problems.length > 0) return { row: null, problems };
  const { date, type, ...rest } = row as ParsedRow;
  return { row: { ...rest, day: date, typeCode: type }, problems };
}

function readCells(cells: ImportCells, schema: RowSchema): { row: Row; problems: RowProblem[] } {
  const problems: RowProblem[] = [];
  const read = importColumns.flatMap((column) => {
    const parsed = schema.shape[column].safeParse(cells[column]);
    if (parsed.success) return [[column, parsed.data] as const];
    problems.push(...parsed.error.issues.map((issue) => problemOf(column, issue)));
    return [];
  });
  return { row: Object.fromEntries(read) as Row, problems };
}

function problemOf(column: ImportColumn, issue: z.core.$ZodIssue): RowProblem {
  const data = issue.code === 'custom' ? (issue.params?.data as RowProblem['data'] | undefined) : undefined;
  return { column, reason: issue.message as RowReason, data: data ?? {} };
}

const is = (column: ImportColumn, reason: RowReason, data: RowProblem['data'] = {}): RowProblem => ({
  column,
  reason,
  data,
});

function* clashesOf(row: Row, facts: BookFacts): Generator<RowProblem> {
  const isShipment = row.side === 'shipment';
  if (isShipment && row.reference === null) yield is('reference', 'reference missing');
  const most = isShipment ? 40 : 120;
  if ((row.reference?.length ?? 0) > most) yield is('reference', 'too long', { most });
  if (row.from && row.to && row.from.id === row.to.id) yield is('to', 'same site', { value: row.to.code });
  if (isShipment && row.units === 0) yield is('units', 'nothing declared');
  yield* wrongDay(row, facts);
  yield* wrongShares(row);
  yield* missingTerms(row, facts);
}

function* wrongDay(row: Row, facts: BookFacts): Generator<RowProblem> {
  const place = row.side === 'shipment' ? row.from : row.to;
  if (row.date === undefined) return;
  if (facts.isClosed(monthOf(row.date))) yield is('date', 'month closed', { value: monthOf(row.date) });
  else if (place && row.date > facts.todayAt(place.timeZone)) yield is('date', 'future', { value: row.date });
}

function* wrongShares(row: Row): Generator<RowProblem> {
  for (const column of ['damaged', 'dirty'] as const) {
    const share = row[column] ?? 0;
    if (share === 0) continue;
    if (row.side === 'shipment') yield is(column, 'only for receipts');
    else if (row.units !== undefined && share > row.units)
      yield is(column, 'more than counted', { value: share, counted: row.units });
  }
}

/** Without terms an issue or a damage could not be reckoned (RULES 3.14). */
function* missingTerms(row: Row, facts: BookFacts): Generator<RowProblem> {
  const { from, to, type, date } = row;
  if (!from || !to || type === undefined || date === undefined) return;
  const charged = (row.damaged ?? 0) + (row.dirty ?? 0) > 0 ? [to, from] : [to];
  const without = charged.find(
    ({ company }) =>
      company.kind === 'partner' && !facts.hasTerms({ companyId: company.id, typeCode: type, day: date }),
  );
  if (without) yield is('type', 'no terms', { company: without.company.name, value: type });
}
