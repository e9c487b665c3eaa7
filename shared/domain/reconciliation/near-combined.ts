import type { ReferenceIndex } from './claims';
import { likenessOf, sumOf } from './contents';
import type { Desk } from './desk';
import type { NearShipments } from './near-reference';
import { inOrder, type Paper } from './papers';
import { readSeveral } from './references';

// Two parts with that many readings each are beyond telling.
const MOST_READINGS = 50;

/**
 * A receipt that names several references of which some are mistyped: combined when exactly one reading
 * of the parts adds up to what was counted.
 */
export function settleNearCombined(desk: Desk, index: ReferenceIndex, near: NearShipments): void {
  for (const receipt of desk.openReceipts()) {
    const readings = readingsOf(desk, receipt, (reference) => {
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

function readingsOf(
  desk: Desk,
  receipt: Paper,
  find: (reference: NonNullable<Paper['reference']>) => Paper[],
): Paper[][] {
  const parts = readSeveral(receipt.text ?? '');
  if (parts.length < 2) return [];
  let readings: Paper[][] = [[]];
  for (const part of parts) {
    const found = find(part);
    readings = readings.flatMap((reading) =>
      found.filter((shipment) => !reading.includes(shipment)).map((shipment) => [...reading, shipment]),
    );
    if (readings.length > MOST_READINGS) return [];
  }
  return readings;
}
