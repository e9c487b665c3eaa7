import type { RuleName } from './output';
import type { Paper } from './papers';
import { UsualDays } from './usual-days';

export interface Pairing {
  shipments: Paper[];
  receipts: Paper[];
  rule: RuleName;
}

/** What the rules have settled so far, and what still lies open. */
export class Desk {
  readonly pairings: Pairing[] = [];
  readonly doubles: { receipt: Paper; of: Paper }[] = [];
  readonly usual = new UsualDays();
  private readonly paired = new Map<Paper, Pairing>();
  private readonly doubled = new Set<Paper>();

  constructor(
    readonly shipments: readonly Paper[],
    readonly receipts: readonly Paper[],
    private readonly terms: { asOf: number; windowDays: number },
  ) {}

  get windowDays(): number {
    return this.terms.windowDays;
  }

  /** Left so lately that it can still be on its way: by the lane's habit, or the window where there is none. */
  mayStillCome({ lane, day }: Paper): boolean {
    const days = this.terms.asOf - day;
    return !(this.usual.isTooLong(lane, days) ?? days > this.windowDays);
  }

  pair(pairing: Pairing): void {
    for (const paper of [...pairing.shipments, ...pairing.receipts]) {
      if (!this.isOpen(paper)) throw new Error(`${paper.id} is settled twice`);
      this.paired.set(paper, pairing);
    }
    this.pairings.push(pairing);
  }

  /** A further part of a delivery that was taken for whole. */
  extend(pairing: Pairing, receipt: Paper): void {
    pairing.receipts.push(receipt);
    pairing.rule = pairing.shipments.length > 1 ? 'combined delivery' : 'split delivery';
    this.paired.set(receipt, pairing);
  }

  double(receipt: Paper, of: Paper): void {
    this.doubles.push({ receipt, of });
    this.doubled.add(receipt);
  }

  isOpen(paper: Paper): boolean {
    return !this.paired.has(paper) && !this.doubled.has(paper);
  }

  openShipments = (): Paper[] => this.shipments.filter((paper) => this.isOpen(paper));
  openReceipts = (): Paper[] => this.receipts.filter((paper) => this.isOpen(paper));
}
