import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { shipmentLines, shipments } from '@/db/schema/shipments';
import { inTransaction } from '@/db/transaction';
import { addDays } from '@/shared/domain/calendar';
import { Problem } from '@/shared/problems/problems';
import { instantOf } from '../../deps';
import { sitesById } from '../partners/sites';
import { sendShipment } from '../shipments/send-shipment';
import type { ImportedDocument } from './documents';
import { keptProblem, mark, type Mark, markedRows } from './import-marks';
import type { Run } from './run-import';

/** Steps between two tellings of progress. */
const stepsTold = 20;
/** A file does not say when a shipment is expected; one day on the way (common practice, no source). */
const daysOnTheWay = 1;

/** Posts the shipments of a file, each in its own transaction together with its mark. */
export async function postShipments(run: Run, documents: readonly ImportedDocument[]): Promise<void> {
  const done = await markedRows(run.deps.db, run.importId);
  let steps = 0;
  for (const document of documents) {
    if (document.side !== 'shipment') continue;
    if (!done.has(document.rowNo)) await postOne(run, document);
    steps += 1;
    if (steps % stepsTold === 0) await run.step(stepsTold);
  }
  await run.step(steps % stepsTold);
}

async function postOne(run: Run, document: ImportedDocument): Promise<void> {
  const base = {
    importId: run.importId,
    rowNo: document.rowNo,
    side: 'shipment' as const,
    reference: document.reference,
  };
  try {
    await inTransaction(run.deps.db, async (tx) => {
      const known = await sameShipment(tx, document);
      const posted = known ?? (await send(tx, { run, document }));
      await mark(tx, [{ ...base, ...posted }]);
    });
  } catch (error) {
    const problem = keptProblem(error);
    const shipmentId = typeof problem.data.shipmentId === 'string' ? problem.data.shipmentId : null;
    await inTransaction(run.deps.db, (tx) =>
      mark(tx, [{ ...base, outcome: 'refused', problem, shipmentId }]),
    );
  }
}

type Posted = Pick<Mark, 'outcome' | 'shipmentId'>;

async function send(
  tx: Transaction,
  { run, document }: { run: Run; document: ImportedDocument },
): Promise<Posted> {
  const { fromSiteId, toSiteId, reference, day } = document;
  const sites = await sitesById(tx, [fromSiteId]);
  const { id } = await sendShipment(tx, {
    reference: reference ?? '',
    contents: sites.get(fromSiteId)?.company.kind === 'operator' ? 'empties' : 'fulls',
    fromSiteId,
    toSiteId,
    leftOn: day,
    expectedOn: addDays(day, daysOnTheWay),
    lines: document.lines.map(({ typeCode, units }) => ({ typeCode, declared: units })),
    origin: 'import',
    importId: run.importId,
    personId: run.personId,
    now: instantOf(run.deps.clock),
  });
  return { outcome: 'posted', shipmentId: id };
}

/** The shipment of that sender and reference, when it says the same; one that says otherwise is a conflict. */
async function sameShipment(tx: Transaction, document: ImportedDocument): Promise<Posted | null> {
  const [held] = await tx
    .select()
    .from(shipments)
    .where(
      and(
        eq(shipments.fromCompanyId, document.fromCompanyId),
        eq(shipments.reference, document.reference ?? ''),
      ),
    );
  if (!held) return null;
  if (await saysTheSame(tx, { held, document })) return { outcome: 'known', shipmentId: held.id };
  throw new Problem('already exists', { data: { reference: held.reference, shipmentId: held.id } });
}

type Pair = { held: typeof shipments.$inferSelect; document: ImportedDocument };

async function saysTheSame(tx: Transaction, { held, document }: Pair): Promise<boolean> {
  if (held.fromSiteId !== document.fromSiteId || held.toSiteId !== document.toSiteId) return false;
  if (held.leftOn !== document.day) return false;
  const lines = await tx.select().from(shipmentLines).where(eq(shipmentLines.shipmentId, held.id));
  const declared = new Map(lines.map((line) => [line.typeCode, line.declared]));
  return (
    lines.length === document.lines.length &&
    document.lines.every((line) => declared.get(line.typeCode) === line.units)
  );
}
