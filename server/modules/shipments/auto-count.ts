import { and, asc, eq, lte, sql } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { shipmentLines, shipments } from '@/db/schema/shipments';
import { jobs } from '@/db/schema/work';
import { inTransaction } from '@/db/transaction';
import { addDays, compareDays, dayInZone } from '@/shared/domain/calendar';
import type { Deps } from '../../deps';
import { instantOf } from '../../deps';
import { type JobHandler, queueJob } from '../../jobs/job-queue';
import type { Scheduled } from '../../jobs/schedule';
import { queueMail } from '../../mail/outbox';
import { peopleWhoMay } from '../partners/people-who-may';
import { countShipment } from './count-shipment';
import { afterAutomaticMail, beforeAutomaticMail } from './letters';
import { selectShipments, type SelectedShipment, toCompany, withEnds } from './shipment-rows';

const noticeJob = 'notice before automatic count';
const countJob = 'automatic count';

/**
 * Empties that a partner has not counted within its `autoCountDays` after the expected arrival are taken as counted
 * as declared (RULES 2). On the last of those days both sides are told; the count follows on the day after the notice.
 */
export const automaticCounts: Scheduled = { name: 'automatic counts', every: 'hour', run: findDue };

export const automaticCountJobs: Record<string, JobHandler> = {
  [noticeJob]: (deps, job) => inTransaction(deps.db, (tx) => giveNotice(tx, { deps, id: idOf(job.payload) })),
  [countJob]: (deps, job) =>
    inTransaction(deps.db, (tx) => takeAsCounted(tx, { deps, id: idOf(job.payload) })),
};

type OneShipment = { deps: Deps; id: string };

const idOf = (payload: unknown): string => (payload as { shipmentId: string }).shipmentId;

/** The last day on which the receiver can still count. */
const lastDayOf = ({ shipment, toCompany: receiver }: SelectedShipment): string =>
  addDays(shipment.expectedOn, receiver.autoCountDays);

async function findDue(deps: Deps): Promise<void> {
  const now = instantOf(deps.clock);
  const furthestEast = dayInZone(now, 'Pacific/Kiritimati');
  const due = await selectShipments(deps.db)
    .where(
      and(
        eq(shipments.state, 'on the way'),
        eq(shipments.contents, 'empties'),
        eq(toCompany.kind, 'partner'),
        lte(sql`date_add(${shipments.expectedOn}, interval ${toCompany.autoCountDays} day)`, furthestEast),
      ),
    )
    .orderBy(asc(shipments.expectedOn), asc(shipments.id));
  for (const row of withEnds(due)) {
    const today = dayInZone(now, row.toSite.timeZone);
    if (compareDays(today, lastDayOf(row)) < 0) continue;
    const { id } = row.shipment;
    await inTransaction(deps.db, async (tx) => {
      const kind = (await wasToldBefore(tx, { row, today })) ? countJob : noticeJob;
      await queueJob(tx, { kind, payload: { shipmentId: id }, onceKey: `${kind} ${id}`, now });
    });
  }
}

/** Nothing is taken as counted without a notice on an earlier day, even if no server ran on the day it was due. */
async function wasToldBefore(
  tx: Transaction,
  { row, today }: { row: SelectedShipment; today: string },
): Promise<boolean> {
  const [notice] = await tx
    .select({ createdAt: jobs.createdAt })
    .from(jobs)
    .where(eq(jobs.onceKey, `${noticeJob} ${row.shipment.id}`));
  return notice !== undefined && compareDays(dayInZone(notice.createdAt, row.toSite.timeZone), today) < 0;
}

async function stillUncounted(tx: Transaction, id: string): Promise<SelectedShipment | undefined> {
  const found = await selectShipments(tx).where(and(eq(shipments.id, id), eq(shipments.state, 'on the way')));
  return withEnds(found)[0];
}

async function giveNotice(tx: Transaction, { deps, id }: OneShipment): Promise<void> {
  const row = await stillUncounted(tx, id);
  if (row) await tellBothSides(tx, { deps, row, letter: beforeAutomaticMail });
}

async function takeAsCounted(tx: Transaction, { deps, id }: OneShipment): Promise<void> {
  await tx.select({ id: shipments.id }).from(shipments).where(eq(shipments.id, id)).for('update');
  const row = await stillUncounted(tx, id);
  if (!row) return;
  const now = instantOf(deps.clock);
  const lines = await tx.select().from(shipmentLines).where(eq(shipmentLines.shipmentId, id));
  await countShipment(tx, {
    shipmentId: id,
    countedOn: dayInZone(now, row.toSite.timeZone),
    lines: lines.map(({ typeCode, declared }) => ({ typeCode, counted: declared, damaged: 0, dirty: 0 })),
    source: 'automatic',
    personId: null,
    now,
  });
  await tellBothSides(tx, { deps, row, letter: afterAutomaticMail });
}

type Telling = { deps: Deps; row: SelectedShipment; letter: typeof beforeAutomaticMail };

async function tellBothSides(tx: Transaction, { deps, row, letter }: Telling): Promise<void> {
  const now = instantOf(deps.clock);
  const today = dayInZone(now, row.toSite.timeZone);
  const link = `${deps.config.PUBLIC_URL}/shipments/${row.shipment.id}`;
  const write = letter({
    reference: row.shipment.reference,
    from: row.fromSite.name,
    to: row.toSite.name,
    toCompany: row.toCompany.name,
    expectedOn: row.shipment.expectedOn,
    on: addDays(today, 1),
    link,
  });
  const receivers = await peopleWhoMay(tx, { companyId: row.toCompany.id, ability: 'count shipments' });
  const senders = await peopleWhoMay(tx, { companyId: row.fromCompany.id, ability: 'send shipments' });
  for (const to of [...receivers, ...senders]) await queueMail(tx, { to, now, ...write(to.name) });
}
