import type { Candidate } from './contest';
import { likenessOf, oneTypeWrong } from './contents';
import type { Desk } from './desk';
import { inWindow, type Paper } from './papers';
import { isNear, NearIndex } from './near-references';
import type { Reference } from './references';

/** Open shipments of the receipt's lane whose reference is one slip away, in the window, with like contents. */
export class NearShipments {
  private readonly index = new NearIndex<Paper>();

  constructor(private readonly desk: Desk) {
    for (const shipment of desk.openShipments())
      if (shipment.reference) this.index.add(shipment.lane, shipment.reference, shipment);
  }

  /** Those near to `written`, whatever they hold. */
  around(receipt: Paper, written: Reference): Paper[] {
    return this.index
      .around(receipt.lane, written)
      .filter(
        (shipment) =>
          this.desk.isOpen(shipment) &&
          inWindow(this.desk.windowDays, shipment, receipt) &&
          shipment.reference !== null &&
          isNear(written, shipment.reference),
      );
  }

  candidates = (receipt: Paper): Candidate[] => {
    if (!receipt.reference) return [];
    return this.around(receipt, receipt.reference)
      .map((shipment) => ({
        shipment,
        receipt,
        rule: 'near reference' as const,
        likeness: likenessOf(shipment.contents, receipt.contents),
        usual: this.desk.usual.isUsual(shipment.lane, receipt.day - shipment.day),
      }))
      .filter(({ shipment, likeness }) => likeness < 3 || oneTypeWrong(shipment.contents, receipt.contents));
  };
}
