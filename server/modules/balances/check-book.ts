import { type SQL, sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import type { Deps } from '../../deps';
import { instantOf } from '../../deps';
import type { Scheduled } from '../../jobs/schedule';
import { writeLog } from '../log/write-log';

export type BookDifference = { accountId: number; typeCode: string; kept: number; lines: number };
export type BookCheck = { balances: BookDifference[]; dailyNets: BookDifference[] };

/** Compares what is kept beside the ledger with what its lines add up to (RULES 1). Each comparison is one statement, so one view of the data. */
export async function checkBook(db: Reader): Promise<BookCheck> {
  const sums = sql`
    select account_id, type_code, sum(units) as units from (
      select to_account_id as account_id, type_code, units from ledger_lines
      union all select from_account_id, type_code, -units from ledger_lines) l group by account_id, type_code`;
  const daily = sql`
    select account_id, type_code, day, sum(units) as units from (
      select to_account_id as account_id, type_code, value_date as day, units from ledger_lines
      union all select from_account_id, type_code, value_date, -units from ledger_lines) l
    group by account_id, type_code, day`;
  const sides = sql`sum(kept) as kept, sum(\`lines\`) as \`lines\``;
  return {
    balances: await differing(
      db,
      sql`select account_id as accountId, type_code as typeCode, ${sides} from (
            select account_id, type_code, units as kept, 0 as \`lines\` from balances
            union all select account_id, type_code, 0, units from (${sums}) s) b
          group by account_id, type_code having sum(kept) <> sum(\`lines\`) limit 100`,
    ),
    dailyNets: await differing(
      db,
      sql`select account_id as accountId, type_code as typeCode, ${sides} from (
            select account_id, type_code, day, net as kept, 0 as \`lines\` from daily_nets
            union all select account_id, type_code, day, 0, units from (${daily}) s) b
          group by account_id, type_code, day having sum(kept) <> sum(\`lines\`) limit 100`,
    ),
  };
}

type Row = { accountId: number; typeCode: string; kept: string; lines: string };

async function differing(db: Reader, query: SQL): Promise<BookDifference[]> {
  const [rows] = await db.execute(query);
  return (rows as unknown as Row[]).map((row) => ({
    ...row,
    kept: Number(row.kept),
    lines: Number(row.lines),
  }));
}

export const bookSubject = { kind: 'book', id: 'book' } as const;

/** Every day; what differs is logged for the administrator, who sees it under Today. */
export const bookCheck: Scheduled = {
  name: 'book check',
  every: 'day',
  run: async (deps: Deps) => {
    const found = await checkBook(deps.db);
    const differs = found.balances.length + found.dailyNets.length > 0;
    if (differs) deps.logger.error({ found }, 'the book does not add up');
    await writeLog(deps.db, {
      at: { requestId: 'book check', address: '', now: instantOf(deps.clock) },
      person: null,
      action: 'checkBook',
      outcome: differs ? 'differs' : 'adds up',
      subject: bookSubject,
      ...(differs ? { detail: found } : {}),
    });
  },
};
