import { and, desc, eq, inArray, like, or } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { people } from '@/db/schema/companies';
import { months, statements } from '@/db/schema/statements';
import { jobs } from '@/db/schema/work';
import type { MonthJob, MonthRow, readMonth } from '@/shared/contracts/months';
import type { AnswerOf } from '@/shared/contracts/operation';
import { lastDayOfMonth, monthOf, nextMonth } from '@/shared/domain/calendar';
import { may, type Person } from '../../http/person';
import { operatorDay } from '../partners/operator-day';
import { draftResult } from '../statements/draft-month';
import { jobKeyOf, monthJobs } from './close-month';
import { earlierOpenMonth, laterClosed } from './month-order';
import { openItemsOf } from './open-items';

type Asked = { now: string; after: string | undefined; limit: number };

/** From the month of today back to the first with a movement. */
export async function monthsPage(db: Database, { now, after, limit }: Asked) {
  const rows = await db
    .select({ row: months, by: people.name })
    .from(months)
    .leftJoin(people, eq(people.id, months.closedBy))
    .orderBy(months.month);
  const held = new Map(rows.map((each) => [each.row.month, each]));
  const today = await operatorDay(db, now);
  const current = monthOf(today);
  const last = rows.at(-1)?.row.month ?? current;
  const all: string[] = [];
  for (let each = rows[0]?.row.month ?? current; each <= current || each <= last; each = nextMonth(each))
    all.push(each);
  const wanted = all.reverse().filter((month) => after === undefined || month < after);
  const page = wanted.slice(0, limit);
  const counts = await statementCounts(db, page);
  return {
    rows: page.map((month) => rowOf(month, { held: held.get(month), today, counts: counts.get(month) })),
    next: wanted.length > limit ? (page.at(-1) ?? null) : null,
  };
}

type Counts = MonthRow['statements'];
type Found = {
  held: { row: typeof months.$inferSelect; by: string | null } | undefined;
  today: string;
  counts: Counts | undefined;
};

function rowOf(month: string, { held, today, counts }: Found): MonthRow {
  return {
    month,
    state: held?.row.state ?? 'open',
    over: today > lastDayOfMonth(month),
    closedBy: held?.by ?? null,
    closedAt: held?.row.closedAt ?? null,
    reason: held?.row.reason ?? '',
    statements: counts ?? { drafts: 0, issued: 0, confirmed: 0, disputed: 0 },
  };
}

async function statementCounts(db: Database, of: readonly string[]): Promise<Map<string, Counts>> {
  const counts = new Map<string, Counts>();
  if (of.length === 0) return counts;
  const rows = await db
    .select({ month: statements.month, state: statements.state, answer: statements.answer })
    .from(statements)
    .where(inArray(statements.month, [...of]));
  for (const { month, state, answer } of rows) {
    const held = counts.get(month) ?? { drafts: 0, issued: 0, confirmed: 0, disputed: 0 };
    if (state === 'draft') held.drafts += 1;
    else held.issued += 1;
    if (answer === 'confirmed' || answer === 'confirmed by silence') held.confirmed += 1;
    if (answer === 'disputed') held.disputed += 1;
    counts.set(month, held);
  }
  return counts;
}

/** A month with what still stands open, its jobs, and what may be done with it now. */
export async function monthPage(
  db: Database,
  { month, person, now }: { month: string; person: Person; now: string },
): Promise<AnswerOf<typeof readMonth>> {
  const [held] = await db
    .select({ row: months, by: people.name })
    .from(months)
    .leftJoin(people, eq(people.id, months.closedBy))
    .where(eq(months.month, month));
  const today = await operatorDay(db, now);
  const counts = (await statementCounts(db, [month])).get(month);
  const row = rowOf(month, { held, today, counts });
  const closed = row.state === 'closed';
  const earlierOpen = closed ? null : await earlierOpenMonth(db, month);
  const able = may(person, 'close months');
  return {
    ...row,
    openItems: await openItemsOf(db, month),
    earlierOpen,
    jobs: await jobsOf(db, month),
    mayClose: able && !closed && row.over && earlierOpen === null,
    mayIssue: able && closed && row.statements.drafts > 0,
    mayDraft: able && closed && !(await laterClosed(db, month)),
  };
}

/** The latest job of each kind. */
async function jobsOf(db: Database, month: string): Promise<MonthJob[]> {
  const rows = await db
    .select()
    .from(jobs)
    .where(
      or(
        and(eq(jobs.kind, monthJobs.drafts), like(jobs.onceKey, `${jobKeyOf('drafts', month)}%`)),
        and(eq(jobs.kind, monthJobs.issue), like(jobs.onceKey, `${jobKeyOf('issue', month)}%`)),
      ),
    )
    .orderBy(desc(jobs.createdAt), desc(jobs.id));
  return (['drafts', 'issue'] as const).flatMap((kind) => {
    const latest = rows.find((job) => job.kind === monthJobs[kind]);
    if (!latest) return [];
    const result = draftResult.safeParse(latest.result);
    const refused = result.success ? result.data.refused : [];
    return [
      {
        kind,
        state: latest.state,
        done: latest.done,
        total: latest.total,
        refused: refused.map(({ companyId, name, why }) => ({ partner: { id: companyId, name }, why })),
        problem: latest.problem,
      },
    ];
  });
}
