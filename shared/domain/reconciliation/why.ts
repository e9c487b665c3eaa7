import type { Candidate } from './contest';

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

/** One plain sentence: what speaks for the pair, and what else it could be. */
export function whyOf(candidate: Candidate, rivals: { shipments: string[]; receipts: string[] }): string {
  const days = candidate.receipt.day - candidate.shipment.day;
  const way = days === 0 ? 'on the same day' : days === 1 ? '1 day on the way' : `${days} days on the way`;
  const also = [...rivals.shipments, ...rivals.receipts];
  const rival = also.length > 0 ? `; ${list(also)} could be meant as well` : '';
  return `${READ_AS[candidate.rule]}, ${CONTENTS[candidate.likeness]}, ${way}${rival}.`;
}

const MOST_NAMED = 3;

function list(names: string[]): string {
  const named = names.slice(0, MOST_NAMED);
  const more = names.length - named.length;
  return more > 0 ? `${named.join(', ')} and ${more} more` : named.join(', ');
}
