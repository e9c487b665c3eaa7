import { createHash } from 'node:crypto';
import { and, asc, desc, gt, inArray, lt } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { ledgerEntries, ledgerLines, ledgerSeals } from '@/db/schema/ledger';
import type { Deps } from '../../deps';
import { instantOf } from '../../deps';
import { canonical } from '../../http/keyed';

/** Entries younger than this may still have an older neighbour whose transaction has not committed. */
const settledAfterMs = 120_000;
const batch = 1000;

type Sealed = { entryId: number; hash: string };

/** Hash of an entry with its lines, chained to the hash before it: a row changed later breaks the chain at its entry. */
async function hashesAfter(db: Database, from: Sealed, olderThan: string): Promise<Sealed[]> {
  const entries = await db
    .select()
    .from(ledgerEntries)
    .where(and(gt(ledgerEntries.id, from.entryId), lt(ledgerEntries.recordedAt, olderThan)))
    .orderBy(asc(ledgerEntries.id))
    .limit(batch);
  if (entries.length === 0) return [];
  const lines = await db
    .select()
    .from(ledgerLines)
    .where(
      inArray(
        ledgerLines.entryId,
        entries.map((entry) => entry.id),
      ),
    )
    .orderBy(asc(ledgerLines.entryId), asc(ledgerLines.lineNo));
  const linesOf = new Map<number, typeof lines>();
  for (const line of lines) linesOf.set(line.entryId, [...(linesOf.get(line.entryId) ?? []), line]);
  let before = from.hash;
  return entries.map((entry) => {
    const content = canonical({ before, entry, lines: linesOf.get(entry.id) ?? [] });
    before = createHash('sha256').update(content).digest('hex');
    return { entryId: entry.id, hash: before };
  });
}

const beginning: Sealed = { entryId: 0, hash: '' };

/** Seals what has settled since the last seal, one row an entry. Several servers may try: a seal is written once. */
export async function sealLedger(deps: Deps): Promise<void> {
  const now = deps.clock.now();
  const olderThan = new Date(now.getTime() - settledAfterMs).toISOString();
  const [last] = await deps.db.select().from(ledgerSeals).orderBy(desc(ledgerSeals.throughEntryId)).limit(1);
  let from = last ? { entryId: last.throughEntryId, hash: last.hash } : beginning;
  for (;;) {
    const sealed = await hashesAfter(deps.db, from, olderThan);
    const end = sealed.at(-1);
    if (!end) return;
    const sealedAt = instantOf(deps.clock);
    await deps.db
      .insert(ledgerSeals)
      .ignore()
      .values(sealed.map(({ entryId, hash }) => ({ throughEntryId: entryId, hash, sealedAt })));
    from = end;
  }
}

export type Verification = { sealedEntries: number; firstBroken: number | null };

/** Reckons the chain anew and names the first entry whose seal does not fit. */
export async function verifyLedger(db: Database): Promise<Verification> {
  const seals = await db.select().from(ledgerSeals).orderBy(asc(ledgerSeals.throughEntryId));
  const kept = new Map(seals.map((seal) => [seal.throughEntryId, seal.hash]));
  const lastSealed = seals.at(-1)?.throughEntryId ?? 0;
  const found = new Set<number>();
  for (let from = beginning; from.entryId < lastSealed;) {
    const sealed = await hashesAfter(db, from, '9999-12-31T00:00:00.000Z');
    for (const { entryId, hash } of sealed) {
      if (entryId > lastSealed) break;
      found.add(entryId);
      if (kept.get(entryId) !== hash) return { sealedEntries: kept.size, firstBroken: entryId };
    }
    const end = sealed.at(-1);
    if (!end) break;
    from = end;
  }
  const gone = seals.find((seal) => !found.has(seal.throughEntryId));
  return { sealedEntries: kept.size, firstBroken: gone?.throughEntryId ?? null };
}
