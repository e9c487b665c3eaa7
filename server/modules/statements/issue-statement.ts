import { createHash } from 'node:crypto';
import { and, asc, eq, lt } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { files } from '@/db/schema/files';
import { statements } from '@/db/schema/statements';
import { addDays } from '@/shared/domain/calendar';
import { statementContent } from '@/shared/domain/statement/content';
import { Problem } from '@/shared/problems/problems';
import { statements as words } from '@/shared/text/en/statements';
import type { Deps } from '../../deps';
import { statementWorkbook, workbookMediaType } from '../../documents/statement-workbook';
import { operatorDay } from '../partners/operator-day';
import { issuedMail } from './letters';
import { addStep, lockedStatement, type StatementRecord } from './locked-statement';
import { writeToPartner } from './write-to-partner';

type Issuing = {
  statementId: string;
  personId: string | null;
  now: string;
  deps: Pick<Deps, 'files' | 'config'>;
};

/**
 * Issues a draft (RULES 4): from now on neither its figures nor its file change, the partner is told, and the days
 * to object run. A statement builds on the ones before it, so these must be out first.
 */
export async function issueStatement(tx: Transaction, issuing: Issuing): Promise<void> {
  const { statementId, now, deps, personId } = issuing;
  const row = await lockedStatement(tx, { id: statementId, scope: null });
  if (row.state === 'issued') throw new Problem('already issued', { data: { at: row.issuedAt } });
  await refuseBeforeEarlier(tx, row);
  const content = statementContent.parse(row.content);
  const today = await operatorDay(tx, now);
  const answerBy = addDays(today, content.partner.objectionDays);
  const bytes = await statementWorkbook({ content, sha256: row.sha256, issued: { on: today, answerBy } });
  const workbookFileId = await keepWorkbook(tx, {
    bytes,
    name: words.document.fileName(row.number),
    issuing,
  });
  await tx
    .update(statements)
    .set({ state: 'issued', issuedAt: now, issuedBy: personId, objectionUntil: answerBy, workbookFileId })
    .where(eq(statements.id, row.id));
  await addStep(tx, { statementId, step: 'issued', personId, at: now });
  const letter = issuedMail({
    operator: content.operator.name,
    month: content.month,
    total: content.total,
    currency: content.currency,
    answerBy,
    link: `${deps.config.PUBLIC_URL}/statements/${row.id}`,
  });
  const told = await writeToPartner(tx, { companyId: row.companyId, letter, now });
  if (told > 0) await addStep(tx, { statementId, step: 'mailed', personId: null, at: now });
}

async function refuseBeforeEarlier(tx: Transaction, row: StatementRecord): Promise<void> {
  const [waiting] = await tx
    .select({ month: statements.month })
    .from(statements)
    .where(
      and(
        eq(statements.companyId, row.companyId),
        lt(statements.month, row.month),
        eq(statements.state, 'draft'),
      ),
    )
    .orderBy(asc(statements.month))
    .limit(1);
  if (waiting) throw new Problem('earlier statement waits', { data: { month: waiting.month } });
}

type Keeping = { bytes: Buffer; name: string; issuing: Issuing };

/** The file sent is the file kept. It belongs to the operator; a partner gets it through its statement alone. */
async function keepWorkbook(tx: Transaction, { bytes, name, issuing }: Keeping): Promise<string> {
  const sha256 = createHash('sha256').update(bytes).digest('hex');
  await issuing.deps.files.put(sha256, bytes);
  const [operator] = await tx
    .select({ id: companies.id })
    .from(companies)
    .where(eq(companies.kind, 'operator'))
    .limit(1);
  if (!operator) throw new Error('there is no operator');
  const id = newId();
  await tx.insert(files).values({
    id,
    companyId: operator.id,
    name,
    mediaType: workbookMediaType,
    bytes: bytes.length,
    sha256,
    uploadedBy: issuing.personId,
    createdAt: issuing.now,
  });
  return id;
}
