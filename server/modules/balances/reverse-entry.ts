import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { people } from '@/db/schema/companies';
import { accounts, ledgerEntries, ledgerLines, partnerEvents } from '@/db/schema/ledger';
import { adjustmentKinds } from '@/shared/contracts/balances';
import { Problem } from '@/shared/problems/problems';
import { postEntry } from '../ledger/post-entry';
import { refuseWhatCannotBe } from '../ledger/reckonable';
import { recordEvents } from '../ledger/record-events';
import { operatorDay } from '../partners/operator-day';

export type Reversing = { entryId: number; reason: string; personId: string | null; now: string };

type Entry = typeof ledgerEntries.$inferSelect;
type Line = typeof ledgerLines.$inferSelect;

/**
 * Takes an adjustment back by an entry that names it, on the same value date, and its events with it (RULES 1). Being a
 * correction it may reach into a closed month; what that changes shows in the next statement (RULES 4).
 */
export async function reverseEntry(tx: Transaction, reversing: Reversing): Promise<{ entryId: number }> {
  const { entry, lines } = await lockedAdjustment(tx, reversing.entryId);
  await refuseSecond(tx, entry.id);
  const entryId = await postEntry(tx, {
    kind: 'correction',
    valueDate: entry.valueDate,
    moves: lines.map((line) => ({
      typeCode: line.typeCode,
      units: line.units,
      from: line.toAccountId,
      to: line.fromAccountId,
    })),
    reason: reversing.reason,
    personId: reversing.personId,
    correctsEntryId: entry.id,
  });
  await takeBackEvents(tx, { reversing, entryId });
  return { entryId };
}

async function lockedAdjustment(tx: Transaction, id: number): Promise<{ entry: Entry; lines: Line[] }> {
  const [entry] = await tx.select().from(ledgerEntries).where(eq(ledgerEntries.id, id));
  const isAdjustment =
    entry?.shipmentId === null && (adjustmentKinds as readonly string[]).includes(entry.kind);
  if (!entry || !isAdjustment) throw new Problem('not found');
  const lines = await tx
    .select()
    .from(ledgerLines)
    .where(eq(ledgerLines.entryId, id))
    .orderBy(asc(ledgerLines.lineNo));
  // Entries cannot be locked by a user who may not change them; the sites they touch can.
  await tx
    .select({ id: accounts.id })
    .from(accounts)
    .where(
      and(
        eq(accounts.kind, 'site'),
        inArray(
          accounts.id,
          lines.flatMap((line) => [line.fromAccountId, line.toAccountId]),
        ),
      ),
    )
    .orderBy(asc(accounts.id))
    .for('update');
  return { entry, lines };
}

async function refuseSecond(tx: Transaction, id: number): Promise<void> {
  const [first] = await tx
    .select({ at: ledgerEntries.recordedAt, by: people.name })
    .from(ledgerEntries)
    .leftJoin(people, eq(people.id, ledgerEntries.personId))
    .where(eq(ledgerEntries.correctsEntryId, id));
  if (first) throw new Problem('already settled', { data: { by: first.by, at: first.at } });
}

async function takeBackEvents(
  tx: Transaction,
  { reversing, entryId }: { reversing: Reversing; entryId: number },
): Promise<void> {
  const events = await tx.select().from(partnerEvents).where(eq(partnerEvents.entryId, reversing.entryId));
  if (events.length === 0) return;
  await recordEvents(
    tx,
    events.map((event) => ({
      companyId: event.companyId,
      date: event.date,
      typeCode: event.typeCode,
      kind: 'corrected' as const,
      quantity: -event.quantity,
      correctsId: event.id,
      entryId,
      cause: `${event.cause} taken back`.slice(0, 200),
    })),
  );
  await refuseWhatCannotBe(tx, {
    companyIds: events.map((event) => event.companyId),
    today: await operatorDay(tx, reversing.now),
  });
}
