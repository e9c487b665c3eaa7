import { and, eq } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import type { companies } from '@/db/schema/companies';
import { statementLines, statements, statementSteps } from '@/db/schema/statements';
import type { StatementContent } from '@/shared/domain/statement/content';
import { contentHash } from '../../http/keyed';
import { draftContent } from './draft-content';

type Drafting = { partner: typeof companies.$inferSelect; month: string; now: string };
export type Drafted = 'drafted' | 'nothing to say' | 'issued before';

/**
 * Writes the draft of one partner and month, over an earlier draft of it. Refuses as the assessment does.
 * There is one statement for a partner and month, however often and by however many this is done.
 */
export async function draftStatement(tx: Transaction, { partner, month, now }: Drafting): Promise<Drafted> {
  const content = await draftContent(tx, { partner, month });
  const [held] = await tx
    .select({ id: statements.id, state: statements.state })
    .from(statements)
    .where(and(eq(statements.companyId, partner.id), eq(statements.month, month)))
    .for('update');
  if (held?.state === 'issued') return 'issued before';
  if (!content) return 'nothing to say';
  const written = {
    number: content.number,
    currency: content.currency,
    payable: content.payable,
    tax: content.tax,
    content,
    sha256: contentHash(content),
  };
  if (held) {
    await tx.update(statements).set(written).where(eq(statements.id, held.id));
    await tx.delete(statementLines).where(eq(statementLines.statementId, held.id));
    await writeLines(tx, held.id, content);
    return 'drafted';
  }
  const id = newId();
  await tx.insert(statements).values({
    id,
    companyId: partner.id,
    month,
    state: 'draft',
    answer: 'awaited',
    createdAt: now,
    ...written,
  });
  await tx.insert(statementSteps).values({ statementId: id, step: 'drafted', personId: null, at: now });
  await writeLines(tx, id, content);
  return 'drafted';
}

async function writeLines(tx: Transaction, statementId: string, { lines }: StatementContent): Promise<void> {
  if (lines.length === 0) return;
  await tx.insert(statementLines).values(
    lines.map((line, index) => ({
      id: line.id,
      statementId,
      lineNo: index + 1,
      component: line.component,
      accountMonth: line.accountMonth,
      typeCode: line.typeCode,
      quantity: line.quantity,
      rate: line.rate,
      reckonedFrom: { parts: line.parts, correction: line.correction, credit: line.credit },
      amount: line.amount,
    })),
  );
}
