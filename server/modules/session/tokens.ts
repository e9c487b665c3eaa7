import { createHash, randomBytes } from 'node:crypto';
import { and, eq, gt, isNull } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { people, personTokens } from '@/db/schema/companies';
import { Problem } from '@/shared/problems/problems';
import { hashPassword } from './password';

const hour = 3_600_000;
const lifetime = { invitation: 14 * 24 * hour, reset: hour };

const hashOf = (token: string): string => createHash('sha256').update(token).digest('hex');

/** Makes a link token of 256 random bits; the database keeps only its hash. Earlier ones of the person end. */
export async function makeToken(
  tx: Transaction,
  { personId, purpose, now }: { personId: string; purpose: 'invitation' | 'reset'; now: string },
): Promise<string> {
  const token = randomBytes(32).toString('base64url');
  await tx
    .update(personTokens)
    .set({ usedAt: now })
    .where(and(eq(personTokens.personId, personId), isNull(personTokens.usedAt)));
  await tx.insert(personTokens).values({
    id: newId(),
    personId,
    purpose,
    tokenHash: hashOf(token),
    expiresAt: new Date(Date.parse(now) + lifetime[purpose]).toISOString(),
    createdAt: now,
  });
  return token;
}

/** Uses a token once: sets the password and ends every session of the person. */
export async function choosePasswordBy(
  tx: Transaction,
  { token, password, now }: { token: string; password: string; now: string },
): Promise<string> {
  const [held] = await tx
    .select()
    .from(personTokens)
    .where(
      and(
        eq(personTokens.tokenHash, hashOf(token)),
        isNull(personTokens.usedAt),
        gt(personTokens.expiresAt, now),
      ),
    )
    .for('update');
  if (!held) throw new Problem('link not valid');
  await tx.update(personTokens).set({ usedAt: now }).where(eq(personTokens.id, held.id));
  await setPassword(tx, { personId: held.personId, password, now });
  return held.personId;
}

export async function setPassword(
  tx: Transaction,
  { personId, password, now }: { personId: string; password: string; now: string },
): Promise<void> {
  const passwordHash = await hashPassword(password);
  await tx.update(people).set({ passwordHash, sessionsFrom: now }).where(eq(people.id, personId));
}
