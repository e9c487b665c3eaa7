import { compare, isWholeMinor, negate, proportion } from './money';
import type { LineComponent } from './statement/components';

/** What a statement line says, as far as a dispute goes. */
export type DisputedLine = {
  component: LineComponent;
  quantity: number;
  amount: string;
  currency: string;
};

/** Components whose quantity is containers: such a line is disputed by units; the daily fee counts unit-days. */
const byUnits: Partial<Record<LineComponent, 'fewer' | 'more'>> = {
  'deposits asked': 'fewer',
  'deposits released': 'more',
  lost: 'fewer',
  'found again': 'more',
  damage: 'fewer',
  cleaning: 'fewer',
};

/** Which way a partner can say that the units should differ; null where only the money can be disputed. */
export function claimableWay({ component, quantity }: DisputedLine): 'fewer' | 'more' | null {
  return quantity > 0 ? (byUnits[component] ?? null) : null;
}

/** The line's amount for so many of its units, above 0, rounded once to the minor unit (RULES 3.13). */
export function amountOfUnits(line: DisputedLine, units: number): string {
  const amount = compare(line.amount, '0') < 0 ? negate(line.amount) : line.amount;
  return proportion(amount, { times: units, over: line.quantity, currency: line.currency });
}

/** Whether an amount can be claimed to be too much: above 0, in whole minor units, no more than the line. */
export function isClaimableAmount(line: DisputedLine, amount: string): boolean {
  const most = compare(line.amount, '0') < 0 ? negate(line.amount) : line.amount;
  return compare(amount, '0') > 0 && compare(amount, most) <= 0 && isWholeMinor(amount, line.currency);
}
