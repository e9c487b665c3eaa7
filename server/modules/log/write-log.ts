import type { Reader } from '@/db/client';
import { log } from '@/db/schema/access';
import type { Person } from '../../http/person';
import type { Circumstances } from '../../http/route';

type LogRow = {
  at: Circumstances;
  person: Pick<Person, 'id' | 'companyId'> | null;
  action: string;
  outcome: string;
  subject?: { kind: string; id: string | null };
  detail?: Record<string, unknown>;
};

/** Writes who did what. Never a password, a token or the content of a message. */
export async function writeLog(db: Reader, row: LogRow): Promise<void> {
  await db.insert(log).values({
    at: row.at.now,
    personId: row.person?.id ?? null,
    companyId: row.person?.companyId ?? null,
    action: row.action,
    outcome: row.outcome,
    subjectKind: row.subject?.kind ?? null,
    subjectId: row.subject?.id ?? null,
    detail: row.detail ?? null,
    requestId: row.at.requestId,
    address: row.at.address.slice(0, 60),
  });
}
