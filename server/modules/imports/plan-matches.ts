import { eq, inArray } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { imports, receiptMatches, receipts } from '@/db/schema/work';
import { inTransaction } from '@/db/transaction';
import { dayInZone } from '@/shared/domain/calendar';
import type { Reconciliation, ReconciliationInput } from '@/shared/domain/reconciliation';
import { countedBefore } from './counted-before';
import { openReceipts, openShipments, operatorZone } from './open-papers';
import { reconcileApart } from './reconcile-apart';
import type { Run } from './run-import';
import { namesIn } from './why-in-words';

/** How long a shipment can be on the way, and how long until it is overdue (common practice, no source). */
export const windowDays = 10;
const overdueAfterDays = 7;
const rowsPerInsert = 500;

type Row = typeof receiptMatches.$inferInsert;
type Plan = { importId: string; input: ReconciliationInput; outcome: Reconciliation };

/** Compares what is open in the whole book and keeps the outcome in one transaction, before any of it is posted. */
export async function planMatches(run: Run): Promise<void> {
  const { deps, importId } = run;
  const input = {
    asOf: dayInZone(deps.clock.now(), await operatorZone(deps.db)),
    windowDays,
    overdueAfterDays,
    shipments: await openShipments(deps.db),
    receipts: await openReceipts(deps.db, importId),
  };
  const outcome = await reconcileApart(input);
  await inTransaction(deps.db, (tx) => keepPlan(tx, { importId, input, outcome }));
}

async function keepPlan(tx: Transaction, plan: Plan): Promise<void> {
  const { importId, input, outcome } = plan;
  await dropEarlierOffers(
    tx,
    input.receipts.map(({ id }) => id),
  );
  const before = await countedBefore(tx, plan);
  const refused = await refusedPairs(
    tx,
    input.receipts.map(({ id }) => id),
  );
  const offers = offerRows(plan).filter(
    ({ receiptId, shipmentId }) => !refused.has(`${receiptId} ${shipmentId}`),
  );
  const rows = [...matchRows(plan), ...offers, ...before.rows];
  for (let at = 0; at < rows.length; at += rowsPerInsert)
    await tx.insert(receiptMatches).values(rows.slice(at, at + rowsPerInsert));
  await markReceipts(tx, { outcome, countedBefore: before.receiptIds });
  const result = { waiting: outcome.waiting.length, overdue: outcome.overdue.length };
  await tx.update(imports).set({ phase: 'planned', result }).where(eq(imports.id, importId));
}

function matchRows({ importId, outcome }: Plan): Row[] {
  return outcome.matches.flatMap(({ shipments, receipts: matched, rule }) => {
    const group = { importId, groupId: newId(), state: 'planned' as const, rule, score: 1000, why: '' };
    return shipments.flatMap((shipmentId) =>
      matched.map((receiptId) => ({ ...group, id: newId(), shipmentId, receiptId })),
    );
  });
}

function offerRows({ importId, input, outcome }: Plan): Row[] {
  const inWords = namesIn(input);
  return outcome.suggestions.flatMap(({ shipments, receipts: offered, rule, score, why }) => {
    const group = {
      importId,
      groupId: newId(),
      state: 'offered' as const,
      rule,
      score: Math.round(score * 1000),
      why: inWords(why).slice(0, 400),
    };
    return shipments.flatMap((shipmentId) =>
      offered.map((receiptId) => ({ ...group, id: newId(), shipmentId, receiptId })),
    );
  });
}

/** What an earlier import offered for these receipts is offered anew or not at all. */
async function dropEarlierOffers(tx: Transaction, receiptIds: readonly string[]): Promise<void> {
  const offered = await tx
    .select({ id: receiptMatches.id, receiptId: receiptMatches.receiptId })
    .from(receiptMatches)
    .where(eq(receiptMatches.state, 'offered'));
  const concerned = new Set(receiptIds);
  const ids = offered.filter(({ receiptId }) => concerned.has(receiptId)).map(({ id }) => id);
  if (ids.length > 0)
    await tx.update(receiptMatches).set({ state: 'fell away' }).where(inArray(receiptMatches.id, ids));
}

/** Pairs that someone has refused are not offered again. */
async function refusedPairs(tx: Transaction, receiptIds: readonly string[]): Promise<Set<string>> {
  const concerned = new Set(receiptIds);
  const rows = await tx
    .select({ receiptId: receiptMatches.receiptId, shipmentId: receiptMatches.shipmentId })
    .from(receiptMatches)
    .where(eq(receiptMatches.state, 'refused'));
  return new Set(
    rows
      .filter(({ receiptId }) => concerned.has(receiptId))
      .map(({ receiptId, shipmentId }) => `${receiptId} ${shipmentId}`),
  );
}

type Marks = { outcome: Reconciliation; countedBefore: ReadonlySet<string> };

async function markReceipts(tx: Transaction, { outcome, countedBefore: before }: Marks): Promise<void> {
  for (const { receipt, of } of outcome.duplicates)
    await tx.update(receipts).set({ state: 'duplicate', duplicateOf: of }).where(eq(receipts.id, receipt));
  const left = outcome.unannounced.filter((id) => !before.has(id));
  if (left.length > 0)
    await tx.update(receipts).set({ state: 'unannounced' }).where(inArray(receipts.id, left));
  if (before.size > 0)
    await tx
      .update(receipts)
      .set({ state: 'duplicate', rule: 'counted before' })
      .where(inArray(receipts.id, [...before]));
}
