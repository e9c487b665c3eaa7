import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { disputeFiles, disputeMessages } from '@/db/schema/differences';
import type { DisputeMessage } from '@/shared/contracts/disputes';
import type { Person } from '../../http/person';
import { checkOwnFiles } from '../files/own-files';

type Adding = {
  disputeId: string;
  step: DisputeMessage['step'];
  text: string;
  fileIds: readonly string[];
  person: Person;
  now: string;
};

/** Adds a word to the thread, with its papers. */
export async function addMessage(tx: Transaction, adding: Adding): Promise<string> {
  const { disputeId, step, text, fileIds, person, now } = adding;
  await checkOwnFiles(tx, person, { ids: fileIds, path: 'fileIds' });
  const id = newId();
  await tx.insert(disputeMessages).values({
    id,
    disputeId,
    step,
    text,
    companyId: person.companyId,
    personId: person.id,
    at: now,
  });
  if (fileIds.length > 0)
    await tx.insert(disputeFiles).values(fileIds.map((fileId) => ({ messageId: id, fileId })));
  return id;
}
