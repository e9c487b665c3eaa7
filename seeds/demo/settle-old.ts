import { and, eq, lte } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { differences } from '@/db/schema/differences';
import type { SettlementWay } from '@/shared/contracts/differences';
import { shipments } from '@/db/schema/shipments';
import { settleDifference } from '@/server/modules/differences/settle-difference';
import { Problem } from '@/shared/problems/problems';
import type { Book } from './book';
import type { Draws } from './random';

const reasons: Partial<Record<SettlementWay, string>> = {
  'sender miscounted': 'Counted again at the sender: the note was wrong.',
  'receiver miscounted': 'Counted again at the dock: a stack was overlooked.',
  'lost on the way': 'Carrier and both docks looked; nobody has them.',
  'turned up later': 'Came with the next truck.',
};

/** The coordinator's round: what has been open for a few days is settled, one way or another. */
export async function settleOld(
  book: Book,
  draws: Draws,
  days: { today: string; openedBy: string },
): Promise<void> {
  const ane = book.cast.personIds.get('ane@fennmark.example') ?? null;
  await book.onDay(async (tx) => {
    const open = await tx
      .select({ difference: differences, shipment: shipments })
      .from(differences)
      .innerJoin(shipments, eq(shipments.id, differences.shipmentId))
      .where(and(eq(differences.state, 'open'), lte(differences.openedOn, days.openedBy)));
    for (const { difference, shipment } of open) {
      const way = wayFor(difference.openUnits, draws);
      const settling = {
        differenceId: difference.id,
        units: Math.abs(difference.openUnits),
        bearerCompanyId: draws.perMille(600) ? shipment.toCompanyId : shipment.fromCompanyId,
        personId: ane,
        today: days.today,
        now: `${days.today}T13:20:00.000Z`,
      };
      await settleSomehow(tx, { ...settling, way, reason: reasons[way] ?? '' });
    }
  });
}

function wayFor(openUnits: number, draws: Draws): SettlementWay {
  const more: readonly SettlementWay[] = ['sender miscounted', 'sender miscounted', 'receiver miscounted'];
  return draws.oneOf(openUnits > 0 ? more : [...more, 'lost on the way', 'turned up later']);
}

/** What the rules refuse (a partner cannot lose what it does not hold) is settled as the sender's miscount. */
async function settleSomehow(
  tx: Transaction,
  settling: Parameters<typeof settleDifference>[1],
): Promise<void> {
  try {
    await tx.transaction((inner) => settleDifference(inner, settling));
  } catch (error) {
    if (!(error instanceof Problem)) throw error;
    await settleDifference(tx, {
      ...settling,
      way: 'sender miscounted',
      reason: reasons['sender miscounted'] ?? '',
    });
  }
}
