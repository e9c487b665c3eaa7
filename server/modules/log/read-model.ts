import { and, desc, eq, like, lt, or, sql } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { log } from '@/db/schema/access';
import { companies, people } from '@/db/schema/companies';
import { outbox } from '@/db/schema/work';
import type { listLetters, listLog } from '@/shared/contracts/log';
import type { QueryOf } from '@/shared/contracts/operation';
import { Problem } from '@/shared/problems/problems';
import { cursor, cursorNumber, cutPage } from '../../http/page';
import { holdsText, likeText } from '../../http/search';

/** The log, newest first. */
export async function logPage(db: Database, query: QueryOf<typeof listLog>) {
  const after = cursor(query.after, 1);
  const rows = await db
    .select({ row: log, person: people.name, company: companies.name })
    .from(log)
    .leftJoin(people, eq(people.id, log.personId))
    .leftJoin(companies, eq(companies.id, log.companyId))
    .where(
      and(
        after ? lt(log.id, cursorNumber(after[0])) : undefined,
        query.person ? eq(log.personId, query.person) : undefined,
        query.subject ? eq(log.subjectId, query.subject) : undefined,
        query.outcome ? eq(log.outcome, query.outcome) : undefined,
        query.search ? or(actionIsLike(query.search), eq(log.requestId, query.search)) : undefined,
      ),
    )
    .orderBy(desc(log.id))
    .limit(query.limit + 1);
  const flat = rows.map(({ row, person, company }) => ({ ...row, person, company }));
  return cutPage(flat, query.limit, (row) => [String(row.id)]);
}

/** "settle difference", as the screen says it, finds "settleDifference". */
const actionIsLike = (typed: string) =>
  like(sql`replace(${log.action}, ' ', '')`, likeText(typed.replace(/\s+/g, '')));

/** Mail of the outbox, newest first. Ids grow with time. */
export async function lettersPage(db: Database, query: QueryOf<typeof listLetters>) {
  const after = cursor(query.after, 1);
  const rows = await db
    .select()
    .from(outbox)
    .where(
      and(
        after ? lt(outbox.id, after[0]) : undefined,
        query.state ? eq(outbox.state, query.state) : undefined,
        holdsText(query.search, outbox.toAddress, outbox.subject),
      ),
    )
    .orderBy(desc(outbox.id))
    .limit(query.limit + 1);
  return cutPage(rows, query.limit, (row) => [row.id]);
}

export async function letterOf(db: Database, id: string) {
  const [letter] = await db.select().from(outbox).where(eq(outbox.id, id));
  if (!letter) throw new Problem('not found');
  return letter;
}
