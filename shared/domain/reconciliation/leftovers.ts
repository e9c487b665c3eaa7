import type { Desk, Pairing } from './desk';
import { differencesOf, sumOf } from './contents';
import type { Match, Reconciliation, Suggestion } from './output';
import { inOrder, type Paper } from './papers';

const idsOf = (papers: Iterable<Paper>) => inOrder(papers).map(({ id }) => id);

const contentsOf = (papers: Paper[]) => sumOf(papers.map(({ contents }) => contents));

const matchOf = ({ shipments, receipts, rule }: Pairing): Match => ({
  shipments: idsOf(shipments),
  receipts: idsOf(receipts),
  rule,
  differences: differencesOf(contentsOf(shipments), contentsOf(receipts)),
});

const firstPlace = ({ shipments }: Pairing) => Math.min(...shipments.map(({ place }) => place));

/** The outcome in its fixed order: by the day of the shipment or receipt, then by id. */
export function outcomeOf(
  desk: Desk,
  suggestions: Suggestion[],
  { asOf, overdueAfterDays }: { asOf: number; overdueAfterDays: number },
): Reconciliation {
  const isOverdue = ({ day }: Paper) => asOf - day > overdueAfterDays;
  const open = desk.openShipments();
  return {
    matches: [...desk.pairings].sort((a, b) => firstPlace(a) - firstPlace(b)).map(matchOf),
    suggestions,
    duplicates: [...desk.doubles]
      .sort((a, b) => a.receipt.place - b.receipt.place)
      .map(({ receipt, of }) => ({ receipt: receipt.id, of: of.id })),
    waiting: idsOf(open.filter((shipment) => !isOverdue(shipment))),
    overdue: idsOf(open.filter(isOverdue)),
    unannounced: idsOf(desk.openReceipts()),
  };
}
