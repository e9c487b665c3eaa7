import { inArray, type SQL, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { ledgerEntries } from '@/db/schema/ledger';
import {
  adjustmentKinds,
  type listMovements as contract,
  type MovementRow,
} from '@/shared/contracts/balances';
import type { AnswerOf, ParamsOf, QueryOf } from '@/shared/contracts/operation';
import { cursor, cursorNumber, cutPage } from '../../http/page';
import { may, type Person } from '../../http/person';
import { accountNames, placeOf } from '../ledger/account-names';
import { accountsOfPart } from './parts-sql';
import { visibleBalance } from './read-model';

type Asked = { params: ParamsOf<typeof contract>; query: QueryOf<typeof contract>; person: Person };
type Found = {
  entryId: number;
  lineNo: number;
  inward: number;
  units: number;
  valueDate: string;
  fromId: number;
  toId: number;
  kind: string;
  recordedAt: string;
  reason: string;
  correctsEntryId: number | null;
  shipmentId: string | null;
  reference: string | null;
  by: string | null;
};

/** One page of the lines that add up to a part of a balance, newest first. */
export async function movementRows(db: Reader, asked: Asked): Promise<AnswerOf<typeof contract>> {
  await visibleBalance(db, asked);
  const { limit } = asked.query;
  const [found] = await db.execute(statement(asked, keyOf(asked.query.after)));
  const lines = found as unknown as Found[];
  const { rows, next } = cutPage(lines, limit, ({ valueDate, entryId, lineNo, inward }) =>
    [valueDate, entryId, lineNo, inward].map(String),
  );
  return { rows: await named(db, rows, asked.person), next };
}

type Key = { day: string; entry: number; line: number; inward: number };

function keyOf(after: string | undefined): Key | null {
  const seen = cursor(after, 4);
  if (seen === null) return null;
  const [day, entry = '', line = '', inward = ''] = seen;
  return { day, entry: cursorNumber(entry), line: cursorNumber(line), inward: cursorNumber(inward) };
}

/** Lines into the accounts and lines out of them, each read from its own index, put together in order. */
function statement({ params, query }: Asked, key: Key | null): SQL {
  const of = accountsOfPart(query.part, {
    companyId: params.company,
    asOf: query.asOf,
    siteId: query.site,
  });
  const half = (inward: 0 | 1): SQL => sql`
    select l.entry_id, l.line_no, ${inward} as inward, ${inward === 1 ? sql`l.units` : sql`-l.units`} as units,
           l.value_date, l.from_account_id, l.to_account_id
    from accounts a left join shipments s on s.id = a.shipment_id
    join ledger_lines l on ${inward === 1 ? sql`l.to_account_id` : sql`l.from_account_id`} = a.id
    where ${of} and l.type_code = ${params.type}
      ${query.asOf === undefined ? sql`` : sql`and l.value_date <= ${query.asOf}`} ${key ? beforeKey(key, inward) : sql``}
    order by l.value_date desc, l.entry_id desc, l.line_no desc limit ${query.limit + 1}`;
  return sql`
    select m.entry_id as entryId, m.line_no as lineNo, m.inward, m.units, m.value_date as valueDate,
           m.from_account_id as fromId, m.to_account_id as toId, e.kind, e.recorded_at as recordedAt, e.reason,
           e.corrects_entry_id as correctsEntryId, e.shipment_id as shipmentId, s.reference, p.name as \`by\`
    from ((${half(1)}) union all (${half(0)})) m
    join ledger_entries e on e.id = m.entry_id
    left join shipments s on s.id = e.shipment_id left join people p on p.id = e.person_id
    order by m.value_date desc, m.entry_id desc, m.line_no desc, m.inward desc limit ${query.limit + 1}`;
}

function beforeKey({ day, entry, line, inward: last }: Key, inward: 0 | 1): SQL {
  const line_ = inward < last ? sql`l.line_no <= ${line}` : sql`l.line_no < ${line}`;
  return sql`and l.value_date <= ${day} and (l.value_date < ${day}
    or l.entry_id < ${entry} or (l.entry_id = ${entry} and ${line_}))`;
}

async function named(db: Reader, page: readonly Found[], person: Person): Promise<MovementRow[]> {
  const names = await accountNames(
    db,
    page.flatMap((line) => [line.fromId, line.toId]),
  );
  const reversed = await reversedOf(db, page);
  return page.map((line) => ({
    id: `${line.entryId}-${line.lineNo}-${line.inward}`,
    entryId: line.entryId,
    kind: line.kind,
    valueDate: line.valueDate,
    recordedAt: `${line.recordedAt.replace(' ', 'T')}Z`,
    units: Number(line.units),
    from: placeOf(names.get(line.fromId)),
    to: placeOf(names.get(line.toId)),
    shipment: line.shipmentId && line.reference ? { id: line.shipmentId, reference: line.reference } : null,
    by: line.by,
    reason: line.reason,
    correctsEntryId: line.correctsEntryId,
    mayReverse: may(person, 'adjust stock') && isAdjustment(line) && !reversed.has(line.entryId),
  }));
}

function isAdjustment(line: Found): boolean {
  return line.shipmentId === null && (adjustmentKinds as readonly string[]).includes(line.kind);
}

async function reversedOf(db: Reader, page: readonly Found[]): Promise<Set<number | null>> {
  const ids = page.filter(isAdjustment).map((line) => line.entryId);
  if (ids.length === 0) return new Set();
  const rows = await db
    .select({ id: ledgerEntries.correctsEntryId })
    .from(ledgerEntries)
    .where(inArray(ledgerEntries.correctsEntryId, ids));
  return new Set(rows.map((row) => row.id));
}
