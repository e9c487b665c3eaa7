import { sql } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { balances, dailyNets, type EntryKind, ledgerEntries, ledgerLines } from '@/db/schema/ledger';
import { refuseClosedMonth } from './month-gate';

/** So many units of a type go from one account to another; the entry balances by this shape. */
export type Move = { typeCode: string; from: number; to: number; units: number; chargedCompanyId?: string };

export type Entry = {
  kind: EntryKind;
  /** The day it happened, in the site's time zone. */
  valueDate: string;
  moves: readonly Move[];
  reason?: string;
  personId: string | null;
  shipmentId?: string;
  countId?: string;
  differenceId?: string;
  disputeId?: string;
  /** The entry that this one mends; only such an entry may reach into a closed month. */
  correctsEntryId?: number;
};

/** Writes an entry with its lines, and keeps balances and daily nets in the same transaction. Returns its number. */
export async function postEntry(tx: Transaction, entry: Entry): Promise<number> {
  if (entry.moves.length === 0) throw new Error('an entry moves something');
  if (entry.correctsEntryId === undefined) await refuseClosedMonth(tx, entry.valueDate);
  const { moves, ...head } = entry;
  const [written] = await tx.insert(ledgerEntries).values(head);
  const entryId = written.insertId;
  await tx.insert(ledgerLines).values(
    moves.map((move, index) => ({
      entryId,
      lineNo: index + 1,
      typeCode: move.typeCode,
      fromAccountId: move.from,
      toAccountId: move.to,
      units: move.units,
      valueDate: entry.valueDate,
      chargedCompanyId: move.chargedCompanyId ?? null,
    })),
  );
  await keepBalances(tx, { moves, day: entry.valueDate });
  return entryId;
}

type Change = { accountId: number; typeCode: string; by: number };

/** Rows are written in sorted order: sessions that meet wait for each other instead of deadlocking. */
async function keepBalances(
  tx: Transaction,
  { moves, day }: { moves: readonly Move[]; day: string },
): Promise<void> {
  const changes = netChanges(moves);
  if (changes.length === 0) return;
  await tx
    .insert(balances)
    .values(changes.map(({ accountId, typeCode, by }) => ({ accountId, typeCode, units: by })))
    .onDuplicateKeyUpdate({ set: { units: sql`${balances.units} + values(${sql.identifier('units')})` } });
  await tx
    .insert(dailyNets)
    .values(changes.map(({ accountId, typeCode, by }) => ({ accountId, typeCode, day, net: by })))
    .onDuplicateKeyUpdate({ set: { net: sql`${dailyNets.net} + values(${sql.identifier('net')})` } });
}

function netChanges(moves: readonly Move[]): Change[] {
  const net = new Map<string, Change>();
  const add = (change: Change): void => {
    const key = `${change.accountId}\u0000${change.typeCode}`;
    const held = net.get(key);
    if (held) held.by += change.by;
    else net.set(key, { ...change });
  };
  for (const { from, to, typeCode, units } of moves) {
    add({ accountId: from, typeCode, by: -units });
    add({ accountId: to, typeCode, by: units });
  }
  const byAccountAndType = (a: Change, b: Change): number =>
    a.accountId - b.accountId || (a.typeCode < b.typeCode ? -1 : a.typeCode > b.typeCode ? 1 : 0);
  return [...net.values()].filter((change) => change.by !== 0).sort(byAccountAndType);
}
