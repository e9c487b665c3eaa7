import type { Candidate } from './contest';
import { likenessOf } from './contents';
import type { Desk } from './desk';
import type { Paper } from './papers';

// As many loads of one day and lane as can be told apart in an offer of three.
const MOST_A_DAY = 8;

/** Open shipments by lane, day and contents, so that only a window of one lane is ever looked at. */
export class OpenLoads {
  private readonly cells = new Map<string, Paper[]>();

  constructor(private readonly desk: Desk) {
    for (const shipment of desk.openShipments()) {
      this.put(cellOf(shipment, shipment.day, shipment.contents.signature), shipment);
      for (const [type] of shipment.contents.lines) this.put(cellOf(shipment, shipment.day, type), shipment);
    }
  }

  private put(cell: string, shipment: Paper): void {
    const there = this.cells.get(cell);
    if (there) there.push(shipment);
    else this.cells.set(cell, [shipment]);
  }

  /** Of the receipt's lane, in the window before it, with like contents. */
  candidates = (receipt: Paper): Candidate[] => {
    const same = this.inWindow(receipt, receipt.contents.signature, MOST_A_DAY);
    const found = new Set(same);
    // Three of exactly these contents are rivals enough: what is merely like them adds nothing.
    if (same.length < 3)
      for (const [type] of receipt.contents.lines)
        for (const shipment of this.inWindow(receipt, type, Infinity)) found.add(shipment);
    return [...found]
      .map((shipment) => ({
        shipment,
        receipt,
        rule: 'same load' as const,
        likeness: likenessOf(shipment.contents, receipt.contents),
        usual: this.desk.usual.isUsual(shipment.lane, receipt.day - shipment.day),
      }))
      .filter(({ likeness }) => likeness < 3);
  };

  private inWindow(receipt: Paper, contents: string, most: number): Paper[] {
    const found: Paper[] = [];
    for (let day = receipt.day; day >= receipt.day - this.desk.windowDays; day -= 1) {
      const here = (this.cells.get(cellOf(receipt, day, contents)) ?? []).filter((s) => this.desk.isOpen(s));
      found.push(...here.slice(0, most));
    }
    return found;
  }
}

const cellOf = ({ lane }: Paper, day: number, contents: string) => `${lane}\u0000${day}\u0000${contents}`;
