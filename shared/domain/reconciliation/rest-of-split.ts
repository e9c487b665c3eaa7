import { type Contents, likenessOf, restOf, sumOf } from './contents';
import type { Desk, Pairing } from './desk';
import { isNear, NearIndex } from './near-references';
import { inWindow, type Paper } from './papers';

interface Short {
  pairing: Pairing;
  shipment: Paper;
  rest: Contents;
}

// A part that is still to come is more than a miscount by a few.
const PART = 0.1;

/** What is left of a short delivery and a receipt that may be it. */
interface Completion {
  short: Short;
  receipt: Paper;
}

/** Further parts whose reference is mistyped: on the same lane, like what is missing, and with no rival. */
export function settleMistypedRests(desk: Desk): void {
  const index = new NearIndex<Short>();
  for (const short of shortDeliveries(desk))
    if (short.shipment.reference) index.add(short.shipment.lane, short.shipment.reference, short);
  const completions = desk.openReceipts().flatMap((receipt) => {
    const written = receipt.reference;
    if (!written) return [];
    return index
      .around(receipt.lane, written)
      .filter(({ shipment }) => shipment.reference && isNear(written, shipment.reference))
      .filter(({ rest }) => likenessOf(rest, receipt.contents) < 2)
      .map((short) => ({ short, receipt }));
  });
  complete(desk, completions);
}

/** Further parts without a reference: exactly what is missing, and nothing else that could be meant. */
export function settleUnnamedRests(desk: Desk, receipts: readonly Paper[]): void {
  const byRest = new Map<string, Short[]>();
  for (const short of shortDeliveries(desk)) {
    const place = placeOf(short.shipment.lane, short.rest);
    byRest.set(place, [...(byRest.get(place) ?? []), short]);
  }
  const completions = receipts.flatMap((receipt) =>
    (byRest.get(placeOf(receipt.lane, receipt.contents)) ?? []).map((short) => ({ short, receipt })),
  );
  complete(desk, completions);
}

function complete(desk: Desk, completions: Completion[]): void {
  const possible = completions.filter(({ short, receipt }) =>
    inWindow(desk.windowDays, short.shipment, receipt),
  );
  const byPaper = new Map<Paper, number>();
  for (const { short, receipt } of possible)
    for (const paper of [short.shipment, receipt]) byPaper.set(paper, (byPaper.get(paper) ?? 0) + 1);
  for (const { short, receipt } of possible)
    if (byPaper.get(short.shipment) === 1 && byPaper.get(receipt) === 1) desk.extend(short.pairing, receipt);
}

const placeOf = (lane: string, { signature }: Contents) => `${lane}\u0000${signature}`;

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
