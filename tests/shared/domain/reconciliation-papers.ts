import { type Reconciliation, reconcile, type ReconciliationInput } from '@/shared/domain/reconciliation';

export type Shipment = ReconciliationInput['shipments'][number];
export type Receipt = ReconciliationInput['receipts'][number];

export const aShipment = (given: Partial<Shipment> & { id: string }): Shipment => ({
  ref: 'EM-104300',
  from: 'TARNBY',
  to: 'KESTREL',
  date: '2026-03-10',
  lines: [{ type: 'TOTE', quantity: 400 }],
  ...given,
});

export const aReceipt = (given: Partial<Receipt> & { id: string }): Receipt => ({
  ref: 'EM-104300',
  from: 'TARNBY',
  to: 'KESTREL',
  date: '2026-03-12',
  lines: [{ type: 'TOTE', quantity: 400 }],
  ...given,
});

export const totes = (quantity: number) => [{ type: 'TOTE', quantity }];

export const aMonth = (given: Partial<ReconciliationInput>): ReconciliationInput => ({
  asOf: '2026-03-31',
  windowDays: 10,
  overdueAfterDays: 7,
  shipments: [],
  receipts: [],
  ...given,
});

export const outcomeFor = (shipments: Shipment[], receipts: Receipt[]): Reconciliation =>
  reconcile(aMonth({ shipments, receipts }));

/** The pairs that the suggestions offer, in order. */
export const offeredPairs = ({ suggestions }: Reconciliation): [string, string][] =>
  suggestions
    .flatMap(({ shipments, receipts }) =>
      shipments.flatMap((s) => receipts.map((r): [string, string] => [s, r])),
    )
    .sort(([a, b], [c, d]) => (a + b < c + d ? -1 : 1));

/** Matches without their differences. */
export const matched = ({ matches }: Reconciliation) =>
  matches.map(({ rule, shipments, receipts }) => `${rule}: ${shipments.join(' ')} – ${receipts.join(' ')}`);
