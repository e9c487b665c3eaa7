import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { outbox } from '@/db/schema/work';

export type Letter = { kind: string; subject: string; text: string };
type Sending = Letter & { to: { name: string; email: string }; now: string };

/** Writes a message into the outbox, in the transaction that causes it: it goes out if and only if that commits. */
export async function queueMail(tx: Transaction, { to, now, ...letter }: Sending): Promise<void> {
  const id = newId();
  await tx.insert(outbox).values({
    id,
    kind: letter.kind,
    toName: oneLine(to.name),
    toAddress: oneLine(to.email),
    subject: oneLine(letter.subject).slice(0, 200),
    text: letter.text.slice(0, 8000),
    messageId: `<${id}@tarekeep>`,
    state: 'waiting',
    notBefore: now,
    createdAt: now,
  });
}

/** A line break in a header would begin another header. */
function oneLine(text: string): string {
  return text.replace(/[\r\n\u2028\u2029]+/g, ' ').trim();
}
