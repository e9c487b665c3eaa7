import type { ReferenceIndex } from './claims';
import { likenessOf, sumOf } from './contents';
import type { Desk } from './desk';
import type { NearShipments } from './near-reference';
import { inOrder, type Paper } from './papers';
import { readSeveral, type Reference } from './references';
import { gatherTwins } from './twins';

// Two parts with that many readings each are beyond telling.
const MOST_READINGS = 50;

interface Reading {
  shipments: Paper[];
  receipts: Paper[];
}

/**
 * A receipt that names several references of which some are mistyped: combined when exactly one reading
 * of the parts adds up to what was counted, and no other receipt wants one of its shipments.
 */
export function settleNearCombined(
  desk: Desk,
  receipts: readonly Paper[],
  { index, near }: { index: ReferenceIndex; near: NearShipments },
): void {
  const readings = new Map<string, Reading>();
  for (const receipt of receipts) {
    const shipments = onlyReading(receipt, (reference) => {
      const exact = index.find(receipt, reference).filter((shipment) => desk.isOpen(shipment));
      return exact.length > 0 ? exact : near.around(receipt, reference);
    });
    if (!shipments) continue;
    const key = shipments.map(({ place }) => place).join();
    const known = readings.get(key);
    if (known) known.receipts.push(receipt);
    else readings.set(key, { shipments, receipts: [receipt] });
  }
  settleReadings(desk, [...readings.values()]);
}

function settleReadings(desk: Desk, readings: Reading[]): void {
  const wanted = new Map<Paper, number>();
  for (const shipment of readings.flatMap(({ shipments }) => shipments))
    wanted.set(shipment, (wanted.get(shipment) ?? 0) + 1);
  for (const { shipments, receipts } of readings) {
    const [twins, ...rivals] = gatherTwins(receipts);
    if (!twins || rivals.length > 0 || shipments.some((shipment) => wanted.get(shipment) !== 1)) continue;
    desk.pair({ shipments, receipts: [twins.kept], rule: 'combined delivery' });
    for (const again of twins.again) desk.double(again, twins.kept);
  }
}

function onlyReading(receipt: Paper, find: Find): Paper[] | null {
  const fitting = readingsOf(receipt, find).filter(
    (shipments) => likenessOf(sumOf(shipments.map(({ contents }) => contents)), receipt.contents) < 2,
  );
  return fitting.length === 1 && fitting[0] ? inOrder(fitting[0]) : null;
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
