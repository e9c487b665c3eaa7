import { likenessOf, sumOf } from './contents';
import { inOrder, inWindow, type Paper } from './papers';
import { namesSeveral, prefixesAgree, readSeveral, type Reference } from './references';

/** Receipts that name the same shipment, or the same shipments, of their lane. */
export interface Claim {
  shipments: Paper[];
  receipts: Paper[];
}

/** A receipt whose reference stands on several shipments of its lane, none of which fits best. */
export interface Torn {
  receipt: Paper;
  between: Paper[];
}

const keyOf = (lane: string, core: string) => `${lane}\u0000${core}`;

/** Shipments by lane and reference. */
export class ReferenceIndex {
  private readonly shipments = new Map<string, Paper[]>();

  constructor(
    shipments: readonly Paper[],
    private readonly windowDays: number,
  ) {
    for (const shipment of shipments) {
      if (!shipment.reference) continue;
      const key = keyOf(shipment.lane, shipment.reference.core);
      const there = this.shipments.get(key);
      if (there) there.push(shipment);
      else this.shipments.set(key, [shipment]);
    }
  }

  /** The shipments that had left and bear the reference: one, or as many as fit equally well. */
  find(receipt: Paper, reference: Reference): Paper[] {
    const all = this.shipments.get(keyOf(receipt.lane, reference.core)) ?? [];
    const left = all.filter((shipment) => shipment.day <= receipt.day);
    if (left.length < 2) return left;
    const grade = (shipment: Paper) =>
      (shipment.reference && prefixesAgree(shipment.reference, reference) ? 0 : 100) +
      (inWindow(this.windowDays, shipment, receipt) ? 0 : 10) +
      likenessOf(shipment.contents, receipt.contents);
    const best = Math.min(...left.map(grade));
    return left.filter((shipment) => grade(shipment) === best);
  }

  /** The shipments that a receipt names, exactly, when it names several. */
  findSeveral(receipt: Paper): Paper[] | null {
    for (const parts of readSeveral(receipt.text ?? '')) {
      const found = new Set(parts.map((reference) => this.find(receipt, reference)[0]));
      const shipments = [...found].filter((shipment) => shipment !== undefined);
      if (shipments.length === found.size && found.size > 1) return inOrder(shipments);
    }
    return null;
  }
}

export function readClaims(
  index: ReferenceIndex,
  receipts: readonly Paper[],
): { claims: Claim[]; torn: Torn[] } {
  const claims = new Map<string, Claim>();
  const torn: Torn[] = [];
  for (const receipt of receipts) {
    if (!receipt.reference) continue;
    const single = namesSeveral(receipt.text ?? '') ? [] : index.find(receipt, receipt.reference);
    if (single.length > 1) torn.push({ receipt, between: single });
    const shipments = single.length === 1 ? single : single.length === 0 ? index.findSeveral(receipt) : null;
    if (!shipments) continue;
    const key = shipments.map(({ place }) => place).join();
    const claim = claims.get(key);
    if (claim) claim.receipts.push(receipt);
    else claims.set(key, { shipments, receipts: [receipt] });
  }
  return { claims: withoutOverlap([...claims.values()]), torn };
}

/**
 * A shipment named alone by one receipt and together with others by another belongs to the claim whose
 * contents bear it out; a claim on several wins where its sum is like what was counted.
 */
function withoutOverlap(claims: Claim[]): Claim[] {
  const taken = new Set<Paper>();
  const sound = ({ shipments, receipts }: Claim) => {
    const declared = sumOf(shipments.map(({ contents }) => contents));
    return Math.min(...receipts.map(({ contents }) => likenessOf(declared, contents)));
  };
  const first = claims
    .filter((c) => c.shipments.length > 1)
    .map((claim) => ({ claim, likeness: sound(claim) }));
  const ordered = [
    ...first.filter(({ likeness }) => likeness < 3).sort((a, b) => a.likeness - b.likeness),
    ...claims.filter((c) => c.shipments.length === 1).map((claim) => ({ claim })),
    ...first.filter(({ likeness }) => likeness === 3),
  ];
  return ordered.flatMap(({ claim }) => {
    if (claim.shipments.some((shipment) => taken.has(shipment))) return [];
    for (const shipment of claim.shipments) taken.add(shipment);
    return [claim];
  });
}
