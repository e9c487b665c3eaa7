import { eq } from 'drizzle-orm';
import type { Reader, Transaction } from '@/db/client';
import { importDocuments } from '@/db/schema/work';
import { Problem } from '@/shared/problems/problems';

/** A problem as it is kept beside what was not posted. */
export type KeptProblem = { code: Problem['code']; data: Record<string, unknown> };

/** The problem to keep, or the error thrown on when it is none of ours. */
export function keptProblem(error: unknown): KeptProblem {
  if (error instanceof Problem) return { code: error.code, data: error.data ?? {} };
  throw error;
}

/** Rows of an import whose document has been dealt with. */
export async function markedRows(db: Reader, importId: string): Promise<Set<number>> {
  const rows = await db
    .select({ rowNo: importDocuments.rowNo })
    .from(importDocuments)
    .where(eq(importDocuments.importId, importId));
  return new Set(rows.map(({ rowNo }) => rowNo));
}

export type Mark = typeof importDocuments.$inferInsert;

/** Writes marks in the transaction of what they stand for. A mark twice is an error: two runs must not go side by side. */
export async function mark(tx: Transaction, marks: readonly Mark[]): Promise<void> {
  if (marks.length > 0) await tx.insert(importDocuments).values([...marks]);
}
