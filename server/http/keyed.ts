import { createHash } from 'node:crypto';
import { and, eq } from 'drizzle-orm';
import { z } from 'zod';
import type { Transaction } from '@/db/client';
import { requests } from '@/db/schema/access';
import { Problem } from '@/shared/problems/problems';

/** Idempotency-Key as the IETF draft of that name has it; ours are UUIDs made by the client. */
export const idempotencyKey = z.string().regex(/^[A-Za-z0-9_-]{8,80}$/);

/** Hash of what is asked, independent of the order of object keys. */
export function contentHash(content: unknown): string {
  return createHash('sha256').update(canonical(content)).digest('hex');
}

/** JSON with sorted keys and no blanks. */
export function canonical(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(canonical).join(',')}]`;
  if (typeof value === 'object' && value !== null) {
    const entries = Object.entries(value).filter(([, part]) => part !== undefined);
    entries.sort(([a], [b]) => (a < b ? -1 : 1));
    return `{${entries.map(([name, part]) => `${JSON.stringify(name)}:${canonical(part)}`).join(',')}}`;
  }
  return JSON.stringify(value) ?? 'null';
}

type Asked = { personId: string; key: string; operation: string; hash: string; now: string };

/**
 * Takes the key, or finds what was answered to it before. Of several at once the first inserts the row and the
 * others wait on it: they see its answer after its commit, or take the key if it was rolled back.
 */
export async function takeKey(tx: Transaction, asked: Asked): Promise<{ answer: unknown } | null> {
  const [result] = await tx.insert(requests).ignore().values({
    personId: asked.personId,
    key: asked.key,
    operation: asked.operation,
    contentHash: asked.hash,
    status: 0,
    answer: null,
    createdAt: asked.now,
  });
  if (result.affectedRows === 1) return null;
  const [before] = await tx
    .select()
    .from(requests)
    .where(and(eq(requests.personId, asked.personId), eq(requests.key, asked.key)));
  if (!before) throw new Problem('failed here');
  if (before.operation !== asked.operation || before.contentHash !== asked.hash)
    throw new Problem('key used otherwise');
  return { answer: before.answer };
}

export async function keepAnswer(tx: Transaction, asked: Asked, answer: unknown): Promise<void> {
  await tx
    .update(requests)
    .set({ status: 200, answer })
    .where(and(eq(requests.personId, asked.personId), eq(requests.key, asked.key)));
}
