import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { companies, people } from '@/db/schema/companies';
import { disputeFiles, disputeMessages, disputes } from '@/db/schema/differences';
import { files } from '@/db/schema/files';
import { type DisputeDetail, type DisputeMessage, undecided } from '@/shared/contracts/disputes';
import type { StoredFile } from '@/shared/contracts/files';
import { Problem } from '@/shared/problems/problems';
import { may, scopeOf } from '../../http/person';
import { disputeRow, money, type Seen, selectDisputes, type SelectedDispute } from './dispute-rows';

/** The dispute with its thread, for its company and the operator; otherwise as if there were none. */
export async function readDispute(
  db: Reader,
  { id, seen }: { id: string; seen: Seen },
): Promise<DisputeDetail> {
  const scope = scopeOf(seen.person);
  const [selected] = await selectDisputes(db)
    .where(and(eq(disputes.id, id), scope ? eq(disputes.companyId, scope) : undefined))
    .limit(1);
  if (!selected) throw new Problem('not found');
  const { dispute, currency, lineAmount } = selected;
  const { acceptedAmount } = dispute;
  return {
    ...disputeRow(selected, seen),
    typeCode: dispute.typeCode,
    countId: dispute.countId,
    lineAmount: lineAmount === null ? null : money(lineAmount, currency),
    acceptedUnits: dispute.acceptedUnits,
    acceptedAmount: acceptedAmount === null ? null : money(acceptedAmount, currency),
    messages: await threadOf(db, id),
    may: mayOf(selected, seen),
  };
}

function mayOf({ dispute }: SelectedDispute, { person }: Seen): DisputeDetail['may'] {
  const isUndecided = undecided.includes(dispute.state);
  const isOwn = dispute.companyId === person.companyId && may(person, 'open disputes');
  return {
    answer: isUndecided && scopeOf(person) === null && may(person, 'answer disputes'),
    reply: isUndecided && isOwn,
    withdraw: isUndecided && isOwn,
  };
}

async function threadOf(db: Reader, disputeId: string): Promise<DisputeMessage[]> {
  const rows = await db
    .select({ message: disputeMessages, company: companies.name, kind: companies.kind, by: people.name })
    .from(disputeMessages)
    .innerJoin(companies, eq(companies.id, disputeMessages.companyId))
    .leftJoin(people, eq(people.id, disputeMessages.personId))
    .where(eq(disputeMessages.disputeId, disputeId))
    .orderBy(asc(disputeMessages.id));
  const papers = await papersOf(
    db,
    rows.map((row) => row.message.id),
  );
  return rows.map(({ message, company, kind, by }) => ({
    id: message.id,
    step: message.step,
    text: message.text,
    side: kind,
    company,
    by,
    at: message.at,
    files: papers.filter((paper) => paper.messageId === message.id).map((paper) => paper.file),
  }));
}

async function papersOf(
  db: Reader,
  messageIds: readonly string[],
): Promise<{ messageId: string; file: StoredFile }[]> {
  if (messageIds.length === 0) return [];
  const rows = await db
    .select({ messageId: disputeFiles.messageId, file: files })
    .from(disputeFiles)
    .innerJoin(files, eq(files.id, disputeFiles.fileId))
    .where(inArray(disputeFiles.messageId, [...messageIds]))
    .orderBy(asc(files.id));
  return rows.map(({ messageId, file }) => ({
    messageId,
    file: {
      id: file.id,
      name: file.name,
      bytes: file.bytes,
      mediaType: file.mediaType as StoredFile['mediaType'],
    },
  }));
}

/** A paper that hangs on a message of this dispute. */
export async function disputeFile(
  db: Reader,
  { id, fileId, seen }: { id: string; fileId: string; seen: Pick<Seen, 'person'> },
): Promise<typeof files.$inferSelect> {
  const scope = scopeOf(seen.person);
  const [row] = await db
    .select({ file: files })
    .from(disputeFiles)
    .innerJoin(disputeMessages, eq(disputeMessages.id, disputeFiles.messageId))
    .innerJoin(disputes, eq(disputes.id, disputeMessages.disputeId))
    .innerJoin(files, eq(files.id, disputeFiles.fileId))
    .where(and(eq(disputes.id, id), eq(files.id, fileId), scope ? eq(disputes.companyId, scope) : undefined))
    .limit(1);
  if (!row) throw new Problem('not found');
  return row.file;
}
