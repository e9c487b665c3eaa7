import { dayNumber } from './calendar';
import { ReferenceIndex, readClaims, type Torn } from './reconciliation/claims';
import { type Candidate, settle } from './reconciliation/contest';
import { likenessOf } from './reconciliation/contents';
import { Desk } from './reconciliation/desk';
import { readInput, type ReconciliationInput } from './reconciliation/input';
import { outcomeOf } from './reconciliation/leftovers';
import { settleMistyped } from './reconciliation/mistyped';
import { settleNearCombined } from './reconciliation/near-combined';
import { NearShipments } from './reconciliation/near-reference';
import type { Reconciliation } from './reconciliation/output';
import { readPapers } from './reconciliation/papers';
import { settleUnnamedRests } from './reconciliation/rest-of-split';
import { OpenLoads } from './reconciliation/same-load';
import { settlePlainClaims } from './reconciliation/same-reference';
import { suggest } from './reconciliation/suggestions';

export { CannotReconcile, type ReconciliationInput } from './reconciliation/input';
export type { Match, Reconciliation, RuleName, Suggestion } from './reconciliation/output';

/**
 * Matches declared shipments with counted receipts (RULES 5). Quantities are whole units, days are
 * 'YYYY-MM-DD'. Refuses with `CannotReconcile`, naming the document: an id twice, a quantity that is not a
 * whole number above 0, a day that does not exist, a shipment without lines.
 */
export function reconcile(raw: ReconciliationInput): Reconciliation {
  const input = readInput(raw);
  const desk = new Desk(readPapers(input.shipments), readPapers(input.receipts), {
    asOf: dayNumber(input.asOf),
    windowDays: input.windowDays,
  });
  const named = settleByReference(desk);
  const unnamed = settleByLoad(desk, named);
  return outcomeOf(desk, suggest(desk, [...named, ...unnamed]), {
    asOf: dayNumber(input.asOf),
    overdueAfterDays: input.overdueAfterDays,
  });
}

/** The rules that read a reference. Returns what they could not settle. */
function settleByReference(desk: Desk): Candidate[] {
  const index = new ReferenceIndex(desk.shipments, desk.windowDays);
  const { claims, torn } = readClaims(index, desk.receipts);
  const doubts = settlePlainClaims(desk, claims);
  const near = new NearShipments(desk);
  const inDoubt = new Set(doubts.flatMap(({ claim }) => claim.receipts));
  const unclaimed = desk.openReceipts().filter((receipt) => !inDoubt.has(receipt));
  settleNearCombined(desk, unclaimed, { index, near });
  return [...torn.flatMap((one) => candidatesOf(desk, one)), ...settleMistyped(desk, doubts, near)];
}

const candidatesOf = (desk: Desk, { receipt, between }: Torn): Candidate[] =>
  between.map((shipment) => ({
    shipment,
    receipt,
    rule: 'same reference',
    likeness: likenessOf(shipment.contents, receipt.contents),
    usual: desk.usual.isUsual(shipment.lane, receipt.day - shipment.day),
  }));

/** Receipts without a reference. What stronger rules left open stays a rival. */
function settleByLoad(desk: Desk, stronger: readonly Candidate[]): Candidate[] {
  const loads = new OpenLoads(desk);
  const unnamed = desk.openReceipts().filter(({ reference }) => !reference);
  const found = unnamed.flatMap(loads.candidates);
  const wanted = new Set(found.map(({ receipt }) => receipt));
  settle(
    desk,
    [...stronger, ...found],
    ({ rule, likeness, usual }) => rule === 'same load' && likeness < 2 && usual,
  );
  settleUnnamedRests(
    desk,
    unnamed.filter((receipt) => !wanted.has(receipt)),
  );
  return found;
}
