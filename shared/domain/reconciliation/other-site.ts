import type { Candidate } from './contest';
import type { Desk } from './desk';
import { inWindow, type Paper } from './papers';
import { prefixesAgree } from './references';

/** Open shipments with the receipt's reference and contents that were sent from, or to, another site. */
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
      .filter((shipment) => inWindow(this.desk.windowDays, shipment, receipt))
      .filter((shipment) => shipment.contents.signature === receipt.contents.signature)
      .map((shipment) => ({ shipment, receipt, rule: 'other site', likeness: 0, usual: true }));
  };
}
