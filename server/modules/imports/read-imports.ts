import { and, desc, eq, lt } from 'drizzle-orm';
import { alias } from 'drizzle-orm/mysql-core';
import type { Reader } from '@/db/client';
import { people } from '@/db/schema/companies';
import { imports, jobs } from '@/db/schema/work';
import type { ImportDetail, ImportRow, ImportState, ImportTotals } from '@/shared/contracts/imports';
import { Problem } from '@/shared/problems/problems';
import { cursor, cutPage } from '../../http/page';
import { numbersOf } from './read-numbers';

type ListAsked = { after?: string | undefined; limit: number; state?: ImportState | undefined };

/** Imports, newest first; their ids are in the order of time. */
export async function listImportRows(
  db: Reader,
  { after, limit, state }: ListAsked,
): Promise<{ rows: ImportRow[]; next: string | null }> {
  const seen = cursor(after, 1);
  const rows = await db
    .select({ held: imports, by: people.name })
    .from(imports)
    .leftJoin(people, eq(people.id, imports.createdBy))
    .where(
      and(
        seen ? lt(imports.id, seen[0]) : undefined,
        state === undefined ? undefined : eq(imports.state, state),
      ),
    )
    .orderBy(desc(imports.id))
    .limit(limit + 1);
  const page = cutPage(rows, limit, ({ held }) => [held.id]);
  return { rows: page.rows.map(({ held, by }) => headOf(held, by)), next: page.next };
}

const headOf = (held: typeof imports.$inferSelect, by: string | null): ImportRow => ({
  id: held.id,
  fileName: held.fileName,
  state: held.state,
  rowsGood: held.rowsGood,
  rowsBad: held.rowsBad,
  by,
  createdAt: held.createdAt,
});

const confirmers = alias(people, 'confirmers');

export async function readImportDetail(
  db: Reader,
  { id, today }: { id: string; today: string },
): Promise<ImportDetail> {
  const [row] = await db
    .select({ held: imports, by: people.name, confirmedBy: confirmers.name, job: jobs })
    .from(imports)
    .leftJoin(people, eq(people.id, imports.createdBy))
    .leftJoin(confirmers, eq(confirmers.id, imports.confirmedBy))
    .leftJoin(jobs, eq(jobs.id, imports.jobId))
    .where(eq(imports.id, id));
  if (!row) throw new Problem('not found');
  const { held, by, confirmedBy, job } = row;
  return {
    ...headOf(held, by),
    totals: held.totals as ImportTotals,
    progress: job ? { done: job.done, of: job.total } : null,
    broken: held.state === 'failed',
    confirmedBy,
    confirmedAt: held.confirmedAt,
    endedAt: held.endedAt,
    numbers: held.state === 'done' ? await numbersOf(db, { importId: id, today }) : null,
  };
}

/** The head of an import that exists. */
export async function importHead(db: Reader, id: string): Promise<{ id: string; fileName: string }> {
  const [held] = await db
    .select({ id: imports.id, fileName: imports.fileName })
    .from(imports)
    .where(eq(imports.id, id));
  if (!held) throw new Problem('not found');
  return held;
}
