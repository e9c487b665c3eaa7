import type { ReferenceIndex } from './claims';
import { likenessOf, sumOf } from './contents';
import type { Desk } from './desk';
import type { NearShipments } from './near-reference';
import { inOrder, type Paper } from './papers';
import { readSeveral, type Reference } from './references';

// Two parts with that many readings each are beyond telling.
const MOST_READINGS = 50;

/**
 * A receipt that names several references of which some are mistyped: combined when exactly one reading
 * of the parts adds up to what was counted.
 */
export function settleNearCombined(
  desk: Desk,
  receipts: readonly Paper[],
  { index, near }: { index: ReferenceIndex; near: NearShipments },
): void {
  for (const receipt of receipts) {
    const readings = readingsOf(receipt, (reference) => {
      const exact = index.find(receipt, reference).filter((shipment) => desk.isOpen(shipment));
      return exact.length > 0 ? exact : near.around(receipt, reference);
    });
    const fitting = readings.filter(
      (shipments) => likenessOf(sumOf(shipments.map(({ contents }) => contents)), receipt.contents) < 2,
    );
    if (fitting.length !== 1 || !fitting[0]) continue;
    desk.pair({ shipments: inOrder(fitting[0]), receipts: [receipt], rule: 'combined delivery' });
  }
}

type Find = (reference: Reference) => Paper[];

const readingsOf = (receipt: Paper, find: Find): Paper[][] =>
  readSeveral(receipt.text ?? '').flatMap((parts) => combine(parts.map(find)));

/** One shipment for each part, in every way, none twice. */
function combine(parts: Paper[][]): Paper[][] {
  let readings: Paper[][] = [[]];
  for (const found of parts) {
    readings = readings.flatMap((reading) =>
      found.filter((shipment) => !reading.includes(shipment)).map((shipment) => [...reading, shipment]),
    );
    if (readings.length > MOST_READINGS) return [];
  }
  return readings;
}
