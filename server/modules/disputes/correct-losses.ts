import { and, asc, between, eq, inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { accounts, ledgerEntries, ledgerLines, partnerEvents } from '@/db/schema/ledger';
import { firstDayOfMonth, lastDayOfMonth } from '@/shared/domain/calendar';
import { siteAccount } from '../ledger/accounts';
import { postEntry } from '../ledger/post-entry';
import { recordEvents } from '../ledger/record-events';
import { sitesById } from '../partners/sites';
import { shipments } from '@/db/schema/shipments';

export type CorrectingLosses = {
  companyId: string;
  typeCode: string;
  /** The month in which they were lost. */
  month: string;
  units: number;
  reason: string;
  disputeId: string;
  personId: string;
};

type LostEvent = typeof partnerEvents.$inferSelect;

/**
 * Takes back losses of a partner in a month, oldest first: each event is corrected, and the units leave `lost` by an
 * entry that names the one which wrote them off. Returns how many could be taken back; losses by age have no event.
 */
export async function correctLosses(tx: Transaction, correcting: CorrectingLosses): Promise<number> {
  let left = correcting.units;
  for (const { event, remaining } of await lossesOf(tx, correcting)) {
    const units = Math.min(left, remaining);
    if (units <= 0) continue;
    await takeBack(tx, { correcting, event, units });
    left -= units;
  }
  return correcting.units - left;
}

async function lossesOf(
  tx: Transaction,
  { companyId, typeCode, month }: CorrectingLosses,
): Promise<{ event: LostEvent; remaining: number }[]> {
  const events = await tx
    .select()
    .from(partnerEvents)
    .where(
      and(
        eq(partnerEvents.companyId, companyId),
        eq(partnerEvents.typeCode, typeCode),
        eq(partnerEvents.kind, 'lost'),
        between(partnerEvents.date, firstDayOfMonth(month), lastDayOfMonth(month)),
      ),
    )
    .orderBy(asc(partnerEvents.date), asc(partnerEvents.id));
  if (events.length === 0) return [];
  const corrections = await tx
    .select()
    .from(partnerEvents)
    .where(
      inArray(
        partnerEvents.correctsId,
        events.map((event) => event.id),
      ),
    );
  return events.map((event) => ({
    event,
    remaining: corrections
      .filter((correction) => correction.correctsId === event.id)
      .reduce((total, correction) => total + correction.quantity, event.quantity),
  }));
}

type TakingBack = { correcting: CorrectingLosses; event: LostEvent; units: number };

async function takeBack(tx: Transaction, taking: TakingBack): Promise<void> {
  const { correcting, event, units } = taking;
  const entryId = event.entryId === null ? null : await reverseEntry(tx, taking);
  const taken = [event, ...(await issuedForIt(tx, event))];
  await recordEvents(
    tx,
    taken.map((each) => ({
      companyId: each.companyId,
      date: each.date,
      typeCode: each.typeCode,
      kind: 'corrected' as const,
      quantity: -units,
      correctsId: each.id,
      entryId,
      shipmentId: each.shipmentId,
      disputeId: correcting.disputeId,
      cause: 'loss taken back after a dispute',
    })),
  );
}

/** A receiver who bore a loss on the way was issued what it then lost: without the loss it never held it. */
function issuedForIt(tx: Transaction, event: LostEvent): Promise<LostEvent[]> | LostEvent[] {
  if (event.entryId === null) return [];
  return tx
    .select()
    .from(partnerEvents)
    .where(
      and(
        eq(partnerEvents.entryId, event.entryId),
        eq(partnerEvents.companyId, event.companyId),
        eq(partnerEvents.typeCode, event.typeCode),
        eq(partnerEvents.kind, 'issued'),
      ),
    );
}

/** Back from `lost` to the site they were written off at; what was lost on the way stands with its sender again. */
async function reverseEntry(
  tx: Transaction,
  { correcting, event, units }: TakingBack,
): Promise<number | null> {
  const [loss] = await tx
    .select({ line: ledgerLines, entry: ledgerEntries, account: accounts })
    .from(ledgerLines)
    .innerJoin(ledgerEntries, eq(ledgerEntries.id, ledgerLines.entryId))
    .innerJoin(accounts, eq(accounts.id, ledgerLines.fromAccountId))
    .where(and(eq(ledgerLines.entryId, event.entryId ?? 0), eq(ledgerLines.typeCode, event.typeCode)))
    .orderBy(asc(ledgerLines.lineNo))
    .limit(1);
  if (!loss) return null;
  const { line, entry, account } = loss;
  const to = account.kind === 'site' ? account.id : await senderAccount(tx, account.shipmentId ?? '');
  return postEntry(tx, {
    kind: 'correction',
    valueDate: entry.valueDate,
    moves: [
      {
        typeCode: line.typeCode,
        from: line.toAccountId,
        to,
        units,
        ...(line.chargedCompanyId ? { chargedCompanyId: line.chargedCompanyId } : {}),
      },
    ],
    reason: correcting.reason,
    personId: correcting.personId,
    ...(entry.shipmentId ? { shipmentId: entry.shipmentId } : {}),
    disputeId: correcting.disputeId,
    correctsEntryId: entry.id,
  });
}

async function senderAccount(tx: Transaction, shipmentId: string): Promise<number> {
  const [shipment] = await tx
    .select({ fromSiteId: shipments.fromSiteId })
    .from(shipments)
    .where(eq(shipments.id, shipmentId));
  const site = (await sitesById(tx, [shipment?.fromSiteId ?? ''])).get(shipment?.fromSiteId ?? '');
  if (!site) throw new Error('a loss on the way has no sender');
  return siteAccount(tx, site);
}
