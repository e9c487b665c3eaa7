import { type Contents, likenessOf, restOf, sumOf } from './contents';
import type { Desk, Pairing } from './desk';
import { isNear } from './near-references';
import { inWindow, type Paper } from './papers';

interface Short {
  pairing: Pairing;
  shipment: Paper;
  rest: Contents;
}

// A part that is still to come is more than a miscount by a few.
const PART = 0.1;

/**
 * Further parts of deliveries that came short, whose own reference is mistyped or missing: the receipt
 * holds what is missing, to the unit, and nothing else could be meant on either side.
 */
export function settleRests(desk: Desk, fits: (shipment: Paper, receipt: Paper) => boolean): void {
  const shorts = gather(shortDeliveries(desk), ({ shipment, rest }) => placeOf(shipment.lane, rest));
  const receipts = gather(desk.openReceipts(), ({ lane, contents }) => placeOf(lane, contents));
  for (const [place, here] of shorts) {
    const pairs = here.flatMap((short) =>
      (receipts.get(place) ?? [])
        .filter(
          (receipt) => inWindow(desk.windowDays, short.shipment, receipt) && fits(short.shipment, receipt),
        )
        .map((receipt) => ({ short, receipt })),
    );
    for (const { short, receipt } of pairs) {
      const rivals = pairs.filter((pair) => pair.short === short || pair.receipt === receipt);
      if (rivals.length === 1) desk.extend(short.pairing, receipt);
    }
  }
}

const placeOf = (lane: string, { signature }: Contents) => `${lane}\u0000${signature}`;

function gather<T>(all: T[], key: (one: T) => string): Map<string, T[]> {
  const gathered = new Map<string, T[]>();
  for (const one of all) {
    const there = gathered.get(key(one));
    if (there) there.push(one);
    else gathered.set(key(one), [one]);
  }
  return gathered;
}

function shortDeliveries(desk: Desk): Short[] {
  return desk.pairings.flatMap((pairing) => {
    const [shipment, ...more] = pairing.shipments;
    if (!shipment || more.length > 0) return [];
    const counted = sumOf(pairing.receipts.map(({ contents }) => contents));
    if (likenessOf(shipment.contents, counted) === 0) return [];
    const rest = restOf(shipment.contents, counted);
    return rest && rest.units > PART * shipment.contents.units ? [{ pairing, shipment, rest }] : [];
  });
}

/** One part's reference is mistyped. */
export const hasNearReference = (shipment: Paper, receipt: Paper): boolean =>
  shipment.reference !== null && receipt.reference !== null && isNear(receipt.reference, shipment.reference);
