import { and, eq } from 'drizzle-orm';
import { pino } from 'pino';
import { statements } from '@/db/schema/statements';
import type { Deps } from '@/server/deps';
import { folderStore } from '@/server/files/file-store';
import { readPerson, type Person } from '@/server/http/person';
import { jobHandlers } from '@/server/jobs/all-work';
import { runNextJob } from '@/server/jobs/job-queue';
import { closeMonth, issueAll } from '@/server/modules/months/close-month';
import { confirmStatement } from '@/server/modules/statements/answer-statement';
import { addDays } from '@/shared/domain/calendar';
import type { Book } from './book';
import { companies } from './scenario-companies';

/** What the jobs are handed, with the clock standing on a day of the past. */
export function depsOn(book: Book, now: string): Deps {
  const config = {
    PUBLIC_URL: process.env.PUBLIC_URL ?? `http://localhost:${process.env.PORT ?? 4100}`,
  } as Deps['config'];
  return {
    config,
    pool: undefined as never,
    db: book.db,
    files: folderStore(process.env.FILES_DIR ?? '.local/files'),
    logger: pino({ level: 'error' }),
    clock: { now: () => new Date(now) },
  };
}

export async function personNamed(book: Book, email: string): Promise<Person> {
  const person = await readPerson(book.db, book.cast.personIds.get(email) ?? '');
  if (!person) throw new Error(`nobody has ${email}`);
  return person;
}

/** Mikkel closes a month, looks through and issues its statements; the partners confirm, but for those named. */
export async function endMonth(
  book: Book,
  { month, on, unanswered }: { month: string; on: string; unanswered: readonly string[] },
): Promise<void> {
  const mikkel = await personNamed(book, 'mikkel@fennmark.example');
  const now = `${on}T08:15:00.000Z`;
  const deps = depsOn(book, now);
  const act = { month, personId: mikkel.id, now };
  await book.onDay((tx) =>
    closeMonth(tx, { ...act, reason: 'What is open is known to both sides and follows as corrections.' }),
  );
  while (await runNextJob(deps, jobHandlers));
  await book.onDay((tx) => issueAll(tx, { ...act, key: 'demo' }));
  while (await runNextJob(deps, jobHandlers));
  for (const company of companies) {
    const manager = company.people.find((person) => person.roles.includes('manager'));
    if (manager && !unanswered.includes(company.code))
      await confirm(book, { month, email: manager.email, on: addDays(on, 4) });
  }
}

async function confirm(
  book: Book,
  { month, email, on }: { month: string; email: string; on: string },
): Promise<void> {
  const person = await personNamed(book, email);
  await book.onDay(async (tx) => {
    const [row] = await tx
      .select({ id: statements.id })
      .from(statements)
      .where(and(eq(statements.companyId, person.companyId), eq(statements.month, month)));
    if (row) await confirmStatement(tx, { statementId: row.id, person, now: `${on}T10:40:00.000Z` });
  });
}
