import type { Candidate } from './contest';
import type { Paper } from './papers';

const READ_AS: Record<Candidate['rule'], string> = {
  'same reference': 'The same reference',
  'split delivery': 'The same reference',
  'combined delivery': 'One of the references',
  'other site': 'The same reference at another site',
  'near reference': 'The reference is one slip away',
  'same load': 'No reference, the same lane',
};

const CONTENTS = [
  'the same contents',
  'contents a few units apart',
  'like contents',
  'other contents',
] as const;

const MOST_NAMED = 3;

/** One plain sentence: what speaks for the pair, and what else it could be. */
export function whyOf(candidate: Candidate, rivals: { shipments: Paper[]; receipts: number }): string {
  const days = candidate.receipt.day - candidate.shipment.day;
  const way = days === 0 ? 'on the same day' : days === 1 ? '1 day on the way' : `${days} days on the way`;
  const evidence = `${READ_AS[candidate.rule]}, ${CONTENTS[candidate.likeness]}, ${way}`;
  return `${[evidence, ...otherShipments(rivals.shipments), ...otherReceipts(rivals.receipts)].join('; ')}.`;
}

function otherShipments(shipments: Paper[]): string[] {
  if (shipments.length === 0) return [];
  const names = shipments.slice(0, MOST_NAMED).map(({ text, id }) => text?.trim() || id);
  const more = shipments.length - names.length;
  return [`it fits ${names.join(', ')}${more > 0 ? ` and ${more} more` : ''} as well`];
}

const otherReceipts = (count: number): string[] =>
  count === 0 ? [] : [count === 1 ? 'another receipt fits too' : `${count} other receipts fit too`];
