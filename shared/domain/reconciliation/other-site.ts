import type { Candidate } from './contest';
import { likenessOf } from './contents';
import type { Desk } from './desk';
import { inWindow, type Paper } from './papers';
import { prefixesAgree } from './references';

/** Open shipments with the receipt's reference and like contents that were sent from, or to, another site. */
export class OtherSites {
  private readonly byCore = new Map<string, Paper[]>();

  constructor(private readonly desk: Desk) {
    for (const shipment of desk.openShipments()) {
      if (!shipment.reference) continue;
      const there = this.byCore.get(shipment.reference.core);
      if (there) there.push(shipment);
      else this.byCore.set(shipment.reference.core, [shipment]);
    }
  }

  candidates = (receipt: Paper): Candidate[] => {
    const { reference } = receipt;
    if (!reference) return [];
    return (this.byCore.get(reference.core) ?? [])
      .filter((shipment) => shipment.reference && prefixesAgree(shipment.reference, reference))
      .filter((shipment) => (shipment.from === receipt.from) !== (shipment.to === receipt.to))
      .filter((shipment) => this.desk.isOpen(shipment) && inWindow(this.desk.windowDays, shipment, receipt))
      .map((shipment) => ({
        shipment,
        receipt,
        rule: 'other site' as const,
        likeness: likenessOf(shipment.contents, receipt.contents),
        usual: this.desk.usual.isUsual(shipment.lane, receipt.day - shipment.day),
      }))
      .filter(({ likeness }) => likeness < 3);
  };
}
